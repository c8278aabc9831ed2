import { buildsRepository, type StoredBuildFileText } from '@/db/repositories/builds';
import type { Caller } from '../../caller';
import { Refusal } from '../../refusal';
import { findOrMakeBuild } from './findOrMakeBuild';

/** One file of a version's build. */
export async function readBuildFile(
  caller: Caller,
  input: { readonly recipeId: string; readonly number: number; readonly name: string },
): Promise<StoredBuildFileText> {
  const key = await findOrMakeBuild(caller, input);
  const file = await buildsRepository(caller.database).readFile(key, input.name);
  if (!file) throw new Refusal({ code: 'not-found' });
  return file;
}
