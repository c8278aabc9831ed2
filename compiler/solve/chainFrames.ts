import { mirrorPoint } from '../expand/sides';
import type { ChainSpecification, SceneFrame } from '../expand/types';
import { axisDirection } from '../math/axisDirection';
import { quatToAxes } from '../math/mat4';
import { conjugateQuat, IDENTITY_QUAT, multiplyQuat, quatBetween, quatFromAxes, rotate } from '../math/quat';
import { add, cross, length, negate, normalise, rejectFrom, sub } from '../math/vec3';
import type { Quat, Vec3 } from '../rig/Rig';
import { STRAIGHT_TOLERANCE } from './tolerances';

/**
 * The direction about which a chain folds: the sum of the cross products of neighbouring bones (Newell's normal
 * of the open polyline). Null when the chain is straight, or folds to both sides alike.
 */
function foldDirection(directions: readonly Vec3[]): Vec3 | null {
  let sum: Vec3 = [0, 0, 0];
  for (let index = 0; index + 1 < directions.length; index += 1) {
    sum = add(sum, cross(directions[index] as Vec3, directions[index + 1] as Vec3));
  }
  return length(sum) > STRAIGHT_TOLERANCE ? normalise(sum) : null;
}

/** A hinge direction at right angles to the first bone. Straight chains lean their up axis to the scene's up. */
function firstHinge(directions: readonly Vec3[], toward: Vec3 | null, scene: SceneFrame): Vec3 {
  const first = directions[0] as Vec3;
  const candidates = [
    toward && cross(first, toward),
    toward ? null : foldDirection(directions),
    cross(first, scene.up),
    cross(first, scene.forward),
  ];
  for (const candidate of candidates) {
    if (!candidate) continue;
    const hinge = rejectFrom(candidate, first);
    if (length(hinge) > STRAIGHT_TOLERANCE) return normalise(hinge);
  }
  return normalise(cross(first, scene.left));
}

/** Frame whose named axes lie along `aim` and `up`, given in the joint's own axes. */
function frameFrom(aim: Vec3, hinge: Vec3, orient: ChainSpecification['orient']): Quat {
  const up = cross(hinge, aim);
  const target = quatFromAxes(aim, up, hinge);
  const aimAxis = axisDirection(orient.aim);
  const upAxis = axisDirection(orient.up);
  const own = quatFromAxes(aimAxis, upAxis, cross(aimAxis, upAxis));
  // Carries the joint's own aim, up and hinge axes onto the three directions.
  return multiplyQuat(target, conjugateQuat(own));
}

/**
 * World rest orientation of each joint of a chain on the left side or the centre. The hinge is carried from bone
 * to bone by the smallest turn between them, so no frame flips along the chain; the last joint takes the frame of
 * the one before.
 */
function leftFrames(
  positions: readonly Vec3[],
  orient: ChainSpecification['orient'],
  scene: SceneFrame,
): readonly Quat[] {
  if (orient.rule === 'world' || positions.length < 2) return positions.map(() => IDENTITY_QUAT);
  const directions = positions.slice(1).map((to, index) => normalise(sub(to, positions[index] as Vec3)));
  let hinge = firstHinge(directions, orient.toward, scene);
  const frames = directions.map((aim, index) => {
    const before = directions[index - 1];
    if (before) hinge = normalise(rejectFrom(rotate(quatBetween(before, aim), hinge), aim));
    return frameFrom(aim, hinge, orient);
  });
  return [...frames, frames[frames.length - 1] as Quat];
}

/** The right twin of a left frame by the chain's mirror rule. */
function mirrorFrame(frame: Quat, chain: ChainSpecification, left: Vec3): Quat {
  if (chain.mirror === 'world') return frame;
  const [x, y, z] = quatToAxes(frame).map((axis) => mirrorPoint(axis, left)) as unknown as [Vec3, Vec3, Vec3];
  // A mirror image is left-handed; turning round all three axes (same rotation values, mirrored pose) or only the
  // hinge (aim and up axes as in the mirror) makes it right-handed again.
  if (chain.mirror === 'behaviour') return quatFromAxes(negate(x), negate(y), negate(z));
  const { aim, up } = chain.orient;
  const hinge = 'xyz'.replace(aim.slice(1), '').replace(up.slice(1), '');
  return quatFromAxes(
    hinge === 'x' ? negate(x) : x,
    hinge === 'y' ? negate(y) : y,
    hinge === 'z' ? negate(z) : z,
  );
}

/**
 * World rest orientation of each joint of a chain. Right chains are solved as their mirror image on the left and
 * carried over by the mirror rule, so both sides match to the last digit.
 */
export function chainFrames(
  chain: ChainSpecification,
  positions: readonly Vec3[],
  scene: SceneFrame,
): readonly Quat[] {
  if (chain.side !== 'right') return leftFrames(positions, chain.orient, scene);
  const { left } = scene;
  const orient = chain.orient.toward
    ? { ...chain.orient, toward: mirrorPoint(chain.orient.toward, left) }
    : chain.orient;
  const mirrored = positions.map((point) => mirrorPoint(point, left));
  return leftFrames(mirrored, orient, scene).map((frame) => mirrorFrame(frame, chain, left));
}
