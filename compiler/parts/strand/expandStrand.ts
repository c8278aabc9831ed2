import { jointNumber } from '../../expand/jointIds';
import type { ConstraintEntry, ControlEntry } from '../../expand/primitives';
import type { ExpandPart } from '../types';

/**
 * A chain with one control for each joint but the last, which only marks where the strand ends. Each control
 * hangs on the one before, and each joint follows its control wholly, so a strand can be stretched by moving one.
 */
export const expandStrand: ExpandPart<'strand'> = ({ id, side }, part) => {
  const controls: Record<string, ControlEntry> = {};
  const constraints: Record<string, ConstraintEntry> = {};
  let parent = part.parent;
  for (let index = 0; index < part.joints - 1; index += 1) {
    const joint = `${id}.${jointNumber(index, part.joints)}`;
    const control = `${joint}_fk`;
    controls[control] = {
      side,
      at: joint,
      align: joint,
      ...(parent === undefined ? {} : { parent }),
      shape: part.shape ?? 'ring',
      size: part.size ?? 1,
      ...(part.rotation_order ? { rotation_order: part.rotation_order } : {}),
      channels: { scale: { locked: true } },
    };
    constraints[`${joint}_follow`] = { side, kind: 'parent', target: joint, sources: { [control]: 1 } };
    parent = control;
  }
  return {
    chains: {
      [id]: {
        side,
        role: part.role ?? 'skin',
        points: part.points,
        joints: part.joints,
        curve: part.curve ?? 'smooth',
        ...(part.parent === undefined ? {} : { parent: part.parent }),
        ...(part.mirror ? { mirror: part.mirror } : {}),
        ...(part.orient ? { orient: part.orient } : {}),
        ...(part.rotation_order ? { rotation_order: part.rotation_order } : {}),
      },
    },
    controls,
    constraints,
  };
};
