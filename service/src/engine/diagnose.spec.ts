import { diagnose } from './diagnose';
import type { DiagnosisResult } from './diagnosis-types';
import type { Netlist, Reading } from './netlist/types';
import { consoleString } from './testing/circuits';

const at = (node: string, value: number): Reading => ({ take: 'ac-volts', at: [node, 'N'], value });
const ohms = (part: string, value: number | 'OL'): Reading => ({ take: 'ohms', part, value });
const run = (readings: Reading[], netlist: Netlist = consoleString(), more: object = {}) =>
  diagnose({ netlist, readings, conditions: { lineVolts: 117 }, ...more });
const key = ({ faults }: DiagnosisResult['suspects'][number]) =>
  faults
    .map(({ part, mode }) => `${part}:${mode}`)
    .sort()
    .join('|');

/** V2 open, as a meter of 10 MΩ would find it. */
const OPEN_HEATER: Reading[] = [
  at('C', 117.1),
  at('E', 116.8),
  at('F', 0),
  ohms('V2', 'OL'),
  ohms('V1', 13.9),
];

describe('laws of a ranking', () => {
  it('shares out a probability of one', async () => {
    const { suspects, unscored, parts } = await run(OPEN_HEATER);
    const told = suspects.reduce((sum, { probability }) => sum + probability, 0);
    expect(told).toBeLessThanOrEqual(1 + 1e-9);
    expect(told + unscored).toBeGreaterThan(0.97);
    parts.forEach(({ probability }) => expect(probability).toBeLessThanOrEqual(1));
    suspects.reduce((last, { probability }) => {
      expect(probability).toBeLessThanOrEqual(last);
      return probability;
    }, 1);
  });

  it('does not depend on the order of parts or of readings', async () => {
    const netlist = consoleString();
    const one = await run(OPEN_HEATER, netlist);
    const other = await run([...OPEN_HEATER].reverse(), {
      ...netlist,
      parts: [...netlist.parts].reverse(),
    });
    const top = (result: DiagnosisResult) =>
      new Map(result.suspects.slice(0, 5).map((suspect) => [key(suspect), suspect.probability]));
    for (const [name, probability] of top(one))
      expect(top(other).get(name)).toBeCloseTo(probability, 4);
  });

  it('gives the same answer twice', async () => {
    expect(await run(OPEN_HEATER)).toEqual(await run(OPEN_HEATER));
  });
});

describe('what it finds', () => {
  it('an open heater, by voltage and by ohms', async () => {
    const result = await run(OPEN_HEATER);
    expect(key(result.suspects[0])).toBe('V2:open');
    expect(result.parts[0].part).toBe('V2');
    expect(result.suspects[0].probability).toBeGreaterThan(0.7);
    expect(result.suspects[0].reasons.join(' ')).toContain('V2');
  });

  it('nothing wrong in a healthy set, and says what was not tested', async () => {
    const healthy = await run([]);
    const value = (node: string) => healthy.healthy.nodes[node].acVolts!;
    const result = await run([at('C', value('C')), at('E', value('E')), at('F', value('F'))]);
    expect(result.suspects[0].faults).toEqual([]);
    expect(result.expected[0].deviations).toBeCloseTo(0, 2);
  });

  it('never ranks a fault that no reading shows above “nothing is wrong”', async () => {
    const result = await run([at('L', 117)]);
    expect(result.suspects[0].faults).toEqual([]);
    expect(result.suspects.filter(({ group }) => group === 1).length).toBeGreaterThan(5);
  });

  it('a drifted section with the value it has', async () => {
    // R1A of 68 Ω reads 131 Ω across itself in circuit, cold: about twice its value.
    const result = await run([ohms('R1A', 131), ohms('R1B', 3.7), ohms('V1', 13.8)]);
    expect(key(result.suspects[0])).toBe('R1A:high');
    const [fault] = result.suspects[0].faults;
    expect(fault.valueUnit).toBe('factor');
    expect(fault.interval![0]).toBeLessThan(131 / 68);
    expect(fault.interval![1]).toBeGreaterThan(131 / 68);
    expect(fault.value! * 68).toBeGreaterThan(110);
    expect(fault.value! * 68).toBeLessThan(155);
  });

  it('a heater of another rating, with the types that have it', async () => {
    const tubes = [
      { type: '12L6GT', volts: 12.6, amps: 0.6 },
      { type: '25L6GT', volts: 25, amps: 0.3 },
      { type: '50C5', volts: 50, amps: 0.15 },
    ];
    // A 50 V, 150 mA heater has 55.6 Ω cold where 13.9 Ω belong.
    const result = await run([ohms('V1', 55), ohms('V2', 13.8), ohms('V3', 14)], consoleString(), {
      knowledge: { tubes },
    });
    expect(key(result.suspects[0])).toBe('V1:wrong-type');
    expect(result.suspects[0].faults[0].types).toEqual(['50C5']);
  });

  it('two faults that only make sense together', async () => {
    const result = await run([
      at('C', 116.9),
      at('D', 0),
      ohms('R1B', 'OL'),
      ohms('DS1', 'OL'),
      ohms('R1A', 68.4),
    ]);
    expect(key(result.suspects[0])).toBe('DS1:open|R1B:open');
  });
});

describe('doubt', () => {
  it('asks for a reading again that no good suspect would show', async () => {
    const result = await run([
      ...OPEN_HEATER,
      ohms('V3', 13.9),
      ohms('R1A', 68.2),
      ohms('RK2', 18),
    ]);
    expect(result.suspects.slice(0, 3).some((suspect) => key(suspect).includes('V2:open'))).toBe(
      true,
    );
    const low = result.suspects.find((suspect) => key(suspect) === 'V2:open');
    expect(low!.evidence.find(({ reading }) => reading === 7)!.slip).toBe(true);
  });

  it('leaves out as a suspect what is certain', async () => {
    const result = await run(OPEN_HEATER, consoleString(), {
      asFound: [{ part: 'R1B', change: 'bridged' }],
    });
    expect(result.suspects.every((suspect) => !key(suspect).includes('R1B'))).toBe(true);
  });

  it('lets the family’s solved cases move the odds', async () => {
    const dark = [at('C', 117), at('F', 0)];
    const before = await run(dark);
    const solved = { cases: 30, faults: [{ part: 'V2', mode: 'open' as const, count: 25 }] };
    const after = await run(dark, consoleString(), { knowledge: { solved } });
    const chance = (result: DiagnosisResult) =>
      result.parts.find(({ part }) => part === 'V2')!.probability;
    expect(chance(after)).toBeGreaterThan(2 * chance(before));
    expect(after.parts[0].part).toBe('V2');
  });

  it('suggests at least five next readings, each with a gain, a time and a reason', async () => {
    const { nextReadings } = await run([at('C', 117), at('F', 0)]);
    expect(nextReadings.length).toBeGreaterThanOrEqual(5);
    for (const { bits, minutes, why, label } of nextReadings.slice(0, 5)) {
      expect(bits).toBeGreaterThan(0);
      expect(minutes).toBeGreaterThan(0);
      expect(why).toMatch(/^It tells .+ from .+\.$/);
      expect(label.length).toBeGreaterThan(4);
    }
  });
});

describe('refusals', () => {
  it('names the reading that does not fit', async () => {
    await expect(run([ohms('R99', 5)])).rejects.toMatchObject({
      code: 'reading-refused',
      problems: [{ code: 'unknown-part', path: '/readings/0/part' }],
    });
  });

  it('names the part of a circuit that cannot be solved', async () => {
    const netlist = consoleString();
    netlist.parts.push({ ref: 'R77', kind: 'resistor', between: ['P', 'Q'], ohms: 10 });
    await expect(run([], netlist)).rejects.toMatchObject({
      code: 'netlist-refused',
      problems: [{ code: 'no-path-to-reference' }],
    });
  });
});
