import { makeStyles, mergeClasses, tokens, Tooltip } from '@fluentui/react-components';
import { type Take } from '@engine/netlist/types';
import { takenInWords } from '@/lib/bench/quantities';
import { comparisonInWords, type Verdict } from '../plot/compare-model';
import { type Plot, type PlotRow, ROW_HEIGHT } from '../plot/plot-geometry';

interface StringPlotProps {
  plot: Plot;
  take: Take;
}

const useStyles = makeStyles({
  svg: { display: 'block', overflow: 'visible' },
  grid: { stroke: tokens.colorNeutralStroke3 },
  tick: {
    fontSize: '11px',
    fill: tokens.colorNeutralForeground3,
    fontVariantNumeric: 'tabular-nums',
  },
  label: { fontSize: '13px', fill: tokens.colorNeutralForeground1 },
  band: { fill: tokens.colorBrandBackground2, stroke: tokens.colorBrandStroke2 },
  line: { fill: 'none', stroke: tokens.colorBrandForeground1 },
  computed: { fill: tokens.colorBrandForeground1 },
  published: { stroke: tokens.colorNeutralForeground1 },
  inside: { fill: tokens.colorNeutralForeground1 },
  edge: { fill: tokens.colorStatusWarningForeground1 },
  outside: { fill: tokens.colorStatusDangerForeground1 },
  over: { fontSize: '11px', fontWeight: tokens.fontWeightSemibold },
  row: {
    fill: 'transparent',
    ':hover': { fill: tokens.colorSubtleBackgroundHover },
    ':focus-visible': {
      outline: `2px solid ${tokens.colorStrokeFocus2}`,
      outlineOffset: '-2px',
    },
  },
});

/** Values down the string: band of a healthy set, computed line, measured marks, published ticks. */
export function StringPlot({ plot, take }: StringPlotProps) {
  const styles = useStyles();
  return (
    <svg
      className={styles.svg}
      width={plot.width}
      height={plot.height}
      role="group"
      aria-label="Measured against computed, from the line down"
    >
      {plot.ticks.map(({ x, value }) => (
        <g key={value} aria-hidden>
          <line x1={x} x2={x} y1={22} y2={plot.height} className={styles.grid} />
          <text x={x} y={14} textAnchor="middle" className={styles.tick}>
            {takenInWords(value, take)}
          </text>
        </g>
      ))}
      <g aria-hidden>
        {plot.bands.map((path) => (
          <path key={path} d={path} className={styles.band} />
        ))}
        {plot.lines.map((path) => (
          <path key={path} d={path} strokeWidth={1.5} className={styles.line} />
        ))}
        {plot.rows.map((row) => (
          <Row key={`${row.point.kind} ${row.point.key}`} row={row} left={plot.left} />
        ))}
      </g>
      {plot.rows.map(({ point, y }) => (
        <Tooltip
          key={`${point.kind} ${point.key}`}
          content={`${point.label}: ${comparisonInWords(point)}`}
          relationship="label"
          withArrow
        >
          <rect
            x={0}
            y={y - ROW_HEIGHT / 2}
            width={plot.width}
            height={ROW_HEIGHT}
            tabIndex={0}
            role="img"
            className={styles.row}
          />
        </Tooltip>
      ))}
    </svg>
  );
}

function Row({ row, left }: { row: PlotRow; left: number }) {
  const styles = useStyles();
  const { y, computed, published, measured, verdict } = row;
  return (
    <>
      <text x={left - 12} y={y + 4.5} textAnchor="end" className={styles.label}>
        {shortened(row.point.label, left - 12)}
      </text>
      {computed !== null && <circle cx={computed} cy={y} r={2.5} className={styles.computed} />}
      {published !== null && (
        <path
          d={`M${published} ${y - 11}V${y + 11}M${published - 4} ${y - 11}H${published + 4}M${published - 4} ${y + 11}H${published + 4}`}
          strokeWidth={1.6}
          className={styles.published}
        />
      )}
      {measured !== null && verdict && (
        <>
          <path
            transform={`translate(${measured} ${y})`}
            d={MARKS[verdict]}
            className={mergeClasses(
              verdict === 'inside' && styles.inside,
              verdict === 'edge' && styles.edge,
              verdict === 'outside' && styles.outside,
            )}
          />
          {row.isOver && (
            <text
              x={measured - 12}
              y={y + 4}
              textAnchor="end"
              className={mergeClasses(styles.over, styles[verdict])}
            >
              OL
            </text>
          )}
        </>
      )}
    </>
  );
}

/** Shapes of a measured mark: a square inside the band, a triangle at its edge, a star outside. */
export const MARKS: Record<Verdict, string> = {
  inside: 'M-5-5H5V5H-5Z',
  edge: 'M0-7L7 6H-7Z',
  outside: 'M0-9L2.200-2.200L9 0L2.200 2.200L0 9L-2.200 2.200L-9 0L-2.200-2.200Z',
};

function shortened(label: string, width: number): string {
  const most = Math.max(4, Math.floor(width / 7));
  return label.length > most ? `${label.slice(0, most - 1)}…` : label;
}
