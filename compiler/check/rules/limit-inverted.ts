import type { Rule } from '../Rule';

/** A limit whose smallest value is above its largest leaves no value at all. */
export const limitInverted: Rule = {
  code: 'limit-inverted',
  severity: 'error',
  category: 'animator',
  summary: 'A limit with min above max.',
  message: '"{name}" of "{id}" has min {min} above max {max}.',
  help: 'Swap the two numbers, or correct one of them.',
  create(context) {
    return {
      control({ id, channels, attributes, path }) {
        for (const [name, { min, max }] of Object.entries(channels)) {
          if (min === null || max === null || min <= max) continue;
          const group = { t: 'move', r: 'turn', s: 'scale' }[name[0] ?? ''] ?? name;
          const document = context.stage.document;
          const written = [name, group].find((key) =>
            document.layers.some((layer) => layer.has([...path, 'channels', key])),
          );
          context.report([...path, 'channels', ...(written === undefined ? [] : [written])], {
            id,
            name,
            min,
            max,
          });
        }
        for (const { name, min, max } of attributes) {
          if (min !== null && max !== null && min > max) {
            context.report([...path, 'attributes', name], { id, name, min, max });
          }
        }
      },
    };
  },
};
