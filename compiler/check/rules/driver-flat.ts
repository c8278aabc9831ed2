import type { Rule } from '../Rule';

/** A driver that gives the same for every input follows nothing. */
export const driverFlat: Rule = {
  code: 'driver-flat',
  severity: 'warning',
  category: 'motion',
  summary: 'A driver whose keys all give the same output.',
  message: 'The driver "{id}" gives {output} whatever "{input}" reads.',
  help: 'Give its keys different outputs, or remove it.',
  create({ report }) {
    return {
      driver({ id, control, input, outputs, path }) {
        const [first] = outputs;
        if (first === undefined || outputs.some((output) => output !== first)) return;
        report([...path, 'keys'], { id, output: first, input: `${control}.${input}` });
      },
    };
  },
};
