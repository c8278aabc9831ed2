import { isWrittenControl } from '../isWrittenControl';
import type { Rule } from '../Rule';

/** A control that cannot be selected is a drawing. */
export const controlNotSelectable: Rule = {
  code: 'control-not-selectable',
  severity: 'warning',
  category: 'animator',
  summary: 'A control that cannot be selected.',
  message: '"{id}" cannot be selected, because its role "{role}" is not selectable.',
  help: 'Give it a role that is selectable.',
  create({ report, stage, resolved }) {
    return {
      control(control) {
        const { id, role, path } = control;
        if (resolved.roles.get(role)?.selectable !== false) return;
        if (isWrittenControl(control, stage.document)) report(path, { id, role }, { part: 'key' });
      },
    };
  },
};
