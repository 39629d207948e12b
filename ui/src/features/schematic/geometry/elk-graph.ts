import { type Netlist, type Part } from '@engine/netlist/types';
import { type ElkExtendedEdge, type ElkNode } from 'elkjs/lib/elk-api';
import { railSymbol, startFlag } from './draw-column';
import { type Drawing, emptySketch, type Sketch, type Spot } from './drawing';
import { finish } from './finish';
import { otherEnd, partsByNode, railsIn } from '@/lib/bench/graph';
import {
  drawPart,
  LABEL_GAP,
  NODE_LABEL_HEIGHT,
  nodeLabelWidth,
  PART_LABEL_HEIGHT,
  partLabelWidth,
  RAIL_HEIGHT,
  LINE_HEIGHT,
  SYMBOL_HALF,
  SYMBOL_LENGTH,
} from './metrics';
import { textPlace } from './boxes';

const WIRE_Y = 4;
const RAIL_WIDTH = 30;

const OPTIONS = {
  'elk.algorithm': 'layered',
  'elk.direction': 'RIGHT',
  'elk.edgeRouting': 'ORTHOGONAL',
  'elk.spacing.nodeNode': '28',
  'elk.layered.spacing.nodeNodeBetweenLayers': '28',
  'elk.layered.spacing.edgeNodeBetweenLayers': '14',
  'elk.spacing.edgeNode': '14',
  'elk.spacing.edgeEdge': '10',
  'elk.layered.considerModelOrder.strategy': 'NODES_AND_EDGES',
  'elk.layered.feedbackEdges': 'true',
};

/**
 * Describes any circuit as a graph for a layered layout: a box per part, per node and per reference symbol.
 *
 * @param netlist checked circuit.
 * @returns a graph whose edges are the wires; `drawingOfElk` reads the result back.
 */
export function elkGraphOf(netlist: Netlist): ElkNode {
  const grounds = groundsOf(netlist);
  const depths = depthsOf(netlist, grounds);
  const nodes = [...depths.keys()].filter((node) => !grounds.has(node));
  const edges: ElkExtendedEdge[] = [];
  const children: ElkNode[] = nodes.map((node) =>
    boxWithPorts(`node ${node}`, nodeLabelWidth(netlist, node), 12 + NODE_LABEL_HEIGHT, WIRE_Y),
  );
  for (const part of netlist.parts) {
    const [first, second] = orderedEnds(part, depths);
    const half = SYMBOL_HALF[part.kind];
    const above = PART_LABEL_HEIGHT + LABEL_GAP;
    const width = Math.max(SYMBOL_LENGTH, partLabelWidth(part));
    children.push(boxWithPorts(`part ${part.ref}`, width, above + 2 * half, above + half));
    [first, second].forEach((node, end) => {
      const target = grounds.has(node) ? `rail ${part.ref} ${end}` : `node ${node}`;
      if (grounds.has(node)) {
        const height = RAIL_HEIGHT + LINE_HEIGHT + WIRE_Y;
        children.push(boxWithPorts(target, RAIL_WIDTH, height, WIRE_Y));
      }
      edges.push({
        id: `wire ${part.ref} ${end}`,
        sources: [end === 0 ? `${target} east` : `part ${part.ref} east`],
        targets: [end === 0 ? `part ${part.ref} west` : `${target} west`],
      });
    });
  }
  return { id: 'sheet', layoutOptions: OPTIONS, children, edges };
}

/**
 * Turns a laid-out graph back into a drawing.
 *
 * @param netlist the circuit that `elkGraphOf` was given.
 * @param graph the same graph with coordinates.
 */
export function drawingOfElk(netlist: Netlist, graph: ElkNode): Drawing {
  const sketch = emptySketch();
  const boxes = new Map(graph.children?.map((child) => [child.id, child]));
  const edges = new Map(graph.edges?.map((edge) => [edge.id, edge]));
  const grounds = groundsOf(netlist);
  const depths = depthsOf(netlist, grounds);
  for (const node of depths.keys()) {
    const box = boxes.get(`node ${node}`);
    if (box) drawNode(sketch, netlist, node, box);
  }
  for (const part of netlist.parts) {
    const box = boxes.get(`part ${part.ref}`)!;
    const [first, second] = orderedEnds(part, depths);
    const y = box.y! + PART_LABEL_HEIGHT + LABEL_GAP + SYMBOL_HALF[part.kind];
    const x = box.x! + box.width! / 2;
    sketch.parts.push(drawPart(part, x, y, part.between[0] === first ? 0 : 2));
    [first, second].forEach((node, end) => {
      const side = end === 0 ? -1 : 1;
      const terminal = { x: x + (side * SYMBOL_LENGTH) / 2, y };
      addLevel(sketch, node, terminal, { x: x + (side * box.width!) / 2, y });
      sketch.wires.push({ node, spots: spotsOf(edges.get(`wire ${part.ref} ${end}`)) });
      const rail = boxes.get(`rail ${part.ref} ${end}`);
      if (rail) drawRail(sketch, netlist, node, rail, end === 0);
    });
  }
  return finish(sketch);
}

function boxWithPorts(id: string, width: number, height: number, wireY: number): ElkNode {
  return {
    id,
    width,
    height,
    layoutOptions: { 'elk.portConstraints': 'FIXED_POS' },
    ports: [
      { id: `${id} west`, x: 0, y: wireY, width: 0, height: 0 },
      { id: `${id} east`, x: width, y: wireY, width: 0, height: 0 },
    ].map((port, index) => ({
      ...port,
      layoutOptions: { 'elk.port.side': index === 0 ? 'WEST' : 'EAST' },
    })),
  };
}

/** Nodes that get a symbol at each part instead of wires. */
function groundsOf(netlist: Netlist): Set<string> {
  return new Set(netlist.line ? [netlist.reference, netlist.line.return] : [netlist.reference]);
}

/** Steps from the line's hot wire, by node, in the order they are met. */
function depthsOf(netlist: Netlist, grounds: ReadonlySet<string>): Map<string, number> {
  const byNode = partsByNode(netlist.parts);
  const depths = new Map<string, number>();
  const starts = [netlist.line?.hot, ...byNode.keys()].filter((node) => node && byNode.has(node));
  for (const start of starts as string[]) {
    if (depths.has(start) || grounds.has(start)) continue;
    depths.set(start, 0);
    const queue = [start];
    for (const node of queue) {
      for (const part of byNode.get(node) ?? []) {
        const next = otherEnd(part, node);
        if (depths.has(next) || grounds.has(next)) continue;
        depths.set(next, depths.get(node)! + 1);
        queue.push(next);
      }
    }
  }
  return depths;
}

/** The end nearer to the line first; the reference comes last. */
function orderedEnds(part: Part, depths: ReadonlyMap<string, number>): [string, string] {
  const [a, b] = part.between;
  return (depths.get(a) ?? Infinity) <= (depths.get(b) ?? Infinity) ? [a, b] : [b, a];
}

function spotsOf(edge: ElkExtendedEdge | undefined): Spot[] {
  const section = edge?.sections?.[0];
  if (!section) return [];
  return [section.startPoint, ...(section.bendPoints ?? []), section.endPoint];
}

function addLevel(sketch: Sketch, node: string, from: Spot, to: Spot): void {
  if (from.x !== to.x) sketch.wires.push({ node, spots: [from, to] });
}

function drawNode(sketch: Sketch, netlist: Netlist, node: string, box: ElkNode): void {
  const y = box.y! + WIRE_Y;
  const x = box.x! + box.width! / 2;
  addLevel(sketch, node, { x: box.x!, y }, { x: box.x! + box.width!, y });
  const isHot = railsIn(netlist).has(node);
  if (isHot) sketch.rails.push(startFlag(node, { x: box.x!, y }));
  const label = textPlace(x, box.y! + 12, box.width!, NODE_LABEL_HEIGHT, 'middle');
  sketch.nodes.push({ node, spot: { x, y }, label });
}

function drawRail(
  sketch: Sketch,
  netlist: Netlist,
  node: string,
  box: ElkNode,
  isBefore: boolean,
): void {
  const spot = { x: box.x! + box.width! / 2, y: box.y! + WIRE_Y };
  const edge = { x: isBefore ? box.x! + box.width! : box.x!, y: spot.y };
  sketch.wires.push({ node, spots: [spot, edge] });
  const isNamed = node !== netlist.reference;
  sketch.rails.push(railSymbol(node, spot, railsIn(netlist), isNamed, netlist.reference));
}
