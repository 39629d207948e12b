import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { readSettings, SettingsError } from '../src/config/settings';
import { DatabaseService } from '../src/database/database.service';
import { Person } from '../src/people/person.model';
import { TestApp } from './test-app';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.start();
});
afterAll(() => app.stop());

async function pragma(name: string): Promise<unknown> {
  const rows = await app.nest
    .get(Sequelize)
    .query<Record<string, unknown>>(`PRAGMA ${name}`, { type: QueryTypes.SELECT });
  return Object.values(rows[0])[0];
}

describe('database', () => {
  it('is set up on every connection', async () => {
    expect(await pragma('journal_mode')).toBe('wal');
    expect(await pragma('foreign_keys')).toBe(1);
    expect(await pragma('busy_timeout')).toBe(5000);
  });

  it('keeps all of fifty writes that come at once', async () => {
    const database = app.nest.get(DatabaseService);
    const names = Array.from({ length: 50 }, (_, i) => `p${i}@test.example`);
    await Promise.all(
      names.map((email) =>
        database.write((transaction) =>
          Person.create({ name: 'P', email, role: 'trainee' }, { transaction }),
        ),
      ),
    );
    expect(await Person.count({ where: { email: names } })).toBe(50);
  });

  it('rolls everything back when a job fails, and goes on', async () => {
    const database = app.nest.get(DatabaseService);
    const failing = database.write(async (transaction) => {
      await Person.create(
        { name: 'P', email: 'half@test.example', role: 'trainee' },
        { transaction },
      );
      throw new Error('half way');
    });
    await expect(failing).rejects.toThrow('half way');
    expect(await Person.count({ where: { email: 'half@test.example' } })).toBe(0);
    await expect(database.write(async () => 'next')).resolves.toBe('next');
  });
});

describe('settings', () => {
  it('have defaults that start', () => {
    const settings = readSettings({ JWT_SECRET: 'x'.repeat(40) });
    expect(settings).toMatchObject({ port: 3000, seed: 'demo', smtpUrl: null });
    expect(settings.databaseFile).toMatch(/service\/data\/ohmstead\.sqlite$/);
  });

  it('name everything that is wrong at once', () => {
    try {
      readSettings({ PORT: 'eighty', SEED: 'lots', SMTP_URL: 'mail', JWT_SECRET: 'short' });
      throw new Error('It should have been refused.');
    } catch (error) {
      expect(error).toBeInstanceOf(SettingsError);
      expect((error as SettingsError).problems.map((text) => text.split(' ')[0])).toEqual([
        'PORT',
        'SEED',
        'SMTP_URL',
        'JWT_SECRET',
      ]);
    }
  });
});
