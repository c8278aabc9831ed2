import { parse } from 'yaml';
import { compile } from '@/compiler';
import type { BenchRow } from './BenchRow';
import { heapInUse } from './collectGarbage';
import { makeLargeRecipe } from './largeRecipe';
import { median } from './median';

const NAME = 'long_row.recipe.yaml';

function time(task: () => unknown): number {
  const started = performance.now();
  task();
  return performance.now() - started;
}

/** Compiling a recipe of `lines` lines beside the YAML library parsing the same text, turn by turn. */
function ratios(lines: number, rounds: number) {
  const text = makeLargeRecipe(lines);
  const bare: number[] = [];
  const tried: number[] = [];
  for (let round = 0; round < rounds * 2; round += 1) {
    const typed = `${text}  round: ${round}\n`;
    const parsing = time(() => parse(typed));
    const without = time(() => compile({ recipe: { name: NAME, text: typed }, trials: false }));
    const whole = time(() => compile({ recipe: { name: NAME, text: typed } }));
    if (round < rounds) continue;
    bare.push(without / parsing);
    tried.push(whole / parsing);
  }
  return { bare: median(bare), tried: median(tried) };
}

/** Memory that is in use after `compiles` compiles, once what can be collected is. */
function heapAfter(compiles: number, text: string): number {
  for (let round = 0; round < compiles; round += 1) {
    compile({ recipe: { name: NAME, text: `${text}  round: ${round}\n` }, trials: false });
  }
  return heapInUse();
}

/** Long recipes: how compiling compares with parsing, how that grows, and whether memory does. */
export function measureLongRecipes(): readonly BenchRow[] {
  const short = ratios(2000, 12);
  const long = ratios(20_000, 2);
  const text = makeLargeRecipe(200);
  const first = heapAfter(50, text);
  const last = heapAfter(950, text);
  const row = (name: string, value: number, goal: number): BenchRow => ({ name, value, goal, unit: '×' });
  return [
    row('compile of 2,000 lines without trials ÷ yaml parse of the same text', short.bare, 1.5),
    row('compile of 2,000 lines with trials ÷ yaml parse of the same text', short.tried, 2.5),
    row('that ratio without trials at 20,000 lines ÷ at 2,000 lines', long.bare / short.bare, 1.15),
    row('memory after 1,000 compiles ÷ after 50', last / first, 1.2),
  ];
}
