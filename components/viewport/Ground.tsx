'use client';

import { useMemo } from 'react';
import { axisDirection, leftDirection, type RigScene, type Vec3 } from '@/compiler';
import { FatLines } from './FatLines';

/** A spacing of 1, 2 or 5 times a power of ten, so that graph paper reads like a ruler. */
export function paperSpacing(size: number): number {
  const raw = size / 16;
  const power = 10 ** Math.floor(Math.log10(raw));
  const share = raw / power;
  return power * (share < 1.5 ? 1 : share < 3.5 ? 2 : share < 7.5 ? 5 : 10);
}

interface GroundLines {
  readonly fine: readonly number[];
  readonly bold: readonly number[];
}

/** A point on the ground, by how far it lies to the left and forward. */
type OnGround = (leftwards: number, onwards: number) => Vec3;

function onGround(scene: Pick<RigScene, 'up' | 'forward'>): OnGround {
  const forward = axisDirection(scene.forward);
  const left = leftDirection(scene);
  return (leftwards, onwards) => [
    left[0] * leftwards + forward[0] * onwards,
    left[1] * leftwards + forward[1] * onwards,
    left[2] * leftwards + forward[2] * onwards,
  ];
}

/** Graph paper on the ground with every fifth line bold. */
function groundLines(on: OnGround, spacing: number): GroundLines {
  const count = 10;
  const reach = spacing * count;
  const fine: number[] = [];
  const bold: number[] = [];
  for (let step = -count; step <= count; step += 1) {
    const into = step % 5 === 0 ? bold : fine;
    into.push(...on(step * spacing, -reach), ...on(step * spacing, reach));
    into.push(...on(-reach, step * spacing), ...on(reach, step * spacing));
  }
  return { fine, bold };
}

/** How far forward of the origin something reaches. */
function reachOf({ low, high }: GroundProps['extent'], scene: Pick<RigScene, 'forward'>): number {
  const forward = axisDirection(scene.forward);
  const reach = forward.map((share, axis) => Math.max(share * (low[axis] ?? 0), share * (high[axis] ?? 0)));
  return reach.reduce((sum, part) => sum + part, 0);
}

/** The arrow on the ground before the rig that points forward: its line ends, the tip last. */
function forwardMark(on: OnGround, from: number, spacing: number): readonly number[] {
  const [tail, tip] = [from + spacing * 0.4, from + spacing * 1.6];
  const wing = spacing * 0.4;
  return [
    ...[...on(wing, tip - wing), ...on(0, tip)],
    ...[...on(-wing, tip - wing), ...on(0, tip)],
    ...[...on(0, tail), ...on(0, tip)],
  ];
}

export interface GroundProps {
  readonly scene: Pick<RigScene, 'up' | 'forward'>;
  /** The box around the rig and its size. */
  readonly extent: { readonly low: Vec3; readonly high: Vec3; readonly size: number };
  readonly rule: string;
  readonly ink: string;
}

/** The ground a rig stands on. */
export function Ground({ scene, extent, rule, ink }: GroundProps) {
  const { up, forward } = scene;
  const spacing = paperSpacing(extent.size);
  const from = reachOf(extent, scene);
  const lines = useMemo(() => groundLines(onGround({ up, forward }), spacing), [up, forward, spacing]);
  const mark = useMemo(
    () => forwardMark(onGround({ up, forward }), from, spacing),
    [up, forward, from, spacing],
  );
  return (
    <>
      <FatLines ends={lines.fine} colour={rule} width={0.8} dash={null} opacity={0.55} />
      <FatLines ends={lines.bold} colour={rule} width={1.2} dash={null} />
      <FatLines ends={mark} colour={ink} width={1.6} dash={null} />
    </>
  );
}
