import { COLLECTIONS } from '../../expand/primitives';
import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** An entry that adjusts what a part made, but says nothing, is left over or not finished. */
export const entryChangesNothing: Rule = {
  code: 'entry-changes-nothing',
  severity: 'info',
  category: 'tidiness',
  summary: 'An entry that adjusts something without saying anything.',
  message: 'The entry "{id}" changes nothing.',
  help: 'Say what it should change, or remove it.',
  create({ report, stage, recipe }) {
    return {
      finish() {
        for (const collection of COLLECTIONS) {
          // A mesh is whole with its id alone.
          if (collection === 'geometry') continue;
          for (const [id, entry] of Object.entries(recipe[collection] ?? {})) {
            const path = [collection, id];
            if (stage.poisoned.has(path.join('/'))) continue;
            if (Object.keys(entry).some((key) => key !== 'side')) continue;
            report(
              path,
              { id },
              { part: 'key', ...fixWith('Remove it', 'safe', [removeEntry(stage.document, path)]) },
            );
          }
        }
      },
    };
  },
};
