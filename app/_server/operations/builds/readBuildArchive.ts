import { type Zippable, zipSync } from 'fflate';
import { buildsRepository } from '@/db/repositories/builds';
import type { Caller } from '../../caller';
import { findRecipe } from '../../findRecipe';
import { findOrMakeBuild } from './findOrMakeBuild';

/** The first day a ZIP entry can carry. A fixed one, so that the same build is the same archive byte for byte. */
const ENTRY_TIME = new Date(1980, 0, 1);

/** All files of a version's build in one ZIP archive. */
export async function readBuildArchive(
  caller: Caller,
  input: { readonly recipeId: string; readonly number: number },
): Promise<{ readonly name: string; readonly key: string; readonly bytes: Uint8Array }> {
  const key = await findOrMakeBuild(caller, input);
  const { recipe } = await findRecipe(caller, input.recipeId, 'build.read');
  const files = await buildsRepository(caller.database).readFiles(key);
  const entries: Zippable = {};
  for (const { name, text, encoding } of files) {
    entries[name] = [Buffer.from(text, encoding), { mtime: ENTRY_TIME, level: 6 }];
  }
  return { name: `${recipe.name}@${input.number}.zip`, key, bytes: zipSync(entries) };
}
