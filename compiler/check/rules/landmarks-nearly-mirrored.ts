import { mirrorPoint } from '../../expand/sides';
import { distance } from '../../math/vec3';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';
import { sizeOfRig } from '../sizeOfRig';

/** Shares of the rig's size: below the first both points are one, above the second the model is meant to differ. */
const SAME = 1e-6;
const MEANT = 0.01;

/** A right point that misses the mirror image by a little was measured carelessly, and makes both sides animate unlike. */
export const landmarksNearlyMirrored: Rule = {
  code: 'landmarks-nearly-mirrored',
  severity: 'warning',
  category: 'geometry',
  summary: 'A right landmark that is nearly, but not quite, the mirror image of the left.',
  message: 'The right point of "{name}" lies {distance} {unit} beside the mirror image of the left.',
  help: 'Leave right out where the model is symmetrical.',
  create({ recipe, resolved, solved, stage, report }) {
    return {
      finish() {
        const { left, unit } = resolved.scene;
        let size: number | null = null;
        for (const [name, { at, side, right }] of Object.entries(recipe.landmarks ?? {})) {
          if (side !== 'left' || right === undefined || stage.poisoned.has(`landmarks/${name}`)) continue;
          const mirrored = mirrorPoint(at, left);
          const apart = distance(mirrored, right);
          size ??= sizeOfRig(solved);
          if (apart <= size * SAME || apart >= size * MEANT) continue;
          const path = ['landmarks', name, 'right'];
          const newText = `[${mirrored.join(', ')}]`;
          report(
            path,
            { name, unit, distance: Number(apart.toPrecision(3)) },
            rewrite(stage.document, 'Write the mirror image', [{ path, newText }]),
          );
        }
      },
    };
  },
};
