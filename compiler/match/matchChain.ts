import { composeMat4, invertMat4, type Mat4, multiplyMat4, positionOf, rotationOf } from '../math/mat4';
import { conjugateQuat, multiplyQuat, quatFromAxisAngle, rotate } from '../math/quat';
import { BEND_TOLERANCE } from '../math/tolerances';
import {
  addScaled,
  cross,
  distance,
  dot,
  length,
  normalise,
  rejectFrom,
  signedAngle,
  sub,
} from '../math/vec3';
import type { PoseValues, Vec3 } from '../rig/Rig';
import type { ChainSwitch } from './findSwitches';
import { channelsToward, withoutChannels, withValues } from './matchControl';
import type { RigReader } from './RigReader';

/** The rotation of a follower that makes its target, which keeps its rest offset, have the rotation of `wanted`. */
function withRotation(place: Mat4, wanted: Mat4, restFollowed: Mat4, restTarget: Mat4): Mat4 {
  const offset = multiplyQuat(conjugateQuat(rotationOf(restFollowed)), rotationOf(restTarget));
  return composeMat4(positionOf(place), multiplyQuat(rotationOf(wanted), conjugateQuat(offset)));
}

/**
 * The pose in which a chain is turned joint by joint and stands as it did: the attribute takes 0, each joint's
 * control the turn that the joint had. Bones that were stretched go back to their length.
 */
export function matchToTurning(reader: RigReader, chain: ChainSwitch, pose: PoseValues = {}): PoseValues {
  const before = reader.worldOf(pose, chain.joints);
  let matched = withValues(pose, chain.control, { [chain.attribute]: 0 });
  chain.turners.forEach((turner, index) => {
    matched = withoutChannels(matched, turner);
    const [bare] = reader.worldOf(matched, [turner]);
    const joint = chain.joints[index] ?? '';
    const wanted = withRotation(
      bare as Mat4,
      before[index] as Mat4,
      reader.restOf(turner),
      reader.restOf(joint),
    );
    matched = withValues(matched, turner, channelsToward(reader.control(turner), bare as Mat4, wanted));
  });
  return matched;
}

/** The side to which the joint between the ends stands that lies farthest off their line; null when none does. */
function bendOf(points: readonly Vec3[], along: Vec3): Vec3 | null {
  const [start] = points as [Vec3];
  let bend: Vec3 = [0, 0, 0];
  let size = 0;
  points.forEach((point, index) => {
    if (index > 0) size += distance(point, points[index - 1] as Vec3);
    const off = rejectFrom(sub(point, start), along);
    if (index < points.length - 1 && length(off) > length(bend)) bend = off;
  });
  return length(bend) > BEND_TOLERANCE * size ? normalise(bend) : null;
}

/** Where the pole must stand for the chain to bend as it does, as far off as at rest. */
function polePlace(reader: RigReader, chain: ChainSwitch, joints: readonly Mat4[]): Vec3 {
  const points = joints.map(positionOf);
  const rest = chain.joints.map((joint) => positionOf(reader.restOf(joint)));
  const restPole = positionOf(reader.restOf(chain.pole));
  const [start, end] = [points[0] as Vec3, points[points.length - 1] as Vec3];
  const [restStart, restEnd] = [rest[0] as Vec3, rest[rest.length - 1] as Vec3];
  const along = normalise(sub(end, start));
  const restAlong = normalise(sub(restEnd, restStart));
  const restBend = bendOf(rest, restAlong);
  const restPoleSide = rejectFrom(sub(restPole, restStart), restAlong);
  const swivel = restBend === null ? 0 : signedAngle(restPoleSide, restBend, restAlong);
  // A chain that is straight now bends to the side to which its first joint carries the bend of rest.
  const turned = multiplyQuat(
    rotationOf(joints[0] as Mat4),
    conjugateQuat(rotationOf(reader.restOf(chain.joints[0] ?? ''))),
  );
  const normal = cross(restAlong, restBend ?? normalise(restPoleSide));
  const bend = bendOf(points, along) ?? normalise(cross(rotate(turned, normal), along));
  const side = rotate(quatFromAxisAngle(along, -swivel), bend);
  const foot = addScaled(start, along, dot(sub(restPole, restStart), restAlong));
  return addScaled(foot, side, length(restPoleSide));
}

/**
 * The pose in which a chain follows its goal and stands as it did: the attribute takes 1, goal and pole go where the
 * joints ask for them. Its joints' places come out exactly when its bends lie in one plane; a twist of a bone about
 * itself, which a goal cannot hold, is lost.
 */
export function matchToReaching(reader: RigReader, chain: ChainSwitch, pose: PoseValues = {}): PoseValues {
  const before = reader.worldOf(pose, chain.joints);
  const end = before[before.length - 1] as Mat4;
  const endName = chain.joints[chain.joints.length - 1] ?? '';
  const rolls = Object.fromEntries(chain.rolls.map((name) => [name, 0]));
  const swing = typeof chain.solver.swing === 'number' ? {} : { [chain.solver.swing.attribute]: 0 };
  let matched = withValues(pose, chain.control, { [chain.attribute]: 1 });
  matched = withValues(withoutChannels(matched, chain.goal), chain.goal, { ...rolls, ...swing });

  const restGoal = reader.restOf(chain.goal);
  const inverseEnd = invertMat4(reader.restOf(endName));
  const [bareGoal] = reader.worldOf(matched, [chain.goal]);
  const wanted = multiplyMat4(
    composeMat4(positionOf(end), rotationOf(end)),
    multiplyMat4(inverseEnd as Mat4, restGoal),
  );
  const goalValues = channelsToward(reader.control(chain.goal), bareGoal as Mat4, wanted);
  matched = withValues(matched, chain.goal, goalValues);

  matched = withoutChannels(matched, chain.pole);
  const [barePole] = reader.worldOf(matched, [chain.pole]);
  const place = composeMat4(polePlace(reader, chain, before), rotationOf(barePole as Mat4));
  const poleValues = channelsToward(reader.control(chain.pole), barePole as Mat4, place);
  return withValues(matched, chain.pole, poleValues);
}
