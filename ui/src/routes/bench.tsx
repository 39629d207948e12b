import { Button } from '@fluentui/react-components';
import { lazy, Suspense, useDeferredValue, useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { paths } from '@/app/paths';
import { EmptyState } from '@/components/EmptyState';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { PageHeader } from '@/components/PageHeader';
import { usePageStyles } from '@/components/page-styles';
import { type CaseFilter, useCases } from '@/features/cases/api/get-cases';
import { CaseCards } from '@/features/cases/components/CaseCards';
import { CaseFilters } from '@/features/cases/components/CaseFilters';
import { CaseTable } from '@/features/cases/components/CaseTable';
import { useFamilies } from '@/features/families/api/get-families';
import { useMediaQuery } from '@/hooks/useMediaQuery';
import { problemInWords } from '@/lib/bench/problem';

// The form's rules weigh as much as the list; they load when a case is opened.
const OpenCaseDialog = lazy(() =>
  import('@/features/cases/components/OpenCaseDialog').then((module) => ({
    default: module.OpenCaseDialog,
  })),
);

/** The bench: what is open and whose it is. */
export function Component() {
  const page = usePageStyles();
  const navigate = useNavigate();
  const [isOpening, setIsOpening] = useState(false);
  const [filter, setFilter] = useFilterInUrl();
  const asked = { ...filter, search: useDeferredValue(filter.search) };
  const cases = useCases(asked);
  const families = useFamilies();
  const isNarrow = useMediaQuery('(max-width: 899px)');
  const isFiltered = filter.search !== '' || filter.isMine || filter.state !== 'open';
  const linkTo = (id: number) => paths.case(id);
  const open = (
    <Button appearance="primary" size="large" onClick={() => setIsOpening(true)}>
      Open a case
    </Button>
  );
  return (
    <div className={page.list}>
      <PageHeader title="Bench" hint="Every set that is being worked on." actions={open} />
      <CaseFilters filter={filter} onChange={(_event, next) => setFilter(next)} />
      {cases.isPending ? (
        <LoadingState label="Fetching the cases" />
      ) : cases.isLoadingError ? (
        <FailedState error={cases.error} onRetry={() => void cases.refetch()} />
      ) : cases.data.length === 0 ? (
        <EmptyState
          title={isFiltered ? 'No case fits what you asked for.' : 'No set is on the bench.'}
          action={
            isFiltered ? (
              <Button onClick={() => setFilter({ state: 'open', search: '', isMine: false })}>
                Show all open cases
              </Button>
            ) : undefined
          }
        >
          {isFiltered
            ? 'Search for fewer words, or look among the closed cases.'
            : 'Open a case when a set comes in: say what it is, what is wrong, and which circuit it has.'}
        </EmptyState>
      ) : isNarrow ? (
        <CaseCards cases={cases.data} linkTo={linkTo} />
      ) : (
        <CaseTable cases={cases.data} linkTo={linkTo} />
      )}
      {isOpening && (
        <Suspense fallback={<LoadingState label="Opening the form" />}>
          <OpenCaseDialog
            families={families.data ?? []}
            familiesMessage={families.isError ? problemInWords(families.error) : undefined}
            onClose={() => setIsOpening(false)}
            onOpened={(opened) => void navigate(paths.case(opened.id))}
          />
        </Suspense>
      )}
    </div>
  );
}

/** The filter lives in the address, so that a link shows the same cases. */
function useFilterInUrl(): [CaseFilter, (filter: CaseFilter) => void] {
  const [params, setParams] = useSearchParams();
  const filter = {
    state: params.get('state') ?? 'open',
    search: params.get('search') ?? '',
    isMine: params.get('mine') === '1',
  };
  const setFilter = (next: CaseFilter) =>
    setParams(
      {
        ...(next.state !== 'open' && { state: next.state }),
        ...(next.search && { search: next.search }),
        ...(next.isMine && { mine: '1' }),
      },
      { replace: true, preventScrollReset: true },
    );
  return [filter, setFilter];
}
