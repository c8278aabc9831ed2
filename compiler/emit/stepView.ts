import type { Step } from '../slipway/Step';
import { type KeyRule, VERBS } from '../slipway/verbs';
import { printString } from './printString';
import { printValue } from './printValue';

/** What a template is given for one step: the name and each key as finished text, null for a key left out. */
export type StepView = Readonly<Record<string, string | null>>;

/**
 * The view of a step. The quoted name is under `quotedName`, since a verb may have a key called `name`; every text is
 * already in the script's own notation, so templates only put texts in a row.
 */
export function stepView(step: Step): StepView {
  const view: Record<string, string | null> = { quotedName: printString(step.name) };
  const keys: Readonly<Record<string, KeyRule>> = VERBS[step.verb].keys;
  const values: Readonly<Record<string, unknown>> = step.values;
  for (const key in keys) {
    const value = values[key];
    const rule = keys[key] as KeyRule;
    view[key] = value === null && rule.optional ? null : printValue(rule.kind, value);
  }
  return view;
}
