import type { Reading } from '../netlist/types';
import type { Circuit } from './circuit';
import { settleMeter, type SettledMeter } from './meter';

/** A reading with its leads as integers, ready to be predicted. */
export interface ReadingSpec {
  take: Reading['take'];
  /** Node of the red and of the black lead. */
  a: number;
  b: number;
  /** Index of the part it is taken on, −1 for a reading between nodes. */
  part: number;
  /** True when the likelihood works on ln(ohms + offset). */
  isLog: boolean;
  meter: SettledMeter;
}

/** Settles where a reading is taken. The reading must have passed `checkReading`. */
export function specOf(circuit: Circuit, reading: Reading): ReadingSpec {
  const part = reading.part === undefined ? -1 : circuit.partIndex.get(reading.part)!;
  const branch = part >= 0 ? circuit.branches[part] : undefined;
  const isLog = reading.take === 'ohms' || reading.take === 'lifted-ohms';
  return {
    take: reading.take,
    a: branch ? branch.a : circuit.nodeIndex.get(reading.at![0])!,
    b: branch ? branch.b : circuit.nodeIndex.get(reading.at![1])!,
    part,
    isLog,
    meter: settleMeter(reading),
  };
}
