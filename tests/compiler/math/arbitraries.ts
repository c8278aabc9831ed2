import fc from 'fast-check';
import { normaliseQuat } from '@/compiler/math/quat';
import type { Quat, RotationOrder, Vec3 } from '@/compiler/rig/Rig';

export const ROTATION_ORDERS: readonly RotationOrder[] = ['xyz', 'xzy', 'yxz', 'yzx', 'zxy', 'zyx'];

/** Finite numbers of the sizes that scenes have. */
export const coordinate = fc.double({ min: -1000, max: 1000, noNaN: true }).map((value) => value + 0);

export const point: fc.Arbitrary<Vec3> = fc.tuple(coordinate, coordinate, coordinate);

const part = fc.double({ min: -1, max: 1, noNaN: true });

export const direction: fc.Arbitrary<Vec3> = fc
  .tuple(part, part, part)
  .filter((v) => Math.hypot(...v) > 0.01);

export const rotation: fc.Arbitrary<Quat> = fc
  .tuple(part, part, part, part)
  .filter((q) => Math.hypot(...q) > 0.01)
  .map(normaliseQuat);

export const order = fc.constantFrom(...ROTATION_ORDERS);

export const degrees: fc.Arbitrary<Vec3> = fc.tuple(
  fc.double({ min: -180, max: 180, noNaN: true }),
  fc.double({ min: -180, max: 180, noNaN: true }),
  fc.double({ min: -180, max: 180, noNaN: true }),
);
