import { randomBytes, randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { InjectModel } from '@nestjs/sequelize';
import bcrypt from 'bcryptjs';
import type { Transaction } from 'sequelize';
import { conflict, ProblemException } from '../common/problem';
import { DatabaseService } from '../database/database.service';
import { presentPerson } from '../people/dto/person.dto';
import { digest } from '../people/people.service';
import { Person } from '../people/person.model';
import { Shop } from '../people/shop.model';
import type { AcceptInvitationDto, SetupDto, SignedInDto, SignInDto } from './dto/auth.dto';
import { RefreshToken } from './refresh-token.model';

/** How long the API's token and the cookie hold. */
export const ACCESS_SECONDS = 15 * 60;
export const REFRESH_DAYS = 30;
/** Two tabs may ask at once: a token replaced this short a time ago still works. */
const GRACE_MS = 10_000;
const ROUNDS = 10;
/** Compared with when there is no such person, so that both answers take as long. */
const NOBODY = bcrypt.hashSync('nobody has this password', ROUNDS);

/** What a sign-in hands out: the answer, and the token for the cookie. */
export interface Session {
  answer: SignedInDto;
  refreshToken: string;
}

/** Signing in and staying signed in. */
@Injectable()
export class AuthService {
  constructor(
    private readonly jwt: JwtService,
    private readonly database: DatabaseService,
    @InjectModel(Person) private readonly people: typeof Person,
    @InjectModel(Shop) private readonly shops: typeof Shop,
    @InjectModel(RefreshToken) private readonly tokens: typeof RefreshToken,
  ) {}

  /** Signs in with e-mail and password; says the same whatever was wrong. */
  async signIn({ email, password }: SignInDto): Promise<Session> {
    const person = await this.people.findOne({ where: { email: email.trim().toLowerCase() } });
    const isRight = await bcrypt.compare(password, person?.passwordHash ?? NOBODY);
    if (!person?.passwordHash || !isRight) {
      throw new ProblemException(
        401,
        'wrong-sign-in',
        'E-mail or password is not right. Check both and try again.',
      );
    }
    if (person.isBlocked) {
      throw new ProblemException(
        403,
        'blocked',
        'This account is blocked. Ask the owner of the shop.',
      );
    }
    return this.database.write((transaction) => this.open(person, randomUUID(), transaction));
  }

  /**
   * Hands out the next token of a chain. A token that was replaced before is a sign of theft: the
   * whole chain ends.
   */
  async refresh(token: string | undefined): Promise<Session> {
    const out = new ProblemException(401, 'not-signed-in', 'Sign in to go on.');
    if (!token) throw out;
    const session = await this.database.write(async (transaction) => {
      const known = await this.tokens.findOne({ where: { tokenHash: digest(token) }, transaction });
      if (!known || known.revokedAt || known.expiresAt.getTime() < Date.now()) return null;
      if (known.replacedAt && Date.now() - known.replacedAt.getTime() > GRACE_MS) {
        await this.tokens.update(
          { revokedAt: new Date() },
          { where: { chain: known.chain }, transaction },
        );
        return null;
      }
      const person = await this.people.findByPk(known.personId, { transaction });
      if (!person || person.isBlocked) return null;
      await known.update({ replacedAt: known.replacedAt ?? new Date() }, { transaction });
      return this.open(person, known.chain, transaction);
    });
    if (!session) throw out;
    return session;
  }

  /** Ends the chain a cookie belongs to. */
  async signOut(token: string | undefined): Promise<void> {
    if (!token) return;
    await this.database.write(async (transaction) => {
      const known = await this.tokens.findOne({ where: { tokenHash: digest(token) }, transaction });
      if (!known) return;
      await this.tokens.update(
        { revokedAt: new Date() },
        { where: { chain: known.chain }, transaction },
      );
    });
  }

  /** Takes up an invitation: the link works once. */
  async acceptInvitation({ token, name, password }: AcceptInvitationDto): Promise<Session> {
    const passwordHash = await bcrypt.hash(password, ROUNDS);
    return this.database.write(async (transaction) => {
      const person = await this.people.findOne({
        where: { invitationHash: digest(token) },
        transaction,
      });
      const isOpen =
        person?.invitationExpiresAt && person.invitationExpiresAt.getTime() > Date.now();
      if (!person || !isOpen || person.isBlocked) {
        throw new ProblemException(
          410,
          'invitation-over',
          'This invitation has been used or has expired. Ask the owner for a new one.',
        );
      }
      await person.update(
        { name: name.trim(), passwordHash, invitationHash: null, invitationExpiresAt: null },
        { transaction },
      );
      return this.open(person, randomUUID(), transaction);
    });
  }

  /** True while nobody has an account. */
  async isSetupNeeded(): Promise<boolean> {
    return (await this.people.count()) === 0;
  }

  /** Makes the shop and its owner; only while nobody has an account. */
  async setUp({ shopName, name, email, password }: SetupDto): Promise<Session> {
    const passwordHash = await bcrypt.hash(password, ROUNDS);
    return this.database.write(async (transaction) => {
      if ((await this.people.count({ transaction })) > 0) {
        throw conflict(
          'set-up-already',
          'The shop has an owner already. Sign in, or ask for an invitation.',
        );
      }
      await this.shops.create({ name: shopName.trim() }, { transaction });
      const person = await this.people.create(
        { name: name.trim(), email: email.trim().toLowerCase(), role: 'owner', passwordHash },
        { transaction },
      );
      return this.open(person, randomUUID(), transaction);
    });
  }

  private async open(person: Person, chain: string, transaction: Transaction): Promise<Session> {
    const refreshToken = randomBytes(32).toString('base64url');
    await this.tokens.create(
      {
        personId: person.id,
        chain,
        tokenHash: digest(refreshToken),
        expiresAt: new Date(Date.now() + REFRESH_DAYS * 86_400_000),
      },
      { transaction },
    );
    const accessToken = await this.jwt.signAsync(
      {},
      { subject: String(person.id), expiresIn: ACCESS_SECONDS },
    );
    return {
      answer: { accessToken, expiresIn: ACCESS_SECONDS, person: presentPerson(person) },
      refreshToken,
    };
  }
}
