import type { Metadata } from 'next';
import { openRecipe } from '@/app/_server/operations/recipes/openRecipe';
import { readRecipe } from '@/app/_server/operations/recipes/readRecipe';
import { loadForPage } from '@/app/_server/session';
import { versionNumberSchema } from '@/app/api/v1/_contracts/version';
import { RecipeEditor } from '@/components/editor/RecipeEditor';
import { recipeIdOf } from './recipeId';

type Props = PageProps<'/recipes/[recipeId]'>;

export async function generateMetadata(props: Props): Promise<Metadata> {
  const recipeId = await recipeIdOf(props.params);
  const { title } = await loadForPage((caller) => readRecipe(caller, { recipeId }));
  return { title };
}

/** The editor of one recipe; `?version=2` shows an older version to look at only. */
export default async function RecipePage(props: Props) {
  const recipeId = await recipeIdOf(props.params);
  const asked = versionNumberSchema.safeParse((await props.searchParams).version);
  const { recipe, version, draft, bases, isEditable } = await loadForPage((caller) =>
    openRecipe(caller, { recipeId, number: asked.success ? asked.data : undefined }),
  );
  // A new version or recipe is a new piece of work: the key makes the editor begin afresh.
  return (
    <RecipeEditor
      key={`${recipe.id} ${asked.success ? version.number : 'newest'}`}
      recipe={recipe}
      version={version}
      draft={draft}
      bases={bases}
      isReadOnly={!isEditable}
    />
  );
}
