import type { PoseValues } from '../rig/Rig';

/** A rig made ready to be evaluated many times. */
export interface Poser {
  /** World matrices of the last evaluation: 16 numbers a node in the order of `rig.nodes`, column-major. */
  readonly world: Float64Array;
  /** Weights of the morph targets of the last evaluation, in the order of `rig.shapes`. */
  readonly weights: Float64Array;
  /** Fills `world` and `weights` for the given control values; without values, for rest. */
  evaluate(pose?: PoseValues): void;
}
