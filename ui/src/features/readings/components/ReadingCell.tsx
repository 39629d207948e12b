import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { type ClipboardEvent, type KeyboardEvent, useId } from 'react';
import { type Labels, labelForReading, type Place, placeKey } from '@/lib/bench/places';
import { takenInWords } from '@/lib/bench/quantities';
import { type GridMove } from '../grid/grid-moves';
import { type CellEntry } from '../hooks/useReadingEntry';

interface ReadingCellProps {
  place: Place;
  netlist: Labels;
  entry: CellEntry;
  isReadOnly: boolean;
  /** True for the one cell of the grid that Tab reaches. */
  isTabStop: boolean;
  /** True for the reading suggested next. */
  isNext: boolean;
  onType: (text: string) => void;
  /** Enters what was typed; false when it was not taken. */
  onEnter: () => boolean;
  onRevert: () => void;
  onMove: (move: GridMove) => void;
  onFocus: () => void;
  /** Takes a pasted text; true when it was a block and has been dealt with. */
  onPasteText: (text: string) => boolean;
}

const useStyles = makeStyles({
  root: { position: 'relative' },
  input: {
    boxSizing: 'border-box',
    width: '100%',
    minWidth: '92px',
    height: '34px',
    padding: `0 ${tokens.spacingHorizontalS}`,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: tokens.borderRadiusMedium,
    backgroundColor: 'transparent',
    color: tokens.colorNeutralForeground1,
    fontFamily: 'inherit',
    fontSize: tokens.fontSizeBase300,
    fontVariantNumeric: 'tabular-nums',
    textAlign: 'right',
    ':hover': { backgroundColor: tokens.colorNeutralBackground1Hover },
    ':focus': {
      outline: `2px solid ${tokens.colorStrokeFocus2}`,
      outlineOffset: '-1px',
      backgroundColor: tokens.colorNeutralBackground1,
    },
    '@media (pointer: coarse)': { height: '44px' },
  },
  next: {
    border: `2px dashed ${tokens.colorBrandStroke1}`,
    backgroundColor: tokens.colorBrandBackground2,
  },
  pending: { fontStyle: 'italic' },
  wrong: { border: `2px solid ${tokens.colorStatusDangerBorder2}` },
  readOnly: { border: '1px solid transparent', cursor: 'default' },
  error: {
    margin: 0,
    padding: `${tokens.spacingVerticalXXS} ${tokens.spacingHorizontalXXS}`,
    maxWidth: '220px',
    fontSize: tokens.fontSizeBase200,
    lineHeight: tokens.lineHeightBase200,
    color: tokens.colorStatusDangerForeground1,
    textAlign: 'left',
    whiteSpace: 'normal',
  },
});

const MOVES: Partial<Record<string, GridMove>> = {
  ArrowUp: 'up',
  ArrowDown: 'down',
  Enter: 'next',
};

/** One value of the grid: typed as on the meter, entered with Enter or by leaving. */
export function ReadingCell(props: ReadingCellProps) {
  const { place, entry, isReadOnly, onMove } = props;
  const styles = useStyles();
  const errorId = useId();
  const saved = entry.value === undefined ? '' : takenInWords(entry.value, place.take);
  const text = entry.draft ?? saved;

  const handleKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    const { selectionStart, selectionEnd, value } = event.currentTarget;
    const isWhole = selectionStart === 0 && selectionEnd === value.length;
    const move =
      MOVES[event.key] ??
      (event.key === 'ArrowLeft' && (isWhole || selectionEnd === 0) ? 'left' : undefined) ??
      (event.key === 'ArrowRight' && (isWhole || selectionStart === value.length)
        ? 'right'
        : undefined);
    if (event.key === 'Escape') {
      if (entry.draft !== undefined || entry.error) event.stopPropagation();
      props.onRevert();
      const field = event.currentTarget;
      requestAnimationFrame(() => field.select());
    } else if (move) {
      event.preventDefault();
      if (props.onEnter() || event.key !== 'Enter') onMove(move);
    }
  };
  const handlePaste = (event: ClipboardEvent<HTMLInputElement>) => {
    if (!isReadOnly && props.onPasteText(event.clipboardData.getData('text'))) {
      event.preventDefault();
    }
  };

  return (
    <div className={styles.root}>
      <input
        className={mergeClasses(
          styles.input,
          entry.isPending && styles.pending,
          isReadOnly && styles.readOnly,
          props.isNext && styles.next,
          !!entry.error && styles.wrong,
        )}
        data-place={placeKey(place)}
        aria-label={labelForReading(props.netlist, place)}
        aria-invalid={!!entry.error}
        aria-describedby={entry.error ? errorId : undefined}
        inputMode="decimal"
        autoComplete="off"
        spellCheck={false}
        enterKeyHint="next"
        tabIndex={props.isTabStop ? 0 : -1}
        readOnly={isReadOnly}
        value={text}
        placeholder={isReadOnly ? '' : undefined}
        onChange={(event) => props.onType(event.target.value)}
        onKeyDown={handleKeyDown}
        onPaste={handlePaste}
        onFocus={(event) => {
          event.target.select();
          props.onFocus();
        }}
        onBlur={() => entry.draft !== undefined && props.onEnter()}
      />
      {entry.error && (
        <p id={errorId} role="alert" className={styles.error}>
          {entry.error}
        </p>
      )}
    </div>
  );
}
