import type { Log, ReportingDescriptor, Result } from 'sarif';
import type { Finding, Severity } from '../findings/Finding';
import { findDeclaration } from '../findings/registry';
import type { Span } from '../source/SourceText';
import { COMPILER_VERSION } from '../version';

const LEVELS: Readonly<Record<Severity, 'error' | 'warning' | 'note'>> = {
  error: 'error',
  warning: 'warning',
  info: 'note',
};

/** Half of a surrogate pair without the other: no character, and no URI can hold it. */
const LONE_SURROGATE = /[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/g;

/** A file's name as a relative URI. */
function uriOf(name: string): string {
  return encodeURIComponent(name.replace(LONE_SURROGATE, '\ufffd'));
}

function physicalLocation(span: Span) {
  return {
    artifactLocation: { uri: uriOf(span.source) },
    region: {
      startLine: span.startLine,
      startColumn: span.startColumn,
      endLine: span.endLine,
      endColumn: span.endColumn,
      charOffset: span.start,
      charLength: span.end - span.start,
    },
  };
}

function toResult(finding: Finding, ruleIndex: number): Result {
  return {
    ruleId: finding.code,
    ruleIndex,
    level: LEVELS[finding.severity],
    message: { text: `${finding.message} ${finding.help}` },
    locations: [{ physicalLocation: physicalLocation(finding.span) }],
    relatedLocations: finding.related.map(({ span, label }, id) => ({
      id,
      message: { text: label },
      physicalLocation: physicalLocation(span),
    })),
    ...(finding.fix
      ? {
          fixes: [
            {
              description: { text: finding.fix.title },
              artifactChanges: finding.fix.edits.map(({ span, newText }) => ({
                artifactLocation: { uri: uriOf(span.source) },
                replacements: [
                  { deletedRegion: physicalLocation(span).region, insertedContent: { text: newText } },
                ],
              })),
            },
          ],
        }
      : {}),
  };
}

function toDescriptor(code: string): ReportingDescriptor {
  const declaration = findDeclaration(code);
  return {
    id: code,
    ...(declaration
      ? {
          shortDescription: { text: declaration.summary },
          defaultConfiguration: { level: LEVELS[declaration.severity] },
        }
      : {}),
  };
}

/** Findings as a SARIF 2.1.0 log (OASIS Standard, 2020), for code review tools and CI. */
export function findingsToSarif(findings: readonly Finding[]): Log {
  const codes = [...new Set(findings.map(({ code }) => code))].sort();
  return {
    $schema: 'https://json.schemastore.org/sarif-2.1.0.json',
    version: '2.1.0',
    runs: [
      {
        tool: { driver: { name: 'Pintle', version: COMPILER_VERSION, rules: codes.map(toDescriptor) } },
        columnKind: 'utf16CodeUnits',
        results: findings.map((finding) => toResult(finding, codes.indexOf(finding.code))),
      },
    ],
  };
}
