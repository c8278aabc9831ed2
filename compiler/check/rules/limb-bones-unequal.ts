import { distance } from '../../math/vec3';
import { limbPositions } from '../positionsOf';
import type { Rule } from '../Rule';

/** The two long bones of a limb differ by far less on any animal or machine that folds. Common practice. */
const UNEQUAL = 3;

/** The goal of a limb with one long and one short bone leaves the end behind when it comes near the start. */
export const limbBonesUnequal: Rule = {
  code: 'limb-bones-unequal',
  severity: 'warning',
  category: 'geometry',
  summary: 'A limb with one bone several times as long as the other.',
  message:
    'The bones of "{solver}" measure {upper} and {lower} {unit}: its end cannot come nearer to "{start}" than {nearest}.',
  help: 'Check the middle point, and that the three joints are those that should fold.',
  create({ resolved, solved, report }) {
    return {
      solver(solver) {
        if (solver.kind !== 'two_bone') return;
        const places = limbPositions(solved, solver.joints);
        if (!places) return;
        const [start, mid, end] = places;
        const upper = distance(start, mid);
        const lower = distance(mid, end);
        if (Math.max(upper, lower) <= UNEQUAL * Math.min(upper, lower)) return;
        report(
          solver.path,
          {
            solver: solver.id,
            start: solver.joints[0],
            unit: resolved.scene.unit,
            upper: Number(upper.toPrecision(3)),
            lower: Number(lower.toPrecision(3)),
            nearest: Number(Math.abs(upper - lower).toPrecision(3)),
          },
          { part: 'key' },
        );
      },
    };
  },
};
