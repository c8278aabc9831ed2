import fc from 'fast-check';
import { Euler, type EulerOrder, MathUtils, Quaternion } from 'three';
import { describe, expect, it } from 'vitest';
import { eulerToQuat, quatToEuler } from '@/compiler/math/euler';
import { quatToAxes } from '@/compiler/math/mat4';
import { multiplyQuat, quatFromAxisAngle } from '@/compiler/math/quat';
import type { RotationOrder, Vec3 } from '@/compiler/rig/Rig';
import { degrees, order, ROTATION_ORDERS, rotation } from './arbitraries';
import { expectNear, expectSameRotation } from './expectNear';
import { readReference } from './readReference';

interface EulerCase {
  readonly order_extrinsic: string;
  readonly order_intrinsic: string;
  readonly angles_deg: readonly [number, number, number];
  readonly matrix_rows: readonly Vec3[];
  readonly quaternion_xyzw: readonly number[];
  readonly gimbal_lock: boolean;
}

const AXIS_INDEX: Readonly<Record<string, number>> = { x: 0, y: 1, z: 2 };

/**
 * Source: tests/data/numeric/euler_12_orders.json, products of elementary rotations computed independently of this
 * code. Its angles belong to the intrinsic order; about fixed axes the same product is read from right to left. The
 * six proper orders (first axis = last) are not rotation orders of a control and are left out.
 */
const { cases } = readReference<{ cases: readonly EulerCase[] }>('euler_12_orders.json');
const ours = cases
  .filter(({ order_extrinsic: name }) => new Set(name).size === 3)
  .map((one) => {
    const fixedOrder = one.order_extrinsic.toLowerCase() as RotationOrder;
    const angles: [number, number, number] = [0, 0, 0];
    [...one.order_intrinsic.toLowerCase()].forEach((axis, index) => {
      angles[AXIS_INDEX[axis] as number] = one.angles_deg[index] as number;
    });
    return { ...one, fixedOrder, angles: angles as Vec3 };
  });

describe('against the table of elementary products', () => {
  it('covers all six orders', () => {
    expect(new Set(ours.map(({ fixedOrder }) => fixedOrder))).toEqual(new Set(ROTATION_ORDERS));
  });

  it.each(ours)(
    '$fixedOrder of $angles',
    ({ fixedOrder, angles, matrix_rows: rows, quaternion_xyzw: expected, gimbal_lock: locked }) => {
      const q = eulerToQuat(angles, fixedOrder);
      expectSameRotation(q, expected, 1e-9);
      const [x, y, z] = quatToAxes(q);
      rows.forEach((row, index) => {
        expectNear([x[index] as number, y[index] as number, z[index] as number], row, 1e-9);
      });
      expectSameRotation(eulerToQuat(quatToEuler(q, fixedOrder), fixedOrder), expected, 1e-9);
      const middle = angles[AXIS_INDEX[fixedOrder[1] as string] as number] as number;
      if (!locked && Math.abs(middle) < 90) expectNear(quatToEuler(q, fixedOrder), angles, 1e-9);
    },
  );
});

describe('against three.js 0.187 (MIT), whose orders are intrinsic', () => {
  const reversed = (name: RotationOrder): EulerOrder =>
    [...name].reverse().join('').toUpperCase() as EulerOrder;

  it('composes every order alike', () => {
    fc.assert(
      fc.property(degrees, order, (angles, name) => {
        const [x, y, z] = angles.map((angle) => MathUtils.degToRad(angle)) as [number, number, number];
        const expected = new Quaternion().setFromEuler(new Euler(x, y, z, reversed(name)));
        expectSameRotation(eulerToQuat(angles, name), expected.toArray());
      }),
    );
  });

  it('takes every order apart alike, away from the gimbal', () => {
    fc.assert(
      fc.property(rotation, order, (q, name) => {
        const angles = quatToEuler(q, name);
        fc.pre(Math.abs(angles[AXIS_INDEX[name[1] as string] as number] as number) < 89);
        const euler = new Euler().setFromQuaternion(new Quaternion(...q), reversed(name));
        const expected = [euler.x, euler.y, euler.z].map((angle) => MathUtils.radToDeg(angle));
        for (let i = 0; i < 3; i += 1) {
          // ±180 are one angle.
          const turns = ((angles[i] as number) - (expected[i] as number)) / 360;
          expect(Math.abs(turns - Math.round(turns))).toBeLessThan(1e-9);
        }
      }),
    );
  });
});

describe('everywhere', () => {
  it('gives the rotation back, the middle angle within a right angle', () => {
    fc.assert(
      fc.property(rotation, order, (q, name) => {
        const angles = quatToEuler(q, name);
        expect(Math.abs(angles[AXIS_INDEX[name[1] as string] as number] as number)).toBeLessThanOrEqual(90);
        expectSameRotation(eulerToQuat(angles, name), q, 1e-9);
      }),
    );
  });

  it('means X first about fixed axes by xyz: R = Rz·Ry·Rx', () => {
    const radians = Math.PI / 180;
    const rx = quatFromAxisAngle([1, 0, 0], 20 * radians);
    const ry = quatFromAxisAngle([0, 1, 0], 30 * radians);
    const rz = quatFromAxisAngle([0, 0, 1], 40 * radians);
    expectNear(eulerToQuat([20, 30, 40], 'xyz'), multiplyQuat(rz, multiplyQuat(ry, rx)));
  });

  it.each(ROTATION_ORDERS)(
    'stays exact at and near the gimbal of %s, and reads 0 for the third angle there',
    (name) => {
      const [first, middle, last] = [...name].map((axis) => AXIS_INDEX[axis] as number) as [
        number,
        number,
        number,
      ];
      for (const side of [90, -90]) {
        for (const off of [0, 1e-13, 1e-11, 1e-9, 1e-7, 1e-4]) {
          const angles: [number, number, number] = [0, 0, 0];
          angles[first] = 25;
          angles[middle] = side - Math.sign(side) * off;
          angles[last] = -70;
          const q = eulerToQuat(angles, name);
          const found = quatToEuler(q, name);
          expectSameRotation(eulerToQuat(found, name), q, 1e-9);
          if (off === 0) expect(found[last]).toBe(0);
        }
      }
    },
  );

  it('shows no −0', () => {
    for (const name of ROTATION_ORDERS) {
      expect(quatToEuler([0, 0, 0, 1], name).some((angle) => Object.is(angle, -0))).toBe(false);
    }
  });
});
