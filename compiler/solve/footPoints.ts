import { type FootRollSpecification, SOLE_POINTS, type SolePoint } from '../expand/types';
import { conjugateQuat, rotate } from '../math/quat';
import { cross, dot, length, normalise, rejectFrom, scale, sub } from '../math/vec3';
import type { ResolveContext } from '../resolve/Reporter';
import type { Vec3 } from '../rig/Rig';
import { solveFindings } from './findings';
import { STRAIGHT_TOLERANCE } from './tolerances';
import type { FootPoints, RestPlace } from './types';

/**
 * The points and axes of a foot roll in the rest frame of its foot. The foot points from heel to toe, flat across up;
 * positive roll lifts the heel, positive bank lifts the inner edge. Null (with a finding) when heel and toe, or inner
 * and outer edge, do not lie apart.
 */
export function footPoints(
  solver: FootRollSpecification,
  sole: Readonly<Record<SolePoint, Vec3>>,
  foot: RestPlace,
  up: Vec3,
  context: ResolveContext,
): FootPoints | null {
  const size = length(sub(sole.toe, sole.heel));
  const along = rejectFrom(sub(sole.toe, sole.heel), up);
  const report = (first: SolePoint, second: SolePoint): null => {
    const span = context.document.spanAt([...solver.path, first]);
    context.findings.report(solveFindings, 'sole-points-together', span, { id: solver.id, first, second });
    return null;
  };
  if (!(length(along) > STRAIGHT_TOLERANCE * size)) return report('heel', 'toe');
  const forward = normalise(along);
  const hinge = cross(up, forward);
  const across = dot(sub(sole.inner, sole.outer), hinge);
  if (!(Math.abs(across) > STRAIGHT_TOLERANCE * size)) return report('inner', 'outer');
  const inverse = conjugateQuat(foot.turn);
  const intoFoot = (point: Vec3): Vec3 => rotate(inverse, sub(point, foot.position));
  const points = Object.fromEntries(
    SOLE_POINTS.map((name) => [name, intoFoot(sole[name])]),
  ) as unknown as Readonly<Record<SolePoint, Vec3>>;
  // Turning about forward lifts what lies to its left: the inner edge must rise with positive bank.
  const bankAxis = scale(forward, across > 0 ? 1 : -1);
  return { ...points, hinge: rotate(inverse, hinge), forward: rotate(inverse, bankAxis) };
}
