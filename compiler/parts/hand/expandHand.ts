import { jointNumber } from '../../expand/jointIds';
import type { ChainEntry, ConstraintEntry, ControlEntry, DriverEntry } from '../../expand/primitives';
import { chainEntry } from '../chainEntry';
import { turnControl } from '../turnControl';
import type { ExpandPart } from '../types';

/** Where a digit lies across the hand, −1 to 1 from the first to the last; 0 for an only one. */
function placeAcross(index: number, count: number): number {
  return count < 2 ? 0 : (2 * index) / (count - 1) - 1;
}

/**
 * A chain and joint controls for each digit, and a control whose attributes turn them together: `curl` folds every
 * joint, `spread` turns the roots apart, `cup` rolls the outer roots toward each other.
 */
export const expandHand: ExpandPart<'hand'> = ({ id, side }, part) => {
  const hand = `${id}.digits`;
  const digits = Object.entries(part.digits);
  const chains: Record<string, ChainEntry> = {};
  const constraints: Record<string, ConstraintEntry> = {};
  const drivers: Record<string, DriverEntry> = {};
  const note = (what: string) => ({ default: 0, min: -1, max: 1, note: what });
  const controls: Record<string, ControlEntry> = {
    [hand]: {
      side,
      at: part.at ?? part.parent,
      parent: part.parent,
      shape: 'diamond',
      channels: { move: { locked: true }, turn: { locked: true }, scale: { locked: true } },
      attributes: {
        curl: note('folds all digits'),
        spread: note('spreads the digits'),
        cup: note('rolls the outer digits together'),
      },
    },
  };
  const drive = (name: string, target: string, channel: 'rx' | 'ry' | 'rz', degrees: number): void => {
    if (degrees === 0) return;
    drivers[`${target}_${name}`] = {
      side,
      input: `${hand}.${name}`,
      target,
      channel,
      keys: [
        [-1, -degrees],
        [1, degrees],
      ],
    };
  };

  digits.forEach(([name, points], index) => {
    const chain = `${id}.${name}`;
    const names = points.map((_, joint) => jointNumber(joint, points.length));
    chains[chain] = chainEntry(side, { points, names }, part);
    const across = placeAcross(index, digits.length);
    let parent = part.parent;
    names.slice(0, -1).forEach((joint, depth) => {
      const turned = `${chain}.${joint}`;
      const control = `${turned}_fk`;
      controls[control] = turnControl(turned, { side, parent, order: part.rotation_order, size: 0.8 });
      constraints[`${turned}_turn`] = { side, kind: 'orient', target: turned, sources: { [control]: 1 } };
      drive('curl', control, 'rz', part.curl ?? 70);
      if (depth === 0) {
        drive('spread', control, 'ry', across * (part.spread ?? 20));
        drive('cup', control, 'rx', -across * (part.cup ?? 15));
      }
      parent = control;
    });
  });
  return { chains, controls, constraints, drivers };
};
