import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { FindingList } from '@/compiler/findings/FindingList';
import { mergeDocuments } from '@/compiler/merge/mergeDocuments';
import { mergePatch } from '@/compiler/merge/mergePatch';
import { parseDocument } from '@/compiler/syntax/parseDocument';
import type { JsonValue } from '@/compiler/syntax/types';

/** Source: RFC 7396 (Hoffman and Snell, 2014), Appendix A, all fifteen rows; see the file's head. */
const { cases } = JSON.parse(
  readFileSync(new URL('../../data/json/rfc7396_appendix_a.json', import.meta.url), 'utf8'),
) as { cases: readonly { original: JsonValue; patch: JsonValue; result: JsonValue }[] };

describe('merging (RFC 7396)', () => {
  it('has the fifteen rows of Appendix A', () => expect(cases).toHaveLength(15));

  it.each(cases.map((row, index) => [index + 1, row] as const))(
    'row %d',
    (_, { original, patch, result }) => {
      expect(mergePatch(original, patch)).toEqual(result);
    },
  );

  it('changes neither argument', () => {
    const target = { a: { b: 1 } };
    const patch = { a: { c: 2 } };
    mergePatch(target, patch);
    expect(target).toEqual({ a: { b: 1 } });
    expect(patch).toEqual({ a: { c: 2 } });
  });

  it('takes __proto__ as a key like any other', () => {
    const patch = JSON.parse('{"__proto__": {"polluted": true}}') as JsonValue;
    const merged = mergePatch({}, patch);
    expect(Object.hasOwn(merged as object, '__proto__')).toBe(true);
    expect(({} as { polluted?: boolean }).polluted).toBeUndefined();
  });
});

describe('origins of merged values', () => {
  const parse = (name: string, text: string) => parseDocument({ name, text }, new FindingList());
  const base = parse('base.yaml', 'a: { x: 1, y: 2 }\nb: 3\n');
  const own = parse('own.yaml', 'a: { y: 20 }\n');
  const patch = parse('patch.yaml', 'b: 30\n');
  const merged = mergeDocuments([base, own, patch]);

  it('merges in order', () => expect(merged.value).toEqual({ a: { x: 1, y: 20 }, b: 30 }));

  it('points at the document that set a value last', () => {
    expect(merged.spanAt(['a', 'x']).source).toBe('base.yaml');
    expect(merged.spanAt(['a', 'y']).source).toBe('own.yaml');
    expect(merged.spanAt(['b']).source).toBe('patch.yaml');
  });

  it('names those that had set it before', () => {
    expect(merged.earlierPlaces(['b']).map(({ span }) => span.source)).toEqual(['base.yaml']);
  });

  it('removes by null', () => {
    const without = mergeDocuments([base, parse('cut.yaml', 'a: null\n')]);
    expect(without.value).toEqual({ b: 3 });
  });
});
