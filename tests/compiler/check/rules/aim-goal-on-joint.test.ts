import { describe, expect, it } from 'vitest';
import { told } from '../ruleFindings';

const CODE = 'aim-goal-on-joint';
const eye = (at: string, link: string): string => `chains:
  eye: { points: [[0, 50, 0], [0, 50, 4]], names: [ball, pupil] }
controls:
  look: { at: ${at} }
${link}
`;
const SOLVER = 'solvers:\n  gaze: { kind: aim, joints: [eye.ball], goal: look }';
const CONSTRAINT = 'constraints:\n  gaze: { kind: aim, target: eye.ball, sources: { look: 1 } }';

describe(CODE, () => {
  it('points at the goal of a solver', () => {
    expect(told(CODE, eye('eye.ball', SOLVER))).toEqual([
      ['look', '"eye.ball" aims at "look", which stands at the same place.'],
    ]);
  });

  it('points at the source of a constraint', () => {
    expect(told(CODE, eye('eye.ball', CONSTRAINT)).map(([text]) => text)).toEqual(['look']);
  });

  it('counts a ten-thousandth of the rig as the same place', () => {
    // From the root control to the eye the rig measures 50 cm.
    expect(told(CODE, eye('[0, 50, 0.0049]', SOLVER))).toHaveLength(1);
    expect(told(CODE, eye('[0, 50, 0.0051]', SOLVER))).toEqual([]);
  });

  it('is silent as soon as there is a direction, and for what does not aim', () => {
    expect(told(CODE, eye('[0, 50, 1]', SOLVER))).toEqual([]);
    expect(told(CODE, eye('[0, 50, 1]', CONSTRAINT))).toEqual([]);
    expect(told(CODE, eye('eye.ball', CONSTRAINT.replace('aim', 'orient')))).toEqual([]);
  });
});
