import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { formatQuantity } from '@engine/units';
import { FormMessage } from '@/components/FormMessage';
import { readQuantity } from '@/components/QuantityInput';
import { TextField } from '@/components/TextField';
import { type Case } from '@/lib/api-model';
import { hasStatus } from '@/lib/api-problem';
import { showProblem } from '@/lib/form-problems';
import { useUpdateCase } from '../api/update-case';

const intakeSchema = z.object({
  set: z.string().trim().min(1, 'Say which set it is.').max(200),
  complaint: z.string().trim().min(1, 'Say what is wrong with it, in a sentence.').max(2000),
  earlierWork: z.string().trim().max(4000),
  lineVolts: z.string().superRefine((text, context) => {
    const read = readQuantity(text, 'V');
    if (!read.ok) context.addIssue({ code: 'custom', message: read.message });
  }),
});
type IntakeInput = z.infer<typeof intakeSchema>;

const useStyles = makeStyles({
  form: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalL,
    maxWidth: '720px',
  },
  actions: { display: 'flex', alignItems: 'center', gap: tokens.spacingHorizontalM },
});

interface IntakeFormProps {
  repair: Case;
  /** Fetches the case again, after somebody else was quicker. */
  onRefetch: () => void;
}

/** What came over the counter: the set, its complaint, what was done before. */
export function IntakeForm({ repair, onRefetch }: IntakeFormProps) {
  const styles = useStyles();
  const update = useUpdateCase(String(repair.id));
  const { control, handleSubmit, setError, reset, formState } = useForm<IntakeInput>({
    resolver: zodResolver(intakeSchema),
    values: {
      set: repair.set,
      complaint: repair.complaint,
      earlierWork: repair.earlierWork ?? '',
      lineVolts: repair.lineVolts ? formatQuantity(repair.lineVolts, 'V', 4) : '',
    },
    // An answer that arrives while somebody types must not take their words away.
    resetOptions: { keepDirtyValues: true },
  });
  const send = handleSubmit((input) => {
    const volts = readQuantity(input.lineVolts, 'V');
    const lineVolts = volts.ok ? (volts.value ?? null) : undefined;
    return update.mutateAsync({ ...input, lineVolts, version: repair.version }).then(
      () => reset(input),
      (error: unknown) => {
        if (hasStatus(error, 409)) onRefetch();
        showProblem(error, setError, ['set', 'complaint', 'earlierWork', 'lineVolts']);
      },
    );
  });
  const isSaved = update.isSuccess && !formState.isDirty;
  return (
    <form
      className={styles.form}
      noValidate
      aria-label="Intake"
      onSubmit={(event) => void send(event)}
    >
      <FormMessage message={formState.errors.root?.message} />
      <TextField control={control} name="set" label="Set" isRequired />
      <TextField control={control} name="complaint" label="Complaint" lines={3} isRequired />
      <TextField
        control={control}
        name="earlierWork"
        label="Earlier work"
        hint="What was replaced or changed before, as far as it is known."
        lines={3}
      />
      <TextField
        control={control}
        name="lineVolts"
        label="Line voltage today"
        hint="Measured at the outlet or behind the isolation transformer."
      />
      {repair.abilities.edit && (
        <div className={styles.actions}>
          <Button type="submit" appearance="primary" size="large" disabled={update.isPending}>
            {update.isPending ? 'Saving…' : 'Save'}
          </Button>
          <Text role="status">{isSaved ? 'Saved.' : ''}</Text>
        </div>
      )}
    </form>
  );
}
