import { Badge, makeStyles } from '@fluentui/react-components';

export type StatusTone = 'calm' | 'busy' | 'done' | 'warn';

const COLORS = { calm: 'informative', busy: 'brand', done: 'success', warn: 'warning' } as const;

const useStyles = makeStyles({ root: { whiteSpace: 'nowrap', flexShrink: 0 } });

interface StatusBadgeProps {
  /** The words carry the meaning; the colour only helps. */
  children: string;
  tone?: StatusTone;
}

/** A state in one or two words. */
export function StatusBadge({ children, tone = 'calm' }: StatusBadgeProps) {
  const styles = useStyles();
  return (
    <Badge appearance="tint" color={COLORS[tone]} size="large" className={styles.root}>
      {children}
    </Badge>
  );
}
