import type { Rule } from '../Rule';
import { sizeOfRig } from '../sizeOfRig';

/** Share of the rig's size within which two points are one. Pairs astride two cells are let go: that costs nothing. */
const SAME_PLACE = 1e-4;

/** Two names for one point drift apart as soon as somebody moves one of them. */
export const landmarksCoincide: Rule = {
  code: 'landmarks-coincide',
  severity: 'info',
  category: 'tidiness',
  summary: 'Two landmarks at the same place.',
  message: 'The landmark "{name}" lies at the same place as "{other}".',
  help: 'Use "{other}" for both, or measure "{name}" anew.',
  create({ report, stage, solved }) {
    let step: number | null = null;
    const first = new Map<string, string>();
    return {
      landmark(name, { at }) {
        step ??= sizeOfRig(solved) * SAME_PLACE;
        if (step === 0) return;
        const size = step;
        const cell = at.map((value) => Math.round(value / size) + 0).join(' ');
        const other = first.get(cell);
        first.set(cell, other ?? name);
        if (other === undefined) return;
        const related = [{ span: stage.document.spanAt(['landmarks', other], 'key'), label: 'the other' }];
        report(['landmarks', name, 'at'], { name, other }, { related });
      },
    };
  },
};
