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
  readonly mark: readonly number[];
}

/** Graph paper on the ground with every fifth line bold, and a mark that points forward. */
function groundLines(scene: Pick<RigScene, 'up' | 'forward'>, size: number): GroundLines {
  const forward = axisDirection(scene.forward);
  const left = leftDirection(scene);
  const spacing = paperSpacing(size);
  const count = 10;
  const reach = spacing * count;
  const on = (a: number, b: number): Vec3 => [
    left[0] * a + forward[0] * b,
    left[1] * a + forward[1] * b,
    left[2] * a + forward[2] * b,
  ];
  const fine: number[] = [];
  const bold: number[] = [];
  for (let step = -count; step <= count; step += 1) {
    const into = step % 5 === 0 ? bold : fine;
    into.push(...on(step * spacing, -reach), ...on(step * spacing, reach));
    into.push(...on(-reach, step * spacing), ...on(reach, step * spacing));
  }
  const tip = reach + spacing * 1.6;
  const wing = spacing * 0.7;
  const mark = [
    ...on(0, reach),
    ...on(0, tip),
    ...on(0, tip),
    ...on(wing, tip - wing * 1.4),
    ...on(0, tip),
    ...on(-wing, tip - wing * 1.4),
  ];
  return { fine, bold, mark };
}

export interface GroundProps {
  readonly scene: Pick<RigScene, 'up' | 'forward'>;
  readonly size: number;
  readonly rule: string;
  readonly ink: string;
}

/** The ground a rig stands on. */
export function Ground({ scene, size, rule, ink }: GroundProps) {
  const { up, forward } = scene;
  const spacing = paperSpacing(size);
  const lines = useMemo(() => groundLines({ up, forward }, spacing * 16), [up, forward, spacing]);
  return (
    <>
      <FatLines ends={lines.fine} colour={rule} width={0.8} dash={null} opacity={0.55} />
      <FatLines ends={lines.bold} colour={rule} width={1.2} dash={null} />
      <FatLines ends={lines.mark} colour={ink} width={1.6} dash={null} />
    </>
  );
}
