import { type Netlist, type Reading, type Take } from '@engine/netlist/types';
import { TAKE_WORDS } from './takes';

/** Where and how a reading is taken: what makes two readings replace each other. */
export type Place = Pick<Reading, 'take' | 'at' | 'part'>;

/**
 * Takes the place out of a reading or a suggestion.
 *
 * @returns a new object with nothing else in it.
 */
export function placeOf({ take, at, part }: Place): Place {
  return part ? { take, part } : { take, at };
}

/**
 * Names a place by one string, equal for two readings that replace each other.
 *
 * @param place kind of reading with its leads or its part.
 * @returns a key such as `ohms part R1B` or `ac-volts at H3 CHASSIS`.
 */
export function placeKey(place: Place): string {
  if (place.part) return `${place.take} part ${place.part}`;
  return `${place.take} at ${(place.at ?? []).join(' ')}`;
}

/** What naming a place needs to know about a circuit. */
export type Labels = Pick<Netlist, 'points' | 'reference' | 'line'>;

/**
 * Gives the label of a node as a person calls it.
 *
 * @param netlist circuit with its points.
 * @param node name of a node.
 * @returns "V1 pin 4", "the line" for its hot wire, "chassis", or the name of the node when no point
 *   carries it.
 */
export function labelForNode(netlist: Partial<Labels>, node: string): string {
  const label = netlist.points?.find((point) => point.node === node)?.label;
  if (label) return label;
  if (node === netlist.line?.hot) return 'the line';
  return node === netlist.reference && /^chassis$/i.test(node) ? 'chassis' : node;
}

/**
 * Says where a reading is taken, without its kind.
 *
 * @param netlist circuit with its points and its reference.
 * @param place leads or part.
 * @returns "across R1B", "in R1B" for amps, "at V1 pin 4", "from V1 pin 4 to V2 pin 3".
 */
export function labelForPlace(netlist: Labels, place: Place): string {
  if (place.part) {
    if (place.take === 'amps') return `through ${place.part}`;
    return place.take === 'sign' || place.take === 'lifted-ohms'
      ? `of ${place.part}`
      : `across ${place.part}`;
  }
  const [red, black] = place.at ?? ['', ''];
  if (black === netlist.reference) return `at ${labelForNode(netlist, red)}`;
  return `from ${labelForNode(netlist, red)} to ${labelForNode(netlist, black)}`;
}

/**
 * Names a reading in full for a sentence.
 *
 * @param netlist circuit with its points and its reference.
 * @param place kind of reading with its leads or its part.
 * @returns "ohms across R1B", "AC volts at V1 pin 4", "how DS1 looks".
 */
export function labelForReading(netlist: Labels, place: Place): string {
  const take: Take = place.take;
  if (take === 'sign') return `how ${place.part} looks`;
  if (take === 'lifted-ohms') return `ohms of ${place.part} with one end lifted`;
  return `${TAKE_WORDS[take].phrase} ${labelForPlace(netlist, place)}`;
}
