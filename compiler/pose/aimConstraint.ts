import { axisDirection } from '../math/axisDirection';
import {
  addScaledInto,
  betweenInto,
  conjugateInto,
  frameInto,
  lengthOf,
  makeQuat,
  makeVec,
  multiplyQuatInto,
  normaliseInto,
  rotateInto,
  subInto,
} from '../math/inPlace';
import { positionOf, rotationOf } from '../math/mat4';
import { conjugateQuat, rotate } from '../math/quat';
import { POLE_TOLERANCE } from '../math/tolerances';
import { addScaled, length, sub, ZERO } from '../math/vec3';
import type { AimConstraint, Vec3 } from '../rig/Rig';
import type { Weigh } from './constraint';
import { type RigMemory, restOf, type Step } from './RigMemory';
import { positionInto, rotationInto, turnAxes } from './worldMatrices';

/** Direction from the target to the weighted sources at rest, in the target's own axes; null when they coincide. */
function restDirection(constraint: AimConstraint, memory: RigMemory, shares: Float64Array): Vec3 | null {
  const target = restOf(memory, memory.indexOf(constraint.target));
  const point = constraint.sources.reduce<Vec3>(
    (sum, { node }, index) =>
      addScaled(sum, positionOf(restOf(memory, memory.indexOf(node))), shares[index] ?? 0),
    ZERO,
  );
  const toward = sub(point, positionOf(target));
  return length(toward) > 0 ? rotate(conjugateQuat(rotationOf(target)), toward) : null;
}

/**
 * Prepares an aim constraint; the step it returns turns the target so that its axis points at the weighted mean of
 * the sources' positions. Sources that coincide with the target leave it as it is.
 */
export function prepareAimConstraint(constraint: AimConstraint, memory: RigMemory, weigh: Weigh): Step {
  const { world } = memory;
  const t = memory.indexOf(constraint.target) * 16;
  const sources = Int32Array.from(constraint.sources, ({ node }) => memory.indexOf(node) * 16);
  const shares = new Float64Array(Math.max(2, sources.length));
  // The values are those of rest while a rig is prepared.
  const kept = constraint.keepOffset && weigh(shares) ? restDirection(constraint, memory, shares) : null;
  const axis = makeVec(kept ?? axisDirection(constraint.axis));
  normaliseInto(axis, axis);
  const side = makeVec(axisDirection(constraint.upAxis));
  const inverseFrame = makeQuat();
  frameInto(inverseFrame, axis, side, POLE_TOLERANCE);
  conjugateInto(inverseFrame, inverseFrame);

  const u = constraint.up === null ? -1 : memory.indexOf(constraint.up) * 16;
  const upInNode = makeVec(side);
  if (constraint.up !== null) {
    const upTurn = rotationOf(restOf(memory, memory.indexOf(constraint.up)));
    const ownTurn = rotationOf(restOf(memory, memory.indexOf(constraint.target)));
    upInNode.set(rotate(conjugateQuat(upTurn), rotate(ownTurn, axisDirection(constraint.upAxis))));
  }
  const toward = makeVec();
  const place = makeVec();
  const own = makeQuat();
  const turn = makeQuat();
  const up = makeVec();

  return () => {
    if (!weigh(shares)) return;
    toward.fill(0);
    for (let i = 0; i < sources.length; i += 1) {
      positionInto(place, world, sources[i] as number);
      addScaledInto(toward, toward, place, shares[i] as number);
    }
    positionInto(place, world, t);
    subInto(toward, toward, place);
    if (!(lengthOf(toward) > 0)) return;
    normaliseInto(toward, toward);
    rotationInto(own, world, t);
    if (u < 0) {
      rotateInto(up, own, axis);
      betweenInto(turn, up, toward);
    } else {
      rotationInto(turn, world, u);
      rotateInto(up, turn, upInNode);
      frameInto(turn, toward, up, POLE_TOLERANCE);
      multiplyQuatInto(turn, turn, inverseFrame);
      conjugateInto(own, own);
      multiplyQuatInto(turn, turn, own);
    }
    turnAxes(world, t, turn);
  };
}
