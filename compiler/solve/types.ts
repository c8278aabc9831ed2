import type { Quat, Vec3 } from '../rig/Rig';

/** Where a node stands in the world at rest. */
export interface RestPlace {
  readonly position: Vec3;
  readonly turn: Quat;
}

/** Geometry of a resolved recipe. */
export interface SolvedRecipe {
  /** World rest places of joints, controls and seats by id; what could not be placed is missing. */
  readonly places: ReadonlyMap<string, RestPlace>;
  /** Radius of each control's shape in scene units. */
  readonly sizes: ReadonlyMap<string, number>;
}
