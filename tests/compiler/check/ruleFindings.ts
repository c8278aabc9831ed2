import { compile } from '@/compiler';
import type { Finding } from '@/compiler/findings/Finding';
import { applyFix } from './applyFix';

const SOURCE = 'rule.recipe.yaml';

/** What rule tests build on: the head of every recipe, with a root control at the origin. */
export const HEAD = 'format: 1\nrecipe: demo\nparts:\n  root: { kind: root }\n';

function findingsWith(code: string, body: string): readonly Finding[] {
  const { findings } = compile({ recipe: { name: SOURCE, text: HEAD + body } });
  // A recipe that does not compile could keep a rule silent for another reason than the test's.
  const errors = findings.filter((finding) => finding.severity === 'error' && finding.code !== code);
  if (errors.length > 0) throw new Error(errors.map(({ message }) => message).join('\n'));
  return findings.filter((finding) => finding.code === code);
}

/** The text that each finding of one rule points at, with its message. */
export function told(code: string, body: string): readonly (readonly [string, string])[] {
  return findingsWith(code, body).map(({ span, message }) => [
    (HEAD + body).slice(span.start, span.end),
    message,
  ]);
}

/** The recipe's body after the fix of the only finding; null when it has none. */
export function fixed(code: string, body: string): string | null {
  const [finding] = findingsWith(code, body);
  if (!finding?.fix) return null;
  return applyFix(HEAD + body, finding.fix).slice(HEAD.length);
}
