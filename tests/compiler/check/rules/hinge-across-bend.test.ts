import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'hinge-across-bend';
const STILL = '{ min: 0, max: 0 }';
const leg = (limits: string, rest = ''): string => `chains:
  leg:
    side: both
    points: [[10, 50, 0], [10, 30, 4], [10, 10, 0]]
    names: [hip, knee, ankle]
    limits: { knee: ${limits} }${rest}
controls:
  foot: { side: both, at: leg.left.ankle }
  pole: { side: both, pole_of: { joints: [leg.left.hip, leg.left.knee, leg.left.ankle] } }
solvers:
  bend: { side: both, kind: two_bone, joints: [leg.left.hip, leg.left.knee, leg.left.ankle], goal: foot.left, pole: pole.left }
`;

describe(CODE, () => {
  it('points at the joint whose limits leave another turn than the fold', () => {
    expect(told(CODE, leg(`{ rx: ${STILL}, ry: { min: -9, max: 90 }, rz: ${STILL} }`))).toEqual([
      [
        'knee',
        'The limits of "leg.left.knee" leave only ry, 90 degrees off the axis about which the limb is bent.',
      ],
    ]);
  });

  it('is silent for the turn about which the limb is bent, on both sides and for other axes', () => {
    expect(told(CODE, leg(`{ rx: ${STILL}, ry: ${STILL}, rz: { min: -9, max: 90 } }`))).toEqual([]);
    // With the up axis along z, the hinge is the joint's own y.
    const orient = '\n    orient: { aim: +x, up: +z }';
    expect(told(CODE, leg(`{ rx: ${STILL}, ry: { min: -90, max: 90 }, rz: ${STILL} }`, orient))).toEqual([]);
  });

  it('allows 30 degrees between the hinge and the bend', () => {
    const turned = (toward: string) =>
      leg(`{ rx: ${STILL}, ry: ${STILL}, rz: { min: -90, max: 90 } }`, `\n    orient: { toward: ${toward} }`);
    // The hinge is at right angles to the bone (0, −20, 4) and to toward: 25.4 and 34.9 degrees off the x axis.
    expect(told(CODE, turned('[0.4226, 0, 0.9063]'))).toEqual([]);
    expect(told(CODE, turned('[0.5641, 0, 0.8257]'))[0]?.[1]).toContain('35 degrees');
  });

  it('is silent for a joint that is no hinge', () => {
    expect(told(CODE, leg('{ ry: { min: -9, max: 90 } }'))).toEqual([]);
    expect(told(CODE, leg(`{ rx: ${STILL}, ry: { min: -9, max: 90 } }`))).toEqual([]);
    expect(told(CODE, leg(`{ rx: ${STILL}, ry: ${STILL}, rz: ${STILL} }`))).toEqual([]);
  });
});
