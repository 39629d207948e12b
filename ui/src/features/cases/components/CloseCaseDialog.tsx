import { FAULT_MODES, type FaultMode } from '@engine/netlist/types';
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
  Radio,
  RadioGroup,
  Select,
  Text,
  Textarea,
  tokens,
} from '@fluentui/react-components';
import { useState } from 'react';
import { FormMessage } from '@/components/FormMessage';
import { useDialogLeave } from '@/hooks/useDialogLeave';
import { type Case, type ConfirmedFault, type Outcome } from '@/lib/api-model';
import { problemInWords } from '@/lib/bench/problem';
import { FAULT_WORDS, OUTCOME_WORDS } from '@/lib/words';
import { useCloseCase } from '../api/close-case';

const useStyles = makeStyles({
  surface: { maxWidth: '620px', width: 'calc(100vw - 24px)' },
  content: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalL },
  add: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fit, minmax(min(100%, 160px), 1fr))',
    alignItems: 'end',
    gap: tokens.spacingHorizontalM,
  },
  list: { margin: 0, padding: 0, listStyle: 'none' },
  item: {
    display: 'flex',
    alignItems: 'center',
    justifyContent: 'space-between',
    minHeight: '44px',
    borderBottom: `1px solid ${tokens.colorNeutralStroke3}`,
  },
});

interface CloseCaseDialogProps {
  repair: Case;
  /** Faults that the suspects point at; offered as a start, each can be removed. */
  proposed: ConfirmedFault[];
  onClose: () => void;
}

/** Asks how a case ended and which faults were confirmed. */
export function CloseCaseDialog({ repair, proposed, onClose }: CloseCaseDialogProps) {
  const styles = useStyles();
  const { isOpen, leave } = useDialogLeave(onClose);
  const close = useCloseCase(String(repair.id));
  const [outcome, setOutcome] = useState<Outcome>('repaired');
  const [faults, setFaults] = useState(proposed);
  const [note, setNote] = useState('');
  const [part, setPart] = useState('');
  const [mode, setMode] = useState<FaultMode>('open');
  const [message, setMessage] = useState<string>();
  const isRepaired = outcome === 'repaired';
  const add = () => {
    if (!part || faults.some((fault) => fault.part === part && fault.mode === mode)) return;
    setFaults([...faults, { part, mode }]);
    setPart('');
    setMessage(undefined);
  };
  const send = () => {
    if (isRepaired && faults.length === 0) {
      setMessage('Add the fault that was confirmed; the next set of this family profits from it.');
      return;
    }
    close.mutate(
      { outcome, confirmedFaults: outcome === 'no-fault' ? [] : faults, note: note.trim() },
      { onSuccess: () => leave() },
    );
  };
  return (
    <Dialog open={isOpen} onOpenChange={(_event, { open }) => !open && leave()}>
      <DialogSurface className={styles.surface}>
        <DialogBody>
          <DialogTitle>Close the case</DialogTitle>
          <DialogContent className={styles.content}>
            <Field label="How it ended">
              <RadioGroup
                value={outcome}
                onChange={(_event, { value }) => setOutcome(value as Outcome)}
              >
                {Object.entries(OUTCOME_WORDS).map(([value, label]) => (
                  <Radio key={value} value={value} label={label} />
                ))}
              </RadioGroup>
            </Field>
            {outcome !== 'no-fault' && (
              <>
                <Text weight="semibold">Confirmed faults</Text>
                {faults.length === 0 ? (
                  <Text>None yet. Add what was bad, as it was proved on the bench.</Text>
                ) : (
                  <ul className={styles.list}>
                    {faults.map((fault) => (
                      <li key={`${fault.part} ${fault.mode}`} className={styles.item}>
                        <Text>
                          {fault.part} {FAULT_WORDS[fault.mode]}
                        </Text>
                        <Button
                          appearance="subtle"
                          aria-label={`Remove ${fault.part} ${FAULT_WORDS[fault.mode]}`}
                          onClick={() => setFaults(faults.filter((one) => one !== fault))}
                        >
                          Remove
                        </Button>
                      </li>
                    ))}
                  </ul>
                )}
                <div className={styles.add}>
                  <Field label="Part">
                    <Select value={part} onChange={(_event, { value }) => setPart(value)}>
                      <option value="">Choose</option>
                      {repair.netlist.parts.map(({ ref }) => (
                        <option key={ref}>{ref}</option>
                      ))}
                    </Select>
                  </Field>
                  <Field label="What was wrong">
                    <Select
                      value={mode}
                      onChange={(_event, { value }) => setMode(value as FaultMode)}
                    >
                      {FAULT_MODES.map((one) => (
                        <option key={one} value={one}>
                          {FAULT_WORDS[one]}
                        </option>
                      ))}
                    </Select>
                  </Field>
                  <Button disabled={!part} onClick={add}>
                    Add the fault
                  </Button>
                </div>
              </>
            )}
            <Field label="Note" hint="What the next technician should know.">
              <Textarea value={note} rows={3} onChange={(_event, { value }) => setNote(value)} />
            </Field>
            <FormMessage
              message={message ?? (close.isError ? problemInWords(close.error) : undefined)}
            />
          </DialogContent>
          <DialogActions>
            <Button size="large" onClick={() => leave()}>
              Cancel
            </Button>
            <Button appearance="primary" size="large" disabled={close.isPending} onClick={send}>
              {close.isPending ? 'Closing…' : 'Close the case'}
            </Button>
          </DialogActions>
        </DialogBody>
      </DialogSurface>
    </Dialog>
  );
}
