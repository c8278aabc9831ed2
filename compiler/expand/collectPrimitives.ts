import type { EvaluatedRecipe } from '../expressions/EvaluatedRecipe';
import { mergePatch } from '../merge/mergePatch';
import { expandPart } from '../parts/expandPart';
import type { Side, Vec3 } from '../rig/Rig';
import type { JsonValue, Path } from '../syntax/types';
import { mirrorEntry } from './mirrorEntry';
import {
  COLLECTIONS,
  type Collection,
  type MadePrimitives,
  type PartEntry,
  type PrimitiveEntries,
  type Sided,
} from './primitives';
import { mirrorId, sideOfId } from './sides';

type Collected = { readonly [C in Collection]: Map<string, Sided<PrimitiveEntries[C]>> };
type SideOption = Side | 'both';
type Parts = Readonly<Record<string, PartEntry>>;

function emptyCollections(): Collected {
  return Object.fromEntries(COLLECTIONS.map((collection) => [collection, new Map()])) as unknown as Collected;
}

/** The ids under which a part or primitive appears: one for each side it stands on. */
function sidedIds(id: string, option: SideOption): readonly { readonly id: string; readonly side: Side }[] {
  if (option !== 'both') {
    const needsSuffix = option !== 'centre' && sideOfId(id) === 'centre';
    return [{ id: needsSuffix ? `${id}.${option}` : id, side: option }];
  }
  const left = sideOfId(id) === 'left' ? id : `${id}.left`;
  return [
    { id: left, side: 'left' },
    { id: mirrorId(left), side: 'right' },
  ];
}

function addMade(into: Collected, made: MadePrimitives, side: Side, partId: string): void {
  for (const collection of COLLECTIONS) {
    for (const [id, entry] of Object.entries(made[collection] ?? {})) {
      const target = into[collection] as Map<string, Sided<unknown>>;
      target.set(id, { id, side, entry, path: ['parts', partId], part: partId });
    }
  }
}

function mirrorMade(made: MadePrimitives, left: Vec3): MadePrimitives {
  const copy: Partial<Record<Collection, Record<string, unknown>>> = {};
  for (const collection of COLLECTIONS) {
    const entries: Record<string, unknown> = {};
    for (const [id, entry] of Object.entries(made[collection] ?? {})) {
      entries[mirrorId(id)] = mirrorEntry(entry as PrimitiveEntries[Collection], left);
    }
    copy[collection] = entries;
  }
  return copy as MadePrimitives;
}

/** What a part does to what other parts make, once all of them are written out. */
interface Adjustment {
  readonly part: string;
  readonly adjusts: MadePrimitives;
  readonly side: Side;
}

function addPart(
  into: Collected,
  adjustments: Adjustment[],
  id: string,
  parts: Parts,
  part: PartEntry,
  left: Vec3,
): void {
  const option: SideOption = ('side' in part ? part.side : undefined) ?? sideOfId(id);
  const [first, second] = sidedIds(id, option);
  if (!first) return;
  const made = expandPart({ ...first, parts }, part);
  const { adjusts = {} } = made;
  addMade(into, made, first.side, id);
  adjustments.push({ part: id, adjusts, side: first.side });
  if (!second) return;
  addMade(into, mirrorMade(made, left), second.side, id);
  adjustments.push({ part: id, adjusts: mirrorMade(adjusts, left), side: second.side });
}

function applyAdjustment(into: Collected, { part, adjusts, side }: Adjustment): void {
  for (const collection of COLLECTIONS) {
    const target = into[collection] as Map<string, Sided<PrimitiveEntries[Collection]>>;
    for (const [id, entry] of Object.entries(adjusts[collection] ?? {})) {
      // A part that is adjusted but not there has a finding of its own where it is named.
      if (target.has(id)) addEntry(target, { id, side }, entry, ['parts', part]);
    }
  }
}

/** Merges an author's entry onto what a part made under the same id, or adds it as new. */
function addEntry<C extends Collection>(
  into: Map<string, Sided<PrimitiveEntries[C]>>,
  sided: { readonly id: string; readonly side: Side },
  entry: PrimitiveEntries[C],
  path: Path,
): void {
  if (entry.omit) {
    into.delete(sided.id);
    return;
  }
  const made = into.get(sided.id);
  into.set(sided.id, {
    id: sided.id,
    side: made?.side ?? sided.side,
    entry: made
      ? (mergePatch(
          made.entry as unknown as JsonValue,
          entry as unknown as JsonValue,
        ) as unknown as PrimitiveEntries[C])
      : entry,
    path,
    part: made?.part ?? null,
  });
}

function addEntries<C extends Collection>(
  into: Map<string, Sided<PrimitiveEntries[C]>>,
  collection: C,
  entries: Readonly<Record<string, PrimitiveEntries[C]>>,
  left: Vec3,
  isPoisoned: (place: string) => boolean,
): void {
  for (const [id, entry] of Object.entries(entries)) {
    if (isPoisoned(`${collection}/${id}`)) continue;
    const path = [collection, id];
    const option: SideOption = entry.side ?? sideOfId(id);
    const sides = into.has(id) && option !== 'both' ? [{ id, side: option }] : sidedIds(id, option);
    sides.forEach((sided, index) => {
      addEntry(into, sided, index === 0 ? entry : mirrorEntry<C>(entry, left), path);
    });
  }
}

/** Writes out every part and side and lays the author's own entries on top, by id, as RFC 7396 merge patches. */
export function collectPrimitives(
  recipe: EvaluatedRecipe,
  left: Vec3,
  poisoned: ReadonlySet<string>,
): Collected {
  const collected = emptyCollections();
  const isPoisoned = (place: string): boolean => poisoned.has(place);
  const parts: Parts = recipe.parts ?? {};
  const adjustments: Adjustment[] = [];
  for (const [id, part] of Object.entries(parts)) {
    if (!isPoisoned(`parts/${id}`)) addPart(collected, adjustments, id, parts, part, left);
  }
  for (const adjustment of adjustments) applyAdjustment(collected, adjustment);
  for (const collection of COLLECTIONS) {
    const into = collected[collection] as Map<string, Sided<PrimitiveEntries[Collection]>>;
    addEntries(into, collection, recipe[collection] ?? {}, left, isPoisoned);
  }
  return collected;
}
