import type { FindingList } from '../findings/FindingList';
import { sha256Hex } from '../hash/sha256Hex';
import type { SourceText } from '../source/SourceText';
import { slipwayFindings } from './findings';
import { type Line, spanInLine, spanOfLine, splitLines } from './lines';

/** More than a hundred times the largest rig; what is longer is not a script, and is not read. */
export const LONGEST_SCRIPT = 16_000_000;

/** First line of a build script. */
export const SCRIPT_HEAD = 'slipway 1';
const LAST_LINE = /^end steps=(0|[1-9][0-9]{0,9}) sha256="([0-9a-f]{64})"$/;

function report(
  findings: FindingList,
  line: Line,
  code: 'script-version-unknown' | 'script-truncated',
): null {
  findings.report(slipwayFindings, code, spanOfLine(line), {});
  return null;
}

/**
 * Checks the first and the last line of a script: the version, the count of lines before the last, and the SHA-256 of
 * all bytes before it. `head` is what the first line must be. Gives the lines between them, or null with one finding; a refused script has no steps at all.
 */
export function checkSeal(
  source: SourceText,
  findings: FindingList,
  head: string = SCRIPT_HEAD,
): readonly Line[] | null {
  const { text } = source;
  const whole: Line = { source, number: 1, start: 0, end: Math.min(text.length, head.length) };
  if (text.length > LONGEST_SCRIPT) {
    const lengths = { length: text.length, longest: LONGEST_SCRIPT };
    findings.report(slipwayFindings, 'script-too-long', spanInLine(whole, 0, 0), lengths);
    return null;
  }
  if (!`${text}\n`.startsWith(`${head}\n`)) return report(findings, whole, 'script-version-unknown');
  const lines = splitLines(source);
  const last = lines[lines.length - 1] ?? whole;
  const seal = LAST_LINE.exec(text.slice(last.start, last.end));
  if (!seal || !text.endsWith('\n')) return report(findings, last, 'script-truncated');
  const [, steps, hash] = seal;
  const counted = lines.length - 1;
  if (Number(steps) !== counted) {
    const fact = `The last line counts ${steps} lines before it; there are ${counted}.`;
    findings.report(slipwayFindings, 'script-altered', spanOfLine(last), { fact });
    return null;
  }
  if (sha256Hex(text.slice(0, last.start)) !== hash) {
    const fact = 'The SHA-256 on the last line is not that of the lines before it.';
    findings.report(slipwayFindings, 'script-altered', spanOfLine(last), { fact });
    return null;
  }
  return lines.slice(1, -1);
}
