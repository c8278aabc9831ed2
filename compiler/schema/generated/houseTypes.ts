// Made by bin/generate.ts from the JSON Schemas. Change those, not this.

/**
 * This interface was referenced by `HouseRules`'s JSON-Schema
 * via the `definition` "word".
 */
export type Word = string;
/**
 * This interface was referenced by `HouseRules`'s JSON-Schema
 * via the `definition` "line".
 */
export type Line = string;

/**
 * House rules, format 1: a studio's own standard for containers, roles, names and severities.
 */
export interface HouseRules {
  /**
   * Version of the house-rules language.
   */
  format: 1;
  /**
   * Name of the house rules.
   */
  house: string;
  /**
   * Version of the house rules.
   */
  version?: number;
  /**
   * What people call them.
   */
  title?: string;
  naming: NamingRules;
  /**
   * What things are for. The compiler itself uses carrier, control, skin, guide_line and note.
   */
  roles: {
    [k: string]: Role;
  };
  /**
   * The container tree.
   */
  containers: {
    [k: string]: Container;
  };
  /**
   * Changes the severity of findings, by code. An error of the language itself stays an error.
   */
  severities?: {
    [k: string]: 'error' | 'warning' | 'info' | 'off';
  };
  /**
   * Delivery profiles: what receiving systems want. A recipe names those it is delivered to.
   */
  profiles?: {
    [k: string]: DeliveryProfile;
  };
}
/**
 * How names in the scene are made from ids.
 */
export interface NamingRules {
  /**
   * Parts of a name in order; empty ones are left out. path: the id without its side and index. leaf: the last segment of the id. index: the padded number of a counted joint.
   */
  pattern: ('character' | 'role' | 'side' | 'path' | 'leaf' | 'index')[];
  /**
   * Text between the parts.
   */
  separator?: string;
  /**
   * Least count of digits in an index.
   */
  index_digits?: number;
  /**
   * Text for each side.
   */
  sides?: {
    /**
     * Text for the left side.
     */
    left?: string;
    /**
     * Text for the right side.
     */
    right?: string;
    /**
     * Text for the centre.
     */
    centre?: string;
  };
  /**
   * Longest name allowed, in characters.
   */
  longest?: number;
}
/**
 * What a thing is for; decides its container, name token and visibility.
 *
 * This interface was referenced by `HouseRules`'s JSON-Schema
 * via the `definition` "Role".
 */
export interface Role {
  /**
   * Text that the naming pattern puts for this role; may be empty.
   */
  token?: string;
  container?: Word;
  /**
   * Whether an animator sees things of this role.
   */
  shown?: boolean;
  /**
   * Whether an animator can select things of this role.
   */
  selectable?: boolean;
  title?: Line;
}
/**
 * A group that holds one class of things.
 *
 * This interface was referenced by `HouseRules`'s JSON-Schema
 * via the `definition` "Container".
 */
export interface Container {
  parent?: Word;
  /**
   * carried: moves with the root control. parked: stays in the world. Inherited from the parent container; parked at the top.
   */
  moves?: 'carried' | 'parked';
  /**
   * Whether an animator sees what is inside.
   */
  shown?: boolean;
  title?: Line;
}
/**
 * What one receiving system wants.
 *
 * This interface was referenced by `HouseRules`'s JSON-Schema
 * via the `definition` "DeliveryProfile".
 */
export interface DeliveryProfile {
  /**
   * What people call it.
   */
  title?: string;
  /**
   * Files that are made: glTF 2.0 (.glb), which is always Y up, Z forward, in metres; OpenUSD (.usda), in the axes and unit below.
   */
  formats: ('gltf' | 'usd')[];
  /**
   * usd: axis that points up; +y or +z.
   */
  up?: '+y' | '+z';
  /**
   * usd: axis the character faces along.
   */
  forward?: '+x' | '-x' | '+y' | '-y' | '+z' | '-z';
  /**
   * usd: unit of length.
   */
  unit?: 'mm' | 'cm' | 'm';
  /**
   * Leaves out helper joints; what hangs on one then hangs on the joint above it.
   */
  skin_joints_only?: boolean;
  /**
   * Most joints that are taken.
   */
  joints_at_most?: number;
  /**
   * Most joints that may hang below one another.
   */
  depth_at_most?: number;
  /**
   * Most joints that one vertex may follow.
   */
  influences_at_most?: number;
  /**
   * What names of joints may be.
   */
  names?: {
    /**
     * Most characters of a name.
     */
    longest?: number;
    /**
     * Letters allowed.
     */
    letters?: 'any' | 'lower' | 'upper';
    /**
     * Whether digits are allowed.
     */
    digits?: boolean;
  };
  /**
   * The topmost joint must stand at the origin.
   */
  root_at_origin?: boolean;
  /**
   * Animation that is baked in: every control turned to both ends of its range, one after the other.
   */
  animation?: 'none' | 'range_of_motion';
  /**
   * Bones the receiver knows by its own names, each with the joint of ours that it is.
   */
  bones?: {
    [k: string]: ProfileBone;
  };
}
/**
 * One bone a receiver knows by name.
 *
 * This interface was referenced by `HouseRules`'s JSON-Schema
 * via the `definition` "ProfileBone".
 */
export interface ProfileBone {
  /**
   * Id of the joint that it is.
   */
  joint: string;
  /**
   * Whether the receiver refuses skeletons without it.
   */
  required?: boolean;
  /**
   * Bone that it must hang on, with other joints between if need be; when that is not there, the next above it.
   */
  parent?: string;
}
