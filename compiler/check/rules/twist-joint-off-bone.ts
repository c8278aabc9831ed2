import type { TwistSpecification } from '../../expand/types';
import { addScaled, distance, dot, sub } from '../../math/vec3';
import { chainsByJoint } from '../chainsByJoint';
import { pointPath } from '../pointPath';
import { positionsOf } from '../positionsOf';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** Share of the bone's length; a joint this far from the bone visibly circles about it. Common practice. */
const BESIDE = 0.05;

/** A twist joint turns about the bone; beside it, it would drag the skin round in a circle. */
export const twistJointOffBone: Rule = {
  code: 'twist-joint-off-bone',
  severity: 'warning',
  category: 'geometry',
  summary: 'A twist joint that does not stand on its bone.',
  message: '"{joint}" stands {percent} % of the bone beside the line from "{bone}" to "{tip}".',
  help: 'Place it between both with from, to and share.',
  create({ resolved, solved, stage, report }) {
    const betweenBoth = (solver: TwistSpecification, joint: string, share: number) => {
      const chain = chainsByJoint(resolved).get(joint);
      // A part places its joints itself, and the right copy's ids differ from those that were written.
      if (!chain || chain.part !== null || chain.count !== null || chain.side === 'right') return {};
      const { bone, tip } = solver;
      const newText = `{ from: ${bone}, to: ${tip}, share: ${Number(share.toPrecision(3))} }`;
      const path = pointPath(chain, chain.jointIds.indexOf(joint));
      return rewrite(stage.document, `Place it between "${bone}" and "${tip}"`, [{ path, newText }]);
    };
    return {
      solver(solver) {
        if (solver.kind !== 'twist') return;
        const { bone, tip, joints, path } = solver;
        const [from, to] = positionsOf(solved, [bone, tip]) ?? [];
        if (!from || !to) return;
        const line = sub(to, from);
        const size = distance(from, to);
        joints.forEach((joint, index) => {
          const at = solved.places.get(joint)?.position;
          if (!at) return;
          const share = Math.min(1, Math.max(0, dot(sub(at, from), line) / (size * size)));
          const beside = distance(at, addScaled(from, line, share)) / size;
          if (!(beside > BESIDE)) return;
          const parameters = { joint, bone, tip, percent: Math.round(beside * 100) };
          report([...path, 'joints', index], parameters, betweenBoth(solver, joint, share));
        });
      },
    };
  },
};
