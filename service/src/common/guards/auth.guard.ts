import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { JwtService } from '@nestjs/jwt';
import { InjectModel } from '@nestjs/sequelize';
import type { Request } from 'express';
import { Person } from '../../people/person.model';
import { IS_PUBLIC } from '../decorators/public.decorator';
import { ProblemException } from '../problem';

/** Answers one question: who is this? What they may do is asked of the policies. */
@Injectable()
export class AuthGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly jwt: JwtService,
    @InjectModel(Person) private readonly people: typeof Person,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const isPublic = this.reflector.getAllAndOverride<boolean>(IS_PUBLIC, [
      context.getHandler(),
      context.getClass(),
    ]);
    if (isPublic) return true;
    const request = context.switchToHttp().getRequest<Request & { person: Person }>();
    const token = /^Bearer (.+)$/.exec(request.headers.authorization ?? '')?.[1];
    const id = token ? await this.idIn(token) : null;
    const person = id === null ? null : await this.people.findByPk(id);
    if (!person || person.isBlocked) {
      throw new ProblemException(401, 'not-signed-in', 'Sign in to go on.');
    }
    request.person = person;
    return true;
  }

  private async idIn(token: string): Promise<number | null> {
    try {
      const { sub } = await this.jwt.verifyAsync<{ sub: string }>(token);
      return Number(sub);
    } catch {
      return null;
    }
  }
}
