import type { TwoBoneSpecification } from '../../expand/types';
import { dot } from '../../math/vec3';
import { hingesOfLimbs } from '../hingesOfLimbs';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** Cosine of the angle within which the limb is bent about its hinge at all. */
const ALIGNED = Math.cos((30 * Math.PI) / 180);
/** Degrees by which a limb may be opened past straight: some knees are. Common practice. */
const PAST_STRAIGHT = 15;

/** Limits that open a limb past straight but hardly fold it were written for a bend to the other side. */
export const hingeOpensBackward: Rule = {
  code: 'hinge-opens-backward',
  severity: 'warning',
  category: 'geometry',
  summary: 'A middle joint whose limits are the wrong way round for its bend.',
  message:
    '{channel} of "{joint}" folds the limb by {folds} degrees at most, but opens it by {opens}, past straight.',
  help: 'Turn the limits round, or check on which side of the limb the middle point stands.',
  create(context) {
    const limbs: TwoBoneSpecification[] = [];
    return {
      solver(solver) {
        if (solver.kind === 'two_bone') limbs.push(solver);
      },
      finish() {
        for (const { chain, mid, hinge, bend, axis } of hingesOfLimbs(context, limbs)) {
          const alike = dot(axis, bend.hinge);
          const { min, max } = hinge.range;
          if (Math.abs(alike) < ALIGNED || min === null || max === null) continue;
          const folds = alike > 0 ? max : -min;
          const opens = alike > 0 ? -min : max;
          if (opens <= folds || opens <= bend.degrees + PAST_STRAIGHT) continue;
          const path = [...chain.path, 'limits', hinge.name, hinge.channel];
          context.report(
            path,
            { joint: mid, channel: hinge.channel, folds, opens },
            rewrite(context.stage.document, 'Turn the limits round', [
              { path: [...path, 'min'], newText: String(0 - max) },
              { path: [...path, 'max'], newText: String(0 - min) },
            ]),
          );
        }
      },
    };
  },
};
