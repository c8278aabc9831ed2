import type { Rule } from '../Rule';
import { sizeOfRig } from '../sizeOfRig';
import { textAt } from '../textAt';

const METRES = { mm: 0.001, cm: 0.01, m: 1 } as const;
/** Metres. Smaller and larger things are animated, but not at their own size. Common practice. */
const SMALLEST = 0.001;
const LARGEST = 1000;

/** A rig whose size no character has was measured in another unit than the scene says. */
export const scaleImplausible: Rule = {
  code: 'scale-implausible',
  severity: 'warning',
  category: 'geometry',
  summary: 'A rig under a millimetre or over a kilometre in size.',
  message: 'The rig measures {size} {unit} from end to end.',
  help: 'Set the scene unit in which the points were measured.',
  create({ resolved, solved, stage, report }) {
    return {
      finish() {
        const { unit } = resolved.scene;
        const size = sizeOfRig(solved);
        const metres = size * METRES[unit];
        if (size === 0 || (metres >= SMALLEST && metres <= LARGEST)) return;
        const path = textAt(stage.document, ['scene', 'unit']) === null ? ['recipe'] : ['scene', 'unit'];
        report(path, { size: Number(size.toPrecision(3)), unit });
      },
    };
  },
};
