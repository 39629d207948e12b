import { buildNetlist } from './factories/netlist.factory';
import { TestApp } from './test-app';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());

const HEADER = 'ref,kind,from,to,value,tolerance,rating,make,assembly,note';

describe('circuits', () => {
  it('refuses every route to whoever is not signed in', async () => {
    await app.expectSignedOut([
      ['post', '/circuits/check'],
      ['post', '/circuits/import-csv'],
      ['post', '/circuits/solve'],
    ]);
  });

  it('names every problem of a netlist', async () => {
    const good = await app.send('trainee', 'post', '/circuits/check', { netlist: buildNetlist() });
    expect(good.body).toEqual({ problems: [] });
    const bad = await app.send('trainee', 'post', '/circuits/check', {
      netlist: buildNetlist({ reference: 'NOWHERE' }),
    });
    expect(bad.body.problems[0]).toMatchObject({
      code: 'reference-not-connected',
      nodes: ['NOWHERE'],
    });
    const wrong = await app.send('trainee', 'post', '/circuits/check', {
      netlist: {
        ...buildNetlist(),
        parts: [{ ref: 'R1', kind: 'resistor', between: ['L', 'CHASSIS'], ohms: -5 }],
      },
    });
    expect(wrong.body.problems[0]).toMatchObject({
      code: 'bad-value',
      part: 'R1',
      path: '/parts/0/ohms',
    });
    expect((await app.send('trainee', 'post', '/circuits/check', { netlist: 'text' })).status).toBe(
      400,
    );
  });

  it('imports CSV whole or not at all, with line and column', async () => {
    const csv = `${HEADER}\nR1,resistor,L,A,300,10%,10W,wirewound,,\nV1,heater,A,CHASSIS,35V 150mA,,,,,\n`;
    const line = { hot: 'L', return: 'CHASSIS', volts: 117, hertz: 60 };
    const good = await app.send('trainee', 'post', '/circuits/import-csv', {
      csv,
      title: 'From CSV',
      reference: 'CHASSIS',
      line,
    });
    expect(good.body.problems).toEqual([]);
    expect(good.body.netlist.parts[1]).toEqual({
      ref: 'V1',
      kind: 'heater',
      between: ['A', 'CHASSIS'],
      volts: 35,
      amps: 0.15,
    });
    const bad = await app.send('trainee', 'post', '/circuits/import-csv', {
      csv: csv.replace('300', 'three'),
      title: 'x',
      reference: 'CHASSIS',
    });
    expect(bad.status).toBe(422);
    expect(bad.body.errors[0]).toMatchObject({ pointer: '/csv', line: 2, column: 'value' });
  });

  it('solves on a worker', async () => {
    const { body, status } = await app.send('trainee', 'post', '/circuits/solve', {
      netlist: buildNetlist(),
    });
    expect(status).toBe(200);
    const { V1, R1 } = body.healthy.parts;
    // 35 V at 150 mA each behind 300 Ω from 117 V: a little above rating, the same current everywhere.
    expect(V1.amps).toBeCloseTo(R1.amps, 6);
    expect(300 * R1.amps + 2 * V1.volts).toBeCloseTo(117, 3);
    const bad = await app.send('trainee', 'post', '/circuits/solve', {
      netlist: buildNetlist(),
      asFound: [{ part: 'V9', change: 'bridged' }],
    });
    expect(bad.status).toBe(422);
    expect(bad.body.errors[0].pointer).toBe('/asFound/0/part');
    expect(
      (
        await app.send('trainee', 'post', '/circuits/solve', {
          netlist: buildNetlist(),
          lineVolts: -1,
        })
      ).status,
    ).toBe(400);
  });
});
