import { pointerStep } from './names';
import { isObject } from './reader';
import {
  type Meter,
  type Netlist,
  type NetlistProblem,
  type Reading,
  SEEN,
  type Seen,
  type Take,
  TAKES,
} from './types';

/** Largest value a reading of each kind can have on a set of this trade. */
const MOST: Partial<Record<Take, number>> = { amps: 50, ohms: 1e9, 'lifted-ohms': 1e9 };
const UNITS: Partial<Record<Take, string>> = {
  'ac-volts': 'V',
  'dc-volts': 'V',
  'ripple-volts': 'V',
  amps: 'A',
  ohms: 'Ω',
  'lifted-ohms': 'Ω',
};

function isOhms(take: Take): boolean {
  return take === 'ohms' || take === 'lifted-ohms';
}

/** Highest voltage the circuit could show: doubled peaks of its sources, with room to spare. */
function mostVolts(netlist: Netlist): number {
  const sources = netlist.parts.flatMap((part) => (part.kind === 'winding' ? [part.volts] : []));
  const largest = Math.max(netlist.line?.volts ?? 0, ...sources);
  return 8 * Math.max(largest, 50);
}

function placeProblem(netlist: Netlist, { take, at, part }: Reading): NetlistProblem | null {
  if (part !== undefined && at !== undefined) {
    return {
      code: 'two-places',
      path: '/part',
      message: 'A reading is taken either on a part or between two nodes, not both.',
    };
  }
  if (part !== undefined) {
    return netlist.parts.some(({ ref }) => ref === part)
      ? null
      : {
          code: 'unknown-part',
          path: '/part',
          part,
          message: `There is no part ${String(part)} in this circuit.`,
        };
  }
  if (take === 'amps' || take === 'lifted-ohms' || take === 'sign') {
    return {
      code: 'part-needed',
      path: '/part',
      message: 'This kind of reading needs the part it is taken on.',
    };
  }
  if (!Array.isArray(at) || at.length !== 2 || at.some((node) => typeof node !== 'string')) {
    return {
      code: 'place-needed',
      path: '/at',
      message: 'Say where the reading was taken: two nodes, red lead first, or a part.',
    };
  }
  const nodes = new Set(netlist.parts.flatMap(({ between }) => between));
  nodes.add(netlist.reference);
  if (netlist.line) nodes.add(netlist.line.hot).add(netlist.line.return);
  const lost = at.filter((node) => !nodes.has(node));
  if (lost.length > 0) {
    return {
      code: 'unknown-node',
      path: '/at',
      nodes: lost,
      message: `There is no node ${lost.join(' or ')} in this circuit.`,
    };
  }
  return at[0] === at[1]
    ? {
        code: 'same-node',
        path: '/at',
        nodes: [at[0]],
        message: `Both leads are on node ${at[0]}. Move one of them.`,
      }
    : null;
}

function valueProblem(netlist: Netlist, { take, value, seen }: Reading): NetlistProblem | null {
  const bad = (code: string, message: string): NetlistProblem => ({
    code,
    path: '/value',
    message,
  });
  if (take === 'sign') {
    return SEEN.includes(seen as Seen)
      ? null
      : { code: 'seen-needed', path: '/seen', message: `Say what was seen: ${SEEN.join(', ')}.` };
  }
  if (value === 'OL') {
    return isOhms(take)
      ? null
      : bad(
          'over-range',
          'OL belongs to ohms. For a voltage or a current choose a higher range and enter the value.',
        );
  }
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    return bad('value-needed', isOhms(take) ? 'Enter a number or OL.' : 'Enter a number.');
  }
  if (isOhms(take) && value < 0) {
    // A meter that was zeroed with its leads can show a little below zero.
    if (value < -1)
      return bad(
        'negative-ohms',
        'Ohms cannot be negative. Is the set off and are its capacitors discharged?',
      );
    return null;
  }
  const most = MOST[take] ?? mostVolts(netlist);
  const size = Math.abs(value);
  if (size > most) {
    return bad(
      'out-of-range',
      `${value} ${UNITS[take]} cannot be right on this circuit. Check the range and the decimal point.`,
    );
  }
  // The last digits of a meter can flicker below zero.
  if ((take === 'ac-volts' || take === 'ripple-volts') && value < -0.01) {
    return bad('negative-volts', 'An AC voltage has no sign. Enter it without the minus.');
  }
  return null;
}

/** Fields of a meter and the largest value each can have; all are numbers above or at zero. */
const METER: Record<keyof Meter, number> = {
  ohms: 1e12,
  ohmsPerVolt: 1e9,
  fullScale: 1e5,
  ofReading: 0.5,
  ofFullScale: 0.5,
  digits: 1000,
  resolution: 1e9,
  overOhms: 1e12,
};
/** Fields that would divide by zero or load the circuit with a short. */
const ABOVE_ZERO: (keyof Meter)[] = ['ohms', 'ohmsPerVolt', 'fullScale', 'overOhms'];

function meterProblems({ meter }: Reading): NetlistProblem[] {
  if (meter === undefined) return [];
  if (!isObject(meter)) {
    return [{ code: 'bad-meter', path: '/meter', message: 'The meter must be an object.' }];
  }
  const problems: NetlistProblem[] = [];
  const add = (name: string, message: string) =>
    problems.push({ code: 'bad-meter', path: `/meter/${pointerStep(name)}`, message });
  for (const [name, value] of Object.entries(meter)) {
    if (!Object.hasOwn(METER, name)) {
      add(name, `A meter has no “${name}”.`);
      continue;
    }
    const least = ABOVE_ZERO.includes(name as keyof Meter) ? Number.MIN_VALUE : 0;
    const most = METER[name as keyof Meter];
    if (typeof value !== 'number' || !(value >= least && value <= most)) {
      add(
        name,
        `The meter’s “${name}” must be a number ${least > 0 ? 'above' : 'from'} 0, ${most} at most.`,
      );
    }
  }
  if (meter.ohmsPerVolt !== undefined && meter.fullScale === undefined) {
    add('fullScale', 'A moving-coil meter needs the full scale of the range it was on.');
  }
  return problems;
}

/**
 * Checks one reading against a circuit: its place, its kind and a value that could be.
 *
 * @returns problems with a pointer into the reading (`/value`, `/at`, `/part`, `/seen`, `/take`, `/meter/…`).
 */
export function checkReading(netlist: Netlist, reading: Reading): NetlistProblem[] {
  if (!TAKES.includes(reading.take)) {
    return [
      { code: 'unknown-take', path: '/take', message: `A reading is one of ${TAKES.join(', ')}.` },
    ];
  }
  const first = [placeProblem(netlist, reading), valueProblem(netlist, reading)].filter(
    (problem): problem is NetlistProblem => problem !== null,
  );
  return [...first, ...meterProblems(reading)];
}
