import { displacement } from './displacement';
import { allAtWork } from './poses';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/** At rest nothing moves: with every constraint and solver at work each node stands where its rest transform says. */
export function tryRest(bench: TrialBench): TrialResult {
  const { rig, poser, rest, evaluatedRest, size, tolerance } = bench;
  const tally = new Tally('rest', rig.scene.unit, tolerance);
  rig.nodes.forEach(({ id }, index) => {
    tally.add(displacement(evaluatedRest, index, rest, index, size), id);
  });
  const atWork = allAtWork(bench);
  poser.evaluate(atWork);
  rig.nodes.forEach(({ id }, index) => {
    tally.add(displacement(poser.world, index, rest, index, size), id, atWork);
  });
  return tally.result();
}
