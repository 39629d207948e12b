import { type Netlist } from '@engine/netlist/types';
import { useEffect, useMemo, useState } from 'react';
import { bestDrawing } from '../geometry/best-drawing';
import { type Drawing } from '../geometry/drawing';

/** Room on the screen in px. */
export interface Room {
  width: number;
  height: number;
}

export type DrawingState =
  { state: 'ready'; drawing: Drawing } | { state: 'waiting' } | { state: 'failed' };

/**
 * Lays a circuit out for the room there is; circuits of no usual form are laid out in a worker.
 *
 * @param netlist checked circuit; keep the object while the circuit is the same.
 * @param room px; null until it is measured.
 */
export function useDrawing(netlist: Netlist, room: Room | null): DrawingState {
  const own = useMemo(() => (room ? bestDrawing(netlist, room) : undefined), [netlist, room]);
  const [general, setGeneral] = useState<{ netlist: Netlist; drawing: Drawing | null }>();
  const needsGeneral = own === null;

  useEffect(() => {
    if (!needsGeneral) return;
    let isCurrent = true;
    import('../geometry/elk-layout')
      .then(({ layoutWithElk }) => layoutWithElk(netlist))
      .then(
        (drawing) => isCurrent && setGeneral({ netlist, drawing }),
        () => isCurrent && setGeneral({ netlist, drawing: null }),
      );
    return () => {
      isCurrent = false;
    };
  }, [needsGeneral, netlist]);

  if (own) return { state: 'ready', drawing: own };
  if (own === undefined || general?.netlist !== netlist) return { state: 'waiting' };
  return general.drawing ? { state: 'ready', drawing: general.drawing } : { state: 'failed' };
}
