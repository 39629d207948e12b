import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const ROOT = fileURLToPath(new URL('../..', import.meta.url));
const SERVER = join(ROOT, 'service/dist/src/main.js');
const PAGE = join(ROOT, 'ui/dist/index.html');
/** Milliseconds until a start counts as failed; a first start fills the demo shop. */
const PATIENCE = 90_000;

/** How many roles a demo start prints a sign-in for. */
const DEMO_ROLES = 4;

/** Roles of the demo shop's people. */
export type DemoRole = 'trainee' | 'technician' | 'senior' | 'owner';

/** What somebody types to sign in. */
export interface SignIn {
  email: string;
  password: string;
}

/** A running product with a database of its own. */
export interface Shop {
  /** Where it answers, without a slash at the end. */
  url: string;
  /** The sign-ins that the start printed, one per role; empty without demo data. */
  people: Partial<Record<DemoRole, SignIn>>;
  /** Everything it printed so far. */
  log: () => string;
  stop: () => Promise<void>;
}

/**
 * Starts the built product on a free port with an empty database in a temporary folder.
 *
 * @param seed `demo` fills the database with the demo shop, `none` leaves it empty.
 * @returns the shop once it answers.
 * @throws Error when it was not built, or ends or stays silent before it is ready; the message holds its output.
 */
export async function startShop(seed: 'demo' | 'none' = 'demo'): Promise<Shop> {
  for (const built of [SERVER, PAGE]) {
    if (!existsSync(built)) throw new Error(`${built} is missing. Run "npm run build" first.`);
  }
  const folder = await mkdtemp(join(tmpdir(), 'ohmstead-e2e-'));
  const child = spawn(process.execPath, [SERVER], {
    cwd: ROOT,
    env: {
      ...process.env,
      PORT: '0',
      SEED: seed,
      DATABASE_FILE: join(folder, 'shop.sqlite'),
      UPLOAD_DIR: join(folder, 'uploads'),
      JWT_SECRET: '',
      SMTP_URL: '',
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let output = '';
  const ended = new Promise<void>((resolve) => child.once('exit', () => resolve()));
  const stop = async () => {
    child.kill('SIGTERM');
    await ended;
    await rm(folder, { recursive: true, force: true });
  };
  const ready = new Promise<string>((resolve, reject) => {
    const fail = (why: string) => reject(new Error(`The shop ${why}.\n${output}`));
    const timer = setTimeout(() => fail('did not start in time'), PATIENCE);
    const listen = (piece: Buffer) => {
      output += piece.toString();
      const url = /Ohmstead is ready at (\S+)/.exec(output)?.[1];
      // The sign-ins follow line by line, and a piece may end in the middle of them.
      const isComplete = seed === 'none' || Object.keys(signInsOf(output)).length === DEMO_ROLES;
      if (!url || !isComplete) return;
      clearTimeout(timer);
      resolve(url);
    };
    child.stdout.on('data', listen);
    child.stderr.on('data', listen);
    child.once('exit', (code) => {
      clearTimeout(timer);
      fail(`ended with ${code}`);
    });
  });
  try {
    const url = await ready;
    return { url, people: signInsOf(output), log: () => output, stop };
  } catch (error) {
    await stop();
    throw error;
  }
}

/** Reads the lines "  role  e-mail  password" of a demo start. */
function signInsOf(output: string): Shop['people'] {
  const people: Shop['people'] = {};
  const lines = output.matchAll(/^ {2}(trainee|technician|senior|owner)\s+(\S+@\S+)\s+(\S.*)\n/gm);
  for (const [, role, email, password] of lines) {
    people[role as DemoRole] = { email, password: password.trim() };
  }
  return people;
}
