import {
  betweenInto,
  conjugateInto,
  frameInto,
  lengthOf,
  makeQuat,
  makeVec,
  multiplyQuatInto,
  normaliseInto,
  rotateInto,
  slerpInto,
  subInto,
} from '../math/inPlace';
import { positionOf, rotationOf } from '../math/mat4';
import { conjugateQuat, rotate } from '../math/quat';
import { POLE_TOLERANCE } from '../math/tolerances';
import { normalise, sub } from '../math/vec3';
import type { AimSolver } from '../rig/Rig';
import { type RigMemory, restOf, type Step } from './RigMemory';
import { positionInto, rotationInto, turnAxes } from './worldMatrices';

/**
 * Prepares an aim solver: the direction in which the goal stands at rest keeps pointing at the goal; with a pole, the
 * direction in which the pole stands at rest keeps to the plane of joint, goal and pole. A goal that coincides with
 * the joint leaves it as it is.
 */
export function prepareAim(solver: AimSolver, memory: RigMemory, blendSlot: number): Step {
  const { world, values, indexOf } = memory;
  const j = indexOf(solver.joint) * 16;
  const g = indexOf(solver.goal) * 16;
  const p = solver.pole === null ? -1 : indexOf(solver.pole) * 16;
  const rest = restOf(memory, indexOf(solver.joint));
  const restTurn = rotationOf(rest);
  const toGoal = normalise(sub(positionOf(restOf(memory, indexOf(solver.goal))), positionOf(rest)));
  const axis = makeVec(rotate(conjugateQuat(restTurn), toGoal));
  const fromRest = makeQuat();
  if (solver.pole !== null) {
    const toPole = sub(positionOf(restOf(memory, indexOf(solver.pole))), positionOf(rest));
    frameInto(fromRest, makeVec(toGoal), makeVec(toPole), POLE_TOLERANCE);
    conjugateInto(fromRest, fromRest);
    multiplyQuatInto(fromRest, fromRest, makeQuat(restTurn));
  }
  const place = makeVec();
  const toward = makeVec();
  const side = makeVec();
  const own = makeQuat();
  const turn = makeQuat();

  return () => {
    const blend = Math.min(1, values[blendSlot] as number);
    if (!(blend > 0)) return;
    positionInto(place, world, j);
    positionInto(toward, world, g);
    subInto(toward, toward, place);
    if (!(lengthOf(toward) > 0)) return;
    normaliseInto(toward, toward);
    rotationInto(own, world, j);
    if (p < 0) {
      rotateInto(side, own, axis);
      betweenInto(turn, side, toward);
      multiplyQuatInto(turn, turn, own);
    } else {
      positionInto(side, world, p);
      subInto(side, side, place);
      frameInto(turn, toward, side, POLE_TOLERANCE);
      multiplyQuatInto(turn, turn, fromRest);
    }
    if (blend < 1) slerpInto(turn, own, turn, blend);
    conjugateInto(own, own);
    multiplyQuatInto(turn, turn, own);
    turnAxes(world, j, turn);
  };
}
