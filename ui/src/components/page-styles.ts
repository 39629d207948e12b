import { makeStyles } from '@fluentui/react-components';
import { extraTokens } from '@/theme/extra-tokens';

/** Frames of list screens: all begin at the same left edge, so that nothing jumps between them. */
export const usePageStyles = makeStyles({
  /** A list that uses the width there is. */
  list: { maxWidth: extraTokens.pageWidth, margin: '0 auto' },
  /** Text and forms, which are hard to read when they are wide. */
  text: {
    maxWidth: extraTokens.pageWidth,
    margin: '0 auto',
    '> *': { maxWidth: '960px' },
  },
});
