import { CHANNELS } from '../pose/channelValues';
import { displacement } from './displacement';
import { type PoseDraft, put } from './poses';
import { Tally } from './Tally';
import type { TrialBench } from './TrialBench';
import type { TrialResult } from './TrialResult';

/**
 * Every control reads zero at rest: zeros on all its channels (ones for scale) and its defaults on all attributes,
 * given as values, change nothing. A limit that does not let a channel be zero shows here.
 */
export function tryZero(bench: TrialBench): TrialResult {
  const { rig, poser, evaluatedRest, controls, size, tolerance } = bench;
  const tally = new Tally('zero', rig.scene.unit, tolerance);
  const zeros: PoseDraft = {};
  for (const { name, attributes } of controls.values()) {
    put(zeros, name, Object.fromEntries(attributes.map((attribute) => [attribute.name, attribute.default])));
    put(
      zeros,
      name,
      Object.fromEntries(CHANNELS.map((channel) => [channel, channel.startsWith('s') ? 1 : 0])),
    );
  }
  poser.evaluate(zeros);
  rig.nodes.forEach(({ id }, index) => {
    tally.add(displacement(poser.world, index, evaluatedRest, index, size), id, zeros);
  });
  return tally.result();
}
