import {
  Button,
  Dialog,
  DialogBody,
  DialogContent,
  DialogSurface,
  DialogTitle,
  makeStyles,
  Text,
  tokens,
} from '@fluentui/react-components';
import { useNavigate } from 'react-router-dom';
import { SignInForm } from '@/features/auth/components/SignInForm';
import { useDialogLeave } from '@/hooks/useDialogLeave';
import { type Person, type SignedIn } from '@/lib/api-model';
import { useSessionActions } from '@/lib/session';
import { paths } from './paths';
import { useSignInAgain } from './sign-in-again';

const useStyles = makeStyles({
  surface: { maxWidth: '460px', width: 'calc(100vw - 24px)' },
  content: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalL },
});

/** Asks the person to sign in again over what they were doing, so that nothing they typed is lost. */
export function SignInAgain({ person }: { person: Person }) {
  const styles = useStyles();
  const navigate = useNavigate();
  const settle = useSignInAgain((state) => state.settle);
  const { enter, comeBack, leave } = useSessionActions();
  const { isOpen, leave: close } = useDialogLeave(() => settle(false));
  const handleSignedIn = (signedIn: SignedIn) => {
    if (signedIn.person.id === person.id) {
      comeBack(signedIn);
      close(() => settle(true));
      return;
    }
    // Somebody else: what waited belongs to the other person and is not sent in this one's name.
    close(() => {
      settle(false);
      enter(signedIn);
      void navigate(paths.bench);
    });
  };
  const handleLeave = () =>
    close(() => {
      settle(false);
      void leave();
    });
  return (
    <Dialog open={isOpen} modalType="alert">
      <DialogSurface className={styles.surface}>
        <DialogBody>
          <DialogTitle>Please sign in again</DialogTitle>
          <DialogContent className={styles.content}>
            <Text>
              Your session has ended, {person.name}. What you typed is still here, and goes on where
              it stopped.
            </Text>
            <SignInForm email={person.email} onSignedIn={handleSignedIn} />
            <Button size="large" onClick={handleLeave}>
              Leave this page
            </Button>
          </DialogContent>
        </DialogBody>
      </DialogSurface>
    </Dialog>
  );
}
