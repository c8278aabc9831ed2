import type { Me } from '@/app/api/v1/_contracts/me';
import { type Caller, demandViewer } from '../../caller';

/** Who is signed in. */
export async function readMe(caller: Caller): Promise<Me> {
  const { personId, name, email } = demandViewer(caller);
  return { id: personId, name, email };
}
