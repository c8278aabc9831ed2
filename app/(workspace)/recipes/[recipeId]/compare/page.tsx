import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { z } from 'zod';
import { readRecipe } from '@/app/_server/operations/recipes/readRecipe';
import { readVersion } from '@/app/_server/operations/versions/readVersion';
import { loadForPage } from '@/app/_server/session';
import { versionNumberSchema } from '@/app/api/v1/_contracts/version';
import { instantWords } from '@/components/frame/dates';
import { TitleBlock } from '@/components/frame/TitleBlock';
import { TextComparison } from '@/components/versions/TextComparison';
import { recipeIdOf } from '../recipeId';

type Props = PageProps<'/recipes/[recipeId]/compare'>;

const querySchema = z.object({ from: versionNumberSchema, to: versionNumberSchema });

export const metadata: Metadata = { title: 'Compare versions' };

/** The text of two versions beside each other. */
export default async function ComparePage({ params, searchParams }: Props) {
  const recipeId = await recipeIdOf(params);
  const asked = querySchema.safeParse(await searchParams);
  if (!asked.success) notFound();
  const [recipe, from, to] = await loadForPage(async (caller) => [
    await readRecipe(caller, { recipeId }),
    await readVersion(caller, { recipeId, number: asked.data.from }),
    await readVersion(caller, { recipeId, number: asked.data.to }),
  ]);
  const titleOf = (version: typeof from) =>
    `Version ${version.number}, ${version.author.name}: ${version.message}`;
  return (
    <div className="sheet">
      <p className="text-ink-soft">
        <Link className="plain-action" href={`/recipes/${recipeId}/versions`}>
          Versions of {recipe.title}
        </Link>
      </p>
      <h1>
        {recipe.title}, {from.number} to {to.number}
      </h1>
      <TextComparison
        beforeTitle={titleOf(from)}
        before={from.text}
        afterTitle={titleOf(to)}
        after={to.text}
      />
      <div className="mt-10">
        <TitleBlock
          cells={[
            ['Show', recipe.show.title],
            ['Recipe', recipe.name],
            ['Versions', `${from.number} → ${to.number}`],
            ['State', to.state],
            ['Hashes', `${from.contentHash.slice(0, 8)} → ${to.contentHash.slice(0, 8)}`],
            ['Drawn by', to.author.name],
            ['Date (UTC)', instantWords(to.createdAt)],
          ]}
        />
      </div>
    </div>
  );
}
