import type { Reading, Take } from '../netlist/types';
import type { Predictor } from '../solver/predictor';

/** A reading that could be taken next. */
export interface Candidate {
  take: Take;
  at?: [string, string];
  part?: string;
  /** Bench time in minutes. */
  minutes: number;
}

/** Bench time by kind of reading, minutes (design figures; common practice). */
const MINUTES = { point: 0.5, cold: 0.7, across: 0.7, ripple: 1, tube: 1.5, lift: 4, series: 5 };

/** Where a reading is taken, as one word: two readings at one place replace each other. */
export function placeOf({ take, at, part }: Pick<Reading, 'take' | 'at' | 'part'>): string {
  return `${take} ${part ?? at?.join(' ') ?? ''}`;
}

/**
 * Every reading that could be taken on the circuit and has not been.
 *
 * @param taken places already read, by `placeOf`.
 */
export function listCandidates(
  { circuit, waves }: Pick<Predictor, 'circuit' | 'waves'>,
  taken: ReadonlySet<string>,
): Candidate[] {
  const { netlist, parts, reference, hot } = circuit;
  const black = circuit.nodes[reference];
  const out: Candidate[] = [];
  const add = (candidate: Candidate) => {
    if (!taken.has(placeOf(candidate))) out.push(candidate);
  };
  const points = (netlist.points ?? []).map(({ node }) => node);
  const nodes = points.length > 0 ? points : circuit.nodes;
  const isPowered = hot >= 0;
  const steady = new Set<number>();
  circuit.branches.forEach(({ a, b, isLeak }, k) => {
    if (circuit.isSteady[k] && !isLeak) steady.add(a).add(b);
  });
  for (const node of nodes) {
    const index = circuit.nodeIndex.get(node);
    if (index === undefined || index === reference || index === hot) continue;
    if (isPowered && steady.has(index)) {
      add({ take: 'ac-volts', at: [node, black], minutes: MINUTES.point });
    } else if (waves?.network.rowOf(index) !== -1) {
      add({ take: 'dc-volts', at: [node, black], minutes: MINUTES.point });
      add({ take: 'ripple-volts', at: [node, black], minutes: MINUTES.ripple });
    }
    add({ take: 'ohms', at: [node, black], minutes: MINUTES.cold });
  }
  netlist.parts.forEach((_, k) => {
    const part = parts[k];
    const { ref } = part;
    if (isPowered && circuit.isSteady[k]) {
      add({ take: 'ac-volts', part: ref, minutes: MINUTES.across });
      if (part.kind === 'lamp') add({ take: 'sign', part: ref, minutes: 0.2 });
    } else if (!circuit.isSteady[k] && !['winding', 'load'].includes(part.kind)) {
      add({ take: 'dc-volts', part: ref, minutes: MINUTES.across });
    }
    add({ take: 'ohms', part: ref, minutes: MINUTES.cold });
    const isTube = part.kind === 'heater';
    add({ take: 'lifted-ohms', part: ref, minutes: isTube ? MINUTES.tube : MINUTES.lift });
    if (isPowered && circuit.isSteady[k] && (part.kind === 'fuse' || part.kind === 'switch')) {
      add({ take: 'amps', part: ref, minutes: MINUTES.series });
    }
  });
  return out;
}
