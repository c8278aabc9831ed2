import type { Knex } from 'knex';
import { buildFiles, COMPILER_VERSION, compile, sha256Hex } from '@/compiler/index';
import { auditLogRepository } from '@/db/repositories/auditLog';
import { buildsRepository } from '@/db/repositories/builds';
import { recipeVersionsRepository } from '@/db/repositories/recipeVersions';
import type { Caller } from '../../caller';
import { type CompileInputs, gatherCompileInputs } from '../../compileVersion';
import { findRecipe } from '../../findRecipe';
import { Refusal } from '../../refusal';

/** Hash of everything a compile depends on; house rules other than the built-in ones are not in use yet. */
export function buildKey({ recipe, bases, version }: CompileInputs): string {
  const baseList = Object.entries(bases).map(([reference, { name, text }]) => [reference, name, text]);
  return sha256Hex(JSON.stringify([COMPILER_VERSION, version ?? null, recipe.name, recipe.text, baseList]));
}

/** Compiles and keeps the build under its key. Nothing is kept of a recipe with errors. */
async function makeBuild(database: Knex, key: string, inputs: CompileInputs): Promise<void> {
  const compilation = compile(inputs);
  if (!compilation.rig) throw new Refusal({ code: 'recipe-has-errors', findings: compilation.findings });
  const files = await buildFiles(compilation);
  const manifest = files.find(({ name }) => name.endsWith('.manifest.json'));
  if (!manifest) throw new Error('a build without errors has no manifest');
  await buildsRepository(database).insertIfAbsent({
    key,
    character: compilation.character,
    manifest: JSON.parse(manifest.text),
    files,
  });
}

/**
 * The key of a version's build, which is made at the first asking and looked up ever after; refused with the
 * findings when the recipe has errors.
 */
export async function findOrMakeBuild(
  caller: Caller,
  { recipeId, number }: { readonly recipeId: string; readonly number: number },
): Promise<string> {
  const { database } = caller;
  const { viewer, recipe } = await findRecipe(caller, recipeId, 'build.read');
  const version = await recipeVersionsRepository(database).find(recipe.id, number);
  if (!version) throw new Refusal({ code: 'not-found' });
  const inputs = await gatherCompileInputs(database, { ...recipe, text: version.text, number });
  const key = buildKey(inputs);
  if (await buildsRepository(database).find(key)) return key;
  await makeBuild(database, key, inputs);
  await auditLogRepository(database).append({
    personId: viewer.personId,
    action: 'build.make',
    subjectType: 'recipe',
    subjectId: recipe.id,
    showId: recipe.showId,
    address: caller.address,
    details: { number, key },
  });
  return key;
}
