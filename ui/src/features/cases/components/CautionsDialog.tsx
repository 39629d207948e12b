import { type Netlist } from '@engine/netlist/types';
import {
  Button,
  Dialog,
  DialogActions,
  DialogBody,
  DialogContent,
  DialogSurface,
  DialogTitle,
  makeStyles,
  Text,
  tokens,
} from '@fluentui/react-components';
import { useDialogLeave } from '@/hooks/useDialogLeave';
import { FormMessage } from '@/components/FormMessage';
import { problemInWords } from '@/lib/bench/problem';
import { useAcknowledgeCautions } from '../api/acknowledge-cautions';
import { cautionsFor, CODES_FIRST } from '../words/caution-words';

const useStyles = makeStyles({
  surface: { maxWidth: '660px', width: 'calc(100vw - 24px)' },
  content: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalL },
  list: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalM,
    margin: 0,
    paddingLeft: '22px',
  },
  title: { display: 'block' },
  button: { whiteSpace: 'nowrap' },
  codes: {
    padding: tokens.spacingHorizontalM,
    borderLeft: `4px solid ${tokens.colorPaletteDarkOrangeBorderActive}`,
    backgroundColor: tokens.colorNeutralBackground3,
  },
});

interface CautionsDialogProps {
  caseId: string;
  set: string;
  netlist: Netlist;
  onClose: () => void;
}

/** The cautions of a set; reading them is recorded once per case and person. */
export function CautionsDialog({ caseId, set, netlist, onClose }: CautionsDialogProps) {
  const styles = useStyles();
  const { isOpen, leave } = useDialogLeave(onClose);
  const acknowledge = useAcknowledgeCautions(caseId);
  return (
    <Dialog open={isOpen} onOpenChange={(_event, { open }) => !open && leave()}>
      <DialogSurface className={styles.surface}>
        <DialogBody>
          <DialogTitle>Before power</DialogTitle>
          <DialogContent className={styles.content}>
            <ol className={styles.list}>
              {cautionsFor(netlist, set).map(({ title, text }) => (
                <li key={title}>
                  <Text weight="semibold" className={styles.title}>
                    {title}
                  </Text>
                  <Text>{text}</Text>
                </li>
              ))}
            </ol>
            <Text className={styles.codes}>{CODES_FIRST}</Text>
            <FormMessage
              message={acknowledge.isError ? problemInWords(acknowledge.error) : undefined}
            />
          </DialogContent>
          <DialogActions>
            <Button size="large" className={styles.button} onClick={() => leave()}>
              Stay with cold readings
            </Button>
            <Button
              appearance="primary"
              size="large"
              className={styles.button}
              disabled={acknowledge.isPending}
              onClick={() => acknowledge.mutate(undefined, { onSuccess: () => leave() })}
            >
              I have read them
            </Button>
          </DialogActions>
        </DialogBody>
      </DialogSurface>
    </Dialog>
  );
}
