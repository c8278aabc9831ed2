import type { FindingList } from '../findings/FindingList';
import { mergeDocuments } from '../merge/mergeDocuments';
import type { MergedDocument } from '../merge/types';
import type { SourceText } from '../source/SourceText';
import { parseDocument } from '../syntax/parseDocument';
import type { SourceDocument } from '../syntax/types';
import { documentFindings } from './findings';

/** A text value at a top-level key, if the author wrote one. */
export function topLevelText(document: SourceDocument, key: string): string | undefined {
  const { value } = document;
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return undefined;
  const text = value[key];
  return typeof text === 'string' ? text : undefined;
}

/** The versions a recipe extends, the farthest first. A missing one or a ring is a finding and ends the search. */
function readBases(
  recipe: SourceDocument,
  bases: Readonly<Record<string, SourceText>>,
  findings: FindingList,
): readonly SourceDocument[] {
  const found: SourceDocument[] = [];
  const passed: string[] = [];
  let document = recipe;
  for (;;) {
    const reference = topLevelText(document, 'extends');
    if (reference === undefined) return found;
    const span = document.spanAt(['extends']);
    if (passed.includes(reference)) {
      const ring = [...passed.slice(passed.indexOf(reference)), reference].join(' → ');
      findings.report(documentFindings, 'extends-ring', span, { ring });
      return found;
    }
    const text = Object.hasOwn(bases, reference) ? bases[reference] : undefined;
    if (!text) {
      findings.report(documentFindings, 'base-not-found', span, { reference });
      return found;
    }
    passed.push(reference);
    document = parseDocument(text, findings);
    found.unshift(document);
  }
}

/** Parses a recipe with all it extends and the character's own patch, and merges them in that order. */
export function readRecipe(
  recipe: SourceText,
  bases: Readonly<Record<string, SourceText>>,
  patch: SourceText | undefined,
  findings: FindingList,
): MergedDocument {
  const own = parseDocument(recipe, findings);
  const layers = [...readBases(own, bases, findings), own];
  if (patch) layers.push(parseDocument(patch, findings));
  return mergeDocuments(layers);
}
