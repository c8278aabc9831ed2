import { printString } from '../emit/printString';
import { printValue } from '../emit/printValue';
import { sha256Hex } from '../hash/sha256Hex';
import type { Step } from '../slipway/Step';
import { type KeyRule, VERBS } from '../slipway/verbs';
import type { Upgrade, UpgradeStep } from './Upgrade';

/** First line of an upgrade script. */
export const UPGRADE_HEAD = 'slipway-upgrade 1';

function pairs(step: Step, keys: readonly string[]): string {
  const rules: Readonly<Record<string, KeyRule>> = VERBS[step.verb].keys;
  const values: Readonly<Record<string, unknown>> = step.values;
  return keys
    .map((key) => {
      const value = values[key] ?? null;
      // A key that may be left out and now is: none.
      const isLeftOut = value === null && rules[key]?.optional === true;
      return ` ${key}=${isLeftOut ? 'none' : printValue((rules[key] as KeyRule).kind, value)}`;
    })
    .join('');
}

function wholeStep(step: Step): string {
  const rules: Readonly<Record<string, KeyRule>> = VERBS[step.verb].keys;
  const values: Readonly<Record<string, unknown>> = step.values;
  const keys = Object.keys(rules).filter((key) => !(rules[key]?.optional && (values[key] ?? null) === null));
  return `${step.verb} ${printString(step.name)}${pairs(step, keys)}`;
}

function linesOf(step: UpgradeStep): readonly string[] {
  switch (step.kind) {
    case 'scene':
      return [wholeStep(step.step)];
    case 'rename':
      return [`rename ${printString(step.name)} to=${printString(step.to)}`];
    case 'add':
      return step.steps.map(wholeStep);
    case 'set':
      return [`set ${printString(step.step.name)}${pairs(step.step, step.keys)}`];
    case 'details':
      return [`clear ${printString(step.name)}`, ...step.steps.map(wholeStep)];
    case 'remove':
      return [`remove ${printString(step.name)}`];
    case 'place':
      return [
        `place ${printString(step.name)} before=${step.before === null ? 'none' : printString(step.before)}`,
      ];
    case 'remap':
      return [`remap ${printString(step.name)} from=${printString(step.from)} to=${printString(step.to)}`];
    default:
      return step satisfies never;
  }
}

/** The text of an upgrade: sealed like a build script, its second line the versions that it leads between. */
export function emitUpgrade({ from, to, steps }: Upgrade): string {
  const versions = `upgrade "versions" from=${printString(from)} to=${printString(to)}`;
  const lines = [UPGRADE_HEAD, versions, ...steps.flatMap(linesOf)];
  const body = `${lines.join('\n')}\n`;
  return `${body}end steps=${lines.length} sha256="${sha256Hex(body)}"\n`;
}
