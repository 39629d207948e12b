export { checkRule, OPERATORS } from './check';
export { evaluateRules } from './evaluate';
export { FACTS, type FactDefinition } from './facts';
export type { Rule, RulesOutcome } from './types';
