import { describe, expect, it } from 'vitest';
import { headControl } from '../headControl';
import { fixed, told } from '../ruleFindings';

const CODE = 'rotation-order-locks-up';
const limits = (x: number, y: number, z: number): string =>
  `channels: { rx: { min: -${x}, max: 1 }, ry: { min: -1, max: ${y} }, rz: { min: -${z}, max: ${z} } }`;

describe(CODE, () => {
  it('points at the control and writes an order that puts the least turned axis in the middle', () => {
    const body = headControl(limits(90, 90, 40));
    expect(told(CODE, body)).toEqual([
      ['head', '"head" turns y in the middle of xyz, where two axes become one at 90 degrees.'],
    ]);
    expect(fixed(CODE, body)).toContain('head:\n    rotation_order: xzy\n    at: head.base');
  });

  it('points at the order that was written, and writes over it', () => {
    const body = headControl('rotation_order: yzx', limits(90, 30, 90));
    expect(told(CODE, body).map(([text]) => text)).toEqual(['yzx']);
    expect(fixed(CODE, body)).toContain('rotation_order: zyx');
  });

  it('is silent where the middle stays away from a quarter turn, and where every axis comes near it', () => {
    expect(told(CODE, headControl(limits(90, 84, 40)))).toEqual([]);
    expect(told(CODE, headControl(limits(90, 90, 90)))).toEqual([]);
  });

  it('is silent where an axis is locked or has no limit', () => {
    expect(told(CODE, headControl(limits(90, 90, 40).replace('min: -90, max: 1', 'locked: true')))).toEqual(
      [],
    );
    expect(told(CODE, headControl('channels: { rz: { min: -10, max: 10 } }'))).toEqual([]);
  });
});
