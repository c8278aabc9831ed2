import type { Fix } from '../../findings/Finding';
import type { MergedDocument } from '../../merge/types';
import type { Path } from '../../syntax/types';
import { addKeys } from './addKeys';

/** As `addKeys`, for a single entry. */
export function addKey(
  document: MergedDocument,
  path: Path,
  key: string,
  valueText: string,
): Fix['edits'][number] | null {
  return addKeys(document, path, [[key, valueText]]);
}
