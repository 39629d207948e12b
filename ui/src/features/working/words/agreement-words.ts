import { type Working } from '../api/get-working';

/** Largest remainder that still counts as solved, relative to the largest term. */
const SOLVED = 1e-9;

/**
 * Says whether the symbolic and the numeric solution agree, and how well the equations are met.
 *
 * @param working residual relative to the largest term, and the comparison with the numeric engine.
 * @returns one or two full sentences.
 */
export function agreementInWords(working: Pick<Working, 'residual' | 'agreesWithSolver'>): string {
  const met =
    working.residual <= SOLVED
      ? 'Put back into the equations, the solution meets them to better than one part in a thousand million.'
      : `Put back into the equations, the solution leaves ${working.residual.toExponential(1)} of the largest term over: do not rely on it.`;
  const agrees = working.agreesWithSolver
    ? 'A second, numeric solution agrees.'
    : 'A second, numeric solution does not agree. The values in compare are the numeric ones.';
  return `${met} ${agrees}`;
}
