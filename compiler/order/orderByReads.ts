/** Things in an order in which each comes after those it needs, and the rings that stand against such an order. */
export interface ReadOrder<T> {
  readonly order: readonly T[];
  /** Each as a path that ends where it began. */
  readonly rings: readonly (readonly T[])[];
}

interface Visit<T> {
  readonly thing: T;
  readonly reads: readonly T[];
  next: number;
}

/**
 * Orders things (all different) by what they read; reads of other things do not count. Things keep the order they
 * were given in, but for those that are read before their turn. Walks without recursion, because a document may hold
 * thousands that read one another in a row.
 */
export function orderByReads<T>(things: readonly T[], readsOf: (thing: T) => readonly T[]): ReadOrder<T> {
  const known = new Set(things);
  const settled = new Set<T>();
  const order: T[] = [];
  const rings: (readonly T[])[] = [];
  for (const first of things) {
    const open = new Map<T, number>();
    const walk: Visit<T>[] = [];
    const enter = (thing: T): void => {
      open.set(thing, walk.length);
      walk.push({ thing, reads: [...new Set(readsOf(thing))], next: 0 });
    };
    if (!settled.has(first)) enter(first);
    for (let visit = walk.at(-1); visit; visit = walk.at(-1)) {
      const read = visit.reads[visit.next];
      visit.next += 1;
      if (read === undefined) {
        walk.pop();
        open.delete(visit.thing);
        settled.add(visit.thing);
        order.push(visit.thing);
        continue;
      }
      const start = open.get(read);
      if (start !== undefined) rings.push([...walk.slice(start).map(({ thing }) => thing), read]);
      else if (known.has(read) && !settled.has(read)) enter(read);
    }
  }
  return { order, rings };
}
