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

/**
 * Nodes that nothing ties to the reference: a voltage there would mean nothing. Every kind of part
 * counts as a tie, capacitors too.
 *
 * @param at parts by node.
 */
export function islandProblems(netlist: Netlist, at: Map<string, Part[]>): NetlistProblem[] {
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
export function sourceLoops(netlist: Netlist): NetlistProblem[] {
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
