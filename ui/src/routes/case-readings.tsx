import { makeStyles, tokens } from '@fluentui/react-components';
import { lazy, Suspense } from 'react';
import { LoadingState } from '@/components/LoadingState';
import { ReadingsPanel } from '@/features/readings/components/ReadingsPanel';
import { SuspectsPanel } from '@/features/suspects/components/SuspectsPanel';
import { useMediaQuery } from '@/hooks/useMediaQuery';
import { useCaseScreen } from './case-screen';

// The drawing is the heaviest part of a case; a phone never asks for it here.
const CircuitPane = lazy(() =>
  import('./CircuitPane').then((module) => ({ default: module.CircuitPane })),
);

const useStyles = makeStyles({
  three: {
    display: 'grid',
    gridTemplateColumns: 'minmax(480px, 6fr) minmax(300px, 5fr) minmax(300px, 4fr)',
    gap: tokens.spacingHorizontalXXL,
    alignItems: 'start',
  },
  pane: { minWidth: 0 },
  scrolls: {
    position: 'sticky',
    top: '12px',
    maxHeight: 'calc(100vh - 24px)',
    overflowY: 'auto',
    minWidth: 0,
  },
  title: {
    margin: `0 0 ${tokens.spacingVerticalM}`,
    fontSize: tokens.fontSizeBase500,
    lineHeight: tokens.lineHeightBase500,
  },
});

/** Readings of a case; with room, its circuit and suspects stand beside them. */
export function Component() {
  const styles = useStyles();
  const screen = useCaseScreen();
  const { caseId, repair, readings, result, goTo } = screen;
  const isWide = useMediaQuery('(min-width: 1200px)');
  const panel = (
    <ReadingsPanel
      caseId={caseId}
      netlist={repair.netlist}
      asFound={repair.asFound}
      nextReadings={result?.nextReadings}
      isCautionAcknowledged={Boolean(repair.cautionAcknowledged)}
      onNeedCautions={screen.askForCautions}
      canRecord={repair.abilities.record}
      goTo={goTo}
    />
  );
  if (!isWide) return panel;
  return (
    <div className={styles.three}>
      <section className={styles.pane} aria-labelledby="pane-readings">
        <h2 id="pane-readings" className={styles.title}>
          Readings
        </h2>
        {panel}
      </section>
      <section className={styles.scrolls} aria-labelledby="pane-circuit">
        <h2 id="pane-circuit" className={styles.title}>
          Circuit
        </h2>
        <Suspense fallback={<LoadingState label="Drawing the circuit" />}>
          <CircuitPane height="max(420px, calc(100vh - 90px))" />
        </Suspense>
      </section>
      <section className={styles.scrolls} aria-labelledby="pane-suspects" tabIndex={0}>
        <h2 id="pane-suspects" className={styles.title}>
          Suspects
        </h2>
        <SuspectsPanel
          caseId={caseId}
          netlist={repair.netlist}
          readings={readings}
          caseVersion={repair.version}
          onEnterReading={screen.enterReading}
          onSelectPart={screen.selectPart}
          onShowWorking={screen.showWorking}
        />
      </section>
    </div>
  );
}
