import { type Suspect } from '@engine/diagnosis-types';
import { type Netlist } from '@engine/netlist/types';
import { makeStyles, mergeClasses, Text, tokens } from '@fluentui/react-components';
import { type CaseReading } from '@/lib/bench/case-reading';
import { labelForReading } from '@/lib/bench/places';
import { readingInWords } from '@/lib/bench/quantities';
import { speaksInWords, wouldShowInWords } from '../words/suspect-words';

interface EvidenceTableProps {
  suspect: Suspect;
  /** Readings the diagnosis was made from, in its order. */
  readings: readonly (CaseReading | undefined)[];
  netlist: Netlist;
}

const useStyles = makeStyles({
  scroll: { overflowX: 'auto' },
  table: { borderCollapse: 'collapse', width: '100%', fontSize: tokens.fontSizeBase200 },
  cell: {
    padding: `${tokens.spacingVerticalXS} ${tokens.spacingHorizontalS} ${tokens.spacingVerticalXS} 0`,
    borderBottom: `1px solid ${tokens.colorNeutralStroke3}`,
    textAlign: 'left',
    verticalAlign: 'top',
    fontWeight: tokens.fontWeightRegular,
  },
  head: { color: tokens.colorNeutralForeground3, fontWeight: tokens.fontWeightSemibold },
  note: { color: tokens.colorNeutralForeground3 },
  value: { fontVariantNumeric: 'tabular-nums', whiteSpace: 'nowrap' },
  strong: { fontWeight: tokens.fontWeightSemibold },
});

/** Reading by reading: what was measured, what this suspect would show, and how it speaks. */
export function EvidenceTable({ suspect, readings, netlist }: EvidenceTableProps) {
  const styles = useStyles();
  const rows = suspect.evidence
    .flatMap((evidence) => {
      const reading = readings[evidence.reading];
      return reading ? [{ evidence, reading }] : [];
    })
    .sort((a, b) => strength(b.evidence.times) - strength(a.evidence.times));
  if (rows.length === 0) return null;
  return (
    <div className={styles.scroll}>
      <Text size={200} block className={styles.note}>
        More or less likely than if nothing were wrong, the loudest first.
      </Text>
      <table className={styles.table} aria-label={`Readings for and against ${suspect.title}`}>
        <thead>
          <tr>
            {['Reading', 'Measured', 'Would show', 'How it speaks'].map((title) => (
              <th key={title} scope="col" className={mergeClasses(styles.cell, styles.head)}>
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ evidence, reading }) => (
            <tr key={reading.id}>
              <th scope="row" className={styles.cell}>
                {labelForReading(netlist, reading)}
              </th>
              <td className={mergeClasses(styles.cell, styles.value)}>{readingInWords(reading)}</td>
              <td className={styles.cell}>
                {reading.take === 'sign' ? '–' : wouldShowInWords(evidence, reading)}
              </td>
              <td
                className={mergeClasses(styles.cell, strength(evidence.times) > 1 && styles.strong)}
              >
                {speaksInWords(evidence)}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

/** How loudly a reading speaks, either way, in powers of ten. */
function strength(times: number): number {
  return times > 0 ? Math.abs(Math.log10(times)) : 99;
}
