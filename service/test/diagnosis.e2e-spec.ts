import { openCase } from './factories/case.factory';
import { TestApp } from './test-app';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());

describe('diagnosis', () => {
  it('refuses every route to whoever is not signed in', async () => {
    await app.expectSignedOut([
      ['post', '/cases/1/diagnosis'],
      ['get', '/cases/1/diagnosis'],
      ['get', '/cases/1/compare'],
      ['get', '/cases/1/working'],
      ['post', '/cases/1/working/closed-form'],
    ]);
  });

  it('names the open part, keeps what it used, and gives the same answer for the same inputs', async () => {
    const made = await openCase(app);
    const path = `/cases/${made.id}`;
    expect((await app.send('trainee', 'get', `${path}/diagnosis`)).status).toBe(404);
    const readings = await app.send('trainee', 'post', `${path}/readings`, {
      readings: [
        { take: 'ohms', part: 'V1', value: 'OL' },
        { take: 'ohms', part: 'V2', value: 38.4 },
        { take: 'ohms', part: 'R1', value: 301 },
      ],
    });
    const first = await app.send('trainee', 'post', `${path}/diagnosis`, {});
    expect(first.status).toBe(200);
    expect(first.body.result.suspects[0]).toMatchObject({ title: 'V1 open', group: 1 });
    expect(first.body.readingIds).toEqual(readings.body.map(({ id }: { id: number }) => id));
    expect(first.body.result.nextReadings.length).toBeGreaterThanOrEqual(5);
    const again = await app.send('senior', 'post', `${path}/diagnosis`, {});
    expect(again.body.id).toBe(first.body.id);
    await app.send('trainee', 'post', `${path}/readings`, {
      readings: [{ take: 'ohms', part: 'V1', value: 39 }],
    });
    const changed = await app.send('trainee', 'post', `${path}/diagnosis`, {});
    expect(changed.body.id).not.toBe(first.body.id);
    expect(changed.body.result.suspects[0].faults).toEqual([]);
    expect((await app.send('trainee', 'get', `${path}/diagnosis`)).body.id).toBe(changed.body.id);
  });

  it('compares, shows the working and the implied value', async () => {
    const made = await openCase(app);
    const path = `/cases/${made.id}`;
    await app.send('trainee', 'post', `${path}/readings`, {
      readings: [{ take: 'ohms', at: ['A', 'CHASSIS'], value: 120 }],
    });
    const compare = await app.send('trainee', 'get', `${path}/compare`);
    const point = compare.body.points.find(({ key }: { key: string }) => key === 'ohms A CHASSIS');
    // Two heaters of 35 V at 150 mA, a sixth of their hot resistance when cold.
    expect(point.value).toBeCloseTo((2 * 35) / 0.15 / 6, 3);
    expect(point.deviations).toBeGreaterThan(1);
    const working = await app.send('trainee', 'get', `${path}/working`);
    expect(working.body).toMatchObject({ agreesWithSolver: true });
    expect(working.body.equations).toHaveLength(2);
    const form = await app.send('trainee', 'post', `${path}/working/closed-form`, {
      part: 'V1',
      take: 'ohms',
      at: ['A', 'CHASSIS'],
    });
    // 120 Ω read less the other heater's 38.9 Ω.
    expect(form.body.impliedValue).toBeCloseTo(120 - 35 / 0.15 / 6, 2);
    const none = await app.send('trainee', 'post', `${path}/working/closed-form`, {
      part: 'V1',
      take: 'ohms',
      readingPart: 'R1',
    });
    expect(none.body.errors[0].pointer).toBe('/take');
    const lost = await app.send('trainee', 'post', `${path}/working/closed-form`, {
      part: 'V9',
      take: 'ohms',
      at: ['A', 'CHASSIS'],
    });
    expect(lost.body.errors[0].pointer).toBe('/part');
    expect(
      (
        await app.send('trainee', 'post', `${path}/working/closed-form`, {
          part: 'V1',
          take: 'guess',
        })
      ).status,
    ).toBe(400);
    expect((await app.send('trainee', 'get', '/cases/999/working')).status).toBe(404);
  });
});
