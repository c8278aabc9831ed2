import { chainEntry } from '../chainEntry';
import { namesFor } from '../jointNames';
import { turnControl } from '../turnControl';
import type { ExpandPart } from '../types';

/** One bone that a control turns. What hangs on it takes its end joint for a parent. */
export const expandClavicle: ExpandPart<'clavicle'> = ({ id, side }, part) => {
  const names = namesFor(part.points, part.names, ['root', 'end']);
  const [root = '', end = ''] = names.map((name) => `${id}.${name}`);
  const control = `${id}.turn`;
  return {
    chains: { [id]: chainEntry(side, { points: part.points, names: [...names] }, part) },
    controls: {
      [control]: {
        ...turnControl(root, {
          side,
          parent: part.parent,
          order: part.rotation_order,
          limits: part.limits?.[names[0] ?? ''],
          shape: 'arrow',
        }),
      },
    },
    constraints: { [`${root}_turn`]: { side, kind: 'orient', target: root, sources: { [control]: 1 } } },
    guide_lines: { [`${id}.turn_line`]: { side, from: control, to: end } },
  };
};
