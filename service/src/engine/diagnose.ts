import { rateCandidates, type RatedCandidate } from './advice/next-readings';
import { nextReading } from './advice/explain-next';
import { asShown, evidenceOf, type ReadingView, viewReadings } from './advice/evidence';
import { reasonsFor } from './advice/reasons';
import { remarksFor } from './advice/remarks';
import { readingWords, suspectTitle } from './advice/words';
import type {
  DiagnosisInput,
  DiagnosisResult,
  ExpectedValue,
  RuleVoice,
  Suspect,
} from './diagnosis-types';
import { listAtoms } from './faults/atoms';
import { makeOdds, type OddsSources } from './faults/odds';
import { applyAsFound } from './netlist/as-found';
import { requireSound } from './netlist/require-sound';
import { describeFaults } from './ranking/describe';
import { groupSets } from './ranking/groups';
import { partProbabilities, rank, type Ranked } from './ranking/posterior';
import { PriorModel } from './ranking/priors';
import { Scorer } from './ranking/scorer';
import { Search } from './ranking/search';
import { evaluateRules, type RulesOutcome } from './rules';
import { compileCircuit } from './solver/circuit';
import { operatingPoint } from './solver/operating-point';
import { ENGINE_VERSION } from './tolerances';

/** Suspects told in full, and the least probability of one told beyond the first ten. */
const MOST_TOLD = 25;
const LEAST_TOLD = 1e-3;
/** The first suspect needs no further reading above this, or when no reading would tell much. */
const SETTLED_AT = 0.95;
const IDLE_BITS = 0.02;

/**
 * Diagnoses one case: circuit as found, readings and knowledge in, ranked suspects, next readings
 * and expected values out.
 *
 * @throws EngineError when the netlist, what was found, or a reading cannot be used; it names the
 *   part, node or reading.
 */
export async function diagnose(input: DiagnosisInput): Promise<DiagnosisResult> {
  const outcome = await evaluateRules(input);
  return diagnoseWith(input, outcome);
}

/** Diagnoses with rules already evaluated; pure and synchronous. */
export function diagnoseWith(input: DiagnosisInput, outcome: RulesOutcome): DiagnosisResult {
  const netlist = applyAsFound(input.netlist, input.asFound ?? []);
  requireSound(netlist, input.readings);
  const circuit = compileCircuit(netlist, input.conditions?.lineVolts);
  const { knowledge = {} } = input;
  const scorer = new Scorer(circuit, input.readings);
  const sources: OddsSources = { factors: outcome.factors, solved: knowledge.solved };
  const atoms = listAtoms(
    circuit,
    makeOdds(sources, input.asFound ?? []),
    knowledge.tubes ?? [],
    knowledge.lamps ?? [],
  );
  const priors = new PriorModel(outcome.causes);
  const { sets, unscored } = new Search(scorer, atoms, priors).run();
  const ranked = rank(sets, unscored);
  const told = ranked.filter(
    ({ probability }, i) => i < 10 || (i < MOST_TOLD && probability > LEAST_TOLD),
  );
  const groups = groupSets(
    scorer,
    told.map(({ set }) => set),
  );
  const healthySet = ranked.find(({ set }) => set.atoms.length === 0)!;
  const healthyViews = viewReadings(scorer, healthySet.set)!;
  const labels = new Map((netlist.points ?? []).map(({ node, label }) => [node, label]));
  const labelOf = (node: string) => labels.get(node) ?? node;
  const context = {
    readings: input.readings,
    healthy: evidenceOf(scorer, healthySet.set, healthyViews, healthyViews),
    labelOf,
    black: netlist.reference,
  };

  const suspects = told.map(({ set, probability }, index): Suspect => {
    const views = viewReadings(scorer, set) ?? healthyViews;
    const faults = describeFaults(set, knowledge.tubes ?? [], knowledge.lamps ?? []);
    const evidence = evidenceOf(scorer, set, views, healthyViews);
    const rules = voicesOn(set, outcome);
    const cause = set.cause >= 0 ? outcome.causes[set.cause] : undefined;
    return {
      faults,
      probability,
      group: groups[index],
      title: suspectTitle(faults),
      reasons: reasonsFor(faults, evidence, rules, context),
      evidence,
      rules,
      ...(cause ? { cause: { name: cause.name, because: cause.because } } : {}),
    };
  });

  const { candidates, suspects: considered } = rateCandidates(scorer, ranked);
  const nextReadings = candidates
    .slice(0, 12)
    .map((candidate) =>
      nextReading(candidate, considered, (c) => readingWords(c, labelOf, netlist.reference)),
    );
  const { remarks, retake, noneOfThese } = remarksFor(ranked, groups, context, netlist);
  return {
    engineVersion: ENGINE_VERSION,
    suspects,
    parts: partProbabilities(
      ranked,
      netlist.parts.map(({ ref }) => ref),
    ),
    nextReadings,
    expected: expectedOf(input, scorer, healthyViews),
    settled: isSettled(ranked, candidates),
    remarks,
    retake,
    noneOfThese,
    advice: outcome.advice,
    waiting: outcome.waiting,
    healthy: operatingPoint(circuit),
    unscored,
    dropped: scorer.dropped,
    scored: scorer.scored,
  };
}

/** Rules that had a say about one set. */
function voicesOn(set: Ranked['set'], outcome: RulesOutcome): RuleVoice[] {
  const voices: RuleVoice[] = [];
  for (const atom of set.atoms) {
    for (const { part, mode, factor, rule, because } of outcome.factors) {
      if (part !== atom.ref || mode !== atom.mode) continue;
      voices.push({ rule, effect: factor >= 1 ? 'speaks-for' : 'speaks-against', factor, because });
    }
  }
  if (set.cause >= 0) {
    const { rule, because } = outcome.causes[set.cause];
    voices.push({ rule, effect: 'cause', because });
  }
  return voices;
}

/** The healthy value of each reading with its 95 % interval, and how far off the measured one is. */
function expectedOf(
  { readings }: DiagnosisInput,
  scorer: Scorer,
  views: readonly ReadingView[],
): ExpectedValue[] {
  return readings.map(({ take, at, part, value }, r) => {
    const view = views[r];
    const { spec, y } = scorer.observations[r];
    const place = { take, ...(at ? { at } : {}), ...(part ? { part } : {}) };
    if (take === 'sign') return { ...place, value: null, low: null, high: null };
    const isOver = view.over > 0.5;
    return {
      ...place,
      value: isOver ? null : view.shown,
      low: isOver ? null : asShown(view.mean - 1.96 * view.sigma, spec.isLog),
      high: isOver ? null : asShown(view.mean + 1.96 * view.sigma, spec.isLog),
      measured: value,
      ...(isOver || Number.isNaN(y) ? {} : { deviations: (y - view.mean) / view.sigma }),
    };
  });
}

/** True when the first suspect stands alone, or no reading left would tell anything. */
function isSettled(ranked: readonly Ranked[], candidates: readonly RatedCandidate[]): boolean {
  if (ranked[0].probability >= SETTLED_AT) return true;
  const most = Math.max(0, ...candidates.map(({ bits }) => bits));
  return most < IDLE_BITS;
}
