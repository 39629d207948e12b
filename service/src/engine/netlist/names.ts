/** Reference designators (IEEE 315 style): letters, digits, `-`, `_`, 1 to 24 characters. */
const REF = /^[A-Za-z0-9_-]{1,24}$/;
const NODE = /^\S{1,40}$/;

/**
 * Values are kept by part and by node in plain objects; a name that every object already answers to
 * would be found where nothing was put.
 */
function isReserved(name: string): boolean {
  return name in Object.prototype;
}

/** What is wrong with a part's reference, as code and sentence; null when nothing is. */
export function refProblem(ref: unknown): { code: string; message: string } | null {
  if (typeof ref !== 'string' || !REF.test(ref)) {
    return {
      code: 'bad-ref',
      message: 'A part needs a reference of 1 to 24 letters, digits, “-” or “_”, such as R1B.',
    };
  }
  return isReserved(ref)
    ? { code: 'reserved-name', message: `A part cannot be called “${ref}”. Add a digit.` }
    : null;
}

/**
 * What is wrong with a node's name, as code and sentence; null when nothing is.
 *
 * @param where begins the sentence, such as `R1: “between”`.
 */
export function nodeProblem(
  node: unknown,
  where: string,
): { code: string; message: string } | null {
  if (typeof node !== 'string' || !NODE.test(node)) {
    return {
      code: 'bad-node',
      message: `${where} must name a node: 1 to 40 characters without spaces.`,
    };
  }
  return isReserved(node)
    ? { code: 'reserved-name', message: `${where} cannot be called “${node}”. Add a digit.` }
    : null;
}

/** One step of a JSON pointer (RFC 6901, section 3). */
export function pointerStep(name: string): string {
  return name.replaceAll('~', '~0').replaceAll('/', '~1');
}
