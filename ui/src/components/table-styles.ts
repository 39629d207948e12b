import { makeStyles, tokens } from '@fluentui/react-components';

/** Quiet tables: rules between rows, nothing between columns. */
export const useTableStyles = makeStyles({
  frame: {
    overflowX: 'auto',
    backgroundColor: tokens.colorNeutralBackground1,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: tokens.borderRadiusLarge,
  },
  table: { width: '100%', borderCollapse: 'collapse', fontSize: tokens.fontSizeBase300 },
  caption: {
    position: 'absolute',
    width: '1px',
    height: '1px',
    overflow: 'hidden',
    clipPath: 'inset(50%)',
  },
  head: {
    padding: `${tokens.spacingVerticalM} ${tokens.spacingHorizontalM}`,
    textAlign: 'left',
    whiteSpace: 'nowrap',
    fontSize: tokens.fontSizeBase200,
    fontWeight: tokens.fontWeightSemibold,
    color: tokens.colorNeutralForeground3,
    borderBottom: `1px solid ${tokens.colorNeutralStroke1}`,
  },
  row: {
    ':not(:last-child)': { borderBottom: `1px solid ${tokens.colorNeutralStroke3}` },
    ':hover': { backgroundColor: tokens.colorNeutralBackground1Hover },
  },
  cell: {
    padding: `${tokens.spacingVerticalM} ${tokens.spacingHorizontalM}`,
    textAlign: 'left',
    verticalAlign: 'top',
    fontWeight: 'inherit',
  },
  plain: {
    padding: `${tokens.spacingVerticalM} ${tokens.spacingHorizontalM}`,
    verticalAlign: 'top',
    whiteSpace: 'nowrap',
  },
  number: {
    padding: `${tokens.spacingVerticalM} ${tokens.spacingHorizontalM}`,
    textAlign: 'right',
    verticalAlign: 'top',
    whiteSpace: 'nowrap',
  },
  quiet: {
    padding: `${tokens.spacingVerticalM} ${tokens.spacingHorizontalM}`,
    verticalAlign: 'top',
    whiteSpace: 'nowrap',
    color: tokens.colorNeutralForeground3,
  },
  link: {
    color: tokens.colorBrandForegroundLink,
    fontWeight: tokens.fontWeightSemibold,
    textDecoration: 'none',
    ':hover': { textDecoration: 'underline' },
  },
});
