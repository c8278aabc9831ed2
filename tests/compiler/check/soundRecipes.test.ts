import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { compile, samples } from '@/compiler';
import type { CompileRequest } from '@/compiler/compile';

const everyPart = {
  name: 'every_part.example.yaml',
  text: readFileSync(new URL('../../../compiler/parts/every_part.example.yaml', import.meta.url), 'utf8'),
};

const told = (request: CompileRequest): readonly string[] =>
  compile(request).findings.map(({ code, message }) => `${code}: ${message}`);

/** The smallest and the largest of every number that a roster may vary. */
function extremesOf(text: string): readonly (readonly [string, Readonly<Record<string, number>>])[] {
  const params = [...text.matchAll(/^ {2}(\w+): \{ default: [^,]+, min: ([^,]+), max: ([^,]+),/gm)];
  const all = (group: 2 | 3) =>
    Object.fromEntries(params.map((match) => [match[1] ?? '', Number(match[group])]));
  return params.length === 0
    ? []
    : [
        ['smallest', all(2)],
        ['largest', all(3)],
      ];
}

describe('rules on sound recipes', () => {
  it('are silent about a recipe with every part', () => {
    expect(told({ recipe: everyPart })).toEqual([]);
  });

  it.each(['m', 'mm'])('are silent about it in %s, since they measure against the rig', (unit) => {
    const text = everyPart.text.replace('landmarks:', `scene: { unit: ${unit} }\nlandmarks:`);
    expect(told({ recipe: { ...everyPart, text } })).toEqual([]);
  });

  const grown = samples.flatMap(({ id, text }) =>
    extremesOf(text).map(
      ([size, params]) => [id, size, { recipe: { name: id, text }, character: { params } }] as const,
    ),
  );
  it.each(grown)('are silent about the sample %s at its %s', (_id, _size, request) => {
    expect(told(request)).toEqual([]);
  });

  it('have samples that vary in size to be silent about', () => {
    expect(grown.length).toBeGreaterThanOrEqual(6);
  });
});
