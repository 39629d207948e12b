import { type Netlist } from '@engine/netlist/types';
import { bridgeSupply, consoleString, crossedBridge } from '@/testing/fixtures/circuits';
import ELK from 'elkjs/lib/elk.bundled.js';
import { describe, expect, it } from 'vitest';
import { drawingOfElk, elkGraphOf } from './elk-graph';
import { findOverlaps } from './overlaps';

const circuits: [string, Netlist][] = [
  ['a bridge of resistors', crossedBridge],
  ['a bridge rectifier', bridgeSupply],
  ['a console string', consoleString],
];

describe.each(circuits)('the general layout of %s', (_name, netlist) => {
  it('places every part once and lays nothing over anything else', async () => {
    const graph = await new ELK().layout(elkGraphOf(netlist));
    const drawing = drawingOfElk(netlist, graph);
    expect(drawing.parts.map(({ part }) => part.ref)).toEqual(netlist.parts.map(({ ref }) => ref));
    expect(findOverlaps(drawing)).toEqual([]);
  });

  it('leads a wire to every terminal', async () => {
    const drawing = drawingOfElk(netlist, await new ELK().layout(elkGraphOf(netlist)));
    for (const { part, terminals } of drawing.parts) {
      part.between.forEach((node, end) => {
        const isMet = drawing.wires.some(
          (wire) =>
            wire.node === node &&
            wire.spots.some(
              ({ x, y }) => Math.hypot(x - terminals[end].x, y - terminals[end].y) < 1,
            ),
        );
        expect(isMet, `${part.ref} at ${node}`).toBe(true);
      });
    }
  });
});
