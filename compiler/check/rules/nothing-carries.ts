import { findsCarrier } from '../findsCarrier';
import type { Rule } from '../Rule';

/** Without a root control an animator cannot place the character in a shot. */
export const nothingCarries: Rule = {
  code: 'nothing-carries',
  severity: 'warning',
  category: 'structure',
  summary: 'A rig without a root control.',
  message: 'No control carries the rig, so it cannot be placed in a shot.',
  help: 'Add a part of kind root, or give one control the role carrier.',
  create(context) {
    return {
      finish() {
        if (!context.isWhole) return;
        const hasNodes = context.resolved.chains.length + context.resolved.controls.length > 0;
        if (hasNodes && !findsCarrier(context.resolved)) context.report(['recipe'], {});
      },
    };
  },
};
