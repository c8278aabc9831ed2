import { amountsOf } from '../../expand/solverIds';
import type { Amount } from '../../expand/types';
import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import { isWritten } from '../isWritten';
import type { Rule } from '../Rule';

/** An attribute that nothing reads is a dial without a machine behind it. */
export const attributeUnread: Rule = {
  code: 'attribute-unread',
  severity: 'warning',
  category: 'animator',
  summary: 'An attribute that nothing reads.',
  message: 'Nothing reads the attribute "{name}" of "{id}".',
  help: 'Let a solver, constraint, driver or shape read {id}.{name}, or remove it.',
  create({ report, stage, resolved, isWhole }) {
    const read = new Set<string>();
    const note = (amount: Amount | null): void => {
      if (typeof amount === 'string') read.add(amount);
    };
    return {
      solver(solver) {
        for (const [, amount] of amountsOf(solver)) note(amount);
      },
      constraint: ({ blend }) => note(blend),
      shape: ({ weight }) => note(weight),
      driver: ({ control, input }) => note(`${control}.${input}`),
      finish() {
        if (!isWhole) return;
        for (const { id, attributes, path } of resolved.controls) {
          for (const { name } of attributes) {
            const written = [...path, 'attributes', name];
            if (read.has(`${id}.${name}`) || !isWritten(stage.document, written)) continue;
            const fix = fixWith(`Remove ${name}`, 'asks', [removeEntry(stage.document, written)]);
            report(written, { id, name }, { part: 'key', ...fix });
          }
        }
      },
    };
  },
};
