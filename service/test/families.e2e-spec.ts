import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readNetlistFiles } from '../src/families/netlist-files';
import { buildNetlist } from './factories/netlist.factory';
import { TestApp } from './test-app';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());

const family = (overrides: object = {}) => ({
  name: 'Test family',
  kind: 'radio',
  tags: ['150 mA'],
  netlist: buildNetlist(),
  ...overrides,
});

describe('families', () => {
  it('refuses every route to whoever is not signed in', async () => {
    await app.expectSignedOut([
      ['get', '/families'],
      ['post', '/families'],
      ['get', '/families/1'],
      ['post', '/families/1/versions'],
    ]);
  });

  it('holds the circuits that ship with the project', async () => {
    const { body } = await app.send('trainee', 'get', '/families?search=console 450');
    expect(body).toHaveLength(1);
    expect(body[0].tubes).toContain('17DQ6A');
    const one = await app.send('trainee', 'get', `/families/${body[0].id}`);
    expect(one.body).toMatchObject({
      version: 1,
      abilities: { write: false },
      solved: { cases: 0, faults: [] },
    });
  });

  it.each(['trainee', 'technician'] as const)('lets a %s read but not write', async (role) => {
    expect((await app.send(role, 'post', '/families', family())).status).toBe(403);
    expect(
      (
        await app.send(role, 'post', '/families/1/versions', {
          netlist: buildNetlist(),
          note: 'x',
          basedOn: 1,
        })
      ).status,
    ).toBe(403);
  });

  it('refuses a circuit that cannot be solved, at the part', async () => {
    const netlist = buildNetlist();
    netlist.parts.push({ ref: 'R9', kind: 'resistor', between: ['X', 'Y'], ohms: 10 });
    const answer = await app.send('senior', 'post', '/families', family({ netlist }));
    expect(answer.status).toBe(422);
    expect(answer.body.errors[0].code).toBe('no-path-to-reference');
    const bad = await app.send('senior', 'post', '/families', family({ netlist: { ohmstead: 1 } }));
    expect(bad.body.code).toBe('netlist-refused');
    expect((await app.send('senior', 'post', '/families', family({ kind: 'boat' }))).status).toBe(
      400,
    );
  });

  it('keeps versions, and tells the second of two who changed the same one', async () => {
    const made = await app.send('senior', 'post', '/families', family());
    expect(made.status).toBe(201);
    const path = `/families/${made.body.id}/versions`;
    const second = await app.send('senior', 'post', path, {
      netlist: buildNetlist({ title: 'Second' }),
      note: 'Measured anew.',
      basedOn: 1,
    });
    expect(second.body).toMatchObject({
      version: 2,
      versions: [{ version: 2, by: 'Test senior', note: 'Measured anew.' }, { version: 1 }],
    });
    const late = await app.send('owner', 'post', path, {
      netlist: buildNetlist(),
      note: 'Late.',
      basedOn: 1,
    });
    expect(late.status).toBe(409);
    expect(late.body.code).toBe('stale-version');
    expect((await app.send('senior', 'get', '/families/9999')).status).toBe(404);
  });
});

describe('netlist files', () => {
  it('refuses a broken file by name and takes the others', () => {
    const folder = mkdtempSync(join(tmpdir(), 'ohmstead-netlists-'));
    writeFileSync(join(folder, 'families.json'), '{}');
    writeFileSync(join(folder, 'good.json'), JSON.stringify(buildNetlist()));
    writeFileSync(join(folder, 'not-json.json'), '{"ohmstead": 1,');
    writeFileSync(
      join(folder, 'two-of-one-name.json'),
      JSON.stringify(buildNetlist({ parts: [...buildNetlist().parts, buildNetlist().parts[0]] })),
    );
    const { files, refused } = readNetlistFiles(folder);
    expect(files.map(({ slug }) => slug)).toEqual(['good']);
    expect(refused.map(({ file }) => file)).toEqual(['not-json.json', 'two-of-one-name.json']);
    expect(refused[1].reason).toContain('R1');
    rmSync(folder, { recursive: true });
  });
});
