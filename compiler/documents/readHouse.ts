import type { Finding } from '../findings/Finding';
import { FindingList } from '../findings/FindingList';
import { canonicalJson } from '../hash/canonicalJson';
import { sha256Hex } from '../hash/sha256Hex';
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

/** House rules as read from one text, with what was found in them and their hash. */
interface ReadHouse {
  readonly house: HouseDocument | null;
  readonly hash: string;
  readonly findings: readonly Finding[];
}

/**
 * House rules change far less often than recipes, so each text object is read once. This is a memory of a pure
 * function by the identity of its input, and forgets a text when its owner does.
 */
const readTexts = new WeakMap<SourceText, ReadHouse>();

function readText(text: SourceText): ReadHouse {
  const known = readTexts.get(text);
  if (known) return known;
  const findings = new FindingList();
  const document = mergeDocuments([parseDocument(text, findings)]);
  const shape = document.value === undefined ? null : checkHouseShape(document, findings);
  const house = shape?.isSound && shape.value ? { document, rules: shape.value } : null;
  const hash = house ? sha256Hex(canonicalJson(house.rules)) : '';
  const read: ReadHouse = { house, hash, findings: findings.all };
  readTexts.set(text, read);
  return read;
}

/** The house rules a compile follows. */
export interface FoundHouse {
  readonly reference: string;
  readonly house: HouseDocument;
  /** SHA-256 of their canonical form. */
  readonly hash: string;
}

/**
 * Finds and checks the house rules a recipe names, or the default ones. Null, with findings, when there are none to
 * work with.
 */
export function readHouse(
  named: string | undefined,
  recipe: MergedDocument,
  houses: Readonly<Record<string, SourceText>>,
  findings: FindingList,
): FoundHouse | null {
  const reference = named ?? DEFAULT_HOUSE;
  const text = [houses, BUILT_IN].find((known) => Object.hasOwn(known, reference))?.[reference];
  if (!text) {
    const known = [...Object.keys(BUILT_IN), ...Object.keys(houses)].join(', ');
    findings.report(documentFindings, 'house-not-found', recipe.spanAt(['house']), { reference, known });
    return null;
  }
  const { house, hash, findings: found } = readText(text);
  for (const finding of found) findings.add(finding);
  return house && { reference, house, hash };
}
