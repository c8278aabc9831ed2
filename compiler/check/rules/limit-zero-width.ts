import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** A limit that leaves one value says in two numbers what a lock says in a word, and shows as a channel that is stuck. */
export const limitZeroWidth: Rule = {
  code: 'limit-zero-width',
  severity: 'warning',
  category: 'animator',
  summary: 'A limit that leaves a single value.',
  message: '"{name}" of "{id}" may only be {value}.',
  help: 'Lock the channel, or widen the limit.',
  create({ report, stage }) {
    return {
      controlEntry(id, { channels, attributes }) {
        for (const [name, { min, max, locked }] of Object.entries(channels ?? {})) {
          if (min === undefined || min !== max || locked) continue;
          const path = ['controls', id, 'channels', name];
          const fix = rewrite(stage.document, `Lock ${name}`, [{ path, newText: '{ locked: true }' }]);
          report(path, { id, name, value: min }, fix);
        }
        for (const [name, { min, max }] of Object.entries(attributes ?? {})) {
          if (min !== undefined && min === max)
            report(['controls', id, 'attributes', name], { id, name, value: min });
        }
      },
    };
  },
};
