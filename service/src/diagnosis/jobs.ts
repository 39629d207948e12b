import {
  type ClosedForm,
  closedForm,
  compare,
  type ComparePoint,
  diagnose,
  type DiagnosisInput,
  type DiagnosisResult,
  expectedWorking,
  type OperatingPoint,
  type Reading,
  solve,
  type Working,
} from '../engine';

/** A circuit with what was found and the day's line voltage. */
export type CircuitInput = Pick<DiagnosisInput, 'netlist' | 'asFound' | 'conditions'>;

/** Work that is done off the request's thread: input and result by name. */
export interface Jobs {
  diagnose: { input: DiagnosisInput; result: DiagnosisResult };
  compare: { input: Omit<DiagnosisInput, 'knowledge'>; result: ComparePoint[] };
  working: { input: CircuitInput; result: Working };
  'closed-form': { input: CircuitInput & { part: string; reading: Reading }; result: ClosedForm };
  solve: { input: CircuitInput; result: OperatingPoint };
}
export type JobName = keyof Jobs;

const RUNNERS: {
  [N in JobName]: (input: Jobs[N]['input']) => Jobs[N]['result'] | Promise<Jobs[N]['result']>;
} = {
  diagnose,
  compare,
  working: expectedWorking,
  'closed-form': closedForm,
  solve,
};

/** Runs one job; the engine's own errors come through. */
export async function runJob<N extends JobName>(
  name: N,
  input: Jobs[N]['input'],
): Promise<Jobs[N]['result']> {
  return RUNNERS[name](input);
}
