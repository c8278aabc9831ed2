import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'chain-folds-back';
const through = (points: string, rest = ''): string => `chains:\n  tail: { points: ${points}${rest} }\n`;

describe(CODE, () => {
  it('points at the point where the chain turns back', () => {
    // The second bone turns back by 180 − atan(2 / 8) = 166.0 degrees.
    expect(told(CODE, through('[[0, 10, 0], [0, 10, -20], [0, 12, -12]]'))).toEqual([
      ['[0, 10, -20]', 'At "tail.02" the chain turns back by 166 degrees.'],
    ]);
  });

  it('is silent just below 150 degrees', () => {
    // tan 31° = 0.6009, so the bone turns back by 149 degrees.
    expect(told(CODE, through('[[0, 10, 0], [0, 10, -20], [0, 16.009, -10]]'))).toEqual([]);
  });

  it('is silent for a coil, whose bones turn on gently', () => {
    const coil = '[[0, 0, 0], [0, 10, 0], [0, 10, 10], [0, 0, 10], [0, 0, 2]]';
    expect(told(CODE, through(coil))).toEqual([]);
    expect(told(CODE, through(coil, ', joints: 30'))).toEqual([]);
  });

  it('tells one chain once', () => {
    expect(told(CODE, through('[[0, 0, 0], [0, 9, 0], [0, 1, 0], [0, 8, 0]]'))).toHaveLength(1);
  });
});
