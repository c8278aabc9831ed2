import { writeFileSync } from 'node:fs';
import { cpus } from 'node:os';
import { parseArgs } from 'node:util';
import { measureAgainstThree } from './againstThree';
import type { BenchRow } from './BenchRow';
import { measure as measureCompile } from './compileRecipe';
import { measureLongRecipes } from './longRecipes';
import { measure as measureScriptAndPose } from './scriptAndPose';

/**
 * `npm run bench [-- --json FILE] [-- --keep]`: prints what was measured beside what is aimed at. `--json` also writes
 * the figures as data, `--keep` writes the table kept in the repository. bin/bench.mjs runs it from the project's root.
 */
const { values } = parseArgs({ options: { json: { type: 'string' }, keep: { type: 'boolean' } } });

function digits(value: number): string {
  return value >= 10 ? value.toFixed(1) : value.toPrecision(3);
}

function toTable(rows: readonly BenchRow[]): string {
  const lines = rows.map(({ name, value, goal, unit }) => {
    const isMet = value <= goal;
    return `| ${name} | ${digits(value)} ${unit} | ≤ ${goal} ${unit} | ${isMet ? 'met' : 'missed'} |`;
  });
  return ['| what | measured | aim | |', '| --- | --- | --- | --- |', ...lines].join('\n');
}

const rows = [
  ...(await measureCompile()),
  ...measureLongRecipes(),
  ...(await measureScriptAndPose()),
  ...measureAgainstThree(),
];
const table = toTable(rows);
console.log(table);
if (values.json !== undefined) {
  const data = Object.fromEntries(rows.map(({ name, value, goal, unit }) => [name, { value, goal, unit }]));
  writeFileSync(values.json, `${JSON.stringify(data, null, 2)}\n`);
}
if (values.keep) {
  const machine = `${cpus().length} cores, Node ${process.version}`;
  const head = `# What was measured last\n\nBy \`npm run bench -- --keep\` on a machine with ${machine}. Medians; ratios are taken turn by turn in one run.\n\n`;
  writeFileSync('tests/bench/RESULTS.md', `${head}${table}\n`);
}
