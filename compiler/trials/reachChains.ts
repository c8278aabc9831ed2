import { eulerToQuat } from '../math/euler';
import { invertMat4, transformDirection, transformPoint } from '../math/mat4';
import { rotate } from '../math/quat';
import { addScaled, distance, normalise, sub } from '../math/vec3';
import { readMatrix, readPosition } from '../pose/worldMatrices';
import type { ControlNode, PoseValues, Vec3 } from '../rig/Rig';
import { attributeOf, isFree, joinPoses, nudgedPose, type PoseDraft, put, putAmount } from './poses';
import type { ChainPose, ReachChain } from './ReachChain';
import type { TrialBench } from './TrialBench';

/** A bench before chains have been posed on it. */
export type UnposedBench = Omit<TrialBench, 'chains' | 'chainPoses'>;

/** Every chain of the rig that a solver makes meet a goal; a new kind of such solver belongs here. */
export function findReachChains({
  rig,
  rest,
  indexOfName,
}: Pick<TrialBench, 'rig' | 'rest' | 'indexOfName'>): readonly ReachChain[] {
  const chains: ReachChain[] = [];
  for (const solver of rig.solvers) {
    if (solver.kind !== 'two_bone' && solver.kind !== 'reach') continue;
    const names = solver.kind === 'two_bone' ? [solver.start, solver.mid, solver.end] : solver.joints;
    const joints = names.map((name) => indexOfName.get(name) ?? -1);
    const goal = indexOfName.get(solver.goal) ?? -1;
    const points = joints.map((joint) => readPosition(rest, joint));
    const [start, end] = [points[0] as Vec3, points[points.length - 1] as Vec3];
    const restLength = points
      .slice(1)
      .reduce((sum, point, index) => sum + distance(points[index] as Vec3, point), 0);
    const inverse = invertMat4(readMatrix(rest, goal));
    if (inverse === undefined) continue;
    chains.push({
      solver,
      joints,
      goal,
      pole: indexOfName.get(solver.pole) ?? -1,
      goalToEnd: transformPoint(inverse, end),
      restLength,
      restDistance: distance(start, end),
    });
  }
  return chains;
}

/** Index of a chain's first joint. */
export function startOf(chain: ReachChain): number {
  return chain.joints[0] as number;
}

/** By name, what each node follows as a whole through a constraint: the first source of the first such one. */
function followedNodes({ rig }: UnposedBench): ReadonlyMap<string, string> {
  const follows = new Map<string, string>();
  for (const { kind, target, sources } of rig.constraints) {
    const [first] = sources;
    if (kind === 'parent' && first !== undefined && !follows.has(target)) follows.set(target, first.node);
  }
  return follows;
}

/** The control that moves a node as a whole: itself, what it hangs on or what it follows; null when there is none. */
function moverOf(
  index: number,
  bench: UnposedBench,
  follows: ReadonlyMap<string, string>,
): ControlNode | null {
  const { rig, intent, indexOfName } = bench;
  let node = rig.nodes[index];
  for (let hops = 0; node !== undefined && hops < rig.nodes.length; hops += 1) {
    if (node.id === intent.carrier) return null;
    if (node.kind === 'control' && isFree(node, 'tx') && isFree(node, 'ty') && isFree(node, 'tz'))
      return node;
    const { name }: { readonly name: string } = node;
    const next: string | null = follows.get(name) ?? node.parent;
    node = rig.nodes[next === null ? -1 : (indexOfName.get(next) ?? -1)];
  }
  return null;
}

/** Degrees by which the goals are swung out of the line they lie on at rest. */
const SWING: Vec3 = [18, -24, 12];

/**
 * A pose that puts the goal of every chain at `share` of its length from its start, to the side of where it is at
 * rest, with all solvers at work, `stretch` as given and no swing. What else moves depends on the rig; trials measure
 * where goals really are.
 */
function reachPose(
  movers: ReadonlyMap<ReachChain, ControlNode | null>,
  bench: UnposedBench,
  share: number,
  stretch: number,
): PoseValues {
  const draft: PoseDraft = {};
  for (const chain of movers.keys()) {
    const { solver } = chain;
    putAmount(draft, solver.blend, 1, bench);
    putAmount(draft, solver.stretch, stretch, bench);
    putAmount(draft, solver.swing, 0, bench);
    const mover = movers.get(chain) ?? null;
    if (mover === null) continue;
    const start = readPosition(bench.rest, startOf(chain));
    const end = readPosition(bench.rest, chain.joints[chain.joints.length - 1] as number);
    const along = normalise(sub(end, start));
    const swung = rotate(eulerToQuat(SWING, 'xyz'), chain.restDistance > 0 ? along : [0, 1, 0]);
    const wanted = addScaled(start, swung, share * chain.restLength);
    const frame = invertMat4(readMatrix(bench.rest, bench.indexOfName.get(mover.name) ?? -1));
    if (frame === undefined) continue;
    const [tx, ty, tz] = transformDirection(frame, sub(wanted, end));
    put(draft, mover.name, { tx, ty, tz });
  }
  return draft;
}

/** Where goals are put, in lengths of the chain: folded, near full reach and beyond it. */
const SHARES = [0.55, 0.98, 1.1];
const STRETCHED_SHARES = [1.3];
/** With everything else in the rig moved as well, poles among it. */
const NUDGED = [
  { seed: 3, share: 0.85 },
  { seed: 7, share: 0.65 },
];

/** Evaluates the poses in which chains are tried, for all trials of them together. */
export function poseChains(chains: readonly ReachChain[], bench: UnposedBench): readonly ChainPose[] {
  if (chains.length === 0) return [];
  const follows = followedNodes(bench);
  const movers = new Map(chains.map((chain) => [chain, moverOf(chain.goal, bench, follows)]));
  const canStretch = chains.some(({ solver }) => attributeOf(solver.stretch, bench));
  const poses = [
    ...SHARES.map((share) => reachPose(movers, bench, share, 0)),
    ...(canStretch ? STRETCHED_SHARES : []).map((share) => reachPose(movers, bench, share, 1)),
    ...NUDGED.map(({ seed, share }) =>
      joinPoses(nudgedPose(bench, seed), reachPose(movers, bench, share, 0)),
    ),
  ];
  return poses.map((pose) => {
    bench.poser.evaluate(pose);
    return { pose, world: bench.poser.world.slice() };
  });
}
