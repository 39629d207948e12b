import { type Netlist, type Take } from '@engine/netlist/types';
import { makeStyles, mergeClasses, Tab, TabList, Text, tokens } from '@fluentui/react-components';
import { useRef, useState } from 'react';
import { EmptyState } from '@/components/EmptyState';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { type CaseReading, revisionOfReadings } from '@/lib/bench/case-reading';
import { TAKE_WORDS } from '@/lib/bench/takes';
import { useCompare } from '../api/get-compare';
import { useWidth } from '../hooks/useWidth';
import { firstTake, plottedOf, pointsOf, takesOf } from '../plot/compare-model';
import { plotOf } from '../plot/plot-geometry';
import { CompareTable } from './CompareTable';
import { PlotLegend } from './PlotLegend';
import { StringPlot } from './StringPlot';

export interface ComparePanelProps {
  caseId: string;
  netlist: Netlist;
  /** Readings as the service keeps them; compared again when they change. */
  readings: readonly CaseReading[];
  /** Version of the case; compared again when circuit or line voltage change. */
  caseVersion?: number;
  /** Offered on each part row: show the working for it. */
  onShowWorking?: (part: string) => void;
}

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalM, minWidth: 0 },
  stale: { opacity: 0.6 },
  sheet: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalM,
    minWidth: 0,
    padding: tokens.spacingHorizontalL,
    borderRadius: tokens.borderRadiusLarge,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    '@media (max-width: 640px)': { padding: tokens.spacingHorizontalM },
  },
  plot: { minWidth: 0, maxWidth: '900px' },
  tabs: { flexWrap: 'wrap' },
});

/** Measured against computed: a plot down the string, and the same values as a table. */
export function ComparePanel(props: ComparePanelProps) {
  const { caseId, netlist, readings, caseVersion, onShowWorking } = props;
  const styles = useStyles();
  const compare = useCompare(caseId, `${caseVersion ?? ''}:${revisionOfReadings(readings)}`);
  const [chosen, setChosen] = useState<Take>();
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame);

  const all = compare.data?.points ?? [];
  const takes = takesOf(all);
  const take = chosen && takes.includes(chosen) ? chosen : firstTake(all, netlist);
  const points = take ? pointsOf(all, take, netlist) : [];
  const drawn = plottedOf(points);
  const longest = Math.max(4, ...drawn.map(({ label }) => label.length)) * 7.2 + 16;
  const left = Math.min(longest, Math.max(84, width * 0.36));
  const plot = plotOf(drawn, netlist, Math.max(280, width), left);

  if (compare.isPending) return <LoadingState label="Computing the healthy set" />;
  if (compare.isError && !compare.data) {
    return <FailedState error={compare.error} onRetry={() => void compare.refetch()} />;
  }
  if (!take) {
    return (
      <EmptyState title="Nothing to compare yet">
        Give the circuit points for a lead, or enter a first reading.
      </EmptyState>
    );
  }
  return (
    <section
      className={mergeClasses(styles.root, compare.isPlaceholderData && styles.stale)}
      aria-label="Measured and computed"
      aria-busy={compare.isPlaceholderData}
    >
      <TabList
        className={styles.tabs}
        selectedValue={take}
        onTabSelect={(_event, { value }) => setChosen(value as Take)}
        aria-label="What to compare"
      >
        {takes.map((one) => (
          <Tab key={one} value={one}>
            {TAKE_WORDS[one].title}
          </Tab>
        ))}
      </TabList>
      <div className={styles.sheet}>
        <div className={styles.plot} ref={frame}>
          <StringPlot plot={plot} take={take} />
        </div>
        <PlotLegend />
        {plot.isCompressed && (
          <Text size={200}>
            Large values stand closer together on this scale, so that small ones can be told apart.
          </Text>
        )}
      </div>
      <div className={styles.sheet}>
        <CompareTable points={points} take={take} onShowWorking={onShowWorking} />
      </div>
      <Text size={200}>
        Computed for a healthy set at {compare.data?.lineVolts} V line, with the meter in place.
      </Text>
    </section>
  );
}
