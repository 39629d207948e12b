import { type Netlist, type Take } from '@engine/netlist/types';
import {
  Button,
  makeStyles,
  mergeClasses,
  Spinner,
  Tab,
  TabList,
  Text,
  tokens,
} from '@fluentui/react-components';
import { useMemo, useRef, useState } from 'react';
import { type CaseReading, revisionOfReadings } from '@/lib/bench/case-reading';
import { problemInWords } from '@/lib/bench/problem';
import { TAKE_WORDS } from '@/lib/bench/takes';
import { useCompare } from '../api/get-compare';
import { useWidth } from '../hooks/useWidth';
import { pointsOf, takesOf } from '../plot/compare-model';
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
  plot: { minWidth: 0, maxWidth: '900px' },
  tabs: { flexWrap: 'wrap' },
  failed: {
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'flex-start',
    gap: tokens.spacingVerticalM,
  },
});

/** Measured against computed: a plot down the string, and the same values as a table. */
export function ComparePanel(props: ComparePanelProps) {
  const { caseId, readings, caseVersion, onShowWorking } = props;
  const styles = useStyles();
  const compare = useCompare(caseId, `${caseVersion ?? ''}:${revisionOfReadings(readings)}`);
  const [chosen, setChosen] = useState<Take>();
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame);

  const all = useMemo(() => compare.data?.points ?? [], [compare.data]);
  const takes = takesOf(all);
  const take = chosen && takes.includes(chosen) ? chosen : takes[0];
  const points = useMemo(() => (take ? pointsOf(all, take) : []), [all, take]);
  const plot = useMemo(() => {
    const longest = Math.max(4, ...points.map(({ label }) => label.length)) * 7.2 + 16;
    return plotOf(points, Math.max(280, width), Math.min(longest, Math.max(84, width * 0.3)));
  }, [points, width]);

  if (compare.isPending) return <Spinner label="Computing the healthy set" />;
  if (compare.isError && !compare.data) {
    return (
      <div role="alert" className={styles.failed}>
        <Text>{problemInWords(compare.error)}</Text>
        <Button onClick={() => void compare.refetch()}>Try again</Button>
      </div>
    );
  }
  if (!take) {
    return (
      <Text>
        There is nothing to compare yet. Give the circuit points for a lead, or enter a first
        reading.
      </Text>
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
      <div className={styles.plot} ref={frame}>
        <StringPlot plot={plot} take={take} />
      </div>
      <PlotLegend />
      {plot.isCompressed && (
        <Text size={200}>
          Large values stand closer together on this scale, so that small ones can be told apart.
        </Text>
      )}
      <CompareTable points={points} take={take} onShowWorking={onShowWorking} />
      <Text size={200}>
        Computed for a healthy set at {compare.data?.lineVolts} V line, with the meter in place.
      </Text>
    </section>
  );
}
