import { NetlistError } from '../errors';
import { FIELDS, fieldProblem, swappedField } from './fields';
import { pointerStep, refProblem } from './names';
import { isObject, Reader } from './reader';
import { type Netlist, PART_KINDS, type PartKind } from './types';

/** Largest circuit that is taken. */
export const MOST_PARTS = 400;
const MOST_POINTS = 1000;
const TOP = ['ohmstead', 'title', 'reference', 'line', 'parts', 'points', 'layout', '$schema'];
const LINE = ['hot', 'return', 'volts', 'hertz', 'ohms'];
const PUBLISHED = ['acVolts', 'dcVolts', 'rippleVolts', 'ohms'];

function readPart(reader: Reader, value: unknown, path: string): void {
  if (!isObject(value)) {
    reader.add('bad-part', path, 'Every part must be an object with ref, kind and between.');
    return;
  }
  const { ref, kind, between } = value;
  const name = typeof ref === 'string' ? ref : undefined;
  const called = name ?? 'A part';
  const wrongRef = refProblem(ref);
  if (wrongRef) reader.add(wrongRef.code, `${path}/ref`, wrongRef.message, name);
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
  const odd = swappedField(kind as PartKind, value);
  if (odd) reader.add('bad-value', `${path}/${odd.field}`, `${called}: ${odd.message}`, name);
}

function readLine(reader: Reader, value: unknown): void {
  if (!isObject(value)) {
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
  reader.between(value.volts, 1, 1000, '/line/volts', 'The line voltage');
  reader.between(value.hertz, 10, 1000, '/line/hertz', 'The line frequency');
  if (value.ohms !== undefined) {
    reader.between(value.ohms, 0, 1e6, '/line/ohms', 'The line’s source resistance');
  }
}

function readPoints(reader: Reader, value: unknown): void {
  if (!Array.isArray(value)) {
    reader.add('bad-points', '/points', 'The points must be a list.');
    return;
  }
  if (value.length > MOST_POINTS) {
    reader.add('too-many-points', '/points', `A circuit can have ${MOST_POINTS} points at most.`);
    return;
  }
  value.forEach((point: unknown, i) => {
    const path = `/points/${i}`;
    if (!isObject(point)) {
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
    if (!isObject(point.published)) {
      reader.add('bad-value', `${path}/published`, 'Published values must be an object.');
      return;
    }
    reader.known(point.published, PUBLISHED, `${path}/published`, 'The published values');
    for (const [name, number] of Object.entries(point.published)) {
      if (PUBLISHED.includes(name) && !(typeof number === 'number' && Number.isFinite(number))) {
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
  if (!isObject(value)) {
    reader.add('bad-layout', '/layout', 'The layout must be an object with one entry per part.');
    return;
  }
  for (const [ref, place] of Object.entries(value)) {
    const isPlace =
      isObject(place) &&
      Number.isFinite(place.x) &&
      Number.isFinite(place.y) &&
      [0, 1, 2, 3].includes(place.turn as number);
    if (!isPlace) {
      reader.add(
        'bad-layout',
        `/layout/${pointerStep(ref)}`,
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
  if (!isObject(json)) {
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
