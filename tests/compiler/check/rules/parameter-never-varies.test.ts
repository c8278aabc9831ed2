import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'parameter-never-varies';
const joints = (text: string): string => `params:\n  joints: { ${text} }\n`;

describe(CODE, () => {
  it('points at the parameter', () => {
    expect(told(CODE, joints('default: 5, min: 5, max: 5'))).toEqual([
      ['joints', 'The parameter "joints" can only be 5.'],
    ]);
  });

  it('sees the single whole number between two bounds', () => {
    const body = joints('default: 5, min: 4.5, max: 5.5');
    expect(told(CODE, body)).toEqual([]);
    expect(told(CODE, body.replace('default', 'whole: true, default')).map(([text]) => text)).toEqual([
      'joints',
    ]);
  });

  it('is silent about ranges and about parameters without bounds', () => {
    expect(told(CODE, joints('default: 5, min: 5, max: 6'))).toEqual([]);
    expect(told(CODE, joints('default: 5'))).toEqual([]);
  });
});
