import type { JsonValue } from '../syntax/types';

/** Names read as `<scope>.<name>` in any expression of a document. */
export function namesInExpressions(
  value: JsonValue | undefined,
  scope: 'params' | 'landmarks',
): ReadonlySet<string> {
  const names = new Set<string>();
  const pattern = new RegExp(`\\b${scope}\\s*\\.\\s*([a-z][a-z0-9_]*)`, 'g');
  const pending: (JsonValue | undefined)[] = [value];
  for (let item = pending.pop(); item !== undefined; item = pending.pop()) {
    if (typeof item === 'string') {
      if (item.startsWith('=')) for (const [, name] of item.matchAll(pattern)) names.add(name as string);
    } else if (typeof item === 'object' && item !== null) {
      for (const child of Object.values(item)) pending.push(child);
    }
  }
  return names;
}
