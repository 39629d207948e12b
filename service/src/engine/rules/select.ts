import { withDefaults } from '../netlist/defaults';
import { isPictureTube } from '../netlist/picture-tube';
import type { Netlist, Part } from '../netlist/types';
import { stringRefs } from './heater-string';
import type { PartSelector } from './types';

/** The make of a part, with the format's default where the drawing states none. */
export function makeOf(part: Part): string | undefined {
  const filled = withDefaults(part);
  return 'make' in filled ? filled.make : undefined;
}

/** True when two parts lie between the same two nodes. */
export function isAcross(one: Part, other: Part): boolean {
  return one.ref !== other.ref && one.between.every((node) => other.between.includes(node));
}

/**
 * Finds the parts that a selector means; every field given must fit.
 *
 * @param at the part at hand, for rules about each part or each body.
 */
export function selectParts(netlist: Netlist, selector: PartSelector, at?: Part): Part[] {
  const { kind, make, ref, assembly } = selector;
  const inString = selector.isInString === undefined ? null : stringRefs(netlist);
  return netlist.parts.filter((part) => {
    if (kind && !kind.includes(part.kind)) return false;
    if (make && !make.includes(makeOf(part) ?? '')) return false;
    if (ref !== undefined && part.ref !== ref) return false;
    if (selector.isPictureTube !== undefined && isPictureTube(part) !== selector.isPictureTube) {
      return false;
    }
    if (selector.isThis && part.ref !== at?.ref) return false;
    if (selector.isAcrossThis && !(at && isAcross(part, at))) return false;
    if (assembly !== undefined && part.assembly === undefined) return false;
    if (assembly === 'same' && part.assembly !== at?.assembly) return false;
    return !inString || inString.has(part.ref) === selector.isInString;
  });
}
