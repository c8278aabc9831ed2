import type { Metadata } from 'next';
import Link from 'next/link';
import { readRecipe } from '@/app/_server/operations/recipes/readRecipe';
import { listVersions } from '@/app/_server/operations/versions/listVersions';
import { loadForPage } from '@/app/_server/session';
import { versionListQuerySchema } from '@/app/api/v1/_contracts/version';
import { VersionTable } from '@/components/versions/VersionTable';
import { recipeIdOf } from '../recipeId';

type Props = PageProps<'/recipes/[recipeId]/versions'>;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const recipeId = await recipeIdOf(params);
  const { title } = await loadForPage((caller) => readRecipe(caller, { recipeId }));
  return { title: `Versions of ${title}` };
}

/** Every version of a recipe, the newest first. */
export default async function VersionsPage({ params, searchParams }: Props) {
  const recipeId = await recipeIdOf(params);
  const asked = versionListQuerySchema.safeParse(await searchParams);
  const query = asked.success ? asked.data : versionListQuerySchema.parse({});
  const [recipe, list] = await loadForPage(async (caller) => [
    await readRecipe(caller, { recipeId }),
    await listVersions(caller, { recipeId, ...query }),
  ]);
  return (
    <div className="sheet">
      <p className="text-ink-soft">
        <Link className="plain-action" href={`/shows/${recipe.show.slug}`}>
          {recipe.show.title}
        </Link>
      </p>
      <h1>Versions of {recipe.title}</h1>
      <VersionTable recipeId={recipeId} list={list} isFirstPage={query.cursor === undefined} />
    </div>
  );
}
