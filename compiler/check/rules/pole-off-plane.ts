import type { TwoBoneSpecification } from '../../expand/types';
import { angleBetween, distance, length, normalise, rejectFrom, sub } from '../../math/vec3';
import { bendOf } from '../bendOf';
import { limbPositions } from '../positionsOf';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';
import { textAt } from '../textAt';

/** Degrees about the line from start to end; below it nobody sees the difference. Common practice. */
const BESIDE = 15;
/** Degrees; a limb bent less points nowhere surely. */
const SLIGHT = 2;

/** A pole says to the eye where the elbow points. One off the plane of the limb says it wrongly from the start. */
export const poleOffPlane: Rule = {
  code: 'pole-off-plane',
  severity: 'warning',
  category: 'geometry',
  summary: 'A pole that does not stand where its limb is bent to.',
  message: '"{pole}" stands {degrees} degrees beside the plane in which "{solver}" is bent.',
  help: 'Let pole_of place it from the three joints.',
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
          if (control?.place.kind !== 'place' || !at || !places) continue;
          const [start, mid, end] = places;
          const bend = bendOf(start, mid, end);
          const away = rejectFrom(sub(at, start), normalise(sub(end, start)));
          const degrees = (angleBetween(away, bend.toward) * 180) / Math.PI;
          if (bend.degrees < SLIGHT || degrees <= BESIDE) continue;
          const path = [...control.path, 'at'];
          const key = textAt(stage.document, path, 'key');
          const factor = length(away) / (distance(start, mid) + distance(mid, end));
          const newText = `{ joints: [${joints.join(', ')}], distance: ${Number(factor.toPrecision(2))} }`;
          // The right copy's ids differ from those that were written.
          const fix =
            key !== 'at' || control.side === 'right' || !(factor > 0)
              ? {}
              : rewrite(stage.document, 'Place it by pole_of', [
                  { path, part: 'key', newText: 'pole_of' },
                  { path, newText },
                ]);
          report(path, { pole, solver: id, degrees: Math.round(degrees) }, fix);
        }
      },
    };
  },
};
