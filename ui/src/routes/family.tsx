import { makeStyles, tokens } from '@fluentui/react-components';
import { useParams } from 'react-router-dom';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { PageHeader } from '@/components/PageHeader';
import { useFamily } from '@/features/families/api/get-family';
import { FamilyFacts } from '@/features/families/components/FamilyFacts';
import { PublishedSheet } from '@/features/families/components/PublishedSheet';
import { SchematicView } from '@/features/schematic/components/SchematicView';

const useStyles = makeStyles({
  root: {
    display: 'grid',
    gridTemplateColumns: '1fr',
    gap: tokens.spacingHorizontalXXL,
    alignItems: 'start',
    '@media (min-width: 1000px)': { gridTemplateColumns: 'minmax(0, 5fr) minmax(280px, 2fr)' },
  },
  side: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalXXL, minWidth: 0 },
});

/** One chassis family: its circuit and what its solved cases found. */
export function Component() {
  const styles = useStyles();
  const { familyId = '' } = useParams();
  const family = useFamily(familyId);
  if (family.isPending) return <LoadingState label="Fetching the family" />;
  if (family.isLoadingError)
    return <FailedState error={family.error} onRetry={() => void family.refetch()} />;
  return (
    <>
      <PageHeader title={family.data.name} hint={family.data.description} />
      <div className={styles.root}>
        <SchematicView netlist={family.data.netlist} height="max(440px, calc(100vh - 240px))" />
        <div className={styles.side}>
          <FamilyFacts family={family.data} />
          <PublishedSheet netlist={family.data.netlist} />
        </div>
      </div>
    </>
  );
}
