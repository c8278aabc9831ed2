import type { Draft, PutDraftRequest } from '@/app/api/v1/_contracts/draft';
import type { CreateVersionRequest, VersionListItem } from '@/app/api/v1/_contracts/version';
import { requestJson } from '@/components/api/request';

/** Stores a draft; `revision` is the one believed to be stored, null when there is none. */
export function putDraft(recipeId: string, draft: PutDraftRequest, revision: number | null): Promise<Draft> {
  return requestJson<Draft>(`/recipes/${recipeId}/draft`, {
    method: 'PUT',
    body: draft,
    headers: revision === null ? { 'if-none-match': '*' } : { 'if-match': `"${revision}"` },
  });
}

/** Drops the stored draft, if there is one. */
export function deleteDraft(recipeId: string): Promise<void> {
  return requestJson<void>(`/recipes/${recipeId}/draft`, { method: 'DELETE' });
}

/** Saves the next version; refused when `parent` is no longer the newest. */
export function createVersion(recipeId: string, version: CreateVersionRequest): Promise<VersionListItem> {
  return requestJson<VersionListItem>(`/recipes/${recipeId}/versions`, { method: 'POST', body: version });
}
