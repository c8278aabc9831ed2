import { describe, expect, it } from 'vitest';
import { compile } from '@/compiler';

const HEAD = 'format: 1\nrecipe: demo\nparts:\n  root: { kind: root }\n';
/** More than a stack holds when each thing is settled by a call from within the one that needs it. */
const ROW = 4000;

/** A collection in which every entry needs the next one; the last is `last`, or needs the first. */
function row(collection: string, entry: (next: string, index: number) => string, last?: string): string {
  const lines = Array.from({ length: ROW }, (_, index) => {
    const isLast = index === ROW - 1;
    return `  k${index}: ${isLast && last !== undefined ? last : entry(`k${(index + 1) % ROW}`, index)}`;
  });
  return `${HEAD}${collection}:\n${lines.join('\n')}\n`;
}

function compileText(text: string) {
  const { rig, findings } = compile({ recipe: { name: 'demo.recipe.yaml', text } });
  return { rig, errors: findings.filter(({ severity }) => severity === 'error').map(({ code }) => code) };
}

const chainFrom = (next: string, index: number) => `{ points: [[${index}, 1, 0], ${next}.01] }`;

describe('thousands of things in a row', () => {
  it.each([
    ['containers', row('containers', (next) => `{ parent: ${next} }`, '{}')],
    [
      'parents of controls',
      row('controls', (next) => `{ at: [0, 1, 0], parent: ${next} }`, '{ at: [0, 1, 0] }'),
    ],
    ['places of chains', row('chains', chainFrom, '{ points: [[1, 0, 0], [2, 0, 0]] }')],
  ])('compile, the last written first: %s', (_, text) => {
    const { rig, errors } = compileText(text);
    expect(errors).toEqual([]);
    expect(rig?.nodes.length).toBeGreaterThanOrEqual(ROW);
  });

  it.each([
    ['containers', row('containers', (next) => `{ parent: ${next} }`), 'container-ring'],
    ['parents of controls', row('controls', (next) => `{ at: [0, 1, 0], parent: ${next} }`), 'parent-ring'],
    ['places of chains', row('chains', chainFrom), 'place-ring'],
  ])('are one finding when they form a ring: %s', (_, text, code) => {
    expect(compileText(text)).toEqual({ rig: null, errors: [code] });
  });
});

it('takes no name from what every object has: a container in "constructor" is in none', () => {
  expect(compileText(`${HEAD}containers: { k: { parent: constructor } }\n`)).toEqual({
    rig: null,
    errors: ['unknown-reference'],
  });
});
