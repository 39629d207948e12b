import type { Trace } from './trace';
import { cubicAt, cubicTurn, type Span } from './cubic';
import { dot } from './dense';
import type { BranchElement } from './elements';
import { type Gram, type Moments, momentsOf } from './gram';
import type { Network } from './network';

/** A voltage or current over one cycle. */
export interface Waveform {
  /** Seconds from the upward zero crossing of a phase-0 source. */
  seconds: Float64Array;
  values: Float64Array;
}

/** Highest and lowest value of a waveform, and between which samples they lie. */
export interface Extremes {
  high: number;
  low: number;
  highAt: { sample: number; part: number };
  lowAt: { sample: number; part: number };
}

/** What a start for the next solve needs. */
export interface WarmStart {
  elements: readonly BranchElement[];
  /** States by element index; 0 for elements without one. */
  state: Float64Array;
  /** Node volts at the start of the cycle. */
  nodeVolts: Float64Array;
  /** Conductance of slow parts by element index. */
  siemens: Float64Array;
}

/**
 * One solved cycle. Voltages are against node 0, currents from `a` through the element to `b` (a
 * source that delivers has a negative product of the two). Quantities are worked out when asked for.
 */
export class SteadyState {
  constructor(
    /** The block's equations at the solution; for sensitivities. */
    readonly network: Network,
    /** Samples of the cycle. */
    readonly trace: Trace,
    /** True when cycle and slow parts repeat within the tolerance. */
    readonly converged: boolean,
    /** Cycles that were run. */
    readonly cycles: number,
    private readonly gram: Gram,
  ) {}

  /** Average volts of every node. */
  get mean(): Float64Array {
    return this.nodes((node) => this.pair(node, 0).mean);
  }
  /** RMS volts of every node, direct part included. */
  get rms(): Float64Array {
    return this.nodes((node) => this.pair(node, 0).rms);
  }
  /** RMS of the alternating part of every node: an AC meter with a blocking capacitor. */
  get acRms(): Float64Array {
    return this.nodes((node) => this.pair(node, 0).acRms);
  }
  /** Peak-to-peak volts of every node. */
  get peakToPeak(): Float64Array {
    return this.nodes((node) => this.pairPeakToPeak(node, 0));
  }
  /** Average amps of every element. */
  get branchMean(): Float64Array {
    return Float64Array.from(this.network.block.elements, (_, k) => this.current(k).mean);
  }
  /** RMS amps of every element. */
  get branchRms(): Float64Array {
    return Float64Array.from(this.network.block.elements, (_, k) => this.current(k).rms);
  }

  /** Mean, RMS and alternating RMS of the voltage from node a to node b. */
  pair(a: number, b: number): Moments {
    return momentsOf(this.network, this.gram, this.pairRows(a, b));
  }

  /** Mean, RMS and alternating RMS of an element's current. */
  current(k: number): Moments {
    return momentsOf(this.network, this.gram, this.currentRows(k));
  }

  /** Average watts turned into heat (or delivered, when negative) in an element. */
  power(k: number): number {
    const { a, b } = this.network.block.elements[k];
    const volts = this.pair(a, b);
    const amps = this.current(k);
    const { width } = this.network.block;
    const sum = this.pairRows(a, b);
    const rows = this.currentRows(k);
    // v·i from the polarisation identity; both scaled to one size, or the smaller one drowns.
    const scale = amps.rms > 0 ? volts.rms / amps.rms : 0;
    if (!(scale > 0)) return 0;
    const difference = sum.slice();
    for (let i = 0; i < rows.length && width > 0; i += 1) {
      sum[i] += scale * rows[i];
      difference[i] -= scale * rows[i];
    }
    const plus = momentsOf(this.network, this.gram, sum).rms;
    const minus = momentsOf(this.network, this.gram, difference).rms;
    return (plus * plus - minus * minus) / (4 * scale);
  }

  /** Peak-to-peak voltage from node a to node b. */
  pairPeakToPeak(a: number, b: number): number {
    const { high, low } = this.extremes(a, b);
    return high - low;
  }

  /** Highest and lowest voltage from node a to node b, refined between samples by a cubic. */
  extremes(a: number, b: number): Extremes {
    const { network, trace } = this;
    const { width } = network.block;
    const rows = this.pairRows(a, b);
    const rates = network.met.map((conduction, m) =>
      conduction.rateRow(rows.subarray(m * width, (m + 1) * width)),
    );
    const found: Extremes = {
      high: -Infinity,
      low: Infinity,
      highAt: { sample: 0, part: 0 },
      lowAt: { sample: 0, part: 0 },
    };
    const see = (value: number, sample: number, part: number): void => {
      if (value > found.high) {
        found.high = value;
        found.highAt = { sample, part };
      }
      if (value < found.low) {
        found.low = value;
        found.lowAt = { sample, part };
      }
    };
    for (let k = 0; k + 1 < trace.count; k += 1) {
      const m = trace.which[k];
      const span: Span = {
        length: trace.length[k],
        from: dot(rows, m * width, trace.xi, k * width, width),
        fromSlope: dot(rates[m], 0, trace.xi, k * width, width),
        to: dot(rows, m * width, trace.xi, (k + 1) * width, width),
        toSlope: dot(rates[m], 0, trace.xi, (k + 1) * width, width),
      };
      see(span.from, k, 0);
      see(span.to, k, 1);
      if (span.fromSlope * span.toSlope >= 0) continue;
      const turn = cubicTurn(span);
      see(cubicAt(span, turn), k, turn);
    }
    return found;
  }

  /** Voltage from node a to node b over the cycle. */
  waveform(a: number, b: number): Waveform {
    return this.sampled(this.pairRows(a, b));
  }

  /** Current of an element over the cycle. */
  currentWaveform(k: number): Waveform {
    return this.sampled(this.currentRows(k));
  }

  /** Rows over ξ of the voltage from a to b, one per pattern. */
  pairRows(a: number, b: number): Float64Array {
    return this.rows((m, row) => this.network.met[m].pairRow(a, b, row));
  }

  /** Rows over ξ of an element's current, one per pattern. */
  currentRows(k: number): Float64Array {
    return this.rows((m, row) => this.network.met[m].currentRow(k, row));
  }

  /** What the next solve can start from. */
  get warmStart(): WarmStart {
    const { network, trace } = this;
    const { block } = network;
    const state = new Float64Array(block.elements.length);
    block.stateElement.forEach((k, s) => {
      state[k] = trace.xi[s];
    });
    const row = new Float64Array(block.width);
    const nodeVolts = this.nodes((node) =>
      dot(network.met[trace.which[0]].pairRow(node, 0, row), 0, trace.xi, 0, block.width),
    );
    return { elements: block.elements, state, nodeVolts, siemens: network.laws.siemens.slice() };
  }

  private nodes(of: (node: number) => number): Float64Array {
    return Float64Array.from({ length: this.network.block.nodes }, (_, node) =>
      node === 0 ? 0 : of(node),
    );
  }

  private rows(fill: (m: number, row: Float64Array) => void): Float64Array {
    const { width } = this.network.block;
    const rows = new Float64Array(this.network.met.length * width);
    for (let m = 0; m < this.network.met.length; m += 1) {
      fill(m, rows.subarray(m * width, (m + 1) * width));
    }
    return rows;
  }

  private sampled(rows: Float64Array): Waveform {
    const { trace, network } = this;
    const { width } = network.block;
    const seconds = trace.time.slice(0, trace.count);
    const values = new Float64Array(trace.count);
    for (let k = 0; k < trace.count; k += 1) {
      values[k] = dot(rows, trace.which[k] * width, trace.xi, k * width, width);
    }
    return { seconds, values };
  }
}
