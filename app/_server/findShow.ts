import { type Show, showsRepository } from '@/db/repositories/shows';
import { type Caller, demandPermission, demandViewer } from './caller';
import type { Action } from './policy';
import { Refusal } from './refusal';
import { scopeOf, type Viewer } from './viewer';

/** The show, for a viewer who may do `action` in it; a foreign show is refused as one that does not exist. */
export async function findShow(
  caller: Caller,
  slug: string,
  action: Action,
): Promise<{ readonly viewer: Viewer; readonly show: Show }> {
  const viewer = demandViewer(caller);
  const show = await showsRepository(caller.database).findBySlug(slug, scopeOf(viewer));
  if (!show) throw new Refusal({ code: 'not-found' });
  demandPermission(viewer, action, { showId: show.id });
  return { viewer, show };
}
