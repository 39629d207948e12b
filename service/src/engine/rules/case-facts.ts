import type { DiagnosisInput } from '../diagnosis-types';
import { isPictureTube } from '../netlist/picture-tube';
import type { Netlist, Part, Published, Reading, Take } from '../netlist/types';
import type { FactValues } from './facts';
import { stringRefs } from './heater-string';
import { latestOhms, latestOn } from './latest';
import { makeOf } from './select';

const PUBLISHED_AS: Partial<Record<Take, keyof Published>> = {
  'ac-volts': 'acVolts',
  'dc-volts': 'dcVolts',
  'ripple-volts': 'rippleVolts',
  ohms: 'ohms',
};

/** Sections in the body of a part, 1 when it stands alone. */
export function sectionsOf(netlist: Netlist, { assembly }: Part): number {
  if (assembly === undefined) return 1;
  return netlist.parts.filter((part) => part.assembly === assembly).length;
}

function isDropperSection(netlist: Netlist, part: Part): boolean {
  return part.kind === 'resistor' && part.make === 'wirewound' && sectionsOf(netlist, part) > 1;
}

/** Nodes that hang on the hot side of the line through nothing but switches and fuses. */
function hotNodes({ line, parts }: Netlist): Set<string> {
  const nodes = new Set<string>(line ? [line.hot] : []);
  const contacts = parts.filter(({ kind }) => kind === 'switch' || kind === 'fuse');
  for (let size = -1; size !== nodes.size;) {
    size = nodes.size;
    for (const { between } of contacts) {
      if (between.some((node) => nodes.has(node))) between.forEach((node) => nodes.add(node));
    }
  }
  return nodes;
}

/** Current in the string over its rating; sections that share it with something else say nothing. */
function stringAmpsRatio(netlist: Netlist, readings: readonly Reading[]): number | undefined {
  const refs = stringRefs(netlist);
  const string = netlist.parts.filter(({ ref }) => refs.has(ref));
  const ratings = string.flatMap((part) => (part.kind === 'heater' ? [part.amps] : []));
  const rating = ratings.sort((a, b) => a - b)[Math.floor(ratings.length / 2)];
  for (const reading of readings.toReversed()) {
    const part = string.find(({ ref }) => ref === reading.part);
    if (!part || reading.take !== 'amps' || typeof reading.value !== 'number') continue;
    if (part.kind === 'heater') return Math.abs(reading.value) / part.amps;
    if (part.kind === 'switch' || part.kind === 'fuse' || part.kind === 'thermistor') {
      return Math.abs(reading.value) / rating;
    }
  }
  return undefined;
}

/** Largest relative distance of a reading from its published value. */
function publishedDeviation(netlist: Netlist, readings: readonly Reading[]): number | undefined {
  const deviations = readings.flatMap(({ take, at, value }) => {
    const field = PUBLISHED_AS[take];
    if (!field || !at || at[1] !== netlist.reference || typeof value !== 'number') return [];
    const point = netlist.points?.find(({ node }) => node === at[0]);
    const published = point?.published?.[field];
    return published ? [Math.abs(value / published - 1)] : [];
  });
  return deviations.length > 0 ? Math.max(...deviations) : undefined;
}

/** What readings and looks say about the case, each unknown until one of them was taken. */
function measuredFacts(netlist: Netlist, readings: readonly Reading[]): FactValues {
  const { parts } = netlist;
  const read = parts.flatMap((part) => {
    const value = latestOhms(readings, part)?.value;
    return value === undefined ? [] : [{ part, isOpen: value === 'OL' }];
  });
  const droppers = read.filter(({ part }) => isDropperSection(netlist, part));
  const seen = parts.flatMap((part) => {
    const look = latestOn(readings, ['sign'], part)?.seen;
    return look === undefined ? [] : [{ part, look }];
  });
  const lamps = seen.filter(({ part }) => part.kind === 'lamp');
  const open = (list: typeof read) => list.filter(({ isOpen }) => isOpen).length;
  const burnt = seen.filter(({ look }) => look === 'burnt' || look === 'cracked');
  return {
    stringAmpsRatio: stringAmpsRatio(netlist, readings),
    publishedDeviation: publishedDeviation(netlist, readings),
    openPartCount: read.length > 0 ? open(read) : undefined,
    openDropperSectionCount: droppers.length > 0 ? open(droppers) : undefined,
    darkLampCount:
      lamps.length > 0 ? lamps.filter(({ look }) => look === 'dark').length : undefined,
    // Silence is not recorded, so hum is either heard or not known.
    isHumming: seen.some(({ look }) => look === 'hums') ? true : undefined,
    burntPartCount: seen.length > 0 ? burnt.length : undefined,
  };
}

/**
 * Facts about the case as a whole.
 *
 * @param input the case, with its netlist as found.
 */
export function caseFacts(input: DiagnosisInput): FactValues {
  const { netlist, asFound = [], conditions, readings } = input;
  const { parts, line } = netlist;
  const count = (test: (part: Part) => boolean) => parts.filter(test).length;
  const made = (kind: Part['kind'], make: string) =>
    count((part) => part.kind === kind && makeOf(part) === make);
  const hot = hotNodes(netlist);
  const bodies = parts.filter((part) => sectionsOf(netlist, part) > 1);
  return {
    heaterCount: count(({ kind }) => kind === 'heater'),
    lampCount: count(({ kind }) => kind === 'lamp'),
    rectifierCount: count(({ kind }) => kind === 'rectifier'),
    seleniumCount: made('rectifier', 'selenium'),
    vacuumRectifierCount: made('rectifier', 'vacuum'),
    electrolyticCount: made('capacitor', 'electrolytic'),
    paperCapacitorCount: made('capacitor', 'paper'),
    lineCapacitorCount: count(
      ({ kind, between }) => kind === 'capacitor' && between.some((node) => hot.has(node)),
    ),
    dropperSectionCount: count((part) => isDropperSection(netlist, part)),
    bodyCount: new Set(bodies.map(({ assembly }) => assembly)).size,
    pictureTubeCount: count(isPictureTube),
    isChassisOnLine: line?.return === netlist.reference || line?.hot === netlist.reference,
    hasLine: line !== undefined,
    lineRatio: !line
      ? null
      : conditions?.lineVolts === undefined
        ? undefined
        : conditions.lineVolts / line.volts,
    bridgedCount: asFound.filter(({ change }) => change === 'bridged').length,
    ...measuredFacts(netlist, readings),
  };
}
