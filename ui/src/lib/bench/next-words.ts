import { type NextReading } from '@engine/diagnosis-types';
import { gainInWords, minutesInWords } from './chance';
import { type Labels, labelForReading } from './places';
import { isPoweredReading } from './takes';

/**
 * Names a suggested reading.
 *
 * @returns the engine's label, else "ohms across R1B, power off".
 */
export function nextInWords(netlist: Labels, next: NextReading): string {
  if (next.label) return next.label;
  if (next.take === 'sign') return labelForReading(netlist, next);
  return `${labelForReading(netlist, next)}, ${isPoweredReading(next.take) ? 'powered' : 'power off'}`;
}

/**
 * Says what a suggested reading costs and gives.
 *
 * @returns "About a minute, would settle much."
 */
export function effortInWords(next: NextReading): string {
  const time = minutesInWords(next.minutes);
  return `${time[0].toUpperCase()}${time.slice(1)}, ${gainInWords(next.bits)}.`;
}

/**
 * Puts the reason of a suggested reading as a full sentence.
 *
 * @returns "It tells R1B open from DS1 open."; empty when no reason is given.
 */
export function whyInWords(next: Pick<NextReading, 'why'>): string {
  const words = next.why.trim();
  if (words === '') return '';
  // A reason that begins with its verb needs its subject.
  const whole = /^(tells|shows|settles|rules|splits|confirms) /i.test(words)
    ? `It ${words[0].toLowerCase()}${words.slice(1)}`
    : words[0].toUpperCase() + words.slice(1);
  return /[.!?]$/.test(whole) ? whole : `${whole}.`;
}
