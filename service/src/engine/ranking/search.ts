import type { Atom } from '../faults/atoms';
import { scanCells, scoreSet, setKey, type ScoredSet } from './fault-set';
import { logSumExp } from './normal';
import type { PriorModel } from './priors';
import type { Scorer } from './scorer';
import { roughLog, screenPairs, type Version, versionsOf } from './screen-pairs';

/** What the search found, best first. */
export interface SearchResult {
  sets: ScoredSet[];
  /** Estimate of the share of probability in sets that were never scored in full. */
  unscored: number;
}

/** Limits of the search; more is slower and finds rarer sets. */
export interface SearchLimits {
  /** Sets whose combinations with every other fault are screened. */
  extended: number;
  /** Screened combinations that are scored in full, per extended set. */
  refined: number;
  /** Screened pairs that are scored in full. */
  pairs: number;
  /** Sets scored once more with exact sensitivities, where a rectifier block is part of them. */
  exact: number;
  /** Most faults in one set. */
  most: number;
  /** Most members of one cause whose subsets are all scored. */
  members: number;
}

export const SEARCH_LIMITS: SearchLimits = {
  extended: 6,
  refined: 5,
  pairs: 20,
  exact: 20,
  most: 6,
  members: 8,
};

/** Sets this far below the best (in ln) do not count as explanations. */
const FAR = 6;
/** A reading that moves by less than this many standard deviations counts as left alone. */
const LEFT_ALONE = 0.5;
/** Most sets of one size that are combined with further faults. */
const PER_SIZE = 4;

/** A screened combination, before its full score. */
interface Candidate {
  atoms: Atom[];
  start: ScoredSet['best'];
  estimate: number;
}

/**
 * Finds the fault sets that explain the readings best: all single faults, then every subset of
 * every common cause, then combinations grown from the best sets, best first, until what is left
 * cannot matter.
 */
export class Search {
  private readonly sets = new Map<string, ScoredSet>();
  private readonly isExtended = new Set<string>();
  /** Estimates of combinations that were screened but not scored in full. */
  private readonly screened = new Map<string, number>();
  private readonly versions = new Map<string, Version[]>();

  constructor(
    private readonly scorer: Scorer,
    private readonly atoms: readonly Atom[],
    private readonly priors: PriorModel,
    private readonly limits: SearchLimits = SEARCH_LIMITS,
  ) {}

  /** Runs the search. */
  run(): SearchResult {
    this.add([], []);
    for (const atom of this.atoms) this.add([atom], [atom.cells[0].fault]);
    this.isExtended.add('');
    this.scoreCauses();
    if (this.isStrained()) this.scorePairs();
    for (let count = 0; count < this.limits.extended; count += 1) {
      const next = this.nextToExtend();
      if (!next) break;
      this.extend(next);
    }
    this.scoreBestExactly();
    const sets = [...this.sets.values()].sort(
      (x, y) => y.score - x.score || (x.key < y.key ? -1 : 1),
    );
    return { sets, unscored: this.unscoredShare(sets) };
  }

  /** Scores a set in full and keeps it. */
  private add(atoms: readonly Atom[], start: ScoredSet['best']): void {
    const key = setKey(atoms);
    if (this.sets.has(key)) return;
    const scored = scoreSet(this.scorer, atoms, start);
    if (!scored) return;
    const prior = this.priors.of(atoms);
    this.screened.delete(key);
    this.sets.set(key, {
      ...scored,
      logPrior: prior.log,
      cause: prior.cause,
      score: prior.log + scored.logLikelihood,
    });
  }

  /** True when no set so far explains the readings without calling one of them a slip. */
  private isStrained(): boolean {
    const best = this.best();
    for (const { score, bestLikelihood } of this.sets.values()) {
      if (score > best - FAR && bestLikelihood.slipCount === 0) return false;
    }
    return true;
  }

  private best(): number {
    let best = -Infinity;
    for (const { score } of this.sets.values()) if (score > best) best = score;
    return best;
  }

  /** Screens every pair and scores the promising ones in full. */
  private scorePairs(): void {
    const pairs = screenPairs(this.scorer, this.atoms, this.versionsFor, this.priors, this.sets);
    for (const { atoms, estimate } of pairs) this.screened.set(setKey(atoms), estimate);
    pairs.slice(0, this.limits.pairs).forEach(({ atoms, start }) => this.add(atoms, start));
  }

  /** Scores all subsets of two and more members of every cause. */
  private scoreCauses(): void {
    for (const keys of this.priors.memberKeys()) {
      const members = keys
        .map((key) => this.atoms.find((atom) => atom.key === key))
        .filter((atom): atom is Atom => atom !== undefined)
        .map((atom) => ({ atom, alone: this.sets.get(atom.key) }))
        .sort((x, y) => (y.alone?.score ?? -Infinity) - (x.alone?.score ?? -Infinity))
        .slice(0, this.limits.members);
      const count = 1 << members.length;
      for (let bits = 3; bits < count; bits += 1) {
        const chosen = members.filter((_, i) => bits & (1 << i));
        if (chosen.length < 2 || chosen.length > this.limits.most) continue;
        if (new Set(chosen.map(({ atom }) => atom.part)).size < chosen.length) continue;
        this.add(
          chosen.map(({ atom }) => atom),
          chosen.map(({ atom, alone }) => alone?.best[0] ?? atom.cells[0].fault),
        );
      }
    }
  }

  /**
   * The set most worth combining with more faults. A set that already explains every reading gains
   * nothing but faults that would not show; a few such are enough. Of each size only some are
   * taken, so that one false start is not followed to its end.
   */
  private nextToExtend(): ScoredSet | null {
    const best = this.best();
    const bySize = new Map<number, number>();
    let quiet = 0;
    for (const key of this.isExtended) {
      const set = this.sets.get(key);
      if (!set || set.atoms.length === 0) continue;
      bySize.set(set.atoms.length, (bySize.get(set.atoms.length) ?? 0) + 1);
      if (set.bestLikelihood.slipCount === 0) quiet += 1;
    }
    let next: ScoredSet | null = null;
    for (const set of this.sets.values()) {
      const size = set.atoms.length;
      if (this.isExtended.has(set.key) || size >= this.limits.most) continue;
      if ((bySize.get(size) ?? 0) >= PER_SIZE) continue;
      const isQuiet = set.bestLikelihood.slipCount === 0;
      if (isQuiet && (quiet >= 3 || set.score < best - 3)) continue;
      if (!next || set.score > next.score) next = set;
    }
    return next;
  }

  /** Versions of an atom, found once. */
  private readonly versionsFor = (atom: Atom): Version[] => {
    const known = this.versions.get(atom.key);
    if (known) return known;
    const made = versionsOf(this.scorer, atom);
    this.versions.set(atom.key, made);
    return made;
  };

  /** Screens a set together with each other fault and scores the promising combinations in full. */
  private extend(set: ScoredSet): void {
    this.isExtended.add(set.key);
    const candidates = this.roughCandidates(set)
      .sort((x, y) => y.estimate - x.estimate)
      .slice(0, this.limits.refined + 4)
      .map((candidate) => this.valuedAnew(set, candidate))
      .sort((x, y) => y.estimate - x.estimate);
    const best = this.best();
    candidates.slice(0, this.limits.refined).forEach(({ atoms, start, estimate }, rank) => {
      if (rank < 3 || estimate > best - 7) this.add(atoms, start);
    });
  }

  /**
   * A set with each other fault, roughly scored: what the new fault changes in a reading-by-reading
   * score is added to the set's own full one.
   */
  private roughCandidates(set: ScoredSet): Candidate[] {
    const { scorer } = this;
    const scored = scorer.scoreWithSpread(set.best);
    if (!scored) return [];
    const spread = Float64Array.from(scored.sigma);
    const before = new Float64Array(spread.length);
    const mean = new Float64Array(spread.length);
    const wider = new Float64Array(spread.length);
    if (!scorer.means(set.best, before)) return [];
    const own = set.logLikelihood - roughLog(scorer, before, spread, spread);
    const parts = new Set(set.atoms.map(({ part }) => part));
    const candidates: Candidate[] = [];
    for (const atom of this.atoms) {
      if (parts.has(atom.part)) continue;
      const atoms = [...set.atoms, atom];
      const key = setKey(atoms);
      if (this.sets.has(key) || this.screened.has(key)) continue;
      const logs: number[] = [];
      let start: ScoredSet['best'] | null = null;
      for (const { cell, sigma } of this.versionsFor(atom)) {
        const faults = [...set.best, cell.fault];
        if (!scorer.means(faults, mean)) continue;
        // A reading that the new fault leaves alone keeps its spread.
        for (let r = 0; r < wider.length; r += 1) {
          wider[r] = Math.abs(mean[r] - before[r]) < LEFT_ALONE * spread[r] ? spread[r] : sigma[r];
        }
        const log = cell.logShare + roughLog(scorer, mean, spread, wider);
        if (start === null || log > Math.max(...logs)) start = faults;
        logs.push(log);
      }
      if (!start) continue;
      const estimate = this.priors.of(atoms).log + own + logSumExp(logs);
      candidates.push({ atoms, start, estimate });
      this.screened.set(key, estimate);
    }
    return candidates;
  }

  /** A candidate whose set has unknown values, scored with these found anew beside the new fault. */
  private valuedAnew(set: ScoredSet, candidate: Candidate): Candidate {
    if (!set.atoms.some(({ coarse }) => coarse.length > 1)) return candidate;
    const trial = this.screen(set, candidate.atoms[candidate.atoms.length - 1]);
    if (!trial) return candidate;
    return {
      ...candidate,
      start: trial.start,
      estimate: this.priors.of(candidate.atoms).log + trial.log,
    };
  }

  /**
   * Rough marginal likelihood of a set with one more fault: the new fault's few cells with the set
   * as it stands, then the set's own unknown values anew beside it.
   */
  private screen(set: ScoredSet, atom: Atom): { log: number; start: ScoredSet['best'] } | null {
    const start = [...set.best, atom.coarse[0].fault];
    const own = set.atoms.length;
    const scan = scanCells(this.scorer, start, own, atom.coarse);
    if (!scan) return null;
    start[own] = atom.coarse[scan.best].fault;
    let log = logSumExp(scan.logs);
    let inner = set.logLikelihood - set.bestLikelihood.log;
    set.atoms.forEach(({ coarse }, slot) => {
      if (coarse.length < 2) return;
      const again = scanCells(this.scorer, start, slot, coarse);
      if (!again || again.like.log <= log) return;
      start[slot] = coarse[again.best].fault;
      log = again.like.log + atom.coarse[scan.best].logShare;
      inner = logSumExp(again.logs) - again.like.log;
    });
    return { log: log + inner, start };
  }

  /** Scores the sets that matter once more, with nothing taken in proportion. */
  private scoreBestExactly(): void {
    if (!this.scorer.predictor.waves) return;
    const best = this.best();
    const sets = [...this.sets.values()]
      .filter(({ score }) => score > best - FAR)
      .sort((x, y) => y.score - x.score)
      .slice(0, this.limits.exact);
    for (const set of sets) {
      const like = this.scorer.scoreExactly(set.best);
      if (!like) continue;
      const change = like.log - set.bestLikelihood.log;
      set.bestLikelihood = like;
      set.logLikelihood += change;
      set.score += change;
    }
  }

  /** Share of the probability that the screened but unscored combinations would hold. */
  private unscoredShare(sets: readonly ScoredSet[]): number {
    const scored = logSumExp(sets.map(({ score }) => score));
    const left = logSumExp([...this.screened.values()]);
    return left === -Infinity ? 0 : Math.exp(left - logSumExp([scored, left]));
  }
}
