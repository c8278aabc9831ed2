import { findSwitches } from '../match/findSwitches';
import { CHANNELS } from '../pose/channelValues';
import type { Channel, ControlNode, Rig, Side } from '../rig/Rig';
import { nodesRead } from '../rig/solverNodes';

/** A channel or attribute that an animator may change. */
export interface ChartValue {
  readonly name: string;
  /** `°`, the scene's unit, `×`, or nothing for a plain number or a choice. */
  readonly unit: string;
  readonly default: number;
  readonly min: number | null;
  readonly max: number | null;
  /** Words for 0, 1, 2 …; null for a number. */
  readonly choices: readonly string[] | null;
  readonly note: string | null;
}

/** One control as an animator looks it up. */
export interface ChartEntry {
  /** From 1, in the order of the chart; the number in the picture. */
  readonly number: number;
  readonly id: string;
  readonly name: string;
  readonly side: Side;
  readonly shape: string;
  /** Ids of what it steers: followers, solved chains' goals, ends of its guide lines. */
  readonly steers: readonly string[];
  readonly values: readonly ChartValue[];
}

/** All controls of a rig that an animator sees, in the order of the rig. */
export interface ControlChart {
  readonly character: string;
  readonly recipe: string;
  readonly house: string;
  readonly entries: readonly ChartEntry[];
}

function unitOf(channel: Channel, unit: string): string {
  return channel.startsWith('t') ? unit : channel.startsWith('r') ? '°' : '×';
}

function valuesOf(control: ControlNode, unit: string): readonly ChartValue[] {
  const channels = CHANNELS.filter((channel) => !control.channels[channel]?.locked).map((channel) => ({
    name: channel,
    unit: unitOf(channel, unit),
    default: channel.startsWith('s') ? 1 : 0,
    min: control.channels[channel]?.min ?? null,
    max: control.channels[channel]?.max ?? null,
    choices: null,
    note: null,
  }));
  const attributes = control.attributes.map(({ name, default: initial, min, max, labels, note }) => ({
    name,
    unit: '',
    default: initial,
    min,
    max,
    choices: labels,
    note,
  }));
  return [...channels, ...attributes];
}

/** For each control, by name, the names of what it steers directly. */
function steered(rig: Rig): ReadonlyMap<string, readonly string[]> {
  const steers = new Map<string, Set<string>>();
  const add = (control: string, thing: string): void => {
    const things = steers.get(control);
    if (things) things.add(thing);
    else steers.set(control, new Set([thing]));
  };
  for (const { target, sources } of rig.constraints) for (const { node } of sources) add(node, target);
  for (const solver of rig.solvers) {
    const tip =
      solver.kind === 'two_bone' ? solver.end : 'joints' in solver ? solver.joints.at(-1) : undefined;
    for (const node of nodesRead(solver))
      add(node, tip ?? (solver.kind === 'aim' ? solver.joint : solver.name));
  }
  for (const { goal, joints } of findSwitches(rig)) add(goal, joints.at(-1) ?? '');
  for (const { control, target } of rig.drivers) if (control !== target) add(control, target);
  for (const node of rig.nodes) {
    if (node.kind === 'line') add(node.from, node.to);
    else if (node.kind === 'joint' && node.parent !== null) add(node.parent, node.name);
  }
  return new Map([...steers].map(([control, things]) => [control, [...things]]));
}

/** Puts together what an animator needs to know of every control. */
export function controlChart(rig: Rig): ControlChart {
  const steers = steered(rig);
  const idOf = new Map(rig.nodes.map(({ name, id }) => [name, id]));
  const controls = rig.nodes.filter((node): node is ControlNode => node.kind === 'control' && node.shown);
  return {
    character: rig.scene.character,
    recipe: rig.scene.recipe,
    house: rig.scene.house,
    entries: controls.map((control, index) => ({
      number: index + 1,
      id: control.id,
      name: control.name,
      side: control.side,
      shape: control.shape,
      steers: (steers.get(control.name) ?? [])
        .map((name) => idOf.get(name) ?? '')
        .filter((id) => id !== '' && !id.endsWith('.seat'))
        .slice(0, 6),
      values: valuesOf(control, rig.scene.unit),
    })),
  };
}
