import type { FindingList } from '../findings/FindingList';
import { HOUSE_TEXTS } from '../house/generated/houseTexts';
import { mergeDocuments } from '../merge/mergeDocuments';
import type { MergedDocument } from '../merge/types';
import type { HouseDocument } from '../resolve/types';
import { checkHouseShape } from '../schema/checkShape';
import type { SourceText } from '../source/SourceText';
import { parseDocument } from '../syntax/parseDocument';
import { documentFindings } from './findings';

/** House rules that come with Pintle; a recipe that names none follows the first. */
export const DEFAULT_HOUSE = 'standard@1';

const BUILT_IN: Readonly<Record<string, SourceText>> = Object.fromEntries(
  Object.entries(HOUSE_TEXTS).map(([name, text]) => [`${name}@1`, { name: `${name}.house.yaml`, text }]),
);

/**
 * Finds and checks the house rules a recipe names, or the default ones. Null, with findings, when there are none to
 * work with.
 */
export function readHouse(
  named: string | undefined,
  recipe: MergedDocument,
  houses: Readonly<Record<string, SourceText>>,
  findings: FindingList,
): { readonly reference: string; readonly house: HouseDocument } | null {
  const reference = named ?? DEFAULT_HOUSE;
  const known = { ...BUILT_IN, ...houses };
  const text = Object.hasOwn(known, reference) ? known[reference] : undefined;
  if (!text) {
    const span = recipe.spanAt(['house']);
    findings.report(documentFindings, 'house-not-found', span, {
      reference,
      known: Object.keys(known).join(', '),
    });
    return null;
  }
  const document = mergeDocuments([parseDocument(text, findings)]);
  if (document.value === undefined) return null;
  const { value, isSound } = checkHouseShape(document, findings);
  return isSound && value ? { reference, house: { document, rules: value } } : null;
}
