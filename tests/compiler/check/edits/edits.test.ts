import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addKeys } from '@/compiler/check/edits/addKeys';
import { removeEntry } from '@/compiler/check/edits/removeEntry';
import type { Fix } from '@/compiler/findings/Finding';
import { FindingList } from '@/compiler/findings/FindingList';
import { mergeDocuments } from '@/compiler/merge/mergeDocuments';
import { LineIndex } from '@/compiler/source/LineIndex';
import { parseDocument } from '@/compiler/syntax/parseDocument';
import type { JsonValue, Path } from '@/compiler/syntax/types';

interface Written {
  readonly [key: string]: number | string | readonly number[] | Written;
}

const KEY = fc.constantFrom('arm', 'leg', 'side', 'tip_01', 'size');
const LEAF = fc.oneof(
  fc.integer({ min: -999, max: 999 }),
  fc.constantFrom('left', '# no comment', 'a, b', '{', "it's"),
  fc.array(fc.integer({ min: -999, max: 999 }), { maxLength: 3 }),
);
const { map: MAP } = fc.letrec<{ map: Written; value: Written[string] }>((tie) => ({
  value: fc.oneof({ depthSize: 'small' }, LEAF, tie('map')),
  map: fc.dictionary(KEY, tie('value'), { minKeys: 1, maxKeys: 4 }),
}));

/** How a map is laid out at some depth: in braces, in braces over lines, or indented; with comments or without. */
const STYLE = fc.record({
  bracesFrom: fc.integer({ min: 1, max: 4 }),
  open: fc.boolean(),
  comments: fc.boolean(),
  last: fc.constantFrom('', '\n', '\n# the end\n'),
});
type Style = { bracesFrom: number; open: boolean; comments: boolean; last: string };

function inBraces(value: Written[string], open: boolean): string {
  if (typeof value === 'string') return JSON.stringify(value);
  if (typeof value === 'number') return String(value);
  if (Array.isArray(value)) return `[${value.join(', ')}]`;
  const items = Object.entries(value).map(([key, each]) => `${key}: ${inBraces(each, false)}`);
  return open ? `{\n        ${items.join(',\n        ')}\n        }` : `{ ${items.join(', ')} }`;
}

function indented(map: Written, depth: number, style: Style): string {
  const indent = '  '.repeat(depth);
  const lines = Object.entries(map).flatMap(([key, value]) => {
    const comment = style.comments ? [`${indent}# about ${key}`] : [];
    const nests = typeof value === 'object' && !Array.isArray(value) && depth + 1 < style.bracesFrom;
    const text = nests
      ? `${indent}${key}:\n${indented(value as Written, depth + 1, style)}`
      : `${indent}${key}: ${inBraces(value, style.open)}${style.comments ? ' # beside it' : ''}`;
    return [...comment, text];
  });
  return lines.join('\n');
}

function pathsOf(value: JsonValue | undefined, path: Path = []): readonly Path[] {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return [];
  return Object.entries(value).flatMap(([key, each]) => [[...path, key], ...pathsOf(each, [...path, key])]);
}

function read(text: string) {
  const findings = new FindingList();
  const document = mergeDocuments([parseDocument({ name: 'edit.yaml', text }, findings)]);
  expect(findings.all.map(({ message }) => message)).toEqual([]);
  return document;
}

const apply = (text: string, { span, newText }: Fix['edits'][number]): string =>
  text.slice(0, span.start) + newText + text.slice(span.end);

/** The plain value with one entry changed; undefined takes it away. */
function changed(value: JsonValue, path: Path, change: JsonValue | undefined): JsonValue {
  const [key, ...rest] = path;
  const { [String(key)]: before, ...others } = value as { [key: string]: JsonValue };
  if (rest.length > 0) return { ...others, [String(key)]: changed(before ?? null, rest, change) };
  return change === undefined ? others : { ...others, [String(key)]: change };
}

const DOCUMENT = fc.record({ value: MAP, style: STYLE, choice: fc.nat() });

describe('edits of recipe text', () => {
  it('removes an entry and nothing else, whatever the layout', () => {
    fc.assert(
      fc.property(DOCUMENT, ({ value, style, choice }) => {
        const text = `keep: 1\n${indented({ rig: value }, 0, style)}${style.last}`;
        const document = read(text);
        const paths = pathsOf(document.value).filter(([first]) => first === 'rig');
        const path = paths[choice % paths.length] ?? [];
        const edit = removeEntry(document, path);
        // Comments between a key and its only entry are the one thing that keeps an edit from being made.
        if (edit === null) {
          expect(style.comments).toBe(true);
          return;
        }
        const { span } = edit;
        expect(new LineIndex({ name: 'edit.yaml', text }).span(span.start, span.end)).toEqual(span);
        const after = apply(text, edit);
        const wanted = changed(document.value as JsonValue, path, undefined);
        expect(read(after).value).toEqual(wanted);
        const comments = (each: string): number => each.match(/# about/g)?.length ?? 0;
        const within = path.reduce<JsonValue>(
          (at, key) => (at as { [key: string]: JsonValue })[key] ?? null,
          document.value ?? null,
        );
        expect(comments(text) - comments(after)).toBeLessThanOrEqual(pathsOf(within).length);
      }),
      { numRuns: 400 },
    );
  });

  it('adds an entry and changes nothing else, whatever the layout', () => {
    fc.assert(
      fc.property(DOCUMENT, ({ value, style, choice }) => {
        const text = `${indented({ rig: value }, 0, style)}${style.last}`;
        const document = read(text);
        const maps: readonly Path[] = pathsOf(document.value).filter((path) => {
          const found = path.reduce<unknown>(
            (at, key) => (at as Record<string, unknown>)[key],
            document.value,
          );
          return typeof found === 'object' && !Array.isArray(found);
        });
        const path = maps[choice % maps.length] ?? [];
        const edit = addKeys(document, path, [
          ['new_one', '{ to: 3 }'],
          ['also', '1'],
        ]);
        if (edit === null) {
          expect(style.comments).toBe(true);
          return;
        }
        const { span } = edit;
        expect(new LineIndex({ name: 'edit.yaml', text }).span(span.start, span.end)).toEqual(span);
        const one = changed(document.value as JsonValue, [...path, 'new_one'], { to: 3 });
        const wanted = changed(one, [...path, 'also'], 1);
        expect(read(apply(text, edit)).value).toEqual(wanted);
      }),
      { numRuns: 400 },
    );
  });

  it('leaves the empty map where the only entry of an indented map goes', () => {
    const text = 'controls:\n  hand:\n    size: 2\n';
    const edit = removeEntry(read(text), ['controls', 'hand', 'size']);
    expect(edit && apply(text, edit)).toBe('controls:\n  hand: {}\n');
  });

  it('keeps its hands off what several documents wrote, and off anchors', () => {
    const layer = (name: string, text: string) => parseDocument({ name, text }, new FindingList());
    const both = mergeDocuments([layer('base', 'a: { b: 1, c: 2 }\n'), layer('own', 'a: { b: 3 }\n')]);
    expect(removeEntry(both, ['a', 'b'])).toBeNull();
    expect(removeEntry(read('a: &x 1\nb: *x\n'), ['a'])).toBeNull();
    expect(removeEntry(read('a: &x 1\nb: *x\n'), ['b'])).toBeNull();
    expect(removeEntry(read('a: 1\nb: "=2 * 3"\n'), ['b'])).not.toBeNull();
  });
});
