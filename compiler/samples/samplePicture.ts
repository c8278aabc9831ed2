import { frontPicture } from '../chart/frontPicture';
import { compile } from '../compile';
import { samples } from './samples';

/** A sample at rest from the front, as SVG; undefined for a sample there is not. */
export function samplePicture(id: string): string | undefined {
  const sample = samples.find((candidate) => candidate.id === id);
  if (!sample) return undefined;
  const { rig } = compile({ recipe: { name: `${id}.recipe.yaml`, text: sample.text }, trials: false });
  return rig ? frontPicture(rig) : undefined;
}
