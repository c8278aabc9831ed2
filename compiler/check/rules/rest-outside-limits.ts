import type { Rule } from '../Rule';

/** Every control reads zero (scale: one) at rest; a limit that excludes that value makes the rig jump when touched. */
export const restOutsideLimits: Rule = {
  code: 'rest-outside-limits',
  severity: 'error',
  category: 'animator',
  summary: 'A limit that excludes the value at rest.',
  message: '"{name}" of "{id}" may run from {min} to {max}, but reads {rest} at rest.',
  help: 'Widen the limit so that it holds {rest}, or change the default.',
  create(context) {
    const check = (
      path: readonly (string | number)[],
      parameters: { readonly id: string; readonly name: string; readonly rest: number },
      min: number | null,
      max: number | null,
    ): void => {
      if (min !== null && max !== null && min > max) return;
      if ((min ?? -Infinity) <= parameters.rest && parameters.rest <= (max ?? Infinity)) return;
      context.report(path, { ...parameters, min: min ?? 'any', max: max ?? 'any' });
    };
    return {
      control({ id, channels, attributes, path }) {
        for (const [name, { min, max }] of Object.entries(channels)) {
          check([...path, 'channels', name], { id, name, rest: name.startsWith('s') ? 1 : 0 }, min, max);
        }
        for (const { name, min, max, default: rest } of attributes) {
          check([...path, 'attributes', name], { id, name, rest }, min, max);
        }
      },
    };
  },
};
