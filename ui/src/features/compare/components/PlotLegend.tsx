import { makeStyles, tokens } from '@fluentui/react-components';
import { MARKS } from './StringPlot';

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexWrap: 'wrap',
    columnGap: tokens.spacingHorizontalL,
    rowGap: tokens.spacingVerticalXXS,
    margin: 0,
    padding: 0,
    listStyleType: 'none',
    fontSize: tokens.fontSizeBase200,
    color: tokens.colorNeutralForeground2,
  },
  item: { display: 'flex', alignItems: 'center', gap: tokens.spacingHorizontalXS },
  band: { fill: tokens.colorBrandBackground2, stroke: tokens.colorBrandStroke2 },
  line: { stroke: tokens.colorBrandForeground1 },
  published: { stroke: tokens.colorNeutralForeground1 },
  inside: { fill: tokens.colorNeutralForeground1 },
  edge: { fill: tokens.colorStatusWarningForeground1 },
  outside: { fill: tokens.colorStatusDangerForeground1 },
});

/** What the signs of the plot mean. */
export function PlotLegend() {
  const styles = useStyles();
  const mark = (verdict: keyof typeof MARKS) => (
    <path transform="translate(10 9)" d={MARKS[verdict]} className={styles[verdict]} />
  );
  const items = [
    {
      text: 'what 95 of 100 healthy sets show',
      sign: (
        <>
          <rect x={2} y={3} width={16} height={12} className={styles.band} />
          <path d="M10 3V15" strokeWidth={1.5} className={styles.line} />
        </>
      ),
    },
    { text: 'measured, inside', sign: mark('inside') },
    { text: 'measured, at the edge', sign: mark('edge') },
    { text: 'measured, outside', sign: mark('outside') },
    {
      text: 'published',
      sign: <path d="M10 2V16M6 2H14M6 16H14" strokeWidth={1.6} className={styles.published} />,
    },
  ];
  return (
    <ul className={styles.root} aria-label="Signs of the plot">
      {items.map(({ text, sign }) => (
        <li key={text} className={styles.item}>
          <svg width={20} height={18} aria-hidden>
            {sign}
          </svg>
          {text}
        </li>
      ))}
    </ul>
  );
}
