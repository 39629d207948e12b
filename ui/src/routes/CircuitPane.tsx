import { useMemo } from 'react';
import { type ComparePoint } from '@engine/diagnosis-types';
import { revisionOfReadings } from '@/lib/bench/case-reading';
import { takenInWords } from '@/lib/bench/quantities';
import { useCompare } from '@/features/compare/api/get-compare';
import {
  SchematicView,
  type SchematicViewProps,
} from '@/features/schematic/components/SchematicView';
import { useCaseScreen } from './case-screen';

/** The circuit of the case that is open, as found, with what was measured at its nodes. */
export function CircuitPane({ height }: { height: number | string }) {
  const { caseId, repair, readings, result, part, selectPart } = useCaseScreen();
  const compare = useCompare(caseId, `${repair.version}:${revisionOfReadings(readings)}`);
  const points = compare.data?.points;
  const values = useMemo(
    () => nodeValues(points ?? [], repair.netlist.reference),
    [points, repair.netlist.reference],
  );
  return (
    <SchematicView
      netlist={repair.netlist}
      asFound={repair.asFound}
      values={values}
      suspects={result?.parts}
      selected={part}
      onSelectPart={selectPart}
      height={height}
    />
  );
}

const VOLTS = ['dc-volts', 'ac-volts'];

/**
 * Picks one voltage per node for the drawing: the measured one where there is one, else the first.
 *
 * @param points the comparison, in walking order.
 * @param reference node that the values are against; others cannot be written at a node.
 */
function nodeValues(
  points: readonly ComparePoint[],
  reference: string,
): NonNullable<SchematicViewProps['values']> {
  const values: NonNullable<SchematicViewProps['values']> = {};
  for (const { take, at, value, measured } of points) {
    if (!at || at[1] !== reference || !VOLTS.includes(take)) continue;
    const [node] = at;
    if (values[node]?.measured !== undefined) continue;
    if (values[node] && measured === undefined) continue;
    values[node] = {
      computed: value === null ? undefined : takenInWords(value, take),
      measured: measured === undefined ? undefined : takenInWords(measured, take),
    };
  }
  return values;
}
