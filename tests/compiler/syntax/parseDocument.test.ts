import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { samples } from '@/compiler';
import { FindingList } from '@/compiler/findings/FindingList';
import { parseDocument } from '@/compiler/syntax/parseDocument';

function parse(text: string) {
  const findings = new FindingList();
  const document = parseDocument({ name: 'text.yaml', text }, findings);
  return { document, findings: findings.all, codes: findings.all.map(({ code }) => code) };
}

/** What the finding's span covers in the text. */
const covered = (text: string, index = 0): string => {
  const { span } = parse(text).findings[index] ?? { span: { start: 0, end: 0 } };
  return text.slice(span.start, span.end);
};

/**
 * Source: tests/data/robust/yaml, constructed after YAML 1.2.2 and the public patterns of alias bombs;
 * expectations.json beside the files says what each is about.
 */
const robust = (name: string) =>
  readFileSync(new URL(`../../data/robust/yaml/${name}`, import.meta.url), 'utf8');

describe('robust YAML files', () => {
  it.each([
    ['billion_laughs.yaml', ['aliases-too-large']],
    ['deep_flow.yaml', ['nested-too-deep']],
    ['dup_keys.yaml', ['duplicate-key']],
    ['merge_key.yaml', ['merge-key']],
    ['tab_indent.yaml', ['tab-indentation']],
    ['multi_doc.yaml', ['several-documents']],
    ['empty.yaml', ['document-empty']],
    ['only_comment.yaml', ['document-empty']],
    ['alias_cycle.yaml', ['alias-ring']],
    ['bad_anchor.yaml', ['alias-unknown']],
    ['nan.yaml', ['number-not-finite', 'number-not-finite', 'number-not-finite']],
    ['proto.yaml', ['key-reserved', 'key-reserved', 'key-reserved']],
    ['big_int.yaml', ['number-not-exact']],
    ['bom.yaml', []],
    ['crlf.yaml', []],
    ['norway.yaml', []],
  ] as const)('%s gives %j', (name, expected) => {
    expect(parse(robust(name)).codes).toEqual(expected);
  });

  it('reads words and numbers as the core schema says', () => {
    expect(parse(robust('norway.yaml')).document.value).toEqual({
      side: 'no',
      flag: 'yes',
      n: 'on',
      v: 1.1,
      oct: 15,
      oldoct: 17,
      sexa: '12:30:45',
    });
  });

  it('passes over a byte order mark and reads CRLF like LF', () => {
    expect(parse(robust('bom.yaml')).document.value).toEqual({ a: 1 });
    expect(parse(robust('crlf.yaml')).document.value).toEqual({ a: 1, b: 2 });
  });

  it('lets no key reach a prototype', () => {
    parse(robust('proto.yaml'));
    expect(Object.hasOwn(Object.prototype, 'polluted')).toBe(false);
  });
});

describe('bounds', () => {
  it.each([
    ['forty thousand open brackets', '['.repeat(40_000), 'nested-too-deep'],
    [
      'five thousand maps in one another',
      Array.from({ length: 5000 }, (_, i) => `${' '.repeat(i)}a:`).join('\n'),
      'text-too-large',
    ],
    [
      'a thousand maps in one another',
      Array.from({ length: 1000 }, (_, i) => `${' '.repeat(i)}a:`).join('\n'),
      'nested-too-deep',
    ],
    ['ten million characters', 'a: 1\n'.repeat(2_000_000), 'text-too-large'],
    [
      'four thousand anchors',
      Array.from({ length: 4000 }, (_, i) => `k${i}: &a${i} 1`).join('\n'),
      'too-many-anchors',
    ],
    ['two hundred thousand items', `a: [${'1,'.repeat(200_000)}]`, 'too-many-keys'],
    [
      'twenty thousand keys',
      Array.from({ length: 20_000 }, (_, i) => `k${i}: 1`).join('\n'),
      'too-many-keys',
    ],
    [
      'aliases that lie ever deeper in one another',
      Array.from(
        { length: 150 },
        (_, i) => `k${i}: &a${i} ${'['.repeat(60)}${i > 0 ? `*a${i - 1}` : '1'}${']'.repeat(60)}`,
      ).join('\n'),
      'nested-too-deep',
    ],
    ['a very long scalar', `a: ${'x'.repeat(30_000)}`, 'scalar-too-long'],
  ])('refuses %s with one finding', (_, text, code) => {
    expect(parse(text).codes).toEqual([code]);
  });

  it('allows the same depth with aliases as without', () => {
    const nested = (depth: number, inner: string) => `${'['.repeat(depth)}${inner}${']'.repeat(depth)}`;
    const text = (depth: number) => `a: &a ${nested(30, '1')}\nb: &b ${nested(depth, '*a')}\nc: *b\n`;
    expect(parse(text(33)).codes).toEqual([]);
    expect(parse(text(34)).codes).toEqual(['nested-too-deep']);
    expect(covered(text(34))).toBe('*a');
    expect(parse(`a: ${nested(63, '1')}`).codes).toEqual([]);
    expect(parse(`a: ${nested(64, '1')}`).codes).toEqual(['nested-too-deep']);
  });

  it('reads eight thousand keys of one map', () => {
    const { document, codes } = parse(Array.from({ length: 8000 }, (_, i) => `k${i}: ${i}`).join('\n'));
    expect(codes).toEqual([]);
    expect(Object.keys(document.value as object)).toHaveLength(8000);
  });
});

describe('exact places', () => {
  it.each([
    ['the second of two equal keys', 'a: 1\nb: 2\na: 3\n', 'a'],
    ['a tag', 'a: !x value\n', 'value'],
    ['a number that is none', 'a: [1, .inf]\n', '.inf'],
    ['an alias without anchor', 'a: *nope\n', '*nope'],
    ['a look-alike key', 'rооt: 1\n', 'rооt'],
    ['the second document', 'a: 1\n---\nb: 2\n', '---'],
  ])('of %s', (_, text, expected) => {
    expect(covered(text)).toBe(expected);
  });

  it('shows the first of two equal keys as related', () => {
    const [finding] = parse('a: 1\nb: 2\na: 3\n').findings;
    expect(finding?.span.startLine).toBe(3);
    expect(finding?.related[0]?.span.startLine).toBe(1);
  });

  it('reads a look-alike key as its Latin twin and offers it as a fix', () => {
    const { document, findings } = parse('rооt: 1\n');
    expect(document.value).toEqual({ root: 1 });
    expect(findings[0]?.fix?.edits[0]?.newText).toBe('root');
    expect(document.spanAt(['root'], 'key').end).toBe(4);
  });

  it('finds keys, values, list items and the nearest parent of what is missing', () => {
    const text = 'one:\n  two: [10, 20]\nthree: &x { four: 4 }\nfive: *x\n';
    const { document } = parse(text);
    const at = (path: (string | number)[], part?: 'key' | 'value') => {
      const { start, end } = document.spanAt(path, part);
      return text.slice(start, end);
    };
    expect(at(['one', 'two', 1])).toBe('20');
    expect(at(['one', 'two'], 'key')).toBe('two');
    expect(at(['one', 'nine'])).toBe('one');
    expect(at(['five', 'four'])).toBe('4');
    expect(document.has(['one', 'two', 1])).toBe(true);
    expect(document.has(['one', 'nine'])).toBe(false);
  });

  it('lets people write their own alphabet in titles and notes', () => {
    expect(parse('title: Заяц\nnotes: { who: Тень }\n').codes).toEqual([]);
  });
});

describe('any text at all', () => {
  const hare = samples[0]?.text ?? '';
  const check = (text: string): void => {
    const { findings } = parse(text);
    for (const { span } of findings) {
      expect(span.start).toBeGreaterThanOrEqual(0);
      expect(span.end).toBeGreaterThanOrEqual(span.start);
      expect(span.end).toBeLessThanOrEqual(text.length);
    }
  };

  it('never throws, and findings stay inside the text', () => {
    fc.assert(fc.property(fc.string({ unit: 'binary', maxLength: 300 }), check), { numRuns: 300 });
    const yamlish = fc.array(
      fc.constantFrom(
        'a',
        ': ',
        '- ',
        '\n',
        '  ',
        '[',
        ']',
        '{',
        '}',
        ',',
        '&x ',
        '*x',
        '!t ',
        '|\n',
        '"',
        "'",
        '#',
        '? ',
        '---\n',
        '\t',
        '<<',
        '.nan',
      ),
      { maxLength: 60 },
    );
    fc.assert(
      fc.property(
        yamlish.map((parts) => parts.join('')),
        check,
      ),
      { numRuns: 1000 },
    );
  });

  it('survives any deletion in a good recipe', () => {
    fc.assert(
      fc.property(fc.nat(hare.length - 1), fc.integer({ min: 1, max: 40 }), (start, size) => {
        check(hare.slice(0, start) + hare.slice(start + size));
      }),
      { numRuns: 200 },
    );
  });
});
