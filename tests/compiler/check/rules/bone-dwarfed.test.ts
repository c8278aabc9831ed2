import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'bone-dwarfed';
const through = (points: string, rest = ''): string => `chains:\n  tail: { points: ${points}${rest} }\n`;

describe(CODE, () => {
  it('points at the end of the short bone', () => {
    expect(told(CODE, through('[[0, 0, 0], [0, 10, 0], [0, 10.2, 0], [0, 22.2, 0]]'))).toEqual([
      ['[0, 10.2, 0]', 'The bone from "tail.02" to "tail.03" is 2 % as long as the one beside it.'],
    ]);
  });

  it('tells a short bone at either end', () => {
    expect(told(CODE, through('[[0, 0, 0], [0, 0.1, 0], [0, 10, 0]]')).map(([text]) => text)).toEqual([
      '[0, 0.1, 0]',
    ]);
    expect(told(CODE, through('[[0, 0, 0], [0, 10, 0], [0, 10.1, 0]]')).map(([text]) => text)).toEqual([
      '[0, 10.1, 0]',
    ]);
  });

  it('is silent for a bone a twentieth as long, and for chains that shrink evenly', () => {
    expect(told(CODE, through('[[0, 0, 0], [0, 10, 0], [0, 10.5, 0], [0, 20, 0]]'))).toEqual([]);
    expect(told(CODE, through('[[0, 0, 0], [0, 100, 0], [0, 110, 0], [0, 111, 0]]'))).toEqual([]);
  });

  it('is silent where joints are spread, and for a single bone', () => {
    expect(told(CODE, through('[[0, 0, 0], [0, 0.1, 0], [0, 10, 0]]', ', joints: 5'))).toEqual([]);
    expect(told(CODE, through('[[0, 0, 0], [0, 0.1, 0]]'))).toEqual([]);
  });
});
