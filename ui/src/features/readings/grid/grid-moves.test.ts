import { consoleString } from '@/testing/fixtures/circuits';
import { describe, expect, it } from 'vitest';
import { sectionsOf } from './grid-model';
import { moveInGrid } from './grid-moves';

const [cold] = sectionsOf(consoleString);
const lastRow = cold.rows.length - 1;
const firstPart = cold.rows.findIndex(({ kind }) => kind === 'part');

describe('moving in the grid', () => {
  it('goes down and up a column', () => {
    expect(moveInGrid(cold, { row: 0, column: 0 }, 'down')).toEqual({ row: 1, column: 0 });
    expect(moveInGrid(cold, { row: 1, column: 0 }, 'up')).toEqual({ row: 0, column: 0 });
  });

  it('stops at the edges', () => {
    expect(moveInGrid(cold, { row: 0, column: 0 }, 'up')).toBeNull();
    expect(moveInGrid(cold, { row: 0, column: 0 }, 'left')).toBeNull();
    expect(moveInGrid(cold, { row: lastRow, column: 2 }, 'right')).toBeNull();
  });

  it('passes over rows without a cell in the column', () => {
    expect(moveInGrid(cold, { row: firstPart, column: 1 }, 'up')).toBeNull();
    expect(moveInGrid(cold, { row: 0, column: 0 }, 'right')).toBeNull();
  });

  it('goes on with Enter to the top of the next column', () => {
    expect(moveInGrid(cold, { row: lastRow, column: 0 }, 'next')).toEqual({
      row: firstPart,
      column: 1,
    });
    expect(moveInGrid(cold, { row: lastRow, column: 2 }, 'next')).toBeNull();
  });
});
