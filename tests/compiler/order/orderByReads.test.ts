import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { orderByReads } from '@/compiler/order/orderByReads';

const NAMES = ['a', 'b', 'c', 'd', 'e', 'f'];
const graph = fc.dictionary(
  fc.constantFrom(...NAMES),
  fc.array(fc.constantFrom(...NAMES, 'elsewhere'), { maxLength: 4 }),
  { noNullPrototype: true },
);

/** All names that can be reached by reads, by the plainest means. */
function reached(from: string, reads: Readonly<Record<string, readonly string[]>>): ReadonlySet<string> {
  const seen = new Set<string>();
  for (let size = -1; size !== seen.size; ) {
    size = seen.size;
    for (const name of [from, ...seen]) for (const read of reads[name] ?? []) seen.add(read);
  }
  return seen;
}

describe('orderByReads', () => {
  it('puts each name once, after those it reads unless they read it too', () => {
    fc.assert(
      fc.property(graph, (reads) => {
        const { order } = orderByReads(NAMES, (name) => reads[name] ?? []);
        expect([...order].sort()).toEqual(NAMES);
        for (const name of NAMES)
          for (const read of reads[name] ?? []) {
            if (read === 'elsewhere' || reached(read, reads).has(name) || read === name) continue;
            expect(order.indexOf(read)).toBeLessThan(order.indexOf(name));
          }
      }),
    );
  });

  it('gives rings that are rings, and at least one where there is one', () => {
    fc.assert(
      fc.property(graph, (reads) => {
        const { rings } = orderByReads(NAMES, (name) => reads[name] ?? []);
        for (const ring of rings) {
          expect(ring[0]).toBe(ring.at(-1));
          for (const [index, name] of ring.slice(0, -1).entries())
            expect(reads[name]).toContain(ring[index + 1]);
        }
        expect(new Set(rings.map((ring) => ring.join(' '))).size).toBe(rings.length);
        expect(rings.length > 0).toBe(NAMES.some((name) => reached(name, reads).has(name)));
      }),
    );
  });
});
