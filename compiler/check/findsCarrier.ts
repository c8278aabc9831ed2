import { CARRIER_ROLE } from '../resolve/findCarrier';
import type { ResolvedRecipe } from '../resolve/types';

/** Whether any control carries the rig. */
export function findsCarrier(recipe: ResolvedRecipe): boolean {
  return recipe.controls.some(({ role }) => role === CARRIER_ROLE);
}
