import type { ChainEntry } from '../expand/primitives';
import type { Side } from '../rig/Rig';

/** The options that parts hand on to the chains they make. */
export interface ChainOptions {
  readonly role?: string;
  readonly parent?: string;
  readonly mirror?: NonNullable<ChainEntry['mirror']>;
  readonly orient?: NonNullable<ChainEntry['orient']>;
  readonly rotation_order?: NonNullable<ChainEntry['rotation_order']>;
  readonly limits?: NonNullable<ChainEntry['limits']>;
}

/** A chain of a part: its own keys, and the options that the part was given. */
export function chainEntry(side: Side, own: ChainEntry, options: ChainOptions): ChainEntry {
  const { role = 'skin', parent, mirror, orient, rotation_order: order, limits } = options;
  return {
    side,
    role,
    ...(parent === undefined ? {} : { parent }),
    ...(mirror === undefined ? {} : { mirror }),
    ...(orient === undefined ? {} : { orient }),
    ...(order === undefined ? {} : { rotation_order: order }),
    ...(limits === undefined ? {} : { limits }),
    ...own,
  };
}
