import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { RuleRow } from '../src/rules/rule.model';
import { RulesService } from '../src/rules/rules.service';
import { TestApp } from './test-app';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());

function rule(overrides: object = {}) {
  return {
    id: 'test-rule',
    name: 'A rule',
    sentence: 'In any string, look twice.',
    about: { scope: 'case' },
    when: { all: [{ fact: 'heaterCount', operator: 'greaterThan', value: 1 }] },
    then: [{ effect: 'advice', text: 'Look twice.' }],
    because: 'It is a test.',
    ...overrides,
  };
}

describe('rules', () => {
  it('refuses every route to whoever is not signed in', async () => {
    await app.expectSignedOut([
      ['get', '/rules'],
      ['get', '/rules/surge-opens-the-string'],
    ]);
  });

  it('lists the rules that ship with the project, none refused', async () => {
    const { body } = await app.send('trainee', 'get', '/rules');
    expect(body.rules.length).toBeGreaterThanOrEqual(12);
    expect(body.refused).toEqual([]);
    const one = await app.send('trainee', 'get', '/rules/surge-opens-the-string');
    expect(one.body).toMatchObject({ version: 1, pack: 'heater-strings', effects: ['cause'] });
    expect((await app.send('trainee', 'get', '/rules/nothing')).status).toBe(404);
  });

  it('makes a changed file a new version and refuses a broken one by name', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'ohmstead-rules-'));
    mkdirSync(join(folder, 'own'));
    const put = (name: string, json: unknown) =>
      writeFileSync(join(folder, 'own', name), JSON.stringify(json));
    put('good.json', rule());
    put(
      'unknown-fact.json',
      rule({ id: 'other', when: { all: [{ fact: 'moonPhase', operator: 'equal', value: 1 }] } }),
    );
    put(
      'unknown-kind.json',
      rule({ id: 'third', about: { scope: 'each-part', kind: ['transistor'] } }),
    );
    const service = app.nest.get(RulesService);
    await service.takeFolder(folder);
    const { refused } = (await app.send('trainee', 'get', '/rules')).body;
    expect(refused.map(({ file }: { file: string }) => file)).toEqual([
      'own/unknown-fact.json',
      'own/unknown-kind.json',
    ]);
    expect(refused[0].reason).toContain('moonPhase');
    expect(refused[1].reason).toContain('transistor');
    put('good.json', rule({ because: 'It was changed.' }));
    await service.takeFolder(folder);
    await service.takeFolder(folder);
    const rows = await RuleRow.findAll({
      where: { ruleKey: 'test-rule' },
      order: [['version', 'ASC']],
    });
    expect(rows.map(({ version, state }) => [version, state])).toEqual([
      [1, 'superseded'],
      [2, 'active'],
    ]);
    rmSync(folder, { recursive: true });
  });
});
