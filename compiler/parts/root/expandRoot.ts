import { chainEntry } from '../chainEntry';
import type { ExpandPart } from '../types';

/** One carrier control, beneath which carried containers hang; on request with a joint that follows it. */
export const expandRoot: ExpandPart<'root'> = ({ id, side }, part) => {
  const at = part.at ?? [0, 0, 0];
  const carrier = {
    role: 'carrier',
    side,
    at,
    shape: part.shape ?? 'compass',
    size: part.size ?? 1,
  } as const;
  const joint = { points: [at], names: ['joint'], parent: id, orient: { rule: 'world' } } as const;
  return {
    controls: { [id]: carrier },
    ...(part.joint ? { chains: { [id]: chainEntry(side, joint, {}) } } : {}),
  };
};
