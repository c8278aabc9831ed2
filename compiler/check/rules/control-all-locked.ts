import { CHANNELS } from '../../expand/specifyControl';
import type { Rule } from '../Rule';

/** A control without a free channel or attribute can be selected but does nothing. */
export const controlAllLocked: Rule = {
  code: 'control-all-locked',
  severity: 'warning',
  category: 'animator',
  summary: 'A control with nothing left to change.',
  message: 'Every channel of "{id}" is locked and it has no attributes.',
  help: 'Unlock a channel, give it an attribute, or remove the control.',
  create(context) {
    return {
      control({ id, channels, attributes, path }) {
        if (attributes.length === 0 && CHANNELS.every((channel) => channels[channel]?.locked)) {
          context.report([...path, 'channels'], { id });
        }
      },
    };
  },
};
