import type { JsonValue, Path } from '../../syntax/types';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** Reading a parameter or landmark is the only way in which an expression can vary. */
const READS = /\b(params|landmarks)\b/;

/** An expression of numbers alone gives the same number for ever, and hides it. */
export const expressionReadsNothing: Rule = {
  code: 'expression-reads-nothing',
  severity: 'info',
  category: 'tidiness',
  summary: 'An expression that reads neither parameters nor landmarks.',
  message: 'The expression "{text}" is always {value}.',
  help: 'Write the number, or read the parameter that it was meant to follow.',
  create({ report, stage, recipe }) {
    const { document } = stage;
    const visit = (raw: JsonValue | undefined, evaluated: unknown, path: Path): void => {
      if (typeof raw === 'string') {
        // What evaluated to anything but a number is prose or was refused.
        if (typeof evaluated !== 'number' || READS.test(raw)) return;
        const value = Number(evaluated.toPrecision(12));
        const fix = rewrite(document, `Write ${value}`, [{ path, newText: String(value) }]);
        report(path, { text: raw, value }, fix);
      } else if (
        typeof raw === 'object' &&
        raw !== null &&
        typeof evaluated === 'object' &&
        evaluated !== null
      ) {
        for (const [key, item] of Object.entries(raw)) {
          const step = Array.isArray(raw) ? Number(key) : key;
          visit(item, (evaluated as Readonly<Record<string, unknown>>)[key], [...path, step]);
        }
      }
    };
    return {
      finish: () => visit(document.value, recipe, []),
    };
  },
};
