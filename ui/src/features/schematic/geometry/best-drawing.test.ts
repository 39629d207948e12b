import { consoleString, halfWaveSupply, longString } from '@/testing/fixtures/circuits';
import { describe, expect, it } from 'vitest';
import { bestDrawing, firstView, wholeView } from './best-drawing';

const desk = { width: 1400, height: 560 };
const phone = { width: 360, height: 560 };

describe('the drawing for a room', () => {
  it('wraps a string more often where it is narrow', () => {
    const rows = (room: typeof desk) => {
      const heaters = bestDrawing(consoleString, room)!.parts.filter(
        ({ part }) => part.kind === 'heater',
      );
      return new Set(heaters.map(({ y }) => y)).size;
    };
    expect(rows(phone)).toBeGreaterThan(rows(desk));
  });

  it('is shown whole where it can be read', () => {
    const { extent } = bestDrawing(halfWaveSupply, desk)!;
    expect(firstView(extent, desk)).toEqual(wholeView(extent, desk));
  });

  it('starts legible at its top left where it is too long', () => {
    const { extent } = bestDrawing(longString(80), phone)!;
    const view = firstView(extent, phone);
    expect(view.zoom).toBeGreaterThanOrEqual(0.72);
    expect(view.y).toBeCloseTo(-extent.y * view.zoom);
  });
});
