import { type GridSection } from './grid-model';

/** A cell by its row and its column, counted within one section. */
export interface GridSpot {
  row: number;
  column: number;
}

export type GridMove = 'up' | 'down' | 'left' | 'right' | 'next' | 'first' | 'last';

/**
 * Finds the cell that a key leads to.
 *
 * `next` is Enter: down the column, then on to the top of the next column, so that a range of the meter
 * is used to the end before it is changed.
 *
 * @param section rows and columns; not every row has a cell in every column.
 * @param from cell that has the focus.
 * @param move where to.
 * @returns the cell, or null when there is none that way.
 */
export function moveInGrid(section: GridSection, from: GridSpot, move: GridMove): GridSpot | null {
  const { row, column } = from;
  switch (move) {
    case 'up':
      return search(section, from, -1, 0);
    case 'down':
      return search(section, from, 1, 0);
    case 'left':
      return search(section, from, 0, -1);
    case 'right':
      return search(section, from, 0, 1);
    case 'first':
      return search(section, { row, column: -1 }, 0, 1);
    case 'last':
      return search(section, { row, column: section.columns.length }, 0, -1);
    case 'next': {
      const below = search(section, from, 1, 0);
      if (below) return below;
      for (let next = column + 1; next < section.columns.length; next++) {
        const top = search(section, { row: -1, column: next }, 1, 0);
        if (top) return top;
      }
      return null;
    }
  }
}

function search(
  section: GridSection,
  from: GridSpot,
  rowStep: number,
  columnStep: number,
): GridSpot | null {
  let { row, column } = from;
  for (;;) {
    row += rowStep;
    column += columnStep;
    if (row < 0 || row >= section.rows.length) return null;
    if (column < 0 || column >= section.columns.length) return null;
    if (section.rows[row].cells[section.columns[column]]) return { row, column };
  }
}
