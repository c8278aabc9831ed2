import { isWrittenControl } from '../isWrittenControl';
import type { Rule } from '../Rule';

/** Lengths of the skeleton's longest edge that a control may stand outside the skeleton. */
const FAR = 3;

/** A control far outside the skeleton is out of the picture whenever the animator looks at the character. */
export const controlFarAway: Rule = {
  code: 'control-far-away',
  severity: 'warning',
  category: 'animator',
  summary: 'A control that stands far away from the skeleton.',
  message: '"{id}" stands {distance} {unit} outside a skeleton that is {size} {unit} long.',
  help: 'Move it nearer, or correct the number that puts it there.',
  create({ report, stage, resolved, solved }) {
    const lowest = [Infinity, Infinity, Infinity];
    const highest = [-Infinity, -Infinity, -Infinity];
    return {
      chain({ jointIds }) {
        for (const id of jointIds) {
          solved.places.get(id)?.position.forEach((value, axis) => {
            lowest[axis] = Math.min(lowest[axis] ?? value, value);
            highest[axis] = Math.max(highest[axis] ?? value, value);
          });
        }
      },
      finish() {
        const size = Math.max(...highest.map((value, axis) => value - (lowest[axis] ?? value)));
        if (!(size > 0)) return;
        for (const control of resolved.controls) {
          const { id, path } = control;
          const place = solved.places.get(id);
          if (!place || !isWrittenControl(control, stage.document)) continue;
          const outside = place.position.map((value, axis) =>
            Math.max(0, (lowest[axis] ?? value) - value, value - (highest[axis] ?? value)),
          );
          const distance = Math.hypot(...outside);
          if (distance <= size * FAR) continue;
          const short = (length: number): number => Number(length.toPrecision(3));
          const at = control.place.kind === 'pole' ? 'pole_of' : 'at';
          report([...path, at], {
            id,
            distance: short(distance),
            size: short(size),
            unit: resolved.scene.unit,
          });
        }
      },
    };
  },
};
