import type { TwoBoneSpecification } from '../../expand/types';
import { dot } from '../../math/vec3';
import { hingesOfLimbs } from '../hingesOfLimbs';
import type { Rule } from '../Rule';

/** Degrees between the hinge that the limits leave and the one about which the limb is bent at rest. */
const ACROSS = 30;
/** Degrees; a limb bent less has no hinge direction worth comparing. */
const SLIGHT = 2;

/** An elbow that may only turn about one axis, and is bent about another, breaks its limits at every reach. */
export const hingeAcrossBend: Rule = {
  code: 'hinge-across-bend',
  severity: 'warning',
  category: 'geometry',
  summary: 'A middle joint limited to an axis about which its limb does not fold.',
  message:
    'The limits of "{joint}" leave only {channel}, {degrees} degrees off the axis about which the limb is bent.',
  help: 'Leave free the turn about which the limb folds, or turn the joints by orient.',
  create(context) {
    const limbs: TwoBoneSpecification[] = [];
    return {
      solver(solver) {
        if (solver.kind === 'two_bone') limbs.push(solver);
      },
      finish() {
        for (const { chain, mid, hinge, bend, axis } of hingesOfLimbs(context, limbs)) {
          const degrees = (Math.acos(Math.min(1, Math.abs(dot(axis, bend.hinge)))) * 180) / Math.PI;
          if (bend.degrees < SLIGHT || degrees <= ACROSS) continue;
          const parameters = { joint: mid, channel: hinge.channel, degrees: Math.round(degrees) };
          context.report([...chain.path, 'limits', hinge.name], parameters, { part: 'key' });
        }
      },
    };
  },
};
