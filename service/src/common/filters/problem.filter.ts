import { STATUS_CODES } from 'node:http';
import { ArgumentsHost, Catch, ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import type { Request, Response } from 'express';
import { ForeignKeyConstraintError, UniqueConstraintError } from 'sequelize';
import { CsvError, EngineError } from '../../engine';
import { type FieldProblem, ProblemException } from '../problem';

interface Told {
  status: number;
  code: string;
  detail: string;
  errors?: FieldProblem[];
}

/** Where the engine speaks of what was found or of the netlist, the request calls it the same. */
function fromEngine(error: EngineError): Told {
  const rows = error instanceof CsvError ? error.rows : undefined;
  return {
    status: 422,
    code: error.code,
    detail: error.message,
    errors: error.problems.map(({ path, message, code }, i) => ({
      pointer: rows ? '/csv' : (path ?? ''),
      message,
      code,
      ...(rows ? { line: rows[i].line, column: rows[i].column } : {}),
    })),
  };
}

/** Sentences for what Nest and Express refuse by themselves. */
const PLAIN: Record<number, [string, string]> = {
  400: [
    'bad-request',
    'The request could not be understood: it is not valid JSON, or a number in its address is none.',
  ],
  401: ['not-signed-in', 'Sign in to go on.'],
  403: ['not-allowed', 'Your role does not allow this. Ask a senior technician or the owner.'],
  404: ['not-found', 'There is nothing at this address.'],
  413: ['too-large', 'This is too large to be taken. Send less at once.'],
  415: ['bad-type', 'This kind of content is not taken here. Send JSON.'],
  429: ['too-many', 'Too many tries in a short time. Wait a minute and try again.'],
};

function isBodyError(error: unknown): error is { status: number; type: string } {
  return typeof error === 'object' && error !== null && 'type' in error && 'status' in error;
}

function tell(error: unknown): Told {
  if (error instanceof ProblemException) {
    const { code, detail, errors } = error;
    return { status: error.getStatus(), code, detail, ...(errors.length > 0 ? { errors } : {}) };
  }
  if (error instanceof EngineError) return fromEngine(error);
  if (error instanceof UniqueConstraintError) {
    return {
      status: 409,
      code: 'taken',
      detail: 'This is there already. Choose another name or reload the page.',
    };
  }
  if (error instanceof ForeignKeyConstraintError) {
    return {
      status: 409,
      code: 'still-used',
      detail: 'Something else still refers to this, or what it refers to is gone. Reload the page.',
    };
  }
  const status =
    error instanceof HttpException ? error.getStatus() : isBodyError(error) ? error.status : 500;
  const plain = PLAIN[status];
  if (plain) return { status, code: plain[0], detail: plain[1] };
  return {
    status: 500,
    code: 'internal',
    detail: 'Something went wrong on our side. What you entered is kept; try again in a moment.',
  };
}

/** Turns every error into one shape, `application/problem+json`, and never shows a stack. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(error: unknown, host: ArgumentsHost): void {
    const request = host.switchToHttp().getRequest<Request>();
    const response = host.switchToHttp().getResponse<Response>();
    const told = tell(error);
    if (told.status >= 500) {
      this.logger.error(
        `${request.method} ${request.path}: ${error instanceof Error ? error.stack : String(error)}`,
      );
    }
    if (response.headersSent) {
      response.end();
      return;
    }
    response
      .status(told.status)
      .type('application/problem+json')
      .send(
        JSON.stringify({
          type: 'about:blank',
          title: STATUS_CODES[told.status] ?? 'Error',
          ...told,
          instance: request.originalUrl.split('?')[0],
        }),
      );
  }
}
