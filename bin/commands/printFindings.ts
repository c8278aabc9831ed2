import type { Finding, SourceText } from '../../compiler/index';
import { frame } from './frame';
import { printable } from './printable';

const BOLD = ['\u001b[1m', '\u001b[0m'] as const;

function bold(text: string): string {
  return process.stdout.isTTY ? `${BOLD[0]}${text}${BOLD[1]}` : text;
}

/** Prints findings as `file:line:column severity code message`, each with its line and what to do. */
export function printFindings(findings: readonly Finding[], sources: readonly SourceText[]): void {
  for (const finding of findings) {
    const { span, severity, code, message, help, related } = finding;
    const place = `${printable(span.source)}:${span.startLine}:${span.startColumn}`;
    console.log(`${place} ${bold(severity)} ${code} ${printable(message)}`);
    const source = sources.find(({ name }) => name === span.source);
    if (source) console.log(frame(finding, source.text));
    for (const { label, span: other } of related) {
      const also = `${printable(other.source)}:${other.startLine}:${other.startColumn}`;
      console.log(`      = ${printable(label)}: ${also}`);
    }
    console.log(`      = ${printable(help)}\n`);
  }
}

/** Whether any finding stops a build. */
export function hasErrors(findings: readonly Finding[]): boolean {
  return findings.some(({ severity }) => severity === 'error');
}
