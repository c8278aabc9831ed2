import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** A limit on a locked channel is never met; one of the two was meant to go. */
export const limitOnLocked: Rule = {
  code: 'limit-on-locked',
  severity: 'warning',
  category: 'animator',
  summary: 'A channel that is both locked and limited.',
  message: '"{name}" of "{id}" is locked, so its limit is never met.',
  help: 'Remove min and max, or unlock the channel.',
  create({ report, stage }) {
    return {
      controlEntry(id, { channels }) {
        for (const [name, { min, max, locked }] of Object.entries(channels ?? {})) {
          if (!locked || (min === undefined && max === undefined)) continue;
          const path = ['controls', id, 'channels', name];
          const fix = rewrite(stage.document, 'Keep the lock alone', [{ path, newText: '{ locked: true }' }]);
          report(path, { id, name }, fix);
        }
      },
    };
  },
};
