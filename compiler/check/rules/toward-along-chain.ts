import { angleBetween, sub } from '../../math/vec3';
import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import { positionsOf } from '../positionsOf';
import type { Rule } from '../Rule';

/** Degrees; nearer than this a small change of a landmark turns every frame of the chain about. */
const ALONG = 5;

/** A direction along the bone cannot say which way its up axis points, so something else decides. */
export const towardAlongChain: Rule = {
  code: 'toward-along-chain',
  severity: 'warning',
  category: 'geometry',
  summary: 'An up direction that lies along the chain.',
  message: 'toward of "{id}" lies within {degrees} degrees of its first bone and cannot turn its up axis.',
  help: 'Give a direction that points sideways from the chain.',
  create({ solved, stage, report }) {
    return {
      chain({ id, orient, jointIds, path }) {
        if (!orient.toward || orient.rule !== 'chain' || orient.like !== null) return;
        const [first, second] = positionsOf(solved, jointIds.slice(0, 2)) ?? [];
        if (!first || !second) return;
        const angle = (angleBetween(sub(second, first), orient.toward) * 180) / Math.PI;
        const degrees = Math.min(angle, 180 - angle);
        if (degrees >= ALONG) return;
        const place = [...path, 'orient', 'toward'];
        const fix = fixWith('Leave toward out', 'asks', [removeEntry(stage.document, place)]);
        report(place, { id, degrees: Math.ceil(degrees) }, fix);
      },
    };
  },
};
