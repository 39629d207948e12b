import { type Netlist } from '@engine/netlist/types';
import { portableString } from '@/testing/fixtures/circuits';
import { describe, expect, it } from 'vitest';
import { isPlaced, layoutAsPlaced } from './placed-layout';

const placed: Netlist = {
  ...portableString,
  layout: { S1: { x: 100, y: 100, turn: 0 }, R1: { x: 260, y: 220, turn: 1 } },
};

describe('a layout made by hand', () => {
  it('wins for the parts it names', () => {
    const drawing = layoutAsPlaced(placed);
    const part = drawing.parts.find((drawn) => drawn.part.ref === 'R1')!;
    expect(part).toMatchObject({ x: 260, y: 220, turn: 1 });
    expect(part.terminals[0]).toEqual({ x: 260, y: 190 });
  });

  it('keeps the other parts, below', () => {
    const drawing = layoutAsPlaced(placed);
    expect(drawing.parts).toHaveLength(portableString.parts.length);
    expect(drawing.parts.find((drawn) => drawn.part.ref === 'V1')!.y).toBeGreaterThan(220);
  });

  it('joins the two ends of a node by a wire that leaves each symbol straight', () => {
    const wires = layoutAsPlaced(placed).wires.filter(({ node }) => node === 'H0');
    const spots = wires.flatMap((wire) => wire.spots);
    expect(spots).toContainEqual({ x: 130, y: 100 });
    expect(spots).toContainEqual({ x: 142, y: 100 });
    expect(spots).toContainEqual({ x: 260, y: 190 });
    expect(spots).toContainEqual({ x: 260, y: 178 });
    expect(wires.some((wire) => wire.spots.length > 2)).toBe(true);
  });

  it('is known by a single part that was placed', () => {
    expect(isPlaced(placed)).toBe(true);
    expect(isPlaced({ ...placed, layout: { GONE: { x: 0, y: 0, turn: 0 } } })).toBe(false);
  });
});
