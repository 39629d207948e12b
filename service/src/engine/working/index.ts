import type { DiagnosisInput } from '../diagnosis-types';
import { NetlistError, ReadingError } from '../errors';
import {
  type ClosedForm,
  closedFormOf,
  type NodalSystem,
  solveExpected,
  type Working,
} from '../expected';
import { applyAsFound } from '../netlist/as-found';
import { requireSound } from '../netlist/require-sound';
import type { Reading } from '../netlist/types';
import { type Circuit, compileCircuit } from '../solver/circuit';
import { healthyValues } from '../solver/branch-values';
import { ColdNetwork } from '../solver/cold-network';
import { settleMeter } from '../solver/meter';
import { formatQuantity } from '../units';
import { alternatingSystem, coldSystem, directSystem } from './system';

type CircuitInput = Pick<DiagnosisInput, 'netlist' | 'asFound' | 'conditions'>;

function compiled({ netlist, asFound, conditions }: CircuitInput): Circuit {
  const found = applyAsFound(netlist, asFound ?? []);
  requireSound(found, []);
  return compileCircuit(found, conditions?.lineVolts);
}

/**
 * The working of a case: nodal equations of the healthy set as found, at the day's line voltage, and
 * their solution through nerdamer, checked against the numeric engine.
 *
 * @throws NetlistError when the circuit does not settle.
 */
export function expectedWorking(input: CircuitInput): Working {
  const circuit = compiled(input);
  const systems = [alternatingSystem(circuit), directSystem(circuit)].filter((one) => one !== null);
  if (systems.length === 0) {
    throw new NetlistError([
      {
        code: 'does-not-settle',
        message: 'This circuit does not settle, so there is nothing to show. Check its values.',
      },
    ]);
  }
  const workings = systems.map(({ system, check, notes, agreement }) => {
    const working = solveExpected(system, check, agreement);
    return { ...working, notes: [...notes, ...working.notes] };
  });
  return {
    nodes: workings.flatMap(({ nodes }) => nodes),
    equations: workings.flatMap(({ equations }) => equations),
    solution: Object.assign({}, ...workings.map(({ solution }) => solution)) as Record<
      string,
      number
    >,
    notes: workings.flatMap(({ notes }) => notes),
    residual: Math.max(...workings.map(({ residual }) => residual)),
    agreesWithSolver: workings.every((working) => working.agreesWithSolver),
  };
}

/** The network a reading was taken on, its meter in place. */
function systemFor(circuit: Circuit, reading: Reading, a: string, b: string): NodalSystem | null {
  if (reading.take === 'ohms') return coldSystem(circuit, a, b);
  if (reading.take !== 'ac-volts' && reading.take !== 'dc-volts') return null;
  const checked = reading.take === 'ac-volts' ? alternatingSystem(circuit) : directSystem(circuit);
  if (!checked) return null;
  const { system } = checked;
  const meter = { part: 'meter', a, b, siemens: settleMeter(reading).siemens };
  return { ...system, conductances: [...system.conductances, meter] };
}

/** True when the leads are joined through this part alone. */
function isOnlyWay(system: NodalSystem, part: string, red: string, black: string): boolean {
  const reached = new Set([red]);
  for (let size = 0; size !== reached.size;) {
    size = reached.size;
    for (const { part: own, a, b } of system.conductances) {
      if (own === part) continue;
      if (reached.has(a)) reached.add(b);
      else if (reached.has(b)) reached.add(a);
    }
  }
  return !reached.has(black);
}

/** An ohmmeter whose whole current flows through the part: its ohms add to the rest. */
function inSeries(
  circuit: Circuit,
  system: NodalSystem,
  part: string,
  measured: number,
  red: string,
  black: string,
): Omit<ClosedForm, 'reading'> {
  const own = 1 / system.conductances.find((branch) => branch.part === part)!.siemens;
  const [a, b] = [circuit.nodeIndex.get(red)!, circuit.nodeIndex.get(black)!];
  const cold = new ColdNetwork(circuit);
  cold.solve(healthyValues(circuit).cold);
  const volts = cold.response(a, b, new Float64Array(circuit.nodes.length));
  const rest = Math.max(0, volts[a] - volts[b] - own);
  const implied = measured - rest;
  const figure = String(Number(rest.toPrecision(6)));
  return {
    part,
    text: `ohms = ${figure} + ${part}`,
    tex: `R = ${figure} + R_{\\mathrm{${part.replace(/_/g, '\\_')}}}`,
    mathml: `<mrow><mi>R</mi><mo>=</mo><mn>${figure}</mn><mo>+</mo><msub><mi>R</mi><mtext>${part}</mtext></msub></mrow>`,
    impliedValue: implied > 0 ? implied : null,
    unit: 'ohms',
    note:
      implied > 0
        ? `The whole current of the ohmmeter flows through ${part}: it would have to measure ${formatQuantity(implied, 'Ω')} to explain this reading alone.`
        : `No ohms of ${part} alone would explain this reading: the rest of the way already has more.`,
  };
}

/**
 * How one reading hangs on the ohms of one part, and what these would have to be to explain it.
 *
 * @throws ReadingError when the reading or the part has no such form.
 */
export function closedForm(input: CircuitInput & { part: string; reading: Reading }): ClosedForm {
  const circuit = compiled(input);
  const { part, reading } = input;
  requireSound(circuit.netlist, [reading]);
  const refuse = (message: string) =>
    new ReadingError([{ code: 'no-closed-form', path: '/take', message }]);
  if (typeof reading.value !== 'number') {
    throw refuse('OL has no closed form: it says only that the resistance is very high.');
  }
  const index = reading.part === undefined ? -1 : circuit.partIndex.get(reading.part)!;
  const [a, b] = index >= 0 ? circuit.parts[index].between : reading.at!;
  const system = systemFor(circuit, reading, a, b);
  if (!system) throw refuse('This kind of reading has no closed form. Choose ohms or volts.');
  if (!system.conductances.some((branch) => branch.part === part)) {
    throw refuse(`${part} has no resistance that this reading could tell. Choose another part.`);
  }
  if (reading.take === 'ohms' && isOnlyWay(system, part, a, b)) {
    return { ...inSeries(circuit, system, part, reading.value, a, b), reading };
  }
  return { ...closedFormOf(system, part, { a, b }, reading.value), reading };
}
