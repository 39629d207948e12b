import { makeStyles, tokens } from '@fluentui/react-components';

/** Styles of the single-reading view. */
export const useBenchEntryStyles = makeStyles({
  root: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalS,
    width: '100%',
    maxWidth: '480px',
    marginInline: 'auto',
  },
  chooser: { display: 'flex', gap: tokens.spacingHorizontalS },
  step: { minWidth: '48px', minHeight: '48px' },
  select: { flexGrow: 1, minWidth: 0, '& select': { minHeight: '48px' } },
  state: {
    display: 'block',
    '::first-letter': { textTransform: 'uppercase' },
    color: tokens.colorNeutralForeground3,
  },
  title: {
    margin: 0,
    fontSize: tokens.fontSizeBase500,
    lineHeight: tokens.lineHeightBase500,
    fontWeight: tokens.fontWeightSemibold,
    overflowWrap: 'anywhere',
  },
  value: {
    display: 'flex',
    alignItems: 'baseline',
    justifyContent: 'flex-end',
    gap: tokens.spacingHorizontalS,
    minHeight: '56px',
    padding: `${tokens.spacingVerticalXS} ${tokens.spacingHorizontalM}`,
    borderRadius: tokens.borderRadiusLarge,
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    backgroundColor: tokens.colorNeutralBackground2,
    fontSize: tokens.fontSizeHero800,
    lineHeight: '48px',
    fontVariantNumeric: 'tabular-nums',
  },
  unit: { fontSize: tokens.fontSizeBase500, color: tokens.colorNeutralForeground3 },
  error: { margin: 0, color: tokens.colorStatusDangerForeground1 },
  looks: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fill, minmax(120px, 1fr))',
    gap: tokens.spacingHorizontalS,
  },
  look: { minHeight: '52px' },
});
