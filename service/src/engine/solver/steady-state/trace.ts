/** One cycle as it was run: samples of ξ and the pattern that held between them. */
export interface Trace {
  /** Number of samples. */
  count: number;
  time: Float64Array;
  /** Seconds from each sample to the next. */
  length: Float64Array;
  /** ξ of each sample, width numbers each. */
  xi: Float64Array;
  /** Index in `network.met` of the pattern from each sample to the next. */
  which: Int32Array;
}

/** An empty trace with room for some samples; it grows. */
export function newTrace(width: number, room: number): Trace {
  return {
    count: 0,
    time: new Float64Array(room),
    length: new Float64Array(room),
    xi: new Float64Array(room * width),
    which: new Int32Array(room),
  };
}

/** Adds a sample; what holds from it to the next is set by the caller. */
export function record(trace: Trace, width: number, time: number, xi: Float64Array): void {
  if (trace.count === trace.time.length) {
    trace.time = grown(trace.time);
    trace.length = grown(trace.length);
    trace.xi = grown(trace.xi);
    const which = new Int32Array(trace.which.length * 2);
    which.set(trace.which);
    trace.which = which;
  }
  trace.time[trace.count] = time;
  trace.xi.set(xi, trace.count * width);
  trace.count += 1;
}

function grown(array: Float64Array): Float64Array<ArrayBuffer> {
  const larger = new Float64Array(array.length * 2);
  larger.set(array);
  return larger;
}
