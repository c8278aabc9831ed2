import {
  type Document,
  isAlias,
  isMap,
  isNode,
  isScalar,
  isSeq,
  type Node,
  type Pair,
  type YAMLMap,
} from 'yaml';
import type { LineIndex } from '../source/LineIndex';
import type { SourceText, Span } from '../source/SourceText';
import { findLookAlike } from './lookAlikes';
import type { JsonValue, Path, SourceDocument } from './types';

/** The text of a map key as every stage knows it: look-alike letters read as the Latin ones they imitate. */
export function keyText(key: unknown): string | null {
  if (!isScalar(key)) return null;
  const { value } = key;
  if (typeof value !== 'string') return null;
  return findLookAlike(value)?.twin ?? value;
}

/** The pairs of a map by key, the first of each; later twins are findings and are not read. */
function indexPairs(map: YAMLMap): ReadonlyMap<string, Pair> {
  const pairs = new Map<string, Pair>();
  for (const pair of map.items) {
    const key = keyText(pair.key);
    if (key !== null && !pairs.has(key)) pairs.set(key, pair);
  }
  return pairs;
}

/** A parsed YAML text. Positions are looked up in its tree on demand, since most values never need one. */
export class YamlSource implements SourceDocument {
  readonly value: JsonValue | undefined;
  readonly isBroken: boolean;
  readonly refusedEntries: ReadonlySet<string>;
  readonly #document: Document | null;
  readonly #anchors: ReadonlyMap<string, Node>;
  /** Made when a map is first looked into: thousands of findings may each look up one of thousands of entries. */
  readonly #pairs = new Map<YAMLMap, ReadonlyMap<string, Pair>>();

  /** `read` is null for a text that was refused as a whole. */
  constructor(
    readonly source: SourceText,
    private readonly lines: LineIndex,
    read: {
      readonly document: Document;
      readonly value: JsonValue | undefined;
      readonly anchors: ReadonlyMap<string, Node>;
      readonly refusedEntries: ReadonlySet<string>;
    } | null,
  ) {
    this.value = read?.value;
    this.isBroken = read === null || read.document.errors.length > 0;
    this.refusedEntries = read?.refusedEntries ?? new Set();
    this.#document = read?.document ?? null;
    this.#anchors = read?.anchors ?? new Map();
  }

  #follow(node: unknown): Node | null {
    if (isAlias(node)) return this.#anchors.get(node.source) ?? null;
    return isNode(node) ? node : null;
  }

  #pairIn(map: YAMLMap, key: string): Pair | undefined {
    let pairs = this.#pairs.get(map);
    if (!pairs) {
      pairs = indexPairs(map);
      this.#pairs.set(map, pairs);
    }
    return pairs.get(key);
  }

  /** The pair or node at a path, as far as it was written, and whether the whole path was. */
  #find(path: Path): { readonly node: Node | null; readonly pair: Pair | null; readonly whole: boolean } {
    let node: Node | null = this.#document?.contents ?? null;
    let pair: Pair | null = null;
    for (const step of path) {
      const here: Node | null = this.#follow(node);
      if (isMap(here)) {
        const next = this.#pairIn(here, String(step));
        if (!next) return { node, pair, whole: false };
        pair = next;
        node = isNode(next.value) ? next.value : null;
      } else if (isSeq(here) && typeof step === 'number' && isNode(here.items[step])) {
        pair = null;
        node = here.items[step] as Node;
      } else {
        return { node, pair, whole: false };
      }
    }
    return { node, pair, whole: true };
  }

  has(path: Path): boolean {
    return this.#find(path).whole;
  }

  /** The document's first key, which stands for the whole where something at the top is missing. */
  #firstKey(path: Path): Node | null {
    const contents = this.#document?.contents;
    const first = path.length <= 1 && isMap(contents) ? contents.items[0]?.key : null;
    return isNode(first) ? first : null;
  }

  spanAt(path: Path, part: 'value' | 'key' = 'value'): Span {
    const { node, pair, whole } = this.#find(path);
    // What was not written is shown at the key of the nearest entry around it: its whole value would say nothing.
    const wantsKey = part === 'key' || !whole;
    const key = pair && isNode(pair.key) ? pair.key : this.#firstKey(path);
    const range = (wantsKey ? (key ?? node) : (node ?? key))?.range;
    if (!range) return this.lines.span(0, 0);
    const [start, end] = range;
    if (!whole && !key) return this.lines.span(start, Math.min(end, start + 1));
    return this.lines.span(start, end);
  }
}
