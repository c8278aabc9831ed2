import { emitScript } from '@/compiler/emit/emitScript';
import { planSteps } from '@/compiler/plan/planSteps';
import { createPoser } from '@/compiler/pose/createPoser';
import { runScript } from '@/compiler/slipway/runScript';
import type { BenchRow } from './BenchRow';
import { makeLargeRig } from './largeRig';
import { median } from './median';

const ROUNDS = 15;

/** Median time of one call in milliseconds, over rounds of `calls` calls, after as many to warm up. */
function medianMilliseconds(calls: number, task: () => void): number {
  const times: number[] = [];
  for (let round = 0; round < ROUNDS * 2; round += 1) {
    const start = performance.now();
    for (let call = 0; call < calls; call += 1) task();
    if (round >= ROUNDS) times.push((performance.now() - start) / calls);
  }
  return median(times);
}

/** Times of a rig of 300 joints: posing it, emitting its script, running the script. */
export async function measure(): Promise<readonly BenchRow[]> {
  const { rig, pose } = makeLargeRig();
  const poser = createPoser(rig);
  const text = emitScript(planSteps(rig));
  const row = (name: string, goal: number, value: number): BenchRow => ({ name, value, goal, unit: 'ms' });
  return [
    row(
      'evaluate a pose, 300 joints',
      0.6,
      medianMilliseconds(100, () => poser.evaluate(pose)),
    ),
    row(
      'plan and emit, 300 joints',
      6,
      medianMilliseconds(5, () => void emitScript(planSteps(rig))),
    ),
    row(
      'run the script, 300 joints',
      30,
      medianMilliseconds(3, () => void runScript({ name: 'bench.slip', text })),
    ),
  ];
}
