import { type Netlist, type Take } from '@engine/netlist/types';
import { railsIn, separate } from '@/lib/bench/graph';
import { KIND_WORDS, partValue } from '@/lib/bench/part-words';
import { labelForNode, labelForPlace, type Place, placeKey, placeOf } from '@/lib/bench/places';
import { isPoweredReading } from '@/lib/bench/takes';

/** A row of the grid: one point, one part, or another pair of leads. */
export interface GridRow {
  id: string;
  kind: 'point' | 'part' | 'leads';
  label: string;
  /** What stands small below the label: "resistor, 15 Ω". */
  detail: string;
  cells: Partial<Record<Take, Place>>;
}

/** One state of the set: its readings share a table. */
export interface GridSection {
  id: 'cold' | 'powered';
  title: string;
  columns: Take[];
  rows: GridRow[];
}

const COLD_COLUMNS: Take[] = ['ohms', 'lifted-ohms', 'sign'];
const POWERED_COLUMNS: Take[] = ['ac-volts', 'dc-volts', 'ripple-volts', 'amps', 'sign'];

/**
 * Lists every place of a circuit where a reading can be typed.
 *
 * Points come against the reference. DC and ripple are offered where a rectifier can put them.
 *
 * @param netlist circuit with the parts added as found.
 * @param others places of readings taken or suggested elsewhere; those without a row get one.
 * @returns the cold section, then the powered one; columns without a cell are left out.
 */
export function sectionsOf(netlist: Netlist, others: readonly Place[] = []): GridSection[] {
  const dcNodes = nodesWithDc(netlist);
  const sections: GridSection[] = [
    { id: 'cold', title: 'Power off', columns: COLD_COLUMNS, rows: coldRows(netlist) },
    {
      id: 'powered',
      title: 'Powered',
      columns: POWERED_COLUMNS,
      rows: poweredRows(netlist, dcNodes),
    },
  ];
  const known = new Set(sections.flatMap(placesOf).map(placeKey));
  for (const place of others) {
    if (known.has(placeKey(place)) || !place.at) continue;
    known.add(placeKey(place));
    const section = sections[isPoweredReading(place.take) ? 1 : 0];
    const id = `leads ${place.at.join(' ')}`;
    const row = section.rows.find((other) => other.id === id);
    if (row) row.cells[place.take] = placeOf(place);
    else section.rows.push(leadsRow(netlist, id, place));
  }
  return sections.map((section) => ({
    ...section,
    columns: section.columns.filter((take) => section.rows.some((row) => row.cells[take])),
  }));
}

/** All places of a section, row by row. */
export function placesOf(section: GridSection): Place[] {
  return section.rows.flatMap((row) =>
    section.columns.flatMap((take) => (row.cells[take] ? [row.cells[take]] : [])),
  );
}

function coldRows(netlist: Netlist): GridRow[] {
  return [
    ...pointsOf(netlist).map((node) => pointRow(netlist, node, ['ohms'])),
    ...netlist.parts.map((part) => partRow(part, ['ohms', 'lifted-ohms', 'sign'])),
  ];
}

function poweredRows(netlist: Netlist, dcNodes: ReadonlySet<string>): GridRow[] {
  const hot = netlist.line && netlist.line.hot !== netlist.reference ? [netlist.line.hot] : [];
  const points = [...hot, ...pointsOf(netlist).filter((node) => !hot.includes(node))];
  const voltsAt = (isDc: boolean): Take[] =>
    isDc ? ['ac-volts', 'dc-volts', 'ripple-volts'] : ['ac-volts'];
  return [
    ...points.map((node) => pointRow(netlist, node, voltsAt(dcNodes.has(node)))),
    ...netlist.parts.map((part) => {
      const isDc = part.between.some((node) => dcNodes.has(node));
      return partRow(part, [...voltsAt(isDc).slice(0, 2), 'amps', 'sign']);
    }),
  ];
}

function pointsOf(netlist: Netlist): string[] {
  if (netlist.points?.length) return netlist.points.map((point) => point.node);
  const nodes = new Set(netlist.parts.flatMap((part) => part.between));
  nodes.delete(netlist.reference);
  if (netlist.line) nodes.delete(netlist.line.hot);
  return [...nodes];
}

function pointRow(netlist: Netlist, node: string, takes: Take[]): GridRow {
  const label = labelForNode(netlist, node);
  const against = `against ${labelForNode(netlist, netlist.reference)}`;
  const at: [string, string] = [node, netlist.reference];
  return {
    id: `point ${node}`,
    kind: 'point',
    label: label[0].toUpperCase() + label.slice(1),
    detail: label === node ? against : `${node}, ${against}`,
    cells: Object.fromEntries(takes.map((take) => [take, { take, at }])),
  };
}

function partRow(part: Netlist['parts'][number], takes: Take[]): GridRow {
  const detail = [KIND_WORDS[part.kind], partValue(part)].filter((word) => word !== '').join(', ');
  return {
    id: `part ${part.ref}`,
    kind: 'part',
    label: part.ref,
    detail,
    cells: Object.fromEntries(takes.map((take) => [take, { take, part: part.ref }])),
  };
}

function leadsRow(netlist: Netlist, id: string, place: Place): GridRow {
  const label = labelForPlace(netlist, place).replace(/^(from|at) /, '');
  return {
    id,
    kind: 'leads',
    label: label[0].toUpperCase() + label.slice(1),
    detail: `red on ${place.at?.[0]}, black on ${place.at?.[1]}`,
    cells: { [place.take]: placeOf(place) },
  };
}

/** Nodes of the figures that hold a rectifier: there can be DC and ripple. */
function nodesWithDc(netlist: Netlist): Set<string> {
  const rails = railsIn(netlist);
  const groups = separate(netlist.parts, rails).filter((group) =>
    group.some((part) => part.kind === 'rectifier'),
  );
  return new Set(groups.flat().flatMap((part) => part.between.filter((node) => !rails.has(node))));
}
