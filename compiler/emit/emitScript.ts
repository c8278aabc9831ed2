import { sha256Hex } from '../hash/sha256Hex';
import type { Step } from '../slipway/Step';
import { templates } from './generated/templates';
import { stepView } from './stepView';

/**
 * The script of a rig's steps in Slipway 1: its first line, one line a step, and the last line with the count of
 * lines before it and the SHA-256 of their bytes. The same steps always give the same bytes.
 */
export function emitScript(steps: readonly Step[]): string {
  // Joined once: a text grown line by line is a chain of pieces that hashing would have to put together.
  const lines = ['slipway 1\n'];
  for (const step of steps) lines.push(templates[step.verb](stepView(step)));
  const script = lines.join('');
  return `${script}end steps=${steps.length + 1} sha256="${sha256Hex(script)}"\n`;
}
