import type { DiagnosisInput } from '../diagnosis-types';
import { isPictureTube } from '../netlist/picture-tube';
import type { Netlist, Part, Reading } from '../netlist/types';

/** What a fact is, for the person who writes rules and for the check of a rule. */
export interface FactDefinition {
  type: 'number' | 'boolean' | 'text';
  unit?: string;
  scope: 'case' | 'part';
  description: string;
  /** Said when the fact is not known yet. */
  waitsFor?: string;
}

/** Every fact a rule may use. `undefined` as a value means that it is not known yet. */
export const FACTS: Record<string, FactDefinition> = {
  heaterCount: { type: 'number', scope: 'case', description: 'Heaters in the circuit.' },
  lampCount: { type: 'number', scope: 'case', description: 'Lamps in the circuit.' },
  rectifierCount: { type: 'number', scope: 'case', description: 'Rectifiers in the circuit.' },
  seleniumCount: {
    type: 'number',
    scope: 'case',
    description: 'Selenium rectifiers in the circuit.',
  },
  vacuumRectifierCount: {
    type: 'number',
    scope: 'case',
    description: 'Vacuum rectifiers in the circuit.',
  },
  electrolyticCount: {
    type: 'number',
    scope: 'case',
    description: 'Electrolytic sections in the circuit.',
  },
  paperCapacitorCount: {
    type: 'number',
    scope: 'case',
    description: 'Paper capacitors in the circuit.',
  },
  lineCapacitorCount: {
    type: 'number',
    scope: 'case',
    description:
      'Capacitors with an end on the hot side of the line or behind its switch and fuse.',
  },
  dropperSectionCount: {
    type: 'number',
    scope: 'case',
    description: 'Wirewound resistors that share a body.',
  },
  bodyCount: { type: 'number', scope: 'case', description: 'Bodies of several sections.' },
  pictureTubeCount: {
    type: 'number',
    scope: 'case',
    description: 'Heaters whose tube is a picture tube.',
  },
  isChassisOnLine: {
    type: 'boolean',
    scope: 'case',
    description: 'The reference is one side of the line: the chassis may be live.',
  },
  hasLine: { type: 'boolean', scope: 'case', description: 'The circuit is fed from the line.' },
  lineRatio: {
    type: 'number',
    scope: 'case',
    unit: 'of design',
    description: 'Line voltage of the day over the design value.',
    waitsFor: 'the line voltage of the day',
  },
  openPartCount: {
    type: 'number',
    scope: 'case',
    description: 'Parts that read OL across themselves, set off.',
    waitsFor: 'ohms across the parts',
  },
  openDropperSectionCount: {
    type: 'number',
    scope: 'case',
    description: 'Dropper sections that read OL across themselves.',
    waitsFor: 'ohms across the dropper sections',
  },
  darkLampCount: {
    type: 'number',
    scope: 'case',
    description: 'Lamps seen dark with the set on.',
    waitsFor: 'a look at the lamps',
  },
  isHumming: {
    type: 'boolean',
    scope: 'case',
    description: 'Somebody heard hum.',
    waitsFor: 'whether the set hums',
  },
  burntPartCount: {
    type: 'number',
    scope: 'case',
    description: 'Parts seen burnt or cracked.',
    waitsFor: 'a look at the parts',
  },
  bridgedCount: { type: 'number', scope: 'case', description: 'Parts found bridged.' },
  kind: { type: 'text', scope: 'part', description: 'Kind of the part at hand.' },
  make: {
    type: 'text',
    scope: 'part',
    description: 'Make of the part at hand.',
    waitsFor: 'its make',
  },
  isPictureTube: {
    type: 'boolean',
    scope: 'part',
    description: 'The part at hand is a picture tube’s heater.',
  },
  sectionCount: {
    type: 'number',
    scope: 'part',
    description: 'Sections in the body of the part at hand, 1 when it stands alone.',
  },
  ratedWatts: {
    type: 'number',
    scope: 'part',
    unit: 'W',
    description: 'Rated watts of a resistor.',
    waitsFor: 'its rated watts',
  },
  ohms: {
    type: 'number',
    scope: 'part',
    unit: 'Ω',
    description: 'Nominal ohms of the part at hand.',
    waitsFor: 'its ohms',
  },
  ohmsRatio: {
    type: 'number',
    scope: 'part',
    unit: 'of nominal',
    description: 'Ohms read across the part, set off, over its nominal cold ohms.',
    waitsFor: 'ohms across it',
  },
  isOpen: {
    type: 'boolean',
    scope: 'part',
    description: 'It reads OL across itself, set off.',
    waitsFor: 'ohms across it',
  },
  voltsAcross: {
    type: 'number',
    scope: 'part',
    unit: 'V',
    description: 'Volts read across the part.',
    waitsFor: 'volts across it',
  },
  voltsRatio: {
    type: 'number',
    scope: 'part',
    unit: 'of rating',
    description: 'Volts read across a heater or lamp over its rating.',
    waitsFor: 'volts across it',
  },
  seen: {
    type: 'text',
    scope: 'part',
    description: 'What was seen on it last: dark, glows, burnt, …',
    waitsFor: 'a look at it',
  },
};

export type FactValues = Record<string, number | boolean | string | undefined>;

function lastOn(readings: readonly Reading[], take: string, part: string): Reading | undefined {
  return readings.findLast((reading) => reading.take === take && reading.part === part);
}

/** Ohms a part has when cold; undefined for kinds an ohmmeter cannot judge. */
function coldOhms(part: Part): number | undefined {
  switch (part.kind) {
    case 'heater':
      return part.volts / part.amps / (part.coldRatio ?? 6);
    case 'lamp':
      return part.volts / part.amps / (part.coldRatio ?? 10);
    case 'thermistor':
      return part.coldOhms;
    case 'resistor':
    case 'choke':
    case 'winding':
      return part.ohms;
    default:
      return undefined;
  }
}

function sectionsOf(netlist: Netlist, part: Part): number {
  if (part.assembly === undefined) return 1;
  return netlist.parts.filter(({ assembly }) => assembly === part.assembly).length;
}

function isDropperSection(netlist: Netlist, part: Part): boolean {
  return part.kind === 'resistor' && part.make === 'wirewound' && sectionsOf(netlist, part) > 1;
}

/** Nodes that hang on the hot side of the line through nothing but switches and fuses. */
function hotNodes(netlist: Netlist): Set<string> {
  const nodes = new Set<string>(netlist.line ? [netlist.line.hot] : []);
  for (let size = -1; size !== nodes.size;) {
    size = nodes.size;
    for (const {
      kind,
      between: [a, b],
    } of netlist.parts) {
      if (kind !== 'switch' && kind !== 'fuse') continue;
      if (nodes.has(a)) nodes.add(b);
      else if (nodes.has(b)) nodes.add(a);
    }
  }
  return nodes;
}

/** Facts about the case as a whole. */
export function caseFacts({
  netlist,
  asFound = [],
  conditions,
  readings,
}: DiagnosisInput): FactValues {
  const { parts, line } = netlist;
  const count = (test: (part: Part) => boolean) => parts.filter(test).length;
  const onParts = readings.filter(({ take, part }) => take === 'ohms' && part !== undefined);
  const isOverOn = (part: Part) => lastOn(readings, 'ohms', part.ref)?.value === 'OL';
  const looks = readings.filter(({ take }) => take === 'sign');
  const hot = hotNodes(netlist);
  const bodies = new Set(
    parts.flatMap((part) => (sectionsOf(netlist, part) > 1 ? [part.assembly] : [])),
  );
  const ofLamps = looks.filter(({ part }) =>
    parts.some(({ ref, kind }) => ref === part && kind === 'lamp'),
  );
  const ofDropper = onParts.filter(({ part }) =>
    parts.some((own) => own.ref === part && isDropperSection(netlist, own)),
  );
  return {
    heaterCount: count(({ kind }) => kind === 'heater'),
    lampCount: count(({ kind }) => kind === 'lamp'),
    rectifierCount: count(({ kind }) => kind === 'rectifier'),
    seleniumCount: count((part) => part.kind === 'rectifier' && part.make === 'selenium'),
    vacuumRectifierCount: count((part) => part.kind === 'rectifier' && part.make === 'vacuum'),
    electrolyticCount: count((part) => part.kind === 'capacitor' && part.make === 'electrolytic'),
    paperCapacitorCount: count((part) => part.kind === 'capacitor' && part.make === 'paper'),
    lineCapacitorCount: count(
      (part) => part.kind === 'capacitor' && part.between.some((node) => hot.has(node)),
    ),
    dropperSectionCount: count((part) => isDropperSection(netlist, part)),
    bodyCount: bodies.size,
    pictureTubeCount: count(isPictureTube),
    isChassisOnLine:
      line !== undefined && (line.return === netlist.reference || line.hot === netlist.reference),
    hasLine: line !== undefined,
    lineRatio:
      line && conditions?.lineVolts !== undefined ? conditions.lineVolts / line.volts : undefined,
    openPartCount: onParts.length > 0 ? count(isOverOn) : undefined,
    openDropperSectionCount:
      ofDropper.length > 0
        ? count((part) => isDropperSection(netlist, part) && isOverOn(part))
        : undefined,
    darkLampCount:
      ofLamps.length > 0 ? ofLamps.filter(({ seen }) => seen === 'dark').length : undefined,
    isHumming: looks.some(({ seen }) => seen === 'hums') ? true : undefined,
    burntPartCount:
      looks.length > 0
        ? looks.filter(({ seen }) => seen === 'burnt' || seen === 'cracked').length
        : undefined,
    bridgedCount: asFound.filter(({ change }) => change === 'bridged').length,
  };
}

/** Facts about one part, to be read beside those of the case. */
export function partFacts({ netlist, readings }: DiagnosisInput, part: Part): FactValues {
  const ohms = lastOn(readings, 'ohms', part.ref)?.value;
  const volts = readings.findLast(
    ({ take, part: ref }) => (take === 'ac-volts' || take === 'dc-volts') && ref === part.ref,
  )?.value;
  const nominal = coldOhms(part);
  const isRated = part.kind === 'heater' || part.kind === 'lamp';
  return {
    kind: part.kind,
    make: 'make' in part ? part.make : undefined,
    isPictureTube: isPictureTube(part),
    sectionCount: sectionsOf(netlist, part),
    ratedWatts: part.kind === 'resistor' ? part.watts : undefined,
    ohms: 'ohms' in part ? part.ohms : undefined,
    ohmsRatio: typeof ohms === 'number' && nominal !== undefined ? ohms / nominal : undefined,
    isOpen: ohms === undefined ? undefined : ohms === 'OL',
    voltsAcross: typeof volts === 'number' ? volts : undefined,
    voltsRatio: typeof volts === 'number' && isRated ? Math.abs(volts) / part.volts : undefined,
    seen: lastOn(readings, 'sign', part.ref)?.seen,
  };
}
