import type { Unit } from './unit-words';

/** Steps a value is written in, largest first. */
const STEPS: readonly (readonly [number, string])[] = [
  [1e9, 'G'],
  [1e6, 'M'],
  [1e3, 'k'],
  [1, ''],
  [1e-3, 'm'],
  [1e-6, 'µ'],
  [1e-9, 'n'],
  [1e-12, 'p'],
];

/**
 * Writes a value for a person: `4.7 kΩ`, `100 µF`, `118.4 V`.
 *
 * @param value SI value; `OL` stays `OL`, what is no number becomes a dash.
 * @param digits significant figures, 3 when left out. Whole hundreds are never rounded away.
 */
export function formatQuantity(value: number | 'OL', unit: Unit, digits = 3): string {
  if (value === 'OL') return 'OL';
  if (!Number.isFinite(value)) return '–';
  if (value === 0) return `0 ${unit}`;
  // Rounded first, so that 999.97 becomes 1 k and never 1000.
  const size = Number(Math.abs(value).toPrecision(Math.max(digits, 3)));
  // Nobody at a bench says milliohms.
  const isSmallOhms = unit === 'Ω' && size < 1;
  const [factor, prefix] = isSmallOhms
    ? [1, '']
    : (STEPS.find(([least]) => size >= least) ?? STEPS[STEPS.length - 1]);
  const scaled = value / factor;
  const figures = Math.abs(scaled) >= 100 ? Math.max(digits, 3) : digits;
  return `${Number(scaled.toPrecision(figures))} ${prefix}${unit}`;
}
