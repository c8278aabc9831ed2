import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'control-size-extreme';

describe(CODE, () => {
  it('points at a size far too large or too small, and writes 1', () => {
    const body = headControl('size: 300');
    expect(told(CODE, body).map(([text]) => text)).toEqual(['300']);
    expect(told(CODE, headControl('size: 0.001')).map(([text]) => text)).toEqual(['0.001']);
    expect(fixed(CODE, body)).toBe(headControl('size: 1'));
  });

  it('is silent about sizes that people choose, and where none was written', () => {
    expect(told(CODE, headControl('size: 5'))).toEqual([]);
    expect(told(CODE, headControl('size: 0.3'))).toEqual([]);
    expect(told(CODE, headControl())).toEqual([]);
  });
});
