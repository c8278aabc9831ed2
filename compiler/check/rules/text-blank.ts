import type { JsonValue, Path } from '../../syntax/types';
import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** Keys whose text is read by people. */
const PROSE: ReadonlySet<string> = new Set(['title', 'note', 'unit']);

/** A title or note without a word shows as a gap wherever it is listed. */
export const textBlank: Rule = {
  code: 'text-blank',
  severity: 'info',
  category: 'tidiness',
  summary: 'A title, note or unit without a word in it.',
  message: '"{key}" holds no words.',
  help: 'Write what it is about, or remove it.',
  create({ report, stage }) {
    const { document } = stage;
    const visit = (value: JsonValue | undefined, path: Path): void => {
      if (typeof value !== 'object' || value === null || Array.isArray(value)) return;
      for (const [key, item] of Object.entries(value)) {
        const at = [...path, key];
        if (typeof item !== 'string') visit(item, at);
        else if (PROSE.has(key) && item.trim() === '')
          report(at, { key }, fixWith('Remove it', 'safe', [removeEntry(document, at)]));
      }
    };
    return {
      finish: () => visit(document.value, []),
    };
  },
};
