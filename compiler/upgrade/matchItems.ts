import { canonicalJson } from '../hash/canonicalJson';
import { idOf, isNodeItem, type RigItem, renamedStep } from './RigItem';

/** Pairs of one thing in both rigs, by their places in the lists; what is in no pair was removed or added. */
export type ItemPairs = ReadonlyMap<number, number>;

/** What two items must share to be one thing: their verb, and whether they are nodes or links. */
function kindOf(item: RigItem): string {
  return isNodeItem(item) ? item.step.verb : `link ${item.step.verb}`;
}

/** What a thing is and refers to, without what it is called: alike in both versions of one that was only renamed. */
function shapeOf({ step }: RigItem, names: ReadonlyMap<string, string>): string {
  const renamed = renamedStep(step, (name) => names.get(name) ?? name);
  const { id: _, ...values } = renamed.values as Readonly<Record<string, unknown>>;
  return canonicalJson({ verb: step.verb, ...values } as never);
}

/**
 * Finds what is one thing in both rigs: first by stable id; then, of what is left, by name; then what is alike in all
 * but its id and name, when exactly one on either side is. Never guesses between several.
 */
export function matchItems(before: readonly RigItem[], after: readonly RigItem[]): ItemPairs {
  const pairs = new Map<number, number>();
  const taken = new Set<number>();
  const pair = (keyOf: (item: RigItem) => string | null, isUniqueOnly: boolean): void => {
    const left = new Map<string, number[]>();
    const right = new Map<string, number[]>();
    const collect = (
      items: readonly RigItem[],
      into: Map<string, number[]>,
      isFree: (index: number) => boolean,
    ) => {
      items.forEach((item, index) => {
        const key = isFree(index) ? keyOf(item) : null;
        if (key === null) return;
        const places = into.get(key);
        if (places) places.push(index);
        else into.set(key, [index]);
      });
    };
    collect(before, left, (index) => !pairs.has(index));
    collect(after, right, (index) => !taken.has(index));
    for (const [key, places] of left) {
      const others = right.get(key) ?? [];
      const [first, second] = [places[0], others[0]];
      if (first === undefined || second === undefined) continue;
      if (isUniqueOnly && (places.length > 1 || others.length > 1)) continue;
      pairs.set(first, second);
      taken.add(second);
    }
  };
  pair((item) => `${kindOf(item)} ${idOf(item)}`, true);
  pair((item) => `${kindOf(item)} ${item.step.name}`, true);

  // Names found above count as the same, so a renamed joint is found beneath a renamed chain; again for what refers to
  // what was found.
  const isOld = new Set(before);
  for (let found = -1; found < pairs.size; ) {
    found = pairs.size;
    const names = new Map<string, string>();
    for (const [from, to] of pairs) names.set(before[from]?.step.name ?? '', after[to]?.step.name ?? '');
    pair((item) => shapeOf(item, isOld.has(item) ? names : new Map()), true);
  }
  return pairs;
}
