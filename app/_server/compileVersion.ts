import type { Knex } from 'knex';
import { type Compilation, compile, findBaseReference, type SourceText } from '@/compiler/index';
import { recipeVersionsRepository } from '@/db/repositories/recipeVersions';

/** A text to compile and where it belongs. */
export interface RecipeToCompile {
  readonly showId: string;
  readonly name: string;
  readonly text: string;
  /** Left out for a text that has no number yet. */
  readonly number?: number;
}

/** What goes into the compile of a version, all of it; two equal inputs give equal builds. */
export interface CompileInputs {
  readonly recipe: SourceText;
  readonly bases: Readonly<Record<string, SourceText>>;
  readonly version?: number;
}

/** A longer row of bases than anyone needs; bounds the look-ups a hostile recipe can cause. */
const MOST_BASES = 32;

/** Gathers a recipe's text and the saved versions it extends, which are looked for in its own show only. */
export async function gatherCompileInputs(database: Knex, recipe: RecipeToCompile): Promise<CompileInputs> {
  const versions = recipeVersionsRepository(database);
  const source: SourceText = { name: `${recipe.name}.recipe.yaml`, text: recipe.text };
  const bases: Record<string, SourceText> = {};
  let reference = findBaseReference(source);
  while (reference && !(reference.text in bases) && Object.keys(bases).length < MOST_BASES) {
    const text = await versions.findTextByName(recipe.showId, reference.name, reference.number);
    if (text === undefined) break;
    const base = { name: `${reference.text}.recipe.yaml`, text };
    bases[reference.text] = base;
    reference = findBaseReference(base);
  }
  return { recipe: source, bases, ...(recipe.number === undefined ? {} : { version: recipe.number }) };
}

/** Compiles a recipe as it would be saved. */
export async function compileVersion(database: Knex, recipe: RecipeToCompile): Promise<Compilation> {
  return compile(await gatherCompileInputs(database, recipe));
}

/** How many findings of each weight a compile gave. */
export function countFindings({ findings }: Compilation): { errors: number; warnings: number } {
  return {
    errors: findings.filter(({ severity }) => severity === 'error').length,
    warnings: findings.filter(({ severity }) => severity === 'warning').length,
  };
}
