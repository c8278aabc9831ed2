import { invariant } from '../findings/invariant';
import {
  addScaledInto,
  conjugateInto,
  copyQuat,
  distanceOf,
  frameInto,
  type Mutable,
  makeQuat,
  makeVec,
  multiplyQuatInto,
  rotateInto,
  slerpInto,
  subInto,
} from '../math/inPlace';
import { invertMat4, positionOf, rotationOf, transformPoint } from '../math/mat4';
import { conjugateQuat, rotate } from '../math/quat';
import { BEND_TOLERANCE, POLE_TOLERANCE, REACH_TOLERANCE } from '../math/tolerances';
import {
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
import type { TwoBoneSolver, Vec3 } from '../rig/Rig';
import type { ReachSlots } from './ReachSlots';
import { type RigMemory, restOf, type Step } from './RigMemory';
import { reachRangeInto } from './reachRange';
import { poleDirectionInto, type RestReach, solveTwoBone, type TwoBoneInput } from './twoBone';
import { positionInto, rotationInto, transformPointInto, turnAxes, writePosition } from './worldMatrices';

/** Places of the nodes of a two-bone solver in the list of nodes. */
interface TwoBoneNodes {
  readonly start: number;
  readonly mid: number;
  readonly end: number;
  readonly goal: number;
  readonly pole: number;
  /** Parent of the start joint; null at the top of the rig. */
  readonly parent: number | null;
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

/** The direction of a pole as `poleDirectionInto` has it, as a new value; undefined when it names no plane. */
export function restPoleDirection(start: Vec3, direction: Vec3, pole: Vec3, span: number): Vec3 | undefined {
  const out = makeVec();
  return poleDirectionInto(out, makeVec(start), makeVec(direction), makeVec(pole), span)
    ? [out[0] as number, out[1] as number, out[2] as number]
    : undefined;
}

function measureRest(nodes: TwoBoneNodes, memory: RigMemory): TwoBoneRest {
  const at = (index: number): Vec3 => positionOf(restOf(memory, index));
  const [start, mid, end] = [at(nodes.start), at(nodes.mid), at(nodes.end)];
  const span = distance(start, mid) + distance(mid, end);
  const line = sub(end, start);
  const direction = normalise(length(line) > span * BEND_TOLERANCE ? line : perpendicularTo(sub(mid, start)));
  const bend = rejectFrom(sub(mid, start), direction);
  const isStraight = length(bend) <= span * BEND_TOLERANCE;
  const towardPole = restPoleDirection(start, direction, at(nodes.pole), span);
  const restBend = isStraight ? (towardPole ?? perpendicularTo(direction)) : normalise(bend);
  const normal = cross(direction, restBend);
  const inverseGoal = invertMat4(restOf(memory, nodes.goal));
  invariant(inverseGoal !== undefined, 'rest matrices hold no scale and can be inverted');
  const intoFrameOf = (index: number, v: Vec3): Vec3 =>
    rotate(conjugateQuat(rotationOf(restOf(memory, index))), v);
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

const fromFrame = makeQuat();

/** Writes the rotation that carries a bone and the normal beside it onto another. */
function carryInto(out: Mutable, bone: Mutable, normal: Mutable, newBone: Mutable, newNormal: Mutable): void {
  frameInto(fromFrame, bone, normal, POLE_TOLERANCE);
  conjugateInto(fromFrame, fromFrame);
  frameInto(out, newBone, newNormal, POLE_TOLERANCE);
  multiplyQuatInto(out, out, fromFrame);
}

const inverse = makeQuat();
const localOwn = makeQuat();
const localSolved = makeQuat();

/**
 * Mixes a solved rotation with the joint's own as rotations against their parents, because that is what hangs below
 * each other in any receiving program, and writes the mix against the parent's new rotation.
 */
export function mixLocalInto(
  out: Mutable,
  own: Mutable,
  ownParent: Mutable,
  solved: Mutable,
  solvedParent: Mutable,
  newParent: Mutable,
  blend: number,
): void {
  conjugateInto(inverse, ownParent);
  multiplyQuatInto(localOwn, inverse, own);
  conjugateInto(inverse, solvedParent);
  multiplyQuatInto(localSolved, inverse, solved);
  slerpInto(localOwn, localOwn, localSolved, blend);
  multiplyQuatInto(out, newParent, localOwn);
}

/**
 * Prepares a two-bone solver against rest; the step it returns turns start and middle joint, where they stand as
 * their parents and constraints left them, toward goal and pole. Lengths are those the bones have at that moment, so
 * scale and stretched joints count. A bone without length leaves all as it is.
 */
export function prepareTwoBone(
  solver: TwoBoneSolver,
  memory: RigMemory,
  parent: number | null,
  slots: ReachSlots,
): Step {
  const { world, values, stretch, restLocal, indexOf } = memory;
  const nodes: TwoBoneNodes = {
    start: indexOf(solver.start),
    mid: indexOf(solver.mid),
    end: indexOf(solver.end),
    goal: indexOf(solver.goal),
    pole: indexOf(solver.pole),
    parent,
  };
  const rest = measureRest(nodes, memory);
  const range = new Float64Array(2);
  const options = {
    stretchSlot: slots.stretch,
    stretchLimit: solver.stretchLimit,
    soft: solver.soft,
    restDistance: rest.reach.distance,
  };
  const [s, m] = [nodes.start * 16, nodes.mid * 16];
  const endOffset = makeVec(restLocal.subarray(nodes.end * 16 + 12, nodes.end * 16 + 15));
  const goalToEnd = makeVec(rest.goalToEnd);
  const normalInStart = makeVec(rest.normalInStart);
  const normalInMid = makeVec(rest.normalInMid);
  const directionInParent = makeVec(rest.directionInParent);
  const bendInParent = makeVec(rest.bendInParent);

  const mid = makeVec();
  const end = makeVec();
  const upperBone = makeVec();
  const lowerBone = makeVec();
  const newBone = makeVec();
  const normal = makeVec();
  const parentTurn = makeQuat();
  const startTurn = makeQuat();
  const midTurn = makeQuat();
  const solvedStart = makeQuat();
  const solvedMid = makeQuat();
  const newStart = makeQuat();
  const newMid = makeQuat();
  const delta = makeQuat();
  const solution = { mid: makeVec(), end: makeVec(), normal: makeVec() };
  const input: TwoBoneInput = {
    start: makeVec(),
    goal: makeVec(),
    pole: makeVec(),
    upper: 1,
    lower: 1,
    asked: 1,
    restReach: null,
    swivel: rest.swivel,
    restDirection: makeVec(),
    restBend: makeVec(),
  };

  return () => {
    const blend = Math.min(1, values[slots.blend] as number);
    if (!(blend > 0)) return;
    positionInto(input.start, world, s);
    positionInto(mid, world, m);
    transformPointInto(end, world, m, endOffset);
    const upper = distanceOf(input.start, mid);
    const lower = distanceOf(mid, end);
    if (!(upper > 0 && lower > 0)) return;

    if (nodes.parent !== null) rotationInto(parentTurn, world, nodes.parent * 16);
    rotationInto(startTurn, world, s);
    rotationInto(midTurn, world, m);
    transformPointInto(input.goal, world, nodes.goal * 16, goalToEnd);
    positionInto(input.pole, world, nodes.pole * 16);
    rotateInto(input.restDirection, parentTurn, directionInParent);
    rotateInto(input.restBend, parentTurn, bendInParent);
    reachRangeInto(range, distanceOf(input.start, input.goal), upper + lower, options, values);
    input.upper = upper;
    input.lower = lower;
    input.asked = range[0] as number;
    input.restReach =
      Math.abs(upper / (upper + lower) - rest.upperShare) <= REACH_TOLERANCE ? rest.reach : null;
    input.swivel = rest.swivel + ((values[slots.swing] as number) * Math.PI) / 180;
    solveTwoBone(input, solution);

    subInto(upperBone, mid, input.start);
    subInto(lowerBone, end, mid);
    subInto(newBone, solution.mid, input.start);
    rotateInto(normal, startTurn, normalInStart);
    carryInto(solvedStart, upperBone, normal, newBone, solution.normal);
    multiplyQuatInto(solvedStart, solvedStart, startTurn);
    subInto(newBone, solution.end, solution.mid);
    rotateInto(normal, midTurn, normalInMid);
    carryInto(solvedMid, lowerBone, normal, newBone, solution.normal);
    multiplyQuatInto(solvedMid, solvedMid, midTurn);

    if (blend === 1) {
      copyQuat(newStart, solvedStart);
      copyQuat(newMid, solvedMid);
    } else {
      mixLocalInto(newStart, startTurn, parentTurn, solvedStart, parentTurn, parentTurn, blend);
      mixLocalInto(newMid, midTurn, startTurn, solvedMid, solvedStart, newStart, blend);
    }
    const factor = 1 + ((range[1] as number) - 1) * blend;
    conjugateInto(delta, startTurn);
    multiplyQuatInto(delta, newStart, delta);
    turnAxes(world, s, delta);
    rotateInto(upperBone, delta, upperBone);
    addScaledInto(mid, input.start, upperBone, factor);
    writePosition(world, m, mid);
    conjugateInto(delta, midTurn);
    multiplyQuatInto(delta, newMid, delta);
    turnAxes(world, m, delta);
    stretch[nodes.mid] = factor;
    stretch[nodes.end] = factor;
  };
}
