import Ajv2020 from 'ajv/dist/2020.js';
import standaloneCode from 'ajv/dist/standalone/index.js';
import { build } from 'esbuild';
import type { Schema } from './schemas';

/**
 * One self-contained ES module with a validator for each schema. The code is written out beforehand, so neither
 * browser nor server compiles schemas at run time and no `eval` is needed under a strict content policy.
 */
export async function validatorsOf(schemas: Readonly<Record<string, Schema>>): Promise<string> {
  const ajv = new Ajv2020({
    allErrors: true,
    discriminator: true,
    strict: true,
    allowUnionTypes: true,
    strictRequired: false,
    inlineRefs: false,
    code: { source: true, esm: true, lines: false },
  });
  ajv.addVocabulary(['x-unit']);
  const exported: Record<string, string> = {};
  for (const [name, schema] of Object.entries(schemas)) {
    ajv.addSchema(schema);
    exported[name] = schema.$id as string;
  }
  const source = standaloneCode(ajv, exported);
  const bundled = await build({
    stdin: { contents: source, resolveDir: process.cwd(), loader: 'js' },
    bundle: true,
    write: false,
    format: 'esm',
    target: 'es2022',
    legalComments: 'none',
  });
  return `// Made by bin/generate.ts from the JSON Schemas. Change those, not this.\n${bundled.outputFiles[0]?.text ?? ''}`;
}

/** Declarations of the validators' module. */
export function validatorDeclarations(names: readonly string[]): string {
  return [
    '// Made by bin/generate.ts.',
    "import type { ErrorObject } from 'ajv';",
    '',
    'interface Validator {',
    '  (value: unknown): boolean;',
    '  errors?: ErrorObject[] | null;',
    '}',
    ...names.map((name) => `export declare const ${name}: Validator;`),
    '',
  ].join('\n');
}
