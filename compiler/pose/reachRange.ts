/** Reach of a chain in one evaluation: [distance from start to end without stretch, factor on the bones' length]. */
export type ReachRange = Float64Array;

/** What limits how a chain follows its goal. */
export interface ReachOptions {
  /** Slots of the attribute or number in the values. */
  readonly stretchSlot: number;
  readonly stretchLimit: number;
  /** Share of the chain's length over which the end slows down. */
  readonly soft: number;
  /** Distance from start to end at rest as a share of the chain's length. */
  readonly restDistance: number;
}

/**
 * How far a chain of length `most` reaches when asked for `asked`. Within the soft zone, which never begins before
 * the reach of rest so that rest stays as it is, the end nears full reach exponentially: with s the zone's length and
 * b = most − s where it begins, b + s (1 − e^((b − asked) / s)). What is left is made up by stretching, as far as
 * `stretch` (0 to 1) and the limit allow.
 */
export function reachRangeInto(
  out: ReachRange,
  asked: number,
  most: number,
  options: ReachOptions,
  values: Float64Array,
): void {
  const zone = Math.min(options.soft, Math.max(0, 1 - options.restDistance)) * most;
  const begin = most - zone;
  let reached = asked;
  if (asked > begin) reached = zone > 0 ? begin + zone * (1 - Math.exp((begin - asked) / zone)) : most;
  const stretch = Math.min(1, Math.max(0, values[options.stretchSlot] as number));
  const wanted = reached > 0 ? Math.min(asked / reached, options.stretchLimit) : 1;
  out[0] = reached;
  out[1] = wanted > 1 ? 1 + stretch * (wanted - 1) : 1;
}
