/**
 * Brings the checkout into a state that can run: installs what the lock file names and builds what
 * has changed since the last time. Plain Node, since nothing is installed yet when it first runs.
 *
 * `node service/scripts/prepare.mjs --build [service|ui] [--quiet]`
 */
import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');
const args = process.argv.slice(2);
const isQuiet = args.includes('--quiet');
const only = args.find((arg) => arg === 'service' || arg === 'ui');
const SKIP = new Set(['node_modules', 'dist', 'data', 'coverage', 'output', 'cases', 'REPORT.md']);

function say(text) {
  if (!isQuiet) process.stderr.write(`${text}\n`);
}

function hashOf(paths) {
  const hash = createHash('sha256');
  const add = (path) => {
    if (!existsSync(path)) return;
    if (statSync(path).isDirectory()) {
      for (const name of readdirSync(path).sort()) if (!SKIP.has(name)) add(join(path, name));
      return;
    }
    hash.update(relative(root, path)).update('\0').update(readFileSync(path)).update('\0');
  };
  paths.forEach((path) => add(join(root, path)));
  return hash.digest('hex');
}

/** Runs `work` unless the stamp says that the same inputs went through it before. */
function whenChanged(name, inputs, output, work) {
  const stamp = join(root, 'node_modules', `.ohmstead-${name}`);
  const hash = hashOf(inputs);
  const isCurrent =
    existsSync(stamp) && readFileSync(stamp, 'utf8') === hash && existsSync(join(root, output));
  if (isCurrent) return;
  work();
  mkdirSync(dirname(stamp), { recursive: true });
  writeFileSync(stamp, hash);
}

function npm(...words) {
  const command = process.platform === 'win32' ? 'npm.cmd' : 'npm';
  // The child's chatter goes to stderr, so that a command's own output stays clean for pipes.
  execFileSync(command, words, {
    cwd: root,
    stdio: ['ignore', isQuiet ? 'ignore' : 2, 2],
    shell: process.platform === 'win32',
  });
}

const major = Number(process.versions.node.split('.')[0]);
if (major < 20) {
  process.stderr.write(`Ohmstead needs Node 20 or newer; this is ${process.version}.\n`);
  process.exit(1);
}

whenChanged('install', ['package-lock.json', '.npmrc'], 'node_modules', () => {
  say('Installing packages. The first time takes some minutes: the database driver is compiled.');
  npm('ci', '--include=dev', '--no-audit', '--no-fund');
});
if (args.includes('--build')) {
  if (only !== 'ui') {
    whenChanged(
      'service',
      [
        'service/src',
        'service/bench',
        'service/package.json',
        'service/tsconfig.build.json',
        'service/tsconfig.json',
        'tsconfig.json',
        'package-lock.json',
      ],
      'service/dist/src',
      () => {
        say('Building the service.');
        npm('run', '--silent', 'build', '-w', 'service');
      },
    );
  }
  if (only !== 'service') {
    whenChanged(
      'ui',
      [
        'ui/src',
        'ui/public',
        'ui/index.html',
        'ui/vite.config.ts',
        'ui/package.json',
        'service/src/engine/units.ts',
        'service/src/engine/netlist',
        'package-lock.json',
      ],
      'ui/dist/index.html',
      () => {
        say('Building the ui.');
        npm('run', '--silent', 'build', '-w', 'ui');
      },
    );
  }
}
