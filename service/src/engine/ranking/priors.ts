import type { Atom } from '../faults/atoms';
import type { FaultMode } from '../netlist/types';
import { logSumExp } from './normal';

/** A common cause that ties faults together, as a rule states it. */
export interface CommonCause {
  name: string;
  rule: string;
  because: string;
  /** Probability of the cause in a set that came in for repair. */
  probability: number;
  /** Given the cause, each member fails by itself with its own probability. */
  members: { part: string; mode: FaultMode; probability: number }[];
}

/** A cause with its members by atom key, ready to be summed. */
interface PreparedCause {
  cause: CommonCause;
  logOdds: number;
  /** ln of Π(1 − q) over all members. */
  logNone: number;
  /** ln(q / (1 − q)) by atom key. */
  logOddsOf: Map<string, number>;
}

/** Prior of a fault set: the parts failing by themselves, or through one of the causes. */
export interface SetPrior {
  log: number;
  /** Index of the cause that carries most of it, −1 when the faults are independent. */
  cause: number;
}

/**
 * Prior odds of fault sets against "nothing is wrong". A set of n faults costs the product of its
 * odds, or one rare cause that opens each member with its own probability, whichever way it came.
 */
export class PriorModel {
  private readonly prepared: PreparedCause[];

  constructor(readonly causes: readonly CommonCause[]) {
    this.prepared = causes.map((cause) => ({
      cause,
      logOdds: Math.log(cause.probability / (1 - cause.probability)),
      logNone: cause.members.reduce((sum, { probability }) => sum + Math.log1p(-probability), 0),
      logOddsOf: new Map(
        cause.members.map(({ part, mode, probability }) => [
          `${part}:${mode}`,
          Math.log(probability / (1 - probability)),
        ]),
      ),
    }));
  }

  /** Prior of a set of atoms, in ln of odds against the empty set. */
  of(atoms: readonly Atom[]): SetPrior {
    const ways = [atoms.reduce((sum, { logOdds }) => sum + logOdds, 0)];
    const from = [-1];
    if (atoms.length > 1) {
      this.prepared.forEach(({ logOdds, logNone, logOddsOf }, index) => {
        let log = logOdds + logNone;
        let members = 0;
        for (const atom of atoms) {
          const own = logOddsOf.get(atom.key);
          if (own === undefined) log += atom.logOdds;
          else {
            log += own;
            members += 1;
          }
        }
        // One member alone is what its own odds already count.
        if (members < 2) return;
        ways.push(log);
        from.push(index);
      });
    }
    const best = ways.indexOf(Math.max(...ways));
    return { log: logSumExp(ways), cause: from[best] };
  }

  /** Keys of the atoms that belong to each cause. */
  memberKeys(): string[][] {
    return this.prepared.map(({ logOddsOf }) => [...logOddsOf.keys()]);
  }
}
