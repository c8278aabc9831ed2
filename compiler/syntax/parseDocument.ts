import { Composer, type CST, type Document, Parser, type YAMLError } from 'yaml';
import type { FindingList } from '../findings/FindingList';
import { LineIndex } from '../source/LineIndex';
import type { SourceText } from '../source/SourceText';
import { checkTokens } from './checkTokens';
import { syntaxFindings } from './findings';
import { LIMITS } from './limits';
import { ValueReader } from './readValue';
import type { SourceDocument } from './types';
import { YamlSource } from './YamlSource';
import { yamlProblem } from './yamlProblems';

/**
 * YAML 1.2 core schema. Keys that occur twice are found by our own walk, in linear time; the library's check is
 * quadratic in the keys of a map. Its own alias bound is never reached, because we follow aliases ourselves.
 */
const COMPOSE_OPTIONS = {
  version: '1.2',
  schema: 'core',
  uniqueKeys: false,
  prettyErrors: false,
  logLevel: 'silent',
  stringKeys: false,
} as const;

function reportYamlError(error: YAMLError, lines: LineIndex, findings: FindingList): void {
  const [start, end] = error.pos;
  const span = lines.span(start, Math.max(end, start + 1));
  if (error.code === 'TAB_AS_INDENT') findings.report(syntaxFindings, 'tab-indentation', span, {});
  else if (error.code === 'TAG_RESOLVE_FAILED')
    return; // every tag of its own is reported by the walk
  else findings.report(syntaxFindings, 'yaml-syntax', span, yamlProblem(error.code));
}

/** The first document; a second one is a finding at its beginning. */
function firstDocument(
  documents: readonly Document.Parsed[],
  lines: LineIndex,
  findings: FindingList,
): Document | null {
  const [first, second] = documents;
  if (second) {
    const start = second.range[0];
    findings.report(syntaxFindings, 'several-documents', lines.span(start, start + 3), {});
  }
  return first ?? null;
}

/**
 * Parses one YAML text into plain values with positions. Whatever is wrong becomes findings; the value is undefined
 * when the text was refused or is empty, and otherwise as much as could be read. Bounded in time and memory for any
 * input up to its size.
 */
export function parseDocument(source: SourceText, findings: FindingList): SourceDocument {
  const lines = new LineIndex(source);
  const nothing = new YamlSource(source, lines, null);
  const { text } = source;
  if (text.length > LIMITS.characters) {
    findings.report(syntaxFindings, 'text-too-large', lines.span(0, 0), {
      size: text.length,
      limit: LIMITS.characters,
    });
    return nothing;
  }
  const tokens: CST.Token[] = [...new Parser().parse(text)];
  if (!checkTokens(tokens, lines, findings)) return nothing;
  const documents = [...new Composer(COMPOSE_OPTIONS).compose(tokens, true, text.length)];
  const document = firstDocument(documents, lines, findings);
  if (!document) return nothing;
  for (const error of document.errors) reportYamlError(error, lines, findings);
  const reader = new ValueReader(document, lines, findings);
  const value = reader.read();
  if ((value === undefined || value === null) && document.errors.length === 0) {
    findings.report(syntaxFindings, 'document-empty', lines.span(0, text.length), {});
  }
  const { anchors, refusedEntries } = reader;
  return new YamlSource(source, lines, { document, value: value ?? undefined, anchors, refusedEntries });
}
