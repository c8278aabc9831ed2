import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { LineIndex } from '@/compiler/source/LineIndex';

const lineText = fc.string({ unit: fc.constantFrom('a', 'é', '🐇', ' ', '\n', '\r\n'), maxLength: 60 });
const offset = fc.integer({ min: -5, max: 90 });

function spanIn(text: string, start: number, end: number) {
  return new LineIndex({ name: 'hare.recipe.yaml', text }).span(start, end);
}

/** Line and column counted the slow way, from the text before the place. */
function countedPlace(text: string, at: number) {
  const before = text.slice(0, at).split('\n');
  return { line: before.length, column: (before.at(-1) ?? '').length + 1 };
}

describe('LineIndex', () => {
  it('counts lines and columns from one, in UTF-16 code units, with an end outside the stretch', () => {
    expect(spanIn('a: 1\n🐇: two\n', 5, 7)).toEqual({
      source: 'hare.recipe.yaml',
      start: 5,
      end: 7,
      startLine: 2,
      startColumn: 1,
      endLine: 2,
      endColumn: 3,
    });
  });

  it('places the end of a text after its last character, on a line of its own after a line break', () => {
    expect(spanIn('', 0, 0)).toMatchObject({ startLine: 1, startColumn: 1, endLine: 1, endColumn: 1 });
    expect(spanIn('a\r\n', 1, 3)).toMatchObject({ startLine: 1, startColumn: 2, endLine: 2, endColumn: 1 });
  });

  it('agrees with counting line breaks, for any text and any two places in it', () => {
    fc.assert(
      fc.property(lineText, offset, offset, (text, start, end) => {
        const span = spanIn(text, start, end);
        const first = countedPlace(text, span.start);
        const last = countedPlace(text, span.end);
        expect(span).toMatchObject({
          startLine: first.line,
          startColumn: first.column,
          endLine: last.line,
          endColumn: last.column,
        });
      }),
    );
  });

  it('moves places outside the text to its nearest end and never ends before it starts', () => {
    fc.assert(
      fc.property(lineText, offset, offset, (text, start, end) => {
        const span = spanIn(text, start, end);
        const clamp = (at: number) => Math.min(Math.max(at, 0), text.length);
        expect(span.start).toBe(clamp(start));
        expect(span.end).toBe(Math.max(clamp(end), clamp(start)));
      }),
    );
  });
});
