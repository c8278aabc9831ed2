import { describe, expect, it } from 'vitest';
import { evaluateText, faultsOf, WORLD } from './evaluateText';

describe('faults of expressions', () => {
  it.each([
    ['1 +', 'expression-syntax'],
    ['(1', 'expression-syntax'],
    ['1 2', 'expression-syntax'],
    ['', 'expression-syntax'],
    ["params['x']", 'expression-syntax'],
    ["landmarks['hips'].x", 'expression-syntax'],
    ['params.x + landmarks.hips', 'expression-failed'],
    ['sqrt(landmarks.hips)', 'expression-failed'],
    ['mix(landmarks.hips, 3, 0.5)', 'expression-failed'],
    ['landmarks.hips', 'expression-type'],
    ['true', 'expression-type'],
    ["'words'", 'expression-type'],
    ['1 / 0', 'expression-not-finite'],
    ['sqrt(-1)', 'expression-not-finite'],
    ['1e9 + 1', 'expression-too-large'],
    ['-2e9', 'expression-too-large'],
  ])('%s gives %s', (expression, code) => {
    const found = faultsOf(expression);
    expect(found.map((finding) => finding.code)).toEqual([code]);
    expect(`${found[0]?.message} ${found[0]?.help}`).not.toMatch(/\{\w+\}|undefined|\[object/);
  });

  it('says what it gives and what was wanted', () => {
    expect(faultsOf('landmarks.hips')[0]?.message).toBe('This expression gives a point, not a number.');
    const { found } = evaluateText(`${WORLD}\n  made: { at: "=params.x" }`);
    expect(found.map(({ message }) => message)).toEqual(['This expression gives a number, not a point.']);
    expect(faultsOf('1 / 0')[0]?.message).toBe('This expression gives Infinity.');
  });

  it('allows the largest number there is', () => expect(faultsOf('1e9')).toEqual([]));

  it('refuses one that is too long or too deep by its own limits', () => {
    expect(faultsOf(`${'('.repeat(60)}1${')'.repeat(60)}`).map(({ code }) => code)).toEqual([
      'expression-syntax',
    ]);
    expect(faultsOf(Array(300).fill('1').join('+')).map(({ code }) => code)).toEqual(['expression-syntax']);
  });

  it('poisons the entry, and tells of it once', () => {
    const { found, poisoned } = evaluateText(
      'landmarks:\n  a: { at: "=nothing(" }\n  b: { at: "=landmarks.a" }\n  c: { at: "=landmarks.b" }',
    );
    expect(found.map(({ code }) => code)).toEqual(['expression-syntax']);
    expect(poisoned).toEqual(['landmarks/a', 'landmarks/b', 'landmarks/c']);
  });
});

describe('names that are not there', () => {
  it.each([
    ['double', '"=params.xx * 2"'],
    ['single', "'=params.xx * 2'"],
    ['no', '=params.xx * 2'],
  ])('are covered exactly inside %s quotes', (_, scalar) => {
    const { found } = evaluateText(`params: { x: { default: 3 } }\ncontrols: { c: { size: ${scalar} } }`);
    expect(found.map(({ code, covered, message }) => [code, covered, message])).toEqual([
      ['expression-unknown-name', 'xx', 'There is no parameter "xx".'],
    ]);
    expect(found[0]?.help).toBe('Did you mean "x"?');
    expect(found[0]?.fix?.edits).toEqual([{ span: found[0]?.span, newText: 'x' }]);
  });

  it('say line and column of the name', () => {
    const { found } = evaluateText('controls:\n  c: { size: "=1 + params.none" }');
    expect(found[0]?.span).toMatchObject({ startLine: 4, startColumn: 27, endLine: 4, endColumn: 31 });
    expect(found[0]?.covered).toBe('none');
  });

  it('are each told of, in the order of the expression', () => {
    const found = faultsOf('params.nothing + landmarks.nowhere.x');
    expect(found.map(({ covered, message }) => [covered, message])).toEqual([
      ['nothing', 'There is no parameter "nothing".'],
      ['nowhere', 'There is no landmark "nowhere".'],
    ]);
    expect(found.every(({ fix, help }) => !fix && help === 'Add it, or read one that exists.')).toBe(true);
  });

  it('offer a landmark by its closest name', () => {
    expect(faultsOf('landmarks.kne.x')[0]).toMatchObject({ covered: 'kne', help: 'Did you mean "knee"?' });
  });

  it('may be functions, whose closest is offered', () => {
    expect(faultsOf('mixx(1, 2, 0.5)')[0]).toMatchObject({
      code: 'expression-unknown-name',
      covered: 'mixx',
      message: 'There is no function "mixx".',
      help: 'Did you mean "mix"?',
    });
  });

  it.each([
    ['a pattern that takes exponential time', `"${'a'.repeat(60)}!".matches("(a+)+$") ? 1 : 2`, 'matches'],
    [
      'loops in loops',
      Array.from({ length: 12 }, (_, i) => i).reduce(
        (inner, i) => `[1,2,3,4,5,6,7,8,9,10,11,12].map(v${i}, ${inner})`,
        '1',
      ),
      'map',
    ],
    ['a clock', 'timestamp("2020-01-01T00:00:00Z").getSeconds()', 'timestamp'],
    ['a type', 'double("1")', 'double'],
  ])('hold no function of the library itself: %s', (_, expression, name) => {
    const found = faultsOf(expression);
    expect(new Set(found.map(({ code }) => code))).toEqual(new Set(['expression-unknown-name']));
    expect(found.map(({ message }) => message)).toContain(`There is no function "${name}".`);
  });

  it('are silent where the name was refused before', () => {
    const { found } = evaluateText('params: { p: { default: big } }\ncontrols: { c: { size: "=params.p" } }');
    expect(found.map(({ code }) => code)).toEqual(['wrong-type']);
  });

  it('cover the whole text where quoting changed it', () => {
    const { found } = evaluateText('controls: { c: { size: "=params.\\u006eone" } }');
    expect(found.map(({ covered }) => covered)).toEqual(['"=params.\\u006eone"']);
  });
});

describe('landmarks in a ring', () => {
  it('are shown as a path, once, with every place', () => {
    const { found, textOf, poisoned } = evaluateText(`landmarks:
  a: { at: ["=landmarks.b.x", 0, 0] }
  b: { at: "=landmarks.c" }
  c: { at: ["=landmarks.a.x + landmarks.a.y", 0, 0] }
  d: { at: "=landmarks.a" }`);
    expect(found).toHaveLength(1);
    expect(found[0]).toMatchObject({
      code: 'expression-ring',
      message: 'These landmarks are worked out from one another in a ring: "a" → "b" → "c" → "a".',
      covered: '["=landmarks.b.x", 0, 0]',
    });
    expect(found[0]?.related.map(({ span, label }) => [textOf(span), label])).toEqual([
      ['"=landmarks.c"', '"b" is worked out here'],
      ['["=landmarks.a.x + landmarks.a.y", 0, 0]', '"c" is worked out here'],
    ]);
    expect(poisoned).toEqual(['landmarks/a', 'landmarks/b', 'landmarks/c', 'landmarks/d']);
  });

  it('are told of apart when they are apart', () => {
    const { found } = evaluateText(
      'landmarks: { a: { at: "=landmarks.b" }, b: { at: "=landmarks.a" }, c: { at: "=landmarks.c" } }',
    );
    expect(found.map(({ code }) => code)).toEqual(['expression-ring', 'expression-ring']);
  });

  it('may be thousands, or none of thousands in a row', () => {
    const row = (last: string) => {
      const lines = Array.from({ length: 5000 }, (_, i) => `  p${i}: { at: "=landmarks.p${i + 1}" }`);
      return `landmarks:\n${lines.join('\n')}\n  p5000: { at: ${last} }`;
    };
    expect(evaluateText(row('[1, 2, 3]')).recipe.landmarks?.p0?.at).toEqual([1, 2, 3]);
    expect(evaluateText(row('"=landmarks.p0"')).found.map(({ code }) => code)).toEqual(['expression-ring']);
  });

  it('may be one alone', () => {
    const { found } = evaluateText('landmarks: { a: { at: "=landmarks.a" } }');
    expect(found.map(({ message }) => message)).toEqual([
      'These landmarks are worked out from one another in a ring: "a" → "a".',
    ]);
  });
});
