import { idsRead } from '../../expand/solverIds';
import type { ConstraintSpecification } from '../../expand/types';
import type { Channel } from '../../rig/Rig';
import { addKeys } from '../edits/addKeys';
import { fixWith } from '../edits/fixWith';
import { isWritten } from '../isWritten';
import { isWrittenControl } from '../isWrittenControl';
import type { Rule } from '../Rule';

type Group = 'move' | 'turn' | 'scale';
const CHANNELS_OF: Readonly<Record<Group, readonly Channel[]>> = {
  move: ['tx', 'ty', 'tz'],
  turn: ['rx', 'ry', 'rz'],
  scale: ['sx', 'sy', 'sz'],
};
const DONE: Readonly<Record<Group, string>> = { move: 'moved', turn: 'turned', scale: 'scaled' };
const GROUPS = Object.keys(CHANNELS_OF) as readonly Group[];

/** What each kind of constraint takes from its sources. */
const TAKEN: Readonly<Record<ConstraintSpecification['kind'], readonly Group[]>> = {
  parent: GROUPS,
  point: ['move'],
  aim: ['move'],
  orient: ['turn'],
  scale: ['scale'],
};

/** A free channel that nothing follows can be keyed by mistake and shows no effect. */
export const channelSteersNothing: Rule = {
  code: 'channel-steers-nothing',
  severity: 'info',
  category: 'animator',
  summary: 'A control with free channels that nothing follows.',
  message: 'Nothing follows "{id}" when it is {done}.',
  help: 'Lock {group} of "{id}".',
  create({ report, stage, resolved, isWhole }) {
    const { document } = stage;
    const followed = new Map<string, Set<Group>>();
    const follow = (id: string | null, groups: readonly Group[]): void => {
      if (id === null) return;
      const all = followed.get(id) ?? new Set<Group>();
      for (const group of groups) all.add(group);
      followed.set(id, all);
    };
    return {
      chain: ({ parent }) => follow(parent, GROUPS),
      control({ parent, spaces }) {
        for (const id of [parent, ...spaces]) follow(id, GROUPS);
      },
      solver(solver) {
        const pole = solver.kind === 'two_bone' || solver.kind === 'reach' ? solver.pole : null;
        for (const id of idsRead(solver)) follow(id, id === pole ? ['move'] : GROUPS);
      },
      constraint(constraint) {
        for (const { node } of constraint.sources) follow(node, TAKEN[constraint.kind]);
        follow(constraint.aim?.up ?? null, ['turn']);
      },
      driver({ control, input }) {
        const group = GROUPS.find((each) => CHANNELS_OF[each].some((channel) => channel === input));
        if (group) follow(control, [group]);
      },
      finish() {
        if (!isWhole) return;
        for (const control of resolved.controls) {
          const { id, path, channels } = control;
          const groups = followed.get(id);
          if (!groups || !isWrittenControl(control, document)) continue;
          for (const group of GROUPS) {
            const isFree = CHANNELS_OF[group].some((channel) => !channels[channel]?.locked);
            if (groups.has(group) || !isFree) continue;
            const listed = [...path, 'channels'];
            const isListed = isWritten(document, listed);
            const edit = isListed
              ? isWritten(document, [...listed, group])
                ? null
                : addKeys(document, listed, [[group, '{ locked: true }']])
              : addKeys(document, path, [['channels', `{ ${group}: { locked: true } }`]]);
            report(
              path,
              { id, group, done: DONE[group] },
              { part: 'key', ...fixWith(`Lock ${group}`, 'asks', [edit]) },
            );
          }
        }
      },
    };
  },
};
