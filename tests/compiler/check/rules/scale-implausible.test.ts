import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'scale-implausible';
const tall = (height: number, scene = ''): string =>
  `${scene}chains:\n  mast: { points: [[0, 0, 0], [0, ${height}, 0]] }\n`;

describe(CODE, () => {
  it('points at the unit', () => {
    expect(told(CODE, tall(1800, 'scene: { unit: m }\n'))).toEqual([
      ['m', 'The rig measures 1800 m from end to end.'],
    ]);
  });

  it('points at the recipe where no unit is written', () => {
    expect(told(CODE, tall(0.05))).toEqual([['demo', 'The rig measures 0.05 cm from end to end.']]);
  });

  it('is silent from a millimetre to a kilometre', () => {
    expect(told(CODE, tall(0.1))).toEqual([]);
    expect(told(CODE, tall(100000))).toEqual([]);
    expect(told(CODE, tall(1, 'scene: { unit: mm }\n'))).toEqual([]);
  });

  it('is silent for a rig of one place', () => {
    expect(told(CODE, 'controls:\n  one: { at: [0, 0, 0] }\n')).toEqual([]);
  });
});
