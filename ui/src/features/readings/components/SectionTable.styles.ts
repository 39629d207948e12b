import { makeStyles, tokens } from '@fluentui/react-components';

/** Styles of the readings' grid. */
export const useSectionTableStyles = makeStyles({
  scroll: { overflowX: 'auto', maxWidth: '100%' },
  table: { borderCollapse: 'collapse', fontSize: tokens.fontSizeBase300 },
  head: {
    padding: `${tokens.spacingVerticalXS} ${tokens.spacingHorizontalS}`,
    textAlign: 'right',
    fontSize: tokens.fontSizeBase200,
    fontWeight: tokens.fontWeightSemibold,
    color: tokens.colorNeutralForeground3,
    borderBottom: `1px solid ${tokens.colorNeutralStroke1}`,
    whiteSpace: 'nowrap',
  },
  place: {
    position: 'sticky',
    left: 0,
    zIndex: 1,
    width: '190px',
    minWidth: '116px',
    maxWidth: '190px',
    padding: `${tokens.spacingVerticalXXS} ${tokens.spacingHorizontalS} ${tokens.spacingVerticalXXS} 0`,
    textAlign: 'left',
    fontWeight: tokens.fontWeightRegular,
    backgroundColor: tokens.colorNeutralBackground1,
  },
  row: { borderBottom: `1px solid ${tokens.colorNeutralStroke3}` },
  firstOfKind: { borderTop: `2px solid ${tokens.colorNeutralStroke2}` },
  label: { display: 'block', fontWeight: tokens.fontWeightSemibold },
  detail: {
    display: 'block',
    fontSize: tokens.fontSizeBase200,
    lineHeight: tokens.lineHeightBase200,
    color: tokens.colorNeutralForeground3,
  },
  cell: { padding: '1px 2px', width: '116px', verticalAlign: 'top' },
  look: { textAlign: 'left', paddingLeft: tokens.spacingHorizontalM },
  blank: { padding: 0 },
  historyColumn: { width: '36px', padding: 0, textAlign: 'right', borderBottom: 'none' },
  hidden: {
    position: 'absolute',
    width: '1px',
    height: '1px',
    overflow: 'hidden',
    clipPath: 'inset(50%)',
  },
});
