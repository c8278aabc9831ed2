import type { SolePoint } from '../expand/types';
import type { Quat, Vec3 } from '../rig/Rig';

/** Where a node stands in the world at rest. */
export interface RestPlace {
  readonly position: Vec3;
  readonly turn: Quat;
}

/** Where a foot rolls, in the rest frame of the control that carries it. */
export interface FootPoints extends Readonly<Record<SolePoint, Vec3>> {
  /** Unit directions: positive roll turns about `hinge`, positive bank about `forward`. */
  readonly hinge: Vec3;
  readonly forward: Vec3;
}

/** Geometry of a resolved recipe. */
export interface SolvedRecipe {
  /** World rest places of joints, controls and seats by id; what could not be placed is missing. */
  readonly places: ReadonlyMap<string, RestPlace>;
  /** Points of each foot roll by the solver's id. */
  readonly feet: ReadonlyMap<string, FootPoints>;
  /** Radius of each control's shape in scene units. */
  readonly sizes: ReadonlyMap<string, number>;
}
