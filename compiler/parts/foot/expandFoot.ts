import type { PartEntry } from '../../expand/primitives';
import { mirrorId, sideOfId } from '../../expand/sides';
import { chainEntry } from '../chainEntry';
import { limbIds } from '../limb/limbIds';
import { turnControl } from '../turnControl';
import type { ExpandPart, PartContext } from '../types';

type Leg = Extract<PartEntry, { readonly kind: 'limb' | 'leg_three' }>;

/** The leg that a foot names: its entry, and its id on the foot's side. Null when there is no such leg. */
function findLeg(
  { parts, side }: PartContext,
  name: string,
): { readonly id: string; readonly leg: Leg } | null {
  const leg = parts[name];
  if (leg?.kind !== 'limb' && leg?.kind !== 'leg_three') return null;
  const option = leg.side ?? sideOfId(name);
  if (option === 'centre' || sideOfId(name) !== 'centre') return { id: name, leg };
  const left = `${name}.left`;
  return { id: side === 'right' || option === 'right' ? mirrorId(left) : left, leg };
}

/**
 * Ball and toe joints at the end of a leg. The leg no longer follows its goal control itself but a helper that the
 * control's attributes roll and bank about the points of the sole; a second helper, which the ball does not lift,
 * keeps the toes on the floor.
 */
export const expandFoot: ExpandPart<'foot'> = (context, part) => {
  const { id, side } = context;
  const found = findLeg(context, part.leg);
  // Named in the leg's own words when it is missing, so that the reference is found wanting where it was written.
  const ids = found === null ? null : limbIds(found.id, found.leg);
  const joints = ids?.joints ?? [];
  const ankle = joints[joints.length - 1] ?? `${part.leg}.end`;
  const goal = ids?.goal ?? `${part.leg}.goal`;
  const reach = ids?.reach ?? `${goal}.reach`;
  const turner = ids?.turners[joints.length - 1] ?? `${ankle}_fk`;
  const ball = `${id}.ball`;
  const rollAnkle = `${id}.roll_ankle`;
  const rollToes = `${id}.roll_toes`;
  const toeBase = `${id}.toe_base`;
  const helper = (point: string, parent: string) => ({
    side,
    role: 'helper',
    points: [point],
    names: ['joint'],
    parent,
    orient: { like: point },
  });

  return {
    chains: {
      [id]: chainEntry(side, { points: [part.ball, part.toe], names: ['ball', 'toe'], parent: ankle }, part),
      [rollAnkle]: helper(ankle, goal),
      [rollToes]: helper(ball, goal),
      [toeBase]: helper(ball, ankle),
    },
    controls: {
      [`${id}.toes`]: turnControl(ball, {
        side,
        parent: `${toeBase}.joint`,
        order: part.rotation_order,
        shape: 'pin',
      }),
    },
    solvers: {
      [`${id}.roll`]: {
        side,
        kind: 'foot_roll',
        foot: goal,
        ankle: `${rollAnkle}.joint`,
        toes: `${rollToes}.joint`,
        heel: part.heel,
        ball: part.ball,
        toe: part.toe,
        inner: part.inner,
        outer: part.outer,
        roll: `${goal}.roll`,
        bank: `${goal}.bank`,
        break: `${goal}.toe_break`,
      },
    },
    constraints: {
      [`${id}.ankle_turn`]: {
        side,
        kind: 'orient',
        target: ankle,
        sources: { [`${rollAnkle}.joint`]: 1, [turner]: 1 },
        blend: reach,
      },
      [`${id}.toe_base_turn`]: {
        side,
        kind: 'orient',
        target: `${toeBase}.joint`,
        sources: { [`${rollToes}.joint`]: 1, [ankle]: 1 },
        blend: reach,
      },
      [`${ball}_turn`]: { side, kind: 'orient', target: ball, sources: { [`${id}.toes`]: 1 } },
    },
    adjusts:
      ids === null
        ? {}
        : {
            controls: {
              [goal]: {
                attributes: {
                  roll: { default: 0, min: -90, max: 120, note: 'rolls over heel, ball and toe, in degrees' },
                  bank: {
                    default: 0,
                    min: -60,
                    max: 60,
                    note: 'leans the foot inward or outward, in degrees',
                  },
                  toe_break: {
                    default: part.break ?? 30,
                    min: 0,
                    max: 90,
                    note: 'roll at which the toes begin to lift, in degrees',
                  },
                },
              },
            },
            solvers: { [ids.solver]: { goal: `${rollAnkle}.joint` } },
            constraints: { [ids.endTurn]: { omit: true } },
          },
  };
};
