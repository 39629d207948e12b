import { zodResolver } from '@hookform/resolvers/zod';
import { Button } from '@fluentui/react-components';
import { useForm } from 'react-hook-form';
import { FormMessage } from '@/components/FormMessage';
import { TextField } from '@/components/TextField';
import { type SignedIn } from '@/lib/api-model';
import { showProblem } from '@/lib/form-problems';
import { type SignInInput, signInSchema, useSignIn } from '../api/sign-in';
import { useFormStyles } from './form-styles';

interface SignInFormProps {
  /** Address of the person who was here, when it is known. */
  email?: string;
  onSignedIn: (signedIn: SignedIn) => void;
}

/** E-mail address and password. */
export function SignInForm({ email = '', onSignedIn }: SignInFormProps) {
  const styles = useFormStyles();
  const signIn = useSignIn();
  const { control, handleSubmit, setError, formState } = useForm<SignInInput>({
    resolver: zodResolver(signInSchema),
    defaultValues: { email, password: '' },
  });
  const send = handleSubmit((input) =>
    signIn.mutateAsync(input).then(onSignedIn, (error: unknown) => {
      showProblem(error, setError, ['email', 'password']);
    }),
  );
  return (
    <form className={styles.form} noValidate onSubmit={(event) => void send(event)}>
      <FormMessage message={formState.errors.root?.message} />
      <TextField
        control={control}
        name="email"
        label="E-mail address"
        type="email"
        autoComplete="username"
      />
      <TextField
        control={control}
        name="password"
        label="Password"
        type="password"
        autoComplete="current-password"
      />
      <Button type="submit" appearance="primary" size="large" disabled={signIn.isPending}>
        {signIn.isPending ? 'Signing in…' : 'Sign in'}
      </Button>
    </form>
  );
}
