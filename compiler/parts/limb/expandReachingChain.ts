import type { ControlEntry, MadePart, PartEntry, SolverEntry } from '../../expand/primitives';
import type { Side } from '../../rig/Rig';
import { chainEntry } from '../chainEntry';
import { turnControl } from '../turnControl';
import type { LimbIds } from './limbIds';

type Leg = Extract<PartEntry, { readonly kind: 'limb' | 'leg_three' }>;

/** The attributes of a goal control that steer how the chain follows it. */
function goalAttributes(part: Leg): NonNullable<ControlEntry['attributes']> {
  const stretch = part.stretch
    ? {
        stretch: {
          default: part.stretch.value ?? 0,
          min: 0,
          max: 1,
          note: 'lets the bones grow to the goal',
        },
      }
    : {};
  return {
    reach: {
      default: part.reach ?? 1,
      min: 0,
      max: 1,
      note: '0 turns joint by joint, 1 follows this control',
    },
    swing: { default: 0, min: -180, max: 180, note: 'swings the bend about the line to the goal' },
    ...stretch,
  };
}

/**
 * What a limb and a three-segment leg have in common: a chain, a control for each joint, a goal and a pole control,
 * the solver between them, and constraints that turn the joints. The goal control's attribute `reach` blends between
 * both ways, for the bones by the solver and for the last joint's turn by its constraint.
 */
export function expandReachingChain(
  side: Side,
  id: string,
  part: Leg,
  ids: LimbIds,
  solver: Pick<SolverEntry, 'kind' | 'bias'>,
  attributes: NonNullable<ControlEntry['attributes']>,
): MadePart {
  const { joints, turners, goal, pole, reach } = ids;
  const order = part.rotation_order;
  const names = joints.map((joint) => joint.slice(id.length + 1));
  const last = joints.length - 1;
  const follows = part.goal_parent === undefined ? {} : { parent: part.goal_parent };
  const goalName = goal.slice(id.length + 1);
  const spacesOf = (name: string) => {
    const spaces = part.spaces?.[name];
    return spaces === undefined ? {} : { spaces };
  };

  const controls: Record<string, ControlEntry> = {};
  joints.forEach((joint, index) => {
    controls[turners[index] ?? ''] = turnControl(joint, {
      side,
      parent: index === 0 ? part.parent : turners[index - 1],
      order,
      limits: part.limits?.[names[index] ?? ''],
    });
  });
  controls[goal] = {
    side,
    at: joints[last] ?? '',
    ...follows,
    shape: 'box',
    ...(order === undefined ? {} : { rotation_order: order }),
    channels: { scale: { locked: true } },
    attributes: { ...goalAttributes(part), ...attributes },
    ...spacesOf(goalName),
  };
  controls[pole] = {
    side,
    pole_of: {
      joints: [joints[0] ?? '', joints[1] ?? '', joints[last] ?? ''],
      distance: part.pole?.distance ?? 1,
      ...(part.bend ? { bend: part.bend } : {}),
    },
    ...follows,
    shape: 'diamond',
    channels: { turn: { locked: true }, scale: { locked: true } },
    ...spacesOf('pole'),
  };

  const turns = joints.map((joint, index) => {
    const turner = turners[index] ?? '';
    const sources = index === last ? { [goal]: 1, [turner]: 1 } : { [turner]: 1 };
    const blend = index === last ? { blend: reach } : {};
    return [`${joint}_turn`, { side, kind: 'orient', target: joint, sources, ...blend }] as const;
  });

  const { points, parent, role, mirror, limits } = part;
  const options = {
    ...(parent === undefined ? {} : { parent }),
    ...(role === undefined ? {} : { role }),
    ...(mirror === undefined ? {} : { mirror }),
    ...(order === undefined ? {} : { rotation_order: order }),
    ...(limits === undefined ? {} : { limits }),
  };
  return {
    chains: { [id]: chainEntry(side, { points, names: [...names] }, options) },
    controls,
    solvers: {
      [ids.solver]: {
        side,
        ...solver,
        joints: [...joints],
        goal,
        pole,
        blend: reach,
        swing: `${goal}.swing`,
        ...(part.stretch ? { stretch: `${goal}.stretch`, stretch_limit: part.stretch.limit ?? 1.5 } : {}),
        soft: part.soft ?? 0,
      },
    },
    constraints: Object.fromEntries(turns),
    ...(part.pole?.guide_line === false
      ? {}
      : { guide_lines: { [`${id}.pole_line`]: { side, from: pole, to: joints[1] ?? '' } } }),
  };
}
