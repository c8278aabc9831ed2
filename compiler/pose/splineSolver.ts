import {
  addScaledInto,
  axisAngleInto,
  conjugateInto,
  dotOf,
  frameInto,
  type Mutable,
  makeQuat,
  makeVec,
  multiplyQuatInto,
  perpendicularInto,
  rotateInto,
  scaleInto,
  signedAngleOf,
  subInto,
} from '../math/inPlace';
import { determinantOf, positionOf, rotationOf } from '../math/mat4';
import { POLE_TOLERANCE } from '../math/tolerances';
import { distance } from '../math/vec3';
import type { SplineSolver, Vec3 } from '../rig/Rig';
import { type RigMemory, restOf, type Step } from './RigMemory';
import { SplineCurve } from './splineCurve';
import { positionInto, rotationInto, turnAxes, writePosition } from './worldMatrices';

/** How far along the chain each joint stands at rest, 0 to 1 by the lengths of the bones. */
function chainFractions(points: readonly Vec3[]): Float64Array {
  const runs = new Float64Array(points.length);
  for (let i = 1; i < points.length; i += 1) {
    runs[i] = (runs[i - 1] as number) + distance(points[i] as Vec3, points[i - 1] as Vec3);
  }
  const total = runs[points.length - 1] as number;
  return runs.map((run, i) => (total > 0 ? run / total : i / Math.max(1, points.length - 1)));
}

/** Cube root of the volume that a matrix gives the unit cube: the one scale that stands for all three. */
function scaleAt(world: Float64Array, o: number): number {
  const m = world;
  const yz = (m[o + 5] as number) * (m[o + 10] as number) - (m[o + 6] as number) * (m[o + 9] as number);
  const zx = (m[o + 6] as number) * (m[o + 8] as number) - (m[o + 4] as number) * (m[o + 10] as number);
  const xy = (m[o + 4] as number) * (m[o + 9] as number) - (m[o + 5] as number) * (m[o + 8] as number);
  const determinant = (m[o] as number) * yz + (m[o + 1] as number) * zx + (m[o + 2] as number) * xy;
  return Math.cbrt(Math.abs(determinant));
}

/**
 * Prepares a spline solver: joints ride on a curve through the controls' places, each where it stands along the chain
 * at rest, keeping the offset and turn that it has to the curve's frame at rest. The ends' twist is spread between
 * them. See section 5 of the reference.
 */
export function prepareSpline(
  solver: SplineSolver,
  memory: RigMemory,
  parent: number | null,
  slots: { readonly stretch: number; readonly volume: number },
): Step {
  const { world, values, indexOf } = memory;
  const joints = Int32Array.from(solver.joints, (name) => indexOf(name) * 16);
  const controls = Int32Array.from(solver.controls, (name) => indexOf(name) * 16);
  const restPoints = solver.joints.map((name) => positionOf(restOf(memory, indexOf(name))));
  const fractions = chainFractions(restPoints);
  const curve = new SplineCurve(controls.length);
  const inverseRestTurn = (name: string): Mutable => {
    const turn = makeQuat(rotationOf(restOf(memory, indexOf(name))));
    conjugateInto(turn, turn);
    return turn;
  };
  const firstInverse = inverseRestTurn(solver.controls[0] ?? '');
  const lastInverse = inverseRestTurn(solver.controls[solver.controls.length - 1] ?? '');

  const place = makeVec();
  const tangent = makeVec();
  const normal = makeVec();
  const side = makeVec();
  const wanted = makeVec();
  const step = makeVec();
  const turn = makeQuat();
  const frame = makeQuat();
  const own = makeQuat();
  const twist = makeQuat();

  // The curve at rest, and each joint's place and turn in its frame there.
  solver.controls.forEach((name, index) => {
    curve.points[index]?.set(positionOf(restOf(memory, indexOf(name))));
  });
  subInto(step, curve.points[1] as Mutable, curve.points[0] as Mutable);
  const firstSide = makeVec();
  perpendicularInto(firstSide, step);
  curve.measure(firstSide);
  const restLength = curve.length;
  const lastSide = makeVec();
  curve.endInto(tangent, lastSide);
  const offsets: Mutable[] = [];
  const restTurns: Mutable[] = [];
  restPoints.forEach((point, index) => {
    curve.atLengthInto(restLength * (fractions[index] as number), place, tangent, normal);
    frameInto(frame, tangent, normal, POLE_TOLERANCE);
    conjugateInto(frame, frame);
    const offset = makeVec(point);
    subInto(offset, offset, place);
    rotateInto(offset, frame, offset);
    offsets.push(offset);
    const restTurn = makeQuat(rotationOf(restOf(memory, (joints[index] as number) / 16)));
    multiplyQuatInto(restTurn, frame, restTurn);
    restTurns.push(restTurn);
  });
  const restScale = parent === null ? 1 : Math.cbrt(Math.abs(determinantOf(restOf(memory, parent))));

  /** The sides that both ends' controls carry with them. */
  const carrySide = (out: Mutable, control: number, inverse: Mutable, from: Mutable): void => {
    rotationInto(turn, world, control);
    multiplyQuatInto(turn, turn, inverse);
    rotateInto(out, turn, from);
  };
  /** Thickens or thins a joint's axes at right angles to the curve. */
  const widen = (o: number, factor: number): void => {
    for (let c = o; c < o + 12; c += 4) {
      for (let i = 0; i < 3; i += 1) step[i] = world[c + i] as number;
      const along =
        (step[0] as number) * (tangent[0] as number) +
        (step[1] as number) * (tangent[1] as number) +
        (step[2] as number) * (tangent[2] as number);
      scaleInto(step, step, factor);
      addScaledInto(step, step, tangent, along * (1 - factor));
      for (let i = 0; i < 3; i += 1) world[c + i] = step[i] as number;
    }
  };

  return () => {
    const stretch = Math.min(1, Math.max(0, values[slots.stretch] as number));
    const volume = Math.min(1, Math.max(0, values[slots.volume] as number));
    for (let i = 0; i < controls.length; i += 1) {
      positionInto(curve.points[i] as Mutable, world, controls[i] as number);
    }
    carrySide(side, controls[0] as number, firstInverse, firstSide);
    curve.measure(side);
    carrySide(wanted, controls[controls.length - 1] as number, lastInverse, lastSide);
    curve.endInto(tangent, normal);
    addScaledInto(wanted, wanted, tangent, -dotOf(wanted, tangent));
    const ends = signedAngleOf(normal, wanted, tangent);
    const size = parent === null ? 1 : scaleAt(world, parent * 16) / restScale;
    const kept = restLength * size;
    const run = kept + (curve.length - kept) * stretch;
    const width = volume > 0 && run > 0 && kept > 0 ? (run / kept) ** (-volume / 2) : 1;

    for (let i = 0; i < joints.length; i += 1) {
      const o = joints[i] as number;
      const here = run * (fractions[i] as number);
      curve.atLengthInto(here, place, tangent, normal);
      const share = curve.length > 0 ? Math.min(1, here / curve.length) : 0;
      axisAngleInto(twist, tangent, ends * share);
      rotateInto(normal, twist, normal);
      frameInto(frame, tangent, normal, POLE_TOLERANCE);
      rotateInto(step, frame, offsets[i] as Mutable);
      addScaledInto(place, place, step, size);
      multiplyQuatInto(turn, frame, restTurns[i] as Mutable);
      rotationInto(own, world, o);
      conjugateInto(own, own);
      multiplyQuatInto(turn, turn, own);
      turnAxes(world, o, turn);
      if (width !== 1) widen(o, width);
      writePosition(world, o, place);
    }
  };
}
