/**
 * What is counted or asked, for a sentence. Counts hold `{n}`, which becomes "at least 2 heaters";
 * measures hold `{n}` without a noun; yes-and-no facts give both sentences.
 */
export type FactWords =
  | { count: [one: string, many: string]; frame: string }
  | { measure: string; unit?: string }
  | { yes: string; no: string }
  | { text: string };

const inCircuit = (one: string, many: string): FactWords => ({
  count: [one, many],
  frame: 'The circuit has {n}.',
});

/** The facts that rules may use, as a technician would say them. */
export const FACT_WORDS: Record<string, FactWords> = {
  heaterCount: inCircuit('heater', 'heaters'),
  lampCount: inCircuit('lamp', 'lamps'),
  rectifierCount: inCircuit('rectifier', 'rectifiers'),
  seleniumCount: inCircuit('selenium rectifier', 'selenium rectifiers'),
  vacuumRectifierCount: inCircuit('vacuum rectifier', 'vacuum rectifiers'),
  electrolyticCount: inCircuit('electrolytic section', 'electrolytic sections'),
  paperCapacitorCount: inCircuit('paper capacitor', 'paper capacitors'),
  lineCapacitorCount: inCircuit('capacitor on the line', 'capacitors on the line'),
  dropperSectionCount: inCircuit('dropper section', 'dropper sections'),
  bodyCount: inCircuit('body of several sections', 'bodies of several sections'),
  pictureTubeCount: inCircuit('picture tube', 'picture tubes'),
  isChassisOnLine: {
    yes: 'The chassis is one side of the line.',
    no: 'The chassis is not on the line.',
  },
  hasLine: {
    yes: 'The circuit is fed from the line.',
    no: 'The circuit is not fed from the line.',
  },
  lineRatio: { measure: 'The line voltage of the day is {n} of its design value.' },
  openPartCount: {
    count: ['part', 'parts'],
    frame: 'With the set off, {n} read OL across themselves.',
  },
  openDropperSectionCount: {
    count: ['dropper section', 'dropper sections'],
    frame: 'With the set off, {n} read OL across themselves.',
  },
  darkLampCount: { count: ['lamp', 'lamps'], frame: 'With the set on, {n} stay dark.' },
  isHumming: { yes: 'The set hums.', no: 'The set does not hum.' },
  burntPartCount: { count: ['part', 'parts'], frame: 'Somebody saw {n} burnt or cracked.' },
  bridgedCount: { count: ['part', 'parts'], frame: 'Somebody found {n} bridged.' },
  kind: { text: 'The part at hand is a {v}.' },
  make: { text: 'Its make is {v}.' },
  isPictureTube: {
    yes: 'The part at hand is the heater of a picture tube.',
    no: 'The part at hand is not the heater of a picture tube.',
  },
  sectionCount: { count: ['section', 'sections'], frame: 'Its body has {n}.' },
  ratedWatts: { measure: 'It is rated for {n}.', unit: 'W' },
  ohms: { measure: 'Its nominal value is {n}.', unit: 'Ω' },
  ohmsRatio: { measure: 'With the set off, it reads {n} of its nominal ohms.' },
  isOpen: {
    yes: 'With the set off, it reads OL across itself.',
    no: 'With the set off, it does not read OL across itself.',
  },
  voltsAcross: { measure: 'The reading across it is {n}.', unit: 'V' },
  voltsRatio: { measure: 'It has {n} of its rated voltage across it.' },
  seen: { text: 'Somebody looked at it and saw: {v}.' },
};
