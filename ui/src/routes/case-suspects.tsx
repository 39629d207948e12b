import { makeStyles } from '@fluentui/react-components';
import { SuspectsPanel } from '@/features/suspects/components/SuspectsPanel';
import { useCaseScreen } from './case-screen';

const useStyles = makeStyles({ root: { maxWidth: '900px' } });

/** Who is suspected, why, and what to read next. */
export function Component() {
  const styles = useStyles();
  const { caseId, repair, readings, enterReading, selectPart, showWorking } = useCaseScreen();
  return (
    <div className={styles.root}>
      <SuspectsPanel
        caseId={caseId}
        netlist={repair.netlist}
        readings={readings}
        caseVersion={repair.version}
        onEnterReading={enterReading}
        onSelectPart={selectPart}
        onShowWorking={showWorking}
      />
    </div>
  );
}
