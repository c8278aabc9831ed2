import { jointNumber } from '../../expand/jointIds';
import type { ChainEntry, ConstraintEntry, ControlEntry, DriverEntry } from '../../expand/primitives';
import { chainEntry } from '../chainEntry';
import { namesFor } from '../jointNames';
import { turnControl } from '../turnControl';
import type { ExpandPart } from '../types';

const FOLD = [20, 110, -120] as const;

/**
 * Three bones that fold, with rows of feathers. The attribute `fold` turns shoulder, elbow and wrist about their
 * hinges; `fan` turns each row's feathers about their roots, the last one most.
 */
export const expandWing: ExpandPart<'wing'> = ({ id, side }, part) => {
  const names = namesFor(part.points, part.names, ['upper', 'lower', 'hand', 'tip']);
  const joints = names.map((name) => `${id}.${name}`);
  const bones = joints.slice(0, 3);
  const wing = `${id}.wing`;
  const chains: Record<string, ChainEntry> = {
    [id]: chainEntry(side, { points: part.points, names: [...names] }, part),
  };
  const controls: Record<string, ControlEntry> = {};
  const constraints: Record<string, ConstraintEntry> = {};
  const drivers: Record<string, DriverEntry> = {};
  const drive = (input: string, target: string, channel: 'ry' | 'rz', degrees: number): void => {
    drivers[`${target}_${input}`] = {
      side,
      input: `${wing}.${input}`,
      target,
      channel,
      keys: [
        [0, 0],
        [1, degrees],
      ],
      beyond: 'extend',
    };
  };

  let parent = part.parent;
  bones.forEach((joint, index) => {
    const control = `${joint}_fk`;
    controls[control] = turnControl(joint, { side, parent, order: part.rotation_order });
    constraints[`${joint}_turn`] = { side, kind: 'orient', target: joint, sources: { [control]: 1 } };
    drive('fold', control, 'rz', part.fold?.[index] ?? FOLD[index] ?? 0);
    parent = control;
  });
  controls[wing] = {
    side,
    at: joints[2] ?? '',
    ...(part.parent === undefined ? {} : { parent: part.parent }),
    shape: 'cross',
    size: 1.5,
    channels: { move: { locked: true }, turn: { locked: true }, scale: { locked: true } },
    attributes: {
      fold: { default: 0, min: 0, max: 1, note: 'folds the wing' },
      fan: { default: 0, min: -1, max: 1, note: 'fans the feathers' },
    },
  };

  for (const [row, feathers] of Object.entries(part.feathers ?? {})) {
    const at = { upper: 0, lower: 1, hand: 2 }[feathers.bone ?? 'hand'];
    const bone = joints[at] ?? '';
    const boneEnd = joints[at + 1] ?? '';
    const [firstTip, lastTip] = feathers.tips;
    const count = feathers.count ?? 5;
    for (let index = 0; index < count; index += 1) {
      const share = count < 2 ? 0.5 : index / (count - 1);
      const feather = `${id}.${row}_${jointNumber(index, count)}`;
      const root = { from: bone, to: boneEnd, share };
      const tip =
        typeof firstTip === 'string' && typeof lastTip === 'string'
          ? { from: firstTip, to: lastTip, share }
          : share < 0.5
            ? firstTip
            : lastTip;
      if (tip === undefined) continue;
      const links = feathers.joints ?? 3;
      const { limits: _, parent: __, ...options } = { ...part, limits: undefined };
      chains[feather] = chainEntry(side, { points: [root, tip], joints: links, parent: bone }, options);
      let above: string = bone;
      for (let link = 0; link < links - 1; link += 1) {
        const joint = `${feather}.${jointNumber(link, links)}`;
        const control = `${joint}_fk`;
        controls[control] = turnControl(joint, {
          side,
          parent: above,
          order: part.rotation_order,
          size: 0.5,
        });
        constraints[`${joint}_turn`] = { side, kind: 'orient', target: joint, sources: { [control]: 1 } };
        if (link === 0 && share > 0) drive('fan', control, 'ry', share * (feathers.fan ?? 30));
        above = control;
      }
    }
  }
  return { chains, controls, constraints, drivers };
};
