import { doOverlap, grown, unionOf } from './boxes';
import {
  type Box,
  type DrawnPart,
  type Drawing,
  type Sketch,
  type Spot,
  type Wire,
} from './drawing';

const MARGIN = 24;
const OUTLINE = 5;

/** Adds junction dots, outlines of bodies and the extent. */
export function finish(sketch: Sketch): Drawing {
  const extent = grown(boundsOf(sketch), MARGIN);
  return { ...sketch, dots: dotsOf(sketch), assemblies: outlinesOf(sketch), extent };
}

/** Smallest box around everything of a sketch, labels included. */
export function boundsOf(sketch: Sketch): Box {
  return unionOf([
    ...sketch.parts.flatMap((part) => [part.box, part.label.box]),
    ...sketch.nodes.map((node) => node.label.box),
    ...sketch.rails.map((rail) => rail.box),
    ...sketch.sources.flatMap((source) => [source.box, source.label.box]),
    ...sketch.wires.flatMap((wire) => wire.spots.map((spot) => ({ ...spot, width: 0, height: 0 }))),
  ]);
}

/** Finds the spots where three or more ends of one node's wires meet. */
export function dotsOf(sketch: Sketch): Drawing['dots'] {
  const dots: Drawing['dots'] = [];
  const byNode = new Map<string, Wire[]>();
  for (const wire of sketch.wires) byNode.set(wire.node, [...(byNode.get(wire.node) ?? []), wire]);
  for (const [node, wires] of byNode) {
    const ends = wires.flatMap((wire) => wire.spots);
    const unique = new Map(
      ends.map((spot) => [`${Math.round(spot.x)},${Math.round(spot.y)}`, spot]),
    );
    for (const spot of unique.values()) {
      const directions = new Set<string>();
      for (const wire of wires) addDirections(directions, wire, spot);
      if (directions.size >= 3) dots.push({ node, spot });
    }
  }
  return dots;
}

function addDirections(directions: Set<string>, wire: Wire, spot: Spot): void {
  for (let index = 1; index < wire.spots.length; index++) {
    for (const end of [wire.spots[index - 1], wire.spots[index]]) {
      const other = end === wire.spots[index] ? wire.spots[index - 1] : wire.spots[index];
      const isLevel = Math.abs(end.y - other.y) < 0.5;
      const isOn = isLevel
        ? Math.abs(spot.y - end.y) < 0.5 && isBetween(spot.x, end.x, other.x)
        : Math.abs(spot.x - end.x) < 0.5 && isBetween(spot.y, end.y, other.y);
      if (!isOn) continue;
      const dx = Math.sign(Math.round(end.x - spot.x));
      const dy = Math.sign(Math.round(end.y - spot.y));
      if (dx !== 0 || dy !== 0) directions.add(`${dx},${dy}`);
    }
  }
}

function isBetween(value: number, a: number, b: number): boolean {
  return value >= Math.min(a, b) - 0.5 && value <= Math.max(a, b) + 0.5;
}

/** Outlines the sections of each body: as one where nothing foreign lies between, else piece by piece. */
function outlinesOf(sketch: Sketch): Drawing['assemblies'] {
  const bodies = new Map<string, DrawnPart[]>();
  for (const drawn of sketch.parts) {
    const name = drawn.part.assembly;
    if (name) bodies.set(name, [...(bodies.get(name) ?? []), drawn]);
  }
  return [...bodies].flatMap(([name, sections]) => {
    const outlines: Box[] = [];
    let run: DrawnPart[] = [];
    const boxOf = (drawn: DrawnPart[]) => grown(unionOf(drawn.map((part) => part.box)), OUTLINE);
    for (const section of sections) {
      const together = boxOf([...run, section]);
      if (run.length > 0 && isForeign(together, sketch, name)) {
        outlines.push(boxOf(run));
        run = [];
      }
      run.push(section);
    }
    if (run.length > 0) outlines.push(boxOf(run));
    return outlines.map((box) => ({ name, box }));
  });
}

function isForeign(box: Box, sketch: Sketch, name: string): boolean {
  return (
    sketch.parts.some(
      (drawn) =>
        (drawn.part.assembly !== name && doOverlap(box, drawn.box)) ||
        doOverlap(box, drawn.label.box),
    ) || sketch.nodes.some((node) => doOverlap(box, node.label.box))
  );
}
