import type { JsonValue } from '../syntax/types';

function isObject(value: JsonValue | undefined): value is { [key: string]: JsonValue } {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/**
 * JSON Merge Patch, RFC 7396 section 2: objects merge key by key, null removes, anything else replaces. Neither
 * argument is changed; keys are set as own properties, so that `__proto__` is a key like any other.
 */
export function mergePatch(target: JsonValue | undefined, patch: JsonValue): JsonValue {
  if (!isObject(patch)) return patch;
  const merged: { [key: string]: JsonValue } = {};
  const set = (key: string, value: JsonValue): void => {
    Object.defineProperty(merged, key, { value, enumerable: true, writable: true, configurable: true });
  };
  if (isObject(target)) for (const [key, value] of Object.entries(target)) set(key, value);
  for (const [key, value] of Object.entries(patch)) {
    if (value === null) delete merged[key];
    else set(key, mergePatch(Object.hasOwn(merged, key) ? merged[key] : undefined, value));
  }
  return merged;
}
