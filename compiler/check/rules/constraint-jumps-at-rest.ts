import type { ConstraintSpecification } from '../../expand/types';
import { dotQuat } from '../../math/quat';
import { distance } from '../../math/vec3';
import type { RestPlace } from '../../solve/types';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** In the scene's unit, relative to the distance from the origin: far above rounding, far below what is seen. */
const PLACE_TOLERANCE = 1e-6;
/** Cosine of half a hundredth of a degree, the least turn that counts as one. */
const TURN_TOLERANCE = Math.cos((0.005 * Math.PI) / 180);

function jumpOf(kind: ConstraintSpecification['kind'], from: RestPlace, to: RestPlace): string | null {
  const size = Math.max(1, ...from.position.map(Math.abs), ...to.position.map(Math.abs));
  const moves =
    (kind === 'parent' || kind === 'point') && distance(from.position, to.position) > PLACE_TOLERANCE * size;
  if (moves) return 'moves';
  const turns =
    (kind === 'parent' || kind === 'orient') && Math.abs(dotQuat(from.turn, to.turn)) < TURN_TOLERANCE;
  return turns ? 'turns' : null;
}

/** Without its offset a target leaves its rest place at once, and the model with it. */
export const constraintJumpsAtRest: Rule = {
  code: 'constraint-jumps-at-rest',
  severity: 'error',
  category: 'motion',
  summary: 'A constraint that moves its target away from rest.',
  message: '"{id}" keeps no offset, so "{target}" {jump} away from its rest place, onto "{source}".',
  help: 'Set keep_offset to true, or let target and source stand and turn alike.',
  create({ solved, stage, report }) {
    return {
      constraint({ id, kind, target, sources, keepOffset, path }) {
        const [source] = sources;
        if (keepOffset || !source || sources.length > 1) return;
        const from = solved.places.get(target);
        const to = solved.places.get(source.node);
        const jump = from && to ? jumpOf(kind, from, to) : null;
        if (jump === null) return;
        const place = [...path, 'keep_offset'];
        const fix = rewrite(stage.document, 'Keep the offset', [{ path: place, newText: 'true' }]);
        report(place, { id, target, source: source.node, jump }, fix);
      },
    };
  },
};
