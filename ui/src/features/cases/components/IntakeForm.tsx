import { Button, Field, makeStyles, Select, Text, tokens } from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { useController, useForm } from 'react-hook-form';
import * as z from 'zod/mini';
import { formatQuantity } from '@engine/units';
import { FormMessage } from '@/components/FormMessage';
import { readQuantity } from '@/components/QuantityInput';
import { TextField } from '@/components/TextField';
import { type Case } from '@/lib/api-model';
import { hasStatus } from '@/lib/api-problem';
import { showProblem } from '@/lib/form-problems';
import { OPEN_STATES, stateInWords } from '@/lib/words';
import { useUpdateCase } from '../api/update-case';

const intakeSchema = z.object({
  set: z.string().check(z.trim(), z.minLength(1, 'Say which set it is.'), z.maxLength(200)),
  complaint: z
    .string()
    .check(
      z.trim(),
      z.minLength(1, 'Say what is wrong with it, in a sentence.'),
      z.maxLength(2000),
    ),
  earlierWork: z.string().check(z.trim(), z.maxLength(4000)),
  state: z.string(),
  lineVolts: z.string().check((context) => {
    const read = readQuantity(context.value, 'V');
    if (!read.ok)
      context.issues.push({ code: 'custom', message: read.message, input: context.value });
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
      state: repair.state,
      lineVolts: repair.lineVolts ? formatQuantity(repair.lineVolts, 'V', 4) : '',
    },
    // An answer that arrives while somebody types must not take their words away.
    resetOptions: { keepDirtyValues: true },
  });
  const {
    field: { value: state, onChange: chooseState },
  } = useController({ control, name: 'state' });
  const send = handleSubmit((input) => {
    const volts = readQuantity(input.lineVolts, 'V');
    const lineVolts = volts.ok ? (volts.value ?? null) : undefined;
    const change = { ...input, lineVolts, version: repair.version };
    return update.mutateAsync(change).then(
      () => reset(input),
      (error: unknown) => {
        if (hasStatus(error, 409)) onRefetch();
        showProblem(error, setError, ['set', 'complaint', 'earlierWork', 'state', 'lineVolts']);
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
        <Field label="State" hint="What the set waits for; closing it is a step of its own.">
          <Select size="large" value={state} onChange={(_event, { value }) => chooseState(value)}>
            {OPEN_STATES.map((one) => (
              <option key={one} value={one}>
                {stateInWords(one).word}
              </option>
            ))}
          </Select>
        </Field>
      )}
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
