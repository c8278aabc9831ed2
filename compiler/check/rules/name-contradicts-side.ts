import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

const COLLECTIONS = [
  'landmarks',
  'parts',
  'chains',
  'controls',
  'solvers',
  'constraints',
  'drivers',
  'guide_lines',
  'geometry',
] as const;

/** The side that a word inside an id names; whole segments are sides already and cannot contradict. */
function sideInName(id: string): 'left' | 'right' | null {
  const words = id
    .split('.')
    .filter((segment) => segment !== 'left' && segment !== 'right')
    .flatMap((segment) => segment.split('_'));
  const isLeft = words.includes('left');
  return isLeft === words.includes('right') ? null : isLeft ? 'left' : 'right';
}

/** A name that says left on the right is believed by whoever reads it. */
export const nameContradictsSide: Rule = {
  code: 'name-contradicts-side',
  severity: 'warning',
  category: 'tidiness',
  summary: 'A name that says another side than its entry.',
  message: '"{name}" says {said} in its name, but its side is {side}.',
  help: 'Take {said} out of the name, or correct side.',
  create({ report, stage, recipe }) {
    return {
      finish() {
        for (const collection of COLLECTIONS) {
          for (const [name, entry] of Object.entries(recipe[collection] ?? {})) {
            const said = sideInName(name);
            const side = 'side' in entry ? entry.side : undefined;
            if (said === null || typeof side !== 'string' || side === said) continue;
            const path = [collection, name, 'side'];
            const canBeSaid = collection !== 'landmarks' && side !== 'both';
            const fix = canBeSaid ? rewrite(stage.document, `Write ${said}`, [{ path, newText: said }]) : {};
            report([collection, name], { name, said, side }, { part: 'key', ...fix });
          }
        }
      },
    };
  },
};
