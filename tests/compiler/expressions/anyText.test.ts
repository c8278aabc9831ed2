import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseExpression } from '@/compiler/expressions/parseExpression';
import { evaluateText, WORLD } from './evaluateText';

const SCRAPS = [
  'params',
  'landmarks',
  '.x',
  '.hips',
  '.',
  '(',
  ')',
  '[',
  ']',
  '{',
  '}',
  '"',
  "'",
  ',',
  '+',
  '-',
  '*',
  '/',
  '%',
  '1',
  '0',
  '2.5',
  '1e999',
  '0x1F',
  '3u',
  ' ',
  '?',
  ':',
  '&&',
  '||',
  '!',
  '==',
  '<',
  'dist',
  'mix',
  'mid',
  'min',
  'true',
  'null',
  'has',
  'map',
  'matches',
  'size',
  '\\',
  '\n',
  '=',
  '\u{1f40c}',
  'ä',
  '__proto__',
  'constructor',
  "b'a'",
];
const anyText = fc.oneof(
  fc.string({ unit: 'binary', maxLength: 60 }),
  fc.array(fc.constantFrom(...SCRAPS), { maxLength: 14 }).map((scraps) => scraps.join('')),
);

describe('any text after "="', () => {
  it('is read without a throw, and a fault lies inside it', () => {
    fc.assert(
      fc.property(anyText, (text) => {
        const parsed = parseExpression(text);
        const result = 'fault' in parsed ? parsed : parsed.evaluate({ params: {}, landmarks: {} });
        if (!('fault' in result)) return;
        const { problem, start, end } = result.fault;
        expect(problem).not.toBe('');
        expect(start).toBeGreaterThanOrEqual(0);
        expect(end).toBeGreaterThanOrEqual(start);
        expect(end).toBeLessThanOrEqual(text.length);
      }),
      { numRuns: 2000 },
    );
  });

  it('names the parts it reads at their very places', () => {
    fc.assert(
      fc.property(anyText, (text) => {
        const parsed = parseExpression(text);
        if ('fault' in parsed) return;
        for (const { name, start, end } of parsed.reads) expect(text.slice(start, end)).toBe(name);
      }),
      { numRuns: 2000 },
    );
  });

  it('gives a finite number or findings inside the value, in a recipe', () => {
    fc.assert(
      fc.property(anyText, (text) => {
        // JSON strings are YAML scalars; lone surrogates and the like are refused by the reader itself.
        const scalar = JSON.stringify(`=${text}`);
        const body = `${WORLD}\ncontrols: { c: { size: ${scalar} } }`;
        const { recipe, found, text: whole } = evaluateText(body);
        const first = whole.lastIndexOf(scalar);
        for (const { span } of found) {
          expect(span.start).toBeGreaterThanOrEqual(first);
          expect(span.end).toBeLessThanOrEqual(first + scalar.length);
          expect(span.end).toBeGreaterThan(span.start);
        }
        const size = recipe.controls?.c?.size;
        expect(found.length > 0 || Number.isFinite(size)).toBe(true);
      }),
      { numRuns: 1000 },
    );
  });
});
