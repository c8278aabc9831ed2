import type { Rule } from '../Rule';

/** A parameter is there to vary; one whose range is a single value is a constant with a detour. */
export const parameterNeverVaries: Rule = {
  code: 'parameter-never-varies',
  severity: 'warning',
  category: 'tidiness',
  summary: 'A parameter whose range holds a single value.',
  message: 'The parameter "{name}" can only be {value}.',
  help: 'Widen its range, or write {value} where it is read.',
  create({ report }) {
    return {
      parameter(name, { min, max, whole }) {
        if (min === undefined || max === undefined || min > max) return;
        // Between these bounds a whole parameter may have a single number although they differ.
        const [lowest, highest] = whole ? [Math.ceil(min), Math.floor(max)] : [min, max];
        if (lowest === highest) report(['params', name], { name, value: lowest }, { part: 'key' });
      },
    };
  },
};
