import type { Draft } from '@/app/api/v1/_contracts/draft';
import type { RecipeDraft } from '@/db/repositories/recipeDrafts';

/** A draft as it leaves the server. */
export function toDraft(draft: RecipeDraft): Draft {
  return { ...draft, updatedAt: draft.updatedAt.toISOString() };
}
