import type { Axis, Vec3 } from '../rig/Rig';

const DIRECTIONS: Readonly<Record<Axis, Vec3>> = {
  '+x': [1, 0, 0],
  '-x': [-1, 0, 0],
  '+y': [0, 1, 0],
  '-y': [0, -1, 0],
  '+z': [0, 0, 1],
  '-z': [0, 0, -1],
};

/** The unit vector along a signed axis. */
export function axisDirection(axis: Axis): Vec3 {
  return DIRECTIONS[axis];
}
