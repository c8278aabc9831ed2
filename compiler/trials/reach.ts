import { transformDirection, transformPoint } from '../math/mat4';
import { addScaled, distance, length, normalise, sub } from '../math/vec3';
import { readMatrix, readPosition } from '../pose/worldMatrices';
import type { Vec3 } from '../rig/Rig';
import { amountIn } from './poses';
import type { ChainPose, ReachChain } from './ReachChain';
import { startOf } from './reachChains';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/** Goals nearer to the start than this part of the chain's length name no direction. */
const NO_DIRECTION = 1e-6;

/** Lengths that the bones have by their own transforms, and that they have been given. */
function measureBones({ joints }: ReachChain, { rig }: TrialBench, world: Float64Array) {
  const own: number[] = [];
  const given: number[] = [];
  for (let i = 1; i < joints.length; i += 1) {
    const [above, here] = [joints[i - 1] as number, joints[i] as number];
    const at = rig.nodes[here]?.at ?? [0, 0, 0];
    own.push(length(transformDirection(readMatrix(world, above), at)));
    given.push(distance(readPosition(world, above), readPosition(world, here)));
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

function tryChain(chain: ReachChain, { pose, world }: ChainPose, bench: TrialBench, tally: Tally): void {
  const { rig } = bench;
  const { solver, joints } = chain;
  if (amountIn(solver.blend, pose, bench) < 1) return;
  const end = joints[joints.length - 1] as number;
  const endId = rig.nodes[end]?.id ?? '';
  const start = readPosition(world, startOf(chain));
  const goal = transformPoint(readMatrix(world, chain.goal), chain.goalToEnd);
  const asked = distance(start, goal);
  const { own, given } = measureBones(chain, bench, world);
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
  tally.add(distance(readPosition(world, end), expected), endId, pose);
}

/**
 * A solved chain ends at its goal wherever it can reach, and keeps the lengths of its bones; beyond, it ends on the
 * line to the goal, as far out as its soft reach and its stretch say.
 */
export function tryReach(bench: TrialBench): TrialResult {
  const { rig, chains, chainPoses, tolerance } = bench;
  const tally = new Tally('reach', rig.scene.unit, tolerance);
  for (const chainPose of chainPoses) for (const chain of chains) tryChain(chain, chainPose, bench, tally);
  return tally.result();
}
