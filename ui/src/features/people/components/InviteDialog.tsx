import {
  Button,
  Dialog,
  DialogActions,
  DialogBody,
  DialogContent,
  DialogSurface,
  DialogTitle,
  Field,
  makeStyles,
  Select,
  tokens,
} from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useController, useForm } from 'react-hook-form';
import { FormMessage } from '@/components/FormMessage';
import { TextField } from '@/components/TextField';
import { useDialogLeave } from '@/hooks/useDialogLeave';
import { ROLES } from '@/lib/api-model';
import { showProblem } from '@/lib/form-problems';
import { ROLE_HINTS, ROLE_WORDS } from '@/lib/words';
import {
  type Invitation,
  type InvitePersonInput,
  invitePersonSchema,
  useInvitePerson,
} from '../api/invite-person';
import { InvitationLink } from './InvitationLink';

const useStyles = makeStyles({
  surface: { maxWidth: '520px', width: 'calc(100vw - 24px)' },
  content: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalL },
});

/** Asks whom to invite, then shows the link to hand over. */
export function InviteDialog({ onClose }: { onClose: () => void }) {
  const styles = useStyles();
  const { isOpen, leave } = useDialogLeave(onClose);
  const invite = useInvitePerson();
  const [invitation, setInvitation] = useState<Invitation>();
  const { control, handleSubmit, setError, formState } = useForm<InvitePersonInput>({
    resolver: zodResolver(invitePersonSchema),
    defaultValues: { name: '', email: '', role: 'technician' },
  });
  const {
    field: { value: role, onChange: chooseRole },
  } = useController({ control, name: 'role' });
  const send = handleSubmit((input) =>
    invite.mutateAsync(input).then(setInvitation, (error: unknown) => {
      showProblem(error, setError, ['name', 'email', 'role']);
    }),
  );
  return (
    <Dialog open={isOpen} onOpenChange={(_event, { open }) => !open && leave()}>
      <DialogSurface className={styles.surface}>
        <form noValidate onSubmit={(event) => void send(event)}>
          <DialogBody>
            <DialogTitle>Invite a person</DialogTitle>
            <DialogContent className={styles.content}>
              {invitation ? (
                <InvitationLink invitation={invitation} />
              ) : (
                <>
                  <FormMessage message={formState.errors.root?.message} />
                  <TextField control={control} name="name" label="Name" isRequired />
                  <TextField
                    control={control}
                    name="email"
                    label="E-mail address"
                    type="email"
                    isRequired
                  />
                  <Field label="Role" hint={ROLE_HINTS[role]}>
                    <Select
                      size="large"
                      value={role}
                      onChange={(_event, { value }) => chooseRole(value)}
                    >
                      {ROLES.map((one) => (
                        <option key={one} value={one}>
                          {ROLE_WORDS[one]}
                        </option>
                      ))}
                    </Select>
                  </Field>
                </>
              )}
            </DialogContent>
            <DialogActions>
              <Button size="large" onClick={() => leave()}>
                {invitation ? 'Done' : 'Cancel'}
              </Button>
              {!invitation && (
                <Button type="submit" appearance="primary" size="large" disabled={invite.isPending}>
                  {invite.isPending ? 'Inviting…' : 'Make the invitation'}
                </Button>
              )}
            </DialogActions>
          </DialogBody>
        </form>
      </DialogSurface>
    </Dialog>
  );
}
