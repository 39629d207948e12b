import type { Fault } from '../diagnosis-types';
import type { FaultMode, Take } from '../netlist/types';

/** How a fault mode is said behind a reference designator. */
const MODE_WORDS: Record<FaultMode, string> = {
  open: 'open',
  high: 'reads high',
  low: 'reads low',
  bridged: 'bridged',
  shorted: 'shorted',
  'wrong-type': 'of a wrong type',
  'heater-cathode-leak': 'leaks from heater to cathode',
  'poor-contact': 'makes poor contact',
  leaky: 'leaky',
  'high-esr': 'has high series resistance',
  weak: 'weak',
  'shorted-turns': 'has shorted turns',
  overload: 'draws too much',
  'no-load': 'draws nothing',
};

/** One fault in plain words, such as "R1B open". */
export function faultWords(ref: string, mode: FaultMode): string {
  return `${ref} ${MODE_WORDS[mode]}`;
}

/** A whole suspect in plain words; an empty list is "nothing is wrong". */
export function suspectTitle(faults: readonly Pick<Fault, 'part' | 'mode'>[]): string {
  if (faults.length === 0) return 'Nothing wrong that these readings could show';
  const words = faults.map(({ part, mode }) => faultWords(part, mode));
  if (words.length === 1) return words[0];
  return `${words.slice(0, -1).join(', ')} and ${words[words.length - 1]}`;
}

const TAKE_WORDS: Record<Take, string> = {
  'ac-volts': 'AC volts',
  'dc-volts': 'DC volts',
  'ripple-volts': 'ripple volts',
  amps: 'current',
  ohms: 'ohms',
  'lifted-ohms': 'ohms',
  sign: 'a look',
};

/**
 * A reading in plain words: "ohms across R1B, power off", "AC volts at V8 pin 4".
 *
 * @param labelOf label of a node as a person knows it.
 */
export function readingWords(
  { take, at, part }: { take: Take; at?: [string, string]; part?: string },
  labelOf: (node: string) => string,
  black: string,
): string {
  if (take === 'sign') return `a look at ${part}`;
  if (take === 'lifted-ohms') return `ohms of ${part} with one end lifted, power off`;
  if (take === 'amps') return `current through ${part}`;
  const where = part
    ? `across ${part}`
    : at![1] === black
      ? `at ${labelOf(at![0])}`
      : `from ${labelOf(at![0])} to ${labelOf(at![1])}`;
  return `${TAKE_WORDS[take]} ${where}${take === 'ohms' ? ', power off' : ''}`;
}

/** Three significant figures with a unit a bench meter would show: "15.2 Ω", "4.70 kΩ", "118 V". */
export function shownWords(value: number | null, take: Take): string {
  if (value === null) return 'OL';
  const unit = take === 'ohms' || take === 'lifted-ohms' ? 'Ω' : take === 'amps' ? 'A' : 'V';
  const size = Math.abs(value);
  const [scale, prefix] =
    size >= 1e6
      ? [1e6, 'M']
      : size >= 1e3
        ? [1e3, 'k']
        : size >= 0.1 || size < 1e-5
          ? [1, '']
          : [1e-3, 'm'];
  const scaled = value / scale;
  const text =
    size < 1e-5
      ? '0'
      : Math.abs(scaled) >= 1000
        ? scaled.toFixed(0)
        : String(Number(scaled.toPrecision(3)));
  return `${text} ${prefix}${unit}`;
}

/** A likelihood ratio in words: "about 12 times more likely". */
export function timesWords(times: number): string {
  const isMore = times >= 1;
  const size = isMore ? times : 1 / times;
  if (size < 1.5) return 'about as likely';
  const rounded =
    size < 10
      ? String(Math.round(size))
      : size < 1000
        ? String(Number(size.toPrecision(2)))
        : 'over 1000';
  return `${size >= 1000 ? '' : 'about '}${rounded} times ${isMore ? 'more' : 'less'} likely`;
}

/** A probability in words: "about 8 in 10". */
export function chanceWords(p: number): string {
  if (p >= 0.995) return 'almost certain';
  if (p >= 0.95) return 'more than 9 in 10';
  if (p >= 0.1) return `about ${Math.min(9, Math.round(p * 10))} in 10`;
  if (p >= 0.01) return `about ${Math.round(p * 100)} in 100`;
  return 'less than 1 in 100';
}
