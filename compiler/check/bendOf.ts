import { angleBetween, cross, normalise, rejectFrom, sub } from '../math/vec3';
import type { Vec3 } from '../rig/Rig';

/** How three joints in a row are bent at rest. */
export interface Bend {
  /** Degrees between the bones; 0 when they lie on one line. */
  readonly degrees: number;
  /** Unit direction from the line start–end to the middle joint; zero when the limb is straight. */
  readonly toward: Vec3;
  /** Unit direction about which the lower bone is turned against the upper; zero when the limb is straight. */
  readonly hinge: Vec3;
}

/** Measures the bend of a limb from the world positions of its joints. */
export function bendOf(start: Vec3, mid: Vec3, end: Vec3): Bend {
  const upper = sub(mid, start);
  const lower = sub(end, mid);
  return {
    degrees: (angleBetween(upper, lower) * 180) / Math.PI,
    toward: normalise(rejectFrom(upper, normalise(sub(end, start)))),
    hinge: normalise(cross(upper, lower)),
  };
}
