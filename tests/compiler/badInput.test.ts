import { describe, expect, it } from 'vitest';
import { compile } from '@/compiler';

const HEAD = 'format: 1\nrecipe: demo\nparts:\n  root: { kind: root }\n';

function compileText(text: string) {
  const compilation = compile({ recipe: { name: 'demo.recipe.yaml', text } });
  return { ...compilation, errors: compilation.findings.filter(({ severity }) => severity === 'error') };
}

/**
 * "Bad input" of the recipe language's design: each fault, what is reported, and the text that the finding points
 * at. One fault, one finding.
 */
const FAULTS: readonly (readonly [fault: string, text: string, code: string, at: string])[] = [
  ['a duplicate key', `${HEAD}title: a\ntitle: b\n`, 'duplicate-key', 'title'],
  ['a tab', 'format: 1\nrecipe: demo\nparts:\n\troot: { kind: root }\n', 'tab-indentation', '\t'],
  [
    'not a number',
    `${HEAD}landmarks:\n  a: { at: [0, .nan, 0] }\nchains: { c: { points: [a, [1, 1, 1]] } }\n`,
    'number-not-finite',
    '.nan',
  ],
  [
    'a huge number',
    `${HEAD}landmarks:\n  a: { at: [0, 4e300, 0] }\nchains: { c: { points: [a, [1, 1, 1]] } }\n`,
    'number-too-large',
    '4e300',
  ],
  ['a look-alike name', HEAD.replace('root:', 'rооt:'), 'look-alike-name', 'rооt'],
  ['an unknown key', `${HEAD}lanmarks: {}\n`, 'unknown-key', 'lanmarks'],
  ['an unknown key of a part', HEAD.replace('kind: root', 'kind: root, seize: 2'), 'unknown-key', 'seize'],
  ['an unknown kind of part', HEAD.replace('kind: root', 'kind: roof'), 'not-one-of', 'roof'],
  [
    'a missing landmark',
    `${HEAD}chains:\n  c: { points: [elbow, [1, 1, 1]] }\n`,
    'unknown-reference',
    'elbow',
  ],
  [
    'a missing landmark of a part on both sides',
    `${HEAD}landmarks: { a: { side: left, at: [1, 2, 3] }, b: { side: left, at: [2, 3, 5] } }\n`.replace(
      'root }',
      'root }\n  arm: { kind: limb, side: both, points: [a, b, wrist] }',
    ),
    'unknown-reference',
    'wrist',
  ],
  [
    'a straight limb',
    `${HEAD}`.replace('root }', 'root }\n  arm: { kind: limb, points: [[0, 1, 0], [0, 2, 0], [0, 3, 0]] }'),
    'pole-undecided',
    '[[0, 1, 0], [0, 2, 0], [0, 3, 0]]',
  ],
  [
    'a zero-length chain',
    `${HEAD}chains:\n  c: { points: [[1, 1, 1], [1, 1, 1]] }\n`,
    'zero-length-bone',
    '[1, 1, 1]',
  ],
  [
    'no length to spread joints on',
    `${HEAD}chains:\n  c: { points: [[1, 1, 1]], joints: 4 }\n`,
    'chain-without-length',
    '[[1, 1, 1]]',
  ],
  [
    'parents in a ring',
    `${HEAD}controls:\n  a: { at: [0, 1, 0], parent: b }\n  b: { at: [0, 2, 0], parent: a }\n`,
    'parent-ring',
    'b',
  ],
  ['its own parent', `${HEAD}controls:\n  a: { at: [0, 1, 0], parent: a }\n`, 'parent-ring', 'a'],
  [
    'two things with one id',
    `${HEAD}chains:\n  c: { points: [[0, 1, 0], [0, 2, 0]] }\ncontrols:\n  c.01: { at: [0, 1, 0] }\n  d: { at: [0, 1, 0], parent: c.01 }\nconstraints: { f: { kind: orient, target: c.02, sources: { d: 1 } } }\n`,
    'id-taken',
    'c.01',
  ],
  [
    'two things with one name',
    `${HEAD}controls:\n  a.b: { at: [0, 1, 0] }\n  a_b: { at: [0, 1, 0], parent: a.b }\nchains: { c: { points: [[0, 1, 0], [0, 2, 0]], parent: a_b } }\n`,
    'name-taken',
    'a_b',
  ],
  [
    'a control under a parked container',
    `${HEAD}controls:\n  a: { at: [0, 1, 0], role: geometry }\nchains: { c: { points: [[0, 1, 0], [0, 2, 0]], parent: a } }\n`,
    'control-in-parked-container',
    'a',
  ],
  [
    'a limit with min above max',
    `${HEAD}controls:\n  a: { at: [0, 1, 0], channels: { rx: { min: 5, max: -5 } } }\nchains: { c: { points: [[0, 1, 0], [0, 2, 0]], parent: a } }\n`,
    'limit-inverted',
    '{ min: 5, max: -5 }',
  ],
  [
    'a group limit with min above max',
    `${HEAD}controls:\n  a: { at: [0, 1, 0], channels: { move: { min: 5, max: -5 } } }\nchains: { c: { points: [[0, 1, 0], [0, 2, 0]], parent: a } }\n`,
    'limit-inverted',
    '{ min: 5, max: -5 }',
  ],
  [
    'an expression that cannot be read',
    `${HEAD}landmarks:\n  a: { at: [0, "=1 +", 0] }\nchains: { c: { points: [a, [1, 1, 1]] } }\n`,
    'expression-syntax',
    '"',
  ],
  [
    'an expression with an unknown name',
    `${HEAD}landmarks:\n  a: { at: [0, "=landmarks.b.x", 0] }\nchains: { c: { points: [a, [1, 1, 1]] } }\n`,
    'expression-unknown-name',
    'b',
  ],
  [
    'a point of two numbers',
    `${HEAD}landmarks:\n  a: { at: [0, 1] }\nchains: { c: { points: [a, [1, 1, 1]] } }\n`,
    'list-size',
    '[0, 1]',
  ],
  ['a list where a map is needed', `${HEAD}landmarks: [a, b]\n`, 'wrong-type', '[a, b]'],
  [
    'text where a number is needed',
    `${HEAD}landmarks:\n  a: { at: [0, one, 0] }\nchains: { c: { points: [a, [1, 1, 1]] } }\n`,
    'text-not-legal',
    'one',
  ],
  ['an unknown house', `${HEAD}house: nowhere@1\n`, 'house-not-found', 'nowhere@1'],
  ['an unknown base', `${HEAD}extends: gone@2\n`, 'base-not-found', 'gone@2'],
  ['a wrong format', HEAD.replace('format: 1', 'format: 2'), 'not-one-of', '2'],
  [
    'a things that follow one another',
    `${HEAD}chains:\n  c: { points: [[0, 1, 0], [0, 2, 0]] }\ncontrols:\n  a: { at: [0, 1, 0], parent: c.01 }\nconstraints:\n  f: { kind: parent, target: c.01, sources: { a: 1 } }\n`,
    'evaluation-ring',
    'f',
  ],
];

describe('bad input', () => {
  it.each(FAULTS)('%s has one finding, at its place, with help', (_, text, code, at) => {
    const { errors, rig, script } = compileText(text);
    expect(errors.map((finding) => finding.code)).toEqual([code]);
    const [finding] = errors;
    expect(text.slice(finding?.span.start, finding?.span.end)).toBe(at);
    expect(finding?.help.length).toBeGreaterThan(10);
    expect(finding?.help).not.toMatch(/[{}]/);
    expect(finding?.message).not.toMatch(/\{\w+\}|undefined|null/);
    expect(rig).toBeNull();
    expect(script).toBeNull();
  });

  it.each(FAULTS)('%s gives the same findings when compiled again', (_, text) => {
    expect(compileText(text).findings).toEqual(compileText(text).findings);
  });

  it.each([
    ['forty thousand open brackets', '['.repeat(40_000), 'nested-too-deep'],
    ['five thousand open braces', `a: ${'{a: '.repeat(5000)}`, 'nested-too-deep'],
    ['ten megabytes', 'a: 1\n'.repeat(2_000_000), 'text-too-large'],
    [
      'an alias bomb',
      Array.from(
        { length: 9 },
        (_, i) =>
          `k${i}: &k${i} [${Array(9)
            .fill(i === 0 ? '1' : `*k${i - 1}`)
            .join(', ')}]`,
      ).join('\n'),
      'aliases-too-large',
    ],
    ['nothing', '', 'document-empty'],
    ['a list', '- 1\n', 'not-a-map'],
    ['a word', 'hare\n', 'not-a-map'],
  ])('%s is refused without a crash', (_, text, code) => {
    const { errors, rig } = compileText(text);
    expect(errors.map((finding) => finding.code)).toContain(code);
    expect(rig).toBeNull();
  });

  it('shows the faults of all stages in one compile', () => {
    const { errors } = compileText(
      `${HEAD}titel: x\nlandmarks:\n  a: { at: [0, "=params.q", 0] }\nchains:\n  c: { points: [nowhere, [1, 1, 1]] }\n  d: { points: [[0, 0, 0], [0, 0, 0]] }\ncontrols:\n  e: { at: [0, 0, 0], channels: { rx: { min: 2, max: 1 } } }\n`,
    );
    expect(errors.map(({ code }) => code)).toEqual([
      'unknown-key',
      'expression-unknown-name',
      'unknown-reference',
      'zero-length-bone',
      'limit-inverted',
    ]);
  });

  it('caps the number of findings and says how many are left out', () => {
    const chains = Array.from({ length: 900 }, (_, i) => `  c${i}: { points: [n${i}, [0, 0, 0]] }`).join(
      '\n',
    );
    const { findings } = compileText(`${HEAD}chains:\n${chains}\n`);
    expect(findings.length).toBe(501);
    expect(findings[findings.length - 1]?.message).toBe('400 more findings are not shown.');
  });
});
