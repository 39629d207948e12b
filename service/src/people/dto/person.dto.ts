import { ApiProperty } from '@nestjs/swagger';
import { type Role, ROLES } from '../../common/policy';
import type { Actor } from '../../common/policy';
import type { Person } from '../person.model';
import { canChange, canInvite, canListPeople } from '../person.policy';
import { isAtLeast } from '../../common/policy';

/** What the signed-in person may do, so that the ui hides what would be refused. */
export class PersonAbilities {
  @ApiProperty() managePeople: boolean;
  @ApiProperty() writeFamilies: boolean;
  @ApiProperty() closeCases: boolean;
  @ApiProperty({ description: 'Whether the asking person may change this one.' }) change: boolean;
}

export class PersonDto {
  @ApiProperty() id: number;
  @ApiProperty() name: string;
  @ApiProperty() email: string;
  @ApiProperty({ enum: ROLES, enumName: 'Role' }) role: Role;
  @ApiProperty() isBlocked: boolean;
  @ApiProperty({ description: 'Invited but not here yet.' }) isInvited: boolean;
  @ApiProperty({ type: PersonAbilities }) abilities: PersonAbilities;
}

/** A person as they leave the server. */
export function presentPerson(person: Person, asker: Actor = person): PersonDto {
  const { id, name, email, role, isBlocked } = person;
  return {
    id,
    name,
    email,
    role,
    isBlocked,
    isInvited: !person.passwordHash,
    abilities: {
      managePeople: canListPeople(person) && canInvite(person),
      writeFamilies: isAtLeast(person, 'senior'),
      closeCases: isAtLeast(person, 'technician'),
      change: canChange(asker, person),
    },
  };
}
