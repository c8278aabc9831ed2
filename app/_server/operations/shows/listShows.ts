import type { ShowList } from '@/app/api/v1/_contracts/show';
import { showsRepository } from '@/db/repositories/shows';
import { type Caller, demandViewer } from '../../caller';
import { can, strongestRole } from '../../policy';
import { scopeOf } from '../../viewer';

/** The shows the viewer belongs to, in order of title. */
export async function listShows(caller: Caller): Promise<ShowList> {
  const viewer = demandViewer(caller);
  const shows = await showsRepository(caller.database).list(scopeOf(viewer));
  return {
    items: shows.flatMap((show) => {
      const role = strongestRole(viewer, show.id);
      return role && can(viewer, 'show.read', { showId: show.id }) ? [{ ...show, role }] : [];
    }),
  };
}
