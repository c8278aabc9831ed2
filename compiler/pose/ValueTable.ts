import type { ControlNode, NumberOrAttribute, PoseValues, Rig } from '../rig/Rig';
import { CHANNELS } from './channelValues';

/** Where the values of one control lie in the table. */
interface ControlSlots {
  /** Place of the control in the list of nodes. */
  readonly node: number;
  /** Slot of each channel and attribute that a pose may change. */
  readonly slots: ReadonlyMap<string, number>;
}

/**
 * Every number that a pose can set, in one flat array: nine channels and the attributes of each control, and the
 * plain numbers of solvers beside them, so that whoever needs a number while evaluating reads it by its slot.
 */
export class ValueTable {
  /** Values of the present pose; the same array for the life of the table. */
  readonly values: Float64Array;
  /** Whether a node's channels may differ from rest, by its place in the list of nodes. */
  readonly moved: Uint8Array;
  readonly #rest: Float64Array;
  readonly #min: Float64Array;
  readonly #max: Float64Array;
  readonly #controls = new Map<string, ControlSlots>();
  /** First channel slot of every control, by name. */
  readonly #channelSlots = new Map<string, number>();
  readonly #attributeSlots = new Map<string, Map<string, number>>();
  readonly #constants = new Map<number, number>();

  constructor(rig: Rig, constants: readonly number[]) {
    const rest: number[] = [];
    const min: number[] = [];
    const max: number[] = [];
    const add = (value: number, low: number | null, high: number | null): number => {
      rest.push(value);
      min.push(low ?? -Infinity);
      max.push(high ?? Infinity);
      return rest.length - 1;
    };
    rig.nodes.forEach((node, index) => {
      if (node.kind === 'control') this.#addControl(node, index, add);
    });
    for (const constant of constants) {
      if (!this.#constants.has(constant)) this.#constants.set(constant, add(constant, null, null));
    }
    this.#rest = Float64Array.from(rest);
    this.#min = Float64Array.from(min);
    this.#max = Float64Array.from(max);
    this.values = Float64Array.from(rest);
    this.moved = new Uint8Array(rig.nodes.length);
  }

  #addControl(
    control: ControlNode,
    node: number,
    add: (value: number, low: number | null, high: number | null) => number,
  ): void {
    const slots = new Map<string, number>();
    for (const channel of CHANNELS) {
      const rule = control.channels[channel];
      const slot = add(channel.startsWith('s') ? 1 : 0, rule?.min ?? null, rule?.max ?? null);
      if (channel === 'tx') this.#channelSlots.set(control.name, slot);
      if (!rule?.locked) slots.set(channel, slot);
    }
    const attributes = new Map<string, number>();
    for (const { name, default: initial, min, max } of control.attributes) {
      const slot = add(initial, min, max);
      attributes.set(name, slot);
      // A channel of the same name would have been met first.
      if (!slots.has(name)) slots.set(name, slot);
    }
    this.#attributeSlots.set(control.name, attributes);
    this.#controls.set(control.name, { node, slots });
  }

  /** Slot of the first of a control's nine channels; they follow one another in the order of `CHANNELS`. */
  channelSlot(control: string): number {
    return this.#channelSlots.get(control) ?? -1;
  }

  /** Slot of a control's attribute or channel; undefined when it has neither. */
  inputSlot(control: string, input: string): number | undefined {
    const channel = CHANNELS.findIndex((name) => name === input);
    const first = this.#channelSlots.get(control);
    if (channel >= 0 && first !== undefined) return first + channel;
    return this.#attributeSlots.get(control)?.get(input);
  }

  /** Slot of a plain number given to the constructor, or of an attribute; an unknown attribute reads 0. */
  amountSlot(amount: NumberOrAttribute): number {
    if (typeof amount === 'number') return this.#constants.get(amount) ?? -1;
    return this.#attributeSlots.get(amount.control)?.get(amount.attribute) ?? this.#constants.get(0) ?? -1;
  }

  /**
   * Reads a pose: what it gives, within limits; rest for what it does not give, for what is no finite number and for
   * locked channels. Own properties only: a control may be called `constructor`, an attribute `length`.
   */
  read(pose: PoseValues): void {
    this.values.set(this.#rest);
    this.moved.fill(0);
    for (const name in pose) {
      const control = this.#controls.get(name);
      if (control === undefined || !Object.hasOwn(pose, name)) continue;
      const given = pose[name];
      for (const key in given) {
        const slot = control.slots.get(key);
        if (slot === undefined || !Object.hasOwn(given, key)) continue;
        const value = given[key];
        if (typeof value !== 'number' || !Number.isFinite(value)) continue;
        const low = this.#min[slot] as number;
        const high = this.#max[slot] as number;
        this.values[slot] = Math.min(high, Math.max(low, value));
        this.moved[control.node] = 1;
      }
    }
  }
}
