/** Slots of the numbers that a solver with a goal reads while evaluating. */
export interface ReachSlots {
  readonly blend: number;
  readonly stretch: number;
  readonly swing: number;
}
