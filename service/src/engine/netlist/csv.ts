import { parse } from 'csv-parse/sync';
import { CsvError, type CsvProblem } from '../errors';
import { parseQuantity, parseRating, type Unit } from '../units';
import { FIELDS, fieldProblem } from './fields';
import { type Netlist, type Part, PART_KINDS, type PartKind } from './types';

/** Columns of the file, in order. */
export const CSV_HEADER = [
  'ref',
  'kind',
  'from',
  'to',
  'value',
  'tolerance',
  'rating',
  'make',
  'assembly',
  'note',
];

type Row = Record<string, string>;

/** Field and unit that `value` fills, and field and unit of `rating`, by kind. */
const MEANING: Record<PartKind, { value?: [string, Unit]; rating?: [string, Unit] }> = {
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
const RATED: readonly PartKind[] = ['heater', 'lamp', 'load', 'winding'];

/** One part out of one row; problems go into the list. */
function partOf(row: Row, line: number, problems: CsvProblem[]): Part | null {
  const bad = (column: string, message: string, code = 'bad-value') => {
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
  if (!/^[A-Za-z0-9_-]{1,24}$/.test(row.ref)) {
    bad('ref', 'A part needs a reference of 1 to 24 letters, digits, “-” or “_”.', 'bad-ref');
  }
  for (const column of ['from', 'to']) {
    if (!/^\S{1,40}$/.test(row[column]))
      bad(column, 'A node needs a name of 1 to 40 characters without spaces.', 'bad-node');
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
  checkFields(part, kind, problems, bad);
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
  problems: readonly CsvProblem[],
  bad: (column: string, message: string, code?: string) => void,
): void {
  const before = problems.length;
  const columnOf = (field: string) =>
    ['tolerance', 'make', 'assembly', 'note'].includes(field)
      ? field
      : MEANING[kind].rating?.[0] === field
        ? 'rating'
        : 'value';
  for (const [field, rule] of Object.entries(FIELDS[kind])) {
    if (part[field] === undefined) {
      if (rule.isRequired && before === problems.length && !(kind === 'thermistor')) {
        bad(columnOf(field), `A ${kind} needs “${field}”.`, 'missing-field');
      }
      continue;
    }
    const wrong = fieldProblem(field, rule, part[field]);
    if (wrong) bad(columnOf(field), wrong);
  }
  for (const field of Object.keys(part)) {
    if (['ref', 'kind', 'between'].includes(field) || FIELDS[kind][field]) continue;
    bad(columnOf(field), `A ${kind} has no “${field}”.`, 'unknown-field');
  }
}

/**
 * Reads parts from CSV (RFC 4180, UTF-8, header as in `CSV_HEADER`). Values may be written the way
 * people do: `4k7`, `0.1u`, `12.6V 150mA`.
 *
 * @throws CsvError with line, column and reason of every bad row; nothing of such a file is taken.
 */
export function importCsv(text: string): { parts: Part[] } {
  let rows: string[][];
  try {
    rows = parse(text, { bom: true, relax_column_count: true, skip_empty_lines: true, trim: true });
  } catch (error) {
    const { lines = 1, message = '' } = error as { lines?: number; message?: string };
    throw new CsvError([
      {
        code: 'not-csv',
        line: lines,
        column: 'ref',
        message: `Line ${lines}: the file is not valid CSV. ${message.split('\n')[0]}.`,
      },
    ]);
  }
  const [header, ...body] = rows;
  if (
    !header ||
    header.length !== CSV_HEADER.length ||
    header.some((name, i) => name.toLowerCase() !== CSV_HEADER[i])
  ) {
    throw new CsvError([
      {
        code: 'bad-header',
        line: 1,
        column: 'ref',
        message: `Line 1: the header must be ${CSV_HEADER.join(',')}.`,
      },
    ]);
  }
  const problems: CsvProblem[] = [];
  const seen = new Map<string, number>();
  const parts: Part[] = [];
  body.forEach((cells, i) => {
    const line = i + 2;
    if (cells.length !== CSV_HEADER.length) {
      problems.push({
        code: 'bad-row',
        line,
        column: 'note',
        message: `Line ${line} has ${cells.length} columns; the header has ${CSV_HEADER.length}.`,
      });
      return;
    }
    const row = Object.fromEntries(CSV_HEADER.map((name, c) => [name, cells[c]]));
    const first = seen.get(row.ref);
    if (first !== undefined) {
      problems.push({
        code: 'duplicate-ref',
        line,
        column: 'ref',
        part: row.ref,
        message: `Line ${line}, column ref: ${row.ref} stands on line ${first} already.`,
      });
    }
    seen.set(row.ref, line);
    const part = partOf(row, line, problems);
    if (part) parts.push(part);
  });
  if (body.length === 0) {
    problems.push({
      code: 'no-parts',
      line: 2,
      column: 'ref',
      message: 'The file has a header but no parts.',
    });
  }
  if (problems.length > 0) throw new CsvError(problems);
  return { parts };
}

function cell(value: string): string {
  return /[",\r\n]/.test(value) ? `"${value.replaceAll('"', '""')}"` : value;
}

/** Writes the parts of a netlist as CSV that `importCsv` reads back; cathodes and exponents are left out. */
export function exportCsv(netlist: Pick<Netlist, 'parts'>): string {
  const lines = netlist.parts.map((part) => {
    const fields = part as unknown as Record<string, number | string | undefined>;
    const { value, rating } = MEANING[part.kind];
    const text =
      part.kind === 'thermistor'
        ? `${part.hotOhms} ${part.coldOhms} ${part.amps}A`
        : part.kind === 'winding'
          ? `${part.volts}V`
          : RATED.includes(part.kind)
            ? `${fields.volts}V ${fields.amps}A`
            : String((value && fields[value[0]]) ?? '');
    const columns = [
      part.ref,
      part.kind,
      ...part.between,
      text,
      String(part.tolerance ?? ''),
      String((rating && fields[rating[0]]) ?? ''),
      String(fields.make ?? ''),
      part.assembly ?? '',
      part.note ?? '',
    ];
    return columns.map(cell).join(',');
  });
  return [CSV_HEADER.join(','), ...lines, ''].join('\r\n');
}
