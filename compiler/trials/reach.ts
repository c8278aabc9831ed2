import { transformDirection, transformPoint } from '../math/mat4';
import { addScaled, distance, length, normalise, sub } from '../math/vec3';
import { readMatrix, readPosition } from '../pose/worldMatrices';
import type { PoseValues, Vec3 } from '../rig/Rig';
import { amountIn, attributeOf, joinPoses, nudgedPose } from './poses';
import { findReachChains, type ReachChain, reachPose, startOf } from './reachChains';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/** Where goals are put, in lengths of the chain: folded, easy, near full reach, at it and beyond. */
const SHARES = [0.55, 0.85, 0.98, 1, 1.02, 1.3];
/** Goals nearer to the start than this part of the chain's length name no direction. */
const NO_DIRECTION = 1e-6;

/** Lengths that the bones have by their own transforms, and that they have been given. */
function measureBones({ joints }: ReachChain, { rig, poser }: TrialBench) {
  const own: number[] = [];
  const given: number[] = [];
  for (let i = 1; i < joints.length; i += 1) {
    const [above, here] = [joints[i - 1] as number, joints[i] as number];
    const at = rig.nodes[here]?.at ?? [0, 0, 0];
    own.push(length(transformDirection(readMatrix(poser.world, above), at)));
    given.push(distance(readPosition(poser.world, above), readPosition(poser.world, here)));
  }
  return { own, given };
}

/** How far a chain has to reach and by what factor it has to stretch, by the definitions of the build language. */
function expectedReach(chain: ReachChain, own: readonly number[], asked: number, stretch: number) {
  const { solver, restDistance, restLength } = chain;
  const most = own.reduce((sum, bone) => sum + bone, 0);
  const zone = Math.max(0, Math.min(solver.soft, 1 - restDistance / restLength)) * most;
  const begin = most - zone;
  const eased =
    asked <= begin ? asked : zone > 0 ? begin + zone * (1 - Math.exp((begin - asked) / zone)) : most;
  const factor = 1 + stretch * (Math.max(1, Math.min(asked / eased, solver.stretchLimit)) - 1);
  const [upper = 0, lower = 0] = own;
  const least = solver.kind === 'two_bone' ? Math.abs(upper - lower) : 0;
  // How near several bones fold is no closed formula; between rest and full reach every distance can be met.
  const isSure = solver.kind === 'two_bone' || asked >= (restDistance / restLength) * most;
  return { factor: eased > 0 ? factor : 1, reached: Math.min(most, Math.max(least, eased)), isSure };
}

function tryChain(chain: ReachChain, pose: PoseValues, bench: TrialBench, tally: Tally): void {
  const { rig, poser } = bench;
  const { solver, joints } = chain;
  if (amountIn(solver.blend, pose, bench) < 1) return;
  const end = joints[joints.length - 1] as number;
  const endId = rig.nodes[end]?.id ?? '';
  const start = readPosition(poser.world, startOf(chain));
  const goal = transformPoint(readMatrix(poser.world, chain.goal), chain.goalToEnd);
  const asked = distance(start, goal);
  const { own, given } = measureBones(chain, bench);
  const most = own.reduce((sum, bone) => sum + bone, 0);
  if (asked <= most * NO_DIRECTION) return;
  const stretch = Math.min(1, Math.max(0, amountIn(solver.stretch, pose, bench)));
  const { factor, reached, isSure } = expectedReach(chain, own, asked, stretch);
  own.forEach((bone, index) => {
    tally.add(
      (given[index] as number) - bone * factor,
      rig.nodes[joints[index + 1] as number]?.id ?? '',
      pose,
    );
  });
  if (!isSure) return;
  const expected: Vec3 = addScaled(start, normalise(sub(goal, start)), reached * factor);
  tally.add(distance(readPosition(poser.world, end), expected), endId, pose);
}

/**
 * A solved chain ends at its goal wherever it can reach, and keeps the lengths of its bones; beyond, it ends on the
 * line to the goal, as far out as its soft reach and its stretch say.
 */
export function tryReach(bench: TrialBench): TrialResult {
  const { rig, poser, tolerance } = bench;
  const tally = new Tally('reach', rig.scene.unit, tolerance);
  const chains = findReachChains(bench);
  if (chains.length === 0) return tally.result();
  const stretches = chains.some(({ solver }) => attributeOf(solver.stretch, bench)) ? [0, 1] : [0];
  const poses = stretches.flatMap((stretch) =>
    SHARES.map((share) => reachPose(chains, bench, share, stretch)),
  );
  const everywhere = joinPoses(nudgedPose(bench, 3), reachPose(chains, bench, 0.8, 0));
  for (const pose of [...poses, everywhere]) {
    poser.evaluate(pose);
    for (const chain of chains) tryChain(chain, pose, bench, tally);
  }
  return tally.result();
}
