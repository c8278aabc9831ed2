import fc from 'fast-check';
import { Euler, type EulerOrder, MathUtils, Object3D, Quaternion, Vector3 } from 'three';
import { describe, expect, it } from 'vitest';
import { createPoser } from '@/compiler/pose/createPoser';
import type { ControlNode, PoseValues } from '@/compiler/rig/Rig';
import { degrees, order, point, rotation } from '../math/arbitraries';
import { expectNear } from '../math/expectNear';
import { control, group, joint, rigOf } from './rigParts';
import { worldOf } from './worldOf';

const factor = fc.double({ min: 0.2, max: 3, noNaN: true });

/** A chain or tree of controls: each hangs below one of those before it. */
const posedTree = fc
  .array(
    fc.record({
      above: fc.nat(),
      at: point,
      turn: rotation,
      order,
      move: point,
      angles: degrees,
      size: fc.tuple(factor, factor, factor),
    }),
    { minLength: 1, maxLength: 12 },
  )
  .map((entries) => {
    const name = (index: number): string => `control_${index}`;
    const nodes: ControlNode[] = entries.map(({ above, at, turn, order: rotationOrder }, index) =>
      control(name(index), {
        parent: index === 0 ? null : name(above % index),
        at,
        turn,
        order: rotationOrder,
      }),
    );
    const pose: PoseValues = Object.fromEntries(
      entries.map(({ move, angles, size }, index) => [
        name(index),
        {
          tx: move[0],
          ty: move[1],
          tz: move[2],
          rx: angles[0],
          ry: angles[1],
          rz: angles[2],
          sx: size[0],
          sy: size[1],
          sz: size[2],
        },
      ]),
    );
    return { nodes, pose };
  });

/** The same tree of three.js objects: one for rest, one below it for the channels. */
function threeWorld(nodes: readonly ControlNode[], pose: PoseValues): readonly (readonly number[])[] {
  const tips = new Map<string, Object3D>();
  const top = new Object3D();
  for (const node of nodes) {
    const rest = new Object3D();
    rest.position.set(...node.at);
    rest.quaternion.copy(new Quaternion(...node.turn));
    const moved = new Object3D();
    const v = pose[node.name] ?? {};
    moved.position.copy(new Vector3(v.tx, v.ty, v.tz));
    const intrinsic = [...node.order].reverse().join('').toUpperCase() as EulerOrder;
    const [x, y, z] = [v.rx ?? 0, v.ry ?? 0, v.rz ?? 0].map((angle) => MathUtils.degToRad(angle));
    moved.quaternion.setFromEuler(new Euler(x, y, z, intrinsic));
    moved.scale.set(v.sx ?? 1, v.sy ?? 1, v.sz ?? 1);
    rest.add(moved);
    (node.parent === null ? top : (tips.get(node.parent) ?? top)).add(rest);
    tips.set(node.name, moved);
  }
  top.updateMatrixWorld(true);
  return nodes.map(({ name }) => tips.get(name)?.matrixWorld.elements ?? []);
}

describe('forward kinematics', () => {
  it('equals that of a tree of three.js 0.187 (MIT) objects, scale and shear included', () => {
    fc.assert(
      fc.property(posedTree, ({ nodes, pose }) => {
        const world = [...worldOf(rigOf(nodes), pose).values()];
        threeWorld(nodes, pose).forEach((expected, index) => {
          const matrix = world[index] ?? [];
          const size = Math.max(1, ...expected.map(Math.abs));
          expectNear(matrix, expected, size * 1e-11);
        });
      }),
    );
  });

  it('moves only what hangs below', () => {
    const rig = rigOf([
      control('root'),
      group('carried', { parent: 'root', at: [0, 1, 0] }),
      group('parked', { at: [5, 0, 0] }),
      joint('hip', { parent: 'carried', at: [0, 2, 0] }),
    ]);
    const world = worldOf(rig, { root: { tx: 10, rz: 90 } });
    expectNear(world.get('hip') ?? [], [0, 1, 0, 0, -1, 0, 0, 0, 0, 0, 1, 0, 7, 0, 0, 1]);
    expectNear(world.get('parked') ?? [], [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0, 5, 0, 0, 1]);
  });

  it('fills whole matrices, the last row too', () => {
    const poser = createPoser(rigOf([control('root'), joint('hip', { parent: 'root', at: [1, 2, 3] })]));
    poser.evaluate({ root: { sx: 2, rx: 10 } });
    for (const start of [0, 16]) {
      expect([3, 7, 11, 15].map((entry) => poser.world[start + entry])).toEqual([0, 0, 0, 1]);
    }
    expect(poser.world).toHaveLength(32);
  });

  it('gives the same numbers for a pose whatever was evaluated before', () => {
    fc.assert(
      fc.property(posedTree, ({ nodes, pose }) => {
        const poser = createPoser(rigOf(nodes));
        const rest = Array.from(poser.world);
        poser.evaluate(pose);
        const posed = Array.from(poser.world);
        poser.evaluate();
        expect(Array.from(poser.world)).toEqual(rest);
        poser.evaluate(pose);
        expect(Array.from(poser.world)).toEqual(posed);
      }),
    );
  });
});

describe('channels and attributes', () => {
  const limited = control('knob', {
    channels: {
      tx: { locked: false, min: -1, max: 2 },
      ty: { locked: true, min: null, max: null },
      sz: { locked: true, min: null, max: null },
    },
  });
  const at = (pose: PoseValues): readonly number[] =>
    (worldOf(rigOf([limited]), pose).get('knob') ?? []).slice(12, 15);

  it('stay within their limits, and at rest where locked', () => {
    expect(at({ knob: { tx: 9, ty: 9, tz: 9 } })).toEqual([2, 0, 9]);
    expect(at({ knob: { tx: -9 } })).toEqual([-1, 0, 0]);
    const scaled = worldOf(rigOf([limited]), { knob: { sz: 4 } }).get('knob');
    expect(scaled?.[10]).toBe(1);
  });

  it('read rest for what is no finite number', () => {
    expect(at({ knob: { tx: Number.NaN, tz: Number.POSITIVE_INFINITY } })).toEqual([0, 0, 0]);
  });

  it('are not fooled by names that every object knows', () => {
    const rig = rigOf([
      control('constructor', {
        attributes: [{ name: 'length', default: 0, min: null, max: null, labels: null, note: null }],
      }),
    ]);
    expect((worldOf(rig, {}).get('constructor') ?? []).slice(12, 15)).toEqual([0, 0, 0]);
    expect((worldOf(rig, JSON.parse('{"__proto__": {"tx": 3}}')).get('constructor') ?? [])[12]).toBe(0);
  });
});
