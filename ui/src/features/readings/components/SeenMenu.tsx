import { type Seen } from '@engine/netlist/types';
import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { type KeyboardEvent } from 'react';
import { type Labels, labelForReading, type Place, placeKey } from '@/lib/bench/places';
import { SEEN_WORDS } from '@/lib/bench/takes';
import { type GridMove } from '../grid/grid-moves';
import { type CellEntry } from '../hooks/useReadingEntry';

interface SeenMenuProps {
  place: Place;
  netlist: Labels;
  entry: CellEntry;
  /** Which looks are offered: those at a dead set or those at a powered one. */
  isPowered: boolean;
  isReadOnly: boolean;
  isTabStop: boolean;
  isNext: boolean;
  onSee: (seen: Seen | undefined) => void;
  onMove: (move: GridMove) => void;
  onFocus: () => void;
}

const useStyles = makeStyles({
  root: {
    boxSizing: 'border-box',
    width: '100%',
    minWidth: '104px',
    height: '34px',
    padding: `0 ${tokens.spacingHorizontalXS}`,
    border: '1px solid transparent',
    borderBottomColor: tokens.colorNeutralStroke2,
    borderRadius: tokens.borderRadiusMedium,
    backgroundColor: 'transparent',
    color: tokens.colorNeutralForeground1,
    fontFamily: 'inherit',
    fontSize: tokens.fontSizeBase300,
    '& option': {
      backgroundColor: tokens.colorNeutralBackground1,
      color: tokens.colorNeutralForeground1,
    },
    ':hover': { backgroundColor: tokens.colorNeutralBackground1Hover },
    ':focus-visible': {
      outline: `2px solid ${tokens.colorStrokeFocus2}`,
      outlineOffset: '-1px',
    },
    '@media (pointer: coarse)': { height: '44px' },
  },
  empty: { color: tokens.colorNeutralForeground4 },
  pending: { fontStyle: 'italic' },
  next: {
    border: `2px dashed ${tokens.colorBrandStroke1}`,
    backgroundColor: tokens.colorBrandBackground2,
  },
  error: { margin: 0, color: tokens.colorStatusDangerForeground1, whiteSpace: 'normal' },
});

const MOVES: Partial<Record<string, GridMove>> = {
  ArrowUp: 'up',
  ArrowDown: 'down',
  ArrowLeft: 'left',
  ArrowRight: 'right',
};

/** How a part looks, chosen from the few words there are for it. Space opens the list. */
export function SeenMenu(props: SeenMenuProps) {
  const { place, netlist, entry, isPowered } = props;
  const styles = useStyles();
  const words = (Object.keys(SEEN_WORDS) as Seen[]).filter(
    (seen) => SEEN_WORDS[seen].isPowered === isPowered,
  );
  const { seen } = entry;
  const shown = seen && SEEN_WORDS[seen].isPowered === isPowered ? seen : undefined;

  // Arrows move in the grid as in every other cell; changing the value in passing would be a trap.
  const handleKeyDown = (event: KeyboardEvent) => {
    const move = MOVES[event.key];
    if (!move || event.altKey) return;
    event.preventDefault();
    props.onMove(move);
  };

  return (
    <>
      <select
        className={mergeClasses(
          styles.root,
          !shown && styles.empty,
          entry.isPending && styles.pending,
          props.isNext && styles.next,
        )}
        data-place={placeKey(place)}
        aria-label={`${labelForReading(netlist, place)}, ${isPowered ? 'powered' : 'power off'}`}
        tabIndex={props.isTabStop ? 0 : -1}
        disabled={props.isReadOnly}
        value={shown ?? ''}
        onChange={(event) => props.onSee((event.target.value || undefined) as Seen | undefined)}
        onKeyDown={handleKeyDown}
        onFocus={props.onFocus}
      >
        <option value="">–</option>
        {words.map((word) => (
          <option key={word} value={word}>
            {SEEN_WORDS[word].word}
          </option>
        ))}
      </select>
      {entry.error && (
        <p role="alert" className={styles.error}>
          {entry.error}
        </p>
      )}
    </>
  );
}
