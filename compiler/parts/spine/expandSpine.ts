import { jointNumber } from '../../expand/jointIds';
import type { PlaceReference } from '../../expand/types';
import { chainEntry } from '../chainEntry';
import { curveControls } from '../curveControls';
import type { ExpandPart } from '../types';

/** Names of the spine's joints: its ends bear their landmarks' names, the rest are numbered. */
function spineNames(from: PlaceReference, to: PlaceReference, count: number): readonly string[] {
  return Array.from({ length: count }, (_, index) => {
    const end = index === 0 ? from : index === count - 1 ? to : null;
    return typeof end === 'string' ? end.replaceAll('.', '_') : jointNumber(index, count);
  });
}

/** A row of joints along a curve between two ends, bent by a control at each end and some between. */
export const expandSpine: ExpandPart<'spine'> = ({ id, side }, part) => {
  const count = part.joints ?? 5;
  const names = spineNames(part.from, part.to, count);
  const joints = names.map((name) => `${id}.${name}`);
  const between = (part.controls ?? 3) - 2;
  const middles = Array.from({ length: between }, (_, index) =>
    between === 1 ? `${id}.middle` : `${id}.middle_${jointNumber(index, between)}`,
  );
  const chain = chainEntry(
    side,
    { points: [part.from, ...(part.via ?? []), part.to], joints: count, names: [...names] },
    part,
  );
  const made = curveControls({
    id,
    side,
    joints,
    controls: [`${id}.low`, ...middles, `${id}.high`],
    parent: part.parent,
    from: part.from,
    to: part.to,
    shape: 'square',
    size: 1.6,
    order: part.rotation_order,
    stretch: part.stretch ?? 1,
    volume: part.volume ?? 0,
  });
  return { ...made, chains: { [id]: chain, ...made.chains } };
};
