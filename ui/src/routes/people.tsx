import { Button } from '@fluentui/react-components';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '@/app/paths';
import { EmptyState } from '@/components/EmptyState';
import { FailedState } from '@/components/FailedState';
import { FormMessage } from '@/components/FormMessage';
import { LoadingState } from '@/components/LoadingState';
import { PageHeader } from '@/components/PageHeader';
import { usePageStyles } from '@/components/page-styles';
import { useChangePerson } from '@/features/people/api/change-person';
import { usePeople } from '@/features/people/api/get-people';
import { InviteDialog } from '@/features/people/components/InviteDialog';
import { PeopleTable } from '@/features/people/components/PeopleTable';
import { problemInWords } from '@/lib/bench/problem';
import { useSession } from '@/lib/session';

/** Who works in the shop; for its owner. */
export function Component() {
  const page = usePageStyles();
  const { data: person } = useSession();
  if (person?.role === 'owner') return <People ownId={person.id} />;
  return (
    <div className={page.text}>
      <PageHeader title="People" />
      <EmptyState
        title="Only the owner of the shop sees its people."
        action={<Link to={paths.bench}>Go to the bench</Link>}
      >
        Ask the owner when somebody is to be invited or needs another role.
      </EmptyState>
    </div>
  );
}

function People({ ownId }: { ownId: number }) {
  const page = usePageStyles();
  const people = usePeople();
  const change = useChangePerson();
  const [isInviting, setIsInviting] = useState(false);
  return (
    <div className={page.text}>
      <PageHeader
        title="People"
        hint="Everybody who works here, and what they may do."
        actions={
          <Button appearance="primary" size="large" onClick={() => setIsInviting(true)}>
            Invite a person
          </Button>
        }
      />
      <FormMessage message={change.isError ? problemInWords(change.error) : undefined} />
      {people.isPending ? (
        <LoadingState label="Fetching the people" />
      ) : people.isLoadingError ? (
        <FailedState error={people.error} onRetry={() => void people.refetch()} />
      ) : people.data.length === 0 ? (
        <EmptyState title="Nobody works here yet.">Invite the first person.</EmptyState>
      ) : (
        <PeopleTable
          people={people.data}
          ownId={ownId}
          isChanging={change.isPending}
          onChange={(_event, data) => change.mutate(data)}
        />
      )}
      {isInviting && <InviteDialog onClose={() => setIsInviting(false)} />}
    </div>
  );
}
