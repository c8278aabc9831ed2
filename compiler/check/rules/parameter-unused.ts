import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** A parameter that no expression reads changes nothing when a roster varies it. */
export const parameterUnused: Rule = {
  code: 'parameter-unused',
  severity: 'warning',
  category: 'tidiness',
  summary: 'A parameter that no expression reads.',
  message: 'No expression reads the parameter "{name}".',
  help: 'Use it as params.{name} in an expression, or remove it.',
  create(context) {
    return {
      finish() {
        if (!context.isWhole) return;
        const read = context.expressionNames().params;
        for (const name of Object.keys(context.recipe.params ?? {})) {
          if (!read.has(name))
            context.report(
              ['params', name],
              { name },
              {
                part: 'key',
                ...fixWith('Remove it', 'asks', [removeEntry(context.stage.document, ['params', name])]),
              },
            );
        }
      },
    };
  },
};
