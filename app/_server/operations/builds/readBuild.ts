import type { Build } from '@/app/api/v1/_contracts/build';
import { buildsRepository } from '@/db/repositories/builds';
import type { Caller } from '../../caller';
import { findOrMakeBuild } from './findOrMakeBuild';

/** What the build of a version holds. */
export async function readBuild(
  caller: Caller,
  input: { readonly recipeId: string; readonly number: number },
): Promise<Build> {
  const build = await buildsRepository(caller.database).find(await findOrMakeBuild(caller, input));
  if (!build) throw new Error('a build vanished between making and reading it');
  return { key: build.key, character: build.character, files: [...build.files] };
}
