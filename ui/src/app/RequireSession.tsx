import { lazy, Suspense } from 'react';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { useSession } from '@/lib/session';
import { paths } from './paths';
import { useSignInAgain } from './sign-in-again';

// Asked for once in a long while; the first page does without it.
const SignInAgain = lazy(() =>
  import('./SignInAgain').then((module) => ({ default: module.SignInAgain })),
);

/** Lets only people who are signed in past; everybody else signs in first and comes back. */
export function RequireSession() {
  const session = useSession();
  const isAsked = useSignInAgain((state) => state.isAsked);
  const { pathname, search } = useLocation();
  if (session.isPending) return <LoadingState label="Opening your bench" />;
  if (session.isError)
    return <FailedState error={session.error} onRetry={() => void session.refetch()} />;
  if (!session.data) return <Navigate to={paths.signIn(pathname + search)} replace />;
  return (
    <>
      <Outlet />
      {isAsked && (
        <Suspense fallback={null}>
          <SignInAgain person={session.data} />
        </Suspense>
      )}
    </>
  );
}
