import { isWritten } from '../isWritten';
import type { Rule } from '../Rule';

/** Two choices with one word cannot be told apart in the list that an animator chooses from. */
export const choiceRepeated: Rule = {
  code: 'choice-repeated',
  severity: 'warning',
  category: 'animator',
  summary: 'A choice that is offered twice under one word.',
  message: '"{name}" of "{id}" offers "{label}" twice.',
  help: 'Give each choice a word of its own, or leave one of them out.',
  create({ report, stage }) {
    return {
      control({ id, attributes, spaces, path }) {
        for (const { name, labels } of attributes) {
          const at = labels === spaces ? [...path, 'spaces'] : [...path, 'attributes', name, 'labels'];
          const seen = new Set<string>();
          for (const label of labels ?? []) {
            const heard = label.trim().toLowerCase();
            if (seen.has(heard) && isWritten(stage.document, at)) {
              report(at, { id, name, label });
              break;
            }
            seen.add(heard);
          }
        }
      },
    };
  },
};
