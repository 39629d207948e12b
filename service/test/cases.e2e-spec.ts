import {
  canCloseCase,
  canEditCase,
  canReadCases,
  canRecord,
  canReopenCase,
} from '../src/cases/case.policy';
import { ROLES } from '../src/common/policy';
import { openCase } from './factories/case.factory';
import { buildNetlist } from './factories/netlist.factory';
import { TestApp } from './test-app';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());

describe('policies', () => {
  it.each(ROLES)('say what a %s may do with a case', (role) => {
    const actor = { id: 1, role, isBlocked: false };
    const open = { state: 'on-the-bench' as const };
    const closed = { state: 'closed' as const };
    const isTrained = role !== 'trainee';
    expect([canReadCases(actor), canEditCase(actor, open), canRecord(actor, open)]).toEqual([
      true,
      true,
      true,
    ]);
    expect([canEditCase(actor, closed), canRecord(actor, closed)]).toEqual([false, false]);
    expect([canCloseCase(actor, open), canCloseCase(actor, closed)]).toEqual([isTrained, false]);
    expect([canReopenCase(actor, closed), canReopenCase(actor, open)]).toEqual([isTrained, false]);
  });
});

describe('cases', () => {
  it('refuses every route to whoever is not signed in', async () => {
    await app.expectSignedOut([
      ['get', '/cases'],
      ['post', '/cases'],
      ['get', '/cases/1'],
      ['patch', '/cases/1'],
      ['post', '/cases/1/cautions'],
      ['post', '/cases/1/close'],
      ['post', '/cases/1/reopen'],
    ]);
  });

  it('opens a case on a family or on a netlist, and refuses neither', async () => {
    const families = await app.send('trainee', 'get', '/families');
    const made = await app.send('trainee', 'post', '/cases', {
      set: 'A set',
      complaint: 'Dead.',
      familyId: families.body[0].id,
    });
    expect(made.status).toBe(201);
    expect(made.body).toMatchObject({
      familyVersion: 1,
      state: 'on-the-bench',
      abilities: { edit: true, close: false },
    });
    expect(made.body.number).toMatch(/^\d{4}-0001$/);
    const own = await openCase(app);
    expect(own.number).toMatch(/-0002$/);
    const none = await app.send('trainee', 'post', '/cases', { set: 'A set', complaint: 'Dead.' });
    expect(none.body.errors[0].pointer).toBe('/familyId');
    const empty = await app.send('trainee', 'post', '/cases', {
      set: '',
      complaint: '',
      lineVolts: 5,
    });
    expect(empty.body.errors.map(({ pointer }: { pointer: string }) => pointer)).toEqual([
      '/set',
      '/complaint',
      '/lineVolts',
    ]);
  });

  it('lists by state and by words', async () => {
    await openCase(app, { set: 'Blue amplifier' });
    const { body } = await app.send('technician', 'get', '/cases?search=blue ampl');
    expect(body).toHaveLength(1);
    expect((await app.send('technician', 'get', '/cases?state=closed')).body).toEqual([]);
    expect((await app.send('senior', 'get', '/cases?mine=1')).body).toEqual([]);
  });

  it('keeps what was found when it fits, and names the part when it does not', async () => {
    const made = await openCase(app);
    const path = `/cases/${made.id}`;
    const good = await app.send('trainee', 'patch', path, {
      version: 1,
      asFound: [{ part: 'R1', change: 'bridged' }],
      lineVolts: 115,
    });
    expect(good.body).toMatchObject({
      version: 2,
      lineVolts: 115,
      asFound: [{ part: 'R1', change: 'bridged' }],
    });
    const bad = await app.send('trainee', 'patch', path, {
      version: 2,
      asFound: [{ part: 'V1', change: 'value', watts: 3 }],
    });
    expect(bad.status).toBe(422);
    expect(bad.body.errors[0].pointer).toBe('/asFound/0/watts');
    const stale = await app.send('senior', 'patch', path, { version: 1, complaint: 'Other.' });
    expect(stale.body.code).toBe('stale-version');
    expect((await app.send('trainee', 'patch', path, { version: 2, state: 'closed' })).status).toBe(
      400,
    );
    expect((await app.send('trainee', 'patch', '/cases/999', { version: 1 })).status).toBe(404);
  });

  it('is closed by a technician with faults that exist, and reopened', async () => {
    const made = await openCase(app);
    const path = `/cases/${made.id}`;
    const repaired = { outcome: 'repaired', confirmedFaults: [{ part: 'R1', mode: 'open' }] };
    expect((await app.send('trainee', 'post', `${path}/close`, repaired)).status).toBe(403);
    const none = await app.send('technician', 'post', `${path}/close`, {
      outcome: 'repaired',
      confirmedFaults: [],
    });
    expect(none.body.errors[0].pointer).toBe('/confirmedFaults');
    const odd = await app.send('technician', 'post', `${path}/close`, {
      outcome: 'repaired',
      confirmedFaults: [{ part: 'R1', mode: 'heater-cathode-leak' }],
    });
    expect(odd.body.errors[0].pointer).toBe('/confirmedFaults/0/mode');
    const silent = await app.send('technician', 'post', `${path}/close`, {
      outcome: 'not-repaired',
      confirmedFaults: [],
    });
    expect(silent.body.errors[0].pointer).toBe('/note');
    const closed = await app.send('technician', 'post', `${path}/close`, repaired);
    expect(closed.body).toMatchObject({
      state: 'closed',
      confirmedFaults: [{ part: 'R1', mode: 'open' }],
      abilities: { edit: false, reopen: true },
    });
    expect(
      (await app.send('owner', 'patch', path, { version: closed.body.version, complaint: 'x' }))
        .status,
    ).toBe(403);
    expect((await app.send('trainee', 'post', `${path}/reopen`)).status).toBe(403);
    const open = await app.send('technician', 'post', `${path}/reopen`);
    expect(open.body).toMatchObject({ state: 'on-the-bench', confirmedFaults: [] });
  });

  it('lets closed cases feed their family, and takes them back', async () => {
    const family = await app.send('senior', 'post', '/families', {
      name: 'Feeding',
      kind: 'radio',
      netlist: buildNetlist(),
    });
    const made = await openCase(app, { netlist: undefined, familyId: family.body.id });
    await app.send('technician', 'post', `/cases/${made.id}/close`, {
      outcome: 'repaired',
      confirmedFaults: [{ part: 'V1', mode: 'open' }],
    });
    const solved = async () =>
      (await app.send('trainee', 'get', `/families/${family.body.id}`)).body.solved;
    expect(await solved()).toEqual({ cases: 1, faults: [{ part: 'V1', mode: 'open', count: 1 }] });
    await app.send('technician', 'post', `/cases/${made.id}/reopen`);
    expect(await solved()).toEqual({ cases: 0, faults: [] });
  });
});
