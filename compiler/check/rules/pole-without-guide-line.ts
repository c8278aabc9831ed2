import { addKeys } from '../edits/addKeys';
import { fixWith } from '../edits/fixWith';
import type { Rule } from '../Rule';

/** A pole hangs in the air beside its limb; a line to the joint it steers shows whose it is. */
export const poleWithoutGuideLine: Rule = {
  code: 'pole-without-guide-line',
  severity: 'info',
  category: 'animator',
  summary: 'A pole control that no guide line ties to its limb.',
  message: 'No guide line shows what the pole "{pole}" steers.',
  help: 'Add a guide line from "{pole}" to "{joint}".',
  create({ report, stage, resolved, isWhole }) {
    const tied = new Set<string>();
    return {
      guideLine({ from, to }) {
        tied.add(from).add(to);
      },
      finish() {
        if (!isWhole) return;
        const controls = new Set(resolved.controls.map(({ id }) => id));
        for (const solver of resolved.solvers) {
          if ((solver.kind !== 'two_bone' && solver.kind !== 'reach') || solver.part !== null) continue;
          const { pole, joints, path } = solver;
          const joint = joints[1];
          if (joint === undefined || tied.has(pole) || !controls.has(pole)) continue;
          // An entry for both sides would need a line for both; which of the two was written is not worth guessing.
          const line = [`${String(path[1])}_line`, `{ from: ${pole}, to: ${joint} }`] as const;
          const edit = solver.side === 'centre' ? addKeys(stage.document, ['guide_lines'], [line]) : null;
          report([...path, 'pole'], { pole, joint }, fixWith('Add a guide line', 'asks', [edit]));
        }
      },
    };
  },
};
