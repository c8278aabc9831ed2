import { dot } from '../../math/vec3';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';
import { sizeOfRig } from '../sizeOfRig';

/** Share of the rig's size within which a point lies in the middle. */
const IN_MIDDLE = 1e-5;

/** A left point in the middle is its own mirror image, so both sides meet there. */
export const landmarkLeftInMiddle: Rule = {
  code: 'landmark-left-in-middle',
  severity: 'warning',
  category: 'geometry',
  summary: 'A left landmark that lies in the middle.',
  message: 'The left landmark "{name}" lies in the middle, where its mirror image is the same point.',
  help: 'Leave side out, or correct the number across.',
  create({ report, stage, resolved, solved }) {
    let size: number | null = null;
    return {
      landmark(name, { at, side, right }) {
        if (side !== 'left' || right !== undefined) return;
        size ??= sizeOfRig(solved);
        if (Math.abs(dot(at, resolved.scene.left)) > size * IN_MIDDLE) return;
        const path = ['landmarks', name, 'side'];
        const fix = rewrite(stage.document, 'Make it a centre point', [{ path, newText: 'centre' }]);
        report(['landmarks', name, 'at'], { name }, fix);
      },
    };
  },
};
