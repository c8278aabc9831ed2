/** Names in an order in which each comes after those it reads, and the rings that stand against such an order. */
export interface ReadOrder {
  readonly order: readonly string[];
  /** Each as a path that ends where it began. */
  readonly rings: readonly (readonly string[])[];
}

interface Visit {
  readonly name: string;
  readonly reads: readonly string[];
  next: number;
}

/**
 * Orders names by what they read; reads of other names do not count. Walks without recursion, because a document may
 * hold thousands that read one another in a row.
 */
export function orderByReads(
  names: readonly string[],
  readsOf: (name: string) => readonly string[],
): ReadOrder {
  const known = new Set(names);
  const settled = new Set<string>();
  const order: string[] = [];
  const rings: (readonly string[])[] = [];
  for (const first of names) {
    const open = new Map<string, number>();
    const walk: Visit[] = [];
    const enter = (name: string): void => {
      open.set(name, walk.length);
      walk.push({ name, reads: [...new Set(readsOf(name))], next: 0 });
    };
    if (!settled.has(first)) enter(first);
    for (let visit = walk.at(-1); visit; visit = walk.at(-1)) {
      const read = visit.reads[visit.next];
      visit.next += 1;
      if (read === undefined) {
        walk.pop();
        open.delete(visit.name);
        settled.add(visit.name);
        order.push(visit.name);
        continue;
      }
      const start = open.get(read);
      if (start !== undefined) rings.push([...walk.slice(start).map(({ name }) => name), read]);
      else if (known.has(read) && !settled.has(read)) enter(read);
    }
  }
  return { order, rings };
}
