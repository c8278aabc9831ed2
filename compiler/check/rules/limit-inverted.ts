import type { Path } from '../../syntax/types';
import type { Rule } from '../Rule';

const GROUPS: Readonly<Record<string, string>> = { t: 'move', r: 'turn', s: 'scale' };

/** A limit whose smallest value is above its largest leaves no value at all. */
export const limitInverted: Rule = {
  code: 'limit-inverted',
  severity: 'error',
  category: 'animator',
  summary: 'A limit with min above max.',
  message: '"{name}" of "{id}" has min {min} above max {max}.',
  help: 'Swap the two numbers, or correct one of them.',
  create(context) {
    const { document } = context.stage;
    /** The key that the limit was written under: the channel's own or its group's. */
    const writtenKey = (path: Path, channel: string): string | undefined =>
      [channel, GROUPS[channel[0] ?? '']].find(
        (key) => key !== undefined && document.layers.some((layer) => layer.has([...path, 'channels', key])),
      );
    return {
      control({ id, channels, attributes, path }) {
        const reported = new Set<string>();
        for (const [channel, { min, max }] of Object.entries(channels)) {
          if (min === null || max === null || min <= max) continue;
          const name = writtenKey(path, channel) ?? channel;
          if (reported.has(name)) continue;
          reported.add(name);
          context.report([...path, 'channels', name], { id, name, min, max });
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
