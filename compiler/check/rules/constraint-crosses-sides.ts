import { areOpposite, referToOtherSide } from '../crossSides';
import type { Rule } from '../Rule';

/** A thing that follows the other side alone is nearly always a slip; several sources may cross on purpose. */
export const constraintCrossesSides: Rule = {
  code: 'constraint-crosses-sides',
  severity: 'warning',
  category: 'motion',
  summary: 'A constraint by which one side follows the other.',
  message: '"{target}" follows "{source}" alone, which is on the other side.',
  help: 'Name the source on the same side. A thing that may follow either side needs both as sources.',
  create({ resolved, stage, report }) {
    const sideOf = (id: string) => resolved.nodeById.get(id)?.side;
    return {
      constraint({ target, sources, path }) {
        const [source] = sources;
        if (!source || sources.length > 1 || !areOpposite(sideOf(target), sideOf(source.node))) return;
        const place = [...path, 'sources', source.node];
        const fix = referToOtherSide(stage.document, place, 'key', (id) => resolved.nodeById.has(id));
        report(place, { target, source: source.node }, { part: 'key', ...fix });
      },
    };
  },
};
