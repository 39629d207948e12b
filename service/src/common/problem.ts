import { HttpException } from '@nestjs/common';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';

/** One field that is wrong. */
export class FieldProblem {
  /** JSON pointer into the request's body. */
  @ApiProperty({ example: '/readings/0/value' })
  pointer: string;
  @ApiProperty({ example: 'Ohms cannot be negative.' })
  message: string;
  @ApiPropertyOptional()
  code?: string;
  @ApiPropertyOptional({ description: 'Line of a CSV file.' })
  line?: number;
  @ApiPropertyOptional({ description: 'Column of a CSV file.' })
  column?: string;
}

/** The one shape of an error (RFC 9457). */
export class Problem {
  @ApiProperty({ example: 'about:blank' })
  type: string;
  @ApiProperty({ example: 'Not found' })
  title: string;
  @ApiProperty({ example: 404 })
  status: number;
  @ApiProperty({ description: 'A sentence for the person: what is wrong and what to do.' })
  detail: string;
  @ApiProperty({ description: 'Fixed word for programs.' })
  code: string;
  @ApiPropertyOptional()
  instance?: string;
  @ApiPropertyOptional({ type: [FieldProblem] })
  errors?: FieldProblem[];
}

/** An error whose sentence may be shown. */
export class ProblemException extends HttpException {
  constructor(
    status: number,
    readonly code: string,
    readonly detail: string,
    readonly errors: FieldProblem[] = [],
  ) {
    super(detail, status);
  }
}

/** Something that is not there, or that the person may not know of. */
export function notFound(what: string): ProblemException {
  return new ProblemException(404, 'not-found', `${what} was not found. It may have been removed.`);
}

/** A value that does not fit, at its field. */
export function badField(pointer: string, message: string, code = 'bad-value'): ProblemException {
  return new ProblemException(422, code, message, [{ pointer, message, code }]);
}

/** Somebody else was quicker. */
export function conflict(code: string, detail: string): ProblemException {
  return new ProblemException(409, code, detail);
}
