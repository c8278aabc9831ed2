import type { ConstraintSpecification } from '../../expand/types';
import type { Rule } from '../Rule';

const WRITES: Readonly<Record<ConstraintSpecification['kind'], readonly string[]>> = {
  parent: ['position', 'rotation', 'scale'],
  point: ['position'],
  orient: ['rotation'],
  scale: ['scale'],
  aim: ['rotation'],
};

/** When two constraints write the same thing, the later silently undoes the earlier. */
export const constraintsCompete: Rule = {
  code: 'constraints-compete',
  severity: 'error',
  category: 'motion',
  summary: 'Two constraints that write the same thing.',
  message: '"{first}" and "{second}" both set the {what} of "{target}".',
  help: 'Keep one, or make one constraint with both sources and weights.',
  create(context) {
    const writers = new Map<string, ConstraintSpecification>();
    return {
      constraint(constraint) {
        for (const what of WRITES[constraint.kind]) {
          const place = `${constraint.target} ${what}`;
          const other = writers.get(place);
          if (!other) {
            writers.set(place, constraint);
            continue;
          }
          context.report(
            constraint.path,
            { first: other.id, second: constraint.id, what, target: constraint.target },
            {
              part: 'key',
              related: [{ span: context.stage.document.spanAt(other.path, 'key'), label: `"${other.id}"` }],
            },
          );
          return;
        }
      },
    };
  },
};
