import { describe, expect, it } from 'vitest';
import { HEAD, shapeOf } from './shapeOf';

const NUMBER = 'a number, or an expression that begins with =';
const POINT = 'three numbers in brackets, or an expression that begins with =';
const PLACE = 'three numbers in brackets, a landmark or joint, or an expression that begins with =';

/** A value with two spellings is refused by both branches of its schema; a person hears of it once. */
describe('points and places', () => {
  it.each([
    [
      'landmarks: { hip: { at: [1, 2] } }',
      'list-size',
      '[1, 2]',
      '"at" of "hip" has 2 numbers, where three numbers are needed.',
    ],
    [
      'landmarks: { hip: { at: [1, 2, 3, 4] } }',
      'list-size',
      '[1, 2, 3, 4]',
      '"at" of "hip" has 4 numbers, where three numbers are needed.',
    ],
    ['landmarks: { hip: { at: hips } }', 'text-not-legal', 'hips', `"hips" is not ${POINT}.`],
    [
      'landmarks: { hip: { at: 3 } }',
      'wrong-type',
      '3',
      '"at" of "hip" is a number, not three numbers in brackets.',
    ],
    ['landmarks: { hip: { at: [1, two, 3] } }', 'text-not-legal', 'two', `"two" is not ${NUMBER}.`],
    [
      'landmarks: { hip: { at: [1, true, 3] } }',
      'wrong-type',
      'true',
      `Item 2 of "at" is true or false, not ${NUMBER}.`,
    ],
    [
      'controls: { c: { at: [1, 2] } }',
      'list-size',
      '[1, 2]',
      '"at" of "c" has 2 numbers, where three numbers are needed.',
    ],
    ['controls: { c: { at: A B } }', 'text-not-legal', 'A B', `"A B" is not ${PLACE}.`],
    [
      'controls: { c: { at: { x: 1 } } }',
      'wrong-type',
      '{ x: 1 }',
      '"at" of "c" is a map, not three numbers in brackets.',
    ],
    [
      'chains: { arm: { points: [a, [1, 2]] } }',
      'list-size',
      '[1, 2]',
      'Item 2 of "points" has 2 numbers, where three numbers are needed.',
    ],
    ['parts: { arm: { kind: limb, points: [a, b, C] } }', 'text-not-legal', 'C', `"C" is not ${PLACE}.`],
    [
      'controls: { c: { pole_of: { joints: [a, b, c], bend: up } } }',
      'text-not-legal',
      'up',
      `"up" is not ${POINT}.`,
    ],
  ])('%s', (rest, code, covered, message) => {
    const { found } = shapeOf(`${HEAD}${rest}\n`);
    expect(found.map(({ finding, text }) => [finding.code, text, finding.message])).toEqual([
      [code, covered, message],
    ]);
  });

  it.each([
    'landmarks: { hip: { at: "=mid(landmarks.a, landmarks.b)" } }',
    'controls: { c: { at: spine.chest } }',
    'controls: { c: { at: [0, "=params.a", 0] } }',
  ])('allows %s', (rest) => expect(shapeOf(`${HEAD}${rest}\n`).found).toEqual([]));
});
