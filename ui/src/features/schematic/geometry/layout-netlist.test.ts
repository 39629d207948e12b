import { type Netlist } from '@engine/netlist/types';
import {
  bridgeSupply,
  consoleString,
  crossedBridge,
  doublerSupply,
  fullWaveSupply,
  halfWaveSupply,
  longString,
  portableString,
  wholeReceiver,
} from '@/testing/fixtures/circuits';
import { describe, expect, it } from 'vitest';
import { bestDrawing } from './best-drawing';
import { type Drawing } from './drawing';
import { layoutNetlist } from './layout-netlist';
import { findOverlaps } from './overlaps';

const circuits: [string, Netlist][] = [
  ['a portable string', portableString],
  ['a console string', consoleString],
  ['a half-wave supply', halfWaveSupply],
  ['a doubler', doublerSupply],
  ['a full-wave supply', fullWaveSupply],
  ['a whole receiver', wholeReceiver],
  ['a bridge rectifier', bridgeSupply],
  ['a string of 80', longString(80)],
];

/** Lays out, or fails with the reason. */
function drawn(netlist: Netlist, width = 1100): Drawing {
  const drawing = layoutNetlist(netlist, width);
  if (!drawing) throw new Error(`${netlist.title} was not laid out`);
  return drawing;
}

function partOf(drawing: Drawing, ref: string) {
  return drawing.parts.find(({ part }) => part.ref === ref)!;
}

describe.each(circuits)('the layout of %s', (_name, netlist) => {
  it.each([420, 760, 1100, 1600])('lays nothing over anything else at a width of %i', (width) => {
    expect(findOverlaps(drawn(netlist, width))).toEqual([]);
  });

  it('places every part once', () => {
    const refs = drawn(netlist).parts.map(({ part }) => part.ref);
    expect([...refs].sort()).toEqual(netlist.parts.map((part) => part.ref).sort());
  });

  it('labels every node once, but for the ends of its rails', () => {
    const drawing = drawn(netlist);
    const rails = new Set(drawing.rails.map((rail) => rail.node));
    const nodes = new Set(netlist.parts.flatMap((part) => part.between));
    const labelled = drawing.nodes.map(({ node }) => node);
    expect(new Set(labelled).size).toBe(labelled.length);
    for (const node of nodes) expect(rails.has(node) || labelled.includes(node)).toBe(true);
  });

  it('joins every terminal to a wire or a symbol of its node', () => {
    const drawing = drawn(netlist);
    for (const { part, terminals } of drawing.parts) {
      part.between.forEach((node, end) => {
        const spot = terminals[end];
        const isMet = drawing.wires.some(
          (wire) =>
            wire.node === node &&
            wire.spots.some((at) => Math.hypot(at.x - spot.x, at.y - spot.y) < 0.6),
        );
        expect(isMet, `${part.ref} at ${node}`).toBe(true);
      });
    }
  });

  it('joins all wires of one node, apart from rails', () => {
    const drawing = drawn(netlist);
    const rails = new Set(drawing.rails.map((rail) => rail.node));
    for (const node of new Set(drawing.wires.map((wire) => wire.node))) {
      if (!rails.has(node)) expect(piecesOf(drawing, node), node).toBe(1);
    }
  });
});

/** Counts pieces of a node's wiring that do not touch. */
function piecesOf(drawing: Drawing, node: string): number {
  const wires = drawing.wires.filter((wire) => wire.node === node);
  const group = wires.map((_, index) => index);
  const touches = (a: (typeof wires)[number], b: (typeof wires)[number]) =>
    a.spots.some((spot) => isOn(spot, b)) || b.spots.some((spot) => isOn(spot, a));
  for (let a = 0; a < wires.length; a++) {
    for (let b = 0; b < a; b++) {
      if (!touches(wires[a], wires[b])) continue;
      const [from, to] = [group[a], group[b]];
      group.forEach((value, index) => {
        if (value === from) group[index] = to;
      });
    }
  }
  return new Set(group).size;
}

function isOn(
  spot: { x: number; y: number },
  wire: { spots: { x: number; y: number }[] },
): boolean {
  return wire.spots.slice(1).some((to, index) => {
    const from = wire.spots[index];
    const isBetween = (value: number, a: number, b: number) =>
      value >= Math.min(a, b) - 0.6 && value <= Math.max(a, b) + 0.6;
    return isBetween(spot.x, from.x, to.x) && isBetween(spot.y, from.y, to.y);
  });
}

describe('a string', () => {
  it('keeps the order from the line to the chassis', () => {
    const refs = drawn(consoleString, 700)
      .parts.map(({ part }) => part)
      .filter((part) => part.kind === 'heater')
      .map((part) => part.ref);
    expect(refs).toEqual(['V10', 'V11', 'V12', 'V13', 'V14', 'V15', 'V16', 'V17']);
  });

  it('wraps into rows that run to and fro', () => {
    const drawing = drawn(longString(40), 1000);
    const heaters = drawing.parts.filter(({ part }) => part.kind === 'heater');
    const rows = [...new Set(heaters.map(({ y }) => y))];
    expect(rows.length).toBeGreaterThan(2);
    rows.slice(0, -1).forEach((row, index) => {
      const xs = heaters.filter(({ y }) => y === row).map(({ x }) => x);
      const sorted = [...xs].sort((a, b) => (index % 2 === 0 ? a - b : b - a));
      expect(xs).toEqual(sorted);
    });
  });

  it('draws a lamp alongside the section it lies across', () => {
    const drawing = drawn(consoleString);
    const [lamp, section] = [partOf(drawing, 'DS1'), partOf(drawing, 'R1B')];
    expect(lamp.x).toBeCloseTo(section.x);
    expect(lamp.y).toBeLessThan(section.label.box.y);
  });

  it('hangs a cathode resistor below its heater', () => {
    const drawing = drawn(consoleString);
    const [below, heater] = [partOf(drawing, 'RK'), partOf(drawing, 'V11')];
    expect(below.x).toBeCloseTo(heater.x);
    expect(below.y).toBeGreaterThan(heater.y);
    expect(below.turn % 2).toBe(1);
  });

  it('outlines the sections of one body together', () => {
    expect(drawn(consoleString, 1600).assemblies).toHaveLength(1);
  });
});

describe('a supply', () => {
  it('runs from left to right', () => {
    const drawing = drawn(halfWaveSupply);
    const xs = ['S1', 'R9', 'V5', 'R10', 'R6'].map((ref) => partOf(drawing, ref).x);
    expect(xs).toEqual([...xs].sort((a, b) => a - b));
  });

  it('hangs filter capacitors and loads down to the reference', () => {
    const drawing = drawn(doublerSupply);
    for (const ref of ['C31A', 'C31B', 'LD1', 'C32', 'LD3']) {
      expect(partOf(drawing, ref).turn % 2, ref).toBe(1);
    }
    expect(drawing.rails.every((rail) => rail.kind === 'reference')).toBe(true);
  });

  it('leads a second rectifier in from the left', () => {
    const drawing = drawn(fullWaveSupply);
    const [first, second] = [partOf(drawing, 'V6A'), partOf(drawing, 'V6B')];
    expect(second.x).toBeLessThan(partOf(drawing, 'L20').x);
    expect(second.y).not.toBe(first.y);
  });

  it('starts behind the switch that feeds a string as well', () => {
    const drawing = drawn(wholeReceiver);
    expect(drawing.sources).toHaveLength(1);
    expect(drawing.rails.some((rail) => rail.node === 'H0' && rail.kind === 'flag')).toBe(true);
  });
});

describe('other circuits', () => {
  it('leaves a crosswise graph to the general layout', () => {
    expect(bestDrawing(crossedBridge, { width: 1000, height: 600 })).toBeNull();
  });

  it('draws an empty circuit as an empty sheet', () => {
    expect(layoutNetlist({ ...portableString, parts: [] }, 1000)?.parts).toEqual([]);
  });
});
