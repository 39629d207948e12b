import { makeStyles, Spinner, tokens } from '@fluentui/react-components';

const useStyles = makeStyles({
  root: {
    display: 'flex',
    justifyContent: 'flex-start',
    padding: `${tokens.spacingVerticalXXL} ${tokens.spacingHorizontalM}`,
  },
});

interface LoadingStateProps {
  /** What is being fetched, such as "Fetching the open cases". */
  label: string;
}

/** Shown while a screen waits for the service. */
export function LoadingState({ label }: LoadingStateProps) {
  const styles = useStyles();
  return (
    <div className={styles.root} role="status">
      <Spinner label={label} size="small" />
    </div>
  );
}
