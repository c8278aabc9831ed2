import type { TwoBoneSpecification } from '../../expand/types';
import { distance, length, normalise, rejectFrom, sub } from '../../math/vec3';
import { limbPositions } from '../positionsOf';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';
import { textAt } from '../textAt';

/** Share of both bones' length, measured from the line start–end. Nearer, the folding elbow passes it. Common practice. */
const NEAR = 0.3;

/** A pole near the limb is overtaken by the elbow as the limb folds, and the limb then swings about. */
export const poleTooNear: Rule = {
  code: 'pole-too-near',
  severity: 'warning',
  category: 'geometry',
  summary: 'A pole that stands too near to its limb.',
  message:
    '"{pole}" stands {share} of the length of "{solver}" from its line, which the folding limb overtakes.',
  help: 'Move it out to about one length of the limb.',
  create({ resolved, solved, stage, report }) {
    const limbs: TwoBoneSpecification[] = [];
    return {
      solver(solver) {
        if (solver.kind === 'two_bone') limbs.push(solver);
      },
      finish() {
        if (limbs.length === 0) return;
        const controls = new Map(resolved.controls.map((control) => [control.id, control]));
        for (const { id, joints, pole } of limbs) {
          const control = controls.get(pole);
          const at = solved.places.get(pole)?.position;
          const places = limbPositions(solved, joints);
          if (!control || !at || !places) continue;
          const [start, mid, end] = places;
          const away = length(rejectFrom(sub(at, start), normalise(sub(end, start))));
          const share = away / (distance(start, mid) + distance(mid, end));
          if (!(share < NEAR)) continue;
          const keys = ['pole_of', 'pole'] as const;
          const key = keys.find((name) => textAt(stage.document, [...control.path, name]) !== null);
          const path = key === undefined ? [...control.path, 'at'] : [...control.path, key, 'distance'];
          const title = 'Put it at one length of the limb';
          const fix = key === undefined ? {} : rewrite(stage.document, title, [{ path, newText: '1' }]);
          report(path, { pole, solver: id, share: Number(share.toPrecision(2)) }, fix);
        }
      },
    };
  },
};
