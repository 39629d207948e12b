import { createHash, randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { DatabaseService } from '../database/database.service';
import { allow } from '../common/policy';
import { badField, conflict, notFound } from '../common/problem';
import { RefreshToken } from '../auth/refresh-token.model';
import type { ChangePersonDto } from './dto/change-person.dto';
import type { InvitationDto, InviteDto } from './dto/invite.dto';
import { type PersonDto, presentPerson } from './dto/person.dto';
import { INVITATION_DAYS } from './people.limits';
import { Person } from './person.model';
import { canChange, canInvite, canListPeople } from './person.policy';

/** Digest under which a token is kept; the token itself never is. */
export function digest(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}

/** People of the shop: who they are, what they may do. */
@Injectable()
export class PeopleService {
  constructor(
    private readonly database: DatabaseService,
    @InjectModel(Person) private readonly people: typeof Person,
    @InjectModel(RefreshToken) private readonly tokens: typeof RefreshToken,
  ) {}

  /** Everybody, by name. */
  async list(actor: Person): Promise<PersonDto[]> {
    allow(canListPeople(actor), 'Only the owner sees the list of people.');
    const people = await this.people.findAll({ order: [['name', 'ASC']] });
    return people.map((person) => presentPerson(person, actor));
  }

  /** Invites somebody; the link works once. Inviting the same address again makes a new link. */
  async invite(actor: Person, { name, email, role }: InviteDto): Promise<InvitationDto> {
    allow(canInvite(actor), 'Only the owner invites people.');
    const token = randomBytes(32).toString('base64url');
    const address = email.trim().toLowerCase();
    const person = await this.database.write(async (transaction) => {
      const known = await this.people.findOne({ where: { email: address }, transaction });
      if (known?.passwordHash) {
        throw badField('/email', 'Somebody with this address works here already.', 'email-taken');
      }
      const values = {
        name: name.trim(),
        email: address,
        role,
        invitationHash: digest(token),
        invitationExpiresAt: new Date(Date.now() + INVITATION_DAYS * 86_400_000),
      };
      if (known) return known.update(values, { transaction });
      return this.people.create(values, { transaction });
    });
    return { person: presentPerson(person, actor), invitationLink: `/invitation/${token}` };
  }

  /** Changes a role or blocks somebody; the last owner stays. */
  async change(actor: Person, id: number, change: ChangePersonDto): Promise<PersonDto> {
    allow(
      canChange(actor, { id }),
      'Only the owner changes people, and nobody changes their own role.',
    );
    return this.database.write(async (transaction) => {
      const person = await this.people.findByPk(id, { transaction });
      if (!person) throw notFound('This person');
      await person.update(change, { transaction });
      const owners = await this.people.count({
        where: { role: 'owner', isBlocked: false },
        transaction,
      });
      if (owners === 0)
        throw conflict('last-owner', 'The shop needs at least one owner who is not blocked.');
      // Whoever is blocked is out at once, on every device.
      if (person.isBlocked) {
        await this.tokens.update(
          { revokedAt: new Date() },
          { where: { personId: id, revokedAt: null }, transaction },
        );
      }
      return presentPerson(person, actor);
    });
  }
}
