import { Engine } from 'json-rules-engine';
import type { DiagnosisInput } from '../diagnosis-types';
import { applyAsFound } from '../netlist/as-found';
import { checkNetlist } from '../netlist/checks';
import type { Netlist, Part } from '../netlist/types';
import { compileCircuit } from '../solver/circuit';
import { operatingPoint } from '../solver/operating-point';
import { caseFacts, sectionsOf } from './case-facts';
import { checkRule } from './check';
import { applyEffects } from './effects';
import { factNamed, type FactValues } from './facts';
import { partFacts } from './part-facts';
import { type JudgedCondition, leavesOf, truthOf } from './truth';
import type { Condition, Rule, RulesOutcome } from './types';

/** Facts named in a rule's conditions. */
function factsIn(condition: Condition): string[] {
  if ('not' in condition) return factsIn(condition.not);
  if ('all' in condition) return condition.all.flatMap(factsIn);
  if ('any' in condition) return condition.any.flatMap(factsIn);
  return [condition.fact];
}

/** A rule made ready: one engine, run once for the case, or once per part or body. */
interface PreparedRule {
  engine: Engine;
  facts: Set<string>;
}

function prepare({ id, when }: Rule): PreparedRule {
  const engine = new Engine([], { allowUndefinedFacts: true });
  engine.addRule({ conditions: when as never, event: { type: id } });
  return { engine, facts: new Set(factsIn(when)) };
}

async function judge(
  { engine, facts }: PreparedRule,
  values: FactValues,
): Promise<JudgedCondition> {
  // Only facts with a value are handed over: an absent one comes back as undefined.
  const known: Record<string, unknown> = {};
  for (const fact of facts) if (values[fact] !== undefined) known[fact] = values[fact];
  const { results, failureResults } = await engine.run(known);
  const [result] = [...results, ...failureResults];
  return JSON.parse(result.toJSON()!).conditions as JudgedCondition;
}

/** Where a rule is asked: once, once per part, or once per body with its first section at hand. */
function placesOf({ about }: Rule, netlist: Netlist): (Part | undefined)[] {
  if (about.scope === 'case') return [undefined];
  const parts = netlist.parts.filter(({ kind }) => !about.kind || about.kind.includes(kind));
  if (about.scope === 'each-part') return parts;
  return parts.filter(
    (part, i) =>
      sectionsOf(netlist, part) > 1 &&
      parts.findIndex(({ assembly }) => assembly === part.assembly) === i,
  );
}

/** The first thing a rule waits for, in words. */
function waitWords(condition: JudgedCondition, at: Part | undefined): string {
  const missing = leavesOf(condition).find(({ value }) => value === undefined);
  const what = factNamed(missing?.fact)?.waitsFor ?? 'something not known yet';
  return at ? what.replace(/\bit\b/, at.ref).replace(/\bits\b/, `${at.ref}’s`) : what;
}

/** Watts of each part in the healthy set; solved when first asked for, and only if it can be. */
function lazyWatts(
  netlist: Netlist,
  lineVolts: number | undefined,
): (ref: string) => number | undefined {
  let parts: Record<string, { watts: number }> | undefined;
  return (ref) => {
    parts ??=
      checkNetlist(netlist).length === 0
        ? operatingPoint(compileCircuit(netlist, lineVolts)).parts
        : {};
    return parts[ref]?.watts;
  };
}

/**
 * Evaluates all rules on a case. A condition on something not yet known neither fires nor blocks:
 * the rule is listed as waiting. Rules never see one another's effects.
 *
 * @param input the case; of its `knowledge.rules` those count that `checkRule` accepts.
 * @throws NetlistError when what was found does not fit the circuit.
 */
export async function evaluateRules(input: DiagnosisInput): Promise<RulesOutcome> {
  const outcome: RulesOutcome = { factors: [], causes: [], advice: [], waiting: [], fired: [] };
  const rules = (input.knowledge?.rules ?? []).filter(
    (rule) => checkRule(rule).length === 0,
  ) as Rule[];
  if (rules.length === 0) return outcome;
  const netlist = applyAsFound(input.netlist, input.asFound ?? []);
  const found = { ...input, netlist };
  const ofCase = caseFacts(found);
  const watts = lazyWatts(netlist, input.conditions?.lineVolts);
  for (const rule of rules) {
    const prepared = prepare(rule);
    const wattsIfAsked = prepared.facts.has('wattsRatio') ? watts : () => undefined;
    let isWaiting = false;
    for (const at of placesOf(rule, netlist)) {
      const ofPart = at ? partFacts(found, at, wattsIfAsked) : {};
      const judged = await judge(prepared, { ...ofCase, ...ofPart });
      const truth = truthOf(judged);
      if (truth === 'yes') {
        const where = at ? { part: at.ref } : {};
        outcome.fired.push({ rule: rule.id, ...where, seen: leavesOf(judged) });
        applyEffects(rule, netlist, at, outcome);
      } else if (truth === 'unknown' && !isWaiting) {
        // One line per rule is enough: a long string would fill the page.
        isWaiting = true;
        outcome.waiting.push({ rule: rule.id, for: waitWords(judged, at) });
      }
    }
  }
  return outcome;
}
