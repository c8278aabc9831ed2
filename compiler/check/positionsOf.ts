import type { Vec3 } from '../rig/Rig';
import type { SolvedRecipe } from '../solve/types';

/** World rest positions in the scene's axes and unit, in the order of the ids; null when one was not placed. */
export function positionsOf(solved: SolvedRecipe, ids: readonly string[]): readonly Vec3[] | null {
  const positions: Vec3[] = [];
  for (const id of ids) {
    const place = solved.places.get(id);
    if (!place) return null;
    positions.push(place.position);
  }
  return positions;
}

/** As `positionsOf`, for the three joints of a limb. */
export function limbPositions(
  solved: SolvedRecipe,
  joints: readonly [string, string, string],
): readonly [Vec3, Vec3, Vec3] | null {
  const [start, mid, end] = positionsOf(solved, joints) ?? [];
  return start && mid && end ? [start, mid, end] : null;
}
