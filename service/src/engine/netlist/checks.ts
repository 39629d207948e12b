import type { Netlist, NetlistProblem, Part } from './types';

/** Resistances at or below this count as a dead short when loops of sources are looked for. */
const DEAD_SHORT = 1e-6;

/** Joins nodes into islands and tells which island a node belongs to. */
class Islands {
  private readonly parent = new Map<string, string>();

  of(node: string): string {
    let root = node;
    for (let up = this.parent.get(root); up !== undefined; up = this.parent.get(root)) root = up;
    return root;
  }

  /** Joins two nodes; false when they were one island already. */
  join(a: string, b: string): boolean {
    const x = this.of(a);
    const y = this.of(b);
    if (x === y) return false;
    this.parent.set(x, y);
    return true;
  }
}

function partsAt(netlist: Netlist): Map<string, Part[]> {
  const at = new Map<string, Part[]>();
  for (const part of netlist.parts) {
    for (const node of new Set(part.between)) at.set(node, [...(at.get(node) ?? []), part]);
  }
  return at;
}

function duplicateRefs(netlist: Netlist): NetlistProblem[] {
  const seen = new Set<string>();
  const problems: NetlistProblem[] = [];
  netlist.parts.forEach(({ ref }, i) => {
    if (seen.has(ref)) {
      problems.push({
        code: 'duplicate-ref',
        part: ref,
        path: `/parts/${i}/ref`,
        message: `Two parts are called ${ref}. Give each part a reference of its own.`,
      });
    }
    seen.add(ref);
  });
  return problems;
}

function selfLoops(netlist: Netlist): NetlistProblem[] {
  return netlist.parts.flatMap(({ ref, between: [a, b] }, i) =>
    a === b
      ? [
          {
            code: 'both-ends-on-one-node',
            part: ref,
            nodes: [a],
            path: `/parts/${i}/between`,
            message: `Both ends of ${ref} are on node ${a}. Connect one of them elsewhere.`,
          },
        ]
      : [],
  );
}

function lineProblems(netlist: Netlist, at: Map<string, Part[]>): NetlistProblem[] {
  const { line } = netlist;
  if (!line) {
    const hasSource = netlist.parts.some(({ kind }) => kind === 'winding');
    return hasSource
      ? []
      : [
          {
            code: 'no-source',
            path: '/line',
            message:
              'The circuit has neither a line nor a transformer winding, so nothing would flow. Add the line.',
          },
        ];
  }
  if (line.hot === line.return) {
    return [
      {
        code: 'line-on-one-node',
        nodes: [line.hot],
        path: '/line/return',
        message: `Both sides of the line are on node ${line.hot}. The return must be another node.`,
      },
    ];
  }
  return (['hot', 'return'] as const).flatMap((side) =>
    at.has(line[side]) || line[side] === netlist.reference
      ? []
      : [
          {
            code: 'line-not-connected',
            nodes: [line[side]],
            path: `/line/${side}`,
            message: `The line’s ${side === 'hot' ? 'hot side' : 'return'} is on node ${line[side]}, but no part is connected there.`,
          },
        ],
  );
}

/** Nodes that nothing ties to the reference: a voltage there would mean nothing. */
function islandProblems(netlist: Netlist, at: Map<string, Part[]>): NetlistProblem[] {
  const islands = new Islands();
  for (const { between } of netlist.parts) islands.join(between[0], between[1]);
  if (netlist.line) islands.join(netlist.line.hot, netlist.line.return);
  if (
    !at.has(netlist.reference) &&
    netlist.line?.return !== netlist.reference &&
    netlist.line?.hot !== netlist.reference
  ) {
    return [
      {
        code: 'reference-not-connected',
        nodes: [netlist.reference],
        path: '/reference',
        message: `Readings are taken against node ${netlist.reference}, but no part is connected there.`,
      },
    ];
  }
  const home = islands.of(netlist.reference);
  const lineHome = netlist.line ? islands.of(netlist.line.hot) : home;
  const lost = new Map<string, string[]>();
  for (const node of at.keys()) {
    const island = islands.of(node);
    // A transformer's primary side may hang on the line alone.
    if (island === home || island === lineHome) continue;
    lost.set(island, [...(lost.get(island) ?? []), node]);
  }
  return [...lost.values()].map((nodes) => ({
    code: 'no-path-to-reference',
    nodes,
    message: `Nothing connects ${nodes.length === 1 ? 'node' : 'nodes'} ${nodes.join(', ')} to ${netlist.reference}. Add the missing wire or part.`,
  }));
}

/** Ideal sources shorted by one another or by a dead short. */
function sourceLoops(netlist: Netlist): NetlistProblem[] {
  const islands = new Islands();
  const { line } = netlist;
  if (line && !(line.ohms && line.ohms > 0)) islands.join(line.hot, line.return);
  return netlist.parts.flatMap((part, i) => {
    const isIdeal =
      'ohms' in part &&
      part.ohms !== undefined &&
      part.ohms <= DEAD_SHORT &&
      part.kind !== 'rectifier';
    if (!isIdeal || part.between[0] === part.between[1]) return [];
    return islands.join(part.between[0], part.between[1])
      ? []
      : [
          {
            code: 'loop-of-ideal-sources',
            part: part.ref,
            nodes: [...part.between],
            path: `/parts/${i}/ohms`,
            message: `${part.ref} closes a loop without any resistance between ${part.between[0]} and ${part.between[1]}. Give it its real ohms.`,
          },
        ];
  });
}

function pointProblems(netlist: Netlist, at: Map<string, Part[]>): NetlistProblem[] {
  const isThere = (node: string) =>
    at.has(node) ||
    node === netlist.reference ||
    node === netlist.line?.hot ||
    node === netlist.line?.return;
  const problems: NetlistProblem[] = [];
  const seen = new Set<string>();
  (netlist.points ?? []).forEach(({ node, label }, i) => {
    if (!isThere(node)) {
      problems.push({
        code: 'point-nowhere',
        nodes: [node],
        path: `/points/${i}/node`,
        message: `The point “${label}” is on node ${node}, but no part is connected there.`,
      });
    }
    if (seen.has(node)) {
      problems.push({
        code: 'duplicate-point',
        nodes: [node],
        path: `/points/${i}/node`,
        message: `Node ${node} is listed twice among the points. Keep one of them.`,
      });
    }
    seen.add(node);
  });
  netlist.parts.forEach((part, i) => {
    if (part.kind !== 'heater' || part.cathode === undefined || isThere(part.cathode)) return;
    problems.push({
      code: 'cathode-nowhere',
      part: part.ref,
      nodes: [part.cathode],
      path: `/parts/${i}/cathode`,
      message: `The cathode of ${part.ref} is on node ${part.cathode}, but no part is connected there.`,
    });
  });
  for (const ref of Object.keys(netlist.layout ?? {})) {
    if (netlist.parts.some((part) => part.ref === ref)) continue;
    problems.push({
      code: 'layout-of-unknown-part',
      part: ref,
      path: `/layout/${ref}`,
      message: `The layout places ${ref}, but there is no such part.`,
    });
  }
  return problems;
}

/** Rectifiers with nothing to feed: their steady state says nothing about a set. */
function loadProblems(netlist: Netlist): NetlistProblem[] {
  const rectifiers = netlist.parts.filter(({ kind }) => kind === 'rectifier');
  if (rectifiers.length === 0) return [];
  const isConsumer = netlist.parts.some(
    ({ kind }) => kind === 'load' || kind === 'resistor' || kind === 'heater',
  );
  return isConsumer
    ? []
    : [
        {
          code: 'rectifier-without-load',
          part: rectifiers[0].ref,
          message: `${rectifiers[0].ref} rectifies, but nothing draws current. Add the load that the rail feeds.`,
        },
      ];
}

/**
 * Checks whether a netlist makes sense as a circuit. Pure; the ui shows the same problems live.
 *
 * @param netlist a document that `readNetlist` has accepted.
 * @returns every problem, naming its part and nodes; empty when the circuit can be solved.
 */
export function checkNetlist(netlist: Netlist): NetlistProblem[] {
  const at = partsAt(netlist);
  return [
    ...duplicateRefs(netlist),
    ...selfLoops(netlist),
    ...lineProblems(netlist, at),
    ...islandProblems(netlist, at),
    ...sourceLoops(netlist),
    ...pointProblems(netlist, at),
    ...loadProblems(netlist),
  ];
}
