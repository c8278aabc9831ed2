import { recipeEnvironment, recipeFunctionNames } from './environment';

/** A name that an expression reads or calls, with its place in the expression's text. */
export interface NameRead {
  readonly scope: 'params' | 'landmarks' | 'functions';
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

type Scope = 'params' | 'landmarks';

/** The scope that a node accesses a member of, by a point or by brackets; null for any other node. */
function scopeOf({ op, args }: AstNode): Scope | null {
  if (op !== '.' && op !== '[]') return null;
  const [owner] = args as [unknown, unknown];
  if (!isNode(owner) || owner.op !== 'id') return null;
  return owner.args === 'params' || owner.args === 'landmarks' ? owner.args : null;
}

/** The function that a call names: `name(…)`, or `value.name(…)`, where the name follows the value. */
function calledName({ op, args, start }: AstNode, text: string): NameRead | null {
  if (op !== 'call' && op !== 'rcall') return null;
  const [name, receiver] = args as [string, unknown];
  const from = op === 'rcall' && isNode(receiver) ? text.indexOf(name, receiver.end) : start;
  return { scope: 'functions', name, start: from, end: from + name.length };
}

/**
 * Walks a syntax tree once: lists the names it reads and calls, and turns whole literals into doubles, because every
 * number of a recipe is one and `1 / 2` must be a half. A fault for a name that only evaluation could tell.
 */
function prepare(root: AstNode, text: string): readonly NameRead[] | { readonly fault: ExpressionFault } {
  const reads: NameRead[] = [];
  const pending: unknown[] = [root];
  for (let item = pending.pop(); item !== undefined; item = pending.pop()) {
    if (Array.isArray(item)) pending.push(...item);
    if (!isNode(item)) continue;
    const { op, args, start, end } = item;
    if (op === 'value') {
      if (typeof args === 'bigint') item.args = Number(args);
      continue;
    }
    const scope = scopeOf(item);
    if (scope && op === '[]') {
      return { fault: { problem: `names are read with a point, as in ${scope}.name`, start, end } };
    }
    if (scope) {
      const [, name] = args as [unknown, string];
      reads.push({ scope, name, start: end - name.length, end });
      continue;
    }
    const called = calledName(item, text);
    if (called) reads.push(called);
    pending.push(args);
  }
  return reads.sort((a, b) => a.start - b.start);
}

/**
 * Parses an expression (without its `=`). Never throws; a bad one gives a fault with its place in the text. Only
 * functions of recipes are ever called: CEL's own hold loops and patterns, whose time no limit bounds.
 */
export function parseExpression(text: string): ParsedExpression | { readonly fault: ExpressionFault } {
  try {
    const run = recipeEnvironment.parse(text);
    const reads = prepare(run.ast as unknown as AstNode, text);
    if ('fault' in reads) return reads;
    const foreign = reads.find(
      ({ scope, name }) => scope === 'functions' && !recipeFunctionNames.includes(name),
    );
    return {
      reads,
      evaluate(scope) {
        if (foreign) return { fault: { ...foreign, problem: `there is no function "${foreign.name}"` } };
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
