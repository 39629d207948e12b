import { type Netlist } from '@engine/netlist/types';
import ELK from 'elkjs/lib/elk-api';
import workerUrl from 'elkjs/lib/elk-worker.min.js?url';
import { type Drawing } from './drawing';
import { drawingOfElk, elkGraphOf } from './elk-graph';

/**
 * Lays out a circuit of any form, in a worker. Import this module lazily: its worker is large.
 *
 * @param netlist checked circuit that is neither a string nor a supply.
 * @throws when the worker fails; the caller then says so.
 */
export async function layoutWithElk(netlist: Netlist): Promise<Drawing> {
  const elk = new ELK({ workerUrl });
  try {
    return drawingOfElk(netlist, await elk.layout(elkGraphOf(netlist)));
  } finally {
    elk.terminateWorker();
  }
}
