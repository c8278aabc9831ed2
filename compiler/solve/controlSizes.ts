import type { ControlSpecification } from '../expand/types';
import { distance } from '../math/vec3';
import { CARRIER_ROLE } from '../resolve/findCarrier';
import type { ResolveContext } from '../resolve/Reporter';
import type { ResolvedRecipe } from '../resolve/types';
import type { Vec3 } from '../rig/Rig';
import { solveFindings } from './findings';
import type { RestPlace } from './types';

/** Radius of a control on a joint, as a share of that joint's longer bone. Common practice: readable, not crowding. */
const SHARE_OF_BONE = 0.3;
/** Radius of a control in mid-air, as a share of the rig's size. */
const SHARE_OF_RIG = 0.03;
/** The root control reaches this far past the rig's footprint. */
const CARRIER_MARGIN = 1.15;
/** Radii are rounded to this many significant digits: nobody sees more, and scripts stay readable. */
const SIZE_DIGITS = 4;

/** Extent of all placed things: the box diagonal (the "rig's size") and the footprint's half diagonal. */
export interface RigExtent {
  readonly size: number;
  readonly footprint: number;
}

/** Measures a rig at rest; an empty one has size 1, so that nothing is divided by zero. */
export function measureExtent(positions: Iterable<Vec3>, up: Vec3): RigExtent {
  const low = [Infinity, Infinity, Infinity];
  const high = [-Infinity, -Infinity, -Infinity];
  for (const position of positions) {
    for (let axis = 0; axis < 3; axis += 1) {
      low[axis] = Math.min(low[axis] as number, position[axis] as number);
      high[axis] = Math.max(high[axis] as number, position[axis] as number);
    }
  }
  let whole = 0;
  let flat = 0;
  for (let axis = 0; axis < 3; axis += 1) {
    const extent = (high[axis] as number) - (low[axis] as number);
    if (!(extent > 0)) continue;
    whole += extent * extent;
    if (up[axis] === 0) flat += extent * extent;
  }
  const size = Math.sqrt(whole);
  return { size: size > 0 ? size : 1, footprint: Math.sqrt(flat) / 2 };
}

/** The longer of the bones that meet at each joint. */
function boneLengths(
  recipe: ResolvedRecipe,
  places: ReadonlyMap<string, RestPlace>,
): ReadonlyMap<string, number> {
  const lengths = new Map<string, number>();
  const note = (id: string, size: number): void => {
    lengths.set(id, Math.max(lengths.get(id) ?? 0, size));
  };
  for (const { jointIds } of recipe.chains) {
    for (let index = 1; index < jointIds.length; index += 1) {
      const before = jointIds[index - 1] as string;
      const here = jointIds[index] as string;
      const from = places.get(before);
      const to = places.get(here);
      if (!from || !to) continue;
      const size = distance(from.position, to.position);
      note(before, size);
      note(here, size);
    }
  }
  return lengths;
}

function roundToDigits(value: number): number {
  return Number(value.toPrecision(SIZE_DIGITS));
}

/** Radius of each control: from the bone it stands on, the footprint it carries, or the rig's size. */
export function controlSizes(
  recipe: ResolvedRecipe,
  places: ReadonlyMap<string, RestPlace>,
  extent: RigExtent,
  context: ResolveContext,
): ReadonlyMap<string, number> {
  const bones = boneLengths(recipe, places);
  const sizes = new Map<string, number>();
  const natural = (control: ControlSpecification): number => {
    if (control.role === CARRIER_ROLE)
      return Math.max(extent.footprint * CARRIER_MARGIN, extent.size * SHARE_OF_RIG);
    const stands = control.place.kind === 'place' ? control.place.at : control.place.joints[1];
    const bone = control.align ?? (typeof stands === 'string' ? stands : null);
    const size = bone === null ? undefined : bones.get(bone);
    return size === undefined || control.place.kind === 'pole'
      ? extent.size * SHARE_OF_RIG
      : size * SHARE_OF_BONE;
  };
  for (const control of recipe.controls) {
    if (!(control.size > 0)) {
      const span = context.document.spanAt([...control.path, 'size']);
      context.findings.report(solveFindings, 'size-not-positive', span, {
        id: control.id,
        size: control.size,
      });
    }
    sizes.set(control.id, roundToDigits(natural(control) * Math.max(control.size, 0)));
  }
  return sizes;
}
