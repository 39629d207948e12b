import type { CsvProblem } from '../errors';
import { parseQuantity, parseRating, type Unit } from '../units';
import { FIELDS, fieldProblem, swappedField } from './fields';
import { nodeProblem, refProblem } from './names';
import { type Part, PART_KINDS, type PartKind } from './types';

export type Row = Record<string, string>;

/** Field and unit that `value` fills, and field and unit of `rating`, by kind. */
export const MEANING: Record<PartKind, { value?: [string, Unit]; rating?: [string, Unit] }> = {
  resistor: { value: ['ohms', 'Ω'], rating: ['watts', 'W'] },
  heater: {},
  lamp: {},
  thermistor: { value: ['hotOhms', 'Ω'] },
  switch: { value: ['ohms', 'Ω'] },
  fuse: { value: ['ohms', 'Ω'] },
  joint: { value: ['ohms', 'Ω'] },
  capacitor: { value: ['farads', 'F'], rating: ['volts', 'V'] },
  rectifier: { value: ['ohms', 'Ω'] },
  choke: { value: ['henries', 'H'], rating: ['ohms', 'Ω'] },
  winding: { rating: ['ohms', 'Ω'] },
  load: {},
};
export const RATED: readonly PartKind[] = ['heater', 'lamp', 'load', 'winding'];

/**
 * Makes one part out of one row; problems go into the list.
 *
 * @param line where the row begins, counted from 1 with the header.
 */
export function partOf(row: Row, line: number, problems: CsvProblem[]): Part | null {
  const bad = (column: string, message: string, code = 'bad-value') => {
    // The first thing wrong with a cell is enough.
    if (problems.some((known) => known.line === line && known.column === column)) return;
    problems.push({ code, line, column, message: `Line ${line}, column ${column}: ${message}` });
  };
  const kind = row.kind as PartKind;
  if (!PART_KINDS.includes(kind)) {
    bad(
      'kind',
      `“${row.kind}” is no kind of part. Kinds are ${PART_KINDS.join(', ')}.`,
      'unknown-kind',
    );
    return null;
  }
  const wrongRef = refProblem(row.ref);
  if (wrongRef) bad('ref', wrongRef.message, wrongRef.code);
  for (const column of ['from', 'to']) {
    const wrongNode = nodeProblem(row[column], `“${column}”`);
    if (wrongNode) bad(column, wrongNode.message, wrongNode.code);
  }
  const part: Record<string, unknown> = { ref: row.ref, kind, between: [row.from, row.to] };
  const put = (column: string, [field, unit]: [string, Unit]) => {
    if (row[column] === '') return;
    const parsed = parseQuantity(row[column], unit);
    if (!parsed.ok) bad(column, parsed.message);
    else if (parsed.value === 'OL') bad(column, 'A part cannot have the value OL.');
    else part[field] = parsed.value;
  };
  if (RATED.includes(kind)) {
    const rating = parseRating(row.value);
    if (rating) Object.assign(part, rating);
    else if (kind === 'winding' && row.value !== '') put('value', ['volts', 'V']);
    else bad('value', `A ${kind} needs its volts and amps, such as 12.6V 150mA.`);
    if (kind === 'winding') delete part.amps;
  } else if (kind === 'thermistor') thermistorOf(row, part, bad);
  else if (MEANING[kind].value) put('value', MEANING[kind].value);
  if (MEANING[kind].rating) put('rating', MEANING[kind].rating);
  if (row.tolerance !== '') {
    const percent = /^(?:±|\+\/-)?\s*([\d.]+)\s*%$/.exec(row.tolerance);
    part.tolerance = percent ? Number(percent[1]) / 100 : Number(row.tolerance);
  }
  for (const column of ['make', 'assembly', 'note'] as const) {
    if (row[column] !== '') part[column] = row[column];
  }
  checkFields(part, kind, bad);
  return part as unknown as Part;
}

/** A thermistor's value is written `18Ω 160Ω 450mA`: hot ohms, cold ohms, amps. */
function thermistorOf(
  row: Row,
  part: Record<string, unknown>,
  bad: (column: string, message: string) => void,
): void {
  const words = row.value.split(/\s+/);
  const units: [string, Unit][] = [
    ['hotOhms', 'Ω'],
    ['coldOhms', 'Ω'],
    ['amps', 'A'],
  ];
  if (words.length !== 3) {
    bad('value', 'A thermistor needs hot ohms, cold ohms and amps, such as 18 160 450mA.');
    return;
  }
  units.forEach(([field, unit], i) => {
    const parsed = parseQuantity(words[i], unit);
    if (parsed.ok && typeof parsed.value === 'number') part[field] = parsed.value;
    else bad('value', parsed.ok ? 'A part cannot have the value OL.' : parsed.message);
  });
}

/** Checks the fields of a part by the same rules as a JSON document. */
function checkFields(
  part: Record<string, unknown>,
  kind: PartKind,
  bad: (column: string, message: string, code?: string) => void,
): void {
  const columnOf = (field: string) =>
    ['tolerance', 'make', 'assembly', 'note'].includes(field)
      ? field
      : MEANING[kind].rating?.[0] === field
        ? 'rating'
        : 'value';
  for (const [field, rule] of Object.entries(FIELDS[kind])) {
    if (part[field] === undefined) {
      if (rule.isRequired) bad(columnOf(field), `A ${kind} needs “${field}”.`, 'missing-field');
      continue;
    }
    const wrong = fieldProblem(field, rule, part[field]);
    if (wrong) bad(columnOf(field), wrong);
  }
  const odd = swappedField(kind, part);
  if (odd) bad('value', odd.message);
  for (const field of Object.keys(part)) {
    if (['ref', 'kind', 'between'].includes(field) || FIELDS[kind][field]) continue;
    bad(columnOf(field), `A ${kind} has no “${field}”.`, 'unknown-field');
  }
}
