import { addScaled, cross, distance, dot, length, normalise, rejectFrom, sub } from '../math/vec3';
import type { Vec3 } from '../rig/Rig';
import { STRAIGHT_TOLERANCE } from './tolerances';

/** Why a pole position could not be decided. */
export type PoleFault = 'straight' | 'bend-along-limb';

/**
 * The pole of three points: in their plane, from the foot of the perpendicular through `mid` onto the line from
 * `start` to `end`, at `factor` × the length of both bones, on the side of `mid`. On one line, `bend` says the side.
 */
export function polePosition(
  start: Vec3,
  mid: Vec3,
  end: Vec3,
  factor: number,
  bend: Vec3 | null,
): Vec3 | PoleFault {
  const size = distance(start, mid) + distance(mid, end);
  const along = normalise(sub(end, start));
  const reach = sub(mid, start);
  // Folded wholly back, start and end coincide and the bone itself is the line.
  const line = length(along) > 0 ? along : normalise(reach);
  const foot = addScaled(start, line, dot(reach, line));
  const away = rejectFrom(reach, line);
  if (length(away) > STRAIGHT_TOLERANCE * size) return addScaled(foot, normalise(away), factor * size);
  if (!bend) return 'straight';
  if (length(cross(normalise(bend), line)) <= STRAIGHT_TOLERANCE) return 'bend-along-limb';
  return addScaled(foot, normalise(rejectFrom(bend, line)), factor * size);
}
