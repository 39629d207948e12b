/** What the service says about a request that it refused, RFC 9457. */
export interface Problem {
  status: number;
  title: string;
  detail?: string;
  code?: string;
  errors?: { pointer?: string; message: string; code?: string }[];
}

/**
 * Reads the problem out of a failed request.
 *
 * @param error whatever the request threw.
 * @returns the service's problem, or null when the service was not reached at all.
 */
export function problemOf(error: unknown): Problem | null {
  if (typeof error !== 'object' || error === null) return null;
  const { response } = error as { response?: { status: number; data?: unknown } };
  if (response) {
    const data = typeof response.data === 'object' && response.data !== null ? response.data : {};
    return { title: 'The service refused this.', ...data, status: response.status };
  }
  const { problem } = error as { problem?: Problem };
  return problem ?? null;
}

/**
 * Puts a failed request into a sentence for the person at the bench.
 *
 * @param error whatever the request threw.
 * @returns what is wrong and what to do.
 */
export function problemInWords(error: unknown): string {
  const problem = problemOf(error);
  if (!problem) return 'The service cannot be reached. Check the network; it is tried again.';
  if (problem.status >= 500)
    return 'The service could not do this just now. Try again in a moment.';
  return problem.errors?.[0]?.message ?? problem.detail ?? problem.title;
}
