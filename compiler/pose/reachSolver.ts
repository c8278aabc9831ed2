import { invariant } from '../findings/invariant';
import {
  addScaledInto,
  conjugateInto,
  copyQuat,
  copyVec,
  crossInto,
  distanceOf,
  frameInto,
  lengthOf,
  type Mutable,
  makeQuat,
  makeVec,
  multiplyQuatInto,
  rotateInto,
  subInto,
} from '../math/inPlace';
import { invertMat4, positionOf, rotationOf, transformPoint } from '../math/mat4';
import { conjugateQuat, rotate } from '../math/quat';
import { BEND_TOLERANCE, POLE_TOLERANCE } from '../math/tolerances';
import {
  angleBetween,
  cross,
  distance,
  length,
  negate,
  normalise,
  perpendicularTo,
  rejectFrom,
  signedAngle,
  sub,
} from '../math/vec3';
import type { ReachSolver, Vec3 } from '../rig/Rig';
import { foldToDistance, makeChainFold } from './chainFold';
import type { ReachSlots } from './ReachSlots';
import { type RigMemory, restOf, type Step } from './RigMemory';
import { reachRangeInto } from './reachRange';
import { bendDirectionInto, chainDirectionInto } from './twoBone';
import { mixLocalInto, restPoleDirection } from './twoBoneSolver';
import { positionInto, rotationInto, transformPointInto, turnAxes, writePosition } from './worldMatrices';

/** The plane a chain bends in at rest. */
interface RestPlane {
  readonly direction: Vec3;
  readonly bend: Vec3;
  readonly isStraight: boolean;
}

/** The line start → end, and the side to which the joint stands that lies farthest off it. */
function restPlane(points: readonly Vec3[], span: number, pole: Vec3): RestPlane {
  const [start] = points;
  const end = points[points.length - 1];
  invariant(start !== undefined && end !== undefined, 'a chain has joints');
  const line = sub(end, start);
  const first = sub(points[1] ?? end, start);
  const direction = normalise(length(line) > span * BEND_TOLERANCE ? line : perpendicularTo(first));
  let farthest: Vec3 = [0, 0, 0];
  for (const point of points.slice(1, -1)) {
    const off = rejectFrom(sub(point, start), direction);
    if (length(off) > length(farthest)) farthest = off;
  }
  const isStraight = length(farthest) <= span * BEND_TOLERANCE;
  const towardPole = restPoleDirection(start, direction, pole, span);
  const bend = isStraight ? (towardPole ?? perpendicularTo(direction)) : normalise(farthest);
  return { direction, bend, isStraight };
}

/** The bends between the bones: their own at rest, or of a straight chain a radian each toward the bend. */
function restBends(directions: readonly Vec3[], { direction, bend, isStraight }: RestPlane) {
  const axes: Mutable[] = [];
  const angles: number[] = [];
  for (let i = 1; i < directions.length; i += 1) {
    const before = directions[i - 1] as Vec3;
    const here = directions[i] as Vec3;
    const axis = normalise(cross(before, here));
    // Curving away from the bend's side lets the middle lead to it.
    axes.push(makeVec(isStraight ? negate(cross(direction, bend)) : axis));
    angles.push(isStraight ? 1 : angleBetween(before, here));
  }
  return { axes, angles };
}

/**
 * Prepares a reach solver: four or more joints in a row whose bends grow or shrink together, in the proportions they
 * have at rest, until the last joint is as far from the first as the goal is; then the chain is turned onto the line to
 * the goal, bent toward the pole. See section 5 of the reference.
 */
export function prepareReach(
  solver: ReachSolver,
  memory: RigMemory,
  parent: number | null,
  slots: ReachSlots & { readonly bias: number },
): Step {
  const { world, values, stretch, restLocal, indexOf } = memory;
  const joints = Int32Array.from(solver.joints, indexOf);
  const bones = joints.length - 1;
  const goal = indexOf(solver.goal) * 16;
  const pole = indexOf(solver.pole) * 16;
  const points = Array.from(joints, (joint) => positionOf(restOf(memory, joint)));
  const restLengths = points.slice(1).map((point, i) => distance(point, points[i] as Vec3));
  const restSpan = restLengths.reduce((sum, size) => sum + size, 0);
  const polePoint = positionOf(restOf(memory, indexOf(solver.pole)));
  const plane = restPlane(points, restSpan, polePoint);
  const start = points[0] as Vec3;
  const towardPole = restPoleDirection(start, plane.direction, polePoint, restSpan);
  const directions = points.slice(1).map((point, i) => normalise(sub(point, points[i] as Vec3)));
  const { axes, angles } = restBends(directions, plane);
  const fold = makeChainFold(directions.map(makeVec), axes, angles, plane.isStraight ? 0 : 1);
  const inverseGoal = invertMat4(restOf(memory, indexOf(solver.goal)));
  invariant(inverseGoal !== undefined, 'rest matrices hold no scale and can be inverted');
  const goalToEnd = makeVec(transformPoint(inverseGoal, points[points.length - 1] as Vec3));
  const intoParent = (v: Vec3): Vec3 =>
    parent === null ? v : rotate(conjugateQuat(rotationOf(restOf(memory, parent))), v);
  const directionInParent = makeVec(intoParent(plane.direction));
  const bendInParent = makeVec(intoParent(plane.bend));
  const restNormal = makeVec(cross(plane.direction, plane.bend));
  const restSwivel =
    plane.isStraight || towardPole === undefined ? 0 : signedAngle(towardPole, plane.bend, plane.direction);
  const restTurns = Array.from(joints, (joint) => makeQuat(rotationOf(restOf(memory, joint))));
  const options = {
    stretchSlot: slots.stretch,
    stretchLimit: solver.stretchLimit,
    soft: solver.soft,
    restDistance: distance(start, points[points.length - 1] as Vec3) / restSpan,
  };

  const range = new Float64Array(2);
  const own = Array.from(joints, () => makeVec());
  const ownTurns = Array.from(joints, () => makeQuat());
  const newTurns = Array.from(joints, () => makeQuat());
  const endOffset = makeVec(
    restLocal.subarray((joints[bones] as number) * 16 + 12, (joints[bones] as number) * 16 + 15),
  );
  const bend = makeVec();
  const normal = makeVec();
  const along = makeVec();
  const place = makeVec();
  const step = makeVec();
  const parentTurn = makeQuat();
  const whole = makeQuat();
  const frame = makeQuat();
  const solved = makeQuat();
  const solvedBefore = makeQuat();
  const delta = makeQuat();
  const input = {
    start: makeVec(),
    goal: makeVec(),
    pole: makeVec(),
    swivel: restSwivel,
    restDirection: makeVec(),
    restBend: makeVec(),
  };

  /** Reads where the joints stand by themselves; the chain's length, 0 when a bone has none. */
  const readOwn = (): number => {
    let most = 0;
    for (let i = 0; i <= bones; i += 1) {
      const point = own[i] as Mutable;
      if (i === bones) transformPointInto(point, world, (joints[i - 1] as number) * 16, endOffset);
      else {
        positionInto(point, world, (joints[i] as number) * 16);
        rotationInto(ownTurns[i] as Mutable, world, (joints[i] as number) * 16);
      }
      if (i === 0) continue;
      const size = distanceOf(point, own[i - 1] as Mutable);
      if (!(size > 0)) return 0;
      fold.lengths[i - 1] = size;
      most += size;
    }
    return most;
  };

  return () => {
    const blend = Math.min(1, values[slots.blend] as number);
    if (!(blend > 0)) return;
    const most = readOwn();
    if (!(most > 0)) return;
    copyVec(input.start, own[0] as Mutable);
    if (parent !== null) rotationInto(parentTurn, world, parent * 16);
    transformPointInto(input.goal, world, goal, goalToEnd);
    positionInto(input.pole, world, pole);
    rotateInto(input.restDirection, parentTurn, directionInParent);
    rotateInto(input.restBend, parentTurn, bendInParent);
    input.swivel = restSwivel + ((values[slots.swing] as number) * Math.PI) / 180;
    const bias = Math.min(1, Math.max(-1, values[slots.bias] as number));

    reachRangeInto(range, distanceOf(input.start, input.goal), most, options, values);
    foldToDistance(fold, range[0] as number, most, bias);
    chainDirectionInto(along, input.start, input.goal, most, input.restDirection);
    bendDirectionInto(bend, along, most, input);
    crossInto(normal, along, bend);
    // The whole chain turns so that its folded span and its plane's normal come to lie along the wanted ones.
    frameInto(frame, lengthOf(fold.span) > 0 ? fold.span : along, restNormal, POLE_TOLERANCE);
    conjugateInto(frame, frame);
    frameInto(whole, along, normal, POLE_TOLERANCE);
    multiplyQuatInto(whole, whole, frame);

    const factor = 1 + ((range[1] as number) - 1) * blend;
    copyVec(place, input.start);
    for (let i = 0; i < bones; i += 1) {
      const o = (joints[i] as number) * 16;
      const turn = newTurns[i] as Mutable;
      const ownTurn = ownTurns[i] as Mutable;
      multiplyQuatInto(solved, whole, fold.turns[i] as Mutable);
      multiplyQuatInto(solved, solved, restTurns[i] as Mutable);
      if (blend === 1) copyQuat(turn, solved);
      else if (i === 0) mixLocalInto(turn, ownTurn, parentTurn, solved, parentTurn, parentTurn, blend);
      else {
        const before = i - 1;
        mixLocalInto(
          turn,
          ownTurn,
          ownTurns[before] as Mutable,
          solved,
          solvedBefore,
          newTurns[before] as Mutable,
          blend,
        );
      }
      copyQuat(solvedBefore, solved);
      conjugateInto(delta, ownTurn);
      multiplyQuatInto(delta, turn, delta);
      turnAxes(world, o, delta);
      writePosition(world, o, place);
      if (i > 0) stretch[joints[i] as number] = factor;
      subInto(step, own[i + 1] as Mutable, own[i] as Mutable);
      rotateInto(step, delta, step);
      addScaledInto(place, place, step, factor);
    }
    stretch[joints[bones] as number] = factor;
  };
}
