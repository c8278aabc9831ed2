import { invariant } from '../findings/invariant';
import type { Mat4 } from '../math/mat4';
import { invertMat4, positionOf, rotationOf, transformPoint } from '../math/mat4';
import { conjugateQuat, IDENTITY_QUAT, multiplyQuat, quatFromAxes, rotate, slerp } from '../math/quat';
import { BEND_TOLERANCE, POLE_TOLERANCE, REACH_TOLERANCE } from '../math/tolerances';
import {
  add,
  cross,
  distance,
  dot,
  length,
  normalise,
  perpendicularTo,
  rejectFrom,
  signedAngle,
  sub,
} from '../math/vec3';
import type { Quat, Vec3 } from '../rig/Rig';
import { poleDirection, type RestReach, solveTwoBone } from './twoBone';
import { readMatrix, readPosition, turnAxes, writePosition } from './worldMatrices';

/** Places in the flat arrays of the nodes a two-bone solver reads and turns. */
export interface TwoBoneNodes {
  readonly start: number;
  readonly mid: number;
  readonly end: number;
  readonly goal: number;
  readonly pole: number;
  /** Parent of the start joint; null at the top of the rig. */
  readonly parent: number | null;
  /** Rest position of the end joint against the middle one. */
  readonly endOffset: Vec3;
}

/** What a two-bone solver takes from rest once. */
interface TwoBoneRest {
  readonly goalToEnd: Vec3;
  readonly reach: RestReach;
  /** Length of the upper bone as a share of both. */
  readonly upperShare: number;
  readonly swivel: number;
  /** Plane normal of the three joints as the start and the middle joint carry it. */
  readonly normalInStart: Vec3;
  readonly normalInMid: Vec3;
  /** Line start → end and bend as the parent of the start joint carries them. */
  readonly directionInParent: Vec3;
  readonly bendInParent: Vec3;
}

function measureRest(nodes: TwoBoneNodes, rest: readonly Mat4[]): TwoBoneRest {
  const at = (index: number): Mat4 => {
    const matrix = rest[index];
    invariant(matrix !== undefined, 'every solver names nodes of its rig');
    return matrix;
  };
  const [start, mid, end] = [
    positionOf(at(nodes.start)),
    positionOf(at(nodes.mid)),
    positionOf(at(nodes.end)),
  ];
  const span = distance(start, mid) + distance(mid, end);
  const line = sub(end, start);
  const direction = normalise(length(line) > span * BEND_TOLERANCE ? line : perpendicularTo(sub(mid, start)));
  const bend = rejectFrom(sub(mid, start), direction);
  const isStraight = length(bend) <= span * BEND_TOLERANCE;
  const towardPole = poleDirection(start, direction, positionOf(at(nodes.pole)), span);
  const restBend = isStraight ? (towardPole ?? perpendicularTo(direction)) : normalise(bend);
  const normal = cross(direction, restBend);
  const inverseGoal = invertMat4(at(nodes.goal));
  invariant(inverseGoal !== undefined, 'rest matrices hold no scale and can be inverted');
  const intoFrameOf = (index: number, v: Vec3): Vec3 => rotate(conjugateQuat(rotationOf(at(index))), v);
  const intoParent = (v: Vec3): Vec3 => (nodes.parent === null ? v : intoFrameOf(nodes.parent, v));
  return {
    goalToEnd: transformPoint(inverseGoal, end),
    reach: {
      distance: length(line) / span,
      foot: dot(sub(mid, start), direction) / span,
      height: length(bend) / span,
      swivel: isStraight ? signedAngle(restBend, bend, direction) : 0,
    },
    upperShare: distance(start, mid) / span,
    swivel: isStraight || towardPole === undefined ? 0 : signedAngle(towardPole, restBend, direction),
    normalInStart: intoFrameOf(nodes.start, normal),
    normalInMid: intoFrameOf(nodes.mid, normal),
    directionInParent: intoParent(direction),
    bendInParent: intoParent(restBend),
  };
}

/** Orientation with x along the bone and y along the plane's normal, as far as the bone allows. */
function boneFrame(bone: Vec3, normal: Vec3): Quat {
  const x = normalise(bone);
  const side = rejectFrom(normal, x);
  const y = length(side) > POLE_TOLERANCE ? normalise(side) : perpendicularTo(x);
  return quatFromAxes(x, y, cross(x, y));
}

/** Rotation that carries a bone and the normal beside it onto another. */
function carry(bone: Vec3, normal: Vec3, newBone: Vec3, newNormal: Vec3): Quat {
  return multiplyQuat(boneFrame(newBone, newNormal), conjugateQuat(boneFrame(bone, normal)));
}

/**
 * Prepares a two-bone solver against rest; the function it returns turns start and middle joint in `world`, where
 * they stand as their parents and constraints left them, toward goal and pole by `blend` (0 to 1). Lengths are those
 * the bones have at that moment, so scale and stretched joints count. A bone without length leaves all as it is.
 */
export function prepareTwoBone(
  nodes: TwoBoneNodes,
  restWorld: readonly Mat4[],
): (world: Float64Array, blend: number) => void {
  const rest = measureRest(nodes, restWorld);
  return (world, blend) => {
    if (!(blend > 0)) return;
    const midMatrix = readMatrix(world, nodes.mid);
    const start = readPosition(world, nodes.start);
    const mid = positionOf(midMatrix);
    const end = transformPoint(midMatrix, nodes.endOffset);
    const upper = distance(start, mid);
    const lower = distance(mid, end);
    if (!(upper > 0 && lower > 0)) return;

    const parentTurn = nodes.parent === null ? IDENTITY_QUAT : rotationOf(readMatrix(world, nodes.parent));
    const startTurn = rotationOf(readMatrix(world, nodes.start));
    const midTurn = rotationOf(midMatrix);
    const solution = solveTwoBone({
      start,
      goal: transformPoint(readMatrix(world, nodes.goal), rest.goalToEnd),
      pole: readPosition(world, nodes.pole),
      upper,
      lower,
      restReach: Math.abs(upper / (upper + lower) - rest.upperShare) <= REACH_TOLERANCE ? rest.reach : null,
      swivel: rest.swivel,
      restDirection: rotate(parentTurn, rest.directionInParent),
      restBend: rotate(parentTurn, rest.bendInParent),
    });
    const upperBone = sub(mid, start);
    const solvedStart = multiplyQuat(
      carry(upperBone, rotate(startTurn, rest.normalInStart), sub(solution.mid, start), solution.normal),
      startTurn,
    );
    const solvedMid = multiplyQuat(
      carry(
        sub(end, mid),
        rotate(midTurn, rest.normalInMid),
        sub(solution.end, solution.mid),
        solution.normal,
      ),
      midTurn,
    );

    // Mixed as local rotations, because that is what hangs below each other in any receiving program.
    const newStart = multiplyQuat(
      parentTurn,
      slerp(local(parentTurn, startTurn), local(parentTurn, solvedStart), Math.min(1, blend)),
    );
    const newMid = multiplyQuat(
      newStart,
      slerp(local(startTurn, midTurn), local(solvedStart, solvedMid), Math.min(1, blend)),
    );
    const startDelta = multiplyQuat(newStart, conjugateQuat(startTurn));
    turnAxes(world, nodes.start, startDelta);
    turnAxes(world, nodes.mid, multiplyQuat(newMid, conjugateQuat(midTurn)));
    writePosition(world, nodes.mid, add(start, rotate(startDelta, upperBone)));
  };
}

function local(parentTurn: Quat, turn: Quat): Quat {
  return multiplyQuat(conjugateQuat(parentTurn), turn);
}
