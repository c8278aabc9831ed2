import type { ChainSpecification } from '../expand/types';
import type { TurnChannel, ValueRange } from '../rig/Rig';

/** The one way in which a joint may turn. */
export interface Hinge {
  readonly channel: TurnChannel;
  readonly range: ValueRange;
  /** The joint's name in its chain, under which limits are written. */
  readonly name: string;
}

const TURNS: readonly TurnChannel[] = ['rx', 'ry', 'rz'];

/** The hinge of a joint whose limits leave it only one way to turn; null for every other joint. */
export function hingeOf(chain: ChainSpecification, joint: string): Hinge | null {
  const name = joint.slice(chain.id.length + 1);
  const limits = chain.limits[name];
  if (!limits) return null;
  const free = TURNS.filter((channel) => {
    const range = limits[channel];
    return range === undefined || range.min !== 0 || range.max !== 0;
  });
  const [channel] = free;
  return channel && free.length === 1
    ? { channel, range: limits[channel] ?? { min: null, max: null }, name }
    : null;
}
