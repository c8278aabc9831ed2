import type { PlaceReference } from '../../expand/types';
import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** A landmark that nothing uses is measured for nothing, or stands for a misspelt name elsewhere. */
export const landmarkUnused: Rule = {
  code: 'landmark-unused',
  severity: 'info',
  category: 'tidiness',
  summary: 'A landmark that nothing uses.',
  message: 'Nothing uses the landmark "{name}".',
  help: 'Use it as a point, or remove it.',
  create(context) {
    const used = new Set<string>();
    const use = (place: PlaceReference): void => {
      if (typeof place === 'string') used.add(place);
      else if ('from' in place) used.add(place.from).add(place.to);
    };
    return {
      chain: ({ points }) => points.forEach(use),
      control: ({ place }) => {
        if (place.kind === 'place') use(place.at);
      },
      solver(solver) {
        if (solver.kind === 'foot_roll') Object.values(solver.sole).forEach(use);
      },
      finish() {
        if (!context.isWhole) return;
        const inExpressions = context.expressionNames().landmarks;
        for (const name of Object.keys(context.recipe.landmarks ?? {})) {
          if (!used.has(name) && !inExpressions.has(name))
            context.report(
              ['landmarks', name],
              { name },
              {
                part: 'key',
                ...fixWith('Remove it', 'asks', [removeEntry(context.stage.document, ['landmarks', name])]),
              },
            );
        }
      },
    };
  },
};
