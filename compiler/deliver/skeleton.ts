import { SKIN_ROLE } from '../resolve/roles';
import type { JointNode, Rig } from '../rig/Rig';
import type { DeliveryProfile } from './DeliveryProfile';

/** One joint that is delivered. */
export interface DeliveredJoint {
  readonly node: JointNode;
  /** Place of the joint in the rig's list of nodes. */
  readonly index: number;
  /** Place in the list of delivered joints of the one it hangs on; null for a topmost joint. */
  readonly parent: number | null;
  /** Joints above it. */
  readonly depth: number;
}

/**
 * The joints that a profile takes, parents first. A joint whose parent is no joint or is left out hangs on the nearest
 * joint above it that is taken; across containers a seat follows that joint, so the way up leads through what it follows.
 */
export function deliveredJoints(rig: Rig, profile: DeliveryProfile): readonly DeliveredJoint[] {
  const byName = new Map(rig.nodes.map((node, index) => [node.name, { node, index }]));
  const followed = new Map<string, string>();
  for (const { kind, target, sources } of rig.constraints) {
    const [only] = sources;
    if (kind === 'parent' && sources.length === 1 && only) followed.set(target, only.node);
  }
  // A joint that follows its control stands in for it: what hangs on the control hangs on the joint.
  const steered = new Map<string, string>();
  for (const { kind, target, sources } of rig.constraints) {
    const [only] = sources;
    const isJoint = byName.get(target)?.node.kind === 'joint';
    if (isJoint && (kind === 'orient' || kind === 'parent') && sources.length === 1 && only) {
      if (!steered.has(only.node)) steered.set(only.node, target);
    }
  }
  const isTaken = (name: string): boolean => {
    const node = byName.get(name)?.node;
    return node?.kind === 'joint' && (!profile.skinJointsOnly || node.role === SKIN_ROLE);
  };
  const above = (name: string): string | null => {
    const seen = new Set([name]);
    let at: string | null | undefined = byName.get(name)?.node.parent;
    while (at !== null && at !== undefined && !seen.has(at)) {
      seen.add(at);
      if (isTaken(at)) return at;
      const joint = steered.get(at);
      if (joint !== undefined && joint !== name && isTaken(joint) && !seen.has(joint)) return joint;
      const node = byName.get(at)?.node;
      at = node?.kind === 'group' ? (followed.get(at) ?? node.parent) : node?.parent;
    }
    return null;
  };

  const joints = rig.nodes.flatMap((node, index) =>
    node.kind === 'joint' && isTaken(node.name) ? [{ node, index, above: above(node.name) }] : [],
  );
  return parentsFirst(joints);
}

interface LooseJoint {
  readonly node: JointNode;
  readonly index: number;
  readonly above: string | null;
}

/** Orders joints depth first, as they stand in the rig among equals; a ring is cut where it is met. */
function parentsFirst(joints: readonly LooseJoint[]): readonly DeliveredJoint[] {
  const below = new Map<string | null, LooseJoint[]>();
  for (const joint of joints) {
    const siblings = below.get(joint.above);
    if (siblings) siblings.push(joint);
    else below.set(joint.above, [joint]);
  }
  const ordered: DeliveredJoint[] = [];
  const pending = [...(below.get(null) ?? [])]
    .reverse()
    .map((joint) => ({ joint, parent: null as number | null }));
  for (let next = pending.pop(); next; next = pending.pop()) {
    const { joint, parent } = next;
    const place = ordered.length;
    const depth = parent === null ? 0 : (ordered[parent]?.depth ?? 0) + 1;
    ordered.push({ node: joint.node, index: joint.index, parent, depth });
    for (const child of [...(below.get(joint.node.name) ?? [])].reverse()) {
      pending.push({ joint: child, parent: place });
    }
  }
  return ordered;
}
