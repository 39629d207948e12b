import { ApiProperty } from '@nestjs/swagger';
import { IsEmail, IsIn, IsNotEmpty, IsString, MaxLength } from 'class-validator';
import { type Role, ROLES } from '../../common/policy';
import { EMAIL_MOST, NAME_MOST } from '../people.limits';
import { PersonDto } from './person.dto';

export class InviteDto {
  @ApiProperty({ maxLength: NAME_MOST })
  @IsString()
  @IsNotEmpty({ message: 'Enter the person’s name.' })
  @MaxLength(NAME_MOST)
  name: string;

  @ApiProperty({ maxLength: EMAIL_MOST })
  @IsEmail({}, { message: 'Enter an e-mail address such as ana@shop.example.' })
  @MaxLength(EMAIL_MOST)
  email: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  @IsIn(ROLES, { message: 'Choose a role: trainee, technician, senior or owner.' })
  role: Role;
}

export class InvitationDto {
  @ApiProperty({ type: PersonDto }) person: PersonDto;
  @ApiProperty({ description: 'Address to hand to the person; works once, for seven days.' })
  invitationLink: string;
}
