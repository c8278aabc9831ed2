import type { Knex } from 'knex';
import { COMPILER_VERSION, type Compilation, sha256Hex } from '@/compiler/index';
import { recipesRepository } from '@/db/repositories/recipes';
import { recipeVersionsRepository } from '@/db/repositories/recipeVersions';
import { countFindings } from '../../compileVersion';

/** A state of a recipe that is about to become its newest version. */
export interface NewVersion {
  readonly recipeId: string;
  /** The newest version so far, which the caller has locked; null for the first. */
  readonly parent: number | null;
  readonly message: string;
  readonly text: string;
  readonly compilation: Compilation;
  readonly authorId: string;
}

/** Adds the version after its parent, makes it the newest and returns its number. */
export async function insertVersion(transaction: Knex.Transaction, version: NewVersion): Promise<number> {
  const { recipeId, parent, message, text, compilation, authorId } = version;
  const number = (parent ?? 0) + 1;
  await recipeVersionsRepository(transaction).insert({
    recipeId,
    number,
    parent,
    message,
    authorId,
    text,
    contentHash: sha256Hex(text),
    compilerVersion: COMPILER_VERSION,
    ...countFindings(compilation),
  });
  await recipesRepository(transaction).setNewest(recipeId, number);
  return number;
}
