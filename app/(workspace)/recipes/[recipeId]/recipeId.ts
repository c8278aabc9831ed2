import { notFound } from 'next/navigation';
import { recipePathSchema } from '@/app/api/v1/_contracts/recipe';

/** The recipe that a page's path names; what cannot be an id names nothing. */
export async function recipeIdOf(params: Promise<unknown>): Promise<string> {
  const path = recipePathSchema.safeParse(await params);
  return path.success ? path.data.recipeId : notFound();
}
