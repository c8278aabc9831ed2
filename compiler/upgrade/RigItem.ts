import { planSteps } from '../plan/planSteps';
import type { Rig } from '../rig/Rig';
import type { Step } from '../slipway/Step';
import { type KeyRule, VERBS, type Verb } from '../slipway/verbs';

/** A node or link of a rig as its step, with the steps that say more about it. */
export interface RigItem {
  readonly step: Step;
  readonly details: readonly Step[];
}

/** A rig as its scene and its items, in the order of its script. */
export interface RigItems {
  readonly scene: Step;
  readonly items: readonly RigItem[];
}

/** Lists what a rig consists of. Nothing here knows the verbs one by one: their table says what each holds. */
export function itemsOf(rig: Rig): RigItems {
  const [scene, ...steps] = planSteps(rig);
  const items: { step: Step; details: Step[] }[] = [];
  const byName = new Map<string, { step: Step; details: Step[] }>();
  for (const step of steps) {
    if (VERBS[step.verb].name === 'new') {
      const item = { step, details: [] };
      items.push(item);
      byName.set(step.name, item);
    } else byName.get(step.name)?.details.push(step);
  }
  return { scene: scene as Step, items };
}

/** The steps of a rig again, every item followed by its details. */
export function stepsOf({ scene, items }: RigItems): readonly Step[] {
  return [scene, ...items.flatMap(({ step, details }) => [step, ...details])];
}

const NODE_VERBS: ReadonlySet<Verb> = new Set(['group', 'joint', 'control', 'note', 'line', 'geometry']);

/** Whether an item is a node, not a link between nodes. */
export function isNodeItem({ step }: RigItem): boolean {
  return NODE_VERBS.has(step.verb);
}

/** The stable id of an item. */
export function idOf({ step }: RigItem): string {
  return 'id' in step.values ? step.values.id : '';
}

function renameIn(kind: KeyRule['kind'], value: unknown, rename: (name: string) => string): unknown {
  if (value === null) return null;
  switch (kind) {
    case 'reference':
    case 'parent':
      return rename(value as string);
    case 'references':
      return (value as readonly string[]).map(rename);
    case 'blend':
    case 'amount':
      return typeof value === 'object'
        ? { ...value, control: rename((value as { readonly control: string }).control) }
        : value;
    default:
      return value;
  }
}

/** The same step with every name in it, its own too, replaced. */
export function renamedStep(step: Step, rename: (name: string) => string): Step {
  const keys: Readonly<Record<string, KeyRule>> = VERBS[step.verb].keys;
  const values: Record<string, unknown> = {};
  for (const [key, value] of Object.entries(step.values)) {
    const rule = keys[key];
    values[key] = rule === undefined ? value : renameIn(rule.kind, value, rename);
  }
  return { verb: step.verb, name: rename(step.name), values } as unknown as Step;
}

/** The same item with every name in it replaced. */
export function renamedItem(item: RigItem, rename: (name: string) => string): RigItem {
  return {
    step: renamedStep(item.step, rename),
    details: item.details.map((step) => renamedStep(step, rename)),
  };
}
