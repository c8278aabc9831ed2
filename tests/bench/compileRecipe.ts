import { readFileSync } from 'node:fs';
import { parse } from 'yaml';
import { compile } from '@/compiler';
import { answerQuestion } from '@/components/worker/answerQuestion';
import type { BenchRow } from './BenchRow';
import { median } from './median';

const ROUNDS = 60;
const WARM_UP = 40;

/**
 * Compiles the crab, a recipe of about 150 joints. Parsing the same text with the YAML library alone and compiling
 * it take turns, and the ratio is taken turn by turn, so that a machine that slows down slows both.
 */
export async function measure(): Promise<readonly BenchRow[]> {
  const text = readFileSync('tests/data/bench/shore_crab.recipe.yaml', 'utf8');
  const name = 'shore_crab.recipe.yaml';
  const time = (task: () => unknown): number => {
    const started = performance.now();
    task();
    return performance.now() - started;
  };
  const ratios: number[] = [];
  const keystrokes: number[] = [];
  for (let round = 0; round < WARM_UP + ROUNDS; round += 1) {
    // Every keystroke is another text; nothing may profit from having seen the same one before.
    const typed = `${text}  round: ${round}\n`;
    const parsing = time(() => parse(typed));
    const compiling = time(() => compile({ recipe: { name, text: typed } }));
    const keystroke = time(() => answerQuestion({ sequence: round, text: typed, name, bases: {} }, () => 0));
    if (round < WARM_UP) continue;
    ratios.push(compiling / parsing);
    keystrokes.push(keystroke);
  }
  return [
    {
      name: 'compile through emitted script ÷ yaml parse of the same text',
      value: median(ratios),
      goal: 3,
      unit: '×',
    },
    {
      name: 'keystroke to findings, built script and posed rig',
      value: median(keystrokes),
      goal: 50,
      unit: 'ms',
    },
  ];
}
