import { makeStyles, tokens } from '@fluentui/react-components';
import { type NodeValues, type PartMarks } from './schematic-model';

interface SheetLegendProps {
  values: Record<string, NodeValues>;
  marks: ReadonlyMap<string, PartMarks>;
}

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexWrap: 'wrap',
    columnGap: tokens.spacingHorizontalL,
    rowGap: tokens.spacingVerticalXXS,
    margin: 0,
    padding: `${tokens.spacingVerticalXS} ${tokens.spacingHorizontalXS}`,
    listStyleType: 'none',
    fontSize: tokens.fontSizeBase200,
    color: tokens.colorNeutralForeground2,
  },
  item: { display: 'flex', alignItems: 'center', gap: tokens.spacingHorizontalXS },
  measured: { fill: tokens.colorBrandForeground1 },
  computed: { fill: 'none', stroke: tokens.colorNeutralForeground2 },
  strong: { fill: 'none', stroke: tokens.colorStatusDangerBorder2 },
  weak: { fill: 'none', stroke: tokens.colorStatusWarningForeground1 },
  difference: { fill: 'none', stroke: tokens.colorBrandForeground1 },
});

/** Says what the signs on the sheet mean; only those in use. */
export function SheetLegend({ values, marks }: SheetLegendProps) {
  const styles = useStyles();
  const shown = Object.values(values);
  const levels = new Set([...marks.values()].map((mark) => mark.suspect?.level));
  const items = [
    shown.some(({ measured }) => measured) && {
      text: 'measured',
      sign: <rect x={3} y={5} width={7} height={7} className={styles.measured} />,
    },
    shown.some(({ computed }) => computed) && {
      text: 'computed for a healthy set',
      sign: <circle cx={7} cy={8} r={3.5} strokeWidth={1.4} className={styles.computed} />,
    },
    levels.has('strong') && {
      text: 'likely suspect',
      sign: (
        <>
          <rect x={4} y={5} width={12} height={7} strokeWidth={2} className={styles.strong} />
          <rect
            {...{ x: 1, y: 2, width: 18, height: 13, rx: 3 }}
            strokeWidth={1.6}
            strokeDasharray="4 2"
            className={styles.strong}
          />
        </>
      ),
    },
    levels.has('weak') && {
      text: 'possible suspect',
      sign: (
        <rect
          {...{ x: 2, y: 3, width: 16, height: 11, rx: 2 }}
          strokeWidth={2}
          strokeDasharray="2 3"
          className={styles.weak}
        />
      ),
    },
    [...marks.values()].some((mark) => mark.difference) && {
      text: 'not as drawn',
      sign: (
        <>
          <circle cx={9} cy={8.5} r={6.5} strokeWidth={1.4} className={styles.difference} />
          <path
            d="M5.500 7H12.500M5.500 10H12.500M11 4.500L7 12.500"
            strokeWidth={1.2}
            className={styles.difference}
          />
        </>
      ),
    },
  ].filter((item) => !!item);
  if (items.length === 0) return null;
  return (
    <ul className={styles.root} aria-label="Signs on the drawing">
      {items.map(({ text, sign }) => (
        <li key={text} className={styles.item}>
          <svg width={20} height={17} aria-hidden>
            {sign}
          </svg>
          {text}
        </li>
      ))}
    </ul>
  );
}
