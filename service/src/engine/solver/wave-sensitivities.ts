import type { Circuit, Parameter } from './circuit';
import { Law } from './laws';
import type { BranchValues } from './branch-values';
import type { ReadingSpec } from './reading-spec';
import { type Field, type ParameterOf, type Request, sensitivities } from './steady-state';
import type { WaveNetwork, WaveSolution } from './wave-network';

/** What the meter of a reading averages, as the steady state calls it. */
const WHAT = { 'dc-volts': 'mean', 'ac-volts': 'acRms', 'ripple-volts': 'peakToPeak' } as const;

/** Figure of a branch that a parameter stands for: its main value and its second one. */
function fieldOf(law: number, isSecond: boolean): Field | null {
  switch (law) {
    case Law.Ohmic:
      return isSecond ? null : 'ohms';
    case Law.Hot:
      return isSecond ? null : 'amps';
    case Law.Ntc:
      return isSecond ? 'coldOhms' : 'hotOhms';
    case Law.Capacitor:
      return isSecond ? 'esr' : 'farads';
    case Law.Load:
      return isSecond ? null : 'amps';
    case Law.Rectifier:
      return isSecond ? 'dropVolts' : 'ohms';
    case Law.Choke:
      return isSecond ? 'henries' : 'ohms';
    default:
      return isSecond ? 'volts' : 'ohms';
  }
}

/** Figures that move with a parameter; several for the line, which feeds every winding too. */
function figuresOf(
  circuit: Circuit,
  values: BranchValues,
  { element, line }: WaveSolution,
  parameter: Parameter,
): ParameterOf[] {
  if (parameter.what === 'line') {
    const windings = circuit.parts
      .map((_, k) => k)
      .filter((k) => values.law[k] === Law.Winding && element[k] >= 0)
      .map((k) => ({ element: element[k], field: 'volts' as const }));
    return line >= 0 ? [...windings, { element: line, field: 'volts' }] : windings;
  }
  const k = parameter.part;
  const isPlain =
    k >= 0 &&
    !circuit.isSteady[k] &&
    element[k] >= 0 &&
    values.state[k] !== 1 &&
    values.state[k] !== 2;
  if (!isPlain || parameter.what === 'exponent' || parameter.what === 'open') return [];
  const field = fieldOf(values.law[k], parameter.what === 'second');
  return field ? [{ element: element[k], field }] : [];
}

/** A reading as a request; null for one that no derivative is asked of. */
function requestOf(
  network: WaveNetwork,
  { element }: WaveSolution,
  spec: ReadingSpec,
): Request | null {
  const { take, a, b, part } = spec;
  if (take === 'amps') return element[part] < 0 ? null : { what: 'mean', element: element[part] };
  if (take !== 'dc-volts' && take !== 'ac-volts' && take !== 'ripple-volts') return null;
  const x = network.rowOf(a);
  const y = network.rowOf(b);
  return x < 0 || y < 0 ? null : { what: WHAT[take], a: x, b: y };
}

/**
 * Change of readings in a waveform block per relative change of every parameter of the circuit, at
 * one solution; nothing is loaded by a meter.
 *
 * @returns readings × parameters by rows, zero where nothing moves.
 */
export function waveSensitivities(
  circuit: Circuit,
  network: WaveNetwork,
  values: BranchValues,
  solution: WaveSolution,
  specs: readonly ReadingSpec[],
): Float64Array {
  const width = circuit.parameters.length;
  const out = new Float64Array(specs.length * width);
  const figures: ParameterOf[] = [];
  const owner: number[] = [];
  circuit.parameters.forEach((parameter, p) => {
    for (const figure of figuresOf(circuit, values, solution, parameter)) {
      figures.push(figure);
      owner.push(p);
    }
  });
  const rows: number[] = [];
  const requests: Request[] = [];
  specs.forEach((spec, r) => {
    const request = requestOf(network, solution, spec);
    if (!request) return;
    rows.push(r);
    requests.push(request);
  });
  if (requests.length === 0 || figures.length === 0) return out;
  const slopes = sensitivities(solution.state, requests, figures);
  rows.forEach((r, i) => {
    figures.forEach((_, f) => {
      out[r * width + owner[f]] += slopes[i * figures.length + f];
    });
  });
  return out;
}
