import type { JsonValue, Path } from '../syntax/types';
import { recipeSchema } from './generated/recipeSchema';

export type SchemaNode = { readonly [key: string]: unknown };

function asNode(value: unknown): SchemaNode | undefined {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
    ? (value as SchemaNode)
    : undefined;
}

/** The definition behind a `$ref`. House rules refer into the recipe's schema, which holds every definition. */
function resolve(node: SchemaNode | undefined): SchemaNode | undefined {
  if (typeof node?.$ref !== 'string') return node;
  let target: unknown = recipeSchema;
  for (const step of node.$ref.replace(/^.*#\//, '').split('/')) target = asNode(target)?.[step];
  return resolve(asNode(target));
}

function kindsOf(node: SchemaNode): readonly { readonly kind: string; readonly schema: SchemaNode }[] {
  const branches = (node.oneOf as readonly SchemaNode[] | undefined) ?? [];
  return branches.flatMap((branch) => {
    const schema = resolve(branch) ?? {};
    const kind = asNode(asNode(schema.properties)?.kind)?.const;
    return typeof kind === 'string' ? [{ kind, schema }] : [];
  });
}

/** The kinds of parts there are, in the order of the schema. */
export function partKinds(): readonly string[] {
  return kindsOf(recipeSchema.$defs.Part as unknown as SchemaNode).map(({ kind }) => kind);
}

/**
 * The schema that governs the value at `path` of a document, references followed and the kind of a part looked up;
 * an empty one where none does. Validator errors do not say it: their schema paths begin anew at every reference.
 */
export function schemaAt(schema: unknown, document: JsonValue | undefined, path: Path): SchemaNode {
  let node = asNode(schema);
  let value: unknown = document;
  for (const step of path) {
    if (typeof step === 'number') {
      const before = node?.prefixItems as readonly unknown[] | undefined;
      node = resolve(asNode(before?.[step] ?? node?.items));
      value = Array.isArray(value) ? value[step] : undefined;
    } else {
      node = resolve(asNode(asNode(node?.properties)?.[step] ?? node?.additionalProperties));
      value = asNode(value)?.[step];
    }
    const kind = asNode(value)?.kind;
    if (node?.oneOf) node = kindsOf(node).find((branch) => branch.kind === kind)?.schema ?? node;
  }
  return node ?? {};
}
