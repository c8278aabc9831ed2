import { dot } from '../../math/vec3';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';
import { sizeOfRig } from '../sizeOfRig';

/** Shares of the rig's size: below the first a point lies in the middle, above the second beside it on purpose. */
const IN_MIDDLE = 1e-6;
const MEANT = 0.005;

/** A spine that runs a little beside the middle turns every mirrored pose askew. */
export const landmarkOffMiddle: Rule = {
  code: 'landmark-off-middle',
  severity: 'warning',
  category: 'geometry',
  summary: 'A centre landmark that nearly, but not quite, lies in the middle.',
  message: 'The landmark "{name}" lies {distance} {unit} beside the middle.',
  help: 'Write 0 for the number across, or give it a side.',
  create({ report, stage, resolved, solved }) {
    const { left, unit } = resolved.scene;
    let size: number | null = null;
    const axis = left.findIndex((value) => value !== 0);
    return {
      landmark(name, { at, side }) {
        const beside = Math.abs(dot(at, left));
        if (side === 'left' || beside === 0) return;
        size ??= sizeOfRig(solved);
        if (beside <= size * IN_MIDDLE || beside >= size * MEANT) return;
        const path = ['landmarks', name, 'at', axis];
        const fix = rewrite(stage.document, 'Write 0', [{ path, newText: '0' }]);
        report(path, { name, unit, distance: Number(beside.toPrecision(3)) }, fix);
      },
    };
  },
};
