import type { Show } from '@/app/api/v1/_contracts/show';
import type { Caller } from '../../caller';
import { findShow } from '../../findShow';
import { strongestRole } from '../../policy';
import { Refusal } from '../../refusal';

/** One show of the viewer's. */
export async function readShow(caller: Caller, { slug }: { readonly slug: string }): Promise<Show> {
  const { viewer, show } = await findShow(caller, slug, 'show.read');
  const role = strongestRole(viewer, show.id);
  if (!role) throw new Refusal({ code: 'not-found' });
  return { ...show, role };
}
