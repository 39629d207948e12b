import { type Line, type Netlist } from '@engine/netlist/types';
import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { memo } from 'react';
import { type NodeProps } from 'reactflow';
import { labelForNode } from '@/lib/bench/places';
import { type Drawing, type DrawnNode, type RailSymbol, type TextPlace } from '../geometry/drawing';
import { LINE_HEIGHT, lineLabel } from '../geometry/metrics';
import { LineSymbol, RailEnd } from '../symbols/SupplySymbols';
import { isChassis, type NodeValues } from './schematic-model';

/** What React Flow hands to the sheet below the parts. */
export interface SheetNodeData {
  drawing: Drawing;
  netlist: Netlist;
  values: Record<string, NodeValues>;
}

const useStyles = makeStyles({
  svg: { display: 'block', overflow: 'visible', pointerEvents: 'none' },
  name: { fontSize: '12px', fill: tokens.colorNeutralForeground3 },
  measured: {
    fontSize: '13px',
    fontWeight: tokens.fontWeightSemibold,
    fill: tokens.colorNeutralForeground1,
    fontVariantNumeric: 'tabular-nums',
  },
  computed: {
    fontSize: '12px',
    fill: tokens.colorNeutralForeground2,
    fontVariantNumeric: 'tabular-nums',
  },
  dot: { fill: 'currentColor' },
  point: { fill: tokens.colorNeutralBackground1, stroke: 'currentColor' },
  junction: { fillOpacity: 0 },
  outline: { fill: 'none', stroke: tokens.colorNeutralForeground3 },
  measuredSign: { fill: tokens.colorBrandForeground1 },
  computedSign: { fill: 'none', stroke: tokens.colorNeutralForeground2 },
});

/** Wires, dots, rails, the line and everything written at nodes. */
export const SheetNode = memo(function SheetNode({ data }: NodeProps<SheetNodeData>) {
  const styles = useStyles();
  const { drawing, netlist, values } = data;
  const { extent } = drawing;
  return (
    <svg
      className={styles.svg}
      width={extent.width}
      height={extent.height}
      viewBox={`${extent.x} ${extent.y} ${extent.width} ${extent.height}`}
      aria-hidden
    >
      {drawing.assemblies.map(({ name, box }, index) => (
        <rect
          key={`${name} ${index}`}
          {...box}
          rx={6}
          strokeDasharray="6 5"
          strokeWidth={1.3}
          className={styles.outline}
        />
      ))}
      <g
        fill="none"
        stroke="currentColor"
        strokeWidth={1.8}
        strokeLinecap="round"
        strokeLinejoin="round"
      >
        {drawing.wires.map((wire, index) => (
          <polyline key={index} points={wire.spots.map(({ x, y }) => `${x},${y}`).join(' ')} />
        ))}
        {drawing.sources.map(({ x, y }, index) => (
          <g key={index} transform={`translate(${x} ${y})`}>
            <LineSymbol />
          </g>
        ))}
        {drawing.rails.map((rail, index) => (
          <g key={index} transform={`translate(${rail.spot.x} ${rail.spot.y})`}>
            <RailEnd rail={rail} isChassis={isChassis(netlist)} />
          </g>
        ))}
      </g>
      {drawing.rails.map((rail, index) => (
        <RailName key={index} rail={rail} netlist={netlist} />
      ))}
      {netlist.line &&
        drawing.sources.map(({ label }, index) => (
          <SourceLabel key={index} label={label} line={netlist.line!} />
        ))}
      {drawing.dots.map(({ spot }, index) => (
        <circle key={index} cx={spot.x} cy={spot.y} r={3.4} className={styles.dot} />
      ))}
      {drawing.nodes.map((node) => (
        <NodeLabel
          key={node.node}
          node={node}
          netlist={netlist}
          values={values[node.node]}
          isJunction={drawing.dots.some(
            ({ spot }) => spot.x === node.spot.x && spot.y === node.spot.y,
          )}
        />
      ))}
    </svg>
  );
});

function xOf({ box, anchor }: TextPlace): number {
  return anchor === 'start'
    ? box.x
    : anchor === 'middle'
      ? box.x + box.width / 2
      : box.x + box.width;
}

function NodeLabel({
  node,
  netlist,
  values,
  isJunction,
}: {
  node: DrawnNode;
  netlist: Netlist;
  values?: NodeValues;
  isJunction: boolean;
}) {
  const styles = useStyles();
  const label = labelForNode(netlist, node.node);
  const isPoint = netlist.points?.some((point) => point.node === node.node);
  const hasValues = !!values?.measured || !!values?.computed;
  const top = node.label.box.y + LINE_HEIGHT - 3;
  return (
    <g textAnchor={node.label.anchor}>
      {isPoint && (
        <circle
          cx={node.spot.x}
          cy={node.spot.y}
          r={isJunction ? 6 : 3.2}
          strokeWidth={isJunction ? 1.2 : 1.6}
          className={mergeClasses(styles.point, isJunction && styles.junction)}
        />
      )}
      {(isPoint || hasValues) && node.node !== netlist.line?.hot && (
        <text x={xOf(node.label)} y={top} className={styles.name}>
          {label}
        </text>
      )}
      {values?.measured && (
        <Value place={node.label} y={top + LINE_HEIGHT} text={values.measured} isMeasured />
      )}
      {values?.computed && (
        <Value
          place={node.label}
          y={top + (values.measured ? 2 : 1) * LINE_HEIGHT}
          text={values.computed}
        />
      )}
    </g>
  );
}

/** A value with its sign in front: a filled square when measured, a ring when computed. */
function Value({
  place,
  y,
  text,
  isMeasured = false,
}: {
  place: TextPlace;
  y: number;
  text: string;
  isMeasured?: boolean;
}) {
  const styles = useStyles();
  const width = text.length * 6.6;
  const x = xOf(place) + (place.anchor === 'middle' ? 5 : place.anchor === 'start' ? 11 : 0);
  const left = place.anchor === 'middle' ? x - width / 2 : place.anchor === 'start' ? x : x - width;
  return (
    <>
      {isMeasured ? (
        <rect x={left - 10} y={y - 8} width={6.5} height={6.5} className={styles.measuredSign} />
      ) : (
        <circle
          cx={left - 7}
          cy={y - 4.5}
          r={3}
          strokeWidth={1.3}
          className={styles.computedSign}
        />
      )}
      <text x={x} y={y} className={mergeClasses(isMeasured ? styles.measured : styles.computed)}>
        {text}
      </text>
    </>
  );
}

function RailName({ rail, netlist }: { rail: RailSymbol; netlist: Netlist }) {
  const styles = useStyles();
  if (!rail.isNamed) return null;
  const { x, y, width, height } = rail.box;
  const isBelow = rail.side === 'below';
  const spot = isBelow
    ? { x: x + width / 2, y: y + height - 3 }
    : { x: rail.side === 'left' ? x : x + width, y: y + height / 2 + 4 };
  const anchor = isBelow ? 'middle' : rail.side === 'left' ? 'start' : 'end';
  return (
    <text {...spot} textAnchor={anchor} className={styles.name}>
      {labelForNode({ ...netlist, line: undefined }, rail.node)}
    </text>
  );
}

function SourceLabel({ label, line }: { label: TextPlace; line: Line }) {
  const styles = useStyles();
  const [title, rating] = lineLabel(line);
  return (
    <g textAnchor={label.anchor}>
      <text x={xOf(label)} y={label.box.y + LINE_HEIGHT - 3} className={styles.name}>
        {title}
      </text>
      <text x={xOf(label)} y={label.box.y + 2 * LINE_HEIGHT - 3} className={styles.computed}>
        {rating}
      </text>
    </g>
  );
}
