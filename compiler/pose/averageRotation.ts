import { dotQuat, IDENTITY_QUAT, normaliseQuat, slerp } from '../math/quat';
import type { Quat } from '../rig/Rig';

/**
 * Weighted average of rotations; weights are positive and sum to one. Two: slerp on the shorter arc. More: the
 * normalised sum of the weighted quaternions, each with the sign that lies nearer to the first. Should they cancel
 * out, identity.
 */
export function averageRotation(turns: readonly Quat[], weights: readonly number[]): Quat {
  const [first, second] = turns;
  if (first === undefined) return IDENTITY_QUAT;
  if (second === undefined) return first;
  if (turns.length === 2) return slerp(first, second, weights[1] ?? 0);
  const sum: [number, number, number, number] = [0, 0, 0, 0];
  turns.forEach((turn, index) => {
    const weight = (weights[index] ?? 0) * (dotQuat(first, turn) < 0 ? -1 : 1);
    for (let i = 0; i < 4; i += 1) sum[i] = (sum[i] as number) + (turn[i] as number) * weight;
  });
  return normaliseQuat(sum);
}
