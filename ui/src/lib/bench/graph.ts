import { type Netlist, type Part } from '@engine/netlist/types';

/** Nodes that other figures are drawn down to: the line's two wires and the reference. */
export function railsIn(netlist: Netlist): Set<string> {
  const rails = new Set([netlist.reference]);
  if (netlist.line) rails.add(netlist.line.hot).add(netlist.line.return);
  return rails;
}

/** The node at the other end of a part. */
export function otherEnd(part: Part, node: string): string {
  return part.between[0] === node ? part.between[1] : part.between[0];
}

/** Parts by node. */
export function partsByNode(parts: readonly Part[]): Map<string, Part[]> {
  const byNode = new Map<string, Part[]>();
  for (const part of parts) {
    for (const node of new Set(part.between)) {
      byNode.set(node, [...(byNode.get(node) ?? []), part]);
    }
  }
  return byNode;
}

/**
 * Splits parts into groups that share no node but a rail.
 *
 * @param parts parts in drawing order.
 * @param rails nodes that do not join groups.
 * @returns groups in the order of their first part, each in drawing order.
 */
export function separate(parts: readonly Part[], rails: ReadonlySet<string>): Part[][] {
  const groupOf = new Map<string, string>();
  const find = (name: string): string => {
    let root = name;
    while (groupOf.get(root) !== undefined && groupOf.get(root) !== root) root = groupOf.get(root)!;
    return root;
  };
  for (const part of parts) {
    const own = `part ${part.ref}`;
    groupOf.set(own, own);
    for (const node of part.between) {
      if (rails.has(node)) continue;
      const key = `node ${node}`;
      if (!groupOf.has(key)) groupOf.set(key, key);
      groupOf.set(find(key), find(own));
    }
  }
  const groups = new Map<string, Part[]>();
  for (const part of parts) {
    const root = find(`part ${part.ref}`);
    groups.set(root, [...(groups.get(root) ?? []), part]);
  }
  return [...groups.values()];
}
