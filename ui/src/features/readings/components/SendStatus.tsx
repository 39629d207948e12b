import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { type SendState } from '../hooks/useReadingSender';

const WORDS: Record<SendState, string> = {
  idle: 'All readings are saved.',
  sending: 'Saving…',
  waiting: 'The service cannot be reached. Your readings are kept here and sent as soon as it can.',
};

const useStyles = makeStyles({
  root: { color: tokens.colorNeutralForeground3 },
  waiting: { color: tokens.colorStatusWarningForeground1 },
});

/** Says whether everything that was typed has reached the service. */
export function SendStatus({ state }: { state: SendState }) {
  const styles = useStyles();
  return (
    <Text size={200} role="status" className={state === 'waiting' ? styles.waiting : styles.root}>
      {WORDS[state]}
    </Text>
  );
}
