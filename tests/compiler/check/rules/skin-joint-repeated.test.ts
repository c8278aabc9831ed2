import { describe, expect, it } from 'vitest';
import { fixed, told } from '../ruleFindings';

const CODE = 'skin-joint-repeated';
const withJoints = (joints: string): string => `chains:
  tail: { points: [[0, 10, 0], [0, 10, -10]], names: [base, tip] }
  ear: { points: [[0, 20, 0], [0, 25, 0]], names: [base, tip], parent: tail.base }
geometry:
  body: {}
skins:
  body: { geometry: body, joints: [${joints}] }
`;

describe(CODE, () => {
  it('points at the joint that its chain listed before', () => {
    expect(told(CODE, withJoints('tail, ear, tail.base'))).toEqual([
      ['tail.base', 'The skin "body" lists the joint "tail.base" again, after "tail".'],
    ]);
  });

  it('points at the chain whose joint was listed before', () => {
    expect(told(CODE, withJoints('ear.tip, ear'))).toEqual([
      ['ear', 'The skin "body" lists the joint "ear.tip" again, after "ear.tip".'],
    ]);
  });

  it('takes exactly that item out of the list', () => {
    expect(fixed(CODE, withJoints('tail, ear, tail.base'))).toBe(withJoints('tail, ear'));
    expect(fixed(CODE, withJoints('ear.tip, ear.tip, tail'))).toBe(withJoints('ear.tip, tail'));
  });

  it('is silent for joints of one name in two chains', () => {
    expect(told(CODE, withJoints('tail, ear'))).toEqual([]);
    expect(told(CODE, withJoints('tail.base, ear.base, ear.tip'))).toEqual([]);
  });
});
