import { distance } from '../../math/vec3';
import type { Path } from '../../syntax/types';
import type { Rule } from '../Rule';
import { sizeOfRig } from '../sizeOfRig';

/** Share of the rig's size; nearer than this the least move of the goal turns the joint about. */
const TOGETHER = 1e-4;

/** From a place to itself there is no direction. */
export const aimGoalOnJoint: Rule = {
  code: 'aim-goal-on-joint',
  severity: 'warning',
  category: 'geometry',
  summary: 'A thing that aims at the place where it stands.',
  message: '"{target}" aims at "{goal}", which stands at the same place.',
  help: 'Move the goal away in the direction in which "{target}" should look.',
  create({ solved, report }) {
    let size: number | null = null;
    const check = (target: string, goal: string, path: Path, part: 'key' | 'value'): void => {
      const from = solved.places.get(target);
      const to = solved.places.get(goal);
      if (!from || !to) return;
      size ??= sizeOfRig(solved);
      if (distance(from.position, to.position) > size * TOGETHER) return;
      report(path, { target, goal }, { part });
    };
    return {
      solver(solver) {
        if (solver.kind === 'aim') check(solver.joints[0], solver.goal, [...solver.path, 'goal'], 'value');
      },
      constraint({ kind, target, sources, path }) {
        const [source] = sources;
        if (kind !== 'aim' || !source || sources.length > 1) return;
        check(target, source.node, [...path, 'sources', source.node], 'key');
      },
    };
  },
};
