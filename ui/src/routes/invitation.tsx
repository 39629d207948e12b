import { useNavigate, useParams } from 'react-router-dom';
import { paths } from '@/app/paths';
import { AcceptInvitationForm } from '@/features/auth/components/AcceptInvitationForm';
import { DoorFrame } from '@/features/auth/components/DoorFrame';
import { useSessionActions } from '@/lib/session';

/** Lets somebody who was invited choose a name and a password. */
export function Component() {
  const { token = '' } = useParams();
  const { enter } = useSessionActions();
  const navigate = useNavigate();
  return (
    <DoorFrame
      title="Join the shop"
      hint="You were invited to this shop. Choose the name your colleagues see, and a password."
    >
      <AcceptInvitationForm
        token={token}
        onSignedIn={(signedIn) => {
          enter(signedIn);
          void navigate(paths.bench, { replace: true });
        }}
      />
    </DoorFrame>
  );
}
