import { parse } from 'yaml';
import { DEFAULT_HOUSE, type SourceText } from '../../compiler/index';
import { readText } from './readText';

/**
 * House rules of a file under every name a recipe may call them by: their own name and version, and the default's,
 * so that `--house` also serves recipes that name none.
 */
export function readHouse(path: string | undefined): Readonly<Record<string, SourceText>> {
  if (path === undefined) return {};
  const text = readText(path);
  const houses: Record<string, SourceText> = { [DEFAULT_HOUSE]: text };
  try {
    const { house, version } = parse(text.text) as { house?: unknown; version?: unknown };
    if (typeof house === 'string') houses[`${house}@${typeof version === 'number' ? version : 1}`] = text;
  } catch {
    // Not YAML: the compiler reports it when the recipe follows these rules.
  }
  return houses;
}
