import { describe, expect, it } from 'vitest';
import { evaluateText } from './evaluateText';

const BODY = `params:
  stature: { default: 96, min: 30, max: 260 }
  joints: { default: 5, whole: true, min: 2 }
controls: { c: { size: "=params.stature" } }`;

describe('parameters', () => {
  it('take the default, or what the character gives', () => {
    expect(evaluateText(BODY).recipe.controls?.c?.size).toBe(96);
    const { recipe, found } = evaluateText(BODY, { stature: 30 });
    expect([recipe.controls?.c?.size, found]).toEqual([30, []]);
  });

  it.each([
    [
      { stature: 29.9 },
      'parameter-out-of-range',
      'stature',
      'The parameter "stature" is 29.9, but must be between 30 and 260.',
    ],
    [
      { stature: 261 },
      'parameter-out-of-range',
      'stature',
      'The parameter "stature" is 261, but must be between 30 and 260.',
    ],
    [
      { joints: 1 },
      'parameter-out-of-range',
      'joints',
      'The parameter "joints" is 1, but must be at least 2.',
    ],
    [
      { joints: 3.5 },
      'parameter-not-whole',
      'joints',
      'The parameter "joints" is 3.5, but must be a whole number.',
    ],
    [{ statur: 90 }, 'parameter-unknown', 'params', 'The recipe has no parameter "statur".'],
  ])('refuse %j, and stay at the default', (given, code, covered, message) => {
    const { recipe, found } = evaluateText(BODY, given);
    expect(found.map((finding) => [finding.code, finding.covered, finding.message])).toEqual([
      [code, covered, message],
    ]);
    expect(recipe.controls?.c?.size).toBe(96);
  });

  it('name the closest, or all there are', () => {
    expect(evaluateText(BODY, { statur: 90 }).found[0]?.help).toBe('Did you mean "stature"?');
    expect(evaluateText(BODY, { wombat: 90 }).found[0]?.help).toBe('Parameters are stature, joints.');
    expect(evaluateText('title: none', { wombat: 90 }).found[0]?.help).toBe('Parameters are none.');
  });

  it.each(['__proto__', 'constructor', 'toString'])('know no %s', (name) => {
    const given = JSON.parse(`{"${name}": 1}`) as Record<string, number>;
    expect(evaluateText(BODY, given).found.map(({ code }) => code)).toEqual(['parameter-unknown']);
  });

  it('check the default too', () => {
    const { found } = evaluateText('params: { p: { default: 5, max: 4 }, q: { default: 1.5, whole: true } }');
    expect(found.map(({ code, covered, message }) => [code, covered, message])).toEqual([
      ['parameter-out-of-range', '5', 'The parameter "p" is 5, but must be at most 4.'],
      ['parameter-not-whole', '1.5', 'The parameter "q" is 1.5, but must be a whole number.'],
    ]);
  });

  it('tell of inverted limits alone', () => {
    const { found } = evaluateText('params: { p: { default: 5, min: 4, max: 2 } }', { p: 9 });
    expect(found.map(({ code, covered, message }) => [code, covered, message])).toEqual([
      [
        'parameter-limits-inverted',
        '{ default: 5, min: 4, max: 2 }',
        'The parameter "p" has min 4 above max 2.',
      ],
    ]);
  });
});
