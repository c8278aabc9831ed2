import type { LengthUnit } from '../rig/Rig';
import type { HouseRules } from '../schema/generated/houseTypes';

type ProfileEntry = NonNullable<HouseRules['profiles']>[string];

/** What one receiving system wants, with defaults filled in; null where it sets no bound. */
export interface DeliveryProfile {
  readonly id: string;
  readonly formats: readonly ('gltf' | 'usd')[];
  /** usd only: glTF is always Y up, Z forward, in metres. */
  readonly up: '+y' | '+z';
  readonly forward: '+x' | '-x' | '+y' | '-y' | '+z' | '-z';
  readonly unit: LengthUnit;
  readonly skinJointsOnly: boolean;
  readonly jointsAtMost: number | null;
  readonly depthAtMost: number | null;
  readonly influencesAtMost: number | null;
  readonly names: {
    readonly longest: number | null;
    readonly letters: 'any' | 'lower' | 'upper';
    readonly digits: boolean;
  };
  readonly rootAtOrigin: boolean;
  readonly animation: 'none' | 'range_of_motion';
  /** By the receiver's name. */
  readonly bones: ReadonlyMap<string, ProfileBone>;
}

export interface ProfileBone {
  readonly joint: string;
  readonly required: boolean;
  readonly parent: string | null;
}

/** Fills in what a profile leaves out. */
export function toProfile(id: string, entry: ProfileEntry): DeliveryProfile {
  return {
    id,
    formats: entry.formats,
    up: entry.up ?? '+y',
    forward: entry.forward ?? (entry.up === '+z' ? '-y' : '+z'),
    unit: entry.unit ?? 'cm',
    skinJointsOnly: entry.skin_joints_only ?? true,
    jointsAtMost: entry.joints_at_most ?? null,
    depthAtMost: entry.depth_at_most ?? null,
    influencesAtMost: entry.influences_at_most ?? null,
    names: {
      longest: entry.names?.longest ?? null,
      letters: entry.names?.letters ?? 'any',
      digits: entry.names?.digits ?? true,
    },
    rootAtOrigin: entry.root_at_origin ?? false,
    animation: entry.animation ?? 'range_of_motion',
    bones: new Map(
      Object.entries(entry.bones ?? {}).map(([name, bone]) => [
        name,
        { joint: bone.joint, required: bone.required ?? false, parent: bone.parent ?? null },
      ]),
    ),
  };
}
