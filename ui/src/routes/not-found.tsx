import { Link as RouterLink } from 'react-router-dom';
import { paths } from '@/app/paths';
import { EmptyState } from '@/components/EmptyState';
import { PageHeader } from '@/components/PageHeader';

/** Answers every address that leads nowhere. */
export function Component() {
  return (
    <>
      <PageHeader title="Nothing here" />
      <EmptyState
        title="This address leads nowhere."
        action={<RouterLink to={paths.bench}>Go to the bench</RouterLink>}
      >
        It may have been typed wrongly, or what it led to is no longer kept.
      </EmptyState>
    </>
  );
}
