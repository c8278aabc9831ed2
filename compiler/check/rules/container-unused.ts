import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** A container of the recipe's own that holds neither a role nor another container stays empty for ever. */
export const containerUnused: Rule = {
  code: 'container-unused',
  severity: 'info',
  category: 'tidiness',
  summary: 'A container that nothing lies in.',
  message: 'No role and no container lies in the container "{id}".',
  help: 'Name it as the container of a role, or remove it.',
  create({ report, stage, resolved, isWhole }) {
    const { document, house } = stage;
    let holding: Set<string> | null = null;
    return {
      container(id) {
        if (!isWhole || house.rules.containers[id] !== undefined) return;
        if (holding === null) {
          holding = new Set();
          for (const { container } of resolved.roles.values()) if (container !== null) holding.add(container);
          for (const { parent } of resolved.containers.values()) if (parent !== null) holding.add(parent);
        }
        if (holding.has(id)) return;
        const path = ['containers', id];
        report(path, { id }, { part: 'key', ...fixWith('Remove it', 'safe', [removeEntry(document, path)]) });
      },
    };
  },
};
