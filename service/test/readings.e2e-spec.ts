import type { CaseDto } from '../src/cases/dto/case.dto';
import { openCase } from './factories/case.factory';
import { TestApp } from './test-app';

let app: TestApp;
let made: CaseDto;
let path: string;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());
beforeEach(async () => {
  made = await openCase(app);
  path = `/cases/${made.id}/readings`;
});

const ohms = (value: unknown, more: object = {}) => ({
  readings: [{ take: 'ohms', part: 'R1', value, ...more }],
});

describe('readings', () => {
  it('refuses every route to whoever is not signed in', async () => {
    await app.expectSignedOut([
      ['get', '/cases/1/readings'],
      ['post', '/cases/1/readings'],
      ['delete', '/cases/1/readings/1'],
      ['get', '/cases/1/readings/history?place=x'],
      ['get', '/meters'],
      ['post', '/meters'],
    ]);
  });

  it('keeps a correction beside what it corrects', async () => {
    await app.send('trainee', 'post', path, ohms(290));
    const second = await app.send('trainee', 'post', path, ohms('OL', { note: 'Second look.' }));
    expect(second.body[0]).toMatchObject({
      value: 'OL',
      takenBy: 'Test trainee',
      note: 'Second look.',
    });
    const now = await app.send('trainee', 'get', path);
    expect(now.body.map(({ value }: { value: unknown }) => value)).toEqual(['OL']);
    const all = await app.send('trainee', 'get', `${path}/history?place=ohms R1`);
    expect(
      all.body.map(({ value, isReplaced }: { value: unknown; isReplaced: boolean }) => [
        value,
        isReplaced,
      ]),
    ).toEqual([
      [290, true],
      ['OL', false],
    ]);
    expect((await app.send('trainee', 'delete', `${path}/${second.body[0].id}`)).status).toBe(204);
    expect(
      (await app.send('trainee', 'get', path)).body.map(({ value }: { value: unknown }) => value),
    ).toEqual([290]);
    expect((await app.send('trainee', 'get', `${path}?history=1`)).body).toHaveLength(2);
    expect((await app.send('trainee', 'delete', `${path}/9999`)).status).toBe(404);
  });

  it('enters a reading sent twice once', async () => {
    const body = ohms(301.5, { clientId: 'abc-1' });
    const first = await app.send('trainee', 'post', path, body);
    const again = await app.send('trainee', 'post', path, body);
    expect(again.body[0].id).toBe(first.body[0].id);
    expect((await app.send('trainee', 'get', `${path}?history=1`)).body).toHaveLength(1);
  });

  it.each([
    [ohms(-40), '/readings/0/value'],
    [{ readings: [{ take: 'ohms', part: 'R7', value: 1 }] }, '/readings/0/part'],
    [{ readings: [{ take: 'ohms', at: ['A', 'Q'], value: 1 }] }, '/readings/0/at'],
    [{ readings: [{ take: 'ac-volts', at: ['A', 'CHASSIS'], value: 5000 }] }, '/readings/0/value'],
    [{ readings: [{ take: 'ac-volts', at: ['A', 'CHASSIS'], value: 'OL' }] }, '/readings/0/value'],
    [{ readings: [{ take: 'sign', part: 'V1' }] }, '/readings/0/seen'],
  ])('refuses %j at its field', async (body, pointer) => {
    const answer = await app.send('technician', 'post', path, body);
    expect(answer.status).toBe(422);
    expect(answer.body.errors[0].pointer).toBe(pointer);
    expect((await app.send('trainee', 'get', path)).body).toEqual([]);
  });

  it('refuses what is no reading at all', async () => {
    expect((await app.send('trainee', 'post', path, { readings: [] })).status).toBe(400);
    const answer = await app.send('trainee', 'post', path, {
      readings: [{ take: 'smell', value: {}, caseId: 3 }],
    });
    expect(answer.body.errors.map(({ pointer }: { pointer: string }) => pointer)).toEqual(
      expect.arrayContaining(['/readings/0/take', '/readings/0/value', '/readings/0/caseId']),
    );
  });

  it('asks for the cautions before powered readings, never before cold ones', async () => {
    const powered = { readings: [{ take: 'ac-volts', at: ['A', 'CHASSIS'], value: 70 }] };
    expect((await app.send('trainee', 'post', path, ohms(300))).status).toBe(201);
    const refused = await app.send('trainee', 'post', path, powered);
    expect(refused.status).toBe(409);
    expect(refused.body.code).toBe('cautions-not-acknowledged');
    const read = await app.send('trainee', 'post', `/cases/${made.id}/cautions`);
    expect(read.body.cautionAcknowledged).toBe(true);
    expect((await app.send('trainee', 'post', path, powered)).status).toBe(201);
    // Each person reads them for themselves.
    expect((await app.send('senior', 'post', path, powered)).status).toBe(409);
  });

  it('takes none into a closed case', async () => {
    await app.send('technician', 'post', `/cases/${made.id}/close`, {
      outcome: 'no-fault',
      confirmedFaults: [],
    });
    expect((await app.send('technician', 'post', path, ohms(300))).status).toBe(403);
  });

  it('remembers each person’s meters and uses them', async () => {
    const bad = await app.send('trainee', 'post', '/meters', {
      name: 'Old movement',
      ohmsPerVolt: 1000,
    });
    expect(bad.body.errors[0].pointer).toBe('/fullScale');
    const meter = await app.send('trainee', 'post', '/meters', {
      name: 'Old movement',
      ohmsPerVolt: 1000,
      fullScale: 150,
      ofFullScale: 0.03,
    });
    expect(meter.status).toBe(201);
    expect((await app.send('senior', 'get', '/meters')).body).toEqual([]);
    const entered = await app.send('trainee', 'post', path, ohms(300, { meterId: meter.body.id }));
    expect(entered.body[0].meter).toMatchObject({ ohmsPerVolt: 1000 });
    const stolen = await app.send('senior', 'post', path, ohms(300, { meterId: meter.body.id }));
    expect(stolen.body.errors[0].pointer).toBe('/readings/0/meterId');
  });
});
