import { readdirSync, readFileSync } from 'node:fs';

export type Schema = { [key: string]: unknown };

const RECIPE_ID = 'https://pintle.invalid/schema/recipe/1';

/** A copy of a schema with every reference to the recipe schema made local. */
function withLocalReferences(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(withLocalReferences);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([key, item]) => [
      key,
      key === '$ref' && typeof item === 'string' ? item.replace(RECIPE_ID, '') : withLocalReferences(item),
    ]),
  );
}

function readSchema(path: string): Schema {
  return JSON.parse(readFileSync(path, 'utf8')) as Schema;
}

/** Names of local definitions that a schema refers to, directly or through others. */
function definitionsUsed(
  schema: unknown,
  definitions: Schema,
  found = new Set<string>(),
): ReadonlySet<string> {
  for (const [, name] of JSON.stringify(schema).matchAll(/"#\/\$defs\/([A-Za-z]+)"/g)) {
    if (!name || found.has(name)) continue;
    found.add(name);
    definitionsUsed(definitions[name], definitions, found);
  }
  return found;
}

/** The recipe schema with the fragments of all parts in it. */
export function bundleRecipeSchema(): Schema {
  const recipe = readSchema('compiler/schema/recipe.schema.json');
  const definitions = recipe.$defs as Schema;
  const kinds = readdirSync('compiler/parts', { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map(({ name }) => name)
    .sort();
  const parts = kinds.map(
    (kind) => withLocalReferences(readSchema(`compiler/parts/${kind}/${kind}.schema.json`)) as Schema,
  );
  for (const part of parts) definitions[part.title as string] = part;
  (definitions.Part as Schema).oneOf = parts.map((part) => ({
    $ref: `#/$defs/${part.title as string}`,
  }));
  return recipe;
}

/** The house-rules schema with the definitions it shares with recipes in it. */
export function bundleHouseSchema(recipe: Schema): Schema {
  const house = withLocalReferences(readSchema('compiler/schema/house.schema.json')) as Schema;
  const own = (house.$defs ?? {}) as Schema;
  const definitions = { ...(recipe.$defs as Schema), ...own };
  const used = [...definitionsUsed(house, definitions)].sort();
  return { ...house, $defs: Object.fromEntries(used.map((name) => [name, definitions[name]])) };
}
