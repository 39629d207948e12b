import type { SettledFault } from '../faults/apply';
import type { Atom, AtomCell } from '../faults/atoms';
import type { Likelihood } from './likelihood';
import { logSumExp } from './normal';
import type { Scorer } from './scorer';

/** Posterior of one atom's cells inside a set: which value it has. */
export interface CellPosterior {
  cells: readonly AtomCell[];
  /** ln of share × likelihood, one per cell. */
  logs: number[];
}

/** A fault set scored against the readings. */
export interface ScoredSet {
  /** Keys of its atoms, sorted and joined; empty for "nothing is wrong". */
  key: string;
  atoms: Atom[];
  logPrior: number;
  cause: number;
  /** ln of the marginal likelihood over all unknown values. */
  logLikelihood: number;
  /** The likeliest settled version. */
  best: SettledFault[];
  bestLikelihood: Likelihood;
  cells: CellPosterior[];
  /** logPrior + logLikelihood. */
  score: number;
}

/** Name of a set of atoms, whatever their order. */
export function setKey(atoms: readonly Atom[]): string {
  return atoms
    .map(({ key }) => key)
    .sort()
    .join('|');
}

/** Scores every cell of one atom while the others stay as they are; null when none settles. */
export function scanCells(
  scorer: Scorer,
  faults: readonly SettledFault[],
  slot: number,
  cells: readonly AtomCell[],
): { logs: number[]; best: number; like: Likelihood } | null {
  const trial = faults.slice();
  const logs: number[] = [];
  let best = -1;
  let like: Likelihood | null = null;
  cells.forEach((cell, index) => {
    trial[slot] = cell.fault;
    const result = scorer.score(trial);
    const log = result ? cell.logShare + result.log : -Infinity;
    logs.push(log);
    if (result && (best < 0 || log > logs[best])) {
      best = index;
      like = result;
    }
  });
  return best < 0 || !like ? null : { logs, best, like };
}

/** Ratings within this distance in ln of volts and of amps of the best coarse one are looked at. */
const NEAR_RATING = 0.45;

/**
 * Cells worth scanning for one fault among several. There are some sixty ratings a heater could
 * have: a coarse look first, then only those around the best. Other modes keep all their cells.
 */
function nearCells(
  scorer: Scorer,
  faults: readonly SettledFault[],
  slot: number,
  atom: Atom,
): readonly AtomCell[] {
  if (atom.mode !== 'wrong-type' || atom.cells.length < 20) return atom.cells;
  const scan = scanCells(scorer, faults, slot, atom.coarse);
  if (!scan) return atom.cells;
  const { volts = 1, amps = 1 } = atom.coarse[scan.best].fault;
  return atom.cells.filter(
    ({ fault }) =>
      Math.abs(Math.log(fault.volts! / volts)) <= NEAR_RATING &&
      Math.abs(Math.log(fault.amps! / amps)) <= NEAR_RATING,
  );
}

/**
 * Marginal likelihood of a set over the unknown values of its faults. One unknown is summed over
 * its cells exactly; several are taken as separable around the best point, found by going round
 * the faults twice.
 *
 * @param start settled faults to begin with, one per atom.
 * @returns null when no version settles.
 */
export function scoreSet(
  scorer: Scorer,
  atoms: readonly Atom[],
  start: readonly SettledFault[],
): Omit<ScoredSet, 'logPrior' | 'cause' | 'score'> | null {
  const faults = start.slice();
  const rounds = atoms.filter(({ cells }) => cells.length > 1).length > 1 ? 2 : 1;
  let like = scorer.score(faults);
  let cells: CellPosterior[] = [];
  for (let round = 0; round < rounds; round += 1) {
    cells = [];
    for (let slot = 0; slot < atoms.length; slot += 1) {
      const own =
        atoms.length > 1 ? nearCells(scorer, faults, slot, atoms[slot]) : atoms[slot].cells;
      const scan = scanCells(scorer, faults, slot, own);
      if (!scan) return null;
      faults[slot] = own[scan.best].fault;
      like = scan.like;
      cells.push({ cells: own, logs: scan.logs });
    }
  }
  if (!like) return null;
  const log = cells.reduce((sum, { logs }) => sum + logSumExp(logs) - like.log, like.log);
  return {
    key: setKey(atoms),
    atoms: atoms.slice(),
    logLikelihood: log,
    best: faults,
    bestLikelihood: like,
    cells,
  };
}
