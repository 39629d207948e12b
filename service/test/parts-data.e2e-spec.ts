import { TestApp } from './test-app';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());

describe('parts data', () => {
  it('refuses every route to whoever is not signed in', async () => {
    await app.expectSignedOut([
      ['get', '/parts-data/tubes'],
      ['get', '/parts-data/lamps'],
      ['get', '/auth/me'],
    ]);
  });

  it('answers health without a sign-in', async () => {
    expect((await app.http().get('/api/health')).body).toEqual({ status: 'ok' });
    expect((await app.http().get('/api/ready')).body).toEqual({ status: 'ok' });
    expect((await app.http().get('/api/nothing-here')).body.code).toBe('not-found');
  });

  it('finds a tube by type and by rating, each with its source', async () => {
    const byType = await app.send('trainee', 'get', '/parts-data/tubes?search=12BA6');
    // RCA Receiving Tube Manual: 12.6 V, 150 mA.
    expect(byType.body).toMatchObject({
      total: 1,
      items: [{ type: '12BA6', volts: 12.6, amps: 0.15, status: 'from memory' }],
    });
    expect(byType.body.items[0].source).toContain('RCA Receiving Tube Manual');
    const byRating = await app.send(
      'trainee',
      'get',
      '/parts-data/tubes?volts=50&amps=0.15&limit=2',
    );
    expect(byRating.body.total).toBeGreaterThan(2);
    expect(byRating.body.items).toHaveLength(2);
    const lamps = await app.send('trainee', 'get', '/parts-data/lamps?search=47');
    expect(lamps.body.items[0]).toMatchObject({ type: '47', volts: 6.3, amps: 0.15 });
  });

  it('refuses a query that makes no sense, at its field', async () => {
    const answer = await app.send('trainee', 'get', '/parts-data/tubes?volts=-3&limit=900&order=x');
    expect(answer.status).toBe(400);
    expect(answer.body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      '/limit',
      '/order',
      '/volts',
    ]);
  });
});
