import type { StageContext } from '../expand/StageContext';
import { readSceneFrame } from '../expand/sceneFrame';
import { mirrorPoint } from '../expand/sides';
import { orderByReads } from '../order/orderByReads';
import type { Vec3 } from '../rig/Rig';
import type { Recipe } from '../schema/generated/recipeTypes';
import type { Path } from '../syntax/types';
import type { EvaluatedLandmark, EvaluatedRecipe } from './EvaluatedRecipe';
import { Evaluator, type LandmarkValue, type Wanted } from './Evaluator';
import { expressionFindings } from './findings';
import { readParameters } from './readParameters';

/** Collections whose entries may hold expressions. */
const COLLECTIONS = [
  'parts',
  'chains',
  'controls',
  'solvers',
  'constraints',
  'drivers',
  'geometry',
  'skins',
  'shapes',
  'guide_lines',
] as const;
/** Keys whose text value is a point when it is an expression. */
const POINT_KEYS: ReadonlySet<string> = new Set([
  'at',
  'right',
  'toward',
  'bend',
  'heel',
  'ball',
  'toe',
  'inner',
  'outer',
  'look',
  'crown',
  'along',
  'from',
  'to',
]);
/** Keys whose list holds whole points, where a text is one of them. */
const POINT_LIST_KEYS: ReadonlySet<string> = new Set(['points', 'via', 'tips']);
/** Keys of maps of such lists. */
const POINT_MAP_KEYS: ReadonlySet<string> = new Set(['digits']);
/** Keys with words for people, which are never expressions. */
const PROSE_KEYS: ReadonlySet<string> = new Set(['note', 'title', 'mesh', 'morph', 'labels']);

class RecipeEvaluator {
  readonly #landmarks = new Map<string, EvaluatedLandmark | null>();
  readonly #evaluator: Evaluator;
  readonly #left: Vec3;

  constructor(
    private readonly source: Recipe,
    private readonly context: StageContext,
    params: Readonly<Record<string, number>>,
    left: Vec3,
  ) {
    this.#left = left;
    const names = Object.keys(source.landmarks ?? {});
    this.#evaluator = new Evaluator(context, params, names, (name) => this.#landmarkValue(name));
  }

  evaluate(): EvaluatedRecipe {
    const names = Object.keys(this.source.landmarks ?? {});
    const { order, rings } = orderByReads(names, (name) => this.#landmarksRead(name));
    for (const ring of rings) this.#reportRing(ring);
    for (const name of order) this.#landmarks.set(name, this.#landmark(name));
    const landmarks: Record<string, EvaluatedLandmark> = {};
    for (const name of names) {
      const landmark = this.#landmarks.get(name);
      if (landmark) landmarks[name] = landmark;
      else this.context.poisoned.add(`landmarks/${name}`);
    }
    const evaluated: Record<string, unknown> = { ...this.source, landmarks };
    for (const collection of COLLECTIONS) {
      const entries = this.source[collection];
      if (entries) evaluated[collection] = this.#collection(collection, entries);
    }
    return evaluated as unknown as EvaluatedRecipe;
  }

  #collection(
    collection: string,
    entries: Readonly<Record<string, unknown>>,
  ): Readonly<Record<string, unknown>> {
    const evaluated: Record<string, unknown> = {};
    for (const [id, entry] of Object.entries(entries)) {
      const place = `${collection}/${id}`;
      const value = this.#value(entry, [collection, id], id);
      if (value === null) this.context.poisoned.add(place);
      else evaluated[id] = value;
    }
    return evaluated;
  }

  /** A copy of a value with its expressions worked out; null when one of them failed. Unchanged values are shared. */
  #value(value: unknown, path: Path, key: string): unknown {
    if (typeof value === 'string') {
      if (!value.startsWith('=') || PROSE_KEYS.has(key)) return value;
      return this.#evaluator.evaluate(value, path, this.#wantedAt(path, key));
    }
    if (Array.isArray(value)) {
      const items = value.map((item: unknown, index) => this.#value(item, [...path, index], key));
      return items.includes(null) ? null : items;
    }
    if (typeof value !== 'object' || value === null) return value;
    const copy: Record<string, unknown> = {};
    let failed = false;
    for (const [name, item] of Object.entries(value)) {
      const evaluated = this.#value(item, [...path, name], name);
      if (evaluated === null) failed = true;
      copy[name] = evaluated;
    }
    return failed ? null : copy;
  }

  #wantedAt(path: Path, key: string): Wanted {
    const isListItem = typeof path[path.length - 1] === 'number';
    if (isListItem) {
      // A text in `points` stands for a whole point; a text in a list of three numbers for one of them.
      const holdsPoints = POINT_LIST_KEYS.has(key) || POINT_MAP_KEYS.has(String(path[path.length - 3]));
      return holdsPoints && typeof path[path.length - 2] !== 'number' ? 'point' : 'number';
    }
    return POINT_KEYS.has(key) ? 'point' : 'number';
  }

  #landmarksRead(name: string): readonly string[] {
    const { at, right } = this.source.landmarks?.[name] ?? {};
    return [at, right]
      .flat()
      .filter((item) => typeof item === 'string' && item.startsWith('='))
      .flatMap((item) => this.#evaluator.landmarksRead(item as string));
  }

  /** A landmark whose own landmarks are worked out; on a ring some are not, so that it has no value. */
  #landmark(name: string): EvaluatedLandmark | null {
    const source = this.source.landmarks?.[name];
    if (!source) return null;
    const path = ['landmarks', name];
    const at = this.#value(source.at, [...path, 'at'], 'at') as Vec3 | null;
    const right =
      source.right === undefined
        ? undefined
        : (this.#value(source.right, [...path, 'right'], 'right') as Vec3 | null);
    if (at === null || right === null) return null;
    return { at, ...(source.side ? { side: source.side } : {}), ...(right ? { right } : {}) };
  }

  #landmarkValue(name: string): LandmarkValue | null {
    const landmark = this.#landmarks.get(name);
    if (!landmark) return null;
    const { at, side } = landmark;
    const right = landmark.right ?? (side === 'left' ? mirrorPoint(at, this.#left) : at);
    return { x: at[0], y: at[1], z: at[2], right: { x: right[0], y: right[1], z: right[2] } };
  }

  #reportRing(ring: readonly string[]): void {
    const { document, findings } = this.context;
    const places = ring.slice(0, -1).map((name) => ({
      span: document.spanAt(['landmarks', name, 'at']),
      label: `"${name}" is worked out here`,
    }));
    const [first, ...related] = places;
    if (!first) return;
    const words = ring.map((name) => `"${name}"`).join(' → ');
    findings.report(expressionFindings, 'expression-ring', first.span, { ring: words }, { related });
  }
}

/**
 * Works out every expression of a recipe for the given parameter values. An entry with an expression that fails is
 * left out and added to the poisoned ones; its finding stands at the expression.
 */
export function evaluateRecipe(
  recipe: Recipe,
  given: Readonly<Record<string, number>>,
  context: StageContext,
): EvaluatedRecipe {
  const params = readParameters(recipe, given, context);
  const { left } = readSceneFrame(recipe.scene, context);
  return new RecipeEvaluator(recipe, context, params, left).evaluate();
}
