import type { Severity } from './Finding';
import { PAGES } from './generated/pages';
import { findDeclaration } from './registry';

/** A code with its page of help. */
export interface Explanation {
  readonly code: string;
  readonly severity: Severity;
  readonly summary: string;
  /** Markdown: what it means, a wrong and a right example, why. */
  readonly page: string;
}

/** What a finding code means; undefined for a code there is not. */
export function explainFinding(code: string): Explanation | undefined {
  const declaration = findDeclaration(code);
  if (!declaration) return undefined;
  const { severity, summary } = declaration;
  return { code, severity, summary, page: PAGES[code] ?? '' };
}
