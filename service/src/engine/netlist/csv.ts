import { parse } from 'csv-parse/sync';
import { CsvError, type CsvProblem } from '../errors';
import { MEANING, partOf, RATED } from './csv-row';
import { MOST_PARTS } from './read';
import type { Netlist, Part } from './types';

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

/** A row with the line it begins on, counted from 1 with the header. */
interface PlacedRow {
  line: number;
  cells: string[];
}

function refuseFile(code: string, line: number, message: string): CsvError {
  return new CsvError([{ code, line, column: 'ref', message: `Line ${line}: ${message}` }]);
}

/** Splits a file into rows; empty ones are left out, and every other keeps its line. */
function readRows(text: string): PlacedRow[] {
  // The parser counts a carriage return inside quotes as a line of its own.
  const lines = text.replace(/\r\n?/g, '\n');
  const spoilt = lines.indexOf('\uFFFD');
  if (spoilt >= 0) {
    const line = lines.slice(0, spoilt).split('\n').length;
    throw refuseFile(
      'not-utf8',
      line,
      'the file is not UTF-8. Save it as CSV UTF-8 and try again.',
    );
  }
  try {
    const rows = parse(lines, {
      bom: true,
      relax_column_count: true,
      skip_empty_lines: true,
      skip_records_with_empty_values: true,
      trim: true,
      info: true,
      raw: true,
    }) as unknown as { info: { lines: number }; raw: string; record: string[] }[];
    return rows.map(({ info, raw, record }) => ({
      line: info.lines - (raw.trim().match(/\n/g)?.length ?? 0),
      cells: record,
    }));
  } catch (error) {
    const { lines: line = 1, message = '' } = error as { lines?: number; message?: string };
    throw refuseFile('not-csv', line, `the file is not valid CSV. ${message.split('\n')[0]}.`);
  }
}

/**
 * Reads parts from CSV (RFC 4180, UTF-8, header as in `CSV_HEADER`). Values may be written the way
 * people do: `4k7`, `0.1u`, `12.6V 150mA`.
 *
 * @throws CsvError with line, column and reason of every bad row; nothing of such a file is taken.
 */
export function importCsv(text: string): { parts: Part[] } {
  const [{ cells: header = [] } = {}, ...body] = readRows(text);
  if (
    header.length !== CSV_HEADER.length ||
    header.some((name, i) => name.toLowerCase() !== CSV_HEADER[i])
  ) {
    throw refuseFile('bad-header', 1, `the header must be ${CSV_HEADER.join(',')}.`);
  }
  const problems: CsvProblem[] = [];
  const seen = new Map<string, number>();
  const parts: Part[] = [];
  body.forEach(({ line, cells }) => {
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
  if (body.length > MOST_PARTS) {
    problems.push({
      code: 'too-many-parts',
      line: body[MOST_PARTS].line,
      column: 'ref',
      message: `The file has ${body.length} parts; ${MOST_PARTS} is the most. Split the circuit.`,
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
