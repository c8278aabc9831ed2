import { mirrorPoint } from '../../expand/sides';
import { dot } from '../../math/vec3';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';
import { sizeOfRig } from '../sizeOfRig';
import { textAt } from '../textAt';

/** Share of the rig's size that a left point may lie beyond the middle, as the toes of crossed feet do. */
const SLACK = 0.01;

/** A left point on the right builds the left arm on the right, under the left's names. */
export const landmarkOnOtherSide: Rule = {
  code: 'landmark-on-other-side',
  severity: 'warning',
  category: 'geometry',
  summary: 'A left landmark that lies on the right.',
  message: 'The left landmark "{name}" lies {distance} {unit} on the right; left is toward {left} here.',
  help: 'Change the sign of the number across.',
  create({ report, stage, resolved, solved }) {
    const { left, unit } = resolved.scene;
    let size: number | null = null;
    const axis = left.findIndex((value) => value !== 0);
    return {
      landmark(name, { at, side, right }) {
        const beyond = -dot(at, left);
        if (side !== 'left' || beyond <= 0) return;
        size ??= sizeOfRig(solved);
        if (beyond <= size * SLACK) return;
        const path = ['landmarks', name, 'at'];
        // Where the right point is given too, or numbers are worked out, only the author knows what to correct.
        const canMirror = right === undefined && !textAt(stage.document, path)?.includes('=');
        const newText = `[${mirrorPoint(at, left).join(', ')}]`;
        report(
          path,
          {
            name,
            unit,
            distance: Number(beyond.toPrecision(3)),
            left: `${(left[axis] ?? 1) < 0 ? '-' : '+'}${'xyz'[axis] ?? 'x'}`,
          },
          canMirror ? rewrite(stage.document, 'Move it to the left', [{ path, newText }]) : {},
        );
      },
    };
  },
};
