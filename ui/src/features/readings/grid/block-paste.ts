import { type Place } from '@/lib/bench/places';
import { type GridSection } from './grid-model';
import { type GridSpot, moveInGrid } from './grid-moves';

/** A pasted value and the place it goes to. */
export interface PastedValue {
  place: Place;
  text: string;
}

/**
 * Splits what a spreadsheet puts on the clipboard.
 *
 * @param text rows by line break, columns by tab, or by semicolon where there is no tab.
 * @returns trimmed cells; empty lines at the end are left out.
 */
export function parseBlock(text: string): string[][] {
  const lines = text.replace(/\r\n?/g, '\n').split('\n');
  while (lines.length > 0 && lines[lines.length - 1].trim() === '') lines.pop();
  const separator = text.includes('\t') ? '\t' : ';';
  return lines.map((line) => line.split(separator).map((cell) => cell.trim()));
}

/** True when a pasted text is more than one value. */
export function isBlock(text: string): boolean {
  const block = parseBlock(text);
  return block.length > 1 || (block[0]?.length ?? 0) > 1;
}

/**
 * Says where each value of a pasted block goes.
 *
 * A block whose first column names rows of the section (a label, a node or a designator) goes to those
 * rows; any other block fills downwards from the cell, its columns side by side. Empty cells are skipped.
 *
 * @param section rows and columns pasted into.
 * @param from cell that has the focus.
 * @param block cells as `parseBlock` gives them.
 * @returns values with their places, and how many found none.
 */
export function placeBlock(
  section: GridSection,
  from: GridSpot,
  block: readonly string[][],
): { values: PastedValue[]; left: number } {
  const named = block.filter((row) => row.length > 1 && rowNamed(section, row[0]) >= 0);
  const isNamed = named.length > 0 && named.length >= block.length / 2;
  const values: PastedValue[] = [];
  let left = 0;
  let spot: GridSpot | null = from;
  for (const cells of block) {
    const row: number = isNamed ? rowNamed(section, cells[0]) : (spot?.row ?? -1);
    (isNamed ? cells.slice(1) : cells).forEach((text, offset) => {
      if (text === '') return;
      const place = section.rows[row]?.cells[section.columns[from.column + offset]];
      if (place && place.take !== 'sign') values.push({ place, text });
      else left++;
    });
    if (!isNamed && spot) spot = moveInGrid(section, spot, 'down');
  }
  return { values, left };
}

function rowNamed(section: GridSection, name: string): number {
  const wanted = name.toLowerCase();
  return section.rows.findIndex(
    (row) => row.label.toLowerCase() === wanted || row.id.split(' ')[1]?.toLowerCase() === wanted,
  );
}
