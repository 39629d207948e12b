import { Engine } from 'json-rules-engine';
import type { DiagnosisInput } from '../diagnosis-types';
import { modesOf } from '../faults/modes';
import { applyAsFound } from '../netlist/as-found';
import type { Part } from '../netlist/types';
import { checkRule } from './check';
import { caseFacts, FACTS, type FactValues, partFacts } from './facts';
import { selectParts } from './select';
import type { Condition, Rule, RulesOutcome } from './types';

/** What a rule comes to: unknown is not false. */
type Truth = 'yes' | 'no' | 'unknown';

/** A condition with its outcome, as json-rules-engine hands it back. */
interface JudgedCondition {
  fact?: string;
  factResult?: unknown;
  result?: boolean;
  all?: JudgedCondition[];
  any?: JudgedCondition[];
  not?: JudgedCondition;
}

/** Folds a judged tree in three-valued logic (S. C. Kleene, Introduction to Metamathematics, 1952, §64). */
function truthOf(condition: JudgedCondition): Truth {
  if (condition.not) {
    const inner = truthOf(condition.not);
    return inner === 'unknown' ? inner : inner === 'yes' ? 'no' : 'yes';
  }
  const list = condition.all ?? condition.any;
  if (list) {
    const truths = list.map(truthOf);
    const [deciding, otherwise] = condition.all
      ? (['no', 'yes'] as const)
      : (['yes', 'no'] as const);
    if (truths.includes(deciding)) return deciding;
    return truths.includes('unknown') ? 'unknown' : otherwise;
  }
  if (condition.factResult === undefined) return 'unknown';
  return condition.result ? 'yes' : 'no';
}

/** Comparisons of a judged tree with the values they saw. */
function leavesOf(condition: JudgedCondition): { fact: string; value: unknown }[] {
  if (condition.not) return leavesOf(condition.not);
  const list = condition.all ?? condition.any;
  if (list) return list.flatMap(leavesOf);
  return [{ fact: condition.fact!, value: condition.factResult }];
}

/** Facts named in a rule's conditions. */
function factsIn(condition: Condition): string[] {
  if ('not' in condition) return factsIn(condition.not);
  if ('all' in condition) return condition.all.flatMap(factsIn);
  if ('any' in condition) return condition.any.flatMap(factsIn);
  return [condition.fact];
}

/** A rule made ready: one engine, run once for the case or once per part. */
interface PreparedRule {
  rule: Rule;
  engine: Engine;
  facts: string[];
}

function prepare(rule: Rule): PreparedRule {
  const engine = new Engine([], { allowUndefinedFacts: true });
  engine.addRule({ conditions: rule.when as never, event: { type: rule.id } });
  return { rule, engine, facts: [...new Set(factsIn(rule.when))] };
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

/** Adds a fired rule's effects to the outcome. */
function applyEffects(
  rule: Rule,
  parts: readonly Part[],
  at: Part | undefined,
  outcome: RulesOutcome,
): void {
  for (const effect of rule.then) {
    switch (effect.effect) {
      case 'advice':
      case 'caution':
        if (!outcome.advice.some((said) => said.rule === rule.id && said.text === effect.text)) {
          outcome.advice.push({
            rule: rule.id,
            effect: effect.effect,
            text: effect.text,
            because: rule.because,
          });
        }
        break;
      case 'cause': {
        const members = effect.members.flatMap(({ parts: selector, mode, probability }) =>
          selectParts(parts, selector, at)
            .filter((part) => modesOf(part).includes(mode))
            .map(({ ref }) => ({ part: ref, mode, probability })),
        );
        if (members.length < 2) break;
        const { name, probability } = effect;
        outcome.causes.push({ name, rule: rule.id, because: rule.because, probability, members });
        break;
      }
      default: {
        const factor = effect.effect === 'speaks-for' ? effect.factor : 1 / effect.factor;
        for (const part of selectParts(parts, effect.parts, at)) {
          if (!modesOf(part).includes(effect.mode)) continue;
          outcome.factors.push({
            part: part.ref,
            mode: effect.mode,
            factor,
            rule: rule.id,
            because: rule.because,
          });
        }
      }
    }
  }
}

/** The first thing a rule waits for, in words. */
function waitWords(condition: JudgedCondition, at: Part | undefined): string {
  const missing = leavesOf(condition).find(({ value }) => value === undefined);
  const what = FACTS[missing?.fact ?? '']?.waitsFor ?? 'something not known yet';
  return at ? `${what.replace(/\bit\b/, at.ref).replace(/\bits\b/, `${at.ref}’s`)}` : what;
}

/**
 * Evaluates all rules on a case. A condition on something not yet known neither fires nor blocks:
 * the rule is listed as waiting.
 *
 * @param input the case; its `knowledge.rules` are rules that `checkRule` accepts, others are left out.
 */
export async function evaluateRules(input: DiagnosisInput): Promise<RulesOutcome> {
  const outcome: RulesOutcome = { factors: [], causes: [], advice: [], waiting: [], fired: [] };
  const rules = (input.knowledge?.rules ?? []).filter(
    (rule) => checkRule(rule).length === 0,
  ) as Rule[];
  if (rules.length === 0) return outcome;
  const found = { ...input, netlist: applyAsFound(input.netlist, input.asFound ?? []) };
  const { parts } = found.netlist;
  const ofCase = caseFacts(found);
  for (const rule of rules) {
    const prepared = prepare(rule);
    const { about } = rule;
    const places: (Part | undefined)[] =
      about.scope === 'case'
        ? [undefined]
        : parts.filter(({ kind }) => !about.kind || about.kind.includes(kind));
    let isWaiting = false;
    for (const at of places) {
      const judged = await judge(prepared, at ? { ...ofCase, ...partFacts(found, at) } : ofCase);
      const truth = truthOf(judged);
      if (truth === 'yes') {
        outcome.fired.push({
          rule: rule.id,
          ...(at ? { part: at.ref } : {}),
          seen: leavesOf(judged),
        });
        applyEffects(rule, parts, at, outcome);
      } else if (truth === 'unknown' && !isWaiting) {
        // One line per rule is enough: a long string would fill the page.
        isWaiting = true;
        outcome.waiting.push({ rule: rule.id, for: waitWords(judged, at) });
      }
    }
  }
  return outcome;
}
