import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { problemInWords } from '@/lib/bench/problem';

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'flex-start',
    gap: tokens.spacingVerticalM,
    maxWidth: '60ch',
    padding: `${tokens.spacingVerticalXL} ${tokens.spacingHorizontalM}`,
  },
});

interface FailedStateProps {
  /** Whatever the request threw. */
  error: unknown;
  /** Asks again. */
  onRetry?: () => void;
}

/** Shown when the service refused or could not be reached; says what to do. */
export function FailedState({ error, onRetry }: FailedStateProps) {
  const styles = useStyles();
  return (
    <div className={styles.root} role="alert">
      <Text>{problemInWords(error)}</Text>
      {onRetry && <Button onClick={onRetry}>Try again</Button>}
    </div>
  );
}
