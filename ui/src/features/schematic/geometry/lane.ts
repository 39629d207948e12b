import { type Part } from '@engine/netlist/types';
import { otherEnd, partsByNode, separate } from '@/lib/bench/graph';
import { type Path } from './main-path';
import { mainPath } from './main-path';

/** Parts that hang from a node, one below the other, down to a rail or to a loose end. */
export interface Column {
  parts: Part[];
  /** Nodes from the one it hangs from to the last one; one more than parts. */
  nodes: string[];
}

/** All columns below one spot. */
export interface Drop {
  node: string;
  columns: Column[];
}

/** Parts drawn alongside a stretch of the lane. */
export interface Partner {
  /** Indices of the lane's nodes that it joins, from < to. */
  from: number;
  to: number;
  parts: Part[];
  nodes: string[];
}

/** A stretch of circuit drawn along one line, with what hangs from it. */
export interface Lane {
  nodes: string[];
  parts: Part[];
  drops: Map<number, Drop>;
  /** Columns below the cathode of the heater at this index of `parts`. */
  cathodes: Map<number, Drop>;
  partners: Partner[];
  /** Lanes that leave from a node; feeding ones run back to the left. */
  branches: { at: number; lane: Lane; isFeeding: boolean }[];
}

/** What `laneOf` needs to know about a figure. */
export interface LaneRequest {
  parts: readonly Part[];
  start: string;
  rails: ReadonlySet<string>;
  /** True for a heater string: it ends on a rail and has no branches. */
  isString: boolean;
}

/** Stretch of a string's end that a part to the rail is still drawn alongside of. */
const ALONGSIDE = 2;

/**
 * Orders a figure along a line: the main way, parts alongside, parts hanging down, branches.
 *
 * @param request parts of the figure and where it starts.
 * @returns the lane with every part exactly once, or null when the figure has no such form.
 */
export function laneOf(request: LaneRequest): Lane | null {
  const { parts, start, rails, isString } = request;
  const path = mainPath(parts, start, rails, isString) ?? { nodes: [start], parts: [] };
  if (isString && path.parts.length === 0) return null;
  const lane: Lane = {
    ...path,
    drops: new Map(),
    cathodes: new Map(),
    partners: [],
    branches: [],
  };
  const rest = parts.filter((part) => !path.parts.includes(part));
  const joints = new Set([...rails, ...path.nodes]);
  for (const group of separate(rest, joints)) {
    if (!place(group, lane, path, request)) return null;
  }
  return lane;
}

function place(group: Part[], lane: Lane, path: Path, request: LaneRequest): boolean {
  const { rails, isString } = request;
  const byNode = partsByNode(group);
  // A second winding with its rectifier leads in from the left; a winding alone hangs down.
  const isFeeding = group.length > 1 && group.some((part) => part.kind === 'winding');
  const anchors = path.nodes.filter(
    (node, index) => byNode.has(node) && !isEndRail(index, path, rails),
  );
  const chain = chainOf(group, anchors[0], new Set([...rails, ...path.nodes]));
  if (anchors.length === 0) return placeAtCathode(group, lane, path, request);
  if (chain) {
    const last = chain.nodes[chain.nodes.length - 1];
    const to = path.nodes.indexOf(last);
    const from = path.nodes.indexOf(chain.nodes[0]);
    if (to >= 0 && (!rails.has(last) || (isString && to - from <= ALONGSIDE && to > from))) {
      lane.partners.push(
        from < to
          ? { from, to, ...chain }
          : {
              from: to,
              to: from,
              parts: [...chain.parts].reverse(),
              nodes: [...chain.nodes].reverse(),
            },
      );
      return true;
    }
    if (isString || (rails.has(last) && !isFeeding)) {
      addColumn(lane.drops, from, chain.nodes[0], chain);
      return true;
    }
  }
  if (isString || anchors.length !== 1) return false;
  const at = path.nodes.indexOf(anchors[0]);
  const branch = laneOf({ parts: group, start: anchors[0], rails, isString: false });
  if (!branch || branch.parts.length === 0) return false;
  lane.branches.push({ at, lane: branch, isFeeding });
  return true;
}

/** A string's last node is a rail that is drawn elsewhere as well: nothing hangs from it. */
function isEndRail(index: number, path: Path, rails: ReadonlySet<string>): boolean {
  return index > 0 && index === path.nodes.length - 1 && rails.has(path.nodes[index]);
}

function placeAtCathode(group: Part[], lane: Lane, path: Path, request: LaneRequest): boolean {
  const { rails } = request;
  const index = path.parts.findIndex(
    (part) =>
      part.kind === 'heater' &&
      part.cathode !== undefined &&
      !rails.has(part.cathode) &&
      group.some((other) => other.between.includes(part.cathode!)),
  );
  const heater = path.parts[index];
  if (!heater || heater.kind !== 'heater') return false;
  const node = heater.cathode!;
  const joints = new Set([...rails, node]);
  for (const column of separate(group, joints)) {
    const chain = chainOf(column, node, joints);
    if (!chain) return false;
    addColumn(lane.cathodes, index, node, chain);
  }
  return true;
}

function addColumn(drops: Map<number, Drop>, index: number, node: string, column: Column): void {
  const drop = drops.get(index) ?? { node, columns: [] };
  drop.columns.push(column);
  drops.set(index, drop);
}

/** Reads a group as a chain from a node to another joint or to a loose end; null when it forks. */
function chainOf(group: Part[], start: string, joints: ReadonlySet<string>): Column | null {
  const parts: Part[] = [];
  const nodes = [start];
  const byNode = partsByNode(group);
  let node = start;
  while (parts.length < group.length) {
    const ways = (byNode.get(node) ?? []).filter((part) => !parts.includes(part));
    if (ways.length !== 1) return null;
    parts.push(ways[0]);
    node = otherEnd(ways[0], node);
    nodes.push(node);
    if (joints.has(node)) break;
  }
  return parts.length === group.length ? { parts, nodes } : null;
}
