import type { GuideLineSpecification } from '../../expand/types';
import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** Two lines between the same two things are drawn over each other. */
export const guideLineRepeated: Rule = {
  code: 'guide-line-repeated',
  severity: 'warning',
  category: 'animator',
  summary: 'Two guide lines between the same two things.',
  message: 'The guide line "{id}" is drawn over "{other}".',
  help: 'Remove one of the two.',
  create({ report, stage }) {
    const first = new Map<string, GuideLineSpecification>();
    return {
      guideLine(line) {
        const { id, from, to, path } = line;
        const ends = [from, to].sort().join(' ');
        const other = first.get(ends);
        first.set(ends, other ?? line);
        if (!other || from === to) return;
        const related = [{ span: stage.document.spanAt(other.path, 'key'), label: 'the line beneath it' }];
        const fix = fixWith('Remove this line', 'asks', [removeEntry(stage.document, path)]);
        report(path, { id, other: other.id }, { part: 'key', related, ...(line.part === null ? fix : {}) });
      },
    };
  },
};
