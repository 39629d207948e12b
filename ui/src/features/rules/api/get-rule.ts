import { queryOptions, useQuery } from '@tanstack/react-query';
import { type FaultMode, type PartKind } from '@engine/netlist/types';
import { apiClient } from '@/lib/api-client';
import { type RuleSummary } from '@/lib/api-model';

/** One comparison of a fact with a value. */
export interface Comparison {
  fact: string;
  operator: string;
  value: unknown;
}
export type Condition = Comparison | Conditions;
export type Conditions = { all: Condition[] } | { any: Condition[] } | { not: Condition };

/** Which parts an effect concerns; every field given must fit. */
export interface PartSelector {
  kind?: PartKind[];
  make?: string[];
  ref?: string;
  assembly?: 'same' | 'any';
  isPictureTube?: boolean;
  isThis?: boolean;
  isInString?: boolean;
}

/** What a rule does once its conditions are met. */
export type RuleEffect =
  | {
      effect: 'speaks-for' | 'speaks-against';
      parts: PartSelector;
      mode: FaultMode;
      /** How many times likelier, or less likely: more than 1 in both directions. */
      factor: number;
    }
  | {
      effect: 'cause';
      name: string;
      probability: number;
      members: { parts: PartSelector; mode: FaultMode; probability: number }[];
    }
  | { effect: 'advice' | 'caution'; text: string };

/** A rule with what it looks at and what it does. */
export interface Rule extends RuleSummary {
  content: { when: Conditions; then: RuleEffect[] };
  versions: { version: number; at: string; state: string }[];
}

/** Query options of one rule. */
export function ruleQuery(id: string) {
  return queryOptions({
    queryKey: ['rules', id],
    queryFn: async ({ signal }) =>
      (await apiClient.get<Rule>(`/rules/${encodeURIComponent(id)}`, { signal })).data,
  });
}

/** One rule with its conditions, effects and versions. */
export function useRule(id: string) {
  return useQuery(ruleQuery(id));
}
