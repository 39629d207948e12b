import { type Netlist, type Take } from '@engine/netlist/types';
import { deviationInWords } from '@/lib/bench/chance';
import { computedInWords, takenInWords } from '@/lib/bench/quantities';
import { type ComparePoint } from '@engine/diagnosis-types';

/** How far a reading lies off, for its mark; never said by colour alone. */
export type Verdict = 'inside' | 'edge' | 'outside';

const ORDER: Take[] = ['ac-volts', 'dc-volts', 'ripple-volts', 'ohms', 'lifted-ohms', 'amps'];

/**
 * Lists the kinds of reading there is something to compare for.
 *
 * @returns in the order volts, ripple, ohms, amps.
 */
export function takesOf(points: readonly ComparePoint[]): Take[] {
  return ORDER.filter((take) => points.some((point) => point.take === take));
}

/**
 * Chooses the kind of reading shown at first: the one with most points down the string or the rails.
 *
 * @returns undefined when there is nothing to compare.
 */
export function firstTake(
  points: readonly ComparePoint[],
  netlist: Pick<Netlist, 'line' | 'reference'>,
): Take | undefined {
  const count = (take: Take) =>
    points.filter((point) => point.take === take && isAlong(point, netlist)).length;
  // Ohms stand at every point of any circuit: volts come first wherever there are some.
  const volts = takesOf(points).filter((take) => take.endsWith('volts'));
  return [...volts].sort((a, b) => count(b) - count(a))[0] ?? takesOf(points)[0];
}

/**
 * Orders the points of one kind of reading: the line first, down the string, then readings between two
 * other nodes, then parts.
 *
 * @param netlist says which node is the line and which the reference.
 */
export function pointsOf(
  points: readonly ComparePoint[],
  take: Take,
  netlist: Pick<Netlist, 'line' | 'reference'>,
): ComparePoint[] {
  const rank = (point: ComparePoint) => {
    if (point.kind === 'part' || point.part) return 3;
    if (!isAlong(point, netlist)) return 2;
    return point.at?.[0] === netlist.line?.hot ? 0 : 1;
  };
  return points
    .filter((point) => point.take === take)
    .map((point) => (rank(point) === 0 ? { ...point, label: 'The line' } : point))
    .sort((a, b) => rank(a) - rank(b) || a.order - b.order);
}

/** True for a reading against the reference, which has its place down the string. */
export function isAlong(point: ComparePoint, netlist: Pick<Netlist, 'reference'>): boolean {
  return point.kind === 'point' && point.at?.[1] === netlist.reference;
}

/**
 * Chooses what is drawn: every point, and the parts that were measured; the table has the others too.
 *
 * Where a circuit has no points, all parts are drawn.
 */
export function plottedOf(points: readonly ComparePoint[]): ComparePoint[] {
  const hasPoints = points.some(({ kind }) => kind === 'point');
  return points.filter(
    ({ kind, measured }) => !hasPoints || kind === 'point' || measured !== undefined,
  );
}

/**
 * Judges one measured value.
 *
 * @returns null when nothing was measured; an over-range reading where a value was expected is outside,
 *   and so is a value where over range was expected.
 */
export function verdictOf(point: ComparePoint): Verdict | null {
  const { measured, value, deviations } = point;
  if (measured === undefined || measured === null) return null;
  if (measured === 'OL' || value === null)
    return measured === 'OL' && value === null ? 'inside' : 'outside';
  const size = Math.abs(deviations ?? 0);
  return size < 2 ? 'inside' : size < 3 ? 'edge' : 'outside';
}

/**
 * Says how a measured value compares, as a sentence.
 *
 * @returns "38.2 V measured, 41.0 V computed: 7 % low, inside what tolerances allow."
 */
export function comparisonInWords(point: ComparePoint): string {
  const { measured, value, take } = point;
  const computed = computedInWords(value, take);
  if (measured === undefined || measured === null) return `Not measured yet, ${computed} computed.`;
  const said = `${takenInWords(measured, take)} measured, ${computed} computed`;
  return `${said}: ${deviationPhrase(point)}.`;
}

/** The part of the sentence after the values. */
export function deviationPhrase(point: ComparePoint): string {
  const { measured, value, deviations } = point;
  if (measured === undefined || measured === null) return 'not measured yet';
  if (measured === 'OL' || value === null) {
    if (measured === 'OL' && value === null) return 'as it should be';
    return measured === 'OL'
      ? 'open where a value is expected'
      : 'a value where the meter should be over range';
  }
  const percent = percentOff(measured, value);
  const words = deviations === undefined || deviations === null ? '' : deviationInWords(deviations);
  return [percent, words].filter(Boolean).join(', ');
}

/** "7 % low", "exact" below half a per cent, empty when the computed value is next to nothing. */
export function percentOff(measured: number, value: number): string {
  if (Math.abs(value) < 1e-6) return '';
  const percent = ((measured - value) / Math.abs(value)) * 100;
  if (Math.abs(percent) < 0.5) return 'no difference';
  const size = Math.abs(percent) < 10 ? Math.abs(percent).toFixed(1) : Math.abs(percent).toFixed(0);
  if (Number(size) > 999) return 'more than ten times as much';
  return `${size.replace(/\.0$/, '')} % ${percent < 0 ? 'low' : 'high'}`;
}
