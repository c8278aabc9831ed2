import type { Fix } from '../../findings/Finding';
import type { MergedDocument } from '../../merge/types';
import type { Path } from '../../syntax/types';
import { entrySpans } from './entrySpans';
import { spanNear } from './spanNear';

type Edit = Fix['edits'][number];

/**
 * The edit that writes a new first entry into the map at `path`; `valueText` is one line of YAML. Null where no single
 * document wrote the map, or nothing stands in it yet that shows how it is indented.
 */
export function addKey(document: MergedDocument, path: Path, key: string, valueText: string): Edit | null {
  const map = entrySpans(document, path);
  if (!map) return null;
  const { key: known, text, valueStart: start } = map;
  if (text[start] === '{') {
    const isEmpty = /^\{\s*\}/.test(text.slice(start));
    const newText = isEmpty ? ` ${key}: ${valueText} ` : ` ${key}: ${valueText},`;
    return { span: spanNear(known, text, start + 1, start + 1), newText };
  }
  const lineStart = text.lastIndexOf('\n', start - 1) + 1;
  const indent = text.slice(lineStart, start);
  if (indent.trim() !== '' || indent === '') return null;
  return { span: spanNear(known, text, start, start), newText: `${key}: ${valueText}\n${indent}` };
}
