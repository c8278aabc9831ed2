import { CHANNELS } from '../pose/channelValues';
import type { Channel, ControlNode, NumberOrAttribute, PoseValues, RigAttribute } from '../rig/Rig';
import type { TrialBench } from './TrialBench';

/** A pose that is still being put together. */
export type PoseDraft = Record<string, Record<string, number>>;

/** Part of the rig's size by which a nudge moves, and degrees by which it turns. */
const NUDGE_MOVE = 0.04;
const NUDGE_TURN = 24;
/** Multiples of the golden ratio spread evenly over 0 … 1 whatever their number: varied values without chance. */
const GOLDEN = 0.618033988749895;

/** Adds values to a control of a draft. */
export function put(draft: PoseDraft, control: string, values: Readonly<Record<string, number>>): void {
  const own = Object.hasOwn(draft, control) ? draft[control] : undefined;
  if (own) Object.assign(own, values);
  else draft[control] = { ...values };
}

/** Both poses together; where both give a value, the second's. */
export function joinPoses(first: PoseValues, second: PoseValues): PoseValues {
  const draft: PoseDraft = {};
  for (const pose of [first, second]) {
    for (const [control, values] of Object.entries(pose)) put(draft, control, values);
  }
  return draft;
}

function within(value: number, min: number | null, max: number | null): number {
  return Math.min(max ?? Infinity, Math.max(min ?? -Infinity, value));
}

/** Whether the channel can take any value. */
export function isFree({ channels }: ControlNode, channel: Channel): boolean {
  const rule = channels[channel];
  return rule === undefined || (!rule.locked && rule.min === null && rule.max === null);
}

/** Value −1 … 1 number `index` of an even spread. */
export function spread(index: number): number {
  return 2 * ((index * GOLDEN) % 1) - 1;
}

/** Moves and turns for the unlocked channels of one control, within its limits; scale stays. */
export function nudge(control: ControlNode, seed: number, size: number): Readonly<Record<string, number>> {
  const values: Record<string, number> = {};
  CHANNELS.forEach((channel, index) => {
    const rule = control.channels[channel];
    if (channel.startsWith('s') || rule?.locked) return;
    const most = channel.startsWith('t') ? NUDGE_MOVE * size : NUDGE_TURN;
    values[channel] = within(spread(seed + index) * most, rule?.min ?? null, rule?.max ?? null);
  });
  return values;
}

/** A pose that nudges every control, each differently; the same for the same seed. Attributes keep their defaults. */
export function nudgedPose(bench: Pick<TrialBench, 'controls' | 'size'>, seed: number): PoseValues {
  const draft: PoseDraft = {};
  let next = seed;
  for (const control of bench.controls.values()) {
    next += CHANNELS.length;
    put(draft, control.name, nudge(control, next, bench.size));
  }
  return draft;
}

/** The attribute that an amount reads; undefined for a plain number or an attribute there is not. */
export function attributeOf(
  amount: NumberOrAttribute | null,
  { controls }: Pick<TrialBench, 'controls'>,
): { readonly control: string; readonly attribute: RigAttribute } | undefined {
  if (amount === null || typeof amount === 'number') return undefined;
  const attribute = controls.get(amount.control)?.attributes.find(({ name }) => name === amount.attribute);
  return attribute && { control: amount.control, attribute };
}

/** An amount's value in a pose, limits applied. */
export function amountIn(
  amount: NumberOrAttribute,
  pose: PoseValues,
  bench: Pick<TrialBench, 'controls'>,
): number {
  if (typeof amount === 'number') return amount;
  const found = attributeOf(amount, bench);
  if (!found) return 0;
  const values = Object.hasOwn(pose, found.control) ? pose[found.control] : undefined;
  const { name, min, max } = found.attribute;
  return within(values?.[name] ?? found.attribute.default, min, max);
}

/** Sets an amount in a draft as near to `value` as its limits allow; a plain number stays what it is. */
export function putAmount(
  draft: PoseDraft,
  amount: NumberOrAttribute,
  value: number,
  bench: Pick<TrialBench, 'controls'>,
): void {
  const found = attributeOf(amount, bench);
  if (!found) return;
  const { name, min, max } = found.attribute;
  put(draft, found.control, { [name]: within(value, min, max) });
}

/** A pose, at rest otherwise, in which every solver and blended constraint is as much at work as it can be. */
export function allAtWork(bench: TrialBench): PoseValues {
  const draft: PoseDraft = {};
  for (const solver of bench.rig.solvers) if ('blend' in solver) putAmount(draft, solver.blend, 1, bench);
  return draft;
}
