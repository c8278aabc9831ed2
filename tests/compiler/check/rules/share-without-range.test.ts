import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'share-without-range';
const face = (attribute: string): string => `${headControl(`attributes: { grin: ${attribute} }`)}geometry:
  face: { mesh: face }
shapes:
  grin: { geometry: face, morph: grin, weight: head.grin }
`;

describe(CODE, () => {
  it('points at the attribute and bounds it', () => {
    expect(told(CODE, face('{ default: 0 }'))).toEqual([
      ['grin', '"grin" of "head" is read as weight, yet has no min and max.'],
    ]);
    expect(fixed(CODE, face('{ default: 0 }'))).toBe(face('{ min: 0, max: 1, default: 0 }'));
  });

  it('adds only the bound that is missing', () => {
    expect(fixed(CODE, face('{ min: 0 }'))).toBe(face('{ max: 1, min: 0 }'));
  });

  it("is silent about bounds of one's own choice and about attributes that are no shares", () => {
    expect(told(CODE, face('{ min: -1, max: 2 }'))).toEqual([]);
    expect(told(CODE, headControl('attributes: { grin: {} }'))).toEqual([]);
  });
});
