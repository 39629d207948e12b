import { type Netlist } from '@engine/netlist/types';
import { mergeClasses } from '@fluentui/react-components';
import { HistoryRegular } from '@fluentui/react-icons';
import { useState } from 'react';
import { type Place, placeKey } from '@/lib/bench/places';
import { TAKE_WORDS } from '@/lib/bench/takes';
import { type GridRow, type GridSection } from '../grid/grid-model';
import { type GridSpot, moveInGrid } from '../grid/grid-moves';
import { type ReadingEntry } from '../hooks/useReadingEntry';
import { ReadingCell } from './ReadingCell';
import { RowHistory } from './RowHistory';
import { useSectionTableStyles } from './SectionTable.styles';
import { SeenMenu } from './SeenMenu';

interface SectionTableProps {
  caseId: string;
  netlist: Netlist;
  section: GridSection;
  entry: ReadingEntry;
  isReadOnly: boolean;
  /** Place of the reading suggested next. */
  next?: Place;
  /** Takes a pasted text at a cell; true when it was a block. */
  onPasteText: (section: GridSection, spot: GridSpot, text: string) => boolean;
  onFocusPlace: (place: Place) => void;
}

/** Readings in one state of the set: a grid in which arrows and Enter move. */
export function SectionTable(props: SectionTableProps) {
  const { section, netlist, entry, isReadOnly, next } = props;
  const styles = useSectionTableStyles();
  const [stop, setStop] = useState<GridSpot>(() => firstCell(section));
  const [asked, setAsked] = useState<{ row: GridRow; target: HTMLElement }>();
  const nextKey = next && placeKey(next);

  const move = (from: GridSpot, element: HTMLElement, way: Parameters<typeof moveInGrid>[2]) => {
    const spot = moveInGrid(section, from, way);
    if (!spot) return;
    const selector = `[data-row="${spot.row}"][data-column="${spot.column}"] [data-place]`;
    element.closest('table')?.querySelector<HTMLElement>(selector)?.focus();
  };

  return (
    <div className={styles.scroll}>
      <table
        role="grid"
        className={styles.table}
        aria-label={`Readings, ${section.title.toLowerCase()}`}
      >
        <thead>
          <tr>
            <th scope="col" className={mergeClasses(styles.head, styles.place)}>
              Place
            </th>
            {section.columns.map((take) => (
              <th
                key={take}
                scope="col"
                className={mergeClasses(styles.head, take === 'sign' && styles.look)}
              >
                {TAKE_WORDS[take].title}
              </th>
            ))}
            <th scope="col" className={mergeClasses(styles.head, styles.historyColumn)}>
              <span className={styles.hidden}>History</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {section.rows.map((row, rowIndex) => (
            <tr
              key={row.id}
              className={mergeClasses(
                styles.row,
                rowIndex > 0 && section.rows[rowIndex - 1].kind !== row.kind && styles.firstOfKind,
              )}
            >
              <th scope="row" className={styles.place}>
                <span className={styles.label}>{row.label}</span>
                <span className={styles.detail}>{row.detail}</span>
              </th>
              {section.columns.map((take, column) => {
                const place = row.cells[take];
                if (!place) return <td key={take} className={styles.blank} />;
                const spot = { row: rowIndex, column };
                const common = {
                  place,
                  netlist,
                  entry: entry.entryOf(place),
                  isReadOnly,
                  isTabStop: stop.row === rowIndex && stop.column === column,
                  isNext: placeKey(place) === nextKey,
                  onFocus: () => {
                    setStop(spot);
                    props.onFocusPlace(place);
                  },
                };
                const onMove = (way: Parameters<typeof moveInGrid>[2]) =>
                  move(spot, document.activeElement as HTMLElement, way);
                return (
                  <td key={take} className={styles.cell} data-row={rowIndex} data-column={column}>
                    {take === 'sign' ? (
                      <SeenMenu
                        {...common}
                        isPowered={section.id === 'powered'}
                        onSee={(seen) => entry.see(place, seen)}
                        onMove={onMove}
                      />
                    ) : (
                      <ReadingCell
                        {...common}
                        onType={(text) => entry.type(place, text)}
                        onEnter={() => entry.enter(place)}
                        onRevert={() => entry.revert(place)}
                        onMove={onMove}
                        onPasteText={(text) => props.onPasteText(section, spot, text)}
                      />
                    )}
                  </td>
                );
              })}
              <td className={styles.historyColumn}>
                <button
                  type="button"
                  className={styles.history}
                  aria-label={`History of ${row.label}`}
                  aria-haspopup="dialog"
                  tabIndex={stop.row === rowIndex ? 0 : -1}
                  onClick={(event) => setAsked({ row, target: event.currentTarget })}
                >
                  <HistoryRegular fontSize={18} />
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {asked && (
        <RowHistory
          caseId={props.caseId}
          netlist={netlist}
          {...asked}
          onClose={() => setAsked(undefined)}
        />
      )}
    </div>
  );
}

function firstCell(section: GridSection): GridSpot {
  return moveInGrid(section, { row: 0, column: -1 }, 'first') ?? { row: 0, column: 0 };
}
