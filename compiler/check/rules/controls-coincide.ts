import type { ControlSpecification } from '../../expand/types';
import { addKeys } from '../edits/addKeys';
import { fixWith } from '../edits/fixWith';
import { isWritten } from '../isWritten';
import { isWrittenControl } from '../isWrittenControl';
import type { Rule } from '../Rule';
import { sizeOfRig } from '../sizeOfRig';

/** Share of the rig's size within which two places are one to the eye. */
const SAME_PLACE = 1e-3;

/** Two equal shapes at one place look like one control, and which of them a click takes is chance. */
export const controlsCoincide: Rule = {
  code: 'controls-coincide',
  severity: 'warning',
  category: 'animator',
  summary: 'Two controls with the same shape and size at the same place.',
  message: '"{id}" is drawn exactly over "{other}".',
  help: 'Give one of them another shape or size.',
  create({ report, stage, resolved, solved }) {
    const { document } = stage;
    return {
      finish() {
        const step = sizeOfRig(solved) * SAME_PLACE;
        const first = new Map<string, ControlSpecification>();
        for (const control of resolved.controls) {
          const { id, path, shape } = control;
          const place = solved.places.get(id);
          const radius = solved.sizes.get(id);
          if (step === 0 || !place || radius === undefined) continue;
          const cell = [...place.position, radius].map((value) => Math.round(value / step));
          const key = `${shape} ${cell.join(' ')}`;
          const other = first.get(key);
          first.set(key, other ?? control);
          if (!other || !isWrittenControl(control, document)) continue;
          const edit = isWritten(document, [...path, 'size'])
            ? null
            : addKeys(document, path, [['size', '1.25']]);
          report(
            path,
            { id, other: other.id },
            {
              part: 'key',
              related: [{ span: document.spanAt(other.path, 'key'), label: 'the control beneath it' }],
              ...fixWith('Draw it a little larger', 'asks', [edit]),
            },
          );
        }
      },
    };
  },
};
