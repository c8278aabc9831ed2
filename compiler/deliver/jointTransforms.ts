import { decomposeMat4, IDENTITY_MAT4, invertMat4, type Mat4, multiplyMat4 } from '../math/mat4';
import { dotQuat, normaliseQuat } from '../math/quat';
import type { Poser } from '../pose/Poser';
import { readMatrix } from '../pose/worldMatrices';
import type { Quat, Vec3 } from '../rig/Rig';
import type { SpaceChange } from './axes';
import type { DeliveredJoint } from './skeleton';

/** Transform of a joint against the one it hangs on, in the axes and unit of a file. */
export interface JointTransform {
  readonly at: Vec3;
  readonly turn: Quat;
  readonly size: Vec3;
}

/** Decimals that a file's numbers are rounded to: beneath single precision, above rounding noise. */
const DECIMALS = 9;

function rounded<T extends readonly number[]>(values: T): T {
  const factor = 10 ** DECIMALS;
  return values.map((value) => Math.round(value * factor) / factor + 0) as unknown as T;
}

/** Local transforms of delivered joints as a poser has them now; shear, which files cannot hold, is lost. */
export function jointTransforms(
  joints: readonly DeliveredJoint[],
  poser: Poser,
  change: SpaceChange,
): readonly JointTransform[] {
  const worlds = joints.map(({ index }) => readMatrix(poser.world, index));
  return joints.map(({ parent }, place) => {
    const world = worlds[place] as Mat4;
    const inverse = parent === null ? IDENTITY_MAT4 : invertMat4(worlds[parent] as Mat4);
    const { at, turn, scale } = decomposeMat4(multiplyMat4(inverse ?? IDENTITY_MAT4, world));
    return {
      at: rounded(change.point(at)),
      turn: rounded(normaliseQuat(change.turn(turn))),
      size: rounded(change.size(scale)),
    };
  });
}

/** Turns with signs such that each lies nearer to the one before: between the two, a player takes the short way. */
export function continuous(turns: readonly Quat[]): readonly Quat[] {
  let before: Quat | null = null;
  return turns.map((turn) => {
    const flipped = before !== null && dotQuat(before, turn) < 0;
    const next = flipped ? (turn.map((value) => 0 - value) as unknown as Quat) : turn;
    before = next;
    return next;
  });
}
