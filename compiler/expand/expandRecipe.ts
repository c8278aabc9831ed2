import type { EvaluatedRecipe } from '../expressions/EvaluatedRecipe';
import { collectPrimitives } from './collectPrimitives';
import type { Sided } from './primitives';
import type { StageContext } from './StageContext';
import { readSceneFrame } from './sceneFrame';
import { mirrorPoint } from './sides';
import { specifyChain } from './specifyChain';
import { specifyControl } from './specifyControl';
import {
  specifyConstraint,
  specifyDriver,
  specifyGeometry,
  specifyGuideLine,
  specifyShape,
  specifySkin,
} from './specifyLinks';
import { specifySolver } from './specifySolver';
import type { ExpandedRecipe, LandmarkPoints, SceneFrame } from './types';

/** Fills in the defaults of every entry; an entry that is not complete is poisoned. */
function specifyAll<E, S>(
  collection: string,
  entries: ReadonlyMap<string, Sided<E>>,
  specify: (sided: Sided<E>, context: StageContext) => S | null,
  context: StageContext,
): readonly S[] {
  const specified: S[] = [];
  for (const sided of entries.values()) {
    const specification = specify(sided, context);
    if (specification === null) context.poisoned.add(`${collection}/${sided.id}`);
    else specified.push(specification);
  }
  return specified;
}

function readLandmarks(
  recipe: EvaluatedRecipe,
  scene: SceneFrame,
  poisoned: ReadonlySet<string>,
): ReadonlyMap<string, LandmarkPoints> {
  const landmarks = new Map<string, LandmarkPoints>();
  for (const [name, landmark] of Object.entries(recipe.landmarks ?? {})) {
    if (poisoned.has(`landmarks/${name}`)) continue;
    const mirrored = landmark.side === 'left' ? mirrorPoint(landmark.at, scene.left) : landmark.at;
    landmarks.set(name, { left: landmark.at, right: landmark.right ?? mirrored });
  }
  return landmarks;
}

/** Writes a recipe out in primitives: parts expanded, sides split, defaults filled in. */
export function expandRecipe(recipe: EvaluatedRecipe, context: StageContext): ExpandedRecipe {
  const scene = readSceneFrame(recipe.scene, context);
  const primitives = collectPrimitives(recipe, scene.left, context.poisoned);
  return {
    scene,
    landmarks: readLandmarks(recipe, scene, context.poisoned),
    chains: specifyAll('chains', primitives.chains, specifyChain, context),
    controls: specifyAll('controls', primitives.controls, specifyControl, context),
    solvers: specifyAll('solvers', primitives.solvers, specifySolver, context),
    constraints: specifyAll('constraints', primitives.constraints, specifyConstraint, context),
    drivers: specifyAll('drivers', primitives.drivers, specifyDriver, context),
    geometry: specifyAll('geometry', primitives.geometry, specifyGeometry, context),
    skins: specifyAll('skins', primitives.skins, specifySkin, context),
    shapes: specifyAll('shapes', primitives.shapes, specifyShape, context),
    guideLines: specifyAll('guide_lines', primitives.guide_lines, specifyGuideLine, context),
    notes: Object.entries(recipe.notes ?? {}).map(([key, value]) => ({ key, value })),
  };
}
