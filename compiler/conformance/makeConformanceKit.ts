import { compile } from '../compile';
import { invariant } from '../findings/invariant';
import { createPoser } from '../pose/createPoser';
import type { PoseValues, Rig } from '../rig/Rig';
import { type Feature, features } from './features';
import { ADAPTER_TEXT } from './generated/adapterText';
import { KIT_GUIDE } from './generated/kitGuide';

/** One file of the kit. */
export interface KitFile {
  readonly name: string;
  readonly text: string;
}

/** Decimals of the expected numbers: far finer than the tolerance, coarse enough to be the same on any machine. */
const DECIMALS = 10;

function rounded(value: number): number {
  const factor = 10 ** DECIMALS;
  return Math.round(value * factor) / factor + 0;
}

/** A pose by the names that the script gives its controls. */
function byName(rig: Rig, pose: PoseValues): PoseValues {
  const names = new Map(rig.nodes.map(({ id, name }) => [id, name]));
  return Object.fromEntries(
    Object.entries(pose).map(([id, values]) => {
      const name = names.get(id);
      invariant(name !== undefined, `the poses of the kit name its controls ("${id}")`);
      return [name, values];
    }),
  );
}

/** Expected world matrices of every node, and weights of the morph targets, in one pose. */
function expectation(rig: Rig, poses: readonly PoseValues[]) {
  const poser = createPoser(rig);
  return poses.map((pose) => {
    poser.evaluate(pose);
    const world = rig.nodes.map(({ name }, index) => [
      name,
      Array.from(poser.world.subarray(index * 16, index * 16 + 16), rounded),
    ]);
    const weights = rig.shapes.map(({ name }, index) => [name, rounded(poser.weights[index] ?? 0)]);
    return { pose, world: Object.fromEntries(world), weights: Object.fromEntries(weights) };
  });
}

function featureFiles({ id, summary, recipe, poses }: Feature): readonly KitFile[] {
  const { rig, script, findings } = compile({
    recipe: { name: `${id}.recipe.yaml`, text: recipe },
    character: { name: 'kit' },
    trials: false,
  });
  const faults = findings.filter(({ severity }) => severity === 'error').map(({ message }) => message);
  invariant(rig !== null && script !== null, `the recipes of the kit compile (${id}: ${faults.join(' ')})`);
  const expected = {
    feature: id,
    summary,
    tolerance: 1e-6,
    poses: expectation(
      rig,
      poses.map((pose) => byName(rig, pose)),
    ),
  };
  return [
    { name: `features/${id}.slip`, text: script },
    { name: `features/${id}.expected.json`, text: `${JSON.stringify(expected)}\n` },
  ];
}

/**
 * The conformance kit for people who write adapters: for each feature a script and the world matrices that it must
 * give in some poses, an adapter skeleton, and what to do with them. The same files on every machine.
 */
export function makeConformanceKit(): readonly KitFile[] {
  return [
    { name: 'README.md', text: KIT_GUIDE.kit ?? '' },
    { name: 'adapter.mjs', text: ADAPTER_TEXT.adapter ?? '' },
    ...features.flatMap(featureFiles),
  ];
}
