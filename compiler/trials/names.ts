import { linkKey } from '../resolve/ids';
import type { Rig } from '../rig/Rig';
import { Count } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/** How many characters of one cast share a scene in the trial, this one among them. */
const CAST = 10;

/** Everything in a rig that has a name of its own, by the key that `nameParts` gives it. */
function namedThings(
  rig: Rig,
): readonly { readonly key: string; readonly id: string; readonly name: string }[] {
  const { nodes, constraints, solvers, spaces, drivers, skins, shapes } = rig;
  const links = { constraints, solvers, spaces, drivers, skins, shapes };
  return [
    ...nodes.map(({ id, name }) => ({ key: id, id, name })),
    ...Object.entries(links).flatMap(([collection, items]) =>
      items.map(({ id, name }) => ({ key: linkKey(collection as keyof typeof links, id), id, name })),
    ),
  ];
}

/** A name from the pieces around its character. */
function compose(around: readonly string[], character: string): string {
  const [before, after] = around;
  // Nearly every pattern holds the character once, and thousands of names are composed.
  return around.length === 2 ? `${before}${character}${after}` : around.join(character);
}

/**
 * Ten characters of one cast stand in one scene and no two things share a name: the rig's own names are those that the
 * naming pattern gives, each once, and none is a name of nine others made from the same recipe.
 */
export function tryNames({ rig, intent }: TrialBench): TrialResult {
  const count = new Count('names');
  const parts = intent.nameParts();
  const taken = new Set<string>();
  for (const { key, id, name } of namedThings(rig)) {
    const own = parts.get(key);
    const meant = own === undefined ? name : compose(own, rig.scene.character);
    count.add(name === meant && !taken.has(name), id);
    taken.add(name);
  }
  for (let member = 2; member <= CAST; member += 1) {
    const character = `${rig.scene.character}_${member}`;
    for (const [key, around] of parts) {
      const name = compose(around, character);
      count.add(!taken.has(name), key.slice(key.indexOf('/') + 1));
      taken.add(name);
    }
  }
  return count.result();
}
