import { type Netlist } from '@engine/netlist/types';
import { makeStyles, mergeClasses, Text, tokens } from '@fluentui/react-components';
import { type ReactNode, useId, useMemo } from 'react';
import { EmptyState } from '@/components/EmptyState';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { type CaseReading } from '@/lib/bench/case-reading';
import { type Place } from '@/lib/bench/places';
import { problemInWords } from '@/lib/bench/problem';
import { useDiagnosis } from '../api/get-diagnosis';
import { ruleInWords } from '../words/suspect-words';
import { DiagnosisAdvice, DiagnosisRemarks } from './DiagnosisRemarks';
import { NextReadings } from './NextReadings';
import { PartChances } from './PartChances';
import { SuspectGroups } from './SuspectGroups';

export interface SuspectsPanelProps {
  caseId: string;
  netlist: Netlist;
  /** Readings as the service keeps them; the diagnosis runs again when they change. */
  readings: readonly CaseReading[];
  /** Version of the case; the diagnosis runs again when circuit or line voltage change. */
  caseVersion?: number;
  /** "Enter this reading" on a suggested one. */
  onEnterReading?: (place: Place) => void;
  onSelectPart?: (ref: string) => void;
  /** "Show the working" on a suspect part. */
  onShowWorking?: (part: string) => void;
}

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalL, minWidth: 0 },
  stale: { opacity: 0.6 },
  status: { minHeight: '20px', color: tokens.colorNeutralForeground3 },
  heading: {
    margin: `0 0 ${tokens.spacingVerticalS}`,
    fontSize: tokens.fontSizeBase400,
    lineHeight: tokens.lineHeightBase400,
    fontWeight: tokens.fontWeightSemibold,
  },
  list: { margin: 0, paddingLeft: tokens.spacingHorizontalL },
});

/** Ranked suspects of a case with their evidence, and the readings to take next. */
export function SuspectsPanel(props: SuspectsPanelProps) {
  const { caseId, netlist, readings, caseVersion, onEnterReading, onSelectPart } = props;
  const styles = useStyles();
  const diagnosis = useDiagnosis(caseId, readings, caseVersion);
  const { data } = diagnosis;
  const used = useMemo(() => {
    const byId = new Map(readings.map((reading) => [reading.id, reading]));
    return (data?.readingIds ?? []).map((id) => byId.get(id));
  }, [data, readings]);

  if (readings.length === 0) {
    return (
      <EmptyState title="No readings yet">
        Enter a first one, best with the power off, and the suspects appear here.
      </EmptyState>
    );
  }
  if (!data) {
    if (diagnosis.isError) {
      return <FailedState error={diagnosis.error} onRetry={() => void diagnosis.refetch()} />;
    }
    return <LoadingState label="Weighing the readings" />;
  }
  const { result } = data;
  return (
    <div
      className={mergeClasses(styles.root, diagnosis.isCatchingUp && styles.stale)}
      aria-busy={diagnosis.isCatchingUp}
    >
      <Text size={200} role="status" className={styles.status}>
        {diagnosis.isError
          ? `${problemInWords(diagnosis.error)} These suspects are from before the last change.`
          : diagnosis.isCatchingUp
            ? 'Weighing the readings again…'
            : result.settled
              ? 'The first suspect needs no further reading.'
              : `From ${used.length === 1 ? 'one reading' : `${used.length} readings`}.`}
      </Text>
      <DiagnosisRemarks
        result={result}
        readings={used}
        netlist={netlist}
        onEnterReading={onEnterReading}
      />
      <Block title="Suspects">
        <SuspectGroups
          result={result}
          readings={used}
          netlist={netlist}
          onSelectPart={onSelectPart}
          onShowWorking={props.onShowWorking}
        />
      </Block>
      <Block title="Next readings">
        <NextReadings
          netlist={netlist}
          nextReadings={result.nextReadings}
          onEnterReading={onEnterReading}
        />
      </Block>
      <DiagnosisAdvice result={result} />
      {result.parts.length > 0 && (
        <Block title="Part by part">
          <PartChances parts={result.parts} onSelectPart={onSelectPart} />
        </Block>
      )}
      {result.waiting.length > 0 && (
        <Block title="Rules that wait for a reading">
          <ul className={styles.list}>
            {result.waiting.map(({ rule, for: wanted }) => (
              <li key={`${rule} ${wanted}`}>
                {ruleInWords(rule)}: {wanted}
              </li>
            ))}
          </ul>
        </Block>
      )}
    </div>
  );
}

function Block({ title, children }: { title: string; children: ReactNode }) {
  const styles = useStyles();
  const id = useId();
  return (
    <section aria-labelledby={id}>
      <h3 id={id} className={styles.heading}>
        {title}
      </h3>
      {children}
    </section>
  );
}
