import { describe, expect, it } from 'vitest';
import { runTrials } from '@/compiler/trials/runTrials';
import { trialSubject } from './trialSubject';

/** An arm and a tail on both sides, with more in places that tests fill in. */
function recipe({ chain = '', landmark = '', more = '' }) {
  return `
format: 1
recipe: twins
landmarks:
  shoulder: { side: left, at: [10, 78, 0] ${landmark} }
  elbow: { side: left, at: [25, 70, -3] }
  wrist: { side: left, at: [40, 62, 0] }
parts:
  root: { kind: root }
chains:
  arm: { side: both, points: [shoulder, elbow, wrist] ${chain} }
controls:
  arm: { side: both, at: arm.left.shoulder, align: arm.left.shoulder, parent: root, rotation_order: yzx }
  hand: { side: both, at: arm.left.wrist, parent: root }
constraints:
  arm_follow: { side: both, kind: parent, target: arm.left.shoulder, sources: { arm.left: 1 } }
  hand_turn: { side: both, kind: orient, target: arm.left.wrist, sources: { hand.left: 1, arm.left: 2 } }
${more}`;
}

function mirrorOf(text: string) {
  const { rig, intent } = trialSubject(text);
  return runTrials(rig, intent).find(({ trial }) => trial === 'mirror');
}

describe('the mirror trial', () => {
  it.each(['behaviour', 'orientation', 'world'])('passes for chains mirrored by %s', (mirror) => {
    // Three joints and two controls at rest and in two poses.
    expect(mirrorOf(recipe({ chain: `, mirror: ${mirror}` }))).toMatchObject({ passed: true, checked: 15 });
  });

  it('notices sides that one rule is promised for and another one made', () => {
    const promised = trialSubject(recipe({}));
    const made = trialSubject(recipe({ chain: ', mirror: orientation' }));
    const result = runTrials(made.rig, promised.intent).find(({ trial }) => trial === 'mirror');
    expect(result?.passed).toBe(false);
  });

  it('leaves out what stands on a landmark that the recipe places differently on the right', () => {
    expect(mirrorOf(recipe({ landmark: ', right: [-12, 78, 0]' }))).toMatchObject({
      passed: true,
      checked: 0,
    });
  });

  it('leaves out what something moves that is on one side only', () => {
    const more = `
  pull: { kind: point, target: arm.right.wrist, sources: { patch.right: 1 } }
`;
    const lopsided = recipe({ more }).replace(
      'constraints:',
      '  patch.right: { at: [-30, 60, 5], parent: hand.left }\nconstraints:',
    );
    expect(mirrorOf(lopsided)).toMatchObject({ passed: true });
  });

  it('fails where both sides follow one side', () => {
    const lopsided = recipe({}).replace(
      'sources: { hand.left: 1, arm.left: 2 }',
      'sources: { hand.left: 1 }',
    );
    const crossed = lopsided.replace(
      'hand: { side: both, at: arm.left.wrist, parent: root }',
      'hand: { side: both, at: arm.left.wrist, parent: root }\n  knob: { at: [0, 50, 0], parent: hand.left }',
    );
    const { rig, intent } = trialSubject(
      `${crossed}\n  both_follow: { side: both, kind: point, target: arm.left.elbow, sources: { knob: 1 } }\n`,
    );
    const result = runTrials(rig, intent).find(({ trial }) => trial === 'mirror');
    expect(result).toMatchObject({ passed: false });
    expect(result?.worst).toContain('arm.right.elbow');
  });
});
