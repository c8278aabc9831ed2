import type { ControlEntry } from '../../expand/primitives';
import type { ExpandPart } from '../types';

const NAMES = ['upper', 'lower', 'end'] as const;
type Three<T> = readonly [T, T, T];

/**
 * A chain of three joints that can be turned joint by joint or made to follow a goal. The goal control's
 * attribute `reach` blends between both ways, for the two bones by the solver and for the last joint's turn by
 * its constraint.
 */
export const expandLimb: ExpandPart<'limb'> = ({ id, side }, part) => {
  const names = NAMES.map((fallback, index) => {
    const point = part.points[index];
    return part.names?.[index] ?? (typeof point === 'string' ? point.replaceAll('.', '_') : fallback);
  }) as unknown as Three<string>;
  const joints = names.map((name) => `${id}.${name}`) as unknown as Three<string>;
  const turners = joints.map((joint) => `${joint}_fk`) as unknown as Three<string>;
  const goal = `${id}.${part.goal ?? 'goal'}`;
  const pole = `${id}.pole`;
  const reach = `${goal}.reach`;
  const follows = part.goal_parent === undefined ? {} : { parent: part.goal_parent };
  const order = part.rotation_order ? { rotation_order: part.rotation_order } : {};

  const turner = (index: 0 | 1 | 2): ControlEntry => {
    const parent = index === 0 ? part.parent : turners[(index - 1) as 0 | 1];
    return {
      side,
      at: joints[index],
      align: joints[index],
      ...(parent === undefined ? {} : { parent }),
      shape: 'ring',
      ...order,
      channels: { move: { locked: true }, scale: { locked: true } },
    };
  };

  return {
    chains: {
      [id]: {
        side,
        role: part.role ?? 'skin',
        points: part.points,
        names: [...names],
        ...(part.parent === undefined ? {} : { parent: part.parent }),
        ...(part.mirror ? { mirror: part.mirror } : {}),
        ...order,
      },
    },
    controls: {
      [turners[0]]: turner(0),
      [turners[1]]: turner(1),
      [turners[2]]: turner(2),
      [goal]: {
        side,
        at: joints[2],
        ...follows,
        shape: 'box',
        ...order,
        channels: { scale: { locked: true } },
        attributes: {
          reach: {
            default: part.reach ?? 1,
            min: 0,
            max: 1,
            note: '0 turns joint by joint, 1 follows this control',
          },
        },
      },
      [pole]: {
        side,
        pole_of: {
          joints: [...joints],
          distance: part.pole?.distance ?? 1,
          ...(part.bend ? { bend: part.bend } : {}),
        },
        ...follows,
        shape: 'diamond',
        channels: { turn: { locked: true }, scale: { locked: true } },
      },
    },
    solvers: { [`${id}.bend`]: { side, kind: 'two_bone', joints: [...joints], goal, pole, blend: reach } },
    constraints: {
      [`${joints[0]}_turn`]: { side, kind: 'orient', target: joints[0], sources: { [turners[0]]: 1 } },
      [`${joints[1]}_turn`]: { side, kind: 'orient', target: joints[1], sources: { [turners[1]]: 1 } },
      [`${joints[2]}_turn`]: {
        side,
        kind: 'orient',
        target: joints[2],
        sources: { [goal]: 1, [turners[2]]: 1 },
        blend: reach,
      },
    },
    ...(part.pole?.guide_line === false
      ? {}
      : { guide_lines: { [`${id}.pole_line`]: { side, from: pole, to: joints[1] } } }),
  };
};
