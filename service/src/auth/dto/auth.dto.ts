import { ApiProperty } from '@nestjs/swagger';
import { IsEmail, IsNotEmpty, IsString, MaxLength, MinLength } from 'class-validator';
import { PersonDto } from '../../people/dto/person.dto';
import { EMAIL_MOST, NAME_MOST, PASSWORD_LEAST, PASSWORD_MOST } from '../../people/people.limits';

const PASSWORD_SHORT = `A password needs at least ${PASSWORD_LEAST} characters. A few words make a good one.`;

export class SignInDto {
  @ApiProperty({ maxLength: EMAIL_MOST })
  @IsString()
  @IsNotEmpty({ message: 'Enter your e-mail address.' })
  @MaxLength(EMAIL_MOST)
  email: string;

  @ApiProperty({ maxLength: PASSWORD_MOST })
  @IsString()
  @IsNotEmpty({ message: 'Enter your password.' })
  @MaxLength(PASSWORD_MOST)
  password: string;
}

export class AcceptInvitationDto {
  @ApiProperty()
  @IsString()
  @IsNotEmpty()
  @MaxLength(200)
  token: string;

  @ApiProperty({ maxLength: NAME_MOST })
  @IsString()
  @IsNotEmpty({ message: 'Enter your name.' })
  @MaxLength(NAME_MOST)
  name: string;

  @ApiProperty({ minLength: PASSWORD_LEAST, maxLength: PASSWORD_MOST })
  @IsString()
  @MinLength(PASSWORD_LEAST, { message: PASSWORD_SHORT })
  @MaxLength(PASSWORD_MOST)
  password: string;
}

export class SetupDto {
  @ApiProperty({ maxLength: NAME_MOST })
  @IsString()
  @IsNotEmpty({ message: 'Enter the name of the shop.' })
  @MaxLength(NAME_MOST)
  shopName: string;

  @ApiProperty({ maxLength: NAME_MOST })
  @IsString()
  @IsNotEmpty({ message: 'Enter your name.' })
  @MaxLength(NAME_MOST)
  name: string;

  @ApiProperty({ maxLength: EMAIL_MOST })
  @IsEmail({}, { message: 'Enter an e-mail address such as ana@shop.example.' })
  @MaxLength(EMAIL_MOST)
  email: string;

  @ApiProperty({ minLength: PASSWORD_LEAST, maxLength: PASSWORD_MOST })
  @IsString()
  @MinLength(PASSWORD_LEAST, { message: PASSWORD_SHORT })
  @MaxLength(PASSWORD_MOST)
  password: string;
}

export class SignedInDto {
  @ApiProperty({ description: 'Bearer token for the API.' }) accessToken: string;
  @ApiProperty({ description: 'Seconds until it expires.' }) expiresIn: number;
  @ApiProperty({ type: PersonDto }) person: PersonDto;
}

export class SetupNeededDto {
  @ApiProperty({ description: 'True while nobody has an account yet.' }) needed: boolean;
}
