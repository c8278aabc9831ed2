import type { Rule } from '../Rule';

/** A roster checks what it is told to check; a parameter with one bound was meant to have two. */
export const parameterHalfBounded: Rule = {
  code: 'parameter-half-bounded',
  severity: 'info',
  category: 'tidiness',
  summary: 'A parameter with only one of min and max.',
  message: 'The parameter "{name}" has {given} but no {missing}.',
  help: 'Add {missing}, so that a slip in a roster is found.',
  create({ report }) {
    return {
      parameter(name, { min, max }) {
        if ((min === undefined) === (max === undefined)) return;
        const [given, missing] = min === undefined ? ['max', 'min'] : ['min', 'max'];
        report(['params', name], { name, given, missing }, { part: 'key' });
      },
    };
  },
};
