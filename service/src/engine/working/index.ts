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
import { settleMeter } from '../solver/meter';
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
  return { ...closedFormOf(system, part, { a, b }, reading.value), reading };
}
