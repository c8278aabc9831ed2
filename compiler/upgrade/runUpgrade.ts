import { emitScript } from '../emit/emitScript';
import type { Finding } from '../findings/Finding';
import { FindingList } from '../findings/FindingList';
import { finishFindings } from '../findings/finishFindings';
import type { PoseValues, Rig } from '../rig/Rig';
import { checkSeal } from '../slipway/checkSeal';
import { spanOfLine } from '../slipway/lines';
import { parseLine } from '../slipway/parseLine';
import { readStep } from '../slipway/readStep';
import { readValue } from '../slipway/readValue';
import { runScript } from '../slipway/runScript';
import type { Step } from '../slipway/Step';
import type { Statement, Value } from '../slipway/Value';
import { type KeyRule, VERBS } from '../slipway/verbs';
import type { SourceText } from '../source/SourceText';
import { UPGRADE_HEAD } from './emitUpgrade';
import { upgradeFindings } from './findings';
import { scriptHash } from './planUpgrade';
import { itemsOf, type RigItem, renamedItem, stepsOf } from './RigItem';

export interface UpgradeRun {
  /** The rig after the upgrade; null as soon as anything is wrong with it. */
  readonly rig: Rig | null;
  /** The pose that was given, by the names and attributes of the new rig. */
  readonly pose: PoseValues;
  readonly findings: readonly Finding[];
}

type Report = (code: keyof typeof upgradeFindings, parameters: Readonly<Record<string, string>>) => void;

/** A scene while an upgrade runs over it. */
class UpgradingScene {
  #scene: Step;
  #items: RigItem[];
  #pose: PoseValues;

  constructor(rig: Rig, pose: PoseValues) {
    const { scene, items } = itemsOf(rig);
    this.#scene = scene;
    this.#items = [...items];
    this.#pose = pose;
  }

  get script(): string {
    return emitScript(stepsOf({ scene: this.#scene, items: this.#items }));
  }

  get pose(): PoseValues {
    return this.#pose;
  }

  has(name: string): boolean {
    return this.#items.some(({ step }) => step.name === name);
  }

  #indexOf(name: string): number {
    return this.#items.findIndex(({ step }) => step.name === name);
  }

  restate(step: Step): void {
    this.#scene = step;
  }

  rename(from: string, to: string): void {
    const rename = (name: string): string => (name === from ? to : name);
    this.#items = this.#items.map((item) => renamedItem(item, rename));
    if (Object.hasOwn(this.#pose, from)) {
      const { [from]: values = {}, ...rest } = this.#pose;
      this.#pose = { ...rest, [to]: values };
    }
  }

  add(step: Step): void {
    this.#items.push({ step, details: [] });
  }

  addDetail(step: Step): void {
    const index = this.#indexOf(step.name);
    const item = this.#items[index];
    if (item) this.#items[index] = { ...item, details: [...item.details, step] };
  }

  clear(name: string): void {
    const index = this.#indexOf(name);
    const item = this.#items[index];
    if (item) this.#items[index] = { ...item, details: [] };
  }

  verbOf(name: string): Step['verb'] | null {
    return this.#items[this.#indexOf(name)]?.step.verb ?? null;
  }

  set(name: string, values: Readonly<Record<string, unknown>>): void {
    const index = this.#indexOf(name);
    const item = this.#items[index];
    if (!item) return;
    const step = { ...item.step, values: { ...item.step.values, ...values } } as unknown as Step;
    this.#items[index] = { ...item, step };
  }

  remove(name: string): void {
    this.#items.splice(this.#indexOf(name), 1);
    if (Object.hasOwn(this.#pose, name)) {
      const { [name]: _, ...rest } = this.#pose;
      this.#pose = rest;
    }
  }

  place(name: string, before: string | null): void {
    const [item] = this.#items.splice(this.#indexOf(name), 1);
    if (!item) return;
    this.#items.splice(before === null ? this.#items.length : this.#indexOf(before), 0, item);
  }

  remap(name: string, from: string, to: string): void {
    const values = Object.hasOwn(this.#pose, name) ? this.#pose[name] : undefined;
    if (values === undefined || !Object.hasOwn(values, from)) return;
    const { [from]: value, ...rest } = values;
    this.#pose = { ...this.#pose, [name]: { ...rest, [to]: value ?? 0 } };
  }
}

/** Values of the text keys of an upgrade verb; null where one is missing or no text. `none` reads as null text. */
function readTexts(
  statement: Statement,
  keys: readonly string[],
): Readonly<Record<string, string | null>> | null {
  const texts: Record<string, string | null> = {};
  for (const key of keys) {
    const value = statement.pairs.find((pair) => pair.key === key)?.value;
    if (value?.kind === 'string') texts[key] = value.value;
    else if (value?.kind === 'word' && value.value === 'none') texts[key] = null;
    else return null;
  }
  return statement.pairs.length === keys.length ? texts : null;
}

/** Values of a `set` by the table of the verb that made the thing; null where one does not fit. */
function readChanges(statement: Statement, verb: Step['verb']): Readonly<Record<string, unknown>> | null {
  const rules: Readonly<Record<string, KeyRule>> = VERBS[verb].keys;
  const values: [string, unknown][] = [];
  for (const { key, value } of statement.pairs) {
    const rule = Object.hasOwn(rules, key) ? rules[key] : undefined;
    if (rule === undefined) return null;
    const read = isNone(value) && rule.optional ? null : readValue(rule.kind, value);
    if (read === undefined) return null;
    values.push([key, read]);
  }
  return Object.fromEntries(values);
}

function isNone(value: Value): boolean {
  return value.kind === 'word' && value.value === 'none';
}

const TEXT_KEYS: Readonly<Record<string, readonly string[]>> = {
  upgrade: ['from', 'to'],
  rename: ['to'],
  clear: [],
  remove: [],
  place: ['before'],
  remap: ['from', 'to'],
};

/** Carries out one line of an upgrade's own verbs; says what is wrong with it through `report`. */
function runOwn(scene: UpgradingScene, statement: Statement, report: Report): void {
  const { verb, name } = statement;
  if (!scene.has(name)) {
    report('upgrade-name-unknown', { name });
    return;
  }
  if (verb === 'set') {
    const values = readChanges(statement, scene.verbOf(name) ?? 'group');
    if (values === null)
      report('upgrade-key-wrong', { verb, fact: 'a key or its value is none of this thing.' });
    else scene.set(name, values);
    return;
  }
  const texts = readTexts(statement, TEXT_KEYS[verb] ?? []);
  if (texts === null) {
    report('upgrade-key-wrong', {
      verb,
      fact: `its keys are ${(TEXT_KEYS[verb] ?? []).join(', ') || 'none'}.`,
    });
    return;
  }
  const { to = '', from = '', before = null } = texts;
  switch (verb) {
    case 'rename':
      if (scene.has(to ?? '')) report('upgrade-name-taken', { name: to ?? '' });
      else scene.rename(name, to ?? '');
      break;
    case 'clear':
      scene.clear(name);
      break;
    case 'remove':
      scene.remove(name);
      break;
    case 'place':
      if (before !== null && !scene.has(before)) report('upgrade-name-unknown', { name: before });
      else if (before !== name) scene.place(name, before);
      break;
    default:
      scene.remap(name, from ?? '', to ?? '');
  }
}

/** Carries out one line that is a step of a build script: something new, or a detail. */
function runBuildStep(scene: UpgradingScene, step: Step, report: Report): void {
  if (step.verb === 'scene') scene.restate(step);
  else if (VERBS[step.verb].name === 'existing') {
    if (scene.has(step.name)) scene.addDetail(step);
    else report('upgrade-name-unknown', { name: step.name });
  } else if (scene.has(step.name)) report('upgrade-name-taken', { name: step.name });
  else scene.add(step);
}

/**
 * Carries out an upgrade script on a scene that holds `rig`, and on a pose of it. Seal and versions are checked before
 * the first step; what comes out is built anew by the runner of build scripts and must be the version that the upgrade
 * names. Never throws: whatever is wrong is a finding with its line and column, and then there is no rig.
 */
export function runUpgrade(rig: Rig, source: SourceText, pose: PoseValues = {}): UpgradeRun {
  const findings = new FindingList();
  const stop = (): UpgradeRun => ({ rig: null, pose, findings: finishFindings(findings.all) });
  const lines = checkSeal(source, findings, UPGRADE_HEAD);
  const [first, ...rest] = lines ?? [];
  if (!lines || !first) return stop();
  const head = parseLine(first, findings);
  const versions = head?.verb === 'upgrade' ? readTexts(head, TEXT_KEYS.upgrade ?? []) : null;
  const reportAt =
    (span: Statement['span']): Report =>
    (code, parameters) => {
      findings.report(upgradeFindings, code, span, parameters as never);
    };
  if (versions === null || versions.from !== scriptHash(rig)) {
    reportAt(spanOfLine(first))('upgrade-other-scene', {});
    return stop();
  }
  const scene = new UpgradingScene(rig, pose);
  for (const line of rest) {
    const statement = parseLine(line, findings);
    if (statement === null) return stop();
    const report = reportAt(statement.span);
    if (statement.verb === 'set' || Object.hasOwn(TEXT_KEYS, statement.verb))
      runOwn(scene, statement, report);
    else {
      const placed = readStep(statement, findings);
      if (placed) runBuildStep(scene, placed.step, report);
    }
    if (findings.hasErrors) return stop();
  }
  const run = runScript({ name: source.name, text: scene.script });
  if (run.rig === null || scriptHash(run.rig) !== versions.to) {
    reportAt(spanOfLine(first))('upgrade-other-result', {});
    return stop();
  }
  return { rig: run.rig, pose: scene.pose, findings: [] };
}
