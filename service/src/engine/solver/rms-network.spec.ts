import { lusolve, type Matrix as MathMatrix } from 'mathjs';
import { circuitOf, consoleString, heater, seeded, series, stringOf } from '../testing/circuits';
import type { Part } from '../netlist/types';
import { solve } from '../solve';
import { healthyValues, setOpen, setShorted } from './branch-values';
import { compileCircuit } from './circuit';
import { RmsNetwork } from './rms-network';

function resistor(ref: string, a: string, b: string, ohms: number): Part {
  return { ref, kind: 'resistor', between: [a, b], ohms };
}

describe('published worked examples', () => {
  it('series circuit of 50, 75 and 100 Ω at 0.5 A needs 112.5 V (DOE-HDBK-1011/1-92, module 2, p. 27)', () => {
    const { parts } = solve({ netlist: series(112.5, [50, 75, 100]) });
    expect(parts.R1.amps).toBeCloseTo(0.5, 9);
  });

  it('120 V over 40, 60 and 100 Ω: 0.6 A and drops of 24, 36, 60 V (same handbook, pp. 27-28)', () => {
    const { parts } = solve({ netlist: series(120, [40, 60, 100]) });
    expect(parts.R1.amps).toBeCloseTo(0.6, 9);
    expect(
      [parts.R1.volts, parts.R2.volts, parts.R3.volts].map((v) => Math.round(v * 1e6) / 1e6),
    ).toEqual([24, 36, 60]);
  });

  it('8 Ω with 24 Ω across it is 6 Ω (same handbook, p. 36, fig. 28)', () => {
    const netlist = circuitOf(6, [resistor('R1', 'L', 'N', 8), resistor('R2', 'L', 'N', 24)]);
    const { parts } = solve({ netlist });
    expect(parts.R1.amps + parts.R2.amps).toBeCloseTo(1, 9);
  });

  it('120 V over 5, 10 and 15 Ω: 4 A and 80, 160, 240 W (US Army subcourse OD1633, pp. 45-46)', () => {
    const { parts } = solve({ netlist: series(120, [5, 10, 15]) });
    expect(parts.R1.watts).toBeCloseTo(80, 6);
    expect(parts.R2.watts).toBeCloseTo(160, 6);
    expect(parts.R3.watts).toBeCloseTo(240, 6);
  });

  it('divider with two loads: 500 Ω and 75 Ω drop 120 and 25.5 V (NEETS module 1, NAVEDTRA 14173, ch. 3)', () => {
    // The loads of the example as resistances: 165 V at 0.1 A and 45 V at 0.21 A; bleeder 1500 Ω.
    const netlist = circuitOf(190.5, [
      resistor('R3', 'L', 'A', 75),
      resistor('LOADA', 'A', 'N', 165 / 0.1),
      resistor('R2', 'A', 'B', 500),
      resistor('LOADB', 'B', 'N', 45 / 0.21),
      resistor('R1', 'B', 'N', 1500),
    ]);
    const { nodes, parts } = solve({ netlist });
    expect(nodes.A.acVolts).toBeCloseTo(165, 3);
    expect(nodes.B.acVolts).toBeCloseTo(45, 3);
    expect(parts.R3.amps).toBeCloseTo(0.34, 5);
  });

  it('bleeder of 2031 Ω behind 1300 Ω holds 210 V at 32 mA and takes 21.7 W (Marine Institute E1100, assignment 5, problem 2)', () => {
    const netlist = circuitOf(386, [
      resistor('RS', 'L', 'A', 1300),
      resistor('RB', 'A', 'N', 2031),
      resistor('LOAD', 'A', 'N', 210 / 0.032),
    ]);
    const { nodes, parts } = solve({ netlist });
    expect(nodes.A.acVolts).toBeCloseTo(210, 1);
    expect(parts.RB.watts).toBeCloseTo(21.7, 1);
  });

  it('bleeder with two loads (Marine Institute E1100, assignment 5, problem 4)', () => {
    const netlist = circuitOf(55, [
      resistor('RS', 'L', 'A', 205),
      resistor('LOADA', 'A', 'N', 28 / 0.029),
      resistor('R1', 'A', 'B', 175),
      resistor('LOADB', 'B', 'N', 10 / 0.011),
      resistor('RB', 'B', 'N', 109),
    ]);
    const { nodes, parts } = solve({ netlist });
    // The book rounds its resistors to whole ohms, so its volts hold to half a per cent.
    expect(Math.abs(nodes.A.acVolts! / 28 - 1)).toBeLessThan(0.005);
    expect(Math.abs(nodes.B.acVolts! / 10 - 1)).toBeLessThan(0.005);
    expect(parts.RS.watts).toBeCloseTo(3.56, 1);
  });

  it('425 V at 96 mA behind 855 Ω with a 20 238 Ω bleeder from 525 V (same, problem 5)', () => {
    const netlist = circuitOf(525, [
      resistor('RS', 'L', 'A', 855),
      resistor('RB', 'A', 'N', 20238),
      resistor('LOAD', 'A', 'N', 425 / 0.096),
    ]);
    const { nodes, parts } = solve({ netlist });
    expect(nodes.A.acVolts).toBeCloseTo(425, 0);
    expect(parts.RB.watts).toBeCloseTo(8.9, 1);
    expect(parts.RS.watts).toBeCloseTo(11.7, 1);
  });

  it('a balanced bridge carries nothing across (balance condition, Wheatstone)', () => {
    const netlist = circuitOf(10, [
      resistor('R1', 'L', 'A', 100),
      resistor('R2', 'A', 'N', 200),
      resistor('R3', 'L', 'B', 150),
      resistor('R4', 'B', 'N', 300),
      resistor('R5', 'A', 'B', 50),
    ]);
    expect(solve({ netlist }).parts.R5.amps).toBeLessThan(1e-9);
  });
});

describe('a line with a source resistance', () => {
  it('loses its share on the way in (100 V behind 10 Ω into 90 Ω: 90 V at 1 A, Ohm’s law)', () => {
    const netlist = circuitOf(100, [resistor('R1', 'L', 'N', 90)], {
      line: { hot: 'L', return: 'N', volts: 100, hertz: 60, ohms: 10 },
    });
    const { nodes, parts } = solve({ netlist });
    expect(nodes.L.acVolts).toBeCloseTo(90, 6);
    expect(parts.R1.amps).toBeCloseTo(1, 8);
    expect(Object.keys(parts)).toEqual(['R1']);
    expect(Object.keys(nodes).sort()).toEqual(['L', 'N']);
  });
});

describe('heater strings', () => {
  it('runs every heater at its rating when the ratings add up to the line (tube manual ratings)', () => {
    // 35 + 50 + 3 × 12.6 V at 150 mA: 122.8 V, the common five-tube string.
    const netlist = stringOf(122.8, [
      heater('V5', 35, 0.15),
      heater('V4', 50, 0.15),
      heater('V1', 12.6, 0.15),
      heater('V2', 12.6, 0.15),
      heater('V3', 12.6, 0.15),
    ]);
    const { parts } = solve({ netlist });
    expect(parts.V4.volts).toBeCloseTo(50, 5);
    expect(parts.V4.amps).toBeCloseTo(0.15, 8);
  });

  it('needs 61.3 Ω and 1.38 W to drop 9.2 V at 150 mA (Ohm’s law, worked by hand)', () => {
    const netlist = stringOf(117, [
      { ref: 'R1', kind: 'resistor', between: ['', ''], ohms: 9.2 / 0.15 },
      ...[12.6, 12.6, 12.6, 35, 35].map((volts, i) => heater(`V${i}`, volts, 0.15)),
    ]);
    const { parts } = solve({ netlist });
    expect(parts.R1.watts).toBeCloseTo(1.38, 4);
    expect(parts.R1.amps).toBeCloseTo(0.15, 7);
  });

  it('follows I = I₀(V/V₀)^0.6 below rating (exponent 0.57 to 0.70 published)', () => {
    const netlist = stringOf(25.2, [heater('V1', 12.6, 0.3), heater('V2', 25.2, 0.3)]);
    const { parts } = solve({ netlist });
    expect(parts.V1.amps).toBeCloseTo(0.3 * (parts.V1.volts / 12.6) ** 0.6, 8);
    expect(parts.V2.volts / parts.V1.volts).toBeCloseTo(2, 8);
  });

  it('settles with every part open and with every part shorted, and currents balance at every node', () => {
    const circuit = compileCircuit(consoleString());
    const rms = new RmsNetwork(circuit);
    for (const spoil of [setOpen, setShorted]) {
      circuit.parts.forEach((_, k) => {
        const values = healthyValues(circuit);
        spoil(values, k);
        expect(rms.solve(values)).toBe(true);
        circuit.nodes.forEach((_, index) => {
          if (index === circuit.hot || index === circuit.return) return;
          let sum = 0;
          circuit.branches.forEach(({ a, b }, branch) => {
            if (a === index) sum += rms.amps[branch];
            if (b === index) sum -= rms.amps[branch];
          });
          expect(Math.abs(sum)).toBeLessThan(1e-7);
        });
      });
    }
  });

  it('gives the same answer whatever the order of the parts', () => {
    const netlist = consoleString();
    const turned = { ...netlist, parts: [...netlist.parts].reverse() };
    const x = solve({ netlist });
    const y = solve({ netlist: turned });
    for (const node of Object.keys(x.nodes)) {
      expect(y.nodes[node].acVolts).toBeCloseTo(x.nodes[node].acVolts!, 6);
    }
  });

  it('settles a thermistor across its knee without swinging', () => {
    for (let volts = 5; volts <= 240; volts += 5) {
      const circuit = compileCircuit(consoleString(), volts);
      const rms = new RmsNetwork(circuit);
      expect(rms.solve(healthyValues(circuit))).toBe(true);
      expect(rms.steps).toBeLessThan(40);
    }
  });
});

describe('against mathjs', () => {
  it('solves random resistor networks as lusolve does on the same nodal matrix', () => {
    const random = seeded(11);
    for (let trial = 0; trial < 10; trial += 1) {
      const n = 4 + Math.floor(random() * 8);
      const name = (i: number) => (i === 0 ? 'L' : i === n ? 'N' : `X${i}`);
      const parts: Part[] = [];
      for (let i = 0; i < n; i += 1)
        parts.push(resistor(`S${i}`, name(i), name(i + 1), 10 + 1000 * random()));
      for (let i = 0; i < n; i += 1) {
        const a = Math.floor(random() * (n + 1));
        const b = Math.floor(random() * (n + 1));
        if (a !== b) parts.push(resistor(`P${i}`, name(a), name(b), 10 + 1000 * random()));
      }
      const volts = 100;
      const inner = Array.from({ length: n - 1 }, (_, i) => `X${i + 1}`);
      const row = new Map(inner.map((node, i) => [node, i]));
      const matrix = inner.map(() => inner.map(() => 0));
      const right = inner.map(() => 0);
      for (const part of parts) {
        if (part.kind !== 'resistor') continue;
        const g = 1 / part.ohms;
        const [a, b] = part.between.map((node) => row.get(node));
        if (a !== undefined) matrix[a][a] += g;
        if (b !== undefined) matrix[b][b] += g;
        if (a !== undefined && b !== undefined) {
          matrix[a][b] -= g;
          matrix[b][a] -= g;
        }
        if (a !== undefined && part.between[1] === 'L') right[a] += g * volts;
        if (b !== undefined && part.between[0] === 'L') right[b] += g * volts;
      }
      const expected = lusolve(matrix, right) as unknown as MathMatrix | number[][];
      const column = (expected as number[][]).map((value) =>
        Array.isArray(value) ? value[0] : value,
      );
      const { nodes } = solve({ netlist: circuitOf(volts, parts) });
      inner.forEach((node, i) => expect(nodes[node].acVolts).toBeCloseTo(column[i], 6));
    }
  });
});
