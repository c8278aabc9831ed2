import { jointNumber } from '../../expand/jointIds';
import type { ConstraintEntry, ControlEntry } from '../../expand/primitives';
import { chainEntry } from '../chainEntry';
import { curveControls } from '../curveControls';
import { turnControl } from '../turnControl';
import type { ExpandPart } from '../types';

/**
 * Joints along a curve. Steered by joints: one control for each but the last, which only marks where the strand ends;
 * each control hangs on the one before, and each joint follows its control wholly, so a strand can be stretched by
 * moving one. Steered by a spline: a few controls shape a curve that all joints lie on.
 */
export const expandStrand: ExpandPart<'strand'> = ({ id, side }, part) => {
  const { points, joints: count, curve = 'smooth' } = part;
  const chain = chainEntry(side, { points, joints: count, curve }, part);
  const joints = Array.from({ length: count }, (_, index) => `${id}.${jointNumber(index, count)}`);
  const shape = part.shape ?? 'ring';
  const size = part.size ?? 1;

  if (part.steer === 'spline') {
    const many = part.controls ?? 4;
    const made = curveControls({
      id,
      side,
      joints,
      controls: Array.from({ length: many }, (_, index) => `${id}.grip_${jointNumber(index, many)}`),
      parent: part.parent,
      from: points[0] ?? [0, 0, 0],
      to: points[points.length - 1] ?? [0, 0, 0],
      shape,
      size,
      order: part.rotation_order,
      stretch: part.stretch ?? 0,
      volume: 0,
    });
    return { ...made, chains: { [id]: chain, ...made.chains } };
  }

  const controls: Record<string, ControlEntry> = {};
  const constraints: Record<string, ConstraintEntry> = {};
  let parent = part.parent;
  joints.slice(0, -1).forEach((joint, index) => {
    const control = `${joint}_fk`;
    controls[control] = turnControl(joint, {
      side,
      parent,
      order: part.rotation_order,
      limits: part.limits?.[jointNumber(index, count)],
      shape,
      size,
      moves: true,
    });
    constraints[`${joint}_follow`] = { side, kind: 'parent', target: joint, sources: { [control]: 1 } };
    parent = control;
  });
  return { chains: { [id]: chain }, controls, constraints };
};
