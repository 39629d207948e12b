import {
  Button,
  Dialog,
  DialogActions,
  DialogBody,
  DialogContent,
  DialogSurface,
  DialogTitle,
  makeStyles,
  tokens,
} from '@fluentui/react-components';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { FormMessage } from '@/components/FormMessage';
import { TextField } from '@/components/TextField';
import { useDialogLeave } from '@/hooks/useDialogLeave';
import { type Case, type FamilySummary } from '@/lib/api-model';
import { showProblem } from '@/lib/form-problems';
import { type OpenCaseForm, openCaseSchema, useOpenCase } from '../api/open-case';
import { CircuitSource } from './CircuitSource';

const useStyles = makeStyles({
  surface: { maxWidth: '640px', width: 'calc(100vw - 24px)' },
  body: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalL },
});

interface OpenCaseDialogProps {
  families: readonly FamilySummary[];
  /** Said instead of the families when they could not be fetched. */
  familiesMessage?: string;
  onClose: () => void;
  onOpened: (opened: Case) => void;
}

/** Asks what is on the bench, what is wrong with it and where its circuit comes from. */
export function OpenCaseDialog(props: OpenCaseDialogProps) {
  const styles = useStyles();
  const { isOpen, leave } = useDialogLeave(props.onClose);
  const openCase = useOpenCase();
  const { control, handleSubmit, setError, setValue, formState } = useForm<OpenCaseForm>({
    resolver: zodResolver(openCaseSchema),
    defaultValues: {
      set: '',
      complaint: '',
      source: 'family',
      familyId: '',
      netlistText: '',
      csv: '',
      reference: 'CHASSIS',
      hot: '',
      return: '',
      designVolts: '117',
      hertz: '60',
      lineVolts: '',
    },
  });
  const send = handleSubmit((form) =>
    openCase.mutateAsync(form).then(
      (opened) => leave(() => props.onOpened(opened)),
      (error: unknown) => {
        showProblem(
          error,
          setError,
          ['set', 'complaint', 'familyId', 'csv', 'reference', 'lineVolts'],
          {
            netlist: form.source === 'csv' ? 'csv' : 'netlistText',
            parts: form.source === 'csv' ? 'csv' : 'netlistText',
            line: form.source === 'csv' ? 'hot' : 'netlistText',
            title: 'set',
          },
        );
      },
    ),
  );
  return (
    <Dialog open={isOpen} onOpenChange={(_event, { open }) => !open && leave()}>
      <DialogSurface className={styles.surface}>
        <form noValidate onSubmit={(event) => void send(event)}>
          <DialogBody>
            <DialogTitle>Open a case</DialogTitle>
            <DialogContent className={styles.body}>
              <FormMessage message={formState.errors.root?.message} />
              <TextField
                control={control}
                name="set"
                label="Set"
                hint="Maker, model, and what tells it from its neighbours."
                isRequired
              />
              <TextField
                control={control}
                name="complaint"
                label="Complaint"
                lines={3}
                isRequired
              />
              <CircuitSource
                control={control}
                families={props.families}
                familiesMessage={props.familiesMessage}
                onFile={(field, text) => setValue(field, text, { shouldValidate: true })}
              />
              <TextField
                control={control}
                name="lineVolts"
                label="Line voltage today"
                hint="Leave it empty to use the design voltage; it can be given later."
              />
            </DialogContent>
            <DialogActions>
              <Button size="large" onClick={() => leave()}>
                Cancel
              </Button>
              <Button type="submit" appearance="primary" size="large" disabled={openCase.isPending}>
                {openCase.isPending ? 'Opening…' : 'Open the case'}
              </Button>
            </DialogActions>
          </DialogBody>
        </form>
      </DialogSurface>
    </Dialog>
  );
}
