import { describe, expect, it } from 'vitest';
import { evaluateText, faultsOf, numberOf, pointOf } from './evaluateText';

describe('numbers', () => {
  it.each([
    ['84 / 85', 84 / 85],
    ['1 / 2', 0.5],
    ['7 / 2 * 2', 7],
    ['params.x * 2', 6],
    ['2 * params.x', 6],
    ['params.x / 2', 1.5],
    ['params.half + 1', 1.5],
    ['-params.x', -3],
    ['-(2 - 5)', 3],
    ['2 + 3 * 4', 14],
    ['(2 + 3) * 4', 20],
    ['10 - 4 - 3', 3],
    ['7 % 4', 3],
    ['1e3', 1000],
    ['params.x > 2 ? 10 : 20', 10],
    ['params.x > 2 && params.half < 0.5 ? 10 : 20', 20],
    ['params.x == 3 ? 1 : 0', 1],
    ['landmarks.hips.y', 50],
    ['landmarks.hips.y - landmarks.knee.y', 24],
    ['0 * -1', 0],
  ])('%s is %d', (expression, value) => expect(numberOf(expression)).toBe(value));
});

/** Worked by hand: hips (0, 50, 4) and knee (8, 26, 6) lie 8, 24 and 2 apart, and 64 + 576 + 4 = 644. */
describe('functions', () => {
  it.each([
    ['dist(landmarks.hips, landmarks.knee)', Math.sqrt(644)],
    ['dist(landmarks.hips, landmarks.hips)', 0],
    ['dist(landmarks.knee, landmarks.knee.right)', 16],
    ['mix(10, 20, 0.25)', 12.5],
    ['mix(10, 20, 0)', 10],
    ['mix(10, 20, 1)', 20],
    ['mix(10, 20, 2)', 30],
    ['mid(10, 21)', 15.5],
    ['mid(landmarks.hips, landmarks.knee).y', 38],
    ['min(3, params.half)', 0.5],
    ['max(3, params.half)', 3],
    ['abs(2 - 5)', 3],
    ['sqrt(2.25)', 1.5],
    ['clamp(5, 0, 1)', 1],
    ['clamp(-5, 0, 1)', 0],
    ['clamp(0.5, 0, 1)', 0.5],
  ])('%s is %d', (expression, value) => expect(numberOf(expression)).toBeCloseTo(value, 12));

  it.each([
    ['mid(landmarks.hips, landmarks.knee)', [4, 38, 5]],
    ['mix(landmarks.hips, landmarks.knee, 0.25)', [2, 44, 4.5]],
    ['landmarks.knee', [8, 26, 6]],
    ['landmarks.knee.right', [-8, 26, 6]],
    ['landmarks.elbow.right', [-21, 77, -3]],
    ['landmarks.hips.right', [0, 50, 4]],
    ['params.x > 2 ? landmarks.hips : landmarks.knee', [0, 50, 4]],
  ])('%s is a point', (expression, value) => expect(pointOf(expression)).toEqual(value));

  it('mirrors in the plane of the scene, wherever up is', () => {
    const { recipe } = evaluateText(
      'scene: { up: +z, forward: +x }\nlandmarks:\n  knee: { side: left, at: [1, 2, 3] }\n  other: { at: "=landmarks.knee.right" }',
    );
    expect(recipe.landmarks?.other?.at).toEqual([1, -2, 3]);
  });
});

describe('places of expressions', () => {
  it('are worked out in lists, in points and in inner maps', () => {
    const { recipe, found } = evaluateText(`params: { x: { default: 3 } }
landmarks:
  a: { at: ["=params.x", 1, "=params.x * 2"] }
  later: { at: "=mid(landmarks.a, landmarks.early)" }
  early: { at: [5, 3, 0] }
parts:
  arm: { kind: limb, points: [a, "=landmarks.early", [0, "=params.x", 0]], bend: "=landmarks.a", pole: { distance: "=params.x / 4" } }
controls:
  c: { at: a, channels: { rx: { min: "=-params.x" } } }`);
    expect(found).toEqual([]);
    expect(recipe.landmarks).toMatchObject({ a: { at: [3, 1, 6] }, later: { at: [4, 2, 3] } });
    expect(recipe.parts?.arm).toMatchObject({
      points: ['a', [5, 3, 0], [0, 3, 0]],
      bend: [3, 1, 6],
      pole: { distance: 0.75 },
    });
    expect(recipe.controls?.c?.channels?.rx?.min).toBe(-3);
  });

  it('are none in titles and notes', () => {
    const { recipe, found } = evaluateText(`title: "=1 + 1"
landmarks: { a: { at: [0, 0, 0], note: "=params.none" } }
notes: { n: "=nonsense(" }`);
    expect(found).toEqual([]);
    expect(recipe.title).toBe('=1 + 1');
    expect(recipe.notes).toEqual({ n: '=nonsense(' });
  });

  it('give what a person wrote nothing to run', () => {
    for (const text of [
      'constructor',
      'params.constructor',
      'params.__proto__.x',
      'globalThis',
      'params["x"].constructor',
    ]) {
      expect(numberOf(text)).toBeNull();
      expect(faultsOf(text)).toHaveLength(1);
    }
  });
});
