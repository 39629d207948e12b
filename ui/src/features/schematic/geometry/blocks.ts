import { type Netlist, type Part } from '@engine/netlist/types';
import { otherEnd, partsByNode, railsIn, separate } from '@/lib/bench/graph';

/** A part of the circuit that is drawn as one figure. */
export interface Block {
  kind: 'string' | 'supply';
  parts: Part[];
  /** Node the figure starts at, on its left. */
  start: string;
  /** Nodes that end a figure; without the start, when it is none. */
  rails: Set<string>;
}

/**
 * Splits a circuit into figures: heater strings, and supplies with their rails.
 *
 * Figures share no node but the line and the reference. Where a switch or a fuse feeds a string and a
 * supply together, the string keeps it and the supply starts at the node behind it.
 *
 * @param netlist checked circuit; every part lands in exactly one block.
 * @returns strings first, then supplies, in the order of their parts.
 */
export function blocksOf(netlist: Netlist): Block[] {
  const rails = railsIn(netlist);
  const groups = joinAtCathodes(netlist, separate(netlist.parts, rails), rails);
  const blocks = groups.flatMap((parts) => splitAtFeed(netlist, parts, rails));
  return [
    ...blocks.filter((block) => block.kind === 'string'),
    ...blocks.filter((block) => block.kind === 'supply'),
  ];
}

/** A cathode ties its heater to what hangs at that node, although no wire does. */
function joinAtCathodes(netlist: Netlist, groups: Part[][], rails: Set<string>): Part[][] {
  const joined = groups.map((group) => [...group]);
  for (const group of groups) {
    const isFed = group.some(
      (part) =>
        ['rectifier', 'heater', 'winding'].includes(part.kind) ||
        part.between.includes(netlist.line?.hot ?? ''),
    );
    const host = isFed
      ? undefined
      : groups.find((other) => other.some((part) => isAbove(part, group, rails)));
    if (!host) continue;
    joined[groups.indexOf(host)].push(...group);
    joined[groups.indexOf(group)] = [];
  }
  return joined.filter((group) => group.length > 0);
}

function isAbove(part: Part, group: Part[], rails: Set<string>): boolean {
  if (part.kind !== 'heater' || !part.cathode || rails.has(part.cathode)) return false;
  const { cathode } = part;
  return group.some((other) => other.between.includes(cathode));
}

function splitAtFeed(netlist: Netlist, parts: Part[], rails: Set<string>): Block[] {
  const start = startOf(netlist, parts, rails);
  const whole = [blockOf(parts, start, rails)];
  const feed = feedFrom(parts, start);
  if (rails.has(feed.node) || feed.parts.length === 0) return whole;
  const widened = new Set([...rails, feed.node]);
  const rest = parts.filter((part) => !feed.parts.includes(part));
  const groups = joinAtCathodes(netlist, separate(rest, widened), widened);
  const strings = groups.filter((group) => group.some((part) => part.kind === 'heater'));
  const supplies = groups.filter((group) => group.some(isRectifier));
  if (strings.length !== 1 || supplies.length === 0 || supplies.includes(strings[0])) return whole;
  const others = groups.filter((group) => group !== strings[0]);
  return [
    blockOf([...feed.parts, ...strings[0]], start, rails),
    ...others.map((group) => blockOf(group, feed.node, widened)),
  ];
}

function blockOf(parts: Part[], start: string, rails: Set<string>): Block {
  return {
    kind: parts.some(isRectifier) ? 'supply' : 'string',
    parts,
    start,
    rails: new Set(rails),
  };
}

function isRectifier(part: Part): boolean {
  return part.kind === 'rectifier';
}

/** The line's hot wire, else the far end of a winding, else any rail, else the first node. */
function startOf(netlist: Netlist, parts: Part[], rails: Set<string>): string {
  const byNode = partsByNode(parts);
  if (netlist.line && byNode.has(netlist.line.hot)) return netlist.line.hot;
  const winding = parts.find((part) => part.kind === 'winding');
  if (winding) return winding.between.find((node) => !rails.has(node)) ?? winding.between[0];
  const rail = [...rails].find((node) => node !== netlist.reference && byNode.has(node));
  if (rail) return rail;
  const loose = [...byNode].find(([node, at]) => at.length === 1 && !rails.has(node));
  return loose?.[0] ?? parts[0].between[0];
}

/** Follows the only way on from the start, as far as there is only one. */
function feedFrom(parts: Part[], start: string): { parts: Part[]; node: string } {
  const byNode = partsByNode(parts);
  const feed: Part[] = [];
  let node = start;
  for (;;) {
    const ways = (byNode.get(node) ?? []).filter((part) => !feed.includes(part));
    if (ways.length !== 1) return { parts: feed, node };
    feed.push(ways[0]);
    node = otherEnd(ways[0], node);
    if (node === start) return { parts: [], node: start };
  }
}
