import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'sole-not-level';
const footWith = (heel: string, inner: string, scene = ''): string => `${scene}chains:
  foot: { points: [[0, 8, 0], [0, 2, 12], [0, 1, 18]], names: [ankle, ball, toe] }
controls:
  foot: { at: [0, 3, 1], align: foot.ankle }
  sole: { at: [0, 8, 0], parent: foot }
  toes: { at: foot.ball, parent: sole }
constraints:
  ankle: { kind: orient, target: foot.ankle, sources: { sole: 1 } }
  ball: { kind: orient, target: foot.ball, sources: { toes: 1 } }
solvers:
  roll:
    kind: foot_roll
    foot: foot
    ankle: sole
    toes: toes
    heel: ${heel}
    ball: [0, 0, 12]
    toe: [0, 0, 19]
    inner: ${inner}
    outer: [4, 0, 10]
`;

describe(CODE, () => {
  it('points at the highest point, whichever way the foot control is turned', () => {
    expect(told(CODE, footWith('[0, 0, -5]', '[-4, 6.5, 10]'))).toEqual([
      ['[-4, 6.5, 10]', 'The point inner of "roll" lies 6.5 cm above heel.'],
    ]);
  });

  it('is silent for a thick heel', () => {
    // A quarter of the 24 cm from heel to toe is 6 cm.
    expect(told(CODE, footWith('[0, 5.5, -5]', '[-4, 0, 10]'))).toEqual([]);
  });

  it('is silent for a ball inside the foot, where its joint is', () => {
    const body = footWith('[0, 0, -5]', '[-4, 0, 10]').replace('ball: [0, 0, 12]', 'ball: [0, 9, 12]');
    expect(told(CODE, body)).toEqual([]);
  });

  it('tells a heel in the air', () => {
    expect(told(CODE, footWith('[0, 9, -5]', '[-4, 0, 10]')).map(([text]) => text)).toEqual(['[0, 9, -5]']);
  });
});
