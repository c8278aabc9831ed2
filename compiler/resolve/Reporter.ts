import type { StageContext } from '../expand/StageContext';
import { closestNames } from '../findings/closestNames';
import type { Span } from '../source/SourceText';
import type { Path } from '../syntax/types';
import { resolveFindings } from './findings';
import type { HouseDocument } from './types';

/** Where findings of the resolve stage go, with the house rules for places the recipe did not write. */
export interface ResolveContext extends StageContext {
  readonly house: HouseDocument;
}

/** The place of a value that the recipe or else the house rules wrote. */
export function spanInRecipeOrHouse(
  context: ResolveContext,
  path: Path,
  part: 'key' | 'value' = 'value',
): Span {
  const inRecipe = context.document.layers.some((layer) => layer.has(path));
  return (inRecipe ? context.document : context.house.document).spanAt(path, part);
}

/** When one of these was refused as a whole, nothing can be said about any id. */
const COLLECTIONS_WITH_IDS: ReadonlySet<string> = new Set([
  'landmarks',
  'parts',
  'chains',
  'controls',
  'roles',
  'containers',
]);

/** Whether an id belongs to an entry that was refused earlier, so that a missing reference is no news. */
export function isPoisonedReference(context: StageContext, id: string): boolean {
  for (const place of context.poisoned) {
    if (COLLECTIONS_WITH_IDS.has(place)) return true;
    if (!place.includes('/')) continue;
    const entry = place.slice(place.indexOf('/') + 1);
    if (id === entry || id.startsWith(`${entry}.`)) return true;
  }
  return false;
}

/** Reports a reference that leads nowhere, with the closest names there are. */
export function reportUnknown(
  context: StageContext,
  span: Span,
  what: string,
  id: string,
  candidates: Iterable<string>,
): void {
  if (isPoisonedReference(context, id)) return;
  const close = closestNames(id, candidates);
  const [first] = close;
  context.findings.report(
    resolveFindings,
    'unknown-reference',
    span,
    { what, id },
    first === undefined
      ? {}
      : {
          help: `Did you mean ${close.map((name) => `"${name}"`).join(' or ')}?`,
          ...(close.length === 1
            ? { fix: { title: `Write "${first}"`, safe: false, edits: [{ span, newText: first }] } }
            : {}),
        },
  );
}
