import type { Finding, Severity } from './Finding';
import { MAXIMUM_FINDINGS } from './FindingList';

/** What house rules may say about a code. */
export type SeverityChoice = Severity | 'off';

/** A mirrored copy repeats its original's finding; both sides of one entry are one fault. */
function sameFaultKey({ code, span, message }: Finding): string {
  const oneSide = message.replaceAll('.right', '.left');
  return `${code}\n${span.source}\n${span.start}\n${span.end}\n${oneSide}`;
}

function compareFindings(a: Finding, b: Finding): number {
  if (a.span.source !== b.span.source) return a.span.source < b.span.source ? -1 : 1;
  return (
    a.span.start - b.span.start || a.span.end - b.span.end || (a.code < b.code ? -1 : a.code > b.code ? 1 : 0)
  );
}

/**
 * Puts findings in reading order, drops repeats of one fault, and caps their number, saying how many were left
 * out. Errors are kept before warnings when the cap bites.
 */
export function finishFindings(findings: readonly Finding[]): readonly Finding[] {
  const seen = new Set<string>();
  const distinct = findings.filter((finding) => {
    const key = sameFaultKey(finding);
    if (seen.has(key)) return false;
    seen.add(key);
    return true;
  });
  const sorted = distinct.sort(compareFindings);
  if (sorted.length <= MAXIMUM_FINDINGS) return sorted;
  const errors = sorted.filter(({ severity }) => severity === 'error');
  const kept = (errors.length > 0 ? errors : sorted).slice(0, MAXIMUM_FINDINGS);
  const last = kept[kept.length - 1] as Finding;
  return [
    ...kept,
    {
      code: 'more-findings',
      severity: 'info',
      message: `${sorted.length - kept.length} more findings are not shown.`,
      span: last.span,
      related: [],
      help: 'Mend these first; the others will show then.',
    },
  ];
}
