import type { JsonValue } from '../syntax/types';

/** Names that a document's expressions read. */
export interface ExpressionNames {
  readonly params: ReadonlySet<string>;
  readonly landmarks: ReadonlySet<string>;
}

const READ = /\b(params|landmarks)\s*\.\s*([a-z][a-z0-9_]*)/g;

/** Lists the names read as `params.name` and `landmarks.name` in all expressions of a document. */
export function namesInExpressions(value: JsonValue | undefined): ExpressionNames {
  const names = { params: new Set<string>(), landmarks: new Set<string>() };
  const pending: (JsonValue | undefined)[] = [value];
  for (let item = pending.pop(); item !== undefined; item = pending.pop()) {
    if (typeof item === 'string') {
      if (!item.startsWith('=')) continue;
      for (const [, scope, name] of item.matchAll(READ))
        names[scope as keyof ExpressionNames].add(name as string);
    } else if (typeof item === 'object' && item !== null) {
      for (const key in item) pending.push((item as { [key: string]: JsonValue })[key]);
    }
  }
  return names;
}
