import type { ConstraintSpecification } from '../../expand/types';
import type { Channel } from '../../rig/Rig';
import type { Rule } from '../Rule';

const MOVE: readonly Channel[] = ['tx', 'ty', 'tz'];
const TURN: readonly Channel[] = ['rx', 'ry', 'rz'];
const SCALE: readonly Channel[] = ['sx', 'sy', 'sz'];

const OVERRIDDEN: Readonly<Record<ConstraintSpecification['kind'], readonly Channel[]>> = {
  parent: [...MOVE, ...TURN, ...SCALE],
  point: MOVE,
  orient: TURN,
  scale: SCALE,
  aim: TURN,
};

/** A control that a constraint places ignores the animator: its channels can be keyed and do nothing. */
export const constraintOverridesControl: Rule = {
  code: 'constraint-overrides-control',
  severity: 'warning',
  category: 'motion',
  summary: 'A control whose open channels a constraint overrides.',
  message: '"{id}" overrides {channels} of the control "{target}", which an animator can still set.',
  help: 'Lock these channels, or let the control hang on "{source}" by parent or spaces in place of the constraint.',
  create({ resolved, report }) {
    const constraints: ConstraintSpecification[] = [];
    return {
      constraint(constraint) {
        constraints.push(constraint);
      },
      finish() {
        if (constraints.length === 0) return;
        const controls = new Map(resolved.controls.map((control) => [control.id, control]));
        for (const { id, kind, target, sources, path } of constraints) {
          const channels = controls.get(target)?.channels;
          const open = channels ? OVERRIDDEN[kind].filter((name) => channels[name]?.locked !== true) : [];
          if (open.length === 0) continue;
          const parameters = { id, target, channels: open.join(', '), source: sources[0]?.node ?? '' };
          report([...path, 'target'], parameters);
        }
      },
    };
  },
};
