import type { ErrorObject } from 'ajv';
import type { FindingList } from '../findings/FindingList';
import type { MergedDocument } from '../merge/types';
import type { JsonValue, Path } from '../syntax/types';
import { schemaFindings } from './findings';
import { houseSchema } from './generated/houseSchema';
import type { HouseRules } from './generated/houseTypes';
import { recipeSchema } from './generated/recipeSchema';
import type { Recipe } from './generated/recipeTypes';
import { validateHouse, validateRecipe } from './generated/validators';
import { reportShapeError, type ShapeError } from './reportShapeError';
import { kindOf } from './shapeWords';

/** What is left of a document after its shape was checked. */
export interface Shape<T> {
  /** The document without what was refused; null when it is not even a map. */
  readonly value: T | null;
  /** Entries that were refused, as `chains/arm`; what refers to them has no finding of its own. */
  readonly poisoned: Set<string>;
  readonly isSound: boolean;
}

type JsonMap = { [key: string]: JsonValue };

function isMap(value: JsonValue | undefined): value is JsonMap {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Steps of a JSON Pointer (RFC 6901); list positions become numbers where the document has a list. */
function pathOf(
  pointer: string,
  document: JsonValue,
): { readonly path: Path; readonly value: JsonValue | undefined } {
  const path: (string | number)[] = [];
  let value: JsonValue | undefined = document;
  if (pointer === '') return { path, value };
  for (const raw of pointer.slice(1).split('/')) {
    const step = raw.replaceAll('~1', '/').replaceAll('~0', '~');
    if (Array.isArray(value)) {
      path.push(Number(step));
      value = value[Number(step)];
    } else {
      path.push(step);
      value = isMap(value) && Object.hasOwn(value, step) ? value[step] : undefined;
    }
  }
  return { path, value };
}

/** What a schema can say about the name of a key. */
const NAME_KEYWORDS: ReadonlySet<string> = new Set(['pattern', 'maxLength', 'enum']);

/**
 * Errors about the names of keys, marked with the key. The validator marks only those whose schema stands in place;
 * behind a reference they look like errors of the map itself, right before the summary that has the key.
 */
function withKeyNames(errors: readonly ErrorObject[]): readonly ErrorObject[] {
  const marked = [...errors];
  errors.forEach(({ keyword, instancePath, params }, summary) => {
    if (keyword !== 'propertyNames') return;
    const propertyName = String(params.propertyName);
    for (let index = summary - 1; index >= 0; index -= 1) {
      const error = errors[index] as ErrorObject;
      if (error.instancePath !== instancePath || !NAME_KEYWORDS.has(error.keyword)) return;
      marked[index] = { ...error, propertyName };
    }
  });
  return marked;
}

/**
 * Leaves one error for each root cause: of the branches of a point or place only the summary, and what lies deeper;
 * of a refused key name only the reason; of a missing kind only one word.
 */
function rootCauses(errors: readonly ErrorObject[]): readonly ErrorObject[] {
  const summarised = new Set(
    errors.filter(({ keyword }) => keyword === 'anyOf').map(({ instancePath }) => instancePath),
  );
  const withoutTag = new Set(
    errors
      .filter(({ keyword, params }) => keyword === 'discriminator' && params.error === 'tag')
      .map(({ instancePath }) => instancePath),
  );
  return errors.filter((error) => {
    if (error.keyword === 'propertyNames' || error.keyword === 'oneOf') return false;
    if (error.keyword === 'required' && withoutTag.has(error.instancePath)) return false;
    return !(
      summarised.has(error.instancePath) &&
      error.keyword !== 'anyOf' &&
      error.propertyName === undefined
    );
  });
}

/** The document without refused top-level values and entries. Unknown keys inside entries are simply not read. */
function withoutRefused(document: JsonMap, refused: ReadonlySet<string>): JsonMap {
  const kept: JsonMap = {};
  for (const [key, value] of Object.entries(document)) {
    if (refused.has(key)) continue;
    if (!isMap(value)) {
      kept[key] = value;
      continue;
    }
    const entries = Object.entries(value).filter(([name]) => !refused.has(`${key}/${name}`));
    kept[key] = Object.fromEntries(entries);
  }
  return kept;
}

function check<T>(
  document: MergedDocument,
  validate: typeof validateRecipe,
  schema: unknown,
  findings: FindingList,
): Shape<T> {
  const whole = document.value;
  if (!isMap(whole)) {
    findings.report(schemaFindings, 'not-a-map', document.spanAt([]), { found: kindOf(whole) });
    return { value: null, poisoned: new Set(), isSound: false };
  }
  const poisoned = new Set(document.refusedEntries);
  const fits = validate(whole);
  if (fits && poisoned.size === 0) return { value: whole as unknown as T, poisoned, isSound: true };
  for (const error of fits ? [] : rootCauses(withKeyNames(validate.errors ?? []))) {
    const { path, value } = pathOf(error.instancePath, whole);
    if (document.refusedEntries.has(path.slice(0, 2).join('/'))) continue;
    const shape: ShapeError = { error, path, value, schema };
    reportShapeError(shape, document, findings);
    const refusedKey =
      error.keyword === 'additionalProperties' ? String(error.params.additionalProperty) : error.propertyName;
    const refusedPath = refusedKey === undefined ? path : [...path, refusedKey];
    const isIgnoredKey = error.keyword === 'additionalProperties' && path.length > 0;
    if (refusedPath.length > 0 && !isIgnoredKey) poisoned.add(refusedPath.slice(0, 2).join('/'));
  }
  return { value: withoutRefused(whole, poisoned) as unknown as T, poisoned, isSound: false };
}

/** Checks a recipe against its JSON Schema; findings say in words what is wrong where. */
export function checkRecipeShape(document: MergedDocument, findings: FindingList): Shape<Recipe> {
  return check<Recipe>(document, validateRecipe, recipeSchema, findings);
}

/** Checks house rules against their JSON Schema. */
export function checkHouseShape(document: MergedDocument, findings: FindingList): Shape<HouseRules> {
  return check<HouseRules>(document, validateHouse, houseSchema, findings);
}
