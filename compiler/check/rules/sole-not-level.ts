import type { SolePoint } from '../../expand/types';
import { rotate } from '../../math/quat';
import { add, distance, dot } from '../../math/vec3';
import type { Rule } from '../Rule';

/** Share of the foot's length by which points of a sole may differ in height: thick heels, worn shoes. */
const UNEVEN = 0.25;

/** Points that touch the floor; the ball is often the joint itself, which lies inside the foot. */
const ON_FLOOR = ['heel', 'toe', 'inner', 'outer'] as const satisfies readonly SolePoint[];

/** A foot rolls over points of its sole; one in the air lifts or sinks the foot as it rolls. */
export const soleNotLevel: Rule = {
  code: 'sole-not-level',
  severity: 'warning',
  category: 'geometry',
  summary: 'Points of a sole that lie at different heights.',
  message: 'The point {highest} of "{id}" lies {height} {unit} above {lowest}.',
  help: 'Place heel, toe and both edges where the sole touches the floor.',
  create({ resolved, solved, report }) {
    return {
      solver(solver) {
        if (solver.kind !== 'foot_roll') return;
        const points = solved.feet.get(solver.id);
        const foot = solved.places.get(solver.foot);
        if (!points || !foot) return;
        const { up, unit } = resolved.scene;
        const byHeight = ON_FLOOR.map((name) => ({
          name,
          height: dot(add(foot.position, rotate(foot.turn, points[name])), up),
        })).sort((a, b) => a.height - b.height);
        const [lowest] = byHeight;
        const highest = byHeight.at(-1);
        if (!lowest || !highest) return;
        const height = highest.height - lowest.height;
        if (height <= UNEVEN * distance(points.heel, points.toe)) return;
        const parameters = { id: solver.id, unit, highest: highest.name, lowest: lowest.name };
        report([...solver.path, highest.name], { ...parameters, height: Number(height.toPrecision(3)) });
      },
    };
  },
};
