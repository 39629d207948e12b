import { type NextReading } from '@engine/diagnosis-types';
import { type AsFound, type Netlist } from '@engine/netlist/types';
import { Button, Text, Title3 } from '@fluentui/react-components';
import { ArrowUndoRegular, CalculatorRegular, TableRegular } from '@fluentui/react-icons';
import { useEffect, useMemo, useRef, useState } from 'react';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { type Place, placeKey } from '@/lib/bench/places';
import { isPoweredReading } from '@/lib/bench/takes';
import { useReadings } from '../api/get-readings';
import { isBlock, parseBlock, placeBlock } from '../grid/block-paste';
import { type GridSection, sectionsOf } from '../grid/grid-model';
import { type GridSpot } from '../grid/grid-moves';
import { useIsNarrow } from '../hooks/useIsNarrow';
import { useMeterChoice } from '../hooks/useMeterChoice';
import { useReadingEntry } from '../hooks/useReadingEntry';
import { useReadingSender } from '../hooks/useReadingSender';
import { AddLeads } from './AddLeads';
import { BenchEntry } from './BenchEntry';
import { CautionNote } from './CautionNote';
import { MeterPicker } from './MeterPicker';
import { NextReadingNote } from './NextReadingNote';
import { useReadingsPanelStyles } from './ReadingsPanel.styles';
import { SectionTable } from './SectionTable';
import { SendStatus } from './SendStatus';

export interface ReadingsPanelProps {
  caseId: string;
  netlist: Netlist;
  /** Parts added as found get rows too. */
  asFound?: AsFound[];
  /** Suggested readings, best first; the first one is pointed out at the top. */
  nextReadings?: NextReading[];
  /** True once this person has acknowledged the cautions on this case. */
  isCautionAcknowledged: boolean;
  /** Called when a powered reading is wanted before the cautions were acknowledged. */
  onNeedCautions: () => void;
  /** False shows the readings without letting anybody type (a closed case). */
  canRecord?: boolean;
  /** Place to jump to, for "Enter this reading" elsewhere; a new object jumps again. */
  goTo?: Place;
}

const NO_NEXT: NextReading[] = [];
const NO_READINGS: never[] = [];

/** The readings of a case: a grid for the desk, one reading at a time for the bench. */
export function ReadingsPanel(props: ReadingsPanelProps) {
  const { caseId, nextReadings = NO_NEXT, canRecord = true, goTo } = props;
  const styles = useReadingsPanelStyles();
  const query = useReadings(caseId);
  const readings = query.data ?? NO_READINGS;
  const [meterId, setMeterId] = useMeterChoice();
  const netlist = useMemo(
    () => withAdded(props.netlist, props.asFound),
    [props.netlist, props.asFound],
  );
  const entry = useReadingEntry(caseId, netlist, readings, meterId);
  const sendState = useReadingSender(caseId);
  const isNarrow = useIsNarrow();
  const [mode, setMode] = useState<'grid' | 'bench'>();
  const [added, setAdded] = useState<Place[]>([]);
  const [place, setPlace] = useState<Place>();
  const [left, setLeft] = useState(0);
  const root = useRef<HTMLDivElement>(null);
  const isBench = (mode ?? (isNarrow ? 'bench' : 'grid')) === 'bench';

  const sections = useMemo(
    () => sectionsOf(netlist, [...readings, ...nextReadings, ...added]),
    [netlist, readings, nextReadings, added],
  );

  const jumpTo = (target: Place) => {
    setPlace(target);
    if (isPoweredReading(target.take) && !props.isCautionAcknowledged) props.onNeedCautions();
    requestAnimationFrame(() => focusPlace(root.current, target));
  };
  useEffect(() => {
    if (!goTo) return;
    const id = requestAnimationFrame(() => {
      setPlace(goTo);
      focusPlace(root.current, goTo);
    });
    return () => cancelAnimationFrame(id);
  }, [goTo]);

  const pasteBlock = (section: GridSection, spot: GridSpot, text: string): boolean => {
    if (!isBlock(text)) return false;
    const block = placeBlock(section, spot, parseBlock(text));
    block.values.forEach((value) => entry.enter(value.place, value.text));
    setLeft(block.left);
    return true;
  };
  const undo = () => {
    const target = entry.undo();
    if (target) requestAnimationFrame(() => focusPlace(root.current, target));
  };

  if (query.isPending) return <LoadingState label="Fetching the readings" />;
  if (query.isError && !query.data) {
    return <FailedState error={query.error} onRetry={() => void query.refetch()} />;
  }
  const next = nextReadings[0];
  const bar = (
    <div className={styles.bar}>
      <MeterPicker meterId={meterId} onChoose={setMeterId} />
      <Button
        icon={<ArrowUndoRegular />}
        disabled={!entry.canUndo}
        className={styles.touch}
        onClick={undo}
      >
        Undo
      </Button>
      <Button
        icon={isBench ? <TableRegular /> : <CalculatorRegular />}
        className={styles.touch}
        onClick={() => setMode(isBench ? 'grid' : 'bench')}
      >
        {isBench ? 'All readings' : 'One at a time'}
      </Button>
      <SendStatus state={sendState} />
    </div>
  );
  return (
    <div className={styles.root} ref={root}>
      {next && canRecord && !isBench && (
        <NextReadingNote netlist={netlist} next={next} onGo={() => jumpTo(next)} />
      )}
      {!isBench && bar}
      {left > 0 && (
        <Text role="status" size={200}>
          {left === 1 ? 'One pasted value' : `${left} pasted values`} found no place in the grid.
        </Text>
      )}
      {isBench ? (
        <BenchEntry
          netlist={netlist}
          sections={sections}
          nextReadings={nextReadings}
          entry={entry}
          place={place}
          isReadOnly={!canRecord}
          isCautionAcknowledged={props.isCautionAcknowledged}
          onNeedCautions={props.onNeedCautions}
          onPlace={setPlace}
        />
      ) : (
        sections.map((section) => {
          const isLocked = section.id === 'powered' && !props.isCautionAcknowledged;
          return (
            <section key={section.id} className={styles.section} aria-label={section.title}>
              <Title3 as="h3" className={styles.title}>
                {section.title}
              </Title3>
              {isLocked && canRecord && <CautionNote onNeedCautions={props.onNeedCautions} />}
              <SectionTable
                caseId={caseId}
                netlist={netlist}
                section={section}
                entry={entry}
                isReadOnly={!canRecord || isLocked}
                next={canRecord ? next : undefined}
                onPasteText={pasteBlock}
                onFocusPlace={setPlace}
              />
            </section>
          );
        })
      )}
      {isBench && bar}
      {!isBench && canRecord && (
        <AddLeads
          netlist={netlist}
          onAdd={(target) => {
            setAdded((old) => [...old, target]);
            jumpTo(target);
          }}
        />
      )}
    </div>
  );
}

function withAdded(netlist: Netlist, asFound: readonly AsFound[] = []): Netlist {
  const added = asFound.flatMap((entry) => (entry.change === 'added' ? [entry.add] : []));
  return added.length > 0 ? { ...netlist, parts: [...netlist.parts, ...added] } : netlist;
}

function focusPlace(root: HTMLElement | null, place: Place): void {
  const key = placeKey(place);
  const cells = [...(root?.querySelectorAll<HTMLElement>('[data-place]') ?? [])];
  const cell = cells.find(({ dataset }) => dataset.place === key);
  cell?.scrollIntoView({ block: 'center', behavior: 'auto' });
  cell?.focus();
}
