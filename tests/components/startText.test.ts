import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { recipeNameSchema, recipeTitleSchema } from '@/app/api/v1/_contracts/recipe';
import { compile, samples } from '@/compiler';
import { FindingList } from '@/compiler/findings/FindingList';
import { parseDocument } from '@/compiler/syntax/parseDocument';
import { startText } from '@/components/recipes/startText';

const parse = (text: string) => parseDocument({ name: 'a.yaml', text }, new FindingList());
const TRICKY = [
  '$&',
  '$1 $$',
  'a: b',
  '# no comment',
  '"quoted" \'too\'',
  '\\n',
  '{ }',
  '- a',
  '=1 + 1',
  'Häsin 🐇',
  '%',
  '@',
  '`',
];

describe('the first text of a recipe', () => {
  it.each([undefined, ...samples.map(({ id }) => id)])('builds, begun from %s', (id) => {
    const sample = samples.find((item) => item.id === id)?.text;
    const text = startText('old_hare', 'Old hare', sample);
    const { rig, findings } = compile({ recipe: { name: 'a.yaml', text } });
    expect(findings.filter(({ severity }) => severity === 'error')).toEqual([]);
    expect(rig?.scene.character).toBe('old_hare');
    expect(parse(text).value).toMatchObject({ recipe: 'old_hare', title: 'Old hare' });
  });

  it.each(TRICKY)('holds the title %s as it was typed', (title) => {
    for (const sample of [undefined, ...samples.map(({ text }) => text)]) {
      expect(parse(startText('a', title, sample)).value).toMatchObject({ recipe: 'a', title });
    }
  });

  it('holds whatever title and name the API takes, and nothing else changes', () => {
    const sample = samples[0]?.text ?? '';
    const title = fc
      .oneof(fc.string({ unit: 'grapheme', maxLength: 120 }), fc.stringMatching(/^[ -~]{1,40}$/))
      .filter((text) => recipeTitleSchema.safeParse(text).data === text);
    const name = fc
      .stringMatching(/^[a-z][a-z0-9_]{0,20}$/)
      .filter((text) => recipeNameSchema.safeParse(text).success);
    fc.assert(
      fc.property(name, title, (recipe, typed) => {
        const { value, isBroken } = parse(startText(recipe, typed, sample));
        expect(isBroken).toBe(false);
        expect(value).toEqual({ ...(parse(sample).value as object), recipe, title: typed });
      }),
      { numRuns: 60 },
    );
  });
});
