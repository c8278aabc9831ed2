'use client';

import type { Finding, Fix, Severity, Span } from '@/compiler';

const WORDS: Readonly<Record<Severity, string>> = { error: 'Error', warning: 'Warning', info: 'Note' };

export interface FindingsPaneProps {
  readonly findings: readonly Finding[];
  readonly isReadOnly: boolean;
  /** Name of the recipe being edited; places in other documents are named but cannot be gone to. */
  readonly source: string;
  onGoTo(span: Span): void;
  onFix(fix: Fix): void;
}

function placeWords(span: Span, source: string): string {
  const place = `line ${span.startLine}, column ${span.startColumn}`;
  return span.source === source ? place : `${span.source}, ${place}`;
}

function Place({
  span,
  source,
  words,
  onGoTo,
}: Pick<FindingsPaneProps, 'source' | 'onGoTo'> & { readonly span: Span; readonly words: string }) {
  if (span.source !== source) return <span className="figures text-ink-soft text-sm">{words}</span>;
  return (
    <button type="button" className="plain-action figures text-sm" onClick={() => onGoTo(span)}>
      {words}
    </button>
  );
}

/** Counts in words, for the tab and for people who listen. */
export function countFindings(findings: readonly Finding[]): string {
  const errors = findings.filter(({ severity }) => severity === 'error').length;
  const warnings = findings.filter(({ severity }) => severity === 'warning').length;
  const part = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`;
  return findings.length === 0 ? 'no findings' : `${part(errors, 'error')}, ${part(warnings, 'warning')}`;
}

/** Everything the compiler found, in the order of the text, with what to do about it. */
export function FindingsPane({ findings, isReadOnly, source, onGoTo, onFix }: FindingsPaneProps) {
  if (findings.length === 0) {
    return (
      <p className="p-4 text-ink-soft">Nothing is wrong. The build script was made from exactly this text.</p>
    );
  }
  return (
    <ol className="divide-y divide-rule" aria-label="Findings">
      {findings.map((finding) => (
        <li
          key={`${finding.code} ${finding.span.start} ${finding.message}`}
          className={`finding finding-${finding.severity} px-4 py-3`}
        >
          <p className="flex flex-wrap items-baseline gap-x-3">
            <strong className="finding-word">{WORDS[finding.severity]}</strong>
            <Place
              span={finding.span}
              source={source}
              words={placeWords(finding.span, source)}
              onGoTo={onGoTo}
            />
            <span className="figures ml-auto text-ink-soft text-xs">{finding.code}</span>
          </p>
          <p className="mt-1">{finding.message}</p>
          <p className="text-ink-soft">{finding.help}</p>
          {finding.related.length > 0 && (
            <ul className="mt-1 text-sm">
              {finding.related.map(({ span, label }) => (
                <li key={`${span.source} ${span.start} ${label}`}>
                  <Place
                    span={span}
                    source={source}
                    words={`${label}: ${placeWords(span, source)}`}
                    onGoTo={onGoTo}
                  />
                </li>
              ))}
            </ul>
          )}
          {finding.fix && !isReadOnly && (
            <button type="button" className="action mt-2" onClick={() => finding.fix && onFix(finding.fix)}>
              {finding.fix.title}
            </button>
          )}
        </li>
      ))}
    </ol>
  );
}
