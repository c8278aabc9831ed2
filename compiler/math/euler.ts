import type { Quat, RotationOrder, Vec3 } from '../rig/Rig';
import { quatToAxes } from './mat4';
import { multiplyQuat } from './quat';
import { GIMBAL_TOLERANCE } from './tolerances';

type AxisIndex = 0 | 1 | 2;

/** First, second and third axis of an order, and +1 where they follow each other cyclically, else −1. */
export const ORDER_AXES: Readonly<Record<RotationOrder, readonly [AxisIndex, AxisIndex, AxisIndex, 1 | -1]>> =
  {
    xyz: [0, 1, 2, 1],
    xzy: [0, 2, 1, -1],
    yxz: [1, 0, 2, -1],
    yzx: [1, 2, 0, 1],
    zxy: [2, 0, 1, 1],
    zyx: [2, 1, 0, -1],
  };

export const RADIANS_PER_DEGREE = Math.PI / 180;

function aboutAxis(axis: AxisIndex, degrees: number): Quat {
  const half = (degrees * RADIANS_PER_DEGREE) / 2;
  const s = Math.sin(half);
  return [axis === 0 ? s : 0, axis === 1 ? s : 0, axis === 2 ? s : 0, Math.cos(half)];
}

/**
 * Rotation of the angles [about x, about y, about z] in degrees, taken in `order` about fixed axes: `xyz` turns
 * about X first, R = Rz·Ry·Rx.
 */
export function eulerToQuat(degrees: Vec3, order: RotationOrder): Quat {
  const [first, second, third] = ORDER_AXES[order];
  const a = aboutAxis(first, degrees[first]);
  const b = aboutAxis(second, degrees[second]);
  const c = aboutAxis(third, degrees[third]);
  return multiplyQuat(c, multiplyQuat(b, a));
}

/**
 * Angles [about x, about y, about z] in degrees that give the unit quaternion `q` in `order`; the middle one lies
 * within ±90. Where first and third axis fall together (middle angle ±90) the third angle reads 0. The angles always
 * give `q` back, near that place too.
 */
export function quatToEuler(q: Quat, order: RotationOrder): Vec3 {
  const [i, j, k, parity] = ORDER_AXES[order];
  const columns = quatToAxes(q);
  const at = (row: AxisIndex, column: AxisIndex): number => columns[column][row];
  const middleCosine = Math.hypot(at(i, i), at(j, i));
  const c = middleCosine > GIMBAL_TOLERANCE ? Math.atan2(at(j, i), at(i, i)) : 0;
  // Undo the third rotation, however inexact, before reading the others, so that its error cancels out.
  const sin = Math.sin(c);
  const cos = Math.cos(c);
  const b = Math.atan2(-at(k, i), middleCosine);
  const a = Math.atan2(sin * at(i, k) - cos * at(j, k), cos * at(j, j) - sin * at(i, j));
  const degrees: [number, number, number] = [0, 0, 0];
  const toDegrees = parity / RADIANS_PER_DEGREE;
  degrees[i] = a * toDegrees + 0;
  degrees[j] = b * toDegrees + 0;
  degrees[k] = c * toDegrees + 0;
  return degrees;
}
