import { invariant } from '../findings/invariant';
import { axisAngleInto, type Mutable, makeQuat, makeVec, rotateInto, subInto } from '../math/inPlace';
import { IDENTITY_MAT4, invertMat4, multiplyMat4 } from '../math/mat4';
import type { FootRollSolver } from '../rig/Rig';
import { type RigMemory, restOf, type Step } from './RigMemory';
import { composeInto, multiplyInto } from './worldMatrices';

const ONE = makeVec([1, 1, 1]);
const RADIANS = Math.PI / 180;

/** Slots of the three numbers that roll a foot, all in degrees. */
export interface FootRollSlots {
  readonly roll: number;
  readonly bank: number;
  readonly break: number;
}

/**
 * Prepares a foot roll. Negative roll turns about the heel; positive roll turns about the ball up to the break angle
 * and beyond it about the toe; positive bank turns about the outer point of the sole, negative about the inner one.
 * The ankle is moved by all of them, the toes by all but the ball.
 */
export function prepareFootRoll(solver: FootRollSolver, memory: RigMemory, slots: FootRollSlots): Step {
  const { world, values, indexOf } = memory;
  const foot = indexOf(solver.foot) * 16;
  const ankle = indexOf(solver.ankle) * 16;
  const toes = indexOf(solver.toes) * 16;
  const inverse = invertMat4(restOf(memory, indexOf(solver.foot)));
  invariant(inverse !== undefined, 'rest matrices hold no scale and can be inverted');
  const ankleOffset = Float64Array.from(multiplyMat4(inverse, restOf(memory, indexOf(solver.ankle))));
  const toesOffset = Float64Array.from(multiplyMat4(inverse, restOf(memory, indexOf(solver.toes))));
  const hinge = makeVec(solver.hinge);
  const forward = makeVec(solver.forward);
  const heel = makeVec(solver.heel);
  const ball = makeVec(solver.ball);
  const toe = makeVec(solver.toe);
  const inner = makeVec(solver.inner);
  const outer = makeVec(solver.outer);

  const moved = Float64Array.from(IDENTITY_MAT4);
  const product = Float64Array.from(IDENTITY_MAT4);
  const pivot = Float64Array.from(IDENTITY_MAT4);
  const turn = makeQuat();
  const at = makeVec();

  /** moved = moved × turn about a point. */
  const turnAbout = (point: Mutable, axis: Mutable, degrees: number): void => {
    if (degrees === 0) return;
    axisAngleInto(turn, axis, degrees * RADIANS);
    rotateInto(at, turn, point);
    subInto(at, point, at);
    composeInto(pivot, 0, at, turn, ONE);
    multiplyInto(product, 0, moved, 0, pivot, 0);
    moved.set(product);
  };

  return () => {
    const roll = values[slots.roll] as number;
    const bank = values[slots.bank] as number;
    const limit = Math.max(0, values[slots.break] as number);
    moved.set(IDENTITY_MAT4);
    turnAbout(heel, hinge, Math.min(0, roll));
    turnAbout(outer, forward, Math.max(0, bank));
    turnAbout(inner, forward, Math.min(0, bank));
    turnAbout(toe, hinge, Math.max(0, roll - limit));
    multiplyInto(product, 0, moved, 0, toesOffset, 0);
    if (toes !== ankle) multiplyInto(world, toes, world, foot, product, 0);
    turnAbout(ball, hinge, Math.min(Math.max(0, roll), limit));
    multiplyInto(product, 0, moved, 0, ankleOffset, 0);
    multiplyInto(world, ankle, world, foot, product, 0);
  };
}
