import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { bundleHouseSchema, bundleRecipeSchema, type Schema } from './generate/schemas';
import { templateDeclarations, templatesModule } from './generate/templates';
import { textModule } from './generate/texts';
import { typesOf } from './generate/types';
import { validatorDeclarations, validatorsOf } from './generate/validators';

/** A module that exports a schema as a plain object. */
function schemaModule(name: string, schema: Schema): string {
  return `// Made by bin/generate.ts from the JSON Schemas. Change those, not this.\nexport const ${name} = ${JSON.stringify(schema, null, 2)};\n`;
}

/** Every generated file with its text; the same sources always give the same bytes. */
async function generatedFiles(): Promise<ReadonlyMap<string, string>> {
  const recipe = bundleRecipeSchema();
  const house = bundleHouseSchema(recipe);
  const folder = 'compiler/schema/generated';
  return new Map([
    [`${folder}/recipeSchema.ts`, schemaModule('recipeSchema', recipe)],
    [`${folder}/houseSchema.ts`, schemaModule('houseSchema', house)],
    [`${folder}/recipeTypes.ts`, await typesOf(recipe, 'Recipe')],
    [`${folder}/houseTypes.ts`, await typesOf(house, 'HouseRules')],
    [`${folder}/validators.js`, await validatorsOf({ validateRecipe: recipe, validateHouse: house })],
    [`${folder}/validators.d.ts`, validatorDeclarations(['validateRecipe', 'validateHouse'])],
    ['compiler/emit/generated/templates.js', templatesModule()],
    ['compiler/emit/generated/templates.d.ts', templateDeclarations()],
    ['compiler/house/generated/houseTexts.ts', textModule('HOUSE_TEXTS', 'compiler/house', '.house.yaml')],
    [
      'compiler/samples/generated/sampleTexts.ts',
      textModule('SAMPLE_TEXTS', 'compiler/samples', '.recipe.yaml'),
    ],
    [
      'compiler/conformance/generated/featureTexts.ts',
      textModule('FEATURE_TEXTS', 'compiler/conformance', '.feature.yaml'),
    ],
    [
      'compiler/conformance/generated/adapterText.ts',
      textModule('ADAPTER_TEXT', 'compiler/conformance', '.mjs'),
    ],
    [
      'compiler/conformance/generated/kitGuide.ts',
      textModule('KIT_GUIDE', 'compiler/conformance', '.guide.md'),
    ],
    [
      'compiler/handbook/generated/partExamples.ts',
      textModule('PART_EXAMPLES', 'compiler/parts', '.example.yaml'),
    ],
    [
      'compiler/slipway/generated/referenceText.ts',
      textModule('REFERENCE_TEXT', 'compiler/slipway', 'reference.md'),
    ],
    ['compiler/findings/generated/pages.ts', textModule('PAGES', 'compiler', '.page.md')],
  ]);
}

function readOrNull(path: string): string | null {
  try {
    return readFileSync(path, 'utf8');
  } catch {
    return null;
  }
}

const stale = [...(await generatedFiles())].filter(([path, text]) => readOrNull(path) !== text);
if (process.argv.includes('--check')) {
  for (const [path] of stale) console.error(`stale: ${path}`);
  if (stale.length > 0) console.error('Run `npm run generate` and commit what it writes.');
  process.exitCode = stale.length > 0 ? 1 : 0;
} else {
  for (const [path, text] of stale) {
    mkdirSync(dirname(path), { recursive: true });
    writeFileSync(path, text);
    console.log(`wrote ${path}`);
  }
}
