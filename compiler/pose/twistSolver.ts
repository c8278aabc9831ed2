import {
  axisAngleInto,
  conjugateInto,
  makeQuat,
  makeVec,
  multiplyQuatInto,
  normaliseInto,
  rotateInto,
} from '../math/inPlace';
import { positionOf, rotationOf } from '../math/mat4';
import { conjugateQuat, multiplyQuat, rotate } from '../math/quat';
import { normalise, sub } from '../math/vec3';
import type { TwistSolver } from '../rig/Rig';
import { type RigMemory, restOf, type Step } from './RigMemory';
import { rotationInto, turnAxes } from './worldMatrices';

/** Square of the part of a unit quaternion below which the twist is rounding noise: half a turn of swing to 1e-12. */
const TWIST_NOISE = 1e-24;

/**
 * Prepares a twist solver. The rotation of `driver` against `base`, from rest, is split into a twist about the bone,
 * done first, and the swing that is left; each joint turns about the bone by its share of the twist, −180 to 180
 * degrees. A swing of half a turn leaves no twist.
 */
export function prepareTwist(solver: TwistSolver, memory: RigMemory): Step {
  const { world, indexOf } = memory;
  const joints = Int32Array.from(solver.joints, (name) => indexOf(name) * 16);
  const shares = Float64Array.from(solver.shares);
  const restTurn = (name: string) => rotationOf(restOf(memory, indexOf(name)));
  const boneDirection = normalise(
    sub(positionOf(restOf(memory, indexOf(solver.tip))), positionOf(restOf(memory, indexOf(solver.bone)))),
  );
  const base = indexOf(solver.base) * 16;
  const driver = indexOf(solver.driver) * 16;
  const bone = indexOf(solver.bone) * 16;
  const axisInBase = makeVec(rotate(conjugateQuat(restTurn(solver.base)), boneDirection));
  const axisInBone = makeVec(rotate(conjugateQuat(restTurn(solver.bone)), boneDirection));
  const restToBase = makeQuat(multiplyQuat(conjugateQuat(restTurn(solver.driver)), restTurn(solver.base)));
  const turn = makeQuat();
  const other = makeQuat();
  const axis = makeVec();

  return () => {
    rotationInto(turn, world, base);
    conjugateInto(turn, turn);
    rotationInto(other, world, driver);
    multiplyQuatInto(turn, turn, other);
    multiplyQuatInto(turn, turn, restToBase);
    // Twist about a unit axis of a rotation that twists first: atan2 of the part along it and w, times two.
    const along =
      (turn[0] as number) * (axisInBase[0] as number) +
      (turn[1] as number) * (axisInBase[1] as number) +
      (turn[2] as number) * (axisInBase[2] as number);
    const w = turn[3] as number;
    // A swing of half a turn leaves no twist; what rounding leaves there is no angle.
    let half = along * along + w * w > TWIST_NOISE ? Math.atan2(along, w) : 0;
    // Both signs of the quaternion are one rotation: the half angle is brought within a quarter turn.
    if (half > Math.PI / 2) half -= Math.PI;
    else if (half <= -Math.PI / 2) half += Math.PI;
    rotationInto(other, world, bone);
    rotateInto(axis, other, axisInBone);
    normaliseInto(axis, axis);
    for (let i = 0; i < joints.length; i += 1) {
      axisAngleInto(turn, axis, 2 * half * (shares[i] as number));
      turnAxes(world, joints[i] as number, turn);
    }
  };
}
