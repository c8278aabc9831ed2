import type { PoseValues, ReachSolver, TwoBoneSolver, Vec3 } from '../rig/Rig';

/** A chain whose end a solver brings to a goal, with what trials need of its rest. */
export interface ReachChain {
  readonly solver: TwoBoneSolver | ReachSolver;
  /** Indices of its joints in the list of nodes, from start to end. */
  readonly joints: readonly number[];
  readonly goal: number;
  readonly pole: number;
  /** Where the end is in the goal's frame at rest. */
  readonly goalToEnd: Vec3;
  /** Lengths of the bones at rest together, and the distance from start to end. */
  readonly restLength: number;
  readonly restDistance: number;
}

/** A pose for chains with the world matrices it gives. */
export interface ChainPose {
  readonly pose: PoseValues;
  readonly world: Float64Array;
}
