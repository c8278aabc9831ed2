import { angleBetween, sub } from '../../math/vec3';
import type { Vec3 } from '../../rig/Rig';
import { pointPath } from '../pointPath';
import { positionsOf } from '../positionsOf';
import type { Rule } from '../Rule';

/** Degrees; knees and elbows folded as far as flesh allows reach about 150. Common practice, from memory. */
const FOLDED = 150;

/** A bone that runs back along the one before is nearly always a landmark in the wrong order. */
export const chainFoldsBack: Rule = {
  code: 'chain-folds-back',
  severity: 'warning',
  category: 'geometry',
  summary: 'A chain that turns back on itself.',
  message: 'At "{joint}" the chain turns back by {degrees} degrees.',
  help: 'Check the order of the points, and whether each landmark stands where it should.',
  create({ solved, report }) {
    return {
      chain(chain) {
        const positions = positionsOf(solved, chain.jointIds) ?? [];
        for (let index = 1; index + 1 < positions.length; index += 1) {
          const at = positions[index] as Vec3;
          const turn = angleBetween(
            sub(at, positions[index - 1] as Vec3),
            sub(positions[index + 1] as Vec3, at),
          );
          const degrees = (turn * 180) / Math.PI;
          if (degrees <= FOLDED) continue;
          report(pointPath(chain, index), {
            joint: chain.jointIds[index] ?? '',
            degrees: Math.round(degrees),
          });
          return;
        }
      },
    };
  },
};
