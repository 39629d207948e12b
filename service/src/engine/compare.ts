import { placeOf } from './advice/candidates';
import { asShown, viewReadings } from './advice/evidence';
import type { ComparePoint, DiagnosisInput } from './diagnosis-types';
import { applyAsFound } from './netlist/as-found';
import { requireSound } from './netlist/require-sound';
import type { Netlist, Point, Published, Reading, Take } from './netlist/types';
import { Scorer } from './ranking/scorer';
import { scoreSet } from './ranking/fault-set';
import { type Circuit, compileCircuit } from './solver/circuit';
import { alongTheCircuit } from './solver/walk';

/** Takes worth comparing at a point, with the field the service literature prints for them. */
const AT_POINTS: [Take, keyof Published][] = [
  ['ac-volts', 'acVolts'],
  ['dc-volts', 'dcVolts'],
  ['ripple-volts', 'rippleVolts'],
  ['ohms', 'ohms'],
];

/** True when the circuit has such a reading at the node. */
function isTakenThere(circuit: Circuit, node: string, take: Take): boolean {
  if (take === 'ohms') return true;
  if (circuit.hot < 0 && !circuit.parts.some(({ kind }) => kind === 'winding')) return false;
  const index = circuit.nodeIndex.get(node)!;
  const touching = circuit.branches.filter(
    ({ a, b, isLeak }) => !isLeak && (a === index || b === index),
  );
  const isSteady = touching.every(({ part }) => circuit.isSteady[part] === 1);
  return take === 'ac-volts' ? isSteady : !isSteady;
}

/** Places of the circuit in the order a person walks it. */
function placesOf(
  circuit: Circuit,
  netlist: Netlist,
): { reading: Reading; point?: Point; published?: number }[] {
  const order = alongTheCircuit(circuit);
  const points = [...(netlist.points ?? [])].sort(
    (x, y) => order.get(x.node)! - order.get(y.node)!,
  );
  const black = netlist.reference;
  const places = points
    .filter(({ node }) => node !== black)
    .flatMap((point) =>
      AT_POINTS.filter(([take]) => isTakenThere(circuit, point.node, take)).map(
        ([take, field]) => ({
          reading: { take, at: [point.node, black] } as Reading,
          point,
          published: point.published?.[field],
        }),
      ),
    );
  const onParts = netlist.parts.flatMap(({ ref }, k) => {
    const volts: Take = circuit.isSteady[k] ? 'ac-volts' : 'dc-volts';
    return [volts, 'ohms' as const, 'lifted-ohms' as const].map((take) => ({
      reading: { take, part: ref } as Reading,
    }));
  });
  return [...places, ...onParts];
}

/**
 * The healthy set at every point and across every part, in walking order, beside what was measured
 * there.
 *
 * @throws EngineError as `diagnose` does.
 */
export function compare(input: Omit<DiagnosisInput, 'knowledge'>): ComparePoint[] {
  const netlist = applyAsFound(input.netlist, input.asFound ?? []);
  requireSound(netlist, input.readings);
  const circuit = compileCircuit(netlist, input.conditions?.lineVolts);
  const measured = new Map(
    input.readings
      .filter(({ take }) => take !== 'sign')
      .map((reading) => [placeOf(reading), reading] as const),
  );
  const places = placesOf(circuit, netlist);
  const known = new Set(places.map(({ reading }) => placeOf(reading)));
  const extra = [...measured]
    .filter(([place]) => !known.has(place))
    .map(([, reading]) => ({ reading, point: undefined, published: undefined }));
  const all = [...places, ...extra] as { reading: Reading; point?: Point; published?: number }[];
  const readings = all.map(({ reading }) => measured.get(placeOf(reading)) ?? reading);
  const scorer = new Scorer(circuit, readings);
  const healthy = { ...scoreSet(scorer, [], [])!, logPrior: 0, cause: -1, score: 0 };
  const views = viewReadings(scorer, healthy)!;
  return all.map(({ reading, point, published }, order): ComparePoint => {
    const view = views[order];
    const { spec, y } = scorer.observations[order];
    const isOver = view.over > 0.5;
    const taken = measured.get(placeOf(reading));
    return {
      kind: reading.part ? 'part' : 'point',
      key: placeOf(reading),
      label: reading.part ?? point?.label ?? reading.at!.join(' to '),
      take: reading.take,
      ...(reading.at ? { at: reading.at } : {}),
      ...(reading.part ? { part: reading.part } : {}),
      value: isOver ? null : view.shown,
      low: isOver ? null : asShown(view.mean - 1.96 * view.sigma, spec.isLog),
      high: isOver ? null : asShown(view.mean + 1.96 * view.sigma, spec.isLog),
      ...(published !== undefined ? { published } : {}),
      ...(taken ? { measured: taken.value } : {}),
      ...(taken && !isOver && !Number.isNaN(y) ? { deviations: (y - view.mean) / view.sigma } : {}),
      order,
    };
  });
}
