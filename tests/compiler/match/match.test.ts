import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compile } from '@/compiler';
import { findSwitches } from '@/compiler/match/findSwitches';
import { matchToReaching, matchToTurning } from '@/compiler/match/matchChain';
import { matchSpace } from '@/compiler/match/matchSpace';
import { makeRigReader } from '@/compiler/match/RigReader';
import { positionOf, rotationOf } from '@/compiler/math/mat4';
import type { Rig } from '@/compiler/rig/Rig';
import { expectNear, expectSameRotation } from '../math/expectNear';

const text = readFileSync(
  new URL('../../../compiler/parts/every_part.example.yaml', import.meta.url),
  'utf8',
);
const rig = compile({ recipe: { name: 'every_part.example.yaml', text } }).rig as Rig;
const reader = makeRigReader(rig);
const nameOf = (id: string): string => rig.nodes.find((node) => node.id === id)?.name ?? id;
const switches = findSwitches(rig);

const small = fc.double({ min: -30, max: 30, noNaN: true });
const shift = fc.double({ min: -4, max: 4, noNaN: true });

describe('switches', () => {
  it('are found for every limb and leg', () => {
    expect(switches.map(({ solver }) => solver.id).sort()).toEqual(
      ['arm', 'hind', 'leg'].flatMap((id) => [`${id}.left.bend`, `${id}.right.bend`]).sort(),
    );
  });
});

describe.each(switches.map((chain) => [chain.solver.id, chain] as const))('%s', (_, chain) => {
  const { goal, pole, joints, control, attribute, turners } = chain;

  it('from following its goal to turning joint by joint: every joint stays', () => {
    fc.assert(
      fc.property(shift, shift, shift, small, (tx, ty, tz, ry) => {
        const pose = { [goal]: { tx, ty, tz, ry, rz: ry / 2 }, [pole]: { tx: tz } };
        const before = reader.worldOf(pose, joints);
        const matched = matchToTurning(reader, chain, pose);
        expect(matched[control]?.[attribute]).toBe(0);
        reader.worldOf(matched, joints).forEach((matrix, index) => {
          expectNear(positionOf(matrix), positionOf(before[index] as typeof matrix), 1e-6);
          expectSameRotation(rotationOf(matrix), rotationOf(before[index] as typeof matrix), 1e-6);
        });
      }),
      { numRuns: 40 },
    );
  });

  it('and back: every joint stays', () => {
    fc.assert(
      fc.property(small, small, small, (first, second, last) => {
        // Bends about the hinge keep the chain in one plane; the root may turn in any way.
        const [root = '', mid = ''] = turners;
        const end = turners[turners.length - 1] ?? '';
        const pose = {
          [control]: { [attribute]: 0 },
          [root]: { rx: first, ry: second, rz: last },
          [mid]: { rz: 10 + Math.abs(first) / 2 },
          [end]: { rx: second, ry: first, rz: last },
        };
        const before = reader.worldOf(pose, joints);
        const matched = matchToReaching(reader, chain, pose);
        expect(matched[control]?.[attribute]).toBe(1);
        const isThree = joints.length === 3;
        reader.worldOf(matched, joints).forEach((matrix, index) => {
          // Bends of a longer chain are folded in proportion, so only its ends are bound to stay.
          if (!isThree && index > 0 && index < joints.length - 1) return;
          expectNear(positionOf(matrix), positionOf(before[index] as typeof matrix), 1e-5);
          if (index === joints.length - 1) {
            expectSameRotation(rotationOf(matrix), rotationOf(before[index] as typeof matrix), 1e-6);
          }
        });
      }),
      { numRuns: 40 },
    );
  });
});

describe('spaces', () => {
  it.each(rig.spaces.map((space) => [space.id, space] as const))(
    '%s: switching moves nothing',
    (_, space) => {
      fc.assert(
        fc.property(small, shift, fc.nat({ max: 9 }), fc.nat({ max: 9 }), (angle, move, from, to) => {
          const count = space.sources.length;
          const pose = {
            [nameOf('root')]: { ry: angle, tx: move },
            [nameOf('spine.high')]: { rz: angle / 2, ty: move },
            [nameOf('spine.low')]: { rx: angle / 3 },
            [space.control]: { tx: move, rz: angle, [space.attribute]: from % count },
          };
          const before = reader.worldOf(pose, [space.control])[0];
          const matched = matchSpace(reader, space, to % count, pose);
          expect(matched[space.control]?.[space.attribute]).toBe(to % count);
          const after = reader.worldOf(matched, [space.control])[0];
          const free = !reader.control(space.control).channels.tx?.locked;
          if (before === undefined || after === undefined) throw new Error('the control is there');
          if (free) expectNear(positionOf(after), positionOf(before), 1e-7);
          if (!reader.control(space.control).channels.rx?.locked) {
            expectSameRotation(rotationOf(after), rotationOf(before), 1e-7);
          }
        }),
        { numRuns: 40 },
      );
    },
  );
});
