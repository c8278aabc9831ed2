import type { ResolvedRecipe } from '../resolve/types';

/**
 * Answers whether one thing hangs beneath another, through seats as well, in one step whatever the depth: each node
 * of the tree gets the first and last number of a walk through everything beneath it.
 */
export class Lineage {
  readonly #first = new Map<string, number>();
  readonly #last = new Map<string, number>();

  constructor(recipe: Pick<ResolvedRecipe, 'nodes' | 'seats'>) {
    const followed = new Map(recipe.seats.map(({ id, follows }) => [id, follows]));
    const children = new Map<string | null, string[]>();
    for (const { id, parent } of recipe.nodes) {
      const above = followed.get(id) ?? parent;
      const siblings = children.get(above);
      if (siblings) siblings.push(id);
      else children.set(above, [id]);
    }
    let count = 0;
    // An entry is met twice: on the way down, and once everything beneath it is numbered.
    const pending = [...(children.get(null) ?? [])];
    while (pending.length > 0) {
      const id = pending[pending.length - 1] as string;
      if (this.#first.has(id)) {
        pending.pop();
        this.#last.set(id, count);
        continue;
      }
      count += 1;
      this.#first.set(id, count);
      for (const child of children.get(id) ?? []) pending.push(child);
    }
  }

  /** Whether `id` hangs anywhere beneath `above`; a thing does not hang beneath itself. */
  isBeneath(id: string, above: string): boolean {
    const place = this.#first.get(id);
    const from = this.#first.get(above);
    const to = this.#last.get(above);
    return place !== undefined && from !== undefined && to !== undefined && from < place && place <= to;
  }
}
