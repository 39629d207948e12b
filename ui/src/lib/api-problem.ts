import { isAxiosError } from 'axios';

/** One refused field, with a JSON pointer into what was sent. */
export interface FieldProblem {
  pointer?: string;
  message: string;
  code?: string;
  /** Line of a pasted table, counted from 1. */
  line?: number;
  /** Column of a pasted table, counted from 1. */
  column?: number;
}

interface ProblemBody {
  title?: string;
  detail?: string;
  code?: string;
  errors?: FieldProblem[];
}

/** What the service answered when it refused a request (RFC 9457). */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';
  /** HTTP status. */
  readonly status: number;
  /** Fixed word for programs; sentences may change, this does not. */
  readonly code: string;
  readonly title: string;
  readonly detail?: string;
  readonly errors: FieldProblem[];

  constructor(status: number, body: ProblemBody) {
    super(body.detail ?? body.title ?? 'The service refused this.');
    this.status = status;
    this.code = body.code ?? 'unknown';
    this.title = body.title ?? 'The service refused this.';
    this.detail = body.detail;
    this.errors = Array.isArray(body.errors) ? body.errors : [];
  }

  /** The same facts in the shape that the bench's wording reads. */
  get problem() {
    const { status, code, title, detail, errors } = this;
    return { status, code, title, detail, errors };
  }
}

/**
 * Turns a failed request into an ApiProblem.
 *
 * @param error whatever the request threw.
 * @returns the service's answer; the error itself when the service was not reached or the request was aborted.
 */
export function toApiProblem(error: unknown): unknown {
  if (!isAxiosError(error) || !error.response) return error;
  const { status, data } = error.response;
  return new ApiProblem(status, typeof data === 'object' && data !== null ? data : {});
}

/** True when the service refused a request with this code. */
export function hasCode(error: unknown, code: string): boolean {
  return error instanceof ApiProblem && error.code === code;
}

/** True when the service refused a request with this HTTP status. */
export function hasStatus(error: unknown, status: number): boolean {
  return error instanceof ApiProblem && error.status === status;
}
