import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { CsvError } from '../errors';
import { expectRefusal, refusedFiles } from '../testing/refused';
import { CSV_HEADER, exportCsv, importCsv } from './csv';
import { readNetlist } from './read';
import type { Part } from './types';

const HEADER = `${CSV_HEADER.join(',')}\n`;

/** Rows refused; taking the file makes the test fail. */
function refusalsOf(text: string): CsvError['rows'] {
  try {
    importCsv(text);
  } catch (error) {
    if (error instanceof CsvError) return error.rows;
    throw error;
  }
  throw new Error('The file was taken.');
}

describe('parts from CSV', () => {
  it('are read by kind, with values as people write them', () => {
    const { parts } = importCsv(
      `${HEADER}R1B,resistor,B3,B4,15,10%,7W,wirewound,R1,"lug 2, lug 3"
R6,resistor,B2,P3,470k,±5 %,0.5,,,
V1,heater,C7,CHASSIS,4.2V 450mA,,,,,
RT1,thermistor,B1,B2,18Ω 160Ω 450mA,,,,,
C7A,capacitor,B1,BMINUS,50µ,,150V,electrolytic,C7,
SE1,rectifier,BMINUS,A2,,,,selenium,,
L30,choke,B1,B2,1.2 H,,38,,,
T1,winding,S1,CHASSIS,330V,,70,,,
LD1,load,B2,BMINUS,235V 160mA,,,,,
F1,fuse,L,A0,,,,,,
`,
    );
    expect(parts).toEqual([
      {
        ref: 'R1B',
        kind: 'resistor',
        between: ['B3', 'B4'],
        ohms: 15,
        tolerance: 0.1,
        watts: 7,
        make: 'wirewound',
        assembly: 'R1',
        note: 'lug 2, lug 3',
      },
      {
        ref: 'R6',
        kind: 'resistor',
        between: ['B2', 'P3'],
        ohms: 470e3,
        tolerance: 0.05,
        watts: 0.5,
      },
      { ref: 'V1', kind: 'heater', between: ['C7', 'CHASSIS'], volts: 4.2, amps: 0.45 },
      {
        ref: 'RT1',
        kind: 'thermistor',
        between: ['B1', 'B2'],
        hotOhms: 18,
        coldOhms: 160,
        amps: 0.45,
      },
      {
        ref: 'C7A',
        kind: 'capacitor',
        between: ['B1', 'BMINUS'],
        farads: 5e-5,
        volts: 150,
        make: 'electrolytic',
        assembly: 'C7',
      },
      { ref: 'SE1', kind: 'rectifier', between: ['BMINUS', 'A2'], make: 'selenium' },
      { ref: 'L30', kind: 'choke', between: ['B1', 'B2'], henries: 1.2, ohms: 38 },
      { ref: 'T1', kind: 'winding', between: ['S1', 'CHASSIS'], volts: 330, ohms: 70 },
      { ref: 'LD1', kind: 'load', between: ['B2', 'BMINUS'], volts: 235, amps: 0.16 },
      { ref: 'F1', kind: 'fuse', between: ['L', 'A0'] },
    ]);
  });

  it('may come with a byte order mark, CRLF, spaces and empty rows', () => {
    const text = `\uFEFF${HEADER} R1 , resistor , L , A , 300 ,,,,,\n,,,,,,,,,\n\n`;
    const { parts } = importCsv(text.replaceAll('\n', '\r\n'));
    expect(parts).toEqual([{ ref: 'R1', kind: 'resistor', between: ['L', 'A'], ohms: 300 }]);
  });

  it.each(refusedFiles('csv'))('are refused whole: %s', (_name, text, expected) => {
    const rows = refusalsOf(text);
    expect(rows).toHaveLength(1);
    expectRefusal(rows[0], expected);
  });

  it('are refused with every bad row', () => {
    const rows = refusalsOf(`${HEADER}R1,resistor,L,A,x,,,,,\nR2,lamb,A,B,,,,,,\n`);
    expect(rows.map(({ line, column }) => [line, column])).toEqual([
      [2, 'value'],
      [3, 'kind'],
    ]);
  });
});

describe('a circuit written as CSV', () => {
  it.each([
    'portable-receiver-150',
    'console-television-450',
    'table-receiver-half-wave',
    'television-doubler',
  ])('%s is read back with all its parts', (name) => {
    const file = join(__dirname, '..', '..', '..', '..', 'netlists', `${name}.json`);
    const netlist = readNetlist(JSON.parse(readFileSync(file, 'utf8')));
    // Columns for cathodes, type numbers and exponents there are none.
    const kept = netlist.parts.map((part) => {
      const copy = { ...part } as Record<string, unknown>;
      for (const field of ['cathode', 'tube', 'lamp', 'exponent', 'esr']) delete copy[field];
      return copy as unknown as Part;
    });
    expect(importCsv(exportCsv(netlist)).parts).toEqual(kept);
  });

  it('keeps quotes, commas and line breaks of a note', () => {
    const note = 'marked "15", found\nburnt';
    const parts: Part[] = [
      { ref: 'R1', kind: 'resistor', between: ['A', 'B'], ohms: 1.5e-3, note },
    ];
    expect(importCsv(exportCsv({ parts })).parts).toEqual(parts);
  });
});
