import { type Netlist } from '@engine/netlist/types';
import { chanceInWords } from '@/lib/bench/chance';
import { KIND_WORDS, partValue } from '@/lib/bench/part-words';
import { type Difference, DIFFERENCE_WORDS } from '../geometry/as-found';
import { type DrawnPart } from '../geometry/drawing';

/** Values shown at one node, already formatted with their unit. */
export interface NodeValues {
  computed?: string;
  measured?: string;
}

/** How strongly a part is marked. */
export type SuspectLevel = 'strong' | 'weak';

/** What the sheet shows on a part beside its symbol. */
export interface PartMarks {
  suspect?: { probability: number; level: SuspectLevel; badge: string };
  difference?: Difference;
}

/** Parts below this are not marked: nearly every part has a small chance. */
export const MARKED_FROM = 0.05;

/**
 * Collects the marks of every part.
 *
 * @param suspects probability per part that it is bad.
 * @param differences how parts differ from their drawing.
 */
export function marksOf(
  suspects: readonly { part: string; probability: number }[],
  differences: ReadonlyMap<string, Difference>,
): Map<string, PartMarks> {
  const marks = new Map<string, PartMarks>();
  for (const [ref, difference] of differences) marks.set(ref, { difference });
  for (const { part, probability } of suspects) {
    if (probability < MARKED_FROM) continue;
    const level = probability >= 0.5 ? 'strong' : 'weak';
    const badge = badgeOf(probability);
    marks.set(part, { ...marks.get(part), suspect: { probability, level, badge } });
  }
  return marks;
}

/** The few words that fit on a drawing: "8 in 10". */
function badgeOf(probability: number): string {
  return probability >= 0.985 ? 'surely' : chanceInWords(probability).replace('about ', '');
}

/**
 * Names a part for a screen reader.
 *
 * @returns "R1B, resistor, 15 Ω, suspect about 8 in 10".
 */
export function partInWords({ part }: Pick<DrawnPart, 'part'>, marks: PartMarks = {}): string {
  const words = [part.ref, KIND_WORDS[part.kind], partValue(part)];
  if (part.assembly) words.push(`section of ${part.assembly}`);
  if (marks.difference) words.push(`as found: ${DIFFERENCE_WORDS[marks.difference]}`);
  if (marks.suspect) words.push(`suspect ${chanceInWords(marks.suspect.probability)}`);
  return words.filter((word) => word !== '').join(', ');
}

/** The second line of a part's label: its value, or how it was found. */
export function valueLine({ part }: Pick<DrawnPart, 'part'>, marks: PartMarks = {}): string {
  const { difference } = marks;
  if (difference === 'missing' || difference === 'bridged') return DIFFERENCE_WORDS[difference];
  return partValue(part);
}

/** True when the reference is the chassis, which has a symbol of its own. */
export function isChassis(netlist: Pick<Netlist, 'reference'>): boolean {
  return /^(chassis|frame)$/i.test(netlist.reference);
}
