import {
  type Document,
  isAlias,
  isMap,
  isScalar,
  isSeq,
  type Node,
  type Pair,
  type Scalar,
  type YAMLMap,
} from 'yaml';
import type { FindingList } from '../findings/FindingList';
import type { LineIndex } from '../source/LineIndex';
import type { Span } from '../source/SourceText';
import { syntaxFindings } from './findings';
import { LIMITS } from './limits';
import { codeOf, findLookAlike } from './lookAlikes';
import type { JsonValue } from './types';
import { keyText } from './YamlSource';

const CORE_TAG = /^(tag:yaml\.org,2002:|!!)(str|int|float|bool|null|map|seq)$/;
const RESERVED_KEYS: ReadonlySet<string> = new Set(['__proto__', 'constructor', 'prototype']);
// Controls, format characters (zero-width, bidirectional, soft hyphen) and line separators: all of them can hide what
// a reader believes to see. Tab and line breaks are ordinary.
const HIDDEN = /(?![\t\n\r])[\p{Cc}\p{Cf}\p{Zl}\p{Zp}]/u;
const WHOLE_NUMBER = /^[-+]?[0-9]+$/;
/** Keys whose values are words for people, where any alphabet is welcome. */
const PROSE_KEYS: ReadonlySet<string> = new Set(['title', 'note', 'notes', 'unit']);

interface Anchored {
  readonly value: JsonValue | undefined;
  readonly nodes: number;
  /** Collections inside one another, aliases written out. */
  readonly depth: number;
}

/**
 * Turns a composed document into plain values, reporting what plain values cannot hold. Maps become objects without
 * surprises (no key can reach a prototype); an alias gives the very value of its anchor, within a bound on how far
 * the document would grow.
 */
export class ValueReader {
  /** Nodes by anchor, for looking up positions later. */
  readonly anchors = new Map<string, Node>();
  readonly #finished = new Map<string, Anchored>();
  /** Entries in which something was refused; see `SourceDocument.refusedEntries`. */
  readonly refusedEntries = new Set<string>();
  readonly #open = new Set<string>();
  /** Map keys from the top to the value being read. */
  readonly #path: string[] = [];
  #expanded = 0;
  /** Collections open around the value being read. */
  #depth = 0;
  /** The deepest place read so far within the anchor being read. */
  #deepest = 0;
  #refusedGrowth = false;
  #refusedDepth = false;

  constructor(
    private readonly document: Document,
    private readonly lines: LineIndex,
    private readonly findings: FindingList,
  ) {}

  read(): JsonValue | undefined {
    const { contents } = this.document;
    return contents === null ? undefined : this.#readNode(contents, false);
  }

  /** Marks the entry being read as one whose value is not whole. */
  #refuse(): void {
    this.refusedEntries.add(this.#path.slice(0, 2).join('/'));
  }

  #span(node: Node): Span {
    const range = node.range ?? [0, 0, 0];
    return this.lines.span(range[0], range[1]);
  }

  #readNode(node: unknown, isProse: boolean): JsonValue | undefined {
    this.#expanded += 1;
    if (isAlias(node)) return this.#readAlias(node.source, this.#span(node));
    if (!isScalar(node) && !isMap(node) && !isSeq(node)) return null;
    if (node.tag !== undefined && !CORE_TAG.test(node.tag)) {
      this.findings.report(syntaxFindings, 'tag-refused', this.#span(node), { tag: node.tag });
    }
    const { anchor } = node;
    if (anchor === undefined) return this.#readPlain(node, isProse);
    const before = this.#expanded;
    const deepestBefore = this.#deepest;
    this.#deepest = this.#depth;
    this.anchors.set(anchor, node);
    this.#open.add(anchor);
    const value = this.#readPlain(node, isProse);
    this.#open.delete(anchor);
    const depth = this.#deepest - this.#depth;
    this.#finished.set(anchor, { value, nodes: this.#expanded - before, depth });
    this.#deepest = Math.max(this.#deepest, deepestBefore);
    return value;
  }

  #readAlias(name: string, span: Span): JsonValue | undefined {
    if (this.#open.has(name)) {
      this.#refuse();
      this.findings.report(syntaxFindings, 'alias-ring', span, { name });
      return null;
    }
    const anchored = this.#finished.get(name);
    if (!anchored) {
      this.#refuse();
      this.findings.report(syntaxFindings, 'alias-unknown', span, { name });
      return null;
    }
    // The tokens show only how deep the text itself goes; aliases of values that hold aliases go deeper.
    const deepest = this.#depth + anchored.depth;
    if (deepest > LIMITS.depth) {
      if (!this.#refusedDepth)
        this.findings.report(syntaxFindings, 'nested-too-deep', span, { limit: LIMITS.depth });
      this.#refusedDepth = true;
      this.#refuse();
      return null;
    }
    this.#deepest = Math.max(this.#deepest, deepest);
    this.#expanded += anchored.nodes;
    if (this.#expanded > LIMITS.expandedNodes) {
      if (!this.#refusedGrowth) {
        this.findings.report(syntaxFindings, 'aliases-too-large', span, { limit: LIMITS.expandedNodes });
      }
      this.#refusedGrowth = true;
      this.#refuse();
      return null;
    }
    return anchored.value;
  }

  #readPlain(node: Node, isProse: boolean): JsonValue | undefined {
    if (isScalar(node)) return this.#readScalar(node, isProse);
    this.#depth += 1;
    this.#deepest = Math.max(this.#deepest, this.#depth);
    const value = isMap(node)
      ? this.#readMap(node, isProse)
      : isSeq(node)
        ? node.items.map((item) => this.#readNode(item, isProse) ?? null)
        : null;
    this.#depth -= 1;
    return value;
  }

  #readMap(map: YAMLMap, isProse: boolean): JsonValue {
    const result: { [key: string]: JsonValue } = {};
    const firsts = new Map<string, Pair>();
    for (const pair of map.items) {
      const key = this.#readKey(pair.key);
      if (key === null) {
        // Nothing of the pair is used, but anchors in it may be meant later on.
        if (!isScalar(pair.key)) this.#readNode(pair.key, true);
        this.#readNode(pair.value, true);
        continue;
      }
      const first = firsts.get(key);
      if (first) {
        this.findings.report(
          syntaxFindings,
          'duplicate-key',
          this.#span(pair.key as Node),
          { key },
          { related: [{ span: this.#span(first.key as Node), label: 'written here first' }] },
        );
        continue;
      }
      firsts.set(key, pair);
      this.#path.push(key);
      result[key] = this.#readNode(pair.value, isProse || PROSE_KEYS.has(key)) ?? null;
      this.#path.pop();
    }
    return result;
  }

  /** A key that may be used, or null with a finding. */
  #readKey(key: unknown): string | null {
    const node = isScalar(key) || isAlias(key) || isMap(key) || isSeq(key) ? key : null;
    const span = node ? this.#span(node) : this.lines.span(0, 0);
    if (!isScalar(key) || typeof key.value !== 'string') {
      this.#refuse();
      this.findings.report(syntaxFindings, 'key-not-text', span, {});
      return null;
    }
    const { value } = key;
    if (value === '<<') {
      this.#refuse();
      this.findings.report(syntaxFindings, 'merge-key', span, {});
      return null;
    }
    if (RESERVED_KEYS.has(value)) {
      this.#refuse();
      this.findings.report(syntaxFindings, 'key-reserved', span, { key: value });
      return null;
    }
    if (key.anchor !== undefined) {
      this.anchors.set(key.anchor, key);
      this.#finished.set(key.anchor, { value, nodes: 1, depth: 0 });
    }
    return this.#checkText(value, key, false) ? keyText(key) : null;
  }

  /** Reports hidden characters and look-alike letters; false when the text must not be used. */
  #checkText(text: string, node: Node, isProse: boolean): boolean {
    const hidden = HIDDEN.exec(text);
    if (hidden) {
      this.#refuse();
      this.findings.report(syntaxFindings, 'hidden-character', this.#span(node), {
        code: `U+${codeOf(hidden[0])}`,
      });
      return false;
    }
    const lookAlike = isProse ? null : findLookAlike(text);
    if (lookAlike) {
      const span = this.#span(node);
      this.findings.report(
        syntaxFindings,
        'look-alike-name',
        span,
        { name: text, ...lookAlike },
        {
          fix: {
            title: `Write "${lookAlike.twin}" in Latin letters`,
            safe: true,
            edits: [{ span, newText: lookAlike.twin }],
          },
        },
      );
    }
    return true;
  }

  #readScalar(node: Scalar, isProse: boolean): JsonValue | undefined {
    const { value } = node;
    switch (typeof value) {
      case 'string':
        if (!this.#checkText(value, node, isProse)) return undefined;
        return isProse ? value : (findLookAlike(value)?.twin ?? value);
      case 'number':
        return this.#readNumber(node, value);
      case 'boolean':
        return value;
      default:
        return null;
    }
  }

  #readNumber(node: Scalar, value: number): JsonValue | undefined {
    const text = (node.source ?? String(value)).slice(0, 40);
    if (!Number.isFinite(value)) {
      this.#refuse();
      this.findings.report(syntaxFindings, 'number-not-finite', this.#span(node), { text });
      return undefined;
    }
    if (!Number.isSafeInteger(value) && WHOLE_NUMBER.test(node.source ?? '')) {
      this.#refuse();
      this.findings.report(syntaxFindings, 'number-not-exact', this.#span(node), { text });
      return undefined;
    }
    if (Math.abs(value) > LIMITS.magnitude) {
      const parameters = { text, limit: LIMITS.magnitude };
      this.#refuse();
      this.findings.report(syntaxFindings, 'number-too-large', this.#span(node), parameters);
      return undefined;
    }
    return value + 0;
  }
}
