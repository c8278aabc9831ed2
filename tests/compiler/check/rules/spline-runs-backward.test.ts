import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'spline-runs-backward';
const through = (controls: string, end = 'rope.c'): string => `chains:
  rope: { points: [[0, 50, 0], [0, 40, 0], [0, 30, 0]], names: [a, b, c] }
controls:
  top: { at: rope.a }
  middle: { at: rope.b }
  end: { at: ${end} }
solvers:
  bow: { kind: spline, joints: [rope.a, rope.b, rope.c], controls: ${controls} }
`;

describe(CODE, () => {
  it('points at the list and turns it round', () => {
    const body = through('[end, middle, top]');
    expect(told(CODE, body)).toEqual([
      [
        '[end, middle, top]',
        'The controls of "bow" run from "end", which is nearer to its last joint than to its first.',
      ],
    ]);
    expect(fixed(CODE, body)).toBe(through('[top, middle, end]'));
  });

  it('is silent for controls in the order of the joints', () => {
    expect(told(CODE, through('[top, middle, end]'))).toEqual([]);
  });
});
