import type { Finding } from '../../compiler/index';

const NOUNS = {
  error: ['error', 'errors'],
  warning: ['warning', 'warnings'],
  info: ['note', 'notes'],
} as const;

/** How many findings of each weight, in words; of a weight without any, nothing is said. */
export function countWords(findings: readonly Finding[]): string {
  const counted = (['error', 'warning', 'info'] as const).flatMap((severity) => {
    const count = findings.filter((finding) => finding.severity === severity).length;
    return count === 0 ? [] : [`${count} ${NOUNS[severity][count === 1 ? 0 : 1]}`];
  });
  return counted.length === 0 ? 'nothing is wrong' : counted.join(', ');
}
