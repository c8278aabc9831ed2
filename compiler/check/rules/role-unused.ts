import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** A role of the recipe's own that nothing has was meant for something. */
export const roleUnused: Rule = {
  code: 'role-unused',
  severity: 'info',
  category: 'tidiness',
  summary: 'A role that nothing has.',
  message: 'Nothing has the role "{id}".',
  help: 'Give it to what it was made for, or remove it.',
  create({ report, stage, resolved, isWhole }) {
    const { document, house } = stage;
    let used: ReadonlySet<string> | null = null;
    return {
      role(id) {
        // What adjusts a role of the house is for whatever has that role now or later.
        if (!isWhole || house.rules.roles[id] !== undefined) return;
        used ??= new Set(resolved.nodes.map(({ role }) => role));
        if (used.has(id)) return;
        const path = ['roles', id];
        report(path, { id }, { part: 'key', ...fixWith('Remove it', 'safe', [removeEntry(document, path)]) });
      },
    };
  },
};
