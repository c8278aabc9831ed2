import type { Build } from '@/app/api/v1/_contracts/build';
import type { Draft, PutDraftRequest } from '@/app/api/v1/_contracts/draft';
import type { CreateVersionRequest, Version, VersionListItem } from '@/app/api/v1/_contracts/version';
import { requestJson } from '@/components/api/request';

/** Stores a draft; `revision` is the one believed to be stored, null when there is none. */
export function putDraft(
  recipeId: string,
  draft: PutDraftRequest,
  revision: number | null,
  { keepalive }: { readonly keepalive: boolean },
): Promise<Draft> {
  return requestJson<Draft>(`/recipes/${recipeId}/draft`, {
    method: 'PUT',
    body: draft,
    headers: revision === null ? { 'if-none-match': '*' } : { 'if-match': `"${revision}"` },
    keepalive,
  });
}

/** Drops the stored draft of a revision; refused when another one is stored. */
export function deleteDraft(recipeId: string, revision: number): Promise<void> {
  return requestJson<void>(`/recipes/${recipeId}/draft`, {
    method: 'DELETE',
    headers: { 'if-match': `"${revision}"` },
  });
}

/**
 * Saves the next version; refused when `parent` is no longer the newest. The key is made once for each thing to
 * save, so that asking again after a lost answer saves nothing twice.
 */
export function createVersion(
  recipeId: string,
  version: CreateVersionRequest,
  key: string,
): Promise<VersionListItem> {
  return requestJson<VersionListItem>(`/recipes/${recipeId}/versions`, {
    method: 'POST',
    body: version,
    headers: { 'idempotency-key': key },
  });
}

/** A version with its text. */
export function readVersion(recipeId: string, number: number): Promise<Version> {
  return requestJson<Version>(`/recipes/${recipeId}/versions/${number}`);
}

/** What can be downloaded of a version; made on first asking. */
export function readBuild(recipeId: string, number: number): Promise<Build> {
  return requestJson<Build>(`/recipes/${recipeId}/versions/${number}/build`);
}
