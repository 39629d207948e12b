import { consoleString } from '@/testing/fixtures/circuits';
import { describe, expect, it } from 'vitest';
import { isBlock, parseBlock, placeBlock } from './block-paste';
import { sectionsOf } from './grid-model';

const [cold] = sectionsOf(consoleString);
const firstPart = cold.rows.findIndex(({ kind }) => kind === 'part');

describe('a pasted block', () => {
  it('is split by lines and tabs, whatever the line ends', () => {
    expect(parseBlock('22.1\t22.0\r\n15\t14.8\r\n')).toEqual([
      ['22.1', '22.0'],
      ['15', '14.8'],
    ]);
  });

  it('is told from a single value', () => {
    expect(isBlock('4.7k')).toBe(false);
    expect(isBlock('4.7k\n')).toBe(false);
    expect(isBlock('4.7k\n5')).toBe(true);
    expect(isBlock('R1A;22')).toBe(true);
  });

  it('fills downwards from the cell', () => {
    const { values, left } = placeBlock(cold, { row: 1, column: 0 }, [['60'], ['38'], ['OL']]);
    expect(values.map(({ place, text }) => [place.at?.[0], text])).toEqual([
      ['B2', '60'],
      ['B3', '38'],
      ['B4', 'OL'],
    ]);
    expect(left).toBe(0);
  });

  it('fills two columns side by side', () => {
    const { values } = placeBlock(cold, { row: firstPart, column: 0 }, [
      ['0.1', '0.2'],
      ['0.3', ''],
    ]);
    expect(values.map(({ place, text }) => `${place.take} ${place.part} ${text}`)).toEqual([
      'ohms F1 0.1',
      'lifted-ohms F1 0.2',
      'ohms S1 0.3',
    ]);
  });

  it('goes by names where its first column holds them', () => {
    const { values, left } = placeBlock(cold, { row: 0, column: 0 }, [
      ['R1B', '15.2'],
      ['Dropper lug 2', '38'],
      ['R99', '1'],
    ]);
    expect(values.map(({ place, text }) => [place.part ?? place.at?.[0], text])).toEqual([
      ['R1B', '15.2'],
      ['B3', '38'],
    ]);
    expect(left).toBe(1);
  });

  it('counts what runs over the end', () => {
    const { values, left } = placeBlock(cold, { row: cold.rows.length - 1, column: 0 }, [
      ['1'],
      ['2'],
    ]);
    expect(values).toHaveLength(1);
    expect(left).toBe(1);
  });
});
