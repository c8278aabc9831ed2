import { frontPicture } from './chart/frontPicture';
import { compile } from './compile';
import type { Severity } from './findings/Finding';
import { findDeclaration, listFindingCodes } from './findings/registry';
import { PART_EXAMPLES } from './parts/generated/partExamples';
import type { Rig, RigNode } from './rig/Rig';
import { recipeSchema } from './schema/generated/recipeSchema';
import { REFERENCE_TEXT } from './slipway/generated/referenceText';

/** The Slipway reference as Markdown. */
export function slipwayReference(): string {
  return Object.values(REFERENCE_TEXT)[0] ?? '';
}

/** A finding in the list of all findings. */
export interface FindingEntry {
  readonly code: string;
  readonly severity: Severity;
  readonly summary: string;
}

/** Every finding with its summary, by code. */
export function listFindings(): readonly FindingEntry[] {
  return listFindingCodes().flatMap((code) => {
    const declaration = findDeclaration(code);
    return declaration ? [{ code, severity: declaration.severity, summary: declaration.summary }] : [];
  });
}

/** A part with what the example of it makes. */
export interface PartEntry {
  readonly kind: string;
  /** Ids in the example, by what they are. */
  readonly makes: Readonly<Record<'joints' | 'controls' | 'solvers' | 'guide lines', readonly string[]>>;
  /** SVG of the joints that the example makes; empty for a part without joints. */
  readonly picture: string;
}

interface ExamplePart {
  readonly id: string;
  readonly kind: string;
}

/** The parts of the example, by what the recipe writes under `parts`. */
function exampleParts(text: string): readonly ExamplePart[] {
  const section = text.split('\nparts:\n')[1]?.split(/\n(?=[a-z])/)[0] ?? '';
  return [...section.matchAll(/^ {2}([a-z_]+):\s*(?:\{\s*|\n\s+)kind: ([a-z_]+)/gm)].map((match) => ({
    id: match[1] ?? '',
    kind: match[2] ?? '',
  }));
}

function isPart(id: string, part: string): boolean {
  return id === part || id.startsWith(`${part}.`);
}

/** What each kind of part makes, shown by an example that has all of them. */
export function listParts(): readonly PartEntry[] {
  const text = Object.values(PART_EXAMPLES)[0] ?? '';
  const { rig } = compile({ recipe: { name: 'every_part.example.yaml', text }, trials: false });
  if (!rig) return [];
  return exampleParts(text).map(({ id: part, kind }) => {
    const ids = (kindOfNode: RigNode['kind']): readonly string[] =>
      rig.nodes.filter((node) => node.kind === kindOfNode && isPart(node.id, part)).map(({ id }) => id);
    const joints = ids('joint');
    const shown = new Set(joints);
    return {
      kind,
      makes: {
        joints,
        controls: ids('control'),
        solvers: rig.solvers.filter(({ id }) => isPart(id, part)).map(({ id }) => id),
        'guide lines': ids('line'),
      },
      picture: joints.length > 0 ? pictureOf(rig, shown) : '',
    };
  });
}

function pictureOf(rig: Rig, shown: ReadonlySet<string>): string {
  return frontPicture(rig, { shows: (id) => shown.has(id) });
}

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
