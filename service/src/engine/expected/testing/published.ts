import type { NodalSystem } from '../types';

/** A worked example with where it comes from. */
export interface Published {
  id: string;
  title: string;
  source: string;
  /** `confirmed`: the text was seen; `computed`: worked out from the stated theory, not published. */
  status: 'confirmed' | 'computed';
  note?: string;
  system: NodalSystem;
  /** Printed voltages by node, and to how many volts they are printed. */
  volts: { node: string; value: number; within: number }[];
  /** Printed currents by part, counted from its first node. */
  amps?: { part: string; value: number; within: number }[];
  /** Printed watts by part. */
  watts?: { part: string; value: number; within: number }[];
  /** Ohms of a part that the example works out from a voltage. */
  implied?: { part: string; node: string; volts: number; ohms: number; within: number }[];
}

/** Resistors by name, ends and ohms. */
function resistors(list: [string, string, string, number][]): NodalSystem['conductances'] {
  return list.map(([part, a, b, ohms]) => ({ part, a, b, siemens: 1 / ohms }));
}

const DOE =
  'DOE Fundamentals Handbook, Electrical Science vol. 1 (DOE-HDBK-1011/1-92), module 2 Basic DC Theory';
const MARINE = 'Marine Institute (Memorial University), course E1100 assignment 5';

/** Worked examples of dividers, strings, bleeders and bridges. */
export const PUBLISHED: Published[] = [
  {
    id: 'W01',
    title: 'three resistors in series carry 0.5 A',
    source: `${DOE}, p. 27, example 1`,
    status: 'confirmed',
    system: {
      nodes: ['E', 'A', 'B', 'N'],
      conductances: resistors([
        ['R1', 'E', 'A', 50],
        ['R2', 'A', 'B', 75],
        ['R3', 'B', 'N', 100],
      ]),
      fixed: { E: 112.5, N: 0 },
      injections: {},
    },
    volts: [
      { node: 'A', value: 87.5, within: 1e-6 },
      { node: 'B', value: 50, within: 1e-6 },
    ],
    amps: [{ part: 'R1', value: 0.5, within: 1e-8 }],
  },
  {
    id: 'W02',
    title: '120 V across 40, 60 and 100 Ω',
    source: `${DOE}, pp. 27-28, example 2`,
    status: 'confirmed',
    note: 'total and current seen; drops follow by arithmetic',
    system: {
      nodes: ['E', 'A', 'B', 'N'],
      conductances: resistors([
        ['R1', 'E', 'A', 40],
        ['R2', 'A', 'B', 60],
        ['R3', 'B', 'N', 100],
      ]),
      fixed: { E: 120, N: 0 },
      injections: {},
    },
    volts: [
      { node: 'A', value: 96, within: 1e-6 },
      { node: 'B', value: 60, within: 1e-6 },
    ],
    amps: [{ part: 'R2', value: 0.6, within: 1e-8 }],
  },
  {
    id: 'W03',
    title: '24 Ω beside 8 Ω make 6 Ω',
    source: `${DOE}, p. 36, fig. 28`,
    status: 'confirmed',
    system: {
      nodes: ['A', 'N'],
      conductances: resistors([
        ['R1', 'A', 'N', 8],
        ['R2', 'A', 'N', 10],
      ]),
      fixed: { N: 0 },
      injections: { A: 1 },
    },
    volts: [],
    implied: [{ part: 'R2', node: 'A', volts: 6, ohms: 24, within: 1e-6 }],
  },
  {
    id: 'W05',
    title: 'power in 5, 10 and 15 Ω at 120 V',
    source: 'US Army subcourse OD1633 Basic Electronics, lesson 1 task 2, pp. 45-46',
    status: 'confirmed',
    system: {
      nodes: ['E', 'A', 'B', 'N'],
      conductances: resistors([
        ['R1', 'E', 'A', 5],
        ['R2', 'A', 'B', 10],
        ['R3', 'B', 'N', 15],
      ]),
      fixed: { E: 120, N: 0 },
      injections: {},
    },
    volts: [],
    amps: [{ part: 'R1', value: 4, within: 1e-7 }],
    watts: [
      { part: 'R1', value: 80, within: 1e-5 },
      { part: 'R2', value: 160, within: 1e-5 },
      { part: 'R3', value: 240, within: 1e-5 },
    ],
  },
  {
    id: 'W06',
    title: 'divider with two loads',
    source: 'NEETS Module 1 (NAVEDTRA 14173), ch. 3, practical voltage dividers (about p. 3-105)',
    status: 'confirmed',
    note: 'numbers seen in a stored restatement; module and page from memory',
    system: {
      nodes: ['E', 'P165', 'P45', 'N'],
      conductances: resistors([
        ['R3', 'E', 'P165', 75],
        ['R2', 'P165', 'P45', 500],
        ['R1', 'P45', 'N', 1500],
      ]),
      fixed: { E: 190.5, N: 0 },
      injections: { P45: -0.21, P165: -0.1 },
    },
    volts: [
      { node: 'P45', value: 45, within: 1e-6 },
      { node: 'P165', value: 165, within: 1e-6 },
    ],
    amps: [
      { part: 'R1', value: 0.03, within: 1e-8 },
      { part: 'R2', value: 0.24, within: 1e-8 },
      { part: 'R3', value: 0.34, within: 1e-8 },
    ],
    implied: [
      { part: 'R3', node: 'P165', volts: 165, ohms: 75, within: 1e-3 },
      { part: 'R2', node: 'P45', volts: 45, ohms: 500, within: 1e-3 },
    ],
  },
  {
    id: 'W13',
    title: 'bleeder with a series dropper',
    source: `${MARINE}, problem 2`,
    status: 'confirmed',
    note: 'bleeder printed as 2 kΩ, 21.7 W',
    system: {
      nodes: ['E', 'P', 'N'],
      conductances: resistors([
        ['RS', 'E', 'P', 1300],
        ['RB', 'P', 'N', 2000],
      ]),
      fixed: { E: 386, N: 0 },
      injections: { P: -0.032 },
    },
    volts: [{ node: 'P', value: 210, within: 2 }],
    implied: [{ part: 'RB', node: 'P', volts: 210, ohms: 2031, within: 1 }],
  },
  {
    id: 'W14',
    title: 'bleeder with two loads',
    source: `${MARINE}, problem 4`,
    status: 'confirmed',
    note: 'printed to three figures',
    system: {
      nodes: ['E', 'P28', 'P10', 'N'],
      conductances: resistors([
        ['RS', 'E', 'P28', 205],
        ['R1', 'P28', 'P10', 175],
        ['RB', 'P10', 'N', 109],
      ]),
      fixed: { E: 55, N: 0 },
      injections: { P10: -0.011, P28: -0.029 },
    },
    volts: [
      { node: 'P10', value: 10, within: 0.05 },
      { node: 'P28', value: 28, within: 0.1 },
    ],
    amps: [{ part: 'RB', value: 0.092, within: 0.0005 }],
    watts: [
      { part: 'RB', value: 0.92, within: 0.01 },
      { part: 'R1', value: 1.85, within: 0.02 },
      { part: 'RS', value: 3.56, within: 0.02 },
    ],
  },
  {
    id: 'W15',
    title: 'bleeder with one load',
    source: `${MARINE}, problem 5`,
    status: 'confirmed',
    note: 'bleeder printed as 20 kΩ',
    system: {
      nodes: ['E', 'P', 'N'],
      conductances: resistors([
        ['RS', 'E', 'P', 855],
        ['RB', 'P', 'N', 20000],
      ]),
      fixed: { E: 525, N: 0 },
      injections: { P: -0.096 },
    },
    volts: [{ node: 'P', value: 425, within: 0.5 }],
    watts: [{ part: 'RS', value: 11.7, within: 0.1 }],
    implied: [
      { part: 'RB', node: 'P', volts: 425, ohms: 20238, within: 70 },
      { part: 'RS', node: 'P', volts: 425, ohms: 855, within: 3 },
    ],
  },
  {
    id: 'W16',
    title: 'two resistors feeding a pair',
    source: 'worked homework answer in a stored page (series-parallel DC circuit)',
    status: 'confirmed',
    note: 'its last step has a slip; the branch current is 0.24 A',
    system: {
      nodes: ['E', 'A', 'B', 'N'],
      conductances: resistors([
        ['R1', 'E', 'A', 10],
        ['R2', 'B', 'N', 10],
        ['R3', 'A', 'B', 10],
        ['R4', 'A', 'B', 10],
      ]),
      fixed: { E: 12, N: 0 },
      injections: {},
    },
    volts: [
      { node: 'A', value: 7.2, within: 1e-7 },
      { node: 'B', value: 4.8, within: 1e-7 },
    ],
    amps: [
      { part: 'R1', value: 0.48, within: 1e-8 },
      { part: 'R3', value: 0.24, within: 1e-8 },
    ],
  },
  {
    id: 'W23',
    title: 'balanced bridge',
    source: 'balance condition of the Wheatstone bridge',
    status: 'computed',
    system: {
      nodes: ['E', 'L', 'R', 'N'],
      conductances: resistors([
        ['R1', 'E', 'L', 100],
        ['R2', 'L', 'N', 200],
        ['R3', 'E', 'R', 150],
        ['R4', 'R', 'N', 300],
        ['RM', 'L', 'R', 50],
      ]),
      fixed: { E: 10, N: 0 },
      injections: {},
    },
    volts: [{ node: 'L', value: 6.666667, within: 1e-6 }],
    amps: [{ part: 'RM', value: 0, within: 1e-11 }],
  },
  {
    id: 'W24',
    title: 'unbalanced bridge',
    source: 'Thévenin equivalent of the bridge',
    status: 'computed',
    system: {
      nodes: ['E', 'L', 'R', 'N'],
      conductances: resistors([
        ['R1', 'E', 'L', 100],
        ['R2', 'L', 'N', 200],
        ['R3', 'E', 'R', 300],
        ['R4', 'R', 'N', 150],
        ['RM', 'L', 'R', 50],
      ]),
      fixed: { E: 10, N: 0 },
      injections: {},
    },
    volts: [],
    amps: [{ part: 'RM', value: 0.015385, within: 1e-6 }],
  },
  {
    id: 'W25',
    title: 'a meter of 1 MΩ on a divider of 1 MΩ and 1 MΩ',
    source: 'divider with the meter in parallel',
    status: 'computed',
    system: {
      nodes: ['E', 'A', 'N'],
      conductances: resistors([
        ['R1', 'E', 'A', 1e6],
        ['R2', 'A', 'N', 1e6],
        ['METER', 'A', 'N', 1e6],
      ]),
      fixed: { E: 100, N: 0 },
      injections: {},
    },
    volts: [{ node: 'A', value: 33.333, within: 0.001 }],
  },
];
