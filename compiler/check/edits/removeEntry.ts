import type { Fix } from '../../findings/Finding';
import type { MergedDocument } from '../../merge/types';
import type { Path } from '../../syntax/types';
import { type EntrySpans, entrySpans } from './entrySpans';
import { spanNear } from './spanNear';

type Edit = Fix['edits'][number];

/** An anchor or alias, which other places may need; a multiplication has a space behind its star. */
const ANCHOR = /(^|[\s,:{[])[&*][^\s,}\]]/;

/** Where the blank stretch before an offset begins. Looked for backward: a pattern would search the whole text. */
function blankStart(text: string, end: number): number {
  let start = end;
  while (start > 0 && ' \t\r\n'.includes(text[start - 1] ?? '')) start -= 1;
  return start;
}

/** Removes an entry of a map in braces with the comma that sets it off. */
function removeFromBraces({ text, key, keyStart, valueEnd }: EntrySpans): Edit | null {
  const blank = blankStart(text, keyStart);
  const before = text[blank - 1];
  const after = /^\s*(,[ \t]*|\})/.exec(text.slice(valueEnd));
  if ((before !== '{' && before !== ',') || !after) return null;
  if (after[1] !== '}')
    return { span: spanNear(key, text, keyStart, valueEnd + after[0].length), newText: '' };
  // The last entry takes the comma before it away; the brace that opens the map stays.
  const start = before === '{' ? blank : blank - 1;
  const end = before === '{' ? valueEnd + after[0].length - 1 : valueEnd;
  return { span: spanNear(key, text, start, end), newText: '' };
}

/** Removes an entry of an indented map with its lines; comments above it stay. */
function removeLines({ text, key, keyStart, valueEnd }: EntrySpans): Edit | null {
  const start = text.lastIndexOf('\n', keyStart - 1) + 1;
  if (text.slice(start, keyStart).trim() !== '') return null;
  // A block of text ends behind its last line break; everything else before it.
  if (text[valueEnd - 1] === '\n') return { span: spanNear(key, text, start, valueEnd), newText: '' };
  const rest = /^[ \t]*(#[^\n]*)?\r?(\n|$)/.exec(text.slice(valueEnd));
  return rest ? { span: spanNear(key, text, start, valueEnd + rest[0].length), newText: '' } : null;
}

/** Leaves `{}` where an indented map would otherwise lose its only entry and read as nothing. */
function emptyMap(parent: EntrySpans): Edit | null {
  const { text, key, keyEnd, valueStart, valueEnd } = parent;
  if (!/^:\s*$/.test(text.slice(keyEnd, valueStart))) return null;
  const end = text[valueEnd - 1] === '\n' ? valueEnd - 1 : valueEnd;
  return { span: spanNear(key, text, keyEnd, end), newText: ': {}' };
}

/**
 * The edit that removes a map entry whole, in braces or on lines of its own, leaving its neighbours as they are; null
 * where that cannot be done by cutting text alone.
 */
export function removeEntry(document: MergedDocument, path: Path): Edit | null {
  const entry = entrySpans(document, path);
  if (!entry || ANCHOR.test(entry.text.slice(entry.keyEnd, entry.valueEnd))) return null;
  const parentPath = path.slice(0, -1);
  const layer = document.layers.find((each) => each.has(path));
  const siblings = valueIn(layer?.value, parentPath);
  if (typeof siblings !== 'object' || siblings === null || Array.isArray(siblings)) return null;
  if (parentPath.length === 0) return removeLines(entry);
  const parent = entrySpans(document, parentPath);
  if (!parent) return null;
  if (parent.text[parent.valueStart] === '{') return removeFromBraces(entry);
  return hasOneKey(siblings) ? emptyMap(parent) : removeLines(entry);
}

function hasOneKey(map: object): boolean {
  let count = 0;
  for (const _ in map) if (++count > 1) return false;
  return count === 1;
}

function valueIn(value: unknown, path: Path): unknown {
  let found = value;
  for (const step of path) {
    if (typeof found !== 'object' || found === null) return undefined;
    found = (found as Readonly<Record<string | number, unknown>>)[step];
  }
  return found;
}
