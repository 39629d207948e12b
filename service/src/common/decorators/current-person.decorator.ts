import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import type { Person } from '../../people/person.model';

/** The person whose token came with the request. */
export const CurrentPerson = createParamDecorator(
  (_: unknown, context: ExecutionContext): Person =>
    context.switchToHttp().getRequest<Request & { person: Person }>().person,
);
