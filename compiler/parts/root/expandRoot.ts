import type { ExpandPart } from '../types';

/** One carrier control; containers that are carried hang beneath it. */
export const expandRoot: ExpandPart<'root'> = ({ id, side }, part) => ({
  controls: {
    [id]: {
      role: 'carrier',
      side,
      at: part.at ?? [0, 0, 0],
      shape: part.shape ?? 'compass',
      size: part.size ?? 1,
    },
  },
});
