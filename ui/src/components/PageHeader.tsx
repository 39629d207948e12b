import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { type ReactNode, useEffect } from 'react';

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'flex-end',
    justifyContent: 'space-between',
    gap: `${tokens.spacingVerticalM} ${tokens.spacingHorizontalXL}`,
    marginBottom: tokens.spacingVerticalXL,
  },
  words: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalXS, minWidth: 0 },
  title: {
    margin: 0,
    fontSize: tokens.fontSizeBase600,
    lineHeight: tokens.lineHeightBase600,
    fontWeight: tokens.fontWeightSemibold,
    overflowWrap: 'anywhere',
  },
  hint: { color: tokens.colorNeutralForeground3, maxWidth: '68ch' },
  actions: { display: 'flex', flexWrap: 'wrap', gap: tokens.spacingHorizontalM },
});

interface PageHeaderProps {
  title: string;
  /** One sentence under the title. */
  hint?: ReactNode;
  /** Buttons at the far end. */
  actions?: ReactNode;
}

/** Names the screen, in the page and in the browser's tab. */
export function PageHeader({ title, hint, actions }: PageHeaderProps) {
  const styles = useStyles();
  useEffect(() => {
    document.title = `${title} · Ohmstead`;
  }, [title]);
  return (
    <div className={styles.root}>
      <div className={styles.words}>
        <h1 className={styles.title}>{title}</h1>
        {hint && <Text className={styles.hint}>{hint}</Text>}
      </div>
      {actions && <div className={styles.actions}>{actions}</div>}
    </div>
  );
}
