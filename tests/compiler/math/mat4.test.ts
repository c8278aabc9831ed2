import fc from 'fast-check';
import { Matrix4, Quaternion, Vector3 } from 'three';
import { describe, expect, it } from 'vitest';
import {
  columnsOf,
  composeMat4,
  decomposeMat4,
  determinantOf,
  IDENTITY_MAT4,
  invertMat4,
  type Mat4,
  mirrorMat4X,
  multiplyMat4,
  orthonormaliseAxes,
  transformDirection,
  transformPoint,
} from '@/compiler/math/mat4';
import { cross, dot, length } from '@/compiler/math/vec3';
import type { Quat, Vec3 } from '@/compiler/rig/Rig';
import { point, rotation } from './arbitraries';
import { expectNear, expectSameRotation } from './expectNear';
import { readReference } from './readReference';

const factor = fc.double({ min: 0.1, max: 10, noNaN: true });
const factors: fc.Arbitrary<Vec3> = fc.tuple(factor, factor, factor);

/** Outside check: three.js 0.187 (MIT). */
function threeMatrix(at: Vec3, turn: Quat, size: Vec3): Matrix4 {
  return new Matrix4().compose(new Vector3(...at), new Quaternion(...turn), new Vector3(...size));
}

describe('against three.js', () => {
  it('composes, multiplies and inverts alike', () => {
    fc.assert(
      fc.property(point, rotation, factors, point, rotation, (at, turn, size, at2, turn2) => {
        const a = composeMat4(at, turn, size);
        const b = composeMat4(at2, turn2);
        const theirs = threeMatrix(at, turn, size);
        expectNear(a, theirs.elements, 1e-9);
        const theirProduct = theirs.clone().multiply(threeMatrix(at2, turn2, [1, 1, 1]));
        expectNear(multiplyMat4(a, b), theirProduct.elements, 1e-8);
        expectNear(invertMat4(a) ?? [], theirs.clone().invert().elements, 1e-7);
        expectNear(transformPoint(a, at2), new Vector3(...at2).applyMatrix4(theirs).toArray(), 1e-8);
      }),
    );
  });
});

describe('against the worked chains', () => {
  interface Joint {
    readonly parent: number;
    readonly translation: Vec3;
    readonly rotation_xyzw: Quat;
    readonly scale: Vec3;
    readonly world_column_major: readonly number[];
    readonly inverse_bind_column_major: readonly number[];
  }

  it('gives the world and inverse bind matrices of glTF 2.0 §3.5.3 and §3.7.3', () => {
    // Source: tests/data/numeric/trs_chain.json, computed independently from the glTF 2.0 definitions.
    const { joints } = readReference<{ joints: readonly Joint[] }>('trs_chain.json');
    const world: Mat4[] = [];
    for (const joint of joints) {
      const own = composeMat4(joint.translation, joint.rotation_xyzw, joint.scale);
      const matrix = multiplyMat4(world[joint.parent] ?? IDENTITY_MAT4, own);
      world.push(matrix);
      expectNear(matrix, joint.world_column_major, 1e-9);
      expectNear(invertMat4(matrix) ?? [], joint.inverse_bind_column_major, 1e-9);
    }
    expect(world).toHaveLength(3);
  });

  it('mirrors in x = 0 as S·M·S does', () => {
    // Source: tests/data/numeric/mirror_x.json, linear algebra computed independently.
    interface MirrorCase {
      readonly matrix_rows: readonly (readonly number[])[];
      readonly mirrored_SMS_rows: readonly (readonly number[])[];
    }
    const fromRows = (rows: readonly (readonly number[])[]): Mat4 =>
      [0, 1, 2, 3].flatMap((column) => rows.map((row) => row[column] as number)) as unknown as Mat4;
    for (const one of readReference<{ cases: readonly MirrorCase[] }>('mirror_x.json').cases) {
      const matrix = fromRows(one.matrix_rows);
      expectNear(mirrorMat4X(matrix), fromRows(one.mirrored_SMS_rows), 1e-12);
      expect(mirrorMat4X(mirrorMat4X(matrix))).toEqual(matrix.map((entry) => entry + 0));
      expect(determinantOf(mirrorMat4X(matrix))).toBeCloseTo(1, 12);
    }
  });
});

describe('taking apart', () => {
  it('gives back what was composed, mirrored ones by a negative z', () => {
    fc.assert(
      fc.property(point, rotation, factors, fc.boolean(), (at, turn, [x, y, z], mirrored) => {
        const size: Vec3 = [x, y, mirrored ? -z : z];
        const parts = decomposeMat4(composeMat4(at, turn, size));
        expectNear(parts.at, at, 0);
        expectSameRotation(parts.turn, turn, 1e-9);
        expectNear(parts.scale, size, 1e-9);
      }),
    );
  });

  it('keeps the direction of x and the plane of x and y under shear', () => {
    fc.assert(
      fc.property(rotation, factors, rotation, (outer, size, inner) => {
        const sheared = multiplyMat4(composeMat4([0, 0, 0], outer, size), composeMat4([0, 0, 0], inner));
        const [x, y, z] = columnsOf(sheared);
        const [first, second, third] = orthonormaliseAxes(x, y, z);
        expect(dot(first, x)).toBeCloseTo(length(x), 9);
        expect(Math.abs(dot(third, y))).toBeLessThan(1e-9);
        expect(dot(second, y)).toBeGreaterThan(0);
        expectNear(cross(first, second), third);
      }),
    );
  });

  it('finds right-handed axes even where columns vanish or are parallel', () => {
    const cases: readonly [Vec3, Vec3, Vec3][] = [
      [
        [0, 0, 0],
        [0, 2, 0],
        [0, 0, 3],
      ],
      [
        [1, 0, 0],
        [0, 0, 0],
        [0, 0, 3],
      ],
      [
        [1, 0, 0],
        [2, 0, 0],
        [0, 0, 3],
      ],
      [
        [1, 0, 0],
        [0, 0, 0],
        [0, 0, 0],
      ],
      [
        [0, 0, 0],
        [0, 5, 0],
        [0, 0, 0],
      ],
      [
        [0, 0, 0],
        [0, 0, 0],
        [0, 0, 0],
      ],
    ];
    for (const columns of cases) {
      const [x, y, z] = orthonormaliseAxes(...columns);
      expectNear([length(x), length(y), dot(x, y)], [1, 1, 0]);
      expectNear(cross(x, y), z);
    }
    expect(orthonormaliseAxes([0, 0, 0], [0, 2, 0], [0, 0, 3])).toEqual([
      [1, 0, 0],
      [0, 1, 0],
      [0, 0, 1],
    ]);
  });
});

describe('inverting', () => {
  it('has no answer where space is flattened', () => {
    expect(invertMat4(composeMat4([1, 2, 3], [0, 0, 0, 1], [1, 0, 1]))).toBeUndefined();
    expect(invertMat4([1, 2, 3, 0, 2, 4, 6, 0, 0, 0, 1, 0, 0, 0, 0, 1])).toBeUndefined();
  });

  it('does not mistake a small scale for a flat one', () => {
    const tiny = composeMat4([0, 0, 0], [0, 0, 0, 1], [1e-9, 1e-9, 1e-9]);
    expectNear(multiplyMat4(invertMat4(tiny) ?? IDENTITY_MAT4, tiny), IDENTITY_MAT4);
  });

  it('turns directions without moving them', () => {
    expect(transformDirection(composeMat4([9, 9, 9], [0, 0, 0, 1]), [1, 2, 3])).toEqual([1, 2, 3]);
  });
});
