import type { Finding, SourceText } from '../../compiler/index';

const BOLD = ['\u001b[1m', '\u001b[0m'] as const;

function bold(text: string): string {
  return process.stdout.isTTY ? `${BOLD[0]}${text}${BOLD[1]}` : text;
}

/** The line a finding stands on, numbered, with carets under its exact place. */
function frame({ span }: Finding, text: string): string {
  const line = text.split('\n')[span.startLine - 1]?.replace(/\r$/, '') ?? '';
  const number = String(span.startLine).padStart(5);
  const start = span.startColumn - 1;
  const end = span.endLine === span.startLine ? span.endColumn - 1 : line.length;
  // Tabs are kept, so that the carets stand under the text however wide the terminal draws them.
  const indent = line.slice(0, start).replace(/[^\t]/g, ' ');
  return `${number} | ${line}\n      | ${indent}${'^'.repeat(Math.max(1, end - start))}`;
}

/** Prints findings as `file:line:column severity code message`, each with its line and what to do. */
export function printFindings(findings: readonly Finding[], sources: readonly SourceText[]): void {
  for (const finding of findings) {
    const { span, severity, code, message, help, related } = finding;
    console.log(`${span.source}:${span.startLine}:${span.startColumn} ${bold(severity)} ${code} ${message}`);
    const source = sources.find(({ name }) => name === span.source);
    if (source) console.log(frame(finding, source.text));
    for (const place of related) {
      console.log(
        `      = ${place.label}: ${place.span.source}:${place.span.startLine}:${place.span.startColumn}`,
      );
    }
    console.log(`      = ${help}\n`);
  }
}

/** Whether any finding stops a build. */
export function hasErrors(findings: readonly Finding[]): boolean {
  return findings.some(({ severity }) => severity === 'error');
}
