import { compile } from 'json-schema-to-typescript';
import type { Schema } from './schemas';

/**
 * A copy of a schema in the older form that the type generator reads: fixed-length tuples as `items`, bare
 * references, and without length limits on lists, which it would write out as unions of tuples.
 */
function forTypes(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(forTypes);
  if (typeof value !== 'object' || value === null) return value;
  // A reference with words beside it would become a second, numbered type.
  if ('$ref' in value) return { $ref: value.$ref };
  const copy: Schema = {};
  for (const [key, item] of Object.entries(value)) copy[key] = forTypes(item);
  const { prefixItems } = copy;
  if (Array.isArray(prefixItems)) {
    delete copy.prefixItems;
    copy.items = prefixItems;
    copy.minItems = prefixItems.length;
    copy.maxItems = prefixItems.length;
    copy.additionalItems = false;
  } else if (copy.type === 'array') {
    delete copy.minItems;
    delete copy.maxItems;
  }
  return copy;
}

/** TypeScript declarations for a bundled schema, one exported type for each titled definition. */
export async function typesOf(schema: Schema, name: string): Promise<string> {
  return compile(forTypes(schema) as Parameters<typeof compile>[0], name, {
    additionalProperties: false,
    bannerComment: '// Made by bin/generate.ts from the JSON Schemas. Change those, not this.',
    format: true,
    style: { singleQuote: true, printWidth: 110 },
    unreachableDefinitions: true,
  });
}
