import type { MadePart, PartEntry } from '../expand/primitives';
import { expandAxle } from './axle/expandAxle';
import { expandClavicle } from './clavicle/expandClavicle';
import { expandEye } from './eye/expandEye';
import { expandFoot } from './foot/expandFoot';
import { expandHand } from './hand/expandHand';
import { expandJaw } from './jaw/expandJaw';
import { expandLegThree } from './leg_three/expandLegThree';
import { expandLimb } from './limb/expandLimb';
import { expandNeckHead } from './neck_head/expandNeckHead';
import { expandRoot } from './root/expandRoot';
import { expandSpine } from './spine/expandSpine';
import { expandStrand } from './strand/expandStrand';
import type { PartContext } from './types';
import { expandWing } from './wing/expandWing';

/** Writes any part out in primitives; the one place that knows which kinds there are. */
export function expandPart(context: PartContext, part: PartEntry): MadePart {
  switch (part.kind) {
    case 'root':
      return expandRoot(context, part);
    case 'spine':
      return expandSpine(context, part);
    case 'neck_head':
      return expandNeckHead(context, part);
    case 'limb':
      return expandLimb(context, part);
    case 'foot':
      return expandFoot(context, part);
    case 'hand':
      return expandHand(context, part);
    case 'clavicle':
      return expandClavicle(context, part);
    case 'eye':
      return expandEye(context, part);
    case 'jaw':
      return expandJaw(context, part);
    case 'strand':
      return expandStrand(context, part);
    case 'wing':
      return expandWing(context, part);
    case 'leg_three':
      return expandLegThree(context, part);
    case 'axle':
      return expandAxle(context, part);
    default:
      return part satisfies never;
  }
}
