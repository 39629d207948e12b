import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { type ReactNode } from 'react';

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'flex-start',
    gap: tokens.spacingVerticalM,
    maxWidth: '60ch',
    padding: tokens.spacingHorizontalXL,
    borderRadius: tokens.borderRadiusLarge,
    border: `1px dashed ${tokens.colorNeutralStroke1}`,
  },
});

interface EmptyStateProps {
  /** What is not there, as a sentence. */
  title: string;
  /** What to do next. */
  children?: ReactNode;
  /** A button or link that does it. */
  action?: ReactNode;
}

/** Shown where a list has nothing in it. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  const styles = useStyles();
  return (
    <div className={styles.root}>
      <Text weight="semibold" size={400}>
        {title}
      </Text>
      {children && <Text>{children}</Text>}
      {action}
    </div>
  );
}
