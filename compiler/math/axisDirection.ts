import type { Axis, RigScene, Vec3 } from '../rig/Rig';
import { cross } from './vec3';

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

/** The figure's left in a scene: up × forward. */
export function leftDirection({ up, forward }: Pick<RigScene, 'up' | 'forward'>): Vec3 {
  return cross(axisDirection(up), axisDirection(forward));
}
