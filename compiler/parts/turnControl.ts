import type { ControlEntry } from '../expand/primitives';
import type { JointLimits } from '../expand/types';
import type { RotationOrder, ShapeName, Side } from '../rig/Rig';

/** What a control that turns one joint may say besides where it stands. */
export interface TurnControlOptions {
  readonly side: Side;
  readonly parent: string | undefined;
  readonly order?: RotationOrder | undefined;
  readonly limits?: LimitsEntry | undefined;
  readonly shape?: ShapeName | undefined;
  readonly size?: number | undefined;
  /** Lets the control be moved as well as turned. */
  readonly moves?: boolean;
}

/** Limits of one joint as the language writes them. */
export type LimitsEntry = {
  readonly [Turn in keyof JointLimits]?: { readonly min?: number; readonly max?: number };
};

/** A control that stands on a joint and turns with it; what it may turn is limited as the joint is. */
export function turnControl(joint: string, options: TurnControlOptions): ControlEntry {
  const { side, parent, order, limits = {}, shape = 'ring', size = 1, moves = false } = options;
  return {
    side,
    at: joint,
    align: joint,
    ...(parent === undefined ? {} : { parent }),
    shape,
    size,
    ...(order === undefined ? {} : { rotation_order: order }),
    channels: { ...(moves ? {} : { move: { locked: true } }), scale: { locked: true }, ...limits },
  };
}
