/**
 * What a condition comes to. Unknown is not false; `silent` is a question that makes no sense for
 * this part, so that the rule has nothing to say about it and waits for nothing.
 */
export type Truth = 'yes' | 'no' | 'unknown' | 'silent';

/** A condition with its outcome, as json-rules-engine hands it back. */
export interface JudgedCondition {
  fact?: string;
  factResult?: unknown;
  result?: boolean;
  all?: JudgedCondition[];
  any?: JudgedCondition[];
  not?: JudgedCondition;
}

/** What decides a list, strongest first; the last word holds when nothing else stands there. */
const ORDER = {
  all: ['no', 'silent', 'unknown', 'yes'],
  any: ['yes', 'unknown', 'silent', 'no'],
} as const;

/**
 * Folds a judged tree in three-valued logic (S. C. Kleene, Introduction to Metamathematics, 1952,
 * §64), with `silent` beside it: it silences whatever needs it.
 */
export function truthOf(condition: JudgedCondition): Truth {
  if (condition.not) {
    const inner = truthOf(condition.not);
    return inner === 'yes' ? 'no' : inner === 'no' ? 'yes' : inner;
  }
  const list = condition.all ?? condition.any;
  if (list) {
    const truths = list.map(truthOf);
    return ORDER[condition.all ? 'all' : 'any'].find((word) => truths.includes(word)) ?? 'silent';
  }
  if (condition.factResult === undefined) return 'unknown';
  if (condition.factResult === null) return 'silent';
  return condition.result ? 'yes' : 'no';
}

/** Comparisons of a judged tree with the values they saw. */
export function leavesOf(condition: JudgedCondition): { fact: string; value: unknown }[] {
  if (condition.not) return leavesOf(condition.not);
  const list = condition.all ?? condition.any;
  if (list) return list.flatMap(leavesOf);
  return [{ fact: condition.fact!, value: condition.factResult }];
}
