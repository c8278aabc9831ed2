import { chainEntry } from '../chainEntry';
import { namesFor } from '../jointNames';
import { turnControl } from '../turnControl';
import type { ExpandPart } from '../types';

/** One bone whose control turns and shifts it; the attribute `open` turns it about its hinge. */
export const expandJaw: ExpandPart<'jaw'> = ({ id, side }, part) => {
  const names = namesFor(part.points, part.names, ['hinge', 'tip']);
  const hinge = `${id}.${names[0] ?? ''}`;
  const control = `${id}.move`;
  return {
    chains: { [id]: chainEntry(side, { points: part.points, names: [...names] }, part) },
    controls: {
      [control]: {
        ...turnControl(hinge, {
          side,
          parent: part.parent,
          order: part.rotation_order,
          shape: 'pin',
          moves: true,
        }),
        attributes: { open: { default: 0, min: 0, max: 1, note: 'opens about the hinge' } },
      },
    },
    constraints: { [`${hinge}_follow`]: { side, kind: 'parent', target: hinge, sources: { [control]: 1 } } },
    drivers: {
      [`${id}.open`]: {
        side,
        input: `${control}.open`,
        target: control,
        channel: 'rz',
        keys: [
          [0, 0],
          [1, part.open ?? 25],
        ],
      },
    },
  };
};
