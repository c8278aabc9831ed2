import type { ResolveContext } from '../resolve/Reporter';
import type { ResolvedRecipe } from '../resolve/types';
import { controlSizes, measureExtent } from './controlSizes';
import { PlaceSolver } from './PlaceSolver';
import type { SolvedRecipe } from './types';

/** Computes where everything stands at rest, how it is turned and how large controls are drawn. */
export function solveRecipe(recipe: ResolvedRecipe, context: ResolveContext): SolvedRecipe {
  const solver = new PlaceSolver(recipe, context);
  solver.solveAll();
  const { places, feet } = solver;
  const extent = measureExtent(
    [...places.values()].map(({ position }) => position),
    recipe.scene.up,
  );
  const sizes = controlSizes(recipe, places, extent, context);
  for (const { id, occupant } of recipe.seats) {
    const place = places.get(occupant);
    if (place) places.set(id, place);
  }
  return { places, feet, sizes };
}
