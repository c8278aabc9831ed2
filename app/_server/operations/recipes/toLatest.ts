import type { LatestVersion } from '@/app/api/v1/_contracts/recipe';
import type { RecipeSummary } from '@/db/repositories/recipes';

/** The newest version as it leaves the server. */
export function toLatest({ latest }: RecipeSummary): LatestVersion | null {
  return latest && { ...latest, createdAt: latest.createdAt.toISOString() };
}
