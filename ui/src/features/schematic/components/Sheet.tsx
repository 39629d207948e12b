import { type Netlist } from '@engine/netlist/types';
import { makeStyles, tokens } from '@fluentui/react-components';
import { type ReactNode, useCallback, useEffect, useMemo, useRef } from 'react';
import ReactFlow, { type Node, type NodeTypes, useReactFlow } from 'reactflow';
import { firstView, type View, wholeView } from '../geometry/best-drawing';
import { type Box, type Drawing } from '../geometry/drawing';
import { boxOfPart, PartNode, type PartNodeData } from './PartNode';
import { type NodeValues, type PartMarks } from './schematic-model';
import { SheetNode, type SheetNodeData } from './SheetNode';
import { ZoomControls } from './ZoomControls';

interface SheetProps {
  drawing: Drawing;
  netlist: Netlist;
  marks: ReadonlyMap<string, PartMarks>;
  values: Record<string, NodeValues>;
  selected?: string;
  onSelectPart?: (ref: string) => void;
  /** Stands in the foot of the sheet, beside the zoom. */
  children?: ReactNode;
}

const NODE_TYPES: NodeTypes = { sheet: SheetNode, part: PartNode };
const PRO_OPTIONS = { hideAttribution: true };

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', height: '100%', minHeight: 0 },
  flow: { flexGrow: 1, minHeight: 0, minWidth: 0 },
  foot: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: tokens.spacingHorizontalM,
    padding: `0 ${tokens.spacingHorizontalS}`,
    borderTop: `1px solid ${tokens.colorNeutralStroke3}`,
    backgroundColor: tokens.colorNeutralBackground2,
  },
});

/** The canvas: one node for the sheet, one for each part, nothing to drag or connect. */
export function Sheet(props: SheetProps) {
  const { drawing, netlist, marks, values, selected, onSelectPart } = props;
  const styles = useStyles();
  const flow = useReactFlow();
  const frame = useRef<HTMLDivElement>(null);

  const show = useCallback(
    (view: (extent: Box, room: { width: number; height: number }) => View) => {
      const size = frame.current?.getBoundingClientRect();
      if (size && size.width > 0) flow.setViewport(view(drawing.extent, size));
    },
    [drawing, flow],
  );
  useEffect(() => {
    const id = requestAnimationFrame(() => show(firstView));
    return () => cancelAnimationFrame(id);
  }, [show]);

  // A part reached with the keyboard comes into view.
  const reveal = useCallback(
    (box: Box) => {
      const { x, y, zoom } = flow.getViewport();
      const size = frame.current?.getBoundingClientRect();
      if (!size) return;
      const left = box.x * zoom + x;
      const top = box.y * zoom + y;
      const isInside =
        left >= 0 &&
        top >= 0 &&
        left + box.width * zoom <= size.width &&
        top + box.height * zoom <= size.height;
      if (!isInside) flow.setCenter(box.x + box.width / 2, box.y + box.height / 2, { zoom });
    },
    [flow],
  );

  // So does one that was chosen elsewhere, in the list of suspects say.
  useEffect(() => {
    const chosen = drawing.parts.find(({ part }) => part.ref === selected);
    if (chosen) reveal(boxOfPart(chosen));
  }, [drawing, selected, reveal]);

  const nodes = useMemo<Node<PartNodeData | SheetNodeData>[]>(
    () => [
      {
        id: 'sheet',
        type: 'sheet',
        position: drawing.extent,
        data: { drawing, netlist, values },
        zIndex: 0,
        selectable: false,
      },
      ...drawing.parts.map((drawn) => ({
        id: `part ${drawn.part.ref}`,
        type: 'part',
        position: boxOfPart(drawn),
        zIndex: 1,
        data: {
          drawn,
          marks: marks.get(drawn.part.ref),
          reference: netlist.reference,
          isSelected: drawn.part.ref === selected,
          onSelect: onSelectPart,
          onFocus: reveal,
        },
      })),
    ],
    [drawing, netlist, values, marks, selected, onSelectPart, reveal],
  );

  return (
    <div className={styles.root}>
      <div className={styles.flow} ref={frame}>
        <ReactFlow
          nodes={nodes}
          edges={[]}
          nodeTypes={NODE_TYPES}
          nodesDraggable={false}
          nodesConnectable={false}
          nodesFocusable={false}
          elementsSelectable={false}
          disableKeyboardA11y
          zoomOnDoubleClick={false}
          zoomOnScroll={false}
          preventScrolling={false}
          minZoom={0.15}
          maxZoom={3}
          proOptions={PRO_OPTIONS}
        />
      </div>
      <div className={styles.foot}>
        <div>{props.children}</div>
        <ZoomControls
          onZoomIn={() => flow.zoomIn()}
          onZoomOut={() => flow.zoomOut()}
          onFit={() => show(wholeView)}
        />
      </div>
    </div>
  );
}
