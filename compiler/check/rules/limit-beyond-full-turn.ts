import type { Path } from '../../syntax/types';
import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

const FULL_TURN_DEGREES = 360;

/** A range wider than a full turn keeps nothing from being reached; it only stops the dial at an odd place. */
export const limitBeyondFullTurn: Rule = {
  code: 'limit-beyond-full-turn',
  severity: 'info',
  category: 'animator',
  summary: 'A turning limit wider than a full turn.',
  message: '"{name}" of "{id}" may run over {width} degrees, so every direction can be reached.',
  help: 'Remove the limit, or correct its numbers.',
  create({ report, stage }) {
    const check = (
      path: Path,
      id: string,
      name: string,
      range: { readonly min?: number | null; readonly max?: number | null },
    ): void => {
      const { min, max } = range;
      if (typeof min !== 'number' || typeof max !== 'number' || max - min <= FULL_TURN_DEGREES) return;
      const fix = fixWith('Remove the limit', 'asks', [removeEntry(stage.document, path)]);
      report(path, { id, name, width: max - min }, fix);
    };
    return {
      controlEntry(id, { channels }) {
        for (const [name, option] of Object.entries(channels ?? {}))
          if (name === 'turn' || name.startsWith('r'))
            check(['controls', id, 'channels', name], id, name, option);
      },
      chain({ id, path, limits }) {
        for (const [joint, ranges] of Object.entries(limits))
          for (const [name, range] of Object.entries(ranges))
            check([...path, 'limits', joint, name], `${id}.${joint}`, name, range);
      },
    };
  },
};
