import { OrthographicCamera } from 'three';
import { describe, expect, it } from 'vitest';
import type { Drawing } from '@/components/viewport/drawing';
import { nearestNode } from '@/components/viewport/nearestNode';

/**
 * A camera that looks along −z at a square of 200 by 100 units in a picture of 200 by 100 pixels: a unit is a pixel,
 * and (x, y) of the world is drawn at (100 + x, 50 − y).
 */
function knownCamera(): OrthographicCamera {
  const camera = new OrthographicCamera(-100, 100, 50, -50, 0.1, 100);
  camera.position.set(0, 0, 10);
  camera.updateMatrixWorld();
  return camera;
}

const drawing = (
  joints: readonly (readonly [number, number, number])[],
  outlines: readonly (readonly [number, readonly number[]])[],
): Drawing => ({
  joints: joints.map((at, node) => ({ node, side: 'centre', isShown: true, at })),
  bones: [],
  controls: { left: [], right: [], centre: [] },
  leaders: [],
  outlines: new Map(outlines),
  low: [0, 0, 0],
  high: [1, 1, 1],
  size: 1,
});

const at = (drawn: Drawing, x: number, y: number) => nearestNode(drawn, knownCamera(), 200, 100, x, y);

describe('what a person points at', () => {
  const twoJoints = drawing(
    [
      [0, 0, 0],
      [40, 20, 0],
    ],
    [],
  );

  it('is the joint drawn there', () => {
    expect(at(twoJoints, 100, 50)).toBe(0);
    expect(at(twoJoints, 140, 30)).toBe(1);
    expect(at(twoJoints, 136, 33)).toBe(1);
  });

  it('is nothing far from everything', () => {
    expect(at(twoJoints, 10, 10)).toBeNull();
    // Twelve pixels reach, and five more for a joint.
    expect(at(twoJoints, 100, 50 + 16.9)).toBe(0);
    expect(at(twoJoints, 100, 50 + 17.1)).toBeNull();
    expect(at(drawing([], []), 100, 50)).toBeNull();
  });

  it('is a control along its whole line, and not beyond its ends', () => {
    const line = drawing([], [[7, [-50, 0, 0, 50, 0, 0]]]);
    expect(at(line, 100, 50)).toBe(7);
    expect(at(line, 60, 61)).toBe(7);
    expect(at(line, 60, 63)).toBeNull();
    expect(at(line, 161, 50)).toBe(7);
    expect(at(line, 163, 50)).toBeNull();
  });

  it('is the joint where a control runs past it, and the control further off', () => {
    const both = drawing([[0, 0, 0]], [[7, [-50, 3, 0, 50, 3, 0]]]);
    expect(at(both, 100, 48)).toBe(0);
    expect(at(both, 130, 47)).toBe(7);
  });

  it('is the nearer of two controls, even one drawn as a point', () => {
    const two = drawing(
      [],
      [
        [3, [0, 0, 0, 0, 0, 0]],
        [4, [0, 20, 0, 10, 20, 0]],
      ],
    );
    expect(at(two, 100, 41)).toBe(3);
    expect(at(two, 100, 39)).toBe(4);
  });
});
