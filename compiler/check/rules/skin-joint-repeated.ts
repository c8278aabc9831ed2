import type { Rule } from '../Rule';

/** A joint that a skin lists twice makes people believe that it counts twice. */
export const skinJointRepeated: Rule = {
  code: 'skin-joint-repeated',
  severity: 'warning',
  category: 'structure',
  summary: 'A skin that lists a joint twice.',
  message: 'The skin "{id}" lists the joint "{joint}" again, after "{first}".',
  help: 'List each joint once, by itself or by its chain.',
  create({ resolved, report }) {
    return {
      skin({ id, joints, path }) {
        const jointsOf = new Map(resolved.chains.map((chain) => [chain.id, chain.jointIds]));
        const listedBy = new Map<string, string>();
        joints.forEach((name, index) => {
          const listed = jointsOf.get(name) ?? [name];
          const again = listed.find((joint) => listedBy.has(joint));
          const first = again === undefined ? undefined : listedBy.get(again);
          if (again !== undefined && first !== undefined) {
            report([...path, 'joints', index], { id, joint: again, first });
          }
          for (const joint of listed) listedBy.set(joint, name);
        });
      },
    };
  },
};
