import { FindingList } from '../findings/FindingList';
import type { SourceText } from '../source/SourceText';
import { parseDocument } from '../syntax/parseDocument';
import { topLevelText } from './readRecipe';

/**
 * The name by which recipes call the house rules of a text: `name@version`, version 1 when it states none.
 * Undefined when the text has no readable name (a compile that follows it then says so).
 */
export function findHouseReference(house: SourceText): string | undefined {
  const document = parseDocument(house, new FindingList());
  const name = topLevelText(document, 'house');
  if (name === undefined) return undefined;
  const { value } = document;
  const version = typeof value === 'object' && value !== null && 'version' in value ? value.version : 1;
  return typeof version === 'number' ? `${name}@${version}` : undefined;
}
