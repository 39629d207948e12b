import { type Netlist } from '@engine/netlist/types';
import {
  makeStyles,
  Popover,
  PopoverSurface,
  Spinner,
  Text,
  tokens,
} from '@fluentui/react-components';
import { type CaseReading } from '@/lib/bench/case-reading';
import { labelForReading, placeKey } from '@/lib/bench/places';
import { problemInWords } from '@/lib/bench/problem';
import { readingInWords } from '@/lib/bench/quantities';
import { useReadingHistory } from '../api/get-reading-history';
import { type GridRow } from '../grid/grid-model';

interface RowHistoryProps {
  caseId: string;
  netlist: Netlist;
  /** Row asked about and its button; one history is open at a time. */
  row: GridRow;
  target: HTMLElement;
  onClose: () => void;
}

const useStyles = makeStyles({
  surface: { maxWidth: 'min(340px, 90vw)', maxHeight: '50vh', overflowY: 'auto' },
  list: { margin: 0, padding: 0, listStyleType: 'none' },
  item: {
    padding: `${tokens.spacingVerticalXS} 0`,
    borderBottom: `1px solid ${tokens.colorNeutralStroke3}`,
  },
  value: { fontWeight: tokens.fontWeightSemibold, fontVariantNumeric: 'tabular-nums' },
  past: { textDecorationLine: 'line-through', color: tokens.colorNeutralForeground3 },
  note: {
    display: 'block',
    color: tokens.colorNeutralForeground3,
    fontSize: tokens.fontSizeBase200,
  },
});

/** All readings ever taken in one row, fetched when it is opened. */
export function RowHistory({ caseId, netlist, row, target, onClose }: RowHistoryProps) {
  const styles = useStyles();
  const history = useReadingHistory(caseId);
  const keys = new Set(Object.values(row.cells).map(placeKey));
  const readings = (history.data ?? [])
    .filter((reading) => keys.has(placeKey(reading)))
    .sort((a, b) => (b.takenAt ?? '').localeCompare(a.takenAt ?? ''));

  return (
    <Popover
      open
      trapFocus
      positioning={{ target, position: 'below', align: 'end' }}
      onOpenChange={(_event, { open }) => {
        if (open) return;
        onClose();
        target.focus();
      }}
    >
      <PopoverSurface className={styles.surface} aria-label={`History of ${row.label}`}>
        {history.isPending ? (
          <Spinner size="tiny" label="Looking it up" />
        ) : history.isError ? (
          <Text role="alert">{problemInWords(history.error)}</Text>
        ) : readings.length === 0 ? (
          <Text>Nothing has been read here yet.</Text>
        ) : (
          <ul className={styles.list}>
            {readings.map((reading) => (
              <li key={reading.id} className={styles.item}>
                <span className={isPast(reading) ? styles.past : styles.value}>
                  {readingInWords(reading)}
                </span>{' '}
                {labelForReading(netlist, reading)}
                <span className={styles.note}>{noteOf(reading)}</span>
              </li>
            ))}
          </ul>
        )}
      </PopoverSurface>
    </Popover>
  );
}

function isPast(reading: CaseReading): boolean {
  return !!reading.isReplaced || !!reading.isWithdrawn;
}

function noteOf(reading: CaseReading): string {
  const when = reading.takenAt
    ? new Date(reading.takenAt).toLocaleString(undefined, {
        dateStyle: 'medium',
        timeStyle: 'short',
      })
    : '';
  const state = reading.isWithdrawn ? 'taken back' : reading.isReplaced ? 'replaced later' : '';
  return [reading.takenBy, when, state].filter(Boolean).join(', ');
}
