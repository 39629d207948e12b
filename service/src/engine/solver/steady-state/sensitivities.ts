import { solveDense } from './dense';
import { DeviationField } from './deviation';
import type { Field } from './disturbance';
import { Outputs, type Request } from './outputs';
import { slowDerivative, type SlowElement, slowPoint } from './slow-parts';
import type { SteadyState } from './steady-state';

/** A figure of one element. */
export interface ParameterOf {
  element: number;
  field: Field;
}

/**
 * Derivatives of readings by the logarithm of element figures, at a solved cycle.
 *
 * No voltage or current jumps where a rectifier switches, so the shift of the switching instants
 * adds nothing to first order: the deviation obeys the linear equations of the patterns as they
 * followed each other (forward sensitivity; A. Hindmarsh and others, ACM TOMS 31 (2005) 363-396,
 * section 2). The deviation is made periodic with the derivative of the cycle, and what loads,
 * heaters, lamps and thermistors do in turn is solved for on top.
 *
 * About three digits at the default step. Where a waveform reaches its peak twice (two equal halves
 * of a full-wave supply), the derivative of a peak-to-peak value is that of one of the two.
 *
 * @returns requests×parameters by rows: change of the reading per relative change of the figure.
 */
export function sensitivities(
  state: SteadyState,
  requests: readonly Request[],
  parameters: readonly ParameterOf[],
): Float64Array {
  const { block, laws } = state.network;
  const { slow } = block;
  // Voltage of each slow part, which sets its conductance.
  const own: Request[] = slow.map((k) => {
    const { a, b, kind } = block.elements[k];
    return { what: kind === 'load' ? 'mean' : 'rms', a, b };
  });
  const outputs = new Outputs(state, [...requests, ...own]);
  const field = new DeviationField(state, outputs);
  const slowColumns = slow.map((k) => field.column(k, 'amps'));
  const columns = parameters.map(({ element, field: name }) =>
    slow.includes(element) ? new Float64Array(outputs.count) : field.column(element, name),
  );
  const answers = slowAnswers();
  const result = new Float64Array(requests.length * parameters.length);
  for (let r = 0; r < requests.length; r += 1) {
    for (let p = 0; p < parameters.length; p += 1) {
      let sum = columns[p][r];
      for (let j = 0; j < slow.length; j += 1) {
        sum += slowColumns[j][r] * answers[j * parameters.length + p];
      }
      result[r * parameters.length + p] = sum;
    }
  }
  return result;

  /** d ln(siemens) of every slow part by every parameter. */
  function slowAnswers(): Float64Array {
    const n = slow.length;
    const matrix = new Float64Array(n * n);
    const rhs = new Float64Array(n * parameters.length);
    slow.forEach((k, j) => {
      const element = block.elements[k] as SlowElement;
      const moments = state.pair(element.a, element.b);
      const volts = element.kind === 'load' ? moments.mean : moments.rms;
      const { slope } = slowPoint(element, volts, laws.siemens[k]);
      const perVolt = volts === 0 ? 0 : slope / volts;
      const at = requests.length + j;
      for (let i = 0; i < n; i += 1) matrix[j * n + i] = -perVolt * slowColumns[i][at];
      // A thermistor's law asks for current, which its own conductance moves too.
      matrix[j * n + j] += element.kind === 'ntc' ? 1 - slope : 1;
      parameters.forEach((parameter, p) => {
        const direct =
          parameter.element === k
            ? slowDerivative(element, parameter.field, volts, laws.siemens[k])
            : 0;
        rhs[j * parameters.length + p] = direct + perVolt * columns[p][at];
      });
    });
    solveDense(matrix, rhs, n, parameters.length);
    return rhs;
  }
}
