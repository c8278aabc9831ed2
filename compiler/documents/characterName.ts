import type { FindingList } from '../findings/FindingList';
import type { MergedDocument } from '../merge/types';
import { documentFindings } from './findings';

const CHARACTER_NAME = /^[a-z][a-z0-9_]{0,59}$/;

/**
 * The name that begins every name in the scene: the one given, else the recipe's own. One that could not be part
 * of a name is a finding; the recipe's own is checked by its schema.
 */
export function characterNameOf(
  given: string | undefined,
  recipe: MergedDocument,
  findings: FindingList,
): string {
  const { value } = recipe;
  const own = typeof value === 'object' && value !== null && !Array.isArray(value) ? value.recipe : undefined;
  const fallback = typeof own === 'string' && CHARACTER_NAME.test(own) ? own : 'unnamed';
  if (given === undefined) return fallback;
  if (CHARACTER_NAME.test(given)) return given;
  findings.report(documentFindings, 'character-name', recipe.spanAt(['recipe']), { name: given });
  return fallback;
}
