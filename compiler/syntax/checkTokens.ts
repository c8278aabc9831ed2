import type { CST } from 'yaml';
import type { FindingList } from '../findings/FindingList';
import type { LineIndex } from '../source/LineIndex';
import { syntaxFindings } from './findings';
import { LIMITS } from './limits';

interface Pending {
  readonly token: CST.Token;
  readonly depth: number;
}

/** Counts anchors among the small tokens that stand before a value. */
function countAnchors(tokens: readonly CST.SourceToken[] | undefined): number {
  let count = 0;
  if (tokens) for (const token of tokens) if (token.type === 'anchor') count += 1;
  return count;
}

/**
 * Checks the bounds of a document on its tokens, without recursion, and reports the first that is passed. True when
 * the document may be composed.
 */
export function checkTokens(tokens: readonly CST.Token[], lines: LineIndex, findings: FindingList): boolean {
  const pending: Pending[] = [];
  for (let index = tokens.length - 1; index >= 0; index -= 1)
    pending.push({ token: tokens[index] as CST.Token, depth: 0 });
  let nodes = 0;
  let anchors = 0;
  const refuse = (
    code: 'nested-too-deep' | 'too-many-nodes' | 'too-many-keys' | 'too-many-anchors',
    offset: number,
    limit: number,
  ): false => {
    findings.report(syntaxFindings, code, lines.span(offset, offset + 1), { limit });
    return false;
  };

  for (let item = pending.pop(); item; item = pending.pop()) {
    const { token, depth } = item;
    switch (token.type) {
      case 'document':
        anchors += countAnchors(token.start);
        if (token.value) pending.push({ token: token.value, depth });
        break;
      case 'block-map':
      case 'block-seq':
      case 'flow-collection': {
        nodes += 1;
        if (depth >= LIMITS.depth) return refuse('nested-too-deep', token.offset, LIMITS.depth);
        if (token.items.length > LIMITS.keys) return refuse('too-many-keys', token.offset, LIMITS.keys);
        for (let index = token.items.length - 1; index >= 0; index -= 1) {
          const entry = token.items[index];
          if (!entry) continue;
          anchors += countAnchors(entry.start) + countAnchors(entry.sep);
          if (entry.value) pending.push({ token: entry.value, depth: depth + 1 });
          if (entry.key) pending.push({ token: entry.key, depth: depth + 1 });
        }
        break;
      }
      case 'scalar':
      case 'single-quoted-scalar':
      case 'double-quoted-scalar':
      case 'block-scalar':
        nodes += 1;
        if (token.source.length > LIMITS.scalar) {
          findings.report(
            syntaxFindings,
            'scalar-too-long',
            lines.span(token.offset, token.offset + token.source.length),
            {
              size: token.source.length,
              limit: LIMITS.scalar,
            },
          );
          return false;
        }
        break;
      case 'alias':
        nodes += 1;
        break;
      default:
        break;
    }
    if (nodes > LIMITS.nodes) return refuse('too-many-nodes', tokenOffset(token), LIMITS.nodes);
    if (anchors > LIMITS.anchors) return refuse('too-many-anchors', tokenOffset(token), LIMITS.anchors);
  }
  return true;
}

function tokenOffset(token: CST.Token): number {
  return 'offset' in token ? token.offset : 0;
}
