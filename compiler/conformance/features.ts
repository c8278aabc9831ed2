import type { PoseValues } from '../rig/Rig';
import { FEATURE_TEXTS } from './generated/featureTexts';

/** One thing that an adapter must get right: a small recipe and poses that show it, controls by their ids. */
export interface Feature {
  readonly id: string;
  readonly summary: string;
  readonly recipe: string;
  readonly poses: readonly PoseValues[];
}

/** The whole rig moved, turned and scaled, so that nothing can pass that works at the origin only. */
const ROOT = { root: { tx: 12, ty: -3, tz: 5, rx: 20, ry: 75, rz: -10, sx: 1.5, sy: 1.5, sz: 1.5 } } as const;

const turns: readonly PoseValues[] = [
  { grip: { tx: 1, ty: 2, tz: -3, rx: 30, ry: 50, rz: -70, sx: 1.5, sy: 0.8, sz: 2 } },
  { ...ROOT, grip: { rx: -170, ry: 89, rz: 120 } },
];
const followed: readonly PoseValues[] = [
  { one: { tx: 3, ry: 40, rz: 10, sx: 2 }, two: { ty: 2, rx: -35 }, three: { tz: 4, rz: 100, sy: 0.5 } },
  { ...ROOT, one: { rx: 80, mix: 0.75 }, two: { rx: -120, ry: 20 }, three: { ty: -6 } },
];
const reached: readonly PoseValues[] = [
  { goal: { ty: 8, tz: 4 } },
  { goal: { tx: 6, ty: 5, tz: -9 }, pole: { tx: 15, tz: -30 } },
  { goal: { ty: -20, stretch: 1 } },
  { goal: { ty: -20, stretch: 0.5, swing: 40 } },
  { goal: { ty: 9, reach: 0.4, swing: -75, lead: 0.5 }, base: { ry: 30, rz: 15 } },
  { ...ROOT, goal: { ty: 14, tx: 3, lead: -0.7 }, base: { tx: 1, rx: 25 } },
];
const curved: readonly PoseValues[] = [
  { 'back.high': { tx: 6, tz: 4, ry: 60 } },
  { 'back.low': { ry: -40, tx: -2 }, 'back.middle': { tz: 5 }, 'back.high': { ty: 8, rz: 30 } },
  { ...ROOT, 'back.high': { ty: -6, rx: 45, stretch: 0.5, volume: 0.5 } },
];
const spaced: readonly PoseValues[] = [0, 1, 2].map((space) => ({
  ...ROOT,
  low: { ry: 40, tx: 2 },
  high: { rx: 25, tz: 1 },
  hand: { space, tx: 1, rz: 20 },
}));
const driven: readonly PoseValues[] = [-3, -0.5, 0.5, 1.7, 4].map((open) => ({ ...ROOT, grip: { open } }));
const rolled: readonly PoseValues[] = [
  { 'leg.goal': { roll: 20 } },
  { 'leg.goal': { roll: 55, bank: 10, ty: 2 } },
  { ...ROOT, 'leg.goal': { roll: -25, bank: -15, ry: 30 }, 'foot.toes': { rz: 20 } },
];

const POSES: Readonly<Record<string, readonly [string, readonly PoseValues[]]>> = {
  channels: [
    'Channels of a control with a lock and limits.',
    [
      { grip: { tx: 9, ty: 2, ry: 45, rx: 30, sz: 0.1 } },
      { ...ROOT, grip: { tx: -9, rz: 400, sx: 2, sy: -1, sz: 3 } },
    ],
  ],
  order_xyz: ['Rotation order xyz.', turns],
  order_xzy: ['Rotation order xzy.', turns],
  order_yxz: ['Rotation order yxz.', turns],
  order_yzx: ['Rotation order yzx.', turns],
  order_zxy: ['Rotation order zxy.', turns],
  order_zyx: ['Rotation order zyx.', turns],
  constrain_parent: ['A parent constraint with one source, scale and shear included.', followed],
  constrain_point: ['A point constraint.', followed],
  constrain_orient: ['An orient constraint.', followed],
  constrain_scale: ['A scale constraint.', followed],
  constrain_weights: ['Three weighted sources: the average of places, rotations and scales.', followed],
  constrain_blend: ['Two sources weighed by an attribute.', followed],
  constrain_no_offset: ['A constraint that keeps no offset.', followed],
  constrain_aim: ['An aim constraint without an up node: the shortest arc.', followed],
  constrain_aim_up: ['An aim constraint with an up node.', followed],
  constrain_aim_axis: ['An aim constraint that keeps no offset: its axes count.', followed],
  space_all: ['Spaces that carry a control.', spaced],
  space_turn: ['Spaces that only turn a control.', spaced],
  drive_linear: ['A driver with straight pieces that holds beyond its ends.', driven],
  drive_smooth: ['A driver with smooth pieces.', driven],
  drive_extend: ['A driver that runs on beyond its ends.', driven],
  drive_channel: [
    'A driver that reads a channel: a wheel that rolls.',
    [{ root: { tz: 25 } }, { root: { tz: -90, ry: 30 } }],
  ],
  two_bone: ['Two bones: goal, pole, blend, unreachable goals.', reached],
  two_bone_straight: ['Two bones that are straight at rest.', reached],
  two_bone_stretch: ['Two bones that stretch within a limit.', reached],
  two_bone_soft: ['Two bones with soft reach.', reached],
  two_bone_swing: ['Two bones whose bend is swung by an attribute.', reached],
  reach: ['Three bones that fold together, with bias and stretch.', reached],
  spline_length: ['A spline chain that keeps its length, with twist between its ends.', curved],
  spline_stretch: ['A spline chain that stretches and keeps its volume.', curved],
  twist: [
    'Twist joints on both bones of an arm.',
    [
      { 'arm.s_fk': { rx: 70, rz: 20 }, 'arm.e_fk': { rx: -100, ry: 15 } },
      { ...ROOT, 'arm.goal': { reach: 1, tx: 20, rx: 90 } },
    ],
  ],
  aim: [
    'Aim solvers, free and upright.',
    [
      { goal: { tx: 20, ty: 15, tz: -10 } },
      { ...ROOT, base: { ry: -40, rx: 10 }, goal: { tx: -30, follow: 0.5 } },
    ],
  ],
  foot_roll: ['A foot that rolls and banks.', rolled],
  mirror: [
    'Both sides of an arm: equal values give mirrored poses.',
    ['left', 'right'].map((side) => ({
      [`arm.${side}.goal`]: { reach: 0 },
      [`arm.${side}.s_fk`]: { rx: 20, ry: 10, rz: -30 },
      [`arm.${side}.m_fk`]: { rz: 50 },
    })),
  ],
  scene_axes: [
    'A scene with z up and metres.',
    [{ root: { tx: 1, rz: 90 }, 'arm.goal': { tx: -0.05, tz: 0.05, reach: 0.5 } }],
  ],
  guide_line_and_notes: [
    'A guide line between two moving ends, and notes.',
    [{ grip: { rx: 40 }, far: { ty: 5 } }],
  ],
  mesh: ['A mesh with its skin and a morph target.', [{ grip: { smile: 0.5 } }, { grip: { smile: 7 } }]],
};

/** Every feature of the kit, in the order of its files. */
export const features: readonly Feature[] = Object.entries(POSES).map(([id, [summary, poses]]) => ({
  id,
  summary,
  recipe: FEATURE_TEXTS[id] ?? '',
  poses: [{}, ...poses],
}));
