import { type Take } from '@engine/netlist/types';
import { Button, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { computedInWords, intervalInWords, takenInWords } from '@/lib/bench/quantities';
import { TAKE_WORDS } from '@/lib/bench/takes';
import { type ComparePoint } from '@engine/diagnosis-types';
import { deviationPhrase, verdictOf } from '../plot/compare-model';
import { MARKS } from './StringPlot';

interface CompareTableProps {
  points: readonly ComparePoint[];
  take: Take;
  onShowWorking?: (part: string) => void;
}

const useStyles = makeStyles({
  scroll: { overflowX: 'auto' },
  table: { borderCollapse: 'collapse', fontSize: tokens.fontSizeBase300, width: '100%' },
  head: {
    padding: `${tokens.spacingVerticalXS} ${tokens.spacingHorizontalS}`,
    fontSize: tokens.fontSizeBase200,
    fontWeight: tokens.fontWeightSemibold,
    color: tokens.colorNeutralForeground3,
    textAlign: 'right',
    borderBottom: `1px solid ${tokens.colorNeutralStroke1}`,
    whiteSpace: 'nowrap',
  },
  words: { textAlign: 'left', minWidth: '150px' },
  cell: {
    padding: `${tokens.spacingVerticalS} ${tokens.spacingHorizontalS}`,
    borderBottom: `1px solid ${tokens.colorNeutralStroke3}`,
    textAlign: 'right',
    whiteSpace: 'nowrap',
    fontVariantNumeric: 'tabular-nums',
  },
  place: { textAlign: 'left', fontWeight: tokens.fontWeightSemibold },
  verdict: { whiteSpace: 'normal', textAlign: 'left' },
  quiet: { color: tokens.colorNeutralForeground3 },
  mark: { marginRight: tokens.spacingHorizontalXS, verticalAlign: '-3px' },
  inside: { fill: tokens.colorNeutralForeground1 },
  edge: { fill: tokens.colorStatusWarningForeground1 },
  outside: { fill: tokens.colorStatusDangerForeground1 },
  measured: { fontWeight: tokens.fontWeightSemibold },
  button: { '@media (pointer: coarse)': { minHeight: '44px' } },
});

/** The same values as a table. */
export function CompareTable({ points, take, onShowWorking }: CompareTableProps) {
  const styles = useStyles();
  const hasPublished = points.some(({ published }) => typeof published === 'number');
  const hasWorking = !!onShowWorking && points.some(({ kind }) => kind === 'part');
  return (
    <div className={styles.scroll}>
      <table
        className={styles.table}
        aria-label={`${TAKE_WORDS[take].title}, measured and computed`}
      >
        <thead>
          <tr>
            <th scope="col" className={mergeClasses(styles.head, styles.place)}>
              Place
            </th>
            <th scope="col" className={styles.head}>
              Measured
            </th>
            <th scope="col" className={styles.head}>
              Computed
            </th>
            <th scope="col" className={mergeClasses(styles.head, styles.words)}>
              In words
            </th>
            <th scope="col" className={styles.head}>
              Healthy range
            </th>
            {hasPublished && (
              <th scope="col" className={styles.head}>
                Published
              </th>
            )}
            {hasWorking && <th className={styles.head} />}
          </tr>
        </thead>
        <tbody>
          {points.map((point) => {
            const verdict = verdictOf(point);
            return (
              <tr key={`${point.kind} ${point.key}`}>
                <th scope="row" className={mergeClasses(styles.cell, styles.place)}>
                  {point.label}
                </th>
                <td className={mergeClasses(styles.cell, styles.measured)}>
                  {takenInWords(point.measured, take)}
                </td>
                <td className={styles.cell}>{computedInWords(point.value, take)}</td>
                <td
                  className={mergeClasses(
                    styles.cell,
                    styles.verdict,
                    (!verdict || verdict === 'inside') && styles.quiet,
                  )}
                >
                  {verdict && (
                    <svg
                      width={18}
                      height={18}
                      viewBox="-9 -9 18 18"
                      className={styles.mark}
                      aria-hidden
                    >
                      <path d={MARKS[verdict]} className={styles[verdict]} />
                    </svg>
                  )}
                  {deviationPhrase(point)}
                </td>
                <td className={mergeClasses(styles.cell, styles.quiet)}>
                  {point.low === null || point.high === null
                    ? '–'
                    : intervalInWords(point.low, point.high, take)}
                </td>
                {hasPublished && (
                  <td className={styles.cell}>{takenInWords(point.published, take)}</td>
                )}
                {hasWorking && (
                  <td className={styles.cell}>
                    {point.part && (
                      <Button
                        size="small"
                        appearance="subtle"
                        className={styles.button}
                        aria-label={`Working for ${point.part}`}
                        onClick={() => onShowWorking?.(point.part!)}
                      >
                        Working
                      </Button>
                    )}
                  </td>
                )}
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}
