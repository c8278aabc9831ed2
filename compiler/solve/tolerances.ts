/**
 * Below this sine between two bones (or a bone and a direction) they count as one line: 1e-6 is a sagitta of half
 * a micrometre on a metre, far below what anyone measures on a model, and far above rounding noise.
 */
export const STRAIGHT_TOLERANCE = 1e-6;

/** Rest positions are rounded to this many decimals of the scene's unit, so that scripts read cleanly. */
export const POSITION_DECIMALS = 10;

/** Rest quaternions are rounded to this many decimals; 1e-12 of a turn at a rig's size is below 1e-9 of it. */
export const TURN_DECIMALS = 12;

/** Bones shorter than this fraction of the rig's size count as none. */
export const SHORTEST_BONE = 1e-9;
