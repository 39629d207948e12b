export { closedFormOf } from './closed-form';
export { solveExpected } from './solve-expected';
export type {
  ClosedForm,
  ClosedFormAnswer,
  Equation,
  NodalConductance,
  NodalSystem,
  Working,
} from './types';
