import { Body, Controller, Get, HttpCode, Post, Req, Res } from '@nestjs/common';
import { ApiBearerAuth, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Throttle } from '@nestjs/throttler';
import type { Request, Response } from 'express';
import { ApiProblems } from '../common/decorators/api-problems.decorator';
import { CurrentPerson } from '../common/decorators/current-person.decorator';
import { Public } from '../common/decorators/public.decorator';
import { PersonDto, presentPerson } from '../people/dto/person.dto';
import { Person } from '../people/person.model';
import { AuthService, REFRESH_DAYS, type Session } from './auth.service';
import {
  AcceptInvitationDto,
  SetupDto,
  SetupNeededDto,
  SignedInDto,
  SignInDto,
} from './dto/auth.dto';

export const REFRESH_COOKIE = 'ohmstead_refresh';
const COOKIE_PATH = '/api/auth';
/** Guessing passwords is slow work: this many tries a minute from one address. */
const SIGN_IN_TRIES = { default: { limit: 20, ttl: 60_000 } };

@ApiTags('auth')
@Controller('auth')
export class AuthController {
  constructor(private readonly auth: AuthService) {}

  @Public()
  @Throttle(SIGN_IN_TRIES)
  @Post('sign-in')
  @HttpCode(200)
  @ApiOkResponse({ type: SignedInDto })
  @ApiProblems(400, 401, 403, 429)
  async signIn(
    @Body() body: SignInDto,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SignedInDto> {
    return keep(await this.auth.signIn(body), response);
  }

  @Public()
  @Post('refresh')
  @HttpCode(200)
  @ApiOkResponse({ type: SignedInDto })
  @ApiProblems(401)
  async refresh(
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SignedInDto> {
    return keep(await this.auth.refresh(cookieOf(request)), response);
  }

  @Public()
  @Post('sign-out')
  @HttpCode(204)
  @ApiNoContentResponse()
  async signOut(
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    await this.auth.signOut(cookieOf(request));
    response.clearCookie(REFRESH_COOKIE, { path: COOKIE_PATH });
  }

  @Get('me')
  @ApiBearerAuth()
  @ApiOkResponse({ type: PersonDto })
  @ApiProblems(401)
  me(@CurrentPerson() person: Person): PersonDto {
    return presentPerson(person);
  }

  @Public()
  @Throttle(SIGN_IN_TRIES)
  @Post('accept-invitation')
  @HttpCode(200)
  @ApiOkResponse({ type: SignedInDto })
  @ApiProblems(400, 429)
  async accept(
    @Body() body: AcceptInvitationDto,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SignedInDto> {
    return keep(await this.auth.acceptInvitation(body), response);
  }

  @Public()
  @Get('setup')
  @ApiOkResponse({ type: SetupNeededDto })
  async setupNeeded(): Promise<SetupNeededDto> {
    return { needed: await this.auth.isSetupNeeded() };
  }

  @Public()
  @Throttle(SIGN_IN_TRIES)
  @Post('setup')
  @HttpCode(200)
  @ApiOkResponse({ type: SignedInDto })
  @ApiProblems(400, 409)
  async setUp(
    @Body() body: SetupDto,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SignedInDto> {
    return keep(await this.auth.setUp(body), response);
  }
}

function cookieOf(request: Request): string | undefined {
  return (request.cookies as Record<string, string> | undefined)?.[REFRESH_COOKIE];
}

/** Puts the refresh token into a cookie that no script can read. */
function keep({ answer, refreshToken }: Session, response: Response): SignedInDto {
  response.cookie(REFRESH_COOKIE, refreshToken, {
    httpOnly: true,
    sameSite: 'strict',
    path: COOKIE_PATH,
    maxAge: REFRESH_DAYS * 86_400_000,
    secure: response.req.secure,
  });
  return answer;
}
