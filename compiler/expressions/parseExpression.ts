import { recipeEnvironment } from './environment';

/** A name that an expression reads, with its place in the expression's text. */
export interface NameRead {
  readonly scope: 'params' | 'landmarks';
  readonly name: string;
  readonly start: number;
  readonly end: number;
}

/** What went wrong in an expression and where in its text. */
export interface ExpressionFault {
  readonly problem: string;
  readonly start: number;
  readonly end: number;
}

export interface ParsedExpression {
  readonly reads: readonly NameRead[];
  /** Works the expression out; a fault when it cannot be. */
  evaluate(
    scope: Readonly<Record<string, unknown>>,
  ): { readonly value: unknown } | { readonly fault: ExpressionFault };
}

interface AstNode {
  readonly op: string;
  args: unknown;
  readonly start: number;
  readonly end: number;
}

function isNode(value: unknown): value is AstNode {
  return typeof value === 'object' && value !== null && 'op' in value && 'args' in value;
}

function toFault(error: unknown, text: string): ExpressionFault {
  const { summary, message, range } = error as {
    readonly summary?: string;
    readonly message?: string;
    readonly range?: { readonly start: number; readonly end: number } | null;
  };
  const words = (summary ?? message ?? 'unknown fault').split('\n')[0] ?? '';
  const problem = words.charAt(0).toLowerCase() + words.slice(1);
  const start = Math.min(range?.start ?? 0, text.length);
  return { problem, start, end: Math.max(range?.end ?? text.length, start) };
}

/**
 * Walks a syntax tree once: lists the names it reads, and turns whole literals into doubles, because every number
 * of a recipe is one and `1 / 2` must be a half.
 */
function prepare(root: AstNode): readonly NameRead[] {
  const reads: NameRead[] = [];
  const pending: unknown[] = [root];
  for (let item = pending.pop(); item !== undefined; item = pending.pop()) {
    if (Array.isArray(item)) pending.push(...item);
    if (!isNode(item)) continue;
    if (item.op === 'value') {
      if (typeof item.args === 'bigint') item.args = Number(item.args);
      continue;
    }
    if (item.op === '.' && Array.isArray(item.args)) {
      const [owner, name] = item.args as [unknown, unknown];
      if (isNode(owner) && owner.op === 'id' && typeof name === 'string') {
        if (owner.args === 'params' || owner.args === 'landmarks') {
          reads.push({ scope: owner.args, name, start: item.end - name.length, end: item.end });
          continue;
        }
      }
    }
    pending.push(item.args);
  }
  return reads.reverse();
}

/** Parses an expression (without its `=`). Never throws; a bad one gives a fault with its place in the text. */
export function parseExpression(text: string): ParsedExpression | { readonly fault: ExpressionFault } {
  try {
    const run = recipeEnvironment.parse(text);
    const reads = prepare(run.ast as unknown as AstNode);
    return {
      reads,
      evaluate(scope) {
        try {
          return { value: run(scope) };
        } catch (error) {
          return { fault: toFault(error, text) };
        }
      },
    };
  } catch (error) {
    return { fault: toFault(error, text) };
  }
}
