import { distance } from '../math/vec3';
import { readPosition } from '../pose/worldMatrices';
import type { RigNode } from '../rig/Rig';
import { displacement } from './displacement';
import { findInfluences } from './influences';
import { nudgedPose } from './poses';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/** A guide line of the recipe, with the nodes its ends are meant to meet and those the rig's line draws to. */
interface GuideLine {
  readonly id: string;
  /** Place of the line itself in the list of nodes; undefined when the rig has none. */
  readonly own: number | undefined;
  readonly ends: readonly { readonly meant: number | undefined; readonly drawn: number | undefined }[];
  /** A line from a control to what that control does not move, nor moves it, says something untrue. */
  readonly isIdle: boolean;
}

function findGuideLines(bench: TrialBench): readonly GuideLine[] {
  const { rig, intent, indexOfId, indexOfName } = bench;
  const isMovedBy = findInfluences(bench);
  const nodeAt = (index: number | undefined): RigNode | undefined =>
    index === undefined ? undefined : rig.nodes[index];
  return [...intent.lines].map(([id, { from, to }]) => {
    const own = indexOfId.get(id);
    const line = nodeAt(own);
    const meant = [indexOfId.get(from), indexOfId.get(to)];
    const drawn = line?.kind === 'line' ? [indexOfName.get(line.from), indexOfName.get(line.to)] : [];
    const [first, second] = meant.map(nodeAt);
    const isIdle =
      first !== undefined &&
      second !== undefined &&
      (first.kind === 'control' || second.kind === 'control') &&
      !isMovedBy(second.name, new Set([first.name])) &&
      !isMovedBy(first.name, new Set([second.name]));
    return { id, own, ends: meant.map((node, end) => ({ meant: node, drawn: drawn[end] })), isIdle };
  });
}

/**
 * Both ends of every guide line meet what the recipe joins by it, in every pose: a control and what it steers. The
 * line's own node lies parked and is never moved.
 */
export function tryGuide(bench: TrialBench): TrialResult {
  const { rig, poser, rest, evaluatedRest, size, tolerance } = bench;
  const tally = new Tally('guide', rig.scene.unit, tolerance);
  const lines = findGuideLines(bench);
  if (lines.length === 0) return tally.result();
  const nudged = nudgedPose(bench, 6);
  poser.evaluate(nudged);
  for (const { pose, world } of [
    { pose: {}, world: evaluatedRest },
    { pose: nudged, world: poser.world },
  ]) {
    for (const { id, own, ends } of lines) {
      for (const { meant, drawn } of ends) {
        const isThere = meant !== undefined && drawn !== undefined;
        const gap = isThere ? distance(readPosition(world, meant), readPosition(world, drawn)) : Number.NaN;
        tally.add(gap, id, pose);
      }
      if (own !== undefined) tally.add(displacement(world, own, rest, own, size), id, pose);
    }
  }
  for (const { id, isIdle, ends } of lines) {
    const [from, to] = ends;
    const apart =
      from?.meant === undefined || to?.meant === undefined
        ? Number.NaN
        : distance(readPosition(rest, from.meant), readPosition(rest, to.meant));
    // The whole line is wrong then, not a part of it.
    tally.add(isIdle ? apart : 0, id);
  }
  return tally.result();
}
