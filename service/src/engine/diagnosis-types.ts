import type { AsFound, Conditions, FaultMode, Netlist, Reading, Take } from './netlist/types';

/** A bad part: which, how, and the value found for it where the mode has one. */
export interface Fault {
  part: string;
  mode: FaultMode;
  /** Best value of the mode's unknown: a factor on the nominal value, or ohms. */
  value?: number;
  /** Where the unknown lies with 95 % probability, [low, high]. */
  interval?: [number, number];
  /** What `value` is: a factor (`×`), ohms, or a heater rating. */
  valueUnit?: 'factor' | 'ohms';
  /** Rating fitted instead, for `wrong-type`. */
  volts?: number;
  amps?: number;
  /** Types of that rating, for `wrong-type`. */
  types?: string[];
}

/** A rule that had its say about a suspect. */
export interface RuleVoice {
  rule: string;
  effect: 'speaks-for' | 'speaks-against' | 'cause';
  /** Factor on the odds, above 1 for and below 1 against; absent for a cause. */
  factor?: number;
  because: string;
}

/** How one reading speaks on one suspect. */
export interface ReadingEvidence {
  /** Index into the readings given. */
  reading: number;
  /** What the meter should show under this suspect; null when it should show OL. */
  predicted: number | null;
  /** 95 % interval of the prediction, tolerance and meter together. */
  low?: number;
  high?: number;
  /** How many times more likely the reading is under this suspect than under "nothing is wrong". */
  times: number;
  /** True when this suspect can only explain the reading as a slip. */
  slip: boolean;
}

export interface Suspect {
  /** Empty for "nothing is wrong". */
  faults: Fault[];
  probability: number;
  /** Suspects of one group cannot be told apart by the readings so far. */
  group: number;
  /** Plain words: "R1B open". */
  title: string;
  /** Full sentences: why it stands where it stands. */
  reasons: string[];
  evidence: ReadingEvidence[];
  rules: RuleVoice[];
  /** Common cause that ties the faults together, if one does. */
  cause?: { name: string; because: string };
}

export interface NextReading {
  take: Take;
  at?: [string, string];
  part?: string;
  /** Label for a person: "ohms across R1B, power off". */
  label: string;
  /** Expected gain over the suspects. */
  bits: number;
  minutes: number;
  /** Plain words: "tells R1B open from DS1 open". */
  why: string;
}

/** Measured beside computed for one reading given. */
export interface ExpectedValue {
  take: Take;
  at?: [string, string];
  part?: string;
  /** Healthy value, as the meter would show it; null for OL. */
  value: number | null;
  /** 95 % interval of a healthy set. */
  low: number | null;
  high: number | null;
  measured?: number | 'OL';
  /** (measured − value) / standard deviation; absent for OL. */
  deviations?: number;
}

/** The healthy set at every point and part, for compare and for the drawing. */
export interface OperatingPoint {
  /** RMS volts against the reference. */
  nodes: Record<string, { acVolts?: number; dcVolts?: number; rippleVolts?: number }>;
  parts: Record<string, { volts: number; amps: number; watts: number }>;
}

export interface DiagnosisInput {
  netlist: Netlist;
  asFound?: AsFound[];
  conditions?: Conditions;
  readings: Reading[];
  knowledge?: Knowledge;
}

/** What is known beside the circuit: parts data, rules, solved cases of the family. */
export interface Knowledge {
  /** Heater ratings that could have been fitted by mistake. */
  tubes?: { type: string; volts: number; amps: number; pictureTube?: boolean }[];
  lamps?: { type: string; volts: number; amps: number }[];
  /** Rules as stored, checked when they were loaded. */
  rules?: unknown[];
  /** Confirmed faults of solved cases on this family. */
  solved?: { cases: number; faults: { part: string; mode: FaultMode; count: number }[] };
}

export interface DiagnosisResult {
  engineVersion: string;
  suspects: Suspect[];
  parts: { part: string; probability: number }[];
  nextReadings: NextReading[];
  expected: ExpectedValue[];
  /** True when the first suspect needs no further reading. */
  settled: boolean;
  /** Sentences about the whole: badly explained readings, readings to take again, what is untested. */
  remarks: string[];
  /** Indices of readings that all good suspects call unlikely. */
  retake: number[];
  /** True when even the best suspect explains the readings badly. */
  noneOfThese: boolean;
  /** Advice and cautions of rules that fired. */
  advice: { rule: string; effect: 'advice' | 'caution'; text: string; because: string }[];
  /** Rules that wait for a reading: which, and the reading. */
  waiting: { rule: string; for: string }[];
  healthy: OperatingPoint;
  /** Estimate of the probability that lies in sets never scored. */
  unscored: number;
  /** Hypotheses that did not settle and were dropped. */
  dropped: number;
  /** Hypotheses scored in full. */
  scored: number;
}

/** One place of the circuit: the healthy value beside the published and the measured one. */
export interface ComparePoint {
  kind: 'point' | 'part';
  /** Take and place as one word; unique in the list. */
  key: string;
  label: string;
  take: Take;
  at?: [string, string];
  part?: string;
  /** Healthy value as the meter would show it; null for OL. */
  value: number | null;
  low: number | null;
  high: number | null;
  published?: number;
  measured?: number | 'OL';
  deviations?: number;
  /** Place in walking order. */
  order: number;
}
