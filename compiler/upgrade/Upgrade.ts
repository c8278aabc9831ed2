import type { Step } from '../slipway/Step';

/** One change of a scene that holds the old rig. */
export type UpgradeStep =
  /** States what the scene's own step says from now on. */
  | { readonly kind: 'scene'; readonly step: Step }
  /** Gives a thing another name, everywhere; keys of animation go with it. */
  | { readonly kind: 'rename'; readonly name: string; readonly to: string }
  /** Makes a new thing, with its details. */
  | { readonly kind: 'add'; readonly steps: readonly Step[] }
  /** Gives keys of a thing new values. */
  | { readonly kind: 'set'; readonly step: Step; readonly keys: readonly string[] }
  /** Takes away all details of a thing and says them anew. */
  | { readonly kind: 'details'; readonly name: string; readonly steps: readonly Step[] }
  | { readonly kind: 'remove'; readonly name: string }
  /** Puts a thing before another in the order of the rig. */
  | { readonly kind: 'place'; readonly name: string; readonly before: string | null }
  /** Says that values of one attribute of a control are those of another from now on. */
  | { readonly kind: 'remap'; readonly name: string; readonly from: string; readonly to: string };

/** What turns a scene that holds one version of a rig into one that holds another. */
export interface Upgrade {
  /** SHA-256 of the scripts of both versions: the one the scene holds, and the one it will hold. */
  readonly from: string;
  readonly to: string;
  readonly steps: readonly UpgradeStep[];
}
