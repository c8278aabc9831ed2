import fc from 'fast-check';
import { Matrix4, Quaternion, Vector3 } from 'three';
import { describe, expect, it } from 'vitest';
import { quatToAxes } from '@/compiler/math/mat4';
import {
  canonicalQuat,
  conjugateQuat,
  IDENTITY_QUAT,
  mirrorQuatX,
  multiplyQuat,
  normaliseQuat,
  quatBetween,
  quatFromAxes,
  quatFromAxisAngle,
  rotate,
  slerp,
} from '@/compiler/math/quat';
import { length, normalise } from '@/compiler/math/vec3';
import type { Quat } from '@/compiler/rig/Rig';
import { direction, point, rotation } from './arbitraries';
import { expectNear, expectSameRotation } from './expectNear';

/** Outside check: three.js 0.187 (MIT), an independent implementation of the same algebra. */
const threeQuat = (q: Quat): Quaternion => new Quaternion(q[0], q[1], q[2], q[3]);

describe('against three.js', () => {
  it('multiplies, turns vectors and mixes alike', () => {
    fc.assert(
      fc.property(rotation, rotation, point, fc.double({ min: 0, max: 1, noNaN: true }), (a, b, v, t) => {
        expectNear(multiplyQuat(a, b), threeQuat(a).multiply(threeQuat(b)).toArray());
        expectNear(rotate(a, v), new Vector3(...v).applyQuaternion(threeQuat(a)).toArray(), 1e-9);
        expectSameRotation(slerp(a, b, t), threeQuat(a).slerp(threeQuat(b), t).toArray(), 1e-7);
      }),
    );
  });

  it('reads rotations from axes and writes them back', () => {
    fc.assert(
      fc.property(rotation, (q) => {
        const matrix = new Matrix4().makeRotationFromQuaternion(threeQuat(q));
        const [x, y, z] = quatToAxes(q);
        const e = matrix.elements;
        expectNear([...x, ...y, ...z], [e[0], e[1], e[2], e[4], e[5], e[6], e[8], e[9], e[10]]);
        expectSameRotation(quatFromAxes(x, y, z), q);
      }),
    );
  });

  it('turns about an axis alike', () => {
    fc.assert(
      fc.property(direction, fc.double({ min: -7, max: 7, noNaN: true }), (axis, angle) => {
        const expected = new Quaternion().setFromAxisAngle(new Vector3(...axis).normalize(), angle);
        expectNear(quatFromAxisAngle(axis, angle), expected.toArray());
      }),
    );
  });
});

describe('shortest arcs', () => {
  it('carry one direction onto another', () => {
    fc.assert(
      fc.property(direction, direction, (a, b) => {
        const q = quatBetween(a, b);
        expectNear(rotate(q, normalise(a)), normalise(b), 1e-9);
        expect(Math.hypot(...q)).toBeCloseTo(1, 12);
      }),
    );
  });

  it('keep their digits near half a turn', () => {
    const q = quatBetween([1, 0, 0], [-1, 1e-7, 0]);
    expectNear(rotate(q, [1, 0, 0]), normalise([-1, 1e-7, 0]), 1e-14);
  });

  it('take the stated axis for opposite directions, and identity for zero', () => {
    expect(quatBetween([2, 0, 0], [-1, 0, 0])).toEqual([0, 0, 1, 0]);
    expect(quatBetween([0, 0, 0], [1, 0, 0])).toBe(IDENTITY_QUAT);
  });

  it('slerp goes the shorter way whatever the signs', () => {
    fc.assert(
      fc.property(rotation, rotation, fc.double({ min: 0, max: 1, noNaN: true }), (a, b, t) => {
        const flipped = b.map((value) => -value) as unknown as Quat;
        expectSameRotation(slerp(a, flipped, t), slerp(a, b, t), 1e-9);
        expectSameRotation(slerp(a, b, 0), a, 1e-9);
        expectSameRotation(slerp(a, b, 1), b, 1e-9);
      }),
    );
  });
});

describe('algebra', () => {
  it('undoes a rotation by its conjugate and keeps lengths', () => {
    fc.assert(
      fc.property(rotation, point, (q, v) => {
        expectNear(rotate(conjugateQuat(q), rotate(q, v)), v, 1e-9);
        expect(length(rotate(q, v))).toBeCloseTo(length(v), 8);
      }),
    );
  });

  it('mirrors rotations so that mirroring the turned is turning the mirrored', () => {
    fc.assert(
      fc.property(rotation, point, (q, v) => {
        const [x, y, z] = rotate(q, v);
        expectNear(rotate(mirrorQuatX(q), [-v[0], v[1], v[2]]), [-x, y, z], 1e-9);
      }),
    );
  });

  it('chooses one sign of a rotation and shows no −0', () => {
    fc.assert(
      fc.property(rotation, (q) => {
        const flipped = q.map((value) => -value) as unknown as Quat;
        expect(canonicalQuat(flipped)).toEqual(canonicalQuat(q));
        expect(canonicalQuat(q).some((value) => Object.is(value, -0))).toBe(false);
      }),
    );
    expect(canonicalQuat([-1, 0, 0, 0])).toEqual([1, 0, 0, 0]);
  });

  it('gives identity for a quaternion or an axis without length', () => {
    expect(normaliseQuat([0, 0, 0, 0])).toEqual(IDENTITY_QUAT);
    expect(quatFromAxisAngle([0, 0, 0], 1)).toBe(IDENTITY_QUAT);
  });
});
