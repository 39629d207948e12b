import { makeStyles, tokens } from '@fluentui/react-components';
import { createElement, Fragment, type ReactNode } from 'react';
import { type MarkupNode, readMarkup } from '../words/math-markup';
import { toMathTree } from '../words/math-tree';
import { MathTree } from './MathTree';

interface MathLineProps {
  /** The equation as text: read aloud, and shown when nothing better is there. */
  text: string;
  /** The equation in MathML, where the service gives it. */
  mathml?: string;
}

const useStyles = makeStyles({
  root: {
    padding: `${tokens.spacingVerticalS} 0`,
    fontSize: tokens.fontSizeBase400,
  },
  text: {
    display: 'block',
    padding: `${tokens.spacingVerticalXS} 0`,
    fontFamily: tokens.fontFamilyMonospace,
    whiteSpace: 'pre-wrap',
    overflowWrap: 'anywhere',
  },
});

/** An equation in MathML: the service's own, else read from its text; else the text as it is. */
export function MathLine({ text, mathml }: MathLineProps) {
  const styles = useStyles();
  const markup = mathml ? readMarkup(mathml) : null;
  const tree = markup ? null : toMathTree(text);
  if (!markup && !tree) return <code className={styles.text}>{text}</code>;
  return (
    <div className={styles.root}>
      <math displaystyle="true" aria-label={text}>
        {markup && typeof markup !== 'string' ? drawAll(markup.children) : null}
        {tree && <MathTree tree={tree} />}
      </math>
    </div>
  );
}

function drawAll(nodes: readonly MarkupNode[]): ReactNode {
  return nodes.map((node, index) => (
    <Fragment key={index}>
      {typeof node === 'string' ? node : createElement(node.tag, null, drawAll(node.children))}
    </Fragment>
  ));
}
