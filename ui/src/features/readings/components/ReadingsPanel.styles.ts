import { makeStyles, tokens } from '@fluentui/react-components';

/** Styles of the readings' panel. */
export const useReadingsPanelStyles = makeStyles({
  root: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalM,
    minWidth: 0,
  },
  bar: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: tokens.spacingHorizontalM,
  },
  touch: { '@media (pointer: coarse)': { minHeight: '44px' } },
  section: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalS,
    minWidth: 0,
  },
  title: { margin: `${tokens.spacingVerticalS} 0 0` },
});
