import type { FaultMode, PartKind } from '../netlist/types';
import type { CommonCause } from '../ranking/priors';

/** One comparison of a fact with a value, in the form json-rules-engine takes. */
export interface Comparison {
  fact: string;
  operator: string;
  value: unknown;
}

/** Conditions: all, any or none of a list, nested as deep as two levels. */
export type Conditions = { all: Condition[] } | { any: Condition[] } | { not: Condition };
export type Condition = Comparison | Conditions;

/** Which parts an effect concerns; every field given must fit. */
export interface PartSelector {
  kind?: PartKind[];
  make?: string[];
  ref?: string;
  /** `same`: sections of the body of the part at hand; `any`: sections of whatever body. */
  assembly?: 'same' | 'any';
  isPictureTube?: boolean;
  /** The part at hand (rules about each part). */
  isThis?: boolean;
  /** Lies between the same two nodes as the part at hand (rules about each part). */
  isAcrossThis?: boolean;
  /** Lies in the heater string: in series with heaters between the line's two sides. */
  isInString?: boolean;
}

export type Effect =
  | {
      effect: 'speaks-for' | 'speaks-against';
      parts: PartSelector;
      mode: FaultMode;
      factor: number;
    }
  | {
      effect: 'cause';
      name: string;
      /** Probability of the cause in a set that came in for repair. */
      probability: number;
      members: { parts: PartSelector; mode: FaultMode; probability: number }[];
    }
  | { effect: 'advice' | 'caution'; text: string };

/** A rule as it stands in a file. */
export interface Rule {
  id: string;
  name: string;
  /** The whole rule as a sentence for a person. */
  sentence: string;
  /** Asked once, once for every part, or once for every body of several sections. */
  about: { scope: 'case' } | { scope: 'each-part' | 'each-body'; kind?: PartKind[] };
  when: Conditions;
  then: Effect[];
  because: string;
  source?: { title: string; status: 'confirmed' | 'from memory' | 'common practice' };
}

/** What all rules together have to say about a case. */
export interface RulesOutcome {
  factors: { part: string; mode: FaultMode; factor: number; rule: string; because: string }[];
  causes: CommonCause[];
  advice: { rule: string; effect: 'advice' | 'caution'; text: string; because: string }[];
  /** Rules that wait for something not yet known. */
  waiting: { rule: string; for: string }[];
  /** Rules that fired, with the values they saw. */
  fired: { rule: string; part?: string; seen: { fact: string; value: unknown }[] }[];
}
