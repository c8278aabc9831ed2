import { fixWith } from '../edits/fixWith';
import { removeEntry } from '../edits/removeEntry';
import type { Rule } from '../Rule';

/** A driver that gives nothing for every input follows nothing; a constant that is not 0 moves the rest and is told there. */
export const driverFlat: Rule = {
  code: 'driver-flat',
  severity: 'warning',
  category: 'motion',
  summary: 'A driver whose keys all give 0.',
  message: 'The driver "{id}" gives 0 whatever "{input}" reads.',
  help: 'Give its keys different outputs, or remove it.',
  create({ stage, report }) {
    return {
      driver({ id, control, input, outputs, path, part }) {
        if (outputs.some((output) => output !== 0)) return;
        const fix =
          part === null ? fixWith('Remove the driver', 'asks', [removeEntry(stage.document, path)]) : {};
        report([...path, 'keys'], { id, input: `${control}.${input}` }, fix);
      },
    };
  },
};
