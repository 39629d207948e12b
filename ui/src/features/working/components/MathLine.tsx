import { makeStyles, tokens } from '@fluentui/react-components';
import { useMemo } from 'react';
import { toMathTree } from '../words/math-tree';
import { MathTree } from './MathTree';

const useStyles = makeStyles({
  root: {
    padding: `${tokens.spacingVerticalS} 0`,
    overflowX: 'auto',
    overflowY: 'hidden',
    fontSize: tokens.fontSizeBase400,
  },
  text: {
    fontFamily: tokens.fontFamilyMonospace,
    whiteSpace: 'pre-wrap',
    overflowWrap: 'anywhere',
  },
});

/** An equation in MathML where it can be read so, else as text. */
export function MathLine({ text }: { text: string }) {
  const styles = useStyles();
  const tree = useMemo(() => toMathTree(text), [text]);
  if (!tree) return <code className={styles.text}>{text}</code>;
  return (
    <div className={styles.root}>
      <math displaystyle="true" aria-label={text}>
        <MathTree tree={tree} />
      </math>
    </div>
  );
}
