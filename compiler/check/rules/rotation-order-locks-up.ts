import type { ControlSpecification } from '../../expand/types';
import type { RotationOrder } from '../../rig/Rig';
import { addKeys } from '../edits/addKeys';
import { fixWith } from '../edits/fixWith';
import { isWrittenControl } from '../isWrittenControl';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** At a quarter turn of the middle axis the other two turn about one line; near it they already fight. */
const NEAR_LOCK_DEGREES = 85;

const AXES = ['x', 'y', 'z'] as const;
type TurnAxis = (typeof AXES)[number];

/** How far a control may turn about one of its axes, in degrees; infinite where nothing limits it. */
function reachAbout(axis: TurnAxis, { channels }: ControlSpecification): number {
  const rule = channels[`r${axis}`];
  if (rule?.locked) return 0;
  return Math.max(Math.abs(rule?.min ?? Infinity), Math.abs(rule?.max ?? Infinity));
}

/** The axis that turns least belongs in the middle of the rotation order, where a quarter turn takes a freedom away. */
export const rotationOrderLocksUp: Rule = {
  code: 'rotation-order-locks-up',
  severity: 'warning',
  category: 'animator',
  summary: 'A rotation order whose middle axis reaches a quarter turn although another never does.',
  message: '"{id}" turns {middle} in the middle of {order}, where two axes become one at 90 degrees.',
  help: 'Choose {better}: {least} turns least and never comes near 90 degrees.',
  create({ report, stage }) {
    const { document } = stage;
    return {
      control(control) {
        const { id, order, path } = control;
        if (!isWrittenControl(control, document)) return;
        const [first, middle, last] = [...order] as [TurnAxis, TurnAxis, TurnAxis];
        const reach = {
          x: reachAbout('x', control),
          y: reachAbout('y', control),
          z: reachAbout('z', control),
        };
        // Without a limit on each of the three nobody has yet thought about how far it turns.
        if (AXES.some((axis) => reach[axis] === 0 || reach[axis] === Infinity)) return;
        if (reach[middle] < NEAR_LOCK_DEGREES) return;
        const least = reach[first] <= reach[last] ? first : last;
        if (reach[least] >= NEAR_LOCK_DEGREES) return;
        const better: RotationOrder = `${least === first ? middle : first}${least}${
          least === first ? last : middle
        }` as RotationOrder;
        const written = rewrite(document, `Write ${better}`, [
          { path: [...path, 'rotation_order'], newText: better },
        ]);
        const added = fixWith(`Write ${better}`, 'asks', [
          addKeys(document, path, [['rotation_order', better]]),
        ]);
        report(
          [...path, 'rotation_order'],
          { id, order, middle, better, least },
          { part: 'value', ...(written.fix ? written : added) },
        );
      },
    };
  },
};
