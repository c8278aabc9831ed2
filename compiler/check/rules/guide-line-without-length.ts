import type { Rule } from '../Rule';

/** A guide line from a thing to itself draws nothing. */
export const guideLineWithoutLength: Rule = {
  code: 'guide-line-without-length',
  severity: 'warning',
  category: 'animator',
  summary: 'A guide line that ends where it begins.',
  message: 'The guide line "{id}" leads from "{from}" to itself.',
  help: 'Name the thing that "{from}" steers as its end.',
  create(context) {
    return {
      guideLine({ id, from, to, path }) {
        if (from === to) context.report([...path, 'to'], { id, from });
      },
    };
  },
};
