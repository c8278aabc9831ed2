import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** A joint that a skin lists twice makes people believe that it counts twice. */
export const skinJointRepeated: Rule = {
  code: 'skin-joint-repeated',
  severity: 'warning',
  category: 'structure',
  summary: 'A skin that lists a joint twice.',
  message: 'The skin "{id}" lists the joint "{joint}" again, after "{first}".',
  help: 'List each joint once, by itself or by its chain.',
  create({ resolved, stage, report }) {
    return {
      skin({ id, joints, side, path }) {
        const jointsOf = new Map(resolved.chains.map((chain) => [chain.id, chain.jointIds]));
        const listedBy = new Map<string, string>();
        joints.forEach((name, index) => {
          const listed = jointsOf.get(name) ?? [name];
          const again = listed.find((joint) => listedBy.has(joint));
          const first = again === undefined ? undefined : listedBy.get(again);
          if (again !== undefined && first !== undefined) {
            const list = joints.filter((_, other) => other !== index).join(', ');
            const edit = { path: [...path, 'joints'], newText: `[${list}]` };
            // The right copy's ids differ from those that were written.
            const fix = side === 'right' ? {} : rewrite(stage.document, `Leave "${name}" out`, [edit]);
            report([...path, 'joints', index], { id, joint: again, first }, fix);
          }
          for (const joint of listed) listedBy.set(joint, name);
        });
      },
    };
  },
};
