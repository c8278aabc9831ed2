import { distance } from '../../math/vec3';
import type { Rule } from '../Rule';
import { sizeOfRig } from '../sizeOfRig';

/** Share of the rig's size below which a line cannot be seen. */
const INVISIBLE = 1e-3;

/** A guide line between two things at one place says nothing until they are torn apart. */
export const guideLineInPlace: Rule = {
  code: 'guide-line-in-place',
  severity: 'warning',
  category: 'animator',
  summary: 'A guide line between two things that stand at the same place.',
  message: 'The guide line "{id}" has no length at rest: "{from}" and "{to}" stand at the same place.',
  help: 'Lead it to the joint that "{from}" steers from afar, or remove it.',
  create({ report, resolved, solved }) {
    return {
      finish() {
        let size: number | null = null;
        for (const { id, from, to, path, part } of resolved.guideLines) {
          const start = solved.places.get(from);
          const end = solved.places.get(to);
          if (!start || !end || from === to || part !== null) continue;
          size ??= sizeOfRig(solved);
          if (size > 0 && distance(start.position, end.position) <= size * INVISIBLE)
            report([...path, 'to'], { id, from, to });
        }
      },
    };
  },
};
