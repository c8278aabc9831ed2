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
