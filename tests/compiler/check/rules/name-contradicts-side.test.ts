import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'name-contradicts-side';
const chain = (name: string, side: string): string =>
  `chains:\n  ${name}: { side: ${side}, points: [[4, 60, 0], [8, 66, 0]], names: [base, tip] }\n`;

describe(CODE, () => {
  it('points at the name and corrects the side', () => {
    expect(told(CODE, chain('ear_left', 'right'))).toEqual([
      ['ear_left', '"ear_left" says left in its name, but its side is right.'],
    ]);
    expect(fixed(CODE, chain('ear_left', 'right'))).toBe(chain('ear_left', 'left'));
  });

  it('sees that the copy of a sided name would be called after the wrong side', () => {
    expect(told(CODE, chain('left_ear', 'both')).map(([text]) => text)).toEqual(['left_ear']);
    expect(fixed(CODE, chain('left_ear', 'both'))).toBeNull();
  });

  it('is silent where both agree, where no side is stated, and about words that only contain a side', () => {
    expect(told(CODE, chain('left_ear', 'left'))).toEqual([]);
    expect(told(CODE, chain('left_ear', 'left').replace('side: left, ', ''))).toEqual([]);
    for (const name of ['cleft', 'bright', 'upright_ear'])
      expect(told(CODE, chain(name, 'both'))).toEqual([]);
  });
});
