import { chainEntry } from '../chainEntry';
import type { ExpandPart } from '../types';

/** An eyeball that points at its target; targets of a pair hang on one control, so that both look at one thing. */
export const expandEye: ExpandPart<'eye'> = ({ id, side }, part) => {
  const ball = `${id}.ball`;
  const look = `${id}.look`;
  const follow = `${look}.follow`;
  return {
    chains: {
      [id]: chainEntry(
        side,
        { points: [part.at], names: ['ball'], orient: { rule: 'world' } },
        { ...part, ...(part.limits?.ball ? { limits: { ball: part.limits.ball } } : { limits: {} }) },
      ),
    },
    controls: {
      [look]: {
        side,
        at: part.look,
        ...((part.pair ?? part.parent) ? { parent: part.pair ?? part.parent } : {}),
        shape: 'cross',
        size: 0.6,
        channels: { turn: { locked: true }, scale: { locked: true } },
        attributes: {
          follow: { default: 1, min: 0, max: 1, note: '0 looks straight ahead, 1 at this control' },
        },
      },
    },
    solvers: { [`${id}.aim`]: { side, kind: 'aim', joints: [ball], goal: look, blend: follow } },
    guide_lines: { [`${id}.look_line`]: { side, from: look, to: ball } },
  };
};
