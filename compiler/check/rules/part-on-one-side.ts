import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** A limb on one side only is most often a limb whose other side was forgotten. */
export const partOnOneSide: Rule = {
  code: 'part-on-one-side',
  severity: 'info',
  category: 'structure',
  summary: 'A part on one side with nothing of its kind on the other.',
  message: 'The part "{id}" stands on the {side} only.',
  help: 'Write side: both, or leave it if the character has only the one.',
  create({ report, stage }) {
    const sides = new Map<string, Set<string>>();
    const oneSided: { readonly id: string; readonly kind: string; readonly side: string }[] = [];
    return {
      part(id, { kind, ...options }) {
        const side = 'side' in options ? options.side : undefined;
        if (typeof side !== 'string' || side === 'centre') return;
        const of = sides.get(kind) ?? new Set<string>();
        sides.set(kind, of.add(side));
        if (side !== 'both') oneSided.push({ id, kind, side });
      },
      finish() {
        for (const { id, kind, side } of oneSided) {
          if (sides.get(kind)?.has(side === 'left' ? 'right' : 'left')) continue;
          const path = ['parts', id, 'side'];
          report(path, { id, side }, rewrite(stage.document, 'Write both', [{ path, newText: 'both' }]));
        }
      },
    };
  },
};
