import type { Part } from '../netlist/types';
import type { Branch } from './circuit';

/** Kinds that make their block a matter of waveforms: reactance, rectification, sources of their own. */
const WAVEFORM_KINDS = new Set(['capacitor', 'rectifier', 'choke', 'winding', 'load']);

/** Follows a union-find forest to its root, halving the path on the way. */
function rootOf(parent: Int32Array, node: number): number {
  let at = node;
  while (parent[at] !== at) {
    parent[at] = parent[parent[at]];
    at = parent[at];
  }
  return at;
}

/**
 * Splits a circuit at the terminals of an ideal line source into blocks that cannot influence each
 * other, and says for each branch whether its block can be solved with RMS values alone.
 *
 * @param hot node of the ideal source; with a source resistance it lies behind that, and what hangs
 *   on the line is one block.
 * @returns 1 for a branch of resistances and hot parts only, 0 for one whose block holds a
 *   rectifier, a reactance, a winding or a load.
 */
export function splitBlocks(
  parts: readonly Part[],
  branches: readonly Branch[],
  nodes: number,
  hot: number,
  back: number,
): Uint8Array {
  const isTerminal = (node: number) => node === hot || node === back;
  const parent = Int32Array.from({ length: nodes }, (_, i) => i);
  for (const branch of branches) {
    if (branch.isLeak || isTerminal(branch.a) || isTerminal(branch.b)) continue;
    parent[rootOf(parent, branch.a)] = rootOf(parent, branch.b);
  }
  const blockOf = (branch: Branch): number =>
    isTerminal(branch.a)
      ? isTerminal(branch.b)
        ? -1
        : rootOf(parent, branch.b)
      : rootOf(parent, branch.a);
  const hasWaveform = new Set<number>();
  for (const branch of branches) {
    if (branch.isLeak || !WAVEFORM_KINDS.has(parts[branch.part].kind)) continue;
    hasWaveform.add(blockOf(branch));
  }
  return Uint8Array.from(branches, (branch) => {
    const block = blockOf(branch);
    if (block === -1) return WAVEFORM_KINDS.has(parts[branch.part].kind) ? 0 : 1;
    return hasWaveform.has(block) ? 0 : 1;
  });
}
