/** Below this length, relative to the vectors a result was made from, a direction is rounding noise. */
export const DIRECTION_TOLERANCE = 1e-12;

/**
 * Below this cosine of the middle angle the first and third axes count as one line. Rounding leaves about 1e-16 in
 * a matrix entry, so at 1e-10 the third angle still has six good digits; below it is noise and is set to zero.
 */
export const GIMBAL_TOLERANCE = 1e-10;

/**
 * Above this cosine between two quaternions the sine in the slerp weights loses digits, while a straight line
 * between them is exact to 1e-13 of a turn.
 */
export const SLERP_LINEAR_COSINE = 1 - 1e-12;

/** Relative to the rig's size: what rest must keep when solvers and constraints run over it. */
export const REST_TOLERANCE = 1e-9;

/**
 * Relative to a chain's length: a reach this near to the rest reach, to full reach or to the nearest place the chain
 * can fold to counts as exactly that. The bend grows with the square root of what is left to full reach, so without
 * it the rounding of 1e-16 in a straight chain's length would bend it by 1e-8.
 */
export const REACH_TOLERANCE = 1e-12;

/**
 * Relative to a chain's length: a middle joint nearer than this to the line start–end leaves the chain straight, so
 * that the pole alone says which way it bends. Rounded rest positions put a straight chain's middle off by less.
 */
export const BEND_TOLERANCE = 1e-6;

/**
 * Relative to its distance: a pole nearer than this to the line start–goal names no plane. Rounding of 1e-16 would
 * swing a nearer one's plane by more than 1e-10.
 */
export const POLE_TOLERANCE = 1e-6;
