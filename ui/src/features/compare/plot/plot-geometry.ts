import { scaleLinear, scaleSymlog } from 'd3-scale';
import { area, line } from 'd3-shape';
import { type ComparePoint } from '@engine/diagnosis-types';
import { type Netlist } from '@engine/netlist/types';
import { isAlong, type Verdict, verdictOf } from './compare-model';

/** Height of one row of the plot, px; also a target that a thumb meets. */
export const ROW_HEIGHT = 44;
const TOP = 28;
const BOTTOM = 12;
const RIGHT = 20;

/** One row: everything as x in px, null where there is nothing to show. */
export interface PlotRow {
  point: ComparePoint;
  y: number;
  low: number | null;
  high: number | null;
  computed: number | null;
  published: number | null;
  measured: number | null;
  /** True when the meter was over range: the mark stands at the right edge. */
  isOver: boolean;
  verdict: Verdict | null;
}

export interface Plot {
  width: number;
  height: number;
  left: number;
  rows: PlotRow[];
  ticks: { x: number; value: number }[];
  /** Closed outline of the band and the line of computed values, one per unbroken run of rows. */
  bands: string[];
  lines: string[];
  isCompressed: boolean;
}

/**
 * Lays out the plot down the string: one row per point, the value to the right.
 *
 * Values that spread over more than two decades are drawn on a compressed scale, linear near zero.
 *
 * @param points of one kind of reading, in order.
 * @param netlist says what the string's readings are against.
 * @param width px, at least 200.
 * @param left px kept for labels.
 */
export function plotOf(
  points: readonly ComparePoint[],
  netlist: Pick<Netlist, 'reference'>,
  width: number,
  left: number,
): Plot {
  const height = TOP + points.length * ROW_HEIGHT + BOTTOM;
  const values = points.flatMap(({ value, low, high, published, measured }) =>
    [value, low, high, published, measured].filter((one) => typeof one === 'number'),
  );
  const most = Math.max(0, ...values) || 1;
  const least = Math.min(0, ...values);
  const typical = middleOf(points.flatMap(({ value }) => (value ? [Math.abs(value)] : []))) || most;
  const isCompressed = most > 100 * typical;
  const range: [number, number] = [left, width - RIGHT - 14];
  const scale = isCompressed
    ? scaleSymlog()
        .constant(typical / 5)
        .domain([least, most])
        .range(range)
    : scaleLinear().domain([least, most]).nice(5).range(range);
  const at = (value: number | null | undefined) =>
    typeof value === 'number' ? scale(value) : null;

  const rows = points.map((point, index): PlotRow => {
    const isOver = point.measured === 'OL';
    return {
      point,
      y: TOP + (index + 0.5) * ROW_HEIGHT,
      low: at(point.low),
      high: at(point.high),
      computed: at(point.value),
      published: at(point.published),
      measured: isOver ? width - RIGHT : at(point.measured as number | undefined),
      isOver,
      verdict: verdictOf(point),
    };
  });
  const runs = runsOf(rows, netlist);
  const band = area<PlotRow>()
    .x0((row) => row.low ?? row.computed!)
    .x1((row) => row.high ?? row.computed!)
    .y((row) => row.y);
  const centre = line<PlotRow>()
    .x((row) => row.computed!)
    .y((row) => row.y);
  return {
    width,
    height,
    left,
    rows,
    ticks: ticksOf(scale, width).map((value) => ({ value, x: scale(value) })),
    bands: runs.map((run) => band(widened(run)) ?? ''),
    lines: runs.map((run) => centre(widened(run)) ?? ''),
    isCompressed,
  };
}

function ticksOf(scale: { ticks: (count: number) => number[] }, width: number): number[] {
  const count = width < 480 ? 3 : 6;
  const ticks = scale.ticks(count);
  const step = Math.ceil(ticks.length / (count + 2));
  return ticks.filter((_, index) => index % step === 0);
}

/** Rows along the string that have a computed value; others stand alone: no wire runs through them. */
function runsOf(rows: readonly PlotRow[], netlist: Pick<Netlist, 'reference'>): PlotRow[][] {
  const runs: PlotRow[][] = [];
  let run: PlotRow[] = [];
  for (const row of rows) {
    const isJoined = isAlong(row.point, netlist);
    if (row.computed === null || !isJoined) {
      if (run.length > 0) runs.push(run);
      run = [];
      if (row.computed !== null) runs.push([row]);
    } else {
      run.push(row);
    }
  }
  if (run.length > 0) runs.push(run);
  return runs;
}

/** A run drawn from the upper edge of its first row to the lower edge of its last. */
function widened(run: readonly PlotRow[]): PlotRow[] {
  const [first, last] = [run[0], run[run.length - 1]];
  const reach = ROW_HEIGHT * 0.36;
  return [{ ...first, y: first.y - reach }, ...run, { ...last, y: last.y + reach }];
}

function middleOf(values: number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? 0;
}
