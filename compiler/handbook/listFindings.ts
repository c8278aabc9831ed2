import type { Severity } from '../findings/Finding';
import { findDeclaration, listFindingCodes } from '../findings/registry';

/** A finding in the list of all findings. */
export interface FindingEntry {
  readonly code: string;
  readonly severity: Severity;
  readonly summary: string;
}

/** Every finding with its summary, by code. */
export function listFindings(): readonly FindingEntry[] {
  return listFindingCodes().flatMap((code) => {
    const declaration = findDeclaration(code);
    return declaration ? [{ code, severity: declaration.severity, summary: declaration.summary }] : [];
  });
}
