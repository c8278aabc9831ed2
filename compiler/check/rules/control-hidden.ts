import { isWrittenControl } from '../isWrittenControl';
import type { Rule } from '../Rule';

/** A control that is not shown cannot be used by anyone who does not know that it is there. */
export const controlHidden: Rule = {
  code: 'control-hidden',
  severity: 'warning',
  category: 'animator',
  summary: 'A control that is not shown.',
  message: '"{id}" is not shown: {reason}.',
  help: 'Give it a role that is shown and whose container is shown, or leave the control out.',
  create({ report, stage, resolved }) {
    return {
      control(control) {
        const { id, role, path } = control;
        const node = resolved.nodeById.get(id);
        if (!node || node.shown || !isWrittenControl(control, stage.document)) return;
        const isRoleHidden = resolved.roles.get(role)?.shown === false;
        const reason = isRoleHidden
          ? `the role "${role}" is hidden`
          : `the container "${node.container}" is hidden`;
        report(path, { id, reason }, { part: 'key' });
      },
    };
  },
};
