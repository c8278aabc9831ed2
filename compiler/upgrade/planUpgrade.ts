import { emitScript } from '../emit/emitScript';
import { canonicalJson } from '../hash/canonicalJson';
import { sha256Hex } from '../hash/sha256Hex';
import { planSteps } from '../plan/planSteps';
import type { ControlNode, Rig } from '../rig/Rig';
import type { Step } from '../slipway/Step';
import { matchItems } from './matchItems';
import { isNodeItem, itemsOf, type RigItem, renamedItem } from './RigItem';
import type { Upgrade, UpgradeStep } from './Upgrade';

function same(a: unknown, b: unknown): boolean {
  return canonicalJson(a as never) === canonicalJson(b as never);
}

/** A name that neither rig has, to hold a place while names change hands. */
function freeName(wanted: string, taken: ReadonlySet<string>): string {
  let name = `${wanted}_was`;
  for (let number = 2; taken.has(name); number += 1) name = `${wanted}_was_${number}`;
  return name;
}

/**
 * Renames in an order in which no name is ever taken twice. What stands in the way, because it is renamed later or
 * will be removed, first goes aside to a name that nothing has.
 */
function planRenames(
  renames: ReadonlyMap<string, string>,
  blocked: readonly string[],
  taken: ReadonlySet<string>,
): { readonly steps: readonly UpgradeStep[]; readonly names: ReadonlyMap<string, string> } {
  const steps: UpgradeStep[] = [];
  const names = new Map<string, string>();
  const used = new Set(taken);
  const aside: [string, string][] = [];
  const sources = new Set(renames.keys());
  const rename = (name: string, to: string): void => {
    steps.push({ kind: 'rename', name, to });
  };
  for (const name of blocked) {
    const free = freeName(name, used);
    used.add(free);
    names.set(name, free);
    rename(name, free);
  }
  for (const [from, to] of renames) {
    names.set(from, to);
    // Only where the new name is still borne by something that moves on itself.
    if (!sources.has(to)) {
      rename(from, to);
      continue;
    }
    const free = freeName(from, used);
    used.add(free);
    rename(from, free);
    aside.push([free, to]);
  }
  for (const [free, to] of aside) rename(free, to);
  return { steps, names };
}

function changedKeys(before: Step, after: Step): readonly string[] {
  const old: Readonly<Record<string, unknown>> = before.values;
  const now: Readonly<Record<string, unknown>> = after.values;
  return Object.keys(now).filter((key) => !same(old[key] ?? null, now[key] ?? null));
}

/** Attributes of a control that bear another name and stay what they were: same place in the list, same numbers. */
function renamedAttributes(
  before: ControlNode | undefined,
  after: ControlNode,
): readonly (readonly [string, string])[] {
  if (!before || before.attributes.length !== after.attributes.length) return [];
  const old = new Set(before.attributes.map(({ name }) => name));
  const now = new Set(after.attributes.map(({ name }) => name));
  return before.attributes.flatMap((attribute, index) => {
    const other = after.attributes[index];
    if (!other || attribute.name === other.name || now.has(attribute.name) || old.has(other.name)) return [];
    const { name: _, note: __, ...rest } = attribute;
    const { name: ___, note: ____, ...others } = other;
    return same(rest, others) ? [[attribute.name, other.name] as const] : [];
  });
}

/** Steps that put the items in the wanted order, each before the one it must precede. */
function planOrder(present: readonly string[], wanted: readonly string[]): readonly UpgradeStep[] {
  const steps: UpgradeStep[] = [];
  const order = [...present];
  wanted.forEach((name, index) => {
    if (order[index] === name) return;
    const before = order[index] ?? null;
    order.splice(order.indexOf(name), 1);
    order.splice(index, 0, name);
    steps.push({ kind: 'place', name, before });
  });
  return steps;
}

/** SHA-256 of a rig's script: what identifies a version to an upgrade. */
export function scriptHash(rig: Rig): string {
  return sha256Hex(emitScript(planSteps(rig)));
}

/**
 * What turns a scene that holds `before` into one that holds `after`: names first, then what is new, what changed, what
 * goes, and the order. Things are told apart by id, then by name, then by how they stand; what cannot be told is
 * removed and added. Each step can be carried out when its turn comes: nothing refers to what is not there.
 */
export function planUpgrade(before: Rig, after: Rig): Upgrade {
  const old = itemsOf(before);
  const now = itemsOf(after);
  const pairs = matchItems(old.items, now.items);
  const kept = new Set(pairs.values());
  const nameAt = (items: readonly RigItem[], index: number): string => items[index]?.step.name ?? '';

  const renames = new Map<string, string>();
  for (const [from, to] of pairs) {
    const [name, wanted] = [nameAt(old.items, from), nameAt(now.items, to)];
    if (name !== wanted) renames.set(name, wanted);
  }
  const removed = old.items.filter((_, index) => !pairs.has(index));
  const wantedNames = new Set(now.items.map(({ step }) => step.name));
  const blocked = removed.map(({ step }) => step.name).filter((name) => wantedNames.has(name));
  const taken = new Set([...old.items.map(({ step }) => step.name), ...wantedNames]);
  const { steps: renaming, names } = planRenames(renames, blocked, taken);
  const rename = (name: string): string => names.get(name) ?? name;

  const controls = new Map(
    before.nodes.flatMap((node) => (node.kind === 'control' ? [[rename(node.name), node] as const] : [])),
  );
  const adds: UpgradeStep[] = [];
  const nodeChanges: UpgradeStep[] = [];
  const linkChanges: UpgradeStep[] = [];
  const remaps: UpgradeStep[] = [];
  const oldOf = new Map([...pairs].map(([from, to]) => [to, from]));
  now.items.forEach((item, index) => {
    if (!kept.has(index)) {
      adds.push({ kind: 'add', steps: [item.step, ...item.details] });
      return;
    }
    const was = renamedItem(old.items[oldOf.get(index) ?? -1] as RigItem, rename);
    const changes = isNodeItem(item) ? nodeChanges : linkChanges;
    const keys = changedKeys(was.step, item.step);
    if (keys.length > 0) changes.push({ kind: 'set', step: item.step, keys });
    if (!same(was.details, item.details)) {
      changes.push({ kind: 'details', name: item.step.name, steps: item.details });
    }
  });
  for (const node of after.nodes) {
    if (node.kind !== 'control') continue;
    for (const [from, to] of renamedAttributes(controls.get(node.name), node)) {
      remaps.push({ kind: 'remap', name: node.name, from, to });
    }
  }
  const going = removed.map(({ step }) => rename(step.name));
  const links = removed.filter((item) => !isNodeItem(item)).map(({ step }) => rename(step.name));
  const nodes = going.filter((name) => !links.includes(name));
  const removes = [...links, ...nodes.reverse()].map((name): UpgradeStep => ({ kind: 'remove', name }));

  const leaving = new Set(going);
  const present = [
    ...old.items.map(({ step }) => rename(step.name)).filter((name) => !leaving.has(name)),
    ...now.items.filter((_, index) => !kept.has(index)).map(({ step }) => step.name),
  ];
  const order = planOrder(
    present,
    now.items.map(({ step }) => step.name),
  );
  const scene: UpgradeStep[] = same(old.scene, now.scene) ? [] : [{ kind: 'scene', step: now.scene }];
  return {
    from: scriptHash(before),
    to: scriptHash(after),
    steps: [...scene, ...renaming, ...adds, ...nodeChanges, ...linkChanges, ...removes, ...order, ...remaps],
  };
}
