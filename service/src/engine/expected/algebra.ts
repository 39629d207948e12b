import nerdamer from 'nerdamer';
import 'nerdamer/Algebra.js';
import 'nerdamer/Calculus.js';
import 'nerdamer/Solve.js';
import { EngineError } from '../errors';

/** What the library's own types leave out. */
interface WithEquations {
  solveEquations(equations: string[], unknowns: string[]): [string, number | object][];
  flush(): unknown;
  getCore(): { Settings: { PARSE2NUMBER: boolean } };
}

const library = nerdamer as unknown as WithEquations;

/**
 * Runs one use of the library from a clean state and leaves it clean. It keeps every expression it
 * has seen, and solving for a symbol leaves it in a mode that rounds fractions to eight digits.
 */
function cleanly<T>(use: () => T): T {
  const { Settings } = library.getCore();
  Settings.PARSE2NUMBER = false;
  try {
    return use();
  } finally {
    Settings.PARSE2NUMBER = false;
    library.flush();
  }
}

/** Significant digits of a coefficient. Short whole numbers keep the library's fractions quick. */
const DIGITS = 12;
/** Longest coefficient; beyond it fractions no longer fit a double when the answer is taken out. */
const MOST_DIGITS = 40;

/** Names that mean nothing to the library (`e`, `i` and `pi` do). */
export function unknownName(index: number): string {
  return `uq${index}`;
}

/** Name of the one symbol that stays in a closed form. */
export const SYMBOL = 'xq';

/** Nodal equation: (sum of `own`)·unknown[place] − Σ others[i]·unknown[i] = constant. */
export interface NodalRow {
  place: number;
  /** Every conductance at this node in siemens; summed exactly, so that a small one counts. */
  own: number[];
  /** Conductance to each other unknown in siemens. */
  others: Float64Array;
  /** Amps driven into the node. */
  constant: number;
}

/**
 * Solves a small set of nodal equations through nerdamer. Every row is brought to whole numbers
 * first: with 1 GΩ beside 0.01 Ω decimal fractions are cut short on reading and grow past what a
 * double holds on the way, and the library answers NaN.
 *
 * @param rows n equations in n unknowns, n small: the time grows with its cube.
 * @returns the unknowns; each conductance counts with 12 digits.
 * @throws EngineError `no-distinct-solution` when there is none.
 */
export function solveRows(rows: readonly NodalRow[]): Float64Array {
  const whole = rows.map(wholeRow);
  try {
    return cleanly(() => solveWhole(whole));
  } catch (error) {
    throw error instanceof EngineError ? error : noSolution();
  }
}

function solveWhole(whole: readonly bigint[][]): Float64Array {
  const n = whole.length;
  if (n === 1) {
    const [coefficient, constant] = whole[0];
    return checked(Float64Array.of(ratioOf(nerdamer(`(${constant})/(${coefficient})`).toString())));
  }
  const names = whole.map((_, i) => unknownName(i));
  const equations = whole.map((row) => {
    const terms = row
      .slice(0, n)
      .map((value, i) => (value === 0n ? '' : `(${value})*${names[i]}`))
      .filter((term) => term !== '');
    return `${terms.join('+')}=${row[n]}`;
  });
  const answer = new Map(library.solveEquations(equations, names));
  return checked(Float64Array.from(names, (name) => Number(answer.get(name))));
}

/** Value of a reduced fraction such as `3/8`. */
function ratioOf(text: string): number {
  const [above, below] = text.split('/');
  return Number(above) / Number(below ?? 1);
}

/** An expression in the symbol: one unknown of a small system solved with the symbol in it. */
export function solveWithSymbol(equations: string[], unknowns: string[], wanted: string): string {
  return cleanly(() => {
    const answer = new Map(library.solveEquations(equations, unknowns));
    const expression = String(answer.get(wanted));
    // It has been seen to hand unknowns back instead of refusing.
    if (unknowns.some((name) => expression.includes(name))) throw noSolution();
    return expression;
  });
}

/** Value of an expression for one value of the symbol. */
export function evaluateAt(expression: string, value: number): number {
  return cleanly(() =>
    Number(
      nerdamer(expression, { [SYMBOL]: exactly(value) })
        .evaluate()
        .text('decimals'),
    ),
  );
}

/** Values of the symbol for which an expression takes a value; none when there are none. */
export function solveForSymbol(expression: string, value: number): number[] {
  return cleanly(() => {
    try {
      const found = nerdamer(`${expression}=${exactly(value)}`).solveFor(SYMBOL) as unknown;
      return [found]
        .flat()
        .map((root) => Number(nerdamer(String(root)).evaluate().text('decimals')))
        .filter(Number.isFinite);
    } catch {
      // The library throws where there is nothing to solve for.
      return [];
    }
  });
}

/**
 * A number as the library keeps all its digits: a whole number over a power of ten. (Decimals are
 * rounded to a short fraction on reading, and the `e` of an exponent is Euler's number.)
 */
export function exactly(value: number): string {
  if (value === 0) return '0';
  const [mantissa, power] = value.toExponential(DIGITS + 2).split('e');
  const digits = mantissa.replace('.', '');
  const shift = Number(power) - (DIGITS + 2);
  return shift >= 0 ? `(${digits}${'0'.repeat(shift)})` : `(${digits}/1${'0'.repeat(-shift)})`;
}

/** A row scaled to whole numbers, the constant last. */
function wholeRow({ place, own, others, constant }: NodalRow): bigint[] {
  const powers = own.filter((value) => value > 0).map((value) => Math.floor(Math.log10(value)));
  if (powers.length === 0) throw noSolution();
  const most = Math.max(...powers);
  if (constant !== 0) powers.push(Math.floor(Math.log10(Math.abs(constant))));
  const places = Math.min(DIGITS - 1 - Math.min(...powers), MOST_DIGITS - most);
  const row = Array.from(others, (value) => -wholeOf(value, places));
  row[place] = own.reduce((sum, value) => sum + wholeOf(value, places), 0n);
  return [...row, wholeOf(constant, places)];
}

/** value·10^places as a whole number, from 12 significant digits. */
function wholeOf(value: number, places: number): bigint {
  if (value === 0) return 0n;
  const [mantissa, power] = value.toExponential(DIGITS - 1).split('e');
  const digits = BigInt(mantissa.replace('.', ''));
  const shift = Number(power) - (DIGITS - 1) + places;
  if (shift >= 0) return digits * 10n ** BigInt(shift);
  const divisor = 10n ** BigInt(-shift);
  const half = digits < 0n ? -divisor / 2n : divisor / 2n;
  return (digits + half) / divisor;
}

function checked(values: Float64Array): Float64Array {
  if (values.every(Number.isFinite)) return values;
  throw noSolution();
}

function noSolution(): EngineError {
  return new EngineError(
    'no-distinct-solution',
    'The nodal equations have no single solution. Check that every node has a path to the line or to the reference.',
  );
}
