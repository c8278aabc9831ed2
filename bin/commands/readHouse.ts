import { DEFAULT_HOUSE, findHouseReference, type SourceText } from '../../compiler/index';
import { readText } from './readText';

/**
 * House rules of a file under every name a recipe may call them by: their own name and version, and the default's,
 * so that `--house` also serves recipes that name none.
 */
export function readHouse(path: string | undefined): Readonly<Record<string, SourceText>> {
  if (path === undefined) return {};
  const text = readText(path);
  const reference = findHouseReference(text);
  return { [DEFAULT_HOUSE]: text, ...(reference === undefined ? {} : { [reference]: text }) };
}
