import { isPictureTube } from '../netlist/picture-tube';
import type { Part } from '../netlist/types';
import type { PartSelector } from './types';

/** Kinds that carry the heater current when they stand in a string. */
const STRING_KINDS = new Set([
  'resistor',
  'heater',
  'lamp',
  'thermistor',
  'switch',
  'fuse',
  'joint',
]);

/**
 * Parts of the heater strings: those joined to a heater through nodes that no more than one body of
 * parts shares, found by walking from the heaters over string kinds. Resistors that end on a cathode
 * are not part of it.
 */
function stringRefs(parts: readonly Part[]): Set<string> {
  const cathodes = new Set(
    parts.flatMap((part) => (part.kind === 'heater' && part.cathode ? [part.cathode] : [])),
  );
  const refs = new Set(parts.filter(({ kind }) => kind === 'heater').map(({ ref }) => ref));
  const nodes = new Set(
    parts.filter(({ kind }) => kind === 'heater').flatMap(({ between }) => between),
  );
  for (let size = -1; size !== refs.size;) {
    size = refs.size;
    for (const part of parts) {
      if (refs.has(part.ref) || !STRING_KINDS.has(part.kind)) continue;
      const touching = part.between.filter((node) => nodes.has(node) && !cathodes.has(node));
      if (touching.length === 0) continue;
      refs.add(part.ref);
      part.between.forEach((node) => nodes.add(node));
    }
  }
  return refs;
}

/**
 * Parts a selector means.
 *
 * @param at the part at hand, for rules about each part.
 */
export function selectParts(parts: readonly Part[], selector: PartSelector, at?: Part): Part[] {
  const inString = selector.isInString === undefined ? null : stringRefs(parts);
  return parts.filter((part) => {
    if (selector.kind && !selector.kind.includes(part.kind)) return false;
    if (selector.make && !('make' in part && part.make && selector.make.includes(part.make)))
      return false;
    if (selector.ref !== undefined && part.ref !== selector.ref) return false;
    if (selector.isPictureTube !== undefined && isPictureTube(part) !== selector.isPictureTube)
      return false;
    if (selector.isThis && part.ref !== at?.ref) return false;
    if (selector.assembly === 'any' && part.assembly === undefined) return false;
    if (
      selector.assembly === 'same' &&
      (part.assembly === undefined || part.assembly !== at?.assembly)
    )
      return false;
    if (inString && inString.has(part.ref) !== selector.isInString) return false;
    return true;
  });
}
