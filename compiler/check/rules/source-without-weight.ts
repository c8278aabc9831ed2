import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';
import { textAt } from '../textAt';

/** A source of weight zero never moves its target; it only looks as if it did. */
export const sourceWithoutWeight: Rule = {
  code: 'source-without-weight',
  severity: 'warning',
  category: 'motion',
  summary: 'A source of a constraint whose weight is always zero.',
  message: 'The weight of "{source}" in "{id}" is 0, so "{target}" never follows it.',
  help: 'Give it a weight above 0, or leave it out. To fade between two sources, use blend.',
  create({ stage, report }) {
    return {
      constraint({ id, target, sources, blend, path, part }) {
        if (blend !== null) return;
        for (const { node, weight } of sources) {
          const place = [...path, 'sources', node];
          // An expression may give another weight for another character.
          if (weight !== 0 || textAt(stage.document, place)?.includes('=')) continue;
          const fix =
            part === null ? fixWith(`Leave "${node}" out`, 'safe', [removeEntry(stage.document, place)]) : {};
          report(place, { id, target, source: node }, fix);
        }
      },
    };
  },
};
