export type { BranchElement, ElementOf } from './elements';
export { solveSteadyState, type SolveOptions } from './solve';
export { SteadyState, type Extremes, type Waveform, type WarmStart } from './steady-state';
export type { Moments } from './gram';
export { sensitivities, type ParameterOf } from './sensitivities';
export type { Request } from './outputs';
export type { Field } from './disturbance';
