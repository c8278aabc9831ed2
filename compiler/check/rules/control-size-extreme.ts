import { isWritten } from '../isWritten';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';
import { sizeOfRig } from '../sizeOfRig';

/** Shares of the rig's size: a radius above the first hides the rig, one below the second cannot be hit. */
const LARGEST = 2;
const SMALLEST = 0.002;

/** A shape far larger than the rig, or far smaller than anything on it, cannot be worked with. */
export const controlSizeExtreme: Rule = {
  code: 'control-size-extreme',
  severity: 'warning',
  category: 'animator',
  summary: 'A control drawn far too large or too small for the rig.',
  message: '"{id}" is drawn with a radius of {radius} {unit} on a rig of {size} {unit}.',
  help: 'Choose a size nearer to 1, which fits the control to what is around it.',
  create({ report, stage, resolved, solved }) {
    let size: number | null = null;
    return {
      control({ id, path, size: factor }) {
        const written = [...path, 'size'];
        const radius = solved.sizes.get(id);
        if (radius === undefined || !isWritten(stage.document, written)) return;
        size ??= sizeOfRig(solved);
        const whole = size;
        const fits = (length: number): boolean => length <= whole * LARGEST && length >= whole * SMALLEST;
        if (size === 0 || fits(radius)) return;
        const short = (length: number): number => Number(length.toPrecision(3));
        report(
          written,
          { id, radius: short(radius), size: short(size), unit: resolved.scene.unit },
          fits(radius / factor) ? rewrite(stage.document, 'Write 1', [{ path: written, newText: '1' }]) : {},
        );
      },
    };
  },
};
