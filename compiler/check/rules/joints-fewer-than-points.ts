import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** Joints spread along more points than there are joints leave the shape that the points describe. */
export const jointsFewerThanPoints: Rule = {
  code: 'joints-fewer-than-points',
  severity: 'warning',
  category: 'structure',
  summary: 'A chain that spreads fewer joints than it has points.',
  message: '"{id}" has {points} points but only {joints} joints, so its bones cut across the curve.',
  help: 'Give it at least {points} joints, or leave out points that do not matter.',
  create({ stage, report }) {
    return {
      chain({ id, count, points, path }) {
        if (count === null || count >= points.length) return;
        const place = [...path, 'joints'];
        const title = `Give it ${points.length} joints`;
        const fix = rewrite(stage.document, title, [{ path: place, newText: String(points.length) }]);
        report(place, { id, points: points.length, joints: count }, fix);
      },
    };
  },
};
