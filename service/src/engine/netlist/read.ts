import { NetlistError } from '../errors';
import { FIELDS, fieldProblem } from './fields';
import { type Netlist, type NetlistProblem, PART_KINDS, type PartKind } from './types';

/** Largest circuit that is taken. */
export const MOST_PARTS = 400;
const REF = /^[A-Za-z0-9_-]{1,24}$/;
const NODE = /^\S{1,40}$/;
const TOP = ['ohmstead', 'title', 'reference', 'line', 'parts', 'points', 'layout', '$schema'];
const LINE = ['hot', 'return', 'volts', 'hertz', 'ohms'];
const PUBLISHED = ['acVolts', 'dcVolts', 'rippleVolts', 'ohms'];

type Record_ = Record<string, unknown>;

function isRecord(value: unknown): value is Record_ {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Collects problems while a document is read. */
class Reader {
  readonly problems: NetlistProblem[] = [];

  add(code: string, path: string, message: string, part?: string): void {
    this.problems.push({ code, message, path, ...(part === undefined ? {} : { part }) });
  }

  /** Refuses fields that the format does not know. */
  known(
    value: Record_,
    names: readonly string[],
    path: string,
    where: string,
    part?: string,
  ): void {
    for (const name of Object.keys(value)) {
      if (!names.includes(name)) {
        this.add(
          'unknown-field',
          `${path}/${name}`,
          `${where} has a field “${name}” that the format does not know. Remove it or check its spelling.`,
          part,
        );
      }
    }
  }

  node(value: unknown, path: string, where: string, part?: string): void {
    if (typeof value !== 'string' || !NODE.test(value)) {
      this.add(
        'bad-node',
        path,
        `${where} must name a node: 1 to 40 characters without spaces.`,
        part,
      );
    }
  }

  positive(value: unknown, path: string, where: string): void {
    if (typeof value !== 'number' || !Number.isFinite(value) || value <= 0) {
      this.add('bad-value', path, `${where} must be a number above zero.`);
    }
  }
}

function readPart(reader: Reader, value: unknown, path: string): void {
  if (!isRecord(value)) {
    reader.add('bad-part', path, 'Every part must be an object with ref, kind and between.');
    return;
  }
  const { ref, kind, between } = value;
  const name = typeof ref === 'string' ? ref : undefined;
  const called = name ?? 'A part';
  if (typeof ref !== 'string' || !REF.test(ref)) {
    reader.add(
      'bad-ref',
      `${path}/ref`,
      'A part needs a reference of 1 to 24 letters, digits, “-” or “_”, such as R1B.',
      name,
    );
  }
  if (!PART_KINDS.includes(kind as PartKind)) {
    reader.add(
      'unknown-kind',
      `${path}/kind`,
      `${called} has the kind “${String(kind)}”, which Ohmstead does not know. Kinds are ${PART_KINDS.join(', ')}.`,
      name,
    );
    return;
  }
  if (!Array.isArray(between) || between.length !== 2) {
    reader.add('bad-between', `${path}/between`, `${called} must lie between two nodes.`, name);
  } else {
    between.forEach((node, i) =>
      reader.node(node, `${path}/between/${i}`, `${called}: “between”`, name),
    );
  }
  const fields = FIELDS[kind as PartKind];
  reader.known(value, ['ref', 'kind', 'between', ...Object.keys(fields)], path, called, name);
  for (const [field, rule] of Object.entries(fields)) {
    if (value[field] === undefined) {
      if (rule.isRequired) {
        reader.add(
          'missing-field',
          `${path}/${field}`,
          `${called} is a ${String(kind)} and needs “${field}”.`,
          name,
        );
      }
      continue;
    }
    const problem = fieldProblem(field, rule, value[field]);
    if (problem) reader.add('bad-value', `${path}/${field}`, `${called}: ${problem}`, name);
  }
}

function readLine(reader: Reader, value: unknown): void {
  if (!isRecord(value)) {
    reader.add(
      'bad-line',
      '/line',
      'The line must be an object with hot, return, volts and hertz.',
    );
    return;
  }
  reader.known(value, LINE, '/line', 'The line');
  reader.node(value.hot, '/line/hot', 'The hot side of the line');
  reader.node(value.return, '/line/return', 'The return of the line');
  reader.positive(value.volts, '/line/volts', 'The line voltage');
  reader.positive(value.hertz, '/line/hertz', 'The line frequency');
  if (value.ohms !== undefined && (typeof value.ohms !== 'number' || !(value.ohms >= 0))) {
    reader.add('bad-value', '/line/ohms', 'The line’s source resistance must be zero or more.');
  }
}

function readPoints(reader: Reader, value: unknown): void {
  if (!Array.isArray(value)) {
    reader.add('bad-points', '/points', 'The points must be a list.');
    return;
  }
  value.forEach((point: unknown, i) => {
    const path = `/points/${i}`;
    if (!isRecord(point)) {
      reader.add('bad-point', path, 'Every point must be an object with node and label.');
      return;
    }
    reader.known(point, ['node', 'label', 'published'], path, 'A point');
    reader.node(point.node, `${path}/node`, 'A point');
    if (typeof point.label !== 'string' || point.label.trim() === '' || point.label.length > 80) {
      reader.add(
        'bad-label',
        `${path}/label`,
        'A point needs a label of 1 to 80 characters, such as “V8 pin 4”.',
      );
    }
    if (point.published === undefined) return;
    if (!isRecord(point.published)) {
      reader.add('bad-value', `${path}/published`, 'Published values must be an object.');
      return;
    }
    reader.known(point.published, PUBLISHED, `${path}/published`, 'The published values');
    for (const [name, number] of Object.entries(point.published)) {
      if (PUBLISHED.includes(name) && (typeof number !== 'number' || !Number.isFinite(number))) {
        reader.add(
          'bad-value',
          `${path}/published/${name}`,
          `The published “${name}” must be a number.`,
        );
      }
    }
  });
}

function readLayout(reader: Reader, value: unknown): void {
  if (!isRecord(value)) {
    reader.add('bad-layout', '/layout', 'The layout must be an object with one entry per part.');
    return;
  }
  for (const [ref, place] of Object.entries(value)) {
    const isPlace =
      isRecord(place) &&
      Number.isFinite(place.x) &&
      Number.isFinite(place.y) &&
      [0, 1, 2, 3].includes(place.turn as number);
    if (!isPlace) {
      reader.add(
        'bad-layout',
        `/layout/${ref}`,
        `The place of ${ref} needs x, y and turn (0 to 3 quarter turns).`,
        ref,
      );
    }
  }
}

/**
 * Reads a netlist document strictly: types, ranges and names of every field. Whether the circuit
 * makes sense as a whole is the business of `checkNetlist`.
 *
 * @param json anything, as parsed from JSON.
 * @throws NetlistError with every problem found, each with its place in the document.
 */
export function readNetlist(json: unknown): Netlist {
  const reader = new Reader();
  if (!isRecord(json)) {
    reader.add(
      'not-a-netlist',
      '',
      'A netlist is a JSON object with “ohmstead”, “title”, “reference” and “parts”.',
    );
    throw new NetlistError(reader.problems);
  }
  if (json.ohmstead !== 1) {
    reader.add('bad-version', '/ohmstead', 'The format’s version “ohmstead” must be 1.');
  }
  reader.known(json, TOP, '', 'The netlist');
  if (typeof json.title !== 'string' || json.title.trim() === '' || json.title.length > 200) {
    reader.add('bad-title', '/title', 'The netlist needs a title of 1 to 200 characters.');
  }
  reader.node(json.reference, '/reference', 'The reference');
  if (json.line !== undefined) readLine(reader, json.line);
  if (!Array.isArray(json.parts) || json.parts.length === 0) {
    reader.add('no-parts', '/parts', 'The netlist needs a list of at least one part.');
  } else if (json.parts.length > MOST_PARTS) {
    reader.add(
      'too-many-parts',
      '/parts',
      `The netlist has ${json.parts.length} parts; ${MOST_PARTS} is the most. Split the circuit.`,
    );
  } else json.parts.forEach((part, i) => readPart(reader, part, `/parts/${i}`));
  if (json.points !== undefined) readPoints(reader, json.points);
  if (json.layout !== undefined) readLayout(reader, json.layout);
  if (reader.problems.length > 0) throw new NetlistError(reader.problems);
  return json as unknown as Netlist;
}
