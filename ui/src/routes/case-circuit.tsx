import { CircuitPane } from './CircuitPane';

/** The circuit of a case, with values and suspects on it. */
export function Component() {
  return <CircuitPane height="max(420px, calc(100vh - 260px))" />;
}
