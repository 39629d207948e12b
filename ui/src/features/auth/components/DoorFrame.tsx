import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { type ReactNode, useEffect } from 'react';
import { Mark } from '@/components/Mark';

const useStyles = makeStyles({
  root: {
    minHeight: '100vh',
    display: 'grid',
    alignItems: 'start',
    justifyItems: 'center',
    padding: `clamp(24px, 12vh, 140px) 16px 32px`,
  },
  sheet: {
    width: 'min(100%, 430px)',
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalL,
    padding: 'clamp(20px, 5vw, 36px)',
    backgroundColor: tokens.colorNeutralBackground1,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderTop: `4px solid ${tokens.colorBrandForeground1}`,
    borderRadius: tokens.borderRadiusLarge,
  },
  brand: {
    display: 'flex',
    alignItems: 'center',
    gap: tokens.spacingHorizontalM,
    color: tokens.colorBrandForeground1,
    fontSize: tokens.fontSizeBase500,
    fontWeight: tokens.fontWeightSemibold,
  },
  title: {
    margin: 0,
    fontSize: tokens.fontSizeBase500,
    lineHeight: tokens.lineHeightBase500,
    fontWeight: tokens.fontWeightSemibold,
  },
});

interface DoorFrameProps {
  title: string;
  hint: string;
  children: ReactNode;
}

/** The sheet that stands alone in front of the shop: signing in, setting up, accepting. */
export function DoorFrame({ title, hint, children }: DoorFrameProps) {
  const styles = useStyles();
  useEffect(() => {
    document.title = `${title} · Ohmstead`;
  }, [title]);
  return (
    <main className={styles.root}>
      <div className={styles.sheet}>
        <div className={styles.brand}>
          <Mark size={38} />
          Ohmstead
        </div>
        <h1 className={styles.title}>{title}</h1>
        <Text>{hint}</Text>
        {children}
      </div>
    </main>
  );
}
