import { distance } from '../../math/vec3';
import { positionsOf } from '../positionsOf';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** Controls listed from the far end lay the joints along the curve the wrong way round. */
export const splineRunsBackward: Rule = {
  code: 'spline-runs-backward',
  severity: 'warning',
  category: 'geometry',
  summary: 'A spline whose controls are listed from the far end.',
  message: 'The controls of "{id}" run from "{first}", which is nearer to its last joint than to its first.',
  help: 'List the controls in the order of the joints.',
  create({ solved, stage, report }) {
    return {
      solver(solver) {
        if (solver.kind !== 'spline') return;
        const { id, joints, controls, side, path } = solver;
        const ends = [joints[0], joints.at(-1), controls[0], controls.at(-1)].map((end) => end ?? '');
        const [root, tip, first, last] = positionsOf(solved, ends) ?? [];
        if (!root || !tip || !first || !last) return;
        const isBackward =
          distance(first, tip) < distance(first, root) && distance(last, root) < distance(last, tip);
        if (!isBackward) return;
        const place = [...path, 'controls'];
        const newText = `[${[...controls].reverse().join(', ')}]`;
        // The right copy's ids differ from those that were written.
        const fix =
          side === 'right' ? {} : rewrite(stage.document, 'Turn the list round', [{ path: place, newText }]);
        report(place, { id, first: controls[0] ?? '' }, fix);
      },
    };
  },
};
