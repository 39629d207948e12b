/** What a fact is, for the person who writes rules and for the check of a rule. */
export interface FactDefinition {
  type: 'number' | 'boolean' | 'text';
  unit?: string;
  scope: 'case' | 'part';
  description: string;
  /** Said when the fact is not known yet; `it` and `its` become the part's reference. */
  waitsFor?: string;
}

/**
 * The value of each fact. `undefined` is not known yet: a reading is wanted. `null` is a question
 * that makes no sense here, such as the make of a heater.
 */
export type FactValues = Record<string, number | boolean | string | null | undefined>;

function countOf(what: string): FactDefinition {
  return { type: 'number', scope: 'case', description: `${what} in the circuit.` };
}

/** Facts about the case as a whole. */
const OF_CASE: Record<string, FactDefinition> = {
  heaterCount: countOf('Heaters'),
  lampCount: countOf('Lamps'),
  rectifierCount: countOf('Rectifiers'),
  seleniumCount: countOf('Selenium rectifiers'),
  vacuumRectifierCount: countOf('Vacuum rectifiers'),
  electrolyticCount: countOf('Electrolytic sections'),
  paperCapacitorCount: countOf('Paper capacitors'),
  lineCapacitorCount: {
    type: 'number',
    scope: 'case',
    description:
      'Capacitors with an end on the hot side of the line, or behind its switch or fuse.',
  },
  dropperSectionCount: {
    type: 'number',
    scope: 'case',
    description: 'Wirewound resistors that share a body with others.',
  },
  bodyCount: { type: 'number', scope: 'case', description: 'Bodies of several sections.' },
  pictureTubeCount: {
    type: 'number',
    scope: 'case',
    description: 'Heaters whose tube is a picture tube, by its type or by the words.',
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
  stringAmpsRatio: {
    type: 'number',
    scope: 'case',
    unit: 'of rating',
    description: 'Current measured in the heater string over what its heaters are rated for.',
    waitsFor: 'the current in the heater string',
  },
  publishedDeviation: {
    type: 'number',
    scope: 'case',
    unit: 'of published',
    description:
      'How far the reading that is farthest off lies from its published value, as a share of it: 0.2 is 20 per cent, up or down.',
    waitsFor: 'a reading at a point with a published value',
  },
  openPartCount: {
    type: 'number',
    scope: 'case',
    description: 'Parts that read OL across themselves, set off, of those read so far.',
    waitsFor: 'ohms across the parts',
  },
  openDropperSectionCount: {
    type: 'number',
    scope: 'case',
    description: 'Dropper sections that read OL across themselves, of those read so far.',
    waitsFor: 'ohms across the dropper sections',
  },
  darkLampCount: {
    type: 'number',
    scope: 'case',
    description: 'Lamps seen dark with the set on, of those looked at.',
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
    description: 'Parts seen burnt or cracked, of those looked at.',
    waitsFor: 'a look at the parts',
  },
  bridgedCount: { type: 'number', scope: 'case', description: 'Parts recorded as found bridged.' },
};

/** Facts about the part at hand. */
const OF_PART: Record<string, FactDefinition> = {
  kind: {
    type: 'text',
    scope: 'part',
    description: 'Kind of the part at hand; one found bridged or missing is a joint.',
  },
  make: {
    type: 'text',
    scope: 'part',
    description: 'Make of a resistor, capacitor or rectifier, with the format’s default.',
  },
  asFound: {
    type: 'text',
    scope: 'part',
    description:
      'What was recorded about it as found: as-drawn, fitted, value, bridged, missing or added.',
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
  lampsAcross: {
    type: 'number',
    scope: 'part',
    description: 'Lamps between the same two nodes as the part at hand.',
  },
  ratedWatts: {
    type: 'number',
    scope: 'part',
    unit: 'W',
    description: 'Rated watts of a resistor.',
    waitsFor: 'its rated watts',
  },
  wattsRatio: {
    type: 'number',
    scope: 'part',
    unit: 'of rating',
    description:
      'Watts of a resistor in a healthy set at the line voltage of the day, over its rating.',
    waitsFor: 'its rated watts',
  },
  ohms: {
    type: 'number',
    scope: 'part',
    unit: 'Ω',
    description: 'Nominal ohms of a resistor, choke or winding.',
  },
  ohmsRatio: {
    type: 'number',
    scope: 'part',
    unit: 'of nominal',
    description:
      'Ohms read across it, set off, over its nominal cold ohms. OL counts as the most that the meter shows. A reading with one end lifted goes before one in circuit.',
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
    description: 'Volts read across it, AC or DC, without sign.',
    waitsFor: 'volts across it',
  },
  voltsRatio: {
    type: 'number',
    scope: 'part',
    unit: 'of rating',
    description:
      'Volts read across a heater or lamp over its rating, or DC volts across a capacitor over its rating.',
    waitsFor: 'volts across it',
  },
  seen: {
    type: 'text',
    scope: 'part',
    description:
      'What was seen on it last: dark, glows, burnt, cracked, bulging, leaking, hums, cold, warm, hot or looks-good.',
    waitsFor: 'a look at it',
  },
};

/** Every fact a rule may use, by name. */
export const FACTS: Readonly<Record<string, FactDefinition>> = { ...OF_CASE, ...OF_PART };

/** The definition of a fact; undefined for any other word, also for those every object knows. */
export function factNamed(name: unknown): FactDefinition | undefined {
  return typeof name === 'string' && Object.hasOwn(FACTS, name) ? FACTS[name] : undefined;
}
