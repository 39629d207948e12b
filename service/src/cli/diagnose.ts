import { createInterface } from 'node:readline';
import {
  type Conditions,
  diagnose,
  type DiagnosisResult,
  EngineError,
  readNetlist,
  type Reading,
} from '../engine';
import { shippedKnowledge } from './knowledge';

/** One line of the input; other fields are ignored. */
interface CaseLine {
  id?: unknown;
  netlist?: unknown;
  conditions?: Conditions;
  readings?: Reading[];
}

/** The part of a result that the command prints. */
export function lineOf(id: unknown, ms: number, result: DiagnosisResult): Record<string, unknown> {
  return {
    id,
    ms,
    suspects: result.suspects.map(({ faults, probability, group }) => ({
      faults,
      probability,
      group,
    })),
    parts: result.parts,
    nextReadings: result.nextReadings.map(({ take, at, part, bits, minutes }) => ({
      take,
      at,
      part,
      bits,
      minutes,
    })),
    expected: result.expected.map(({ take, at, part, value, low, high }) => ({
      take,
      at,
      part,
      value,
      low,
      high,
    })),
    settled: result.settled,
  };
}

/** A refusal as one sentence. */
export function refusalOf(error: unknown): string {
  if (error instanceof EngineError) {
    return error.problems.map(({ message }) => message).join(' ') || error.message;
  }
  if (error instanceof SyntaxError) return 'The line is not valid JSON.';
  return 'The case could not be diagnosed.';
}

async function answer(line: string, knowledge: ReturnType<typeof shippedKnowledge>) {
  let id: unknown = null;
  try {
    const input = JSON.parse(line) as CaseLine;
    id = input?.id ?? null;
    const netlist = readNetlist(input.netlist);
    const readings = Array.isArray(input.readings) ? input.readings : [];
    const start = performance.now();
    const result = await diagnose({
      netlist,
      conditions: input.conditions,
      readings,
      knowledge,
    });
    return lineOf(id, Math.round(performance.now() - start), result);
  } catch (error) {
    return { id, error: refusalOf(error) };
  }
}

/** Reads JSON Lines on standard input, one case a line, and writes one JSON line each, in order. */
async function main(): Promise<void> {
  const knowledge = shippedKnowledge();
  for await (const line of createInterface({ input: process.stdin })) {
    if (line.trim() === '') continue;
    process.stdout.write(`${JSON.stringify(await answer(line, knowledge))}\n`);
  }
}

if (require.main === module) void main();
