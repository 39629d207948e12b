export { checkRule } from './check';
export { OPERATORS } from './check-conditions';
export { evaluateRules } from './evaluate';
export { FACTS, type FactDefinition } from './facts';
export type { Rule, RulesOutcome } from './types';
