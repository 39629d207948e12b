import { zodResolver } from '@hookform/resolvers/zod';
import { Button } from '@fluentui/react-components';
import { useForm } from 'react-hook-form';
import { FormMessage } from '@/components/FormMessage';
import { TextField } from '@/components/TextField';
import { type SignedIn } from '@/lib/api-model';
import { showProblem } from '@/lib/form-problems';
import { type SetUpShopInput, setUpShopSchema, useSetUpShop } from '../api/set-up-shop';
import { useFormStyles } from './form-styles';

/** Names the shop and makes its owner. */
export function SetUpShopForm({ onSignedIn }: { onSignedIn: (signedIn: SignedIn) => void }) {
  const styles = useFormStyles();
  const setUp = useSetUpShop();
  const { control, handleSubmit, setError, formState } = useForm<SetUpShopInput>({
    resolver: zodResolver(setUpShopSchema),
    defaultValues: { shopName: '', name: '', email: '', password: '' },
  });
  const send = handleSubmit((input) =>
    setUp.mutateAsync(input).then(onSignedIn, (error: unknown) => {
      showProblem(error, setError, ['shopName', 'name', 'email', 'password']);
    }),
  );
  return (
    <form className={styles.form} noValidate onSubmit={(event) => void send(event)}>
      <FormMessage message={formState.errors.root?.message} />
      <TextField control={control} name="shopName" label="Name of the shop" />
      <TextField control={control} name="name" label="Your name" autoComplete="name" />
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
        hint="At least 10 characters."
        type="password"
        autoComplete="new-password"
      />
      <Button type="submit" appearance="primary" size="large" disabled={setUp.isPending}>
        {setUp.isPending ? 'Opening the shop…' : 'Open the shop'}
      </Button>
    </form>
  );
}
