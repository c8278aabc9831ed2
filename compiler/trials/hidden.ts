import type { RigNode } from '../rig/Rig';
import { Count } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/** Whether an animator may see nodes of this kind; groups and notes draw nothing, so it does not matter for them. */
function maySee(kind: RigNode['kind']): boolean {
  switch (kind) {
    case 'control':
    case 'line':
    case 'geometry':
    case 'group':
    case 'note':
      return true;
    case 'joint':
      return false;
    default:
      return kind satisfies never;
  }
}

/**
 * An animator sees controls, guide lines and geometry only: every node is shown or hidden as its role and the
 * containers around it say, no joint is shown, nothing hidden lies open to be seen, and guide lines cannot be selected.
 */
export function tryHidden({ rig, intent }: TrialBench): TrialResult {
  const count = new Count('hidden');
  for (const { id, kind, shown, selectable } of rig.nodes) {
    const intended = intent.nodes.get(id);
    const isAsMeant = intended === undefined || intended.shown === shown;
    count.add(isAsMeant && (!shown || maySee(kind)) && !(kind === 'line' && selectable), id);
  }
  return count.result();
}
