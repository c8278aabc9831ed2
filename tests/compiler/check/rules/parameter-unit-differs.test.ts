import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'parameter-unit-differs';
const inUnits = (unit: string, scene: string): string =>
  `scene: { unit: ${scene} }\nparams:\n  stature: { default: 9, unit: ${unit} }\n`;

describe(CODE, () => {
  it("points at the unit and writes the scene's", () => {
    expect(told(CODE, inUnits('Metres', 'cm'))).toEqual([
      [
        'Metres',
        'The parameter "stature" is given in Metres, but the scene is in cm, and nothing is converted.',
      ],
    ]);
    expect(fixed(CODE, inUnits('cm', 'mm'))).toBe(inUnits('mm', 'mm'));
  });

  it("is silent about the scene's unit in full, and about what is no length", () => {
    expect(told(CODE, inUnits('metres', 'm'))).toEqual([]);
    for (const unit of ['degrees', 'joints', 'share']) expect(told(CODE, inUnits(unit, 'cm'))).toEqual([]);
  });
});
