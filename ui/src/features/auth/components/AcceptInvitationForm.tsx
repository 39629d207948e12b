import { zodResolver } from '@hookform/resolvers/zod';
import { Button } from '@fluentui/react-components';
import { useForm } from 'react-hook-form';
import { FormMessage } from '@/components/FormMessage';
import { TextField } from '@/components/TextField';
import { type SignedIn } from '@/lib/api-model';
import { showProblem } from '@/lib/form-problems';
import {
  type AcceptInvitationInput,
  acceptInvitationSchema,
  useAcceptInvitation,
} from '../api/accept-invitation';
import { useFormStyles } from './form-styles';

interface AcceptInvitationFormProps {
  token: string;
  onSignedIn: (signedIn: SignedIn) => void;
}

/** Name and password of somebody who was invited. */
export function AcceptInvitationForm({ token, onSignedIn }: AcceptInvitationFormProps) {
  const styles = useFormStyles();
  const accept = useAcceptInvitation(token);
  const { control, handleSubmit, setError, formState } = useForm<AcceptInvitationInput>({
    resolver: zodResolver(acceptInvitationSchema),
    defaultValues: { name: '', password: '' },
  });
  const send = handleSubmit((input) =>
    accept.mutateAsync(input).then(onSignedIn, (error: unknown) => {
      showProblem(error, setError, ['name', 'password']);
    }),
  );
  return (
    <form className={styles.form} noValidate onSubmit={(event) => void send(event)}>
      <FormMessage message={formState.errors.root?.message} />
      <TextField control={control} name="name" label="Your name" autoComplete="name" />
      <TextField
        control={control}
        name="password"
        label="Choose a password"
        hint="At least 10 characters."
        type="password"
        autoComplete="new-password"
      />
      <Button type="submit" appearance="primary" size="large" disabled={accept.isPending}>
        {accept.isPending ? 'Joining…' : 'Join the shop'}
      </Button>
    </form>
  );
}
