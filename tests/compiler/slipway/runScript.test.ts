import { describe, expect, it } from 'vitest';
import { emitScript } from '@/compiler/emit/emitScript';
import { planSteps } from '@/compiler/plan/planSteps';
import { runScript } from '@/compiler/slipway/runScript';
import { control, group, rigOf } from '../pose/rigParts';
import { findingsOf, make, marksOf, SCENE, seal } from './scripts';

const codesOf = (text: string): readonly string[] =>
  runScript({ name: 'test.slip', text }).findings.map(({ code }) => code);

describe('the seal', () => {
  const script = emitScript(planSteps(rigOf([control('root'), group('carried', { parent: 'root' })])));

  it('lets a whole script run', () => {
    const { rig, findings } = runScript({ name: 'test.slip', text: script });
    expect(findings).toEqual([]);
    expect(rig?.nodes.map(({ name }) => name)).toEqual(['root', 'carried']);
  });

  it('refuses another version or another kind of file', () => {
    expect(codesOf(script.replace('slipway 1', 'slipway 2'))).toEqual(['script-version-unknown']);
    expect(codesOf('')).toEqual(['script-version-unknown']);
    expect(codesOf('format: 1\nrecipe: hare\n')).toEqual(['script-version-unknown']);
    expect(codesOf(`\ufeff${script}`)).toEqual(['script-version-unknown']);
  });

  it('refuses what was changed, shortened, lengthened or joined', () => {
    expect(codesOf(script.replace('size=1', 'size=2'))).toEqual(['script-altered']);
    expect(codesOf(script.replaceAll('\n', '\r\n'))).toEqual(['script-version-unknown']);
    expect(codesOf(script.slice(0, -1))).toEqual(['script-truncated']);
    expect(codesOf(script.split('\n').slice(0, -2).join('\n'))).toEqual(['script-truncated']);
    expect(codesOf(`${script}\n`)).toEqual(['script-truncated']);
    expect(codesOf(script + script)).toEqual(['script-altered']);
    const lines = script.split('\n');
    expect(codesOf([...lines.slice(0, 2), ...lines.slice(3)].join('\n'))).toEqual(['script-altered']);
  });

  it('says which of count and hash is wrong, on the last line', () => {
    const { findings } = runScript({ name: 'test.slip', text: script.replace('steps=4', 'steps=5') });
    expect(findings[0]?.message).toBe('The last line counts 5 lines before it; there are 4.');
    expect(findings[0]?.span.startLine).toBe(5);
  });
});

describe('one scene', () => {
  it('is asked for on the second line and nowhere else', () => {
    expect(marksOf()).toEqual([['script-scene-misplaced', '']]);
    expect(marksOf(make.group('a'))).toEqual([['script-scene-misplaced', make.group('a')]]);
    expect(marksOf(SCENE, make.group('a'), SCENE)).toEqual([['script-scene-misplaced', 'scene']]);
    expect(marksOf(SCENE, 'slipway 1')).toEqual([['script-syntax', '1']]);
  });
});

describe('the grammar', () => {
  it.each([
    ['', 'a verb', 'the end of the line'],
    [' group "a"', 'a verb', '" "'],
    ['group', 'a space', 'the end of the line'],
    ['group  "a"', 'a text in quotes', '" "'],
    ['group a', 'a text in quotes', '"a"'],
    ['group "a', 'a closing quote', 'the end of the line'],
    ['group "a\\x"', 'an escape that JSON knows', '"\\\\"'],
    ['group "a\tb"', 'control characters written as \\u and four digits', '"\\t"'],
    ['group "a" id', '"="', 'the end of the line'],
    ['group "a" id=', 'a value', 'the end of the line'],
    ['group "a" id="a" ', 'a key', 'the end of the line'],
    ['group "a" at=(0 0', 'a space or ")"', 'the end of the line'],
    ['group "a" at=((0))', 'a value', '"("'],
    ['group "a" at=(0,0,0)', 'a space or ")"', '","'],
    ['group "a" at=1e999', 'a number a double can hold', '"1"'],
    ['group "a" at=01', 'a space', '"1"'],
    ['group "a"; group "b"', 'a space', '";"'],
    ['# a comment', 'a verb', '"#"'],
  ])('%j: expected %s, found %s', (line, expected, found) => {
    const [finding, ...others] = findingsOf(SCENE, line);
    expect(others).toEqual([]);
    expect(finding?.code).toBe('script-syntax');
    expect(finding?.message).toBe(`Expected ${expected}, found ${found}.`);
    expect(finding?.span.startLine).toBe(3);
  });

  it('goes on after a bad line and finds the next', () => {
    expect(
      findingsOf(SCENE, 'group', make.group('a'), 'joint a').map(({ code, span }) => [code, span.startLine]),
    ).toEqual([
      ['script-syntax', 3],
      ['script-syntax', 5],
    ]);
  });
});

describe('verbs, keys and values', () => {
  it('unknown ones are found, with the nearest that exist', () => {
    const [verb] = findingsOf(SCENE, 'joinr "a"');
    expect(verb?.code).toBe('script-verb-unknown');
    expect(verb?.help).toContain('Did you mean "joint"?');
    const line = make.joint('a').replace('side=', 'sise=');
    const found = findingsOf(SCENE, line);
    expect(found.map(({ code }) => code)).toEqual(['script-key-missing', 'script-key-unknown']);
    expect(found[1]?.help).toContain('Did you mean "side"');
    expect(marksOf(SCENE, 'constructor "a"')).toEqual([['script-verb-unknown', 'constructor']]);
    expect(marksOf(SCENE, `${make.group('a')} toString=1`)).toEqual([['script-key-unknown', 'toString']]);
  });

  it('all faults of a line are found at once', () => {
    const line = `${make.joint('a').replace('side=left', 'side=up').replace('at=(0 0 0)', 'at=(0 0)')} id="b"`;
    expect(marksOf(SCENE, line)).toEqual([
      ['script-value-wrong', 'up'],
      ['script-value-wrong', '(0 0)'],
      ['script-key-repeated', 'id'],
    ]);
  });

  it.each([
    ['id=1', 'a text in quotes'],
    ['parent=nobody', 'a name in quotes or none'],
    ['turn=(0 0 0 "1")', 'four numbers in parentheses'],
    ['size="1"', 'a number'],
    ['shape=star', 'one of ring, square, diamond, cross, arrow, ball, box, pin, compass'],
  ])('%s is refused: %s', (pair, expected) => {
    const key = pair.split('=')[0] as string;
    const line = make.control('a').replace(new RegExp(`${key}=("[^"]*"|\\([^)]*\\)|\\S+)`), pair);
    const [finding, ...others] = findingsOf(SCENE, line);
    expect(others).toEqual([]);
    expect(finding?.message).toBe(`"${key}" takes ${expected}.`);
  });
});

describe('names and references', () => {
  const limit = (name: string): string => `limit "${name}" channel=tx min=0`;

  it('a name is taken once, by nodes, constraints and solvers alike', () => {
    const follow = 'constrain "a" id="c" kind=point target="b" sources=("a") weights=(1) keep_offset=true';
    const [finding, ...others] = findingsOf(SCENE, make.group('a'), make.group('b'), follow);
    expect(others).toEqual([]);
    expect(finding?.code).toBe('script-name-taken');
    expect(finding?.related[0]?.span.startLine).toBe(3);
  });

  it('unknown, forward and wrong kinds are told apart', () => {
    expect(marksOf(SCENE, make.group('a', 'b'))).toEqual([['script-reference-unknown', '"b"']]);
    expect(marksOf(SCENE, make.group('a', 'b'), make.group('b'))).toEqual([
      ['script-reference-forward', '"b"'],
    ]);
    expect(marksOf(SCENE, make.group('a', 'a'))).toEqual([['script-reference-unknown', '"a"']]);
    expect(marksOf(SCENE, make.group('a'), limit('a'))).toEqual([['script-reference-kind', '"a"']]);
    expect(marksOf(SCENE, make.joint('a'), 'entry "a" key="k" value=1')).toEqual([
      ['script-reference-kind', '"a"'],
    ]);
  });

  it('one fault gives one finding: what hangs on a faulty line stays silent', () => {
    expect(
      marksOf(SCENE, make.control('a').replace('size=1', 'size=big'), limit('a'), make.group('b', 'a')),
    ).toEqual([['script-value-wrong', 'big']]);
    expect(marksOf(SCENE, 'control a', limit('a'), make.group('b', 'a')).map(([code]) => code)).toEqual([
      'script-syntax',
    ]);
    expect(
      marksOf(SCENE, make.control('a').replace('(0 0 0 1)', '(0 0 0 2)'), limit('a')).map(([code]) => code),
    ).toEqual(['script-turn-not-unit']);
  });
});

describe('statements about a node', () => {
  it.each([
    [
      'attr "a" name="x" default=1',
      'attr "a" name="x" default=2',
      'The attribute "x" of "a" is already given.',
    ],
    [
      'limit "a" channel=tx min=0',
      'limit "a" channel=tx max=1',
      'The limit of "tx" of "a" is already given.',
    ],
    ['lock "a" channels=(tx)', 'lock "a" channels=(ty tx)', 'The lock of "tx" of "a" is already given.'],
    [
      'show "a" shown=true selectable=false',
      'show "a" shown=true selectable=true',
      'What is shown of "a" is already given.',
    ],
  ])('%s is not said twice', (first, second, message) => {
    expect(findingsOf(SCENE, make.control('a'), first)).toEqual([]);
    expect(findingsOf(SCENE, make.control('a'), first, second).map((finding) => finding.message)).toEqual([
      message,
    ]);
  });

  it('a note has one entry for each key', () => {
    const entry = 'entry "n" key="k" value="v"';
    expect(findingsOf(SCENE, make.note('n'), entry, entry).map(({ code }) => code)).toEqual([
      'script-statement-repeated',
    ]);
  });

  it('lock and limit of one channel go together, in either order', () => {
    const lines = ['limit "a" channel=tx min=0', 'lock "a" channels=(tx)'];
    for (const order of [lines, [...lines].reverse()]) {
      const { rig } = runScript({ name: 'test.slip', text: seal([SCENE, make.control('a'), ...order]) });
      const [node] = rig?.nodes ?? [];
      expect(node?.kind === 'control' && node.channels).toEqual({ tx: { locked: true, min: 0, max: null } });
    }
  });

  it.each([
    ['limit "a" channel=tx min=1 max=0', 'min is 1 and max only 0.'],
    ['attr "a" name="x" default=2 max=1', 'The default 2 is above max, 1.'],
    ['attr "a" name="x" default=-1 min=0', 'The default -1 is below min, 0.'],
  ])('%s leaves no value', (line, message) => {
    expect(findingsOf(SCENE, make.control('a'), line).map((finding) => finding.message)).toEqual([message]);
  });
});

describe('constraints', () => {
  const constrain = (rest: string): string =>
    `constrain "c" id="c" kind=point target="b" ${rest} keep_offset=true`;
  const nodes = [SCENE, make.control('a'), make.group('b'), 'attr "a" name="mix" default=1'];

  it.each([
    ['sources=() weights=()', 'There are no sources.'],
    ['sources=("a") weights=(1 2)', 'There are 1 sources and 2 weights.'],
    ['sources=("a") weights=(-1)', 'A weight is below 0.'],
    ['sources=("a") weights=(1) blend=1', 'There is a blend, and 1 sources.'],
  ])('%s do not fit together', (rest, message) => {
    expect(findingsOf(...nodes, constrain(rest)).map((finding) => finding.message)).toEqual([message]);
  });

  it('blend by an attribute that is there', () => {
    const line = (attribute: string): string =>
      constrain(`sources=("a" "a") weights=(1 1) blend=attr("a" "${attribute}")`);
    expect(findingsOf(...nodes, line('mix'))).toEqual([]);
    expect(marksOf(...nodes, line('max'))).toEqual([['script-attribute-unknown', 'attr("a" "max")']]);
    expect(marksOf(...nodes, line('mix').replace('attr("a"', 'attr("b"'))).toEqual([
      ['script-reference-kind', 'attr("b" "mix")'],
    ]);
  });

  it('that follow one another in a ring are shown as a path', () => {
    const lines = [
      'constrain "x" id="x" kind=point target="b" sources=("d") weights=(1) keep_offset=true',
      'constrain "y" id="y" kind=point target="d" sources=("b") weights=(1) keep_offset=true',
    ];
    const [finding, ...others] = findingsOf(...nodes, make.group('d'), ...lines);
    expect(others).toEqual([]);
    expect(finding?.code).toBe('script-ring');
    expect(finding?.message).toBe('These wait for one another in a ring: "b" → "d".');
    expect(finding?.span.startLine).toBe(7);
  });
});

describe('solvers', () => {
  const nodes = [
    SCENE,
    make.control('g'),
    make.joint('s'),
    make.joint('m', 's'),
    make.joint('e', 'm'),
    make.joint('f', 'e'),
  ];
  const solve = (
    name: string,
    joints: string,
    rest = 'goal="g" pole="g" blend=1 stretch=0 stretch_limit=1 soft=0 swing=0',
  ): string => `two_bone "${name}" id="${name}" ${joints} ${rest}`;

  it('take three joints in a row', () => {
    expect(findingsOf(...nodes, solve('ik', 'start="s" mid="m" end="e"'))).toEqual([]);
    expect(marksOf(...nodes, solve('ik', 'start="s" mid="e" end="f"'))).toEqual([
      ['script-joints-not-in-row', '"e"'],
    ]);
    expect(marksOf(...nodes, solve('ik', 'start="g" mid="m" end="e"'))).toEqual([
      ['script-reference-kind', '"g"'],
    ]);
  });

  it('leave each joint to one solver', () => {
    const both = [solve('ik', 'start="s" mid="m" end="e"'), solve('other', 'start="m" mid="e" end="f"')];
    expect(marksOf(...nodes, ...both)).toEqual([['script-joint-solved-twice', '"m"']]);
  });
});
