import { NetlistError, ReadingError } from '../errors';
import { checkNetlist } from './checks';
import { checkReading } from './readings';
import type { Netlist, NetlistProblem, Reading } from './types';

/**
 * Refuses what cannot be diagnosed, before anything is computed.
 *
 * @throws NetlistError naming parts and nodes, or ReadingError naming the reading by its place in
 *   the list (`/readings/3/value`).
 */
export function requireSound(netlist: Netlist, readings: readonly Reading[]): void {
  const problems = checkNetlist(netlist);
  if (problems.length > 0) throw new NetlistError(problems);
  const bad: NetlistProblem[] = readings.flatMap((reading, index) =>
    checkReading(netlist, reading).map((problem) => ({
      ...problem,
      path: `/readings/${index}${problem.path ?? ''}`,
    })),
  );
  if (bad.length > 0) throw new ReadingError(bad);
}
