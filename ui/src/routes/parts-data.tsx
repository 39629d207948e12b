import {
  Button,
  Field,
  makeStyles,
  SearchBox,
  Tab,
  TabList,
  Text,
  tokens,
} from '@fluentui/react-components';
import { useDeferredValue, useState } from 'react';
import { EmptyState } from '@/components/EmptyState';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { PageHeader } from '@/components/PageHeader';
import { usePageStyles } from '@/components/page-styles';
import {
  PARTS_PAGE,
  type PartsTable as Table,
  usePartsData,
} from '@/features/parts-data/api/get-parts-data';
import { PartsCards } from '@/features/parts-data/components/PartsCards';
import { PartsTable } from '@/features/parts-data/components/PartsTable';
import { useMediaQuery } from '@/hooks/useMediaQuery';

const useStyles = makeStyles({
  bar: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'flex-end',
    gap: tokens.spacingHorizontalXL,
    marginBottom: tokens.spacingVerticalL,
  },
  search: { width: 'min(100%, 360px)' },
  box: { width: '100%', maxWidth: 'none' },
  pages: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: tokens.spacingHorizontalM,
    marginTop: tokens.spacingVerticalL,
  },
});

/** Heater and lamp ratings that the engine reckons with. */
export function Component() {
  const styles = useStyles();
  const frame = usePageStyles();
  const [table, setTable] = useState<Table>('tubes');
  const [search, setSearch] = useState('');
  const [offset, setOffset] = useState(0);
  const page = usePartsData({ table, search: useDeferredValue(search), offset });
  const total = page.data?.total ?? 0;
  const Parts = useMediaQuery('(max-width: 759px)') ? PartsCards : PartsTable;
  const caption = table === 'tubes' ? 'Heater ratings of tubes' : 'Ratings of lamps';
  const last = Math.min(offset + PARTS_PAGE, total);
  return (
    <div className={frame.list}>
      <PageHeader
        title="Parts data"
        hint="Ratings that the computed values rest on. Check those marked as from memory against a data book."
      />
      <div className={styles.bar}>
        <TabList
          size="large"
          selectedValue={table}
          aria-label="Kind of part"
          onTabSelect={(_event, { value }) => {
            setTable(value as Table);
            setOffset(0);
          }}
        >
          <Tab value="tubes">Tubes</Tab>
          <Tab value="lamps">Lamps</Tab>
        </TabList>
        <Field label="Search" className={styles.search}>
          <SearchBox
            className={styles.box}
            size="large"
            placeholder="Type number"
            value={search}
            onChange={(_event, { value }) => {
              setSearch(value);
              setOffset(0);
            }}
          />
        </Field>
      </div>
      {page.isPending ? (
        <LoadingState label="Fetching the ratings" />
      ) : page.isLoadingError ? (
        <FailedState error={page.error} onRetry={() => void page.refetch()} />
      ) : page.data.items.length === 0 ? (
        <EmptyState title="No such type is listed.">
          Search for fewer characters. A part can still be used: give its volts and its current in
          the circuit.
        </EmptyState>
      ) : (
        <>
          <Parts caption={caption} items={page.data.items} />
          <div className={styles.pages}>
            <Text role="status">
              {offset + 1} to {last} of {total}
            </Text>
            <Button
              size="large"
              disabled={offset === 0}
              onClick={() => setOffset(offset - PARTS_PAGE)}
            >
              Earlier ones
            </Button>
            <Button
              size="large"
              disabled={last >= total}
              onClick={() => setOffset(offset + PARTS_PAGE)}
            >
              Later ones
            </Button>
          </div>
        </>
      )}
    </div>
  );
}
