import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import { isWritten } from '../isWritten';
import type { Rule } from '../Rule';

/** Spaces are a choice; a single one gives the animator nothing to choose and the control no attribute. */
export const spaceWithoutChoice: Rule = {
  code: 'space-without-choice',
  severity: 'warning',
  category: 'animator',
  summary: 'A control with a single space.',
  message: '"{id}" has only the space "{space}", so there is nothing to choose.',
  help: 'Add another space, or write "{space}" as its parent and remove spaces.',
  create({ report, stage }) {
    return {
      control({ id, spaces, parent, path }) {
        const [space] = spaces;
        const written = [...path, 'spaces'];
        if (space === undefined || new Set(spaces).size > 1 || !isWritten(stage.document, written)) return;
        const fix =
          parent === space ? fixWith('Remove spaces', 'asks', [removeEntry(stage.document, written)]) : {};
        report(written, { id, space }, fix);
      },
    };
  },
};
