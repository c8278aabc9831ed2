import { mirrorPoint } from '../../expand/sides';
import { distance, dot } from '../../math/vec3';
import type { Vec3 } from '../../rig/Rig';
import { pointPath } from '../pointPath';
import { positionsOf } from '../positionsOf';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** Share of the chain's length by which a joint may cross unsaid: hands that meet, feet side by side. */
const MARGIN = 0.02;

/** A chain of one side that reaches to the other meets its own mirrored copy there. */
export const chainCrossesMiddle: Rule = {
  code: 'chain-crosses-middle',
  severity: 'warning',
  category: 'geometry',
  summary: 'A chain of one side that reaches across the middle of the body.',
  message: '"{joint}" stands across the middle, on the side where it does not belong.',
  help: 'Move the point to its own side, or let the chain be of the centre.',
  create({ recipe, resolved, solved, stage, report }) {
    const { left } = resolved.scene;
    return {
      chain(chain) {
        const { side, points, jointIds } = chain;
        if (side === 'centre') return;
        const positions = positionsOf(solved, jointIds) ?? [];
        let size = 0;
        for (let index = 1; index < positions.length; index += 1) {
          size += distance(positions[index - 1] as Vec3, positions[index] as Vec3);
        }
        const outward = side === 'left' ? 1 : -1;
        const index = positions.findIndex((at) => dot(at, left) * outward < -MARGIN * size);
        if (index < 0) return;
        const point = points[index];
        const landmark =
          chain.count === null && typeof point === 'string' ? recipe.landmarks?.[point] : undefined;
        // A sided landmark on the wrong side is told at the landmark itself.
        if (landmark?.side === 'left' && (side === 'left' || landmark.right === undefined)) return;
        const path = pointPath(chain, index);
        const isLiteral = chain.count === null && typeof point === 'object' && !('from' in point);
        const fix =
          isLiteral && side === 'left'
            ? rewrite(stage.document, 'Mirror the point', [
                { path, newText: `[${mirrorPoint(point, left).join(', ')}]` },
              ])
            : {};
        report(path, { joint: jointIds[index] ?? '' }, fix);
      },
    };
  },
};
