import type { FaultMode, Part } from '../netlist/types';
import type { Circuit } from '../solver/circuit';
import type { SettledFault } from './apply';
import { cellsOf, modesOf, unknownOf } from './modes';
import { fittingRatings, type Rating } from './ratings';

/** One settled version of an atom and its share of the atom's prior. */
export interface AtomCell {
  fault: SettledFault;
  logShare: number;
}

/** One part failing in one mode, with the versions its unknown can take. */
export interface Atom {
  /** `R1B:open`. */
  key: string;
  part: number;
  ref: string;
  mode: FaultMode;
  /** ln of the prior odds that the part is bad in this way. */
  logOdds: number;
  /** Fine cells, for scoring. */
  cells: AtomCell[];
  /** Few cells, for screening combinations. */
  coarse: AtomCell[];
}

/** Cells of an unknown value when a hypothesis is scored, and when combinations are screened. */
const FINE = 12;
const COARSE = 4;

function cellsFor(part: Part, index: number, mode: FaultMode, count: number): AtomCell[] {
  const unknown = unknownOf(part.kind, mode);
  if (!unknown) return [{ fault: { part: index, mode }, logShare: 0 }];
  return cellsOf(unknown, count).map(({ value, width, share }) => ({
    fault: { part: index, mode, value, width },
    logShare: Math.log(share),
  }));
}

function ratingCells(index: number, ratings: Rating[]): AtomCell[] {
  return ratings.map(({ volts, amps, share }) => ({
    fault: { part: index, mode: 'wrong-type' as const, volts, amps },
    logShare: Math.log(share),
  }));
}

/**
 * Lists every way every part can fail.
 *
 * @param odds prior odds of a part and mode; modes it leaves out, or gives zero, are not considered.
 * @param tubes ratings a heater could be replaced by; `lamps` the same for lamps.
 */
export function listAtoms(
  circuit: Circuit,
  odds: (part: Part, mode: FaultMode) => number,
  tubes: readonly { volts: number; amps: number }[],
  lamps: readonly { volts: number; amps: number }[],
): Atom[] {
  const atoms: Atom[] = [];
  circuit.netlist.parts.forEach((_, index) => {
    const part = circuit.parts[index];
    for (const mode of modesOf(part)) {
      const chance = odds(part, mode);
      if (!(chance > 0)) continue;
      let cells: AtomCell[];
      let coarse: AtomCell[];
      if (mode === 'wrong-type') {
        if (part.kind !== 'heater' && part.kind !== 'lamp') continue;
        const data = part.kind === 'lamp' ? lamps : tubes;
        cells = ratingCells(index, fittingRatings(part, data, 0.06));
        coarse = ratingCells(index, fittingRatings(part, data, 0.35));
        if (cells.length === 0) continue;
      } else {
        cells = cellsFor(part, index, mode, FINE);
        coarse = cellsFor(part, index, mode, COARSE);
      }
      atoms.push({
        key: `${part.ref}:${mode}`,
        part: index,
        ref: part.ref,
        mode,
        logOdds: Math.log(chance),
        cells,
        coarse,
      });
    }
  });
  return atoms;
}
