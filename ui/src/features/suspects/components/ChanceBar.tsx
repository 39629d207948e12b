import { makeStyles, tokens } from '@fluentui/react-components';

const useStyles = makeStyles({
  root: {
    height: '6px',
    borderRadius: tokens.borderRadiusCircular,
    backgroundColor: tokens.colorNeutralBackground5,
    overflow: 'hidden',
  },
  fill: {
    height: '100%',
    borderRadius: tokens.borderRadiusCircular,
    backgroundColor: tokens.colorBrandBackground,
    transitionProperty: 'width',
    transitionDuration: tokens.durationNormal,
    '@media (prefers-reduced-motion: reduce)': { transitionDuration: '0s' },
  },
});

/** A quiet bar beside the words; the words carry the meaning. */
export function ChanceBar({ probability }: { probability: number }) {
  const styles = useStyles();
  return (
    <div className={styles.root} aria-hidden>
      <div className={styles.fill} style={{ width: `${Math.max(1, probability * 100)}%` }} />
    </div>
  );
}
