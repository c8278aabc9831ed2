import type { Version, VersionListItem } from '@/app/api/v1/_contracts/version';
import type { RecipeVersion, RecipeVersionSummary } from '@/db/repositories/recipeVersions';

/** A version without its text, as it leaves the server. */
export function toVersionListItem(version: RecipeVersionSummary): VersionListItem {
  return {
    number: version.number,
    parent: version.parent,
    message: version.message,
    author: version.author,
    createdAt: version.createdAt.toISOString(),
    contentHash: version.contentHash,
    compilerVersion: version.compilerVersion,
    errors: version.errors,
    warnings: version.warnings,
    state: version.state,
  };
}

/** A version with its text, as it leaves the server. */
export function toVersion(version: RecipeVersion): Version {
  return { ...toVersionListItem(version), text: version.text };
}
