import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'source-without-weight';
const withWeights = (one: string, two: string, rest = ''): string => `params:
  share: { default: 0, min: 0, max: 1, unit: share, note: how far the neck follows the second control }
chains:
  neck: { points: [[0, 50, 0], [0, 60, 0]], names: [a, b] }
controls:
  one: { at: neck.a, attributes: { mix: { default: 1, min: 0, max: 1 } } }
  two: { at: neck.b }
constraints:
  turn: { kind: orient, target: neck.a, sources: { one: ${one}, two: ${two} }${rest} }
`;

describe(CODE, () => {
  it('points at the weight', () => {
    expect(told(CODE, withWeights('1', '0.0'))).toEqual([
      ['0.0', 'The weight of "two" in "turn" is 0, so "neck.a" never follows it.'],
    ]);
  });

  it('leaves the source out', () => {
    expect(fixed(CODE, withWeights('1', '0.0'))).toBe(withWeights('1', '0.0').replace(', two: 0.0', ''));
    expect(fixed(CODE, withWeights('0', '1'))).toBe(withWeights('0', '1').replace('one: 0, ', ''));
  });

  it('is silent for any other weight', () => {
    expect(told(CODE, withWeights('1', '0.001'))).toEqual([]);
  });

  it('is silent for an expression, which another character may make count', () => {
    expect(told(CODE, withWeights('1', '"=params.share"'))).toEqual([]);
  });

  it('is silent where a blend stands in place of the weights', () => {
    expect(told(CODE, withWeights('1', '0', ', blend: one.mix'))).toEqual([]);
  });
});
