import { NetlistError } from '../errors';
import { consoleString } from '../testing/circuits';
import { applyAsFound } from './as-found';
import type { AsFound, NetlistProblem, Part } from './types';

function partAfter(ref: string, ...asFound: AsFound[]): Part | undefined {
  return applyAsFound(consoleString(), asFound).parts.find((part) => part.ref === ref);
}

function problemsOf(...asFound: unknown[]): NetlistProblem[] {
  try {
    applyAsFound(consoleString(), asFound as AsFound[]);
  } catch (error) {
    if (error instanceof NetlistError) return error.problems;
    throw error;
  }
  return [];
}

describe('what was found', () => {
  it('changes the rating and type of a tube that was fitted', () => {
    const change: AsFound = { part: 'V2', change: 'fitted', volts: 12.6, amps: 0.3, tube: '12XX' };
    expect(partAfter('V2', change)).toMatchObject({
      kind: 'heater',
      between: ['E', 'F'],
      volts: 12.6,
      amps: 0.3,
      tube: '12XX',
      cathode: 'K2',
    });
  });

  it('changes a value', () => {
    expect(partAfter('R1A', { part: 'R1A', change: 'value', ohms: 82 })).toMatchObject({
      ohms: 82,
      assembly: 'R1',
    });
  });

  it('makes a bridged part a wire and a missing one insulation, under its own name and body', () => {
    expect(partAfter('R1B', { part: 'R1B', change: 'bridged' })).toEqual({
      ref: 'R1B',
      kind: 'joint',
      between: ['C', 'D'],
      ohms: 0.01,
      assembly: 'R1',
    });
    expect(partAfter('RT1', { part: 'RT1', change: 'missing' })).toMatchObject({ ohms: 1e9 });
  });

  it('adds a part', () => {
    const add: Part = { ref: 'W1', kind: 'joint', between: ['A', 'C'] };
    expect(partAfter('W1', { change: 'added', add })).toEqual(add);
  });

  it('leaves the family’s circuit as it is', () => {
    const netlist = consoleString();
    applyAsFound(netlist, [{ part: 'R1A', change: 'value', ohms: 82 }]);
    expect(netlist).toEqual(consoleString());
  });

  it.each<[string, unknown, NetlistProblem | object]>([
    [
      'a part that is not there',
      { part: 'V9', change: 'bridged' },
      { code: 'unknown-part', path: '/asFound/0/part', part: 'V9' },
    ],
    [
      'a field of another kind',
      { part: 'R1A', change: 'value', farads: 1e-6 },
      { code: 'unknown-field', path: '/asFound/0/farads', part: 'R1A' },
    ],
    [
      'a value of zero',
      { part: 'R1A', change: 'value', ohms: 0 },
      { code: 'bad-value', path: '/asFound/0/ohms', part: 'R1A' },
    ],
    [
      'no value at all',
      { part: 'R1A', change: 'value' },
      { code: 'nothing-changed', path: '/asFound/0', part: 'R1A' },
    ],
    [
      'another place for a part',
      { part: 'R1A', change: 'value', between: ['A', 'B'] },
      { code: 'unknown-field', path: '/asFound/0/between' },
    ],
    [
      'a thermistor with fewer ohms cold than hot',
      { part: 'RT1', change: 'value', coldOhms: 5 },
      { code: 'bad-value', path: '/asFound/0/coldOhms' },
    ],
    [
      'a change of another name',
      { part: 'R1A', change: 'vanished' },
      { code: 'unknown-change', path: '/asFound/0/change' },
    ],
    [
      'an added part of a name that is taken',
      { change: 'added', add: { ref: 'V1', kind: 'joint', between: ['A', 'B'] } },
      { code: 'duplicate-ref', path: '/asFound/0/add/ref' },
    ],
    [
      'an added part without its value',
      { change: 'added', add: { ref: 'R9', kind: 'resistor', between: ['A', 'B'] } },
      { code: 'missing-field', path: '/asFound/0/add/ohms' },
    ],
    ['an added nothing', { change: 'added' }, { code: 'bad-part', path: '/asFound/0/add' }],
    ['nothing', null, { code: 'bad-change', path: '/asFound/0' }],
  ])('refuses %s', (_what, change, expected) => {
    expect(problemsOf(change)[0]).toMatchObject(expected);
  });

  it('refuses two entries for one part', () => {
    expect(
      problemsOf({ part: 'R1A', change: 'bridged' }, { part: 'R1A', change: 'missing' }),
    ).toMatchObject([{ code: 'changed-twice', path: '/asFound/1/part' }]);
  });
});
