import { amountsOf } from '../../expand/solverIds';
import type { Amount } from '../../expand/types';
import type { Path } from '../../syntax/types';
import { addKeys } from '../edits/addKeys';
import { fixWith } from '../edits/fixWith';
import { isWritten } from '../isWritten';
import type { Rule } from '../Rule';

/** Amounts that are shares between nothing and all. */
const SHARES: ReadonlySet<string> = new Set(['blend', 'stretch', 'volume']);

/** An attribute that blends must end at 0 and 1: beyond them a rig throws its joints past both poses. */
export const shareWithoutRange: Rule = {
  code: 'share-without-range',
  severity: 'warning',
  category: 'animator',
  summary: 'An attribute that blends but may be dialled beyond 0 and 1.',
  message: '"{name}" of "{id}" is read as {use}, yet has no {missing}.',
  help: 'Give it min 0 and max 1.',
  create({ report, stage, resolved }) {
    const uses = new Map<string, string>();
    const note = (use: string, amount: Amount | null): void => {
      if (typeof amount === 'string') uses.set(amount, use);
    };
    return {
      solver(solver) {
        for (const [use, amount] of amountsOf(solver)) if (SHARES.has(use)) note(use, amount);
      },
      constraint: ({ blend }) => note('blend', blend),
      shape: ({ weight }) => note('weight', weight),
      finish() {
        for (const { id, attributes, path } of resolved.controls) {
          for (const { name, min, max } of attributes) {
            const use = uses.get(`${id}.${name}`);
            const written: Path = [...path, 'attributes', name];
            if (!use || (min !== null && max !== null)) continue;
            if (!isWritten(stage.document, written)) continue;
            const bounds = [
              ...(min === null ? [['min', '0'] as const] : []),
              ...(max === null ? [['max', '1'] as const] : []),
            ];
            const missing = bounds.map(([key]) => key).join(' and ');
            const fix = fixWith(`Give it ${missing}`, 'asks', [addKeys(stage.document, written, bounds)]);
            report(written, { id, name, use, missing }, { part: 'key', ...fix });
          }
        }
      },
    };
  },
};
