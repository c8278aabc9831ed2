import { containerNodeId } from '../resolve/ids';
import { RIG_CONTAINER } from '../resolve/resolveContainers';
import { Count } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

const NOTHING_AROUND: ReadonlySet<string> = new Set();

/**
 * Everything lies inside the rig's root group and in the container of its role: what the rig says of a node's
 * container, and the groups that the node really hangs beneath.
 */
export function tryContainment({ rig, intent, indexOfName, indexOfId }: TrialBench): TrialResult {
  const count = new Count('containment');
  /** For each node the groups of containers around it; parents come before children. */
  const around: ReadonlySet<string>[] = [];
  const groupId = (container: string): string => containerNodeId(container);
  for (const [index, { id, parent, container }] of rig.nodes.entries()) {
    const above = parent === null ? undefined : indexOfName.get(parent);
    const aboveNode = above === undefined ? undefined : rig.nodes[above];
    const inherited = above === undefined ? undefined : around[above];
    const before = inherited ?? NOTHING_AROUND;
    // Most nodes hang on one in the same groups and share its set.
    const groups = aboveNode?.role === 'container' ? new Set([...before, aboveNode.id]) : before;
    around[index] = groups;
    const intended = intent.nodes.get(id);
    if (id === groupId(RIG_CONTAINER)) {
      count.add(parent === null, id);
      continue;
    }
    const isInRig = groups.has(groupId(RIG_CONTAINER));
    const isInContainer = intended === undefined || groups.has(groupId(intended.container));
    const saysSo = intended === undefined || intended.container === container;
    count.add(isInRig && isInContainer && saysSo && intended !== undefined, id);
  }
  // What the recipe asks for must be there, too.
  for (const id of intent.nodes.keys()) if (!indexOfId.has(id)) count.add(false, id);
  return count.result();
}
