import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { listRecipes } from '@/app/_server/operations/recipes/listRecipes';
import { readShow } from '@/app/_server/operations/shows/readShow';
import { loadForPage } from '@/app/_server/session';
import { recipeListQuerySchema } from '@/app/api/v1/_contracts/recipe';
import { showPathSchema } from '@/app/api/v1/_contracts/show';
import { samples } from '@/compiler';
import { NewRecipe } from '@/components/recipes/NewRecipe';
import { RecipeTable } from '@/components/recipes/RecipeTable';
import { SearchField } from '@/components/recipes/SearchField';

type Props = PageProps<'/shows/[slug]'>;

async function slugOf({ params }: Props): Promise<string> {
  const path = showPathSchema.safeParse(await params);
  return path.success ? path.data.slug : notFound();
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  const slug = await slugOf(props);
  const { title } = await loadForPage((caller) => readShow(caller, { slug }));
  return { title };
}

/** The recipes of a show. Search, order and page stand in the address, so that a list can be sent to somebody. */
export default async function ShowPage(props: Props) {
  const slug = await slugOf(props);
  // An address that somebody changed by hand shows the first page rather than an error.
  const asked = recipeListQuerySchema.safeParse(await props.searchParams);
  const query = asked.success ? asked.data : recipeListQuerySchema.parse({});
  const [show, list] = await loadForPage(async (caller) => [
    await readShow(caller, { slug }),
    await listRecipes(caller, { slug, ...query }),
  ]);
  const mayWrite = show.role === 'admin' || show.role === 'reviewer' || show.role === 'rigger';
  return (
    <div className="sheet">
      <div className="flex flex-wrap items-end gap-x-6 gap-y-3">
        <div>
          <p className="text-ink-soft">Recipes of</p>
          <h1>{show.title}</h1>
        </div>
        <div className="ml-auto flex flex-wrap items-end gap-4">
          <SearchField search={query.search} />
          {mayWrite && <NewRecipe slug={slug} samples={samples} />}
        </div>
      </div>
      <RecipeTable slug={slug} list={list} query={query} mayWrite={mayWrite} />
    </div>
  );
}
