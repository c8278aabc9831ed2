import { jointNumber } from '../../expand/jointIds';
import type { ConstraintEntry, ControlEntry } from '../../expand/primitives';
import { chainEntry } from '../chainEntry';
import { turnControl } from '../turnControl';
import type { ExpandPart } from '../types';

/**
 * Neck joints that hang on each other, each with its control, and a head joint whose control may take its direction
 * from another thing than the neck while its place stays on it.
 */
export const expandNeckHead: ExpandPart<'neck_head'> = ({ id, side }, part) => {
  const count = part.joints ?? 2;
  // The neck's last joint marks where the head begins; the head is a chain of its own there.
  const names = Array.from({ length: count + 1 }, (_, index) =>
    index === count ? 'end' : jointNumber(index, count),
  );
  const necks = names.map((name) => `${id}.${name}`);
  const head = `${id}.head`;
  const controls: Record<string, ControlEntry> = {};
  const constraints: Record<string, ConstraintEntry> = {};
  let parent = part.parent;
  for (const joint of necks.slice(0, -1)) {
    const control = `${joint}_fk`;
    controls[control] = turnControl(joint, { side, parent, order: part.rotation_order });
    constraints[`${joint}_turn`] = { side, kind: 'orient', target: joint, sources: { [control]: 1 } };
    parent = control;
  }
  controls[head] = {
    ...turnControl(`${head}.skull`, {
      side,
      parent,
      order: part.rotation_order,
      limits: part.limits?.head,
      size: 1.4,
    }),
    ...(part.spaces ? { spaces: part.spaces, space_follow: 'turn' } : {}),
  };
  constraints[`${head}_turn`] = {
    side,
    kind: 'orient',
    target: `${head}.skull`,
    sources: { [head]: 1 },
  };
  const { limits, ...options } = part;
  const headOptions = limits?.head === undefined ? {} : { limits: { skull: limits.head } };
  return {
    chains: {
      [id]: chainEntry(
        side,
        { points: [part.from, ...(part.via ?? []), part.to], joints: count + 1, names: [...names] },
        options,
      ),
      [head]: chainEntry(
        side,
        { points: [part.to, part.crown], names: ['skull', 'crown'], parent: necks[count] ?? '' },
        { ...options, ...headOptions },
      ),
    },
    controls,
    constraints,
    ...(part.guide_line
      ? { guide_lines: { [`${head}_line`]: { side, from: head, to: `${head}.crown` } } }
      : {}),
  };
};
