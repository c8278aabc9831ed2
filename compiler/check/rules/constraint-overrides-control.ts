import type { ConstraintSpecification } from '../../expand/types';
import type { Channel } from '../../rig/Rig';
import { addKeys } from '../edits/addKeys';
import { fixWith } from '../edits/fixWith';
import type { Rule } from '../Rule';
import { textAt } from '../textAt';

const GROUPS = {
  move: ['tx', 'ty', 'tz'],
  turn: ['rx', 'ry', 'rz'],
  scale: ['sx', 'sy', 'sz'],
} as const satisfies Record<string, readonly Channel[]>;

const OVERRIDDEN: Readonly<Record<ConstraintSpecification['kind'], readonly (keyof typeof GROUPS)[]>> = {
  parent: ['move', 'turn', 'scale'],
  point: ['move'],
  orient: ['turn'],
  scale: ['scale'],
  aim: ['turn'],
};

/** A control that a constraint places ignores the animator: its channels can be keyed and do nothing. */
export const constraintOverridesControl: Rule = {
  code: 'constraint-overrides-control',
  severity: 'warning',
  category: 'motion',
  summary: 'A control whose open channels a constraint overrides.',
  message: '"{id}" overrides {channels} of the control "{target}", which an animator can still set.',
  help: 'Lock these channels, or let the control hang on "{source}" by parent or spaces in place of the constraint.',
  create({ resolved, stage, report }) {
    const constraints: ConstraintSpecification[] = [];
    return {
      constraint(constraint) {
        constraints.push(constraint);
      },
      finish() {
        if (constraints.length === 0) return;
        const controls = new Map(resolved.controls.map((control) => [control.id, control]));
        for (const { id, kind, target, sources, path } of constraints) {
          const control = controls.get(target);
          if (!control) continue;
          const groups = OVERRIDDEN[kind];
          const channels = groups.flatMap((group) => GROUPS[group]);
          const open = channels.filter((name) => control.channels[name]?.locked !== true);
          if (open.length === 0) continue;
          const locks = groups.map((group) => `${group}: { locked: true }`).join(', ');
          // Where channels are written already, which of them to change is the author's to say.
          const isFree =
            control.part === null && textAt(stage.document, [...control.path, 'channels']) === null;
          const fix = isFree
            ? fixWith('Lock these channels', 'asks', [
                addKeys(stage.document, control.path, [['channels', `{ ${locks} }`]]),
              ])
            : {};
          const parameters = { id, target, channels: open.join(', '), source: sources[0]?.node ?? '' };
          report([...path, 'target'], parameters, fix);
        }
      },
    };
  },
};
