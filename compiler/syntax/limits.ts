/**
 * Bounds on one document, checked on the token stream before anything is composed, because the YAML library can
 * end the whole process on deep nesting and slows down on very many anchors. Real recipes stay far below them.
 */
export const LIMITS = {
  /** UTF-16 code units; 1 MiB. */
  characters: 1024 * 1024,
  /** Collections inside one another. */
  depth: 64,
  /** Scalars and collections in the whole document. */
  nodes: 100_000,
  /** Keys of one map. */
  keys: 10_000,
  /** Anchors in the document. */
  anchors: 200,
  /** Nodes the document would have with every alias written out. */
  expandedNodes: 200_000,
  /** Characters of one scalar. */
  scalar: 20_000,
  /** Absolute value of a number; no length, angle or factor of a character comes near it. */
  magnitude: 1e9,
} as const;
