import { REST_TOLERANCE } from '../math/tolerances';
import { createPoser } from '../pose/createPoser';
import { indexNodes } from '../pose/evaluationOrder';
import type { Poser } from '../pose/Poser';
import { restWorldMatrices, writeMatrix } from '../pose/worldMatrices';
import type { ControlNode, Rig } from '../rig/Rig';
import type { ChainPose, ReachChain } from './ReachChain';
import { findReachChains, poseChains } from './reachChains';
import type { TrialIntent } from './TrialIntent';

/** A rig with what its recipe asks of it, made ready once for all trials. */
export interface TrialBench {
  readonly rig: Rig;
  readonly intent: TrialIntent;
  /** Shared by all trials: each evaluates what it needs and reads it before the next does. */
  readonly poser: Poser;
  /** World matrices by rest transforms alone, flat like the poser's. */
  readonly rest: Float64Array;
  /** World matrices as everything evaluates at rest, flat like the poser's. */
  readonly evaluatedRest: Float64Array;
  readonly indexOfName: ReadonlyMap<string, number>;
  readonly indexOfId: ReadonlyMap<string, number>;
  readonly controls: ReadonlyMap<string, ControlNode>;
  /** Chains that solvers bring to a goal, and the poses in which trials look at them. */
  readonly chains: readonly ReachChain[];
  readonly chainPoses: readonly ChainPose[];
  /** Greatest distance of a node from the origin at rest, in scene units: what rounding errors are relative to. */
  readonly size: number;
  /** What evaluation may be off by, in scene units. */
  readonly tolerance: number;
}

/** Makes the bench; `rig` must be sound enough to be evaluated. */
export function makeTrialBench(rig: Rig, intent: TrialIntent): TrialBench {
  const poser = createPoser(rig);
  const rest = new Float64Array(rig.nodes.length * 16);
  let size = 0;
  restWorldMatrices(rig).forEach((matrix, index) => {
    writeMatrix(rest, index, matrix);
    size = Math.max(size, Math.hypot(matrix[12], matrix[13], matrix[14]));
  });
  poser.evaluate();
  const controls = rig.nodes.filter((node) => node.kind === 'control');
  // A rig that is one point at the origin has the size of its shapes, or else of one unit.
  if (size === 0) size = Math.max(0, ...controls.map((control) => control.size)) || 1;
  const bench = {
    rig,
    intent,
    poser,
    rest,
    evaluatedRest: poser.world.slice(),
    indexOfName: indexNodes(rig),
    indexOfId: new Map(rig.nodes.map(({ id }, index) => [id, index])),
    controls: new Map(controls.map((control) => [control.name, control])),
    size,
    tolerance: REST_TOLERANCE * size,
  };
  const chains = findReachChains(bench);
  return { ...bench, chains, chainPoses: poseChains(chains, bench) };
}
