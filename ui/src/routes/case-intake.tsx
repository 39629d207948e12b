import { makeStyles, tokens } from '@fluentui/react-components';
import { AsFoundSection } from '@/features/cases/components/AsFoundSection';
import { ClosingSection } from '@/features/cases/components/ClosingSection';
import { IntakeForm } from '@/features/cases/components/IntakeForm';
import { useCaseScreen } from './case-screen';

const useStyles = makeStyles({
  root: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fit, minmax(min(100%, 420px), 1fr))',
    alignItems: 'start',
    gap: `${tokens.spacingVerticalXXXL} 48px`,
    maxWidth: '1400px',
  },
  side: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalXXXL },
});

/** Intake of a case: what came over the counter, what differs, and how it ends. */
export function Component() {
  const styles = useStyles();
  const { repair, refetchCase, askToClose } = useCaseScreen();
  return (
    <div className={styles.root}>
      <IntakeForm repair={repair} onRefetch={refetchCase} />
      <div className={styles.side}>
        <AsFoundSection repair={repair} />
        <ClosingSection repair={repair} onCloseCase={askToClose} />
      </div>
    </div>
  );
}
