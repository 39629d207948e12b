/** Checks every netlist and every rule that ships with the project against its JSON Schema. */
import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import Ajv2020 from 'ajv/dist/2020.js';

const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');
const read = (...path) => JSON.parse(readFileSync(join(root, ...path), 'utf8'));
const ajv = new Ajv2020({ allErrors: true, strict: false });
let refused = 0;

function check(validate, ...path) {
  let reason;
  try {
    if (validate(read(...path))) return;
    reason = ajv.errorsText(validate.errors, { dataVar: 'document' });
  } catch (error) {
    reason = error.message;
  }
  refused += 1;
  console.error(`${path.join('/')}: ${reason}`);
}

const netlist = ajv.compile(read('netlists', 'netlist.schema.json'));
const names = readdirSync(join(root, 'netlists')).filter(
  (name) => name.endsWith('.json') && name !== 'netlist.schema.json' && name !== 'families.json',
);
names.forEach((name) => check(netlist, 'netlists', name));

const rule = ajv.compile(read('rules', 'rule.schema.json'));
let rules = 0;
for (const pack of readdirSync(join(root, 'rules'), { withFileTypes: true })) {
  if (!pack.isDirectory()) continue;
  for (const name of readdirSync(join(root, 'rules', pack.name))) {
    rules += 1;
    check(rule, 'rules', pack.name, name);
  }
}
if (refused > 0) process.exit(1);
if (names.length === 0 || rules === 0) {
  console.error('There are no netlists or no rules to check.');
  process.exit(1);
}
console.log(`${names.length} netlists and ${rules} rules match their schemas.`);
