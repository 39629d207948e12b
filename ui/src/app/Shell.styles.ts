import { makeStyles, tokens } from '@fluentui/react-components';
import { atMost, extraTokens } from '@/theme/extra-tokens';

/** Styles of the frame around every screen. */
export const useShellStyles = makeStyles({
  root: { minHeight: '100vh', display: 'flex', flexDirection: 'column' },
  skip: {
    position: 'absolute',
    left: '8px',
    top: '-60px',
    zIndex: 20,
    padding: `${tokens.spacingVerticalS} ${tokens.spacingHorizontalM}`,
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorBrandForegroundLink,
    borderRadius: tokens.borderRadiusMedium,
    boxShadow: tokens.shadow8,
    ':focus': { top: '8px' },
  },
  top: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    columnGap: tokens.spacingHorizontalXL,
    padding: `${tokens.spacingVerticalS} clamp(12px, 2.5vw, 36px)`,
    backgroundColor: tokens.colorNeutralBackground1,
    borderBottom: `1px solid ${tokens.colorNeutralStroke2}`,
  },
  home: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: tokens.spacingHorizontalS,
    minHeight: extraTokens.touchHeight,
    color: tokens.colorBrandForeground1,
    fontSize: tokens.fontSizeBase400,
    fontWeight: tokens.fontWeightSemibold,
    textDecoration: 'none',
  },
  nav: {
    display: 'flex',
    flexGrow: 1,
    gap: tokens.spacingHorizontalXS,
    overflowX: 'auto',
    scrollbarWidth: 'none',
    [atMost.phone]: { order: 3, columnGap: 0, width: '100%', flexBasis: '100%' },
  },
  // In a case the sections stand at the bottom; a second row of links would push the pad off the screen.
  navInCase: { [atMost.phone]: { display: 'none' } },
  link: {
    display: 'inline-grid',
    alignContent: 'center',
    minHeight: extraTokens.touchHeight,
    padding: `0 ${tokens.spacingHorizontalM}`,
    // Room for the bold word, so that the others stay where they are when one is chosen.
    '::after': {
      content: 'attr(data-label)',
      height: 0,
      overflow: 'hidden',
      visibility: 'hidden',
      fontWeight: tokens.fontWeightSemibold,
    },
    color: tokens.colorNeutralForeground2,
    textDecoration: 'none',
    whiteSpace: 'nowrap',
    borderBottom: '3px solid transparent',
    ':hover': {
      color: tokens.colorNeutralForeground1,
      borderBottomColor: tokens.colorNeutralStroke1,
    },
    ':focus-visible': { outlineOffset: '-3px' },
    [atMost.phone]: { padding: '0 clamp(4px, 1.5vw, 8px)' },
  },
  linkHere: {
    color: tokens.colorBrandForeground1,
    fontWeight: tokens.fontWeightSemibold,
    borderBottomColor: tokens.colorBrandForeground1,
  },
  person: {
    display: 'flex',
    alignItems: 'center',
    marginLeft: 'auto',
    gap: tokens.spacingHorizontalXS,
  },
  main: {
    flexGrow: 1,
    width: '100%',
    padding: `${tokens.spacingVerticalXXL} clamp(12px, 2.5vw, 36px)`,
    ':focus': { outline: 'none' },
    [atMost.phone]: { paddingTop: tokens.spacingVerticalL },
  },
});
