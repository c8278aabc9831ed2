import { dot } from '../../math/vec3';
import type { Rule } from '../Rule';
import { textAt } from '../textAt';

/** A rig with every joint beneath the floor was measured with another axis, or another sign, than the scene's up. */
export const rigBelowFloor: Rule = {
  code: 'rig-below-floor',
  severity: 'warning',
  category: 'geometry',
  summary: 'A rig whose joints all lie beneath the floor.',
  message: 'All {count} joints lie beneath the floor; the highest, "{joint}", at {height} {unit}.',
  help: 'Set the scene axis that points up on the model, or move the points so that the floor is at 0.',
  create({ resolved, solved, stage, report }) {
    let count = 0;
    let highest = { id: '', height: -Infinity };
    return {
      chain({ jointIds }) {
        for (const id of jointIds) {
          const place = solved.places.get(id);
          if (!place) continue;
          count += 1;
          const height = dot(place.position, resolved.scene.up);
          if (height > highest.height) highest = { id, height };
        }
      },
      finish() {
        if (count < 2 || highest.height >= 0) return;
        const height = Number(highest.height.toPrecision(3));
        const path = textAt(stage.document, ['scene', 'up']) === null ? ['recipe'] : ['scene', 'up'];
        report(path, { count, joint: highest.id, height, unit: resolved.scene.unit });
      },
    };
  },
};
