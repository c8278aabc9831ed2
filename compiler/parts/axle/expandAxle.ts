import type { Channel } from '../../rig/Rig';
import { chainEntry } from '../chainEntry';
import type { ExpandPart } from '../types';

const FREE: Readonly<Record<'wheel' | 'hinge' | 'slider', Channel>> = {
  wheel: 'rx',
  hinge: 'rx',
  slider: 'tx',
};
const ALL: readonly Channel[] = ['tx', 'ty', 'tz', 'rx', 'ry', 'rz', 'sx', 'sy', 'sz'];

/**
 * One joint whose x axis lies along a line, and a control with one freedom: turning about the line or sliding along
 * it. A wheel may roll with the way that a channel of another control makes.
 */
export const expandAxle: ExpandPart<'axle'> = ({ id, side }, part) => {
  const motion = part.motion ?? 'hinge';
  const free = FREE[motion];
  const hub = `${id}.hub`;
  const control = `${id}.turn`;
  const range = motion === 'wheel' ? {} : { [free]: { min: part.min ?? 0, max: part.max ?? 90 } };
  const locked = ALL.filter((channel) => channel !== free).map(
    (channel) => [channel, { locked: true }] as const,
  );
  const radius = part.radius ?? 1;
  return {
    chains: {
      [id]: chainEntry(side, { points: [part.at, part.along], names: ['hub', 'end'] }, part),
    },
    controls: {
      [control]: {
        side,
        at: hub,
        align: hub,
        ...(part.parent === undefined ? {} : { parent: part.parent }),
        shape: part.shape ?? 'ring',
        channels: { ...Object.fromEntries(locked), ...range },
      },
    },
    constraints: { [`${hub}_follow`]: { side, kind: 'parent', target: hub, sources: { [control]: 1 } } },
    ...(motion === 'wheel' && part.roll_with !== undefined
      ? {
          drivers: {
            [`${id}.roll`]: {
              side,
              input: part.roll_with,
              target: control,
              channel: 'rx',
              // One turn for each circumference.
              keys: [
                [0, 0],
                [2 * Math.PI * radius, 360],
              ],
              beyond: 'extend',
            },
          },
        }
      : {}),
  };
};
