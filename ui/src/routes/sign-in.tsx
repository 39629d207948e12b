import { Navigate, useLocation } from 'react-router-dom';
import { returnPath } from '@/app/paths';
import { LoadingState } from '@/components/LoadingState';
import { useSetup } from '@/features/auth/api/get-setup';
import { DoorFrame } from '@/features/auth/components/DoorFrame';
import { SetUpShopForm } from '@/features/auth/components/SetUpShopForm';
import { SignInForm } from '@/features/auth/components/SignInForm';
import { useSession, useSessionActions } from '@/lib/session';

/** Signs people in; the first one sets the shop up instead. */
export function Component() {
  const session = useSession();
  const setup = useSetup();
  const { enter } = useSessionActions();
  const { search } = useLocation();
  if (session.data) return <Navigate to={returnPath(search)} replace />;
  if (session.isPending || setup.isPending) return <LoadingState label="Opening the door" />;
  if (setup.data?.needed) {
    return (
      <DoorFrame
        title="Set up the shop"
        hint="Nobody works here yet. The first account belongs to the owner, who invites everybody else."
      >
        <SetUpShopForm onSignedIn={enter} />
      </DoorFrame>
    );
  }
  return (
    <DoorFrame title="Sign in" hint="Use the account that the owner of your shop gave you.">
      <SignInForm onSignedIn={enter} />
    </DoorFrame>
  );
}
