import { join } from 'node:path';
import { shippedKnowledge } from '../src/cli/knowledge';
import { readCases } from './cases';
import { judge, type Outcome, type Scores, scoresOf } from './scores';

/** Folder of the project's own cases, seen from the built file. */
const OWN = join(__dirname, '..', '..', 'bench', 'cases');

function percent(value: number): string {
  return Number.isNaN(value) ? '–' : `${(100 * value).toFixed(1)} %`;
}

function row(name: string, scores: Scores): string[] {
  return [
    name,
    String(scores.cases),
    percent(scores.partFirst),
    percent(scores.setFirst),
    percent(scores.setInThree),
    scores.logLoss.toFixed(3),
    percent(scores.healthy),
    percent(scores.stepRight),
    Number.isNaN(scores.stepReadings) ? '–' : scores.stepReadings.toFixed(1),
    scores.msMean.toFixed(0),
    scores.msMost.toFixed(0),
    String(scores.errors),
  ];
}

const HEADS = [
  'circuit',
  'cases',
  'part first',
  'set first',
  'in three',
  'log loss',
  'healthy',
  'step right',
  'readings',
  'ms mean',
  'ms most',
  'errors',
];

/** The scores per circuit and in all, as a text table. */
function table(outcomes: readonly Outcome[]): string {
  const circuits = [...new Set(outcomes.map(({ circuit }) => circuit))];
  const rows = [
    HEADS,
    ...circuits.map((name) =>
      row(name, scoresOf(outcomes.filter(({ circuit }) => circuit === name))),
    ),
    row('all', scoresOf(outcomes)),
  ];
  const widths = HEADS.map((_, i) => Math.max(...rows.map((cells) => cells[i].length)));
  return rows.map((cells) => cells.map((cell, i) => cell.padEnd(widths[i])).join('  ')).join('\n');
}

/** `npm run bench -- [DIR] [--misses]` */
async function main(): Promise<void> {
  const args = process.argv.slice(2);
  const folder = args.find((arg) => !arg.startsWith('--')) ?? OWN;
  const knowledge = shippedKnowledge();
  const outcomes: Outcome[] = [];
  for (const bench of readCases(folder)) outcomes.push(await judge(bench, knowledge));
  console.log(table(outcomes));
  const all = scoresOf(outcomes);
  console.log(`\nmisses with the true set in the first group: ${percent(all.missesInGroup)}`);
  console.log(`expected calibration error: ${all.calibration.toFixed(3)}`);
  if (args.includes('--misses')) {
    for (const outcome of outcomes.filter(({ rank }) => rank !== 0)) {
      const { id, kind, truth, first, rank, p, firstP, inFirstGroup, taken, error } = outcome;
      console.log(
        `${id} ${kind} true ${truth || 'healthy'} rank ${rank} p ${p.toFixed(3)}; first ${first || 'healthy'} p ${firstP.toFixed(3)}${inFirstGroup ? ' same group' : ''}${kind === 'step' ? ` after ${taken}` : ''}${error ? ` ERROR ${error}` : ''}`,
      );
    }
  }
}

void main();
