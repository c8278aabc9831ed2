import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { samples, TRIAL_NAMES, type TrialName } from '@/compiler';
import { multiplyQuat } from '@/compiler/math/quat';
import { add } from '@/compiler/math/vec3';
import type { Channel, ControlNode, Rig, RigConstraint, RigDriver, RigNode, Vec3 } from '@/compiler/rig/Rig';
import { runTrials } from '@/compiler/trials/runTrials';
import type { TrialIntent } from '@/compiler/trials/TrialIntent';
import { trialSubject } from './trialSubject';

const everyPart = readFileSync('compiler/parts/every_part.example.yaml', 'utf8');

const failedTrials = (rig: Rig, intent: TrialIntent): readonly TrialName[] =>
  runTrials(rig, intent)
    .filter(({ passed }) => !passed)
    .map(({ trial }) => trial);

describe.each([...samples, { id: 'every part', text: everyPart }])('the trials of $id', ({ text }) => {
  const { rig, intent } = trialSubject(text);
  const results = runTrials(rig, intent);

  it('run in their order and all pass', () => {
    expect(results.map(({ trial }) => trial)).toEqual(TRIAL_NAMES);
    expect(results.filter(({ passed }) => !passed)).toEqual([]);
  });

  it('measure finite numbers, and name nothing when they pass', () => {
    for (const { measured, tolerance, worst } of results) {
      expect(measured).toBeGreaterThanOrEqual(0);
      expect(measured).toBeLessThanOrEqual(tolerance);
      expect(worst).toEqual([]);
    }
  });

  it('give the same numbers each time', () => expect(runTrials(rig, intent)).toEqual(results));
});

it('tries everything there is in a rig that has every part', () => {
  const { rig, intent } = trialSubject(everyPart);
  for (const { trial, checked } of runTrials(rig, intent))
    expect([trial, checked > 0]).toEqual([trial, true]);
});

/** One limb on each side, a neck with a limit, a spaced control, and guide lines: each trial has something to try. */
const SOUND = `
format: 1
recipe: sound
landmarks:
  hips: { at: [0, 50, 0] }
  chest: { at: [0, 80, 1] }
  crown: { at: [0, 100, 0] }
  shoulder: { side: left, at: [10, 78, 0] }
  elbow: { side: left, at: [25, 70, -3] }
  wrist: { side: left, at: [40, 62, 0] }
parts:
  root: { kind: root }
  arm: { kind: limb, side: both, parent: trunk.chest, points: [shoulder, elbow, wrist], goal: hand }
chains:
  trunk: { points: [hips, chest, crown] }
controls:
  body: { at: hips, parent: root }
  head:
    at: trunk.chest
    align: trunk.chest
    parent: body
    spaces: [root]
    channels: { move: { locked: true }, scale: { locked: true }, rz: { min: -40, max: 40 } }
constraints:
  trunk_follow: { kind: parent, target: trunk.hips, sources: { body: 1 } }
  head_turn: { kind: orient, target: trunk.chest, sources: { head: 1 } }
guide_lines:
  head_line: { from: head, to: trunk.crown }
notes:
  by: nobody
`;

const sound = trialSubject(SOUND);

const nameOf = (id: string): string => {
  const node = sound.rig.nodes.find((candidate) => candidate.id === id);
  if (!node) throw new Error(`the sound rig has no ${id}`);
  return node.name;
};

/** A rig, the sound one unless given, with one node changed. */
function withNode(id: string, change: (node: RigNode) => RigNode, rig = sound.rig): Rig {
  nameOf(id);
  return { ...rig, nodes: rig.nodes.map((node) => (node.id === id ? change(node) : node)) };
}

/** What a control's channels allow, but for one channel that has lost its rule. */
function without(control: ControlNode, channel: Channel): ControlNode['channels'] {
  return Object.fromEntries(Object.entries(control.channels).filter(([name]) => name !== channel));
}

const withConstraints = (...targets: readonly Partial<RigConstraint>[]): Rig => {
  const added = targets.map((more, index) => ({
    id: `sabotage_${index}`,
    name: `sabotage_${index}`,
    kind: 'point',
    blend: null,
    keepOffset: true,
    ...more,
  })) as readonly RigConstraint[];
  return { ...sound.rig, constraints: [...sound.rig.constraints, ...added] };
};

const withDriver = (
  driver: Pick<RigDriver, 'control' | 'input' | 'target' | 'channel' | 'inputs' | 'outputs'>,
): Rig => ({
  ...sound.rig,
  drivers: [{ id: 'sabotage', name: 'sabotage', curve: 'linear', beyond: 'extend', ...driver }],
});

/** Adds to where a node stands against its parent. */
const shift =
  (by: Vec3) =>
  (node: RigNode): RigNode => ({ ...node, at: add(node.at, by) });

const source = (id: string) => [{ node: nameOf(id), weight: 1 }];

/** For each trial, ways to break the rig that this trial notices and no other one does. */
const SABOTAGE: readonly (readonly [TrialName, string, () => Rig])[] = [
  [
    'rest',
    'a constraint that drops its offset',
    () => withConstraints({ target: nameOf('trunk.crown'), sources: source('head'), keepOffset: false }),
  ],
  [
    'zero',
    'a limit that keeps a control from reading zero',
    () =>
      withNode('body', (node) =>
        node.kind === 'control' ? { ...node, channels: { ty: { locked: false, min: 5, max: null } } } : node,
      ),
  ],
  [
    'carry',
    'a control that is moved by the root a second time',
    () =>
      withDriver({
        control: nameOf('root'),
        input: 'tx',
        target: nameOf('body'),
        channel: 'tx',
        inputs: [0, 1],
        outputs: [0, 1],
      }),
  ],
  [
    'carry',
    'a parked thing that goes along with the root',
    () => withConstraints({ kind: 'parent', target: nameOf('notes'), sources: source('root') }),
  ],
  [
    'carry',
    'a joint that stays behind when the root goes',
    () => withConstraints({ target: nameOf('trunk.crown'), sources: source('container.stay') }),
  ],
  [
    'mirror',
    'a right control whose rest axes are turned round',
    () =>
      withNode('arm.right.wrist_fk', (node) => ({ ...node, turn: multiplyQuat(node.turn, [1, 0, 0, 0]) })),
  ],
  [
    'pole',
    'poles that stand beside the plane of their elbows',
    () => {
      const left = withNode('arm.left.pole', shift([1.6, 3, 0]));
      return withNode('arm.right.pole', shift([-1.6, 3, 0]), left);
    },
  ],
  [
    'reach',
    'wrists that hold on to the body',
    () =>
      withConstraints(
        { target: nameOf('arm.left.wrist'), sources: source('body') },
        { target: nameOf('arm.right.wrist'), sources: source('body') },
      ),
  ],
  [
    'blend',
    'something that jumps while a blend fades',
    () =>
      withDriver({
        control: nameOf('arm.left.hand'),
        input: 'reach',
        target: nameOf('trunk.crown'),
        channel: 'ty',
        inputs: [0, 0.3, 0.3 + 1e-10, 0.45, 1],
        outputs: [0, 0, 2, 0, 0],
      }),
  ],
  [
    'guide',
    'a guide line that leads to another joint',
    () =>
      withNode('head_line', (node) => (node.kind === 'line' ? { ...node, to: nameOf('trunk.hips') } : node)),
  ],
  [
    'guide',
    'a guide line that leads nowhere',
    () => withNode('head_line', (node) => (node.kind === 'line' ? { ...node, to: 'nothing' } : node)),
  ],
  [
    'limits',
    'a control that lost its limit',
    () =>
      withNode('head', (node) =>
        node.kind === 'control' ? { ...node, channels: without(node, 'rz') } : node,
      ),
  ],
  [
    'limits',
    'a control that lost a lock',
    () =>
      withNode('head', (node) =>
        node.kind === 'control' ? { ...node, channels: without(node, 'tx') } : node,
      ),
  ],
  [
    'limits',
    'a joint that is meant to turn less than its control turns it',
    () =>
      withNode('trunk.chest', (node) =>
        node.kind === 'joint' ? { ...node, limits: { rz: { min: -30, max: 30 } } } : node,
      ),
  ],
  ['hidden', 'a joint that is shown', () => withNode('trunk.hips', (node) => ({ ...node, shown: true }))],
  ['hidden', 'a control that is hidden', () => withNode('body', (node) => ({ ...node, shown: false }))],
  [
    'hidden',
    'a guide line that can be selected',
    () => withNode('head_line', (node) => ({ ...node, selectable: true })),
  ],
  [
    'containment',
    'a control that hangs in another container',
    () => withNode('body', (node) => ({ ...node, parent: nameOf('container.works') })),
  ],
  ['containment', 'a thing outside the rig', () => withNode('notes', (node) => ({ ...node, parent: null }))],
  [
    'containment',
    'a control that says it lies elsewhere',
    () => withNode('body', (node) => ({ ...node, container: 'works' })),
  ],
  [
    'names',
    'two constraints of one name',
    () => {
      const [first, ...others] = sound.rig.constraints;
      if (!first) throw new Error('the sound rig has constraints');
      return { ...sound.rig, constraints: [{ ...first, name: others[0]?.name ?? '' }, ...others] };
    },
  ],
];

describe('sabotage', () => {
  it('starts from a rig that passes every trial, each with something to check', () => {
    const results = runTrials(sound.rig, sound.intent);
    expect(results.filter(({ passed }) => !passed)).toEqual([]);
    expect(results.filter(({ checked }) => checked === 0)).toEqual([]);
  });

  it.each(SABOTAGE)('%s, and no other trial, notices %s', (trial, _, broken) => {
    expect(failedTrials(broken(), sound.intent)).toEqual([trial]);
  });

  it('is known for every trial', () => {
    expect([...new Set(SABOTAGE.map(([trial]) => trial))].sort()).toEqual([...TRIAL_NAMES].sort());
  });
});
