import { Field, makeStyles, SearchBox, Text, tokens } from '@fluentui/react-components';
import { useDeferredValue, useState } from 'react';
import { paths } from '@/app/paths';
import { EmptyState } from '@/components/EmptyState';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { PageHeader } from '@/components/PageHeader';
import { usePageStyles } from '@/components/page-styles';
import { useFamilies } from '@/features/families/api/get-families';
import { FamilyCards } from '@/features/families/components/FamilyCards';

const useStyles = makeStyles({
  search: { maxWidth: '420px', marginBottom: tokens.spacingVerticalL },
  box: { width: '100%', maxWidth: 'none' },
});

/** The shop's chassis families. */
export function Component() {
  const styles = useStyles();
  const page = usePageStyles();
  const [search, setSearch] = useState('');
  const families = useFamilies(useDeferredValue(search));
  return (
    <div className={page.list}>
      <PageHeader
        title="Families"
        hint="Sets that share one chassis share one circuit, and what their solved cases found."
      />
      <Field label="Search" className={styles.search}>
        <SearchBox
          className={styles.box}
          size="large"
          placeholder="Name, tag or tube"
          value={search}
          onChange={(_event, { value }) => setSearch(value)}
        />
      </Field>
      {families.isPending ? (
        <LoadingState label="Fetching the families" />
      ) : families.isLoadingError ? (
        <FailedState error={families.error} onRetry={() => void families.refetch()} />
      ) : families.data.length > 0 ? (
        <FamilyCards families={families.data} linkTo={paths.family} />
      ) : search ? (
        <Text role="status">No family fits “{search}”. Search for fewer words.</Text>
      ) : (
        <EmptyState title="There are no families yet.">
          Open a case with a pasted circuit; a senior technician can make a family of it.
        </EmptyState>
      )}
    </div>
  );
}
