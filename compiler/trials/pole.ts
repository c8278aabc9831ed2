import { transformPoint } from '../math/mat4';
import { quatFromAxisAngle, rotate } from '../math/quat';
import { BEND_TOLERANCE } from '../math/tolerances';
import { cross, distance, dot, length, normalise, rejectFrom, scale, signedAngle, sub } from '../math/vec3';
import { readMatrix, readPosition } from '../pose/worldMatrices';
import type { Vec3 } from '../rig/Rig';
import { amountIn } from './poses';
import type { ChainPose, ReachChain } from './ReachChain';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/**
 * Poles nearer to the line of the chain than this part of their distance are not tried: there the plane turns faster
 * than its numbers are exact.
 */
const PLAIN_POLE = 0.02;

interface Plane {
  readonly start: Vec3;
  /** Unit direction from start to goal, and at right angles to it toward the pole. */
  readonly along: Vec3;
  readonly toward: Vec3;
}

/** The plane of start, goal and pole; null when they lie too near to one line. */
function planeOf(
  { joints, pole, goal, goalToEnd }: ReachChain,
  matrices: Float64Array,
  least: number,
): Plane | null {
  const start = readPosition(matrices, joints[0] as number);
  // Not to the end: whether that meets the goal is another trial's question.
  const line = sub(transformPoint(readMatrix(matrices, goal), goalToEnd), start);
  const toPole = sub(readPosition(matrices, pole), start);
  if (length(line) <= least) return null;
  const along = normalise(line);
  const off = rejectFrom(toPole, along);
  return length(off) <= PLAIN_POLE * length(toPole) ? null : { start, along, toward: normalise(off) };
}

/** The joint between start and end that lies farthest off their line, with how far. */
function widestJoint({ joints }: ReachChain, plane: Plane, matrices: Float64Array) {
  let widest = { joint: joints[1] as number, off: [0, 0, 0] as Vec3 };
  for (const joint of joints.slice(1, -1)) {
    const off = rejectFrom(sub(readPosition(matrices, joint), plane.start), plane.along);
    if (length(off) > length(widest.off)) widest = { joint, off };
  }
  return widest;
}

/** The angle from the pole's plane to the bend that the chain has at rest and keeps; null when it has no such angle. */
function restAngle(chain: ReachChain, { rest, tolerance }: TrialBench): number | null {
  const plane = planeOf(chain, rest, chain.restLength * BEND_TOLERANCE);
  if (plane === null) return null;
  const { off } = widestJoint(chain, plane, rest);
  if (length(off) <= chain.restLength * BEND_TOLERANCE) return 0;
  if (chain.solver.kind === 'reach') {
    // Joints that do not bend in one plane have no one direction that could be held against the pole.
    const normal = normalise(cross(plane.along, off));
    const isFlat = chain.joints.every(
      (joint) => Math.abs(dot(sub(readPosition(rest, joint), plane.start), normal)) <= tolerance,
    );
    if (!isFlat) return null;
  }
  return signedAngle(plane.toward, off, plane.along);
}

function tryChain(
  chain: ReachChain,
  angle: number,
  { pose, world }: ChainPose,
  bench: TrialBench,
  tally: Tally,
): void {
  const { rig } = bench;
  if (amountIn(chain.solver.blend, pose, bench) < 1) return;
  const plane = planeOf(chain, world, chain.restLength * PLAIN_POLE);
  if (plane === null) return;
  const swing = (amountIn(chain.solver.swing, pose, bench) * Math.PI) / 180;
  const bend = rotate(quatFromAxisAngle(plane.along, angle + swing), plane.toward);
  if (chain.solver.kind === 'two_bone') {
    const mid = chain.joints[1] as number;
    const off = rejectFrom(sub(readPosition(world, mid), plane.start), plane.along);
    tally.add(distance(off, scale(bend, length(off))), rig.nodes[mid]?.id ?? '', pose);
    return;
  }
  // Folded together, joints of a longer row may pass to the other side of the line, but never out of the plane.
  const normal = cross(plane.along, bend);
  for (const joint of chain.joints.slice(1, -1)) {
    const off = dot(sub(readPosition(world, joint), plane.start), normal);
    tally.add(off, rig.nodes[joint]?.id ?? '', pose);
  }
}

/**
 * The middle joint points at its pole, in whatever pose: start, middle, end and pole lie in one plane, with the middle
 * on the pole's side. Where the recipe puts the pole beside that plane, the angle of rest is kept.
 */
export function tryPole(bench: TrialBench): TrialResult {
  const { rig, intent, rest, tolerance } = bench;
  const tally = new Tally('pole', rig.scene.unit, tolerance);
  const chains = bench.chains.flatMap((chain) => {
    const angle = restAngle(chain, bench);
    return angle === null ? [] : [{ chain, angle }];
  });
  if (chains.length === 0) return tally.result();
  for (const { chain } of chains) {
    // A pole that the compiler placed lies on the plane itself.
    const plane = intent.computedPoles.has(chain.solver.id) ? planeOf(chain, rest, 0) : null;
    if (plane === null) continue;
    const { joint, off } = widestJoint(chain, plane, rest);
    tally.add(distance(off, scale(plane.toward, length(off))), rig.nodes[joint]?.id ?? '');
  }
  for (const chainPose of bench.chainPoses) {
    for (const { chain, angle } of chains) tryChain(chain, angle, chainPose, bench, tally);
  }
  return tally.result();
}
