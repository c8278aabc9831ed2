import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** What hangs on a thing follows it already; holding it there a second time does nothing. */
export const constraintFollowsParent: Rule = {
  code: 'constraint-follows-parent',
  severity: 'warning',
  category: 'motion',
  summary: 'A constraint that lets a joint follow its own parent.',
  message: '"{target}" hangs on "{source}" already, so "{id}" does nothing.',
  help: 'Remove the constraint, or name as source what should move "{target}" against its parent.',
  create({ resolved, stage, report }) {
    const driven = new Set<string>();
    for (const { target } of resolved.drivers) driven.add(target);
    return {
      constraint({ id, kind, target, sources, keepOffset, path, part }) {
        const [source] = sources;
        if (kind === 'aim' || !keepOffset || !source || sources.length > 1 || driven.has(target)) return;
        const node = resolved.nodeById.get(target);
        // A control has channels of its own, which the constraint would override: another rule tells that.
        if (node?.kind !== 'joint' || node.parent !== source.node) return;
        const fix =
          part === null ? fixWith('Remove the constraint', 'asks', [removeEntry(stage.document, path)]) : {};
        report(path, { id, target, source: source.node }, { part: 'key', ...fix });
      },
    };
  },
};
