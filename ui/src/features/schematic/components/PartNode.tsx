import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { memo } from 'react';
import { type NodeProps } from 'reactflow';
import { grown, unionOf } from '../geometry/boxes';
import { type Box, type DrawnPart } from '../geometry/drawing';
import { LINE_HEIGHT } from '../geometry/metrics';
import { PartSymbol } from '../symbols/PartSymbol';
import { partInWords, type PartMarks, valueLine } from './schematic-model';

/** What React Flow hands to the node of one part. */
export interface PartNodeData {
  drawn: DrawnPart;
  marks?: PartMarks;
  reference: string;
  isSelected: boolean;
  onSelect?: (ref: string) => void;
  onFocus: (box: Box) => void;
}

const useStyles = makeStyles({
  button: {
    display: 'block',
    padding: 0,
    border: 'none',
    background: 'none',
    color: 'inherit',
    fontFamily: 'inherit',
    cursor: 'pointer',
    borderRadius: tokens.borderRadiusMedium,
    ':focus-visible': {
      outline: `3px solid ${tokens.colorStrokeFocus2}`,
      outlineOffset: '1px',
    },
  },
  svg: { display: 'block', overflow: 'visible' },
  ref: { fontWeight: tokens.fontWeightSemibold, fontSize: '13px', fill: 'currentColor' },
  value: {
    fontSize: '12px',
    fill: tokens.colorNeutralForeground2,
    fontVariantNumeric: 'tabular-nums',
  },
  missing: { opacity: 0.35, strokeDasharray: '4 3' },
  selected: { fill: tokens.colorBrandBackground2, stroke: tokens.colorBrandStroke1 },
  suspect: { fill: 'none', stroke: tokens.colorStatusDangerBorder2 },
  weak: { strokeDasharray: '2 4', stroke: tokens.colorStatusWarningForeground1 },
  badge: { fill: tokens.colorStatusDangerBackground3 },
  badgeWeak: {
    fill: tokens.colorStatusWarningBackground1,
    stroke: tokens.colorStatusWarningForeground1,
  },
  badgeText: {
    fontSize: '11px',
    fontWeight: tokens.fontWeightSemibold,
    fill: tokens.colorNeutralForegroundOnBrand,
  },
  badgeTextWeak: { fill: tokens.colorNeutralForeground1 },
  difference: { fill: tokens.colorNeutralBackground1, stroke: tokens.colorBrandForeground1 },
});

/** Box that belongs to a part on the sheet: symbol and label together. */
export function boxOfPart(drawn: DrawnPart): Box {
  return grown(unionOf([drawn.box, drawn.label.box]), 4);
}

/** One part on the sheet, as a button. */
export const PartNode = memo(function PartNode({ data }: NodeProps<PartNodeData>) {
  const styles = useStyles();
  const { drawn, marks, reference, isSelected } = data;
  const box = boxOfPart(drawn);
  return (
    <button
      type="button"
      className={mergeClasses(styles.button, 'nodrag', 'nopan')}
      style={{ width: box.width, height: box.height }}
      aria-label={partInWords(drawn, marks)}
      aria-pressed={isSelected}
      onClick={() => data.onSelect?.(drawn.part.ref)}
      onFocus={(event) => {
        if (event.currentTarget.matches(':focus-visible')) data.onFocus(box);
      }}
    >
      <svg
        className={styles.svg}
        width={box.width}
        height={box.height}
        viewBox={`${box.x} ${box.y} ${box.width} ${box.height}`}
        aria-hidden
      >
        <Outline drawn={drawn} marks={marks} isSelected={isSelected} />
        <g
          transform={`translate(${drawn.x} ${drawn.y})`}
          strokeWidth={1.8}
          strokeLinecap="round"
          strokeLinejoin="round"
          className={marks?.difference === 'missing' ? styles.missing : undefined}
        >
          <PartSymbol part={drawn.part} turn={drawn.turn} reference={reference} />
        </g>
        <Difference drawn={drawn} marks={marks} />
        <Label drawn={drawn} marks={marks} />
      </svg>
    </button>
  );
});

interface PieceProps {
  drawn: DrawnPart;
  marks?: PartMarks;
}

/** Frame of a selected part, and the pattern around a suspect: doubled when strong, dotted when weak. */
function Outline({ drawn, marks, isSelected }: PieceProps & { isSelected: boolean }) {
  const styles = useStyles();
  const frame = grown(drawn.box, 3);
  const level = marks?.suspect?.level;
  return (
    <>
      {isSelected && <rect {...frame} rx={6} className={styles.selected} strokeWidth={2} />}
      {level && (
        <rect
          {...grown(drawn.box, 1)}
          rx={5}
          className={mergeClasses(styles.suspect, level === 'weak' && styles.weak)}
          strokeWidth={2.4}
        />
      )}
      {level === 'strong' && (
        <rect
          {...grown(drawn.box, 4)}
          rx={7}
          className={styles.suspect}
          strokeWidth={2}
          strokeDasharray="7 4"
        />
      )}
    </>
  );
}

/** A wire across a bridged part, and the sign of "not as drawn" at the corner of any that differs. */
function Difference({ drawn, marks }: PieceProps) {
  const styles = useStyles();
  if (!marks?.difference) return null;
  const { x, y } = { x: drawn.box.x + 2, y: drawn.box.y + drawn.box.height };
  const isLevel = drawn.turn % 2 === 0;
  return (
    <g strokeWidth={1.6}>
      {marks.difference === 'bridged' && (
        <path
          transform={`translate(${drawn.x} ${drawn.y}) ${isLevel ? '' : 'rotate(90)'}`}
          d="M-26 0C-26-20 26-20 26 0"
          className={styles.difference}
          fillOpacity={0}
          strokeWidth={2.2}
        />
      )}
      <circle cx={x} cy={y} r={7} className={styles.difference} />
      <path
        transform={`translate(${x} ${y})`}
        d="M-3.500-1.500H3.500M-3.500 1.800H3.500M2-4L-2 4"
        className={styles.difference}
        strokeWidth={1.2}
      />
    </g>
  );
}

function Label({ drawn, marks }: PieceProps) {
  const styles = useStyles();
  const { box, anchor } = drawn.label;
  const x =
    anchor === 'start' ? box.x : anchor === 'middle' ? box.x + box.width / 2 : box.x + box.width;
  const value = valueLine(drawn, marks);
  const isAbove = anchor === 'middle';
  // Lines end next to the symbol when they stand above it, and are centred beside an upright one.
  const lines = value ? 2 : 1;
  const first = isAbove
    ? box.y + box.height - (lines - 1) * LINE_HEIGHT - 3
    : box.y + box.height / 2 - ((lines - 1) * LINE_HEIGHT) / 2 + 4;
  const badgeY = isAbove ? first - LINE_HEIGHT - 2 : first + lines * LINE_HEIGHT - 1;
  return (
    <g textAnchor={anchor}>
      <text x={x} y={first} className={styles.ref}>
        {drawn.part.ref}
      </text>
      {value && (
        <text x={x} y={first + LINE_HEIGHT} className={styles.value}>
          {value}
        </text>
      )}
      {marks?.suspect && <Badge x={x} y={badgeY} anchor={anchor} suspect={marks.suspect} />}
    </g>
  );
}

function Badge({
  x,
  y,
  anchor,
  suspect,
}: {
  x: number;
  y: number;
  anchor: DrawnPart['label']['anchor'];
  suspect: NonNullable<PartMarks['suspect']>;
}) {
  const styles = useStyles();
  const width = suspect.badge.length * 6.2 + 12;
  const left = anchor === 'start' ? x : anchor === 'middle' ? x - width / 2 : x - width;
  const isWeak = suspect.level === 'weak';
  return (
    <>
      <rect
        x={left}
        y={y - 11}
        width={width}
        height={15}
        rx={7.5}
        className={isWeak ? styles.badgeWeak : styles.badge}
      />
      <text
        x={left + width / 2}
        y={y}
        textAnchor="middle"
        className={mergeClasses(styles.badgeText, isWeak && styles.badgeTextWeak)}
      >
        {suspect.badge}
      </text>
    </>
  );
}
