import { type AsFound, type Netlist } from '@engine/netlist/types';
import { makeStyles, Spinner, Text, tokens } from '@fluentui/react-components';
import { useMemo, useRef } from 'react';
import { ReactFlowProvider } from 'reactflow';
import 'reactflow/dist/base.css';
import { netlistAsFound } from '../geometry/as-found';
import { useDrawing } from '../hooks/useDrawing';
import { useRoom } from '../hooks/useRoom';
import { marksOf, type NodeValues } from './schematic-model';
import { Sheet } from './Sheet';
import { SheetLegend } from './SheetLegend';
import { SheetValues } from './SheetValues';

export interface SchematicViewProps {
  netlist: Netlist;
  /** How this set differs from its drawing; marked on the parts. */
  asFound?: AsFound[];
  /** By node name. */
  values?: Record<string, NodeValues>;
  /** Probability per part that it is bad; parts below 1 in 20 are not marked. */
  suspects?: { part: string; probability: number }[];
  selected?: string;
  onSelectPart?: (ref: string) => void;
  /** Height in px or any CSS length; fills its parent when left out. */
  height?: number | string;
}

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', minHeight: '240px', minWidth: 0 },
  canvas: {
    position: 'relative',
    flexGrow: 1,
    minHeight: 0,
    overflow: 'hidden',
    borderRadius: tokens.borderRadiusLarge,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
  },
  notice: {
    display: 'flex',
    height: '100%',
    alignItems: 'center',
    justifyContent: 'center',
    padding: tokens.spacingHorizontalXL,
    textAlign: 'center',
  },
});

const NO_VALUES = {};
const NO_SUSPECTS: { part: string; probability: number }[] = [];

/** Draws a circuit with values and suspects: read only, with pan, zoom and keys. */
export function SchematicView(props: SchematicViewProps) {
  const { values = NO_VALUES, suspects = NO_SUSPECTS, asFound, height = '100%' } = props;
  const styles = useStyles();
  const canvas = useRef<HTMLDivElement>(null);
  const room = useRoom(canvas);
  const { netlist, differences } = useMemo(
    () => netlistAsFound(props.netlist, asFound),
    [props.netlist, asFound],
  );
  const layout = useDrawing(netlist, room);
  const marks = useMemo(() => marksOf(suspects, differences), [suspects, differences]);

  return (
    <section className={styles.root} style={{ height }} aria-label={`Circuit: ${netlist.title}`}>
      <div className={styles.canvas} ref={canvas}>
        {netlist.parts.length === 0 ? (
          <Text className={styles.notice}>
            This circuit has no parts yet. Add the first one in the circuit editor.
          </Text>
        ) : layout.state === 'ready' ? (
          <ReactFlowProvider>
            <Sheet
              drawing={layout.drawing}
              netlist={netlist}
              marks={marks}
              values={values}
              selected={props.selected}
              onSelectPart={props.onSelectPart}
            >
              <SheetLegend values={values} marks={marks} />
            </Sheet>
          </ReactFlowProvider>
        ) : layout.state === 'failed' ? (
          <Text className={styles.notice} role="alert">
            This circuit could not be drawn by itself. Place its parts by hand in the circuit
            editor.
          </Text>
        ) : (
          <Spinner className={styles.notice} label="Drawing the circuit" />
        )}
      </div>
      <SheetValues netlist={netlist} values={values} />
    </section>
  );
}
