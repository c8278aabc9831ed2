import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ComparedLine, type ComparedRow, compareTexts } from '@/components/versions/compareTexts';

const rowsOf = (before: string, after: string): readonly ComparedRow[] =>
  compareTexts(before, after).flatMap(({ rows }) => rows);
const textOf = (line: ComparedLine | null): string | null =>
  line?.pieces.map(({ text }) => text).join('') ?? null;
const short = (before: string, after: string) =>
  rowsOf(before, after).map((row) => [row.kind, textOf(row.before), textOf(row.after)]);

describe('comparing two texts', () => {
  it('sees the same, changed, added and removed lines', () => {
    expect(short('a\nb: 1\nc\n', 'a\nb: 2\nc\nd\n')).toEqual([
      ['same', 'a', 'a'],
      ['changed', 'b: 1', 'b: 2'],
      ['same', 'c', 'c'],
      ['added', null, 'd'],
    ]);
    expect(short('a\nb\n', 'b\n')).toEqual([
      ['removed', 'a', null],
      ['same', 'b', 'b'],
    ]);
  });

  it('pairs changed lines as far as they go together', () => {
    expect(short('1\n2\n3\n', 'x\n')).toEqual([
      ['changed', '1', 'x'],
      ['removed', '2', null],
      ['removed', '3', null],
    ]);
  });

  it('marks the very words that changed', () => {
    const [row] = rowsOf('size: 3 cm\n', 'size: 40 cm\n');
    const marked = (line: ComparedLine | null | undefined) =>
      line?.pieces.filter(({ isChanged }) => isChanged).map(({ text }) => text);
    expect([marked(row?.before), marked(row?.after)]).toEqual([['3'], ['40']]);
  });

  it('numbers the lines of each side by themselves', () => {
    const numbers = rowsOf('a\nb\nc\n', 'new\na\nc\n').map(({ before, after }) => [
      before?.number,
      after?.number,
    ]);
    expect(numbers).toEqual([
      [undefined, 1],
      [1, 2],
      [2, undefined],
      [3, 3],
    ]);
  });

  it('folds what is the same far from any change, and keeps three lines around one', () => {
    const lines = Array.from({ length: 20 }, (_, index) => `line ${index + 1}`);
    const changed = lines.with(9, 'other');
    const blocks = compareTexts(`${lines.join('\n')}\n`, `${changed.join('\n')}\n`);
    expect(blocks.map(({ kind, rows }) => [kind, rows.length])).toEqual([
      ['folded', 6],
      ['rows', 7],
      ['folded', 7],
    ]);
  });

  it('folds all of two equal texts', () => {
    expect(compareTexts('a\nb\n', 'a\nb\n').map(({ kind }) => kind)).toEqual(['folded']);
  });

  it('loses no line, whatever the texts', () => {
    const text = fc
      .array(fc.constantFrom('a', 'b', 'c: 1', 'c: 2', '', '  x'), { maxLength: 12 })
      .map((lines) => lines.map((line) => `${line}\n`).join(''));
    fc.assert(
      fc.property(text, text, (before, after) => {
        const rows = rowsOf(before, after);
        const side = (which: 'before' | 'after') =>
          rows.flatMap((row) => (row[which] ? [`${textOf(row[which])}\n`] : [])).join('');
        const numbers = (which: 'before' | 'after') =>
          rows.flatMap((row) => (row[which] ? [row[which].number] : []));
        expect(side('before')).toBe(before);
        expect(side('after')).toBe(after);
        for (const which of ['before', 'after'] as const) {
          expect(numbers(which)).toEqual(numbers(which).map((_, index) => index + 1));
        }
        for (const row of rows) {
          if (row.kind === 'same') expect(textOf(row.before)).toBe(textOf(row.after));
          if (row.kind === 'changed') expect(textOf(row.before)).not.toBe(textOf(row.after));
        }
      }),
    );
  });

  it('tells a last line without its line break', () => {
    expect(short('a', 'a\n').every(([, before, after]) => before === 'a' && after === 'a')).toBe(true);
  });
});
