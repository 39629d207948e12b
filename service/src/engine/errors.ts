import type { NetlistProblem } from './netlist/types';

/** Anything the engine refuses: a fixed code for programs, sentences for people. */
export class EngineError extends Error {
  constructor(
    /** Fixed code, such as `netlist-refused`. */
    readonly code: string,
    message: string,
    /** What is wrong, each naming its part, node or field. */
    readonly problems: NetlistProblem[] = [],
  ) {
    super(message);
    this.name = new.target.name;
  }
}

function firstOf(problems: readonly NetlistProblem[], otherwise: string): string {
  return problems.length > 0 ? problems.map(({ message }) => message).join(' ') : otherwise;
}

/** A netlist, or a change to one, that cannot be used. */
export class NetlistError extends EngineError {
  constructor(problems: NetlistProblem[]) {
    super('netlist-refused', firstOf(problems, 'The circuit cannot be used.'), problems);
  }
}

/** A reading that does not fit the circuit. */
export class ReadingError extends EngineError {
  constructor(problems: NetlistProblem[]) {
    super('reading-refused', firstOf(problems, 'A reading cannot be used.'), problems);
  }
}

/** A rule that cannot be used. */
export class RuleError extends EngineError {
  constructor(problems: NetlistProblem[]) {
    super('rule-refused', firstOf(problems, 'The rule cannot be used.'), problems);
  }
}

/** A bad row of a CSV file; lines count from 1 with the header. */
export interface CsvProblem extends NetlistProblem {
  line: number;
  column: string;
}

/** A CSV file with a bad row; nothing of it is taken. */
export class CsvError extends EngineError {
  constructor(readonly rows: CsvProblem[]) {
    super('csv-refused', firstOf(rows, 'The file cannot be read.'), rows);
  }
}
