import type { Fix } from '../../findings/Finding';
import type { MergedDocument } from '../../merge/types';
import type { Path } from '../../syntax/types';
import { entrySpans } from './entrySpans';
import { spanNear } from './spanNear';

type Edit = Fix['edits'][number];

/**
 * The edit that writes new first entries into the map at `path`, each value one line of YAML. Null where no single
 * document wrote the map, or nothing stands in it yet that shows how it is indented.
 */
export function addKeys(
  document: MergedDocument,
  path: Path,
  entries: readonly (readonly [string, string])[],
): Edit | null {
  const map = entrySpans(document, path);
  if (!map) return null;
  const { key: known, text, valueStart: start } = map;
  const lines = entries.map(([key, valueText]) => `${key}: ${valueText}`);
  if (text[start] === '{') {
    const isEmpty = /^\{\s*\}/.test(text.slice(start));
    const newText = isEmpty ? ` ${lines.join(', ')} ` : ` ${lines.join(', ')},`;
    return { span: spanNear(known, text, start + 1, start + 1), newText };
  }
  const lineStart = text.lastIndexOf('\n', start - 1) + 1;
  const indent = text.slice(lineStart, start);
  if (indent.trim() !== '' || indent === '') return null;
  return {
    span: spanNear(known, text, start, start),
    newText: lines.map((line) => `${line}\n${indent}`).join(''),
  };
}
