import { mirrorId, mirrorPoint } from '../expand/sides';
import type { ChainSpecification, ControlSpecification, PlaceReference } from '../expand/types';
import { distance } from '../math/vec3';
import type { ResolvedRecipe } from '../resolve/types';
import type { Axis } from '../rig/Rig';
import type { TwinAxes, Twins } from './TrialIntent';

/** Landmarks count as mirrored when they are so as near as rest positions are rounded, in scene units. */
const MIRRORED_LANDMARK = 1e-9;

const SAME_AXES: TwinAxes = { kind: 'same' };

/** The axis that is neither the one along the bone nor the one that leans up. */
function hingeOf(aim: Axis, up: Axis): 0 | 1 | 2 {
  const hinge = 'xyz'.replace(aim.slice(1), '').replace(up.slice(1), '');
  return hinge === 'x' ? 0 : hinge === 'y' ? 1 : 2;
}

function chainAxes({ mirror, orient }: ChainSpecification): TwinAxes {
  switch (mirror) {
    case 'behaviour':
      return { kind: 'opposed' };
    case 'orientation':
      return { kind: 'hinge', axis: hingeOf(orient.aim, orient.up) };
    case 'world':
      return SAME_AXES;
    default:
      return mirror satisfies never;
  }
}

/** Landmarks whose right point the recipe gives itself, in another place than the mirror would. */
function lopsidedLandmarks({ landmarks, scene }: ResolvedRecipe): ReadonlySet<string> {
  const lopsided = [...landmarks].filter(
    ([, { left, right }]) =>
      left !== right && distance(right, mirrorPoint(left, scene.left)) > MIRRORED_LANDMARK,
  );
  return new Set(lopsided.map(([name]) => name));
}

/** The right copy of each left entry: written in one place, called by the mirrored id. */
function pairUp<T extends ChainSpecification | ControlSpecification>(
  entries: readonly T[],
): readonly (readonly [T, T])[] {
  const byId = new Map(entries.map((entry) => [entry.id, entry]));
  return entries.flatMap((left) => {
    const right = left.side === 'left' ? byId.get(mirrorId(left.id)) : undefined;
    return right?.side === 'right' && right.path.join('/') === left.path.join('/') ? [[left, right]] : [];
  });
}

/**
 * Joints and controls that the recipe makes on both sides from one entry, each with how its right axes follow from
 * the left ones. Left out is what stands on a landmark whose right point the recipe places differently.
 */
export function findTwins(recipe: ResolvedRecipe): readonly Twins[] {
  const lopsided = lopsidedLandmarks(recipe);
  const axesOfJoint = new Map<string, TwinAxes>();
  const isMirrored = (place: PlaceReference): boolean =>
    typeof place !== 'string' ||
    (recipe.landmarks.has(place) ? !lopsided.has(place) : axesOfJoint.has(place) || !/\bleft\b/.test(place));
  const twins: Twins[] = [];
  for (const [left, right] of pairUp(recipe.chains)) {
    if (!left.points.every(isMirrored)) continue;
    const axes = chainAxes(left);
    left.jointIds.forEach((id, index) => {
      const other = right.jointIds[index];
      if (other === undefined) return;
      axesOfJoint.set(id, axes);
      twins.push({ left: id, right: other, axes });
    });
  }
  const controls = new Map(recipe.controls.map((control) => [control.id, control]));
  const axesOfControl = (control: ControlSpecification): TwinAxes => {
    // Aligned controls take over the axes of a joint, perhaps by way of other controls.
    for (let align = control.align, hops = 0; align !== null && hops < controls.size; hops += 1) {
      const axes = axesOfJoint.get(align);
      if (axes) return axes;
      align = controls.get(align)?.align ?? null;
    }
    return SAME_AXES;
  };
  for (const [left, right] of pairUp(recipe.controls)) {
    const { place } = left;
    const places = place.kind === 'pole' ? place.joints : [place.at];
    if (places.every(isMirrored)) twins.push({ left: left.id, right: right.id, axes: axesOfControl(left) });
  }
  return twins;
}
