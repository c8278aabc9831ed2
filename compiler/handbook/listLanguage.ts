import { recipeSchema } from '../schema/generated/recipeSchema';

/** One key of the recipe language, as its schema describes it. */
export interface KeyEntry {
  readonly key: string;
  readonly description: string;
  readonly unit: string | null;
  /** As JSON; null when there is none. */
  readonly default: string | null;
  readonly example: string | null;
  readonly required: boolean;
}

/** A map of the language with its keys: the whole recipe, an entry of it, or a part. */
export interface LanguageEntry {
  readonly title: string;
  readonly description: string;
  readonly keys: readonly KeyEntry[];
}

type SchemaObject = Readonly<Record<string, unknown>>;

function isObject(value: unknown): value is SchemaObject {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** A schema with what it refers to filled in beneath its own words. */
function resolved(schema: SchemaObject, definitions: SchemaObject): SchemaObject {
  const name = typeof schema.$ref === 'string' ? schema.$ref.slice(schema.$ref.lastIndexOf('/') + 1) : null;
  const target = name === null ? undefined : definitions[name];
  return isObject(target) ? { ...target, ...schema } : schema;
}

function asJson(value: unknown): string | null {
  return value === undefined ? null : JSON.stringify(value);
}

function entryOf(schema: SchemaObject, definitions: SchemaObject): LanguageEntry {
  const properties = isObject(schema.properties) ? schema.properties : {};
  const required = Array.isArray(schema.required) ? schema.required : [];
  return {
    title: String(schema.title ?? ''),
    description: String(schema.description ?? ''),
    keys: Object.entries(properties).map(([key, value]) => {
      const property = resolved(isObject(value) ? value : {}, definitions);
      const examples = Array.isArray(property.examples) ? property.examples : [];
      return {
        key,
        description: String(property.description ?? ''),
        unit: typeof property['x-unit'] === 'string' ? property['x-unit'] : null,
        default: asJson(property.default),
        example: asJson(examples[0] ?? property.const),
        required: required.includes(key),
      };
    }),
  };
}

/** The recipe language: the recipe itself, then every map that it is made of, parts too. */
export function listLanguage(): readonly LanguageEntry[] {
  const schema = recipeSchema as SchemaObject;
  const definitions = isObject(schema.$defs) ? schema.$defs : {};
  const maps = Object.values(definitions).filter(
    (definition): definition is SchemaObject => isObject(definition) && isObject(definition.properties),
  );
  return [schema, ...maps].map((map) => entryOf(map, definitions));
}
