import { EngineError } from '../errors';
import { Elimination } from '../solver/steady-state/elimination';
import { formatQuantity } from '../units';
import {
  exactly,
  evaluateAt,
  solveForSymbol,
  solveWithSymbol,
  SYMBOL,
  unknownName,
} from './algebra';
import { settle } from './condense';
import { type Formula, numberOf, sumOf, toMathml, toTex, toText } from './formula';
import { numbered } from './network';
import type { ClosedFormAnswer, NodalConductance, NodalSystem } from './types';

/** The expression must meet the network at the part's own value, and the implied value the reading. */
const AGREEMENT = 1e-6;
/** Below this share of the reading's scale a part has no influence on it. */
const NO_INFLUENCE = 1e-10;
/** Beyond this a part is open, and a value means nothing. */
const MOST_IMPLIED = 1e11;
/** Largest stand-in for a part when the rest of the network is looked at from its ends. */
const MOST_OHMS = 1e10;

/** How a voltage follows one part's ohms x: v = base + gain/(x + rest), or v = base + gain·x. */
interface Shape {
  base: number;
  gain: number;
  /** Resistance of everything else, seen from the part's ends; infinite when the current is forced. */
  rest: number;
}

/**
 * A voltage as a function of one part's resistance, and the resistance that would explain a reading.
 *
 * The part's current is an unknown of its own, so that its resistance x stands once: the rest of the
 * network, seen from the part's ends, is a voltage behind a resistance (Helmholtz 1853, Thévenin
 * 1883); its figures come from the nodal equations. nerdamer solves the remaining equations with x in
 * them and then for x; the value found is put back into the whole network.
 *
 * @param part a part that is a resistance in the system.
 * @param target voltage asked for, from node a to node b.
 * @param measured volts read there.
 * @returns formula, and the implied ohms; null with a reason in `note` when there are none.
 * @throws EngineError `part-not-in-equations` for a part that is no resistance here.
 */
export function closedFormOf(
  system: NodalSystem,
  part: string,
  target: { a: string; b: string },
  measured: number,
): ClosedFormAnswer {
  const branch = branchOf(system, part);
  const shape = shapeOf(system, branch, target);
  const isFlat = shape.gain === 0;
  const ohms = 1 / branch.siemens;
  const here = voltsWith(system, branch, ohms, target);
  const scale = Math.max(Math.abs(here), Math.abs(measured), Math.abs(shape.base), 1e-9);
  const expression = new Expression(shape, ohms, scale);
  const meets = Math.abs(expression.at(ohms) - here) <= AGREEMENT * scale;
  const formula = formulaOf(system, shape, part, target);
  const answer = (impliedValue: number | null, note: string): ClosedFormAnswer => ({
    part,
    text: toText(formula),
    tex: toTex(formula),
    mathml: toMathml(formula),
    impliedValue,
    unit: 'ohms',
    note,
  });
  if (!meets) {
    return answer(
      null,
      `The formula does not meet the network at ${part}'s own value, so it was not used.`,
    );
  }
  if (isFlat) return answer(null, `This reading does not depend on ${part}.`);
  const implied = expression.ohmsFor(measured);
  const volts = formatQuantity(measured, 'V', 4);
  if (implied === undefined) {
    return answer(null, `No resistance of ${part} alone brings this reading to ${volts}.`);
  }
  if (implied > MOST_IMPLIED) {
    return answer(
      null,
      `No resistance of ${part} brings this reading to ${volts}; with ${part} open it comes nearest.`,
    );
  }
  if (implied < 0) {
    return answer(
      null,
      `${part} alone cannot bring this reading to ${volts}: it would have to be less than nothing.`,
    );
  }
  const back = voltsWith(system, branch, implied, target);
  if (!(Math.abs(back - measured) <= AGREEMENT * scale)) {
    return answer(
      null,
      `The value found for ${part} gives ${formatQuantity(back, 'V', 5)} when it is put back, not ${volts}, so it was not used.`,
    );
  }
  return answer(
    implied,
    `${volts} would be explained by ${part} measuring ${formatQuantity(implied, 'Ω', 4)} instead of ${formatQuantity(ohms, 'Ω', 4)}, everything else being sound.`,
  );
}

function branchOf(system: NodalSystem, part: string): NodalConductance {
  const branch = system.conductances.find((one) => one.part === part && one.siemens > 0);
  if (branch) return branch;
  throw new EngineError(
    'part-not-in-equations',
    `${part} does not stand in these equations as a resistance. Choose a resistor, heater, lamp or choke of this block.`,
  );
}

/** Volts of a node in a solution that holds unknown nodes only; known ones are passed as a function. */
type VoltsAt = (node: string) => number;

/**
 * Figures of the shape, from two solutions by nerdamer: the network as it stands, and its answer to
 * one ampere through the part's ends.
 */
function shapeOf(
  whole: NodalSystem,
  branch: NodalConductance,
  target: { a: string; b: string },
  ohms = 1 / branch.siemens,
): Shape {
  const { a, b } = branch;
  const system: NodalSystem = {
    ...whole,
    conductances: whole.conductances.map((one) =>
      one === branch ? { ...one, siemens: 1 / ohms } : one,
    ),
  };
  const { network, indexOf } = numbered(system);
  const volts = settle(network);
  const volt: VoltsAt = (node) => system.fixed[node] ?? volts[indexOf.get(node)!];
  const response = numbered(system, false);
  put(response.network.drive, response.indexOf.get(a), 1);
  put(response.network.drive, response.indexOf.get(b), -1);
  const answers = settle(response.network);
  const answer: VoltsAt = (node) => (node in system.fixed ? 0 : answers[indexOf.get(node)!]);

  const across = volt(a) - volt(b);
  const now = volt(target.a) - volt(target.b);
  const transfer = answer(target.a) - answer(target.b);
  const own = answer(a) - answer(b);
  const scale = Math.max(Math.abs(across), Math.abs(now), 1e-9);
  // Share of the current that takes the way around the part; none when it is forced through it.
  const around = (ohms - own) / ohms;
  if (Math.abs(transfer * across) <= NO_INFLUENCE * scale * ohms) {
    return { base: now, gain: 0, rest: 0 };
  }
  // Where the part is small against the rest that share has few digits: look from a larger value.
  if (around < 0.01 && ohms < MOST_OHMS) {
    const larger = ohms / Math.max(around, 1e-4);
    return shapeOf(whole, branch, target, Math.min(larger, MOST_OHMS));
  }
  if (around <= 1e-9) {
    const amps = across / ohms;
    const perOhm = (transfer * amps) / ohms;
    return { base: now - perOhm * ohms, gain: perOhm, rest: Infinity };
  }
  const rest = own / around;
  const swing = (transfer * across) / (ohms * around);
  return { base: now + swing, gain: -swing * (ohms + rest), rest };
}

function put(drive: Float64Array, node: number | undefined, amps: number): void {
  if (node !== undefined) drive[node] += amps;
}

/**
 * The voltage as an expression of the symbol, solved by nerdamer from the last equations: wanted
 * voltage, part's current, part's voltage. Everything is in proportion (ohms to `unit`, volts to
 * `scale`), since the library keeps the most digits near 1.
 */
class Expression {
  private readonly text: string;
  private readonly unit: number;

  constructor(
    { base, gain, rest }: Shape,
    ohms: number,
    private readonly scale: number,
  ) {
    this.unit = rest === Infinity ? ohms : rest;
    if (gain === 0) {
      this.text = exactly(base / scale);
      return;
    }
    if (rest === Infinity) {
      this.text = `${exactly(base / scale)}+${exactly((gain * ohms) / scale)}*${SYMBOL}`;
      return;
    }
    const [volts, amps, across] = [unknownName(0), unknownName(1), unknownName(2)];
    // One volt behind the rest drives the part; the wanted voltage is base + gain times its current.
    this.text = solveWithSymbol(
      [
        `${volts}-${exactly(gain / rest / scale)}*${amps}=${exactly(base / scale)}`,
        `${across}+${amps}=1`,
        `${across}-${SYMBOL}*${amps}=0`,
      ],
      [volts, amps, across],
      volts,
    );
  }

  /** Volts with the part at some ohms. */
  at(ohms: number): number {
    return this.scale * evaluateAt(this.text, ohms / this.unit);
  }

  /** Ohms that lead to some volts. */
  ohmsFor(volts: number): number | undefined {
    const [root] = solveForSymbol(this.text, volts / this.scale);
    return root === undefined ? undefined : root * this.unit;
  }
}

/** The voltage asked for with the part at some value, by the numeric elimination. */
function voltsWith(
  system: NodalSystem,
  branch: NodalConductance,
  ohms: number,
  target: { a: string; b: string },
): number {
  const unknowns = system.nodes.filter((node) => !(node in system.fixed));
  const place = new Map(unknowns.map((node, i) => [node, i]));
  const elimination = new Elimination(unknowns.length, 0);
  const amps = new Float64Array(unknowns.length);
  for (const one of system.conductances) {
    const siemens = one === branch ? 1 / Math.max(ohms, 1e-6) : one.siemens;
    const i = place.get(one.a) ?? -1;
    const j = place.get(one.b) ?? -1;
    if (i === j) continue;
    elimination.add(i, j, siemens);
    if (i < 0) amps[j] += siemens * system.fixed[one.a];
    if (j < 0) amps[i] += siemens * system.fixed[one.b];
  }
  for (const [node, value] of Object.entries(system.injections)) put(amps, place.get(node), value);
  elimination.factor();
  elimination.solve(amps, 1);
  const at: VoltsAt = (node) => system.fixed[node] ?? amps[place.get(node)!];
  return at(target.a) - at(target.b);
}

/** v(a) − v(b) = base ± gain/(PART + rest). */
function formulaOf(
  system: NodalSystem,
  { base, gain, rest }: Shape,
  part: string,
  { a, b }: { a: string; b: string },
): Formula {
  const left = sumOf(
    system.fixed[b] === 0
      ? [{ isMinus: false, of: { kind: 'volts', node: a } }]
      : [
          { isMinus: false, of: { kind: 'volts', node: a } },
          { isMinus: true, of: { kind: 'volts', node: b } },
        ],
  );
  const symbol: Formula = { kind: 'part', ref: part };
  const constant = { isMinus: base < 0, of: numberOf(Math.abs(base)) };
  if (gain === 0) return { kind: 'equation', left, right: sumOf([constant]) };
  const moving: Formula =
    rest === Infinity
      ? { kind: 'product', left: numberOf(Math.abs(gain)), right: symbol }
      : {
          kind: 'fraction',
          top: numberOf(Math.abs(gain)),
          bottom: sumOf([
            { isMinus: false, of: symbol },
            { isMinus: false, of: numberOf(rest) },
          ]),
        };
  const terms = [constant, { isMinus: gain < 0, of: moving }];
  const isNothing = Math.abs(base) <= 1e-9 * Math.abs(gain / (rest === Infinity ? 1 : rest));
  return { kind: 'equation', left, right: sumOf(isNothing ? [terms[1]] : terms) };
}
