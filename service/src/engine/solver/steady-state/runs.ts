import type { Trace } from './trace';

/** Steps of one length under one pattern that follow each other. */
export interface Run {
  /** First and last sample. */
  from: number;
  to: number;
  /** Index in `network.met`. */
  which: number;
  /** Seconds of one step. */
  length: number;
}

/** Cuts a cycle into runs; no run crosses a switching. */
export function runsOf(trace: Trace): Run[] {
  const runs: Run[] = [];
  for (let from = 0; from + 1 < trace.count;) {
    const which = trace.which[from];
    const length = trace.length[from];
    let to = from + 1;
    while (to + 1 < trace.count && trace.which[to] === which && trace.length[to] === length)
      to += 1;
    runs.push({ from, to, which, length });
    from = to;
  }
  return runs;
}
