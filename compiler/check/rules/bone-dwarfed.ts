import { distance } from '../../math/vec3';
import type { Vec3 } from '../../rig/Rig';
import { pointPath } from '../pointPath';
import { positionsOf } from '../positionsOf';
import type { Rule } from '../Rule';

/** Share of the shorter neighbour; the shortest bones that are measured on purpose are longer. Common practice. */
const DWARFED = 0.03;

/** A bone much shorter than those around it has a direction that one careless digit turns about. */
export const boneDwarfed: Rule = {
  code: 'bone-dwarfed',
  severity: 'warning',
  category: 'geometry',
  summary: 'A bone far shorter than its neighbours.',
  message: 'The bone from "{first}" to "{second}" is {percent} % as long as the one beside it.',
  help: 'Move the two points apart, or leave one of them out.',
  create({ solved, report }) {
    return {
      chain(chain) {
        if (chain.count !== null) return;
        const positions = positionsOf(solved, chain.jointIds) ?? [];
        const lengths = positions.slice(1).map((to, index) => distance(positions[index] as Vec3, to));
        lengths.forEach((length, index) => {
          const neighbour = Math.min(lengths[index - 1] ?? Infinity, lengths[index + 1] ?? Infinity);
          if (neighbour === Infinity || length >= neighbour * DWARFED) return;
          report(pointPath(chain, index + 1), {
            first: chain.jointIds[index] ?? '',
            second: chain.jointIds[index + 1] ?? '',
            percent: Number(((length / neighbour) * 100).toPrecision(2)),
          });
        });
      },
    };
  },
};
