import type { MadePrimitives, PartEntry } from '../expand/primitives';
import { expandLimb } from './limb/expandLimb';
import { expandRoot } from './root/expandRoot';
import { expandStrand } from './strand/expandStrand';
import type { PartContext } from './types';

/** Writes any part out in primitives; the one place that knows which kinds there are. */
export function expandPart(context: PartContext, part: PartEntry): MadePrimitives {
  switch (part.kind) {
    case 'root':
      return expandRoot(context, part);
    case 'limb':
      return expandLimb(context, part);
    case 'strand':
      return expandStrand(context, part);
    default:
      return part satisfies never;
  }
}
