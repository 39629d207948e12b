import { type Seen } from '@engine/netlist/types';
import {
  Button,
  makeStyles,
  Menu,
  MenuDivider,
  MenuItem,
  MenuList,
  MenuPopover,
  MenuTrigger,
  mergeClasses,
  tokens,
} from '@fluentui/react-components';
import { type KeyboardEvent } from 'react';
import { labelForReading, type Place, placeKey } from '@/lib/bench/places';
import { SEEN_WORDS } from '@/lib/bench/takes';
import { type GridMove } from '../grid/grid-moves';
import { type CellEntry } from '../hooks/useReadingEntry';

interface SeenMenuProps {
  place: Place;
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
  button: {
    width: '100%',
    minWidth: '104px',
    minHeight: '34px',
    justifyContent: 'flex-start',
    fontWeight: tokens.fontWeightRegular,
    paddingLeft: tokens.spacingHorizontalS,
    paddingRight: tokens.spacingHorizontalS,
    '@media (pointer: coarse)': { minHeight: '44px' },
  },
  empty: { color: tokens.colorNeutralForeground4 },
  pending: { fontStyle: 'italic' },
  next: {
    border: `2px dashed ${tokens.colorBrandStroke1}`,
    backgroundColor: tokens.colorBrandBackground2,
  },
});

const MOVES: Partial<Record<string, GridMove>> = {
  ArrowUp: 'up',
  ArrowDown: 'down',
  ArrowLeft: 'left',
  ArrowRight: 'right',
};

/** How a part looks, chosen from the few words there are for it. */
export function SeenMenu(props: SeenMenuProps) {
  const { place, entry, isPowered } = props;
  const styles = useStyles();
  const words = (Object.keys(SEEN_WORDS) as Seen[]).filter(
    (seen) => SEEN_WORDS[seen].isPowered === isPowered,
  );
  const shown =
    entry.seen && SEEN_WORDS[entry.seen].isPowered === isPowered ? entry.seen : undefined;

  const handleKeyDown = (event: KeyboardEvent) => {
    const move = MOVES[event.key];
    if (!move || event.altKey) return;
    event.preventDefault();
    props.onMove(move);
  };

  return (
    <Menu>
      <MenuTrigger disableButtonEnhancement>
        <Button
          appearance="subtle"
          size="small"
          className={mergeClasses(
            styles.button,
            !shown && styles.empty,
            entry.isPending && styles.pending,
            props.isNext && styles.next,
          )}
          data-place={placeKey(place)}
          data-look={isPowered ? 'powered' : 'cold'}
          aria-label={`${labelForReading({ reference: '' }, place)}: ${
            shown ? SEEN_WORDS[shown].word : 'not looked at'
          }`}
          tabIndex={props.isTabStop ? 0 : -1}
          disabledFocusable={props.isReadOnly}
          onKeyDown={handleKeyDown}
          onFocus={props.onFocus}
        >
          {shown ? SEEN_WORDS[shown].word : 'Look'}
        </Button>
      </MenuTrigger>
      <MenuPopover>
        <MenuList>
          {words.map((seen) => (
            <MenuItem key={seen} onClick={() => props.onSee(seen)}>
              {SEEN_WORDS[seen].word}
            </MenuItem>
          ))}
          {entry.seen && <MenuDivider />}
          {entry.seen && <MenuItem onClick={() => props.onSee(undefined)}>Take it back</MenuItem>}
        </MenuList>
      </MenuPopover>
    </Menu>
  );
}
