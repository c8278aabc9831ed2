// Made by bin/generate.ts from the JSON Schemas. Change those, not this.

/**
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "word".
 */
export type Word = string;
/**
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "line".
 */
export type Line = string;
/**
 * One of the six axis directions.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "AxisName".
 */
export type AxisName = '+x' | '-x' | '+y' | '-y' | '+z' | '-z';
/**
 * Three numbers in the scene's unit and axes, or an expression that gives a point.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Point".
 */
export type Point = [NumberOrExpression, NumberOrExpression, NumberOrExpression] | string;
/**
 * A number, or an expression: a string that begins with = and holds CEL over params, landmarks, dist, mix and mid.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "NumberOrExpression".
 */
export type NumberOrExpression = number | string;
/**
 * A building block; kind decides which.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Part".
 */
export type Part =
  | AxlePart
  | ClaviclePart
  | EyePart
  | FootPart
  | HandPart
  | JawPart
  | LegThreePart
  | LimbPart
  | NeckHeadPart
  | RootPart
  | SpinePart
  | StrandPart
  | WingPart;
/**
 * left or right: that side alone. both: the left side as written and its mirror image, in which every .left in an id reads .right. centre: neither. Without it, an id with a segment left or right says the side.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "SideOption".
 */
export type SideOption = 'left' | 'right' | 'both' | 'centre';
/**
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "id".
 */
export type Id = string;
/**
 * A landmark or joint by name, a point, or a point between two of them.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Place".
 */
export type Place = [NumberOrExpression, NumberOrExpression, NumberOrExpression] | string | Between;
/**
 * How the right copy's frames follow from the left's. behaviour: the same rotation values give the mirrored pose. orientation: aim and up axes are mirror images. world: the same world orientation.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "MirrorRule".
 */
export type MirrorRule = 'behaviour' | 'orientation' | 'world';
/**
 * Which axis turns first, second and third, about fixed axes.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "RotationOrderOption".
 */
export type RotationOrderOption = 'xyz' | 'xzy' | 'yxz' | 'yzx' | 'zxy' | 'zyx';
/**
 * A number, an expression, or an attribute of a control as control.attribute.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "NumberOrAttribute".
 */
export type NumberOrAttribute = number | string;
/**
 * A channel, or move, turn or scale for all three of a kind.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "ChannelName".
 */
export type ChannelName =
  'move' | 'turn' | 'scale' | 'tx' | 'ty' | 'tz' | 'rx' | 'ry' | 'rz' | 'sx' | 'sy' | 'sz';

/**
 * A rig recipe, format 1: everything Pintle needs to make one character movable.
 */
export interface Recipe {
  /**
   * Version of the recipe language.
   */
  format: 1;
  recipe: Word;
  title?: Line;
  /**
   * House rules to follow, as name@version.
   */
  house?: string;
  /**
   * Recipe version this one changes, as name@version. This document is merged onto it by RFC 7396: maps merge key by key, null removes, anything else replaces.
   */
  extends?: string;
  /**
   * Parameters: the numbers that vary from character to character.
   */
  params?: {
    [k: string]: Parameter;
  };
  scene?: Scene;
  /**
   * Named measured points on the model. Those with side left have a mirrored right twin.
   */
  landmarks?: {
    [k: string]: Landmark;
  };
  /**
   * Adds to or adjusts the roles of the house rules.
   */
  roles?: {
    [k: string]: Role;
  };
  /**
   * Adds to or adjusts the containers of the house rules.
   */
  containers?: {
    [k: string]: Container;
  };
  /**
   * Building blocks that expand into chains, controls, solvers, constraints and guide lines. Whatever a part makes can be adjusted by id in those maps.
   */
  parts?: {
    [k: string]: Part;
  };
  /**
   * Joint chains.
   */
  chains?: {
    [k: string]: Chain;
  };
  /**
   * Controls: what the animator takes hold of. An entry whose id a part has made adjusts that control.
   */
  controls?: {
    [k: string]: Control;
  };
  /**
   * Solvers: what computes the rotation of several joints at once.
   */
  solvers?: {
    [k: string]: Solver;
  };
  /**
   * Constraints: what makes one thing follow others.
   */
  constraints?: {
    [k: string]: Constraint;
  };
  /**
   * Drivers: what follows an attribute or channel of a control through a curve and is added to a channel of another thing.
   */
  drivers?: {
    [k: string]: Driver;
  };
  /**
   * Guide lines: drawn, never selectable, from a control to the thing it steers.
   */
  guide_lines?: {
    [k: string]: GuideLine;
  };
  /**
   * Meshes of the model that the rig carries.
   */
  geometry?: {
    [k: string]: Geometry;
  };
  /**
   * Which joints deform which mesh.
   */
  skins?: {
    [k: string]: Skin;
  };
  /**
   * Morph targets of meshes, each with what weighs it.
   */
  shapes?: {
    [k: string]: Shape;
  };
  /**
   * Custom metadata carried on the rig's note node.
   */
  notes?: {
    [k: string]: string | number | boolean;
  };
  /**
   * Delivery profiles of the house rules for which files are made.
   */
  deliver?: Word[];
}
/**
 * A number that varies from character to character.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Parameter".
 */
export interface Parameter {
  /**
   * Value when a character gives none.
   */
  default: number;
  /**
   * Smallest value allowed.
   */
  min?: number;
  /**
   * Largest value allowed.
   */
  max?: number;
  unit?: Line;
  /**
   * Only whole numbers are allowed.
   */
  whole?: boolean;
  note?: Line;
}
/**
 * Axes and unit of every number in the recipe and in the emitted script. Right-handed always; angles in degrees.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Scene".
 */
export interface Scene {
  up?: AxisName;
  forward?: AxisName;
  /**
   * Unit of length.
   */
  unit?: 'mm' | 'cm' | 'm';
}
/**
 * A named measured point on the model.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Landmark".
 */
export interface Landmark {
  at: Point;
  /**
   * left: a mirrored right twin exists.
   */
  side?: 'left' | 'centre';
  right?: Point;
  note?: Line;
}
/**
 * What a thing is for; decides its container, name token and visibility.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
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
 * This interface was referenced by `Recipe`'s JSON-Schema
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
 * One joint that turns about, swings on or slides along a line: a wheel, a hinge or a slider, with a control that has that one freedom.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "AxlePart".
 */
export interface AxlePart {
  /**
   * A moving part of a prop.
   */
  kind: 'axle';
  side?: SideOption;
  parent?: Id;
  at: Place;
  along: Place;
  /**
   * wheel: turns without end. hinge: turns within limits. slider: moves along the line.
   */
  motion?: 'wheel' | 'hinge' | 'slider';
  min?: NumberOrExpression;
  max?: NumberOrExpression;
  /**
   * wheel: channel of a control, as control.tz, with whose way the wheel rolls. Needs radius.
   */
  roll_with?: string;
  radius?: NumberOrExpression;
  /**
   * Shape of the control.
   */
  shape?: 'ring' | 'square' | 'diamond' | 'cross' | 'arrow' | 'ball' | 'box' | 'pin' | 'compass';
  role?: Word;
  mirror?: MirrorRule;
}
/**
 * A point on the line between two others.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Between".
 */
export interface Between {
  /**
   * Landmark or joint at its start.
   */
  from: string;
  /**
   * Landmark or joint at its end.
   */
  to: string;
  share?: NumberOrExpression;
}
/**
 * One bone between body and limb, with a control that turns it.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "ClaviclePart".
 */
export interface ClaviclePart {
  /**
   * A collar bone, shoulder blade or hip girdle.
   */
  kind: 'clavicle';
  side?: SideOption;
  parent?: Id;
  /**
   * Root and end.
   */
  points: Place[];
  /**
   * Names of the two joints. Without it they take their landmarks' names, else root and end.
   */
  names?: string[];
  /**
   * How far the root turns, by its name; the control is limited alike.
   */
  limits?: {
    [k: string]: JointLimits;
  };
  role?: Word;
  mirror?: MirrorRule;
  rotation_order?: RotationOrderOption;
}
/**
 * How far a joint is meant to turn from rest, by axis. Controls enforce it; the joint itself does not.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "JointLimits".
 */
export interface JointLimits {
  rx?: Range;
  ry?: Range;
  rz?: Range;
}
/**
 * Smallest and largest value, from rest.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Range".
 */
export interface Range {
  min?: NumberOrExpression;
  max?: NumberOrExpression;
}
/**
 * An eyeball that points at a control of its own in front of it; a pair hangs on one control that both follow.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "EyePart".
 */
export interface EyePart {
  /**
   * An eye.
   */
  kind: 'eye';
  side?: SideOption;
  parent?: Id;
  at: Place;
  look: Place;
  pair?: Id;
  /**
   * How far the eyeball is meant to turn, under the name ball.
   */
  limits?: {
    [k: string]: JointLimits;
  };
  role?: Word;
  mirror?: MirrorRule;
}
/**
 * A foot at the end of a leg: ball and toe joints, and attributes on the leg's goal control that roll it over heel, ball and toe and bank it over its edges.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "FootPart".
 */
export interface FootPart {
  /**
   * A foot that rolls.
   */
  kind: 'foot';
  side?: SideOption;
  leg: Id;
  ball: Place;
  toe: Place;
  heel: Place;
  inner: Place;
  outer: Place;
  break?: NumberOrExpression;
  role?: Word;
  mirror?: MirrorRule;
  rotation_order?: RotationOrderOption;
}
/**
 * Digits that are turned joint by joint, and one control that curls, spreads and cups them together.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "HandPart".
 */
export interface HandPart {
  /**
   * A hand or claw with any count of digits.
   */
  kind: 'hand';
  side?: SideOption;
  parent: Id;
  at?: Place;
  /**
   * Digits by name, in their order across the hand.
   */
  digits: {
    /**
     * Places of the digit's joints, from its root to its tip.
     */
    [k: string]: Place[];
  };
  curl?: NumberOrExpression;
  spread?: NumberOrExpression;
  cup?: NumberOrExpression;
  role?: Word;
  mirror?: MirrorRule;
  orient?: Orient;
  rotation_order?: RotationOrderOption;
}
/**
 * How joint frames are turned.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Orient".
 */
export interface Orient {
  /**
   * chain: the aim axis points at the next joint and the third axis is the hinge. world: frames keep the scene's axes.
   */
  rule?: 'chain' | 'world';
  aim?: AxisName;
  up?: AxisName;
  toward?: Point;
  like?: Id;
}
/**
 * One bone that opens about a hinge: a control that turns and shifts it, with an attribute that opens it.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "JawPart".
 */
export interface JawPart {
  /**
   * A jaw or beak.
   */
  kind: 'jaw';
  side?: SideOption;
  parent?: Id;
  /**
   * Hinge and tip.
   */
  points: Place[];
  /**
   * Names of the two joints. Without it they take their landmarks' names, else hinge and tip.
   */
  names?: string[];
  open?: NumberOrExpression;
  role?: Word;
  mirror?: MirrorRule;
  orient?: Orient;
  rotation_order?: RotationOrderOption;
}
/**
 * Four joints in a row with three bones, as of a hind leg: joint-by-joint controls, a goal control with a reach solver that folds all bends together, a pole vector control, a blend between the two ways, and an attribute that moves the fold between knee and hock.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "LegThreePart".
 */
export interface LegThreePart {
  /**
   * A leg that bends twice.
   */
  kind: 'leg_three';
  side?: SideOption;
  parent?: Id;
  /**
   * Hip, knee, hock and end.
   */
  points: Place[];
  /**
   * Names of the four joints. Without it they take their landmarks' names, else upper, middle, lower, end.
   */
  names?: string[];
  goal?: Word;
  goal_parent?: Id;
  /**
   * The pole vector control.
   */
  pole?: {
    distance?: NumberOrExpression;
    /**
     * Draws a guide line from the pole control to the joint it leads.
     */
    guide_line?: boolean;
  };
  bend?: Point;
  reach?: NumberOrExpression;
  /**
   * Lets bones grow toward a goal out of reach; the goal control's attribute stretch turns it on.
   */
  stretch?: {
    limit?: NumberOrExpression;
    value?: NumberOrExpression;
  };
  soft?: NumberOrExpression;
  /**
   * What may carry the goal control (by its name) and the pole control (pole); each gets an attribute space.
   */
  spaces?: {
    /**
     * What may carry the control.
     */
    [k: string]: Id[];
  };
  /**
   * How far the joints turn, by name; joint-by-joint controls are limited alike.
   */
  limits?: {
    [k: string]: JointLimits;
  };
  role?: Word;
  mirror?: MirrorRule;
  rotation_order?: RotationOrderOption;
}
/**
 * Three joints in a row that bend in the middle: joint-by-joint controls, a goal control with two-bone inverse kinematics, a pole vector control with its guide line, a blend between the two ways, and on request twist joints, stretch, soft reach and spaces.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "LimbPart".
 */
export interface LimbPart {
  /**
   * An arm, a leg, or anything else that bends once.
   */
  kind: 'limb';
  side?: SideOption;
  parent?: Id;
  /**
   * Start, bend and end.
   */
  points: Place[];
  /**
   * Names of the three joints. Without it they take their landmarks' names, else upper, lower, end.
   */
  names?: string[];
  goal?: Word;
  goal_parent?: Id;
  /**
   * The pole vector control.
   */
  pole?: {
    distance?: NumberOrExpression;
    /**
     * Draws a guide line from the pole control to the joint it leads.
     */
    guide_line?: boolean;
  };
  bend?: Point;
  reach?: NumberOrExpression;
  /**
   * Lets bones grow toward a goal out of reach; the goal control's attribute stretch turns it on.
   */
  stretch?: {
    limit?: NumberOrExpression;
    value?: NumberOrExpression;
  };
  soft?: NumberOrExpression;
  /**
   * What may carry the goal control (by its name) and the pole control (pole); each gets an attribute space.
   */
  spaces?: {
    /**
     * What may carry the control.
     */
    [k: string]: Id[];
  };
  /**
   * How far the joints turn, by name; joint-by-joint controls are limited alike.
   */
  limits?: {
    [k: string]: JointLimits;
  };
  /**
   * Counts of joints that share the twist along each bone.
   */
  twist?: {
    /**
     * Joints along the upper bone, which let the twist at its root fade in. Needs parent.
     */
    upper?: number;
    /**
     * Joints along the lower bone, which let the twist of the end fade out.
     */
    lower?: number;
  };
  role?: Word;
  mirror?: MirrorRule;
  rotation_order?: RotationOrderOption;
}
/**
 * A neck of joints that are turned one by one, and a head on it that can keep its direction against the body.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "NeckHeadPart".
 */
export interface NeckHeadPart {
  /**
   * Neck and head.
   */
  kind: 'neck_head';
  side?: SideOption;
  parent?: Id;
  from: Place;
  to: Place;
  crown: Place;
  /**
   * Count of joints of the neck, the head's own not counted.
   */
  joints?: number;
  /**
   * Places the neck runs through on the way.
   */
  via?: Place[];
  /**
   * What may turn the head beside the neck; the attribute space chooses.
   */
  spaces?: Id[];
  /**
   * How far the head turns, under the name head; its control is limited alike.
   */
  limits?: {
    [k: string]: JointLimits;
  };
  /**
   * Draws a guide line from the head control to the crown.
   */
  guide_line?: boolean;
  role?: Word;
  orient?: Orient;
  rotation_order?: RotationOrderOption;
}
/**
 * The control that carries the whole rig; on request with a root joint beneath it.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "RootPart".
 */
export interface RootPart {
  /**
   * The carrier of the rig.
   */
  kind: 'root';
  at?: Place;
  /**
   * Shape of the control.
   */
  shape?: 'ring' | 'square' | 'diamond' | 'cross' | 'arrow' | 'ball' | 'box' | 'pin' | 'compass';
  size?: NumberOrExpression;
  /**
   * Makes a joint at the root that follows the control, as some receivers of skeletons want.
   */
  joint?: boolean;
}
/**
 * A row of joints along a curve between two ends: a control at each end that carries both place and direction of the curve, controls between them that follow both, a spline solver, stretch and volume.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "SpinePart".
 */
export interface SpinePart {
  /**
   * A spine, or any bendy body between two ends.
   */
  kind: 'spine';
  side?: SideOption;
  parent?: Id;
  from: Place;
  to: Place;
  /**
   * Places it runs through on the way.
   */
  via?: Place[];
  /**
   * Count of joints, spread evenly by arc length.
   */
  joints?: number;
  /**
   * Count of controls: both ends and those between.
   */
  controls?: number;
  stretch?: NumberOrExpression;
  volume?: NumberOrExpression;
  role?: Word;
  orient?: Orient;
  rotation_order?: RotationOrderOption;
}
/**
 * A tail, ear, tentacle or rope: joints spread evenly along a curve, each turned by a control that hangs on the one before, or all laid along a curve through a few controls.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "StrandPart".
 */
export interface StrandPart {
  /**
   * A row of joints.
   */
  kind: 'strand';
  side?: SideOption;
  parent?: Id;
  /**
   * Where the strand runs, from base to tip.
   */
  points: Place[];
  /**
   * Count of joints, spread evenly by arc length.
   */
  joints: number;
  /**
   * Whether joints follow a smooth curve through the points or straight lines.
   */
  curve?: 'smooth' | 'straight';
  /**
   * joints: one control for each joint. spline: a few controls shape a curve.
   */
  steer?: 'joints' | 'spline';
  /**
   * spline: count of controls along the strand.
   */
  controls?: number;
  stretch?: NumberOrExpression;
  /**
   * Shape of the controls.
   */
  shape?: 'ring' | 'square' | 'diamond' | 'cross' | 'arrow' | 'ball' | 'box' | 'pin' | 'compass';
  size?: NumberOrExpression;
  /**
   * joints: how far each joint turns, by its name; controls are limited alike.
   */
  limits?: {
    [k: string]: JointLimits;
  };
  role?: Word;
  mirror?: MirrorRule;
  orient?: Orient;
  rotation_order?: RotationOrderOption;
}
/**
 * A limb that folds in two places with rows of feathers on its bones: a control for each joint, one control that folds the wing and fans its feathers.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "WingPart".
 */
export interface WingPart {
  /**
   * A wing.
   */
  kind: 'wing';
  side?: SideOption;
  parent?: Id;
  /**
   * Shoulder, elbow, wrist and tip.
   */
  points: Place[];
  /**
   * Names of the four joints. Without it they take their landmarks' names, else upper, lower, hand, tip.
   */
  names?: string[];
  /**
   * Turn of shoulder, elbow and wrist about their hinges at fold 1.
   */
  fold?: NumberOrExpression[];
  /**
   * Rows of feathers by name.
   */
  feathers?: {
    /**
     * A row of feathers along one bone.
     */
    [k: string]: {
      /**
       * Bone that the row sits on.
       */
      bone?: 'upper' | 'lower' | 'hand';
      /**
       * Where the tips of the first and the last feather lie.
       */
      tips: Place[];
      /**
       * Count of feathers.
       */
      count?: number;
      /**
       * Count of joints of each feather.
       */
      joints?: number;
      fan?: NumberOrExpression;
    };
  };
  role?: Word;
  mirror?: MirrorRule;
  orient?: Orient;
  rotation_order?: RotationOrderOption;
}
/**
 * Joints in a row. Joint ids are the chain's id, a dot, and the joint's name.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Chain".
 */
export interface Chain {
  /**
   * Leaves out what a part made under this id.
   */
  omit?: boolean;
  role?: Word;
  /**
   * Where the chain runs, from first to last.
   */
  points?: Place[];
  /**
   * Count of joints, spread evenly by arc length over a curve through the points. Without it there is one joint at each point.
   */
  joints?: number;
  /**
   * How joints are spread between the points: along a smooth curve or along straight lines.
   */
  curve?: 'smooth' | 'straight';
  /**
   * Names of the joints in order. Without it a joint takes its landmark's name, else a padded number.
   */
  names?: string[];
  parent?: Id;
  side?: SideOption;
  mirror?: MirrorRule;
  orient?: Orient;
  rotation_order?: RotationOrderOption;
  /**
   * How far joints are meant to turn, by the joint's name in the chain.
   */
  limits?: {
    [k: string]: JointLimits;
  };
}
/**
 * What the animator takes hold of.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Control".
 */
export interface Control {
  /**
   * Leaves out what a part made under this id.
   */
  omit?: boolean;
  role?: Word;
  at?: Place;
  pole_of?: PolePlace;
  /**
   * Joint or control whose rest orientation it takes, or world.
   */
  align?: string;
  parent?: Id;
  /**
   * Drawn shape.
   */
  shape?: 'ring' | 'square' | 'diamond' | 'cross' | 'arrow' | 'ball' | 'box' | 'pin' | 'compass';
  size?: NumberOrExpression;
  side?: SideOption;
  rotation_order?: RotationOrderOption;
  /**
   * Locks and limits by channel; move, turn and scale stand for three channels each.
   */
  channels?: {
    [k: string]: ChannelOption;
  };
  /**
   * Values of its own, by name.
   */
  attributes?: {
    [k: string]: AttributeOption;
  };
  /**
   * Joints and controls that may carry it; the attribute space chooses. Its parent comes first unless it is listed, else the first. Switching keeps nothing in place by itself: a tool matches the pose, or reads the values from Pintle.
   */
  spaces?: Id[];
  /**
   * all: the chosen space carries the control. turn: it only turns it; place stays with the parent.
   */
  space_follow?: 'all' | 'turn';
}
/**
 * Stands where the pole of three joints belongs, in place of at: in their plane, from the foot of the perpendicular through the middle joint.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "PolePlace".
 */
export interface PolePlace {
  /**
   * Start, middle and end joint.
   */
  joints: Id[];
  distance?: NumberOrExpression;
  bend?: Point;
}
/**
 * What an animator may do with a channel.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "ChannelOption".
 */
export interface ChannelOption {
  /**
   * The channel cannot be changed.
   */
  locked?: boolean;
  min?: NumberOrExpression;
  max?: NumberOrExpression;
}
/**
 * A value of its own on a control, beside the nine channels.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "AttributeOption".
 */
export interface AttributeOption {
  default?: NumberOrExpression;
  min?: NumberOrExpression;
  max?: NumberOrExpression;
  note?: Line;
  /**
   * Words for the values 0, 1, 2 …, for a choice in place of a number.
   */
  labels?: string[];
}
/**
 * Computes the transform of several joints at once. Which keys it takes depends on its kind.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Solver".
 */
export interface Solver {
  /**
   * Leaves out what a part made under this id.
   */
  omit?: boolean;
  /**
   * two_bone: three joints in a row bend so that the last meets the goal. reach: four or more joints fold evenly so that the last meets the goal. spline: joints lie along a curve through controls. twist: joints along a bone share the twist of another joint. aim: one joint points at a goal. foot_roll: a foot rolls and banks over points of its sole.
   */
  kind?: 'two_bone' | 'reach' | 'spline' | 'twist' | 'aim' | 'foot_roll';
  /**
   * two_bone: the three joints from root to tip. reach: four or more. spline: two or more. Each is the parent of the next. twist: joints along the bone, children of its joint. aim: the one joint.
   */
  joints?: Id[];
  goal?: Id;
  pole?: Id;
  blend?: NumberOrAttribute;
  stretch?: NumberOrAttribute;
  stretch_limit?: NumberOrExpression;
  soft?: NumberOrExpression;
  swing?: NumberOrAttribute;
  bias?: NumberOrAttribute;
  /**
   * spline: the controls whose places shape the curve, from root to tip.
   */
  controls?: Id[];
  volume?: NumberOrAttribute;
  /**
   * twist: share of the twist that each joint takes. Without it, joint i of n takes i / (n + 1).
   */
  shares?: NumberOrExpression[];
  bone?: Id;
  tip?: Id;
  base?: Id;
  driver?: Id;
  foot?: Id;
  ankle?: Id;
  toes?: Id;
  heel?: Place;
  ball?: Place;
  toe?: Place;
  inner?: Place;
  outer?: Place;
  roll?: NumberOrAttribute;
  bank?: NumberOrAttribute;
  break?: NumberOrAttribute;
  side?: SideOption;
}
/**
 * Makes one thing follow others.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Constraint".
 */
export interface Constraint {
  /**
   * Leaves out what a part made under this id.
   */
  omit?: boolean;
  /**
   * What is followed: everything, position, rotation or scale; or, aim, the target turns to point at the sources.
   */
  kind?: 'parent' | 'point' | 'orient' | 'scale' | 'aim';
  target?: Id;
  /**
   * What is followed, each with its weight; weights are taken as shares of their sum.
   */
  sources?: {
    [k: string]: NumberOrExpression;
  };
  blend?: NumberOrAttribute;
  /**
   * Keeps the distance and turn that target and sources have at rest, so that nothing moves at rest.
   */
  keep_offset?: boolean;
  axis?: AxisName;
  up_axis?: AxisName;
  up?: Id;
  side?: SideOption;
}
/**
 * Adds a value that follows a control to a channel of a joint or control.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Driver".
 */
export interface Driver {
  /**
   * Leaves out what a part made under this id.
   */
  omit?: boolean;
  /**
   * Attribute or channel of a control, as control.attribute.
   */
  input?: string;
  target?: Id;
  /**
   * Channel that it is added to.
   */
  channel?: 'tx' | 'ty' | 'tz' | 'rx' | 'ry' | 'rz' | 'sx' | 'sy' | 'sz';
  /**
   * Curve as pairs of input and output, inputs ascending.
   */
  keys?: NumberOrExpression[][];
  /**
   * How outputs run between keys: straight, or level at each key.
   */
  curve?: 'linear' | 'smooth';
  /**
   * Beyond the end keys: hold the last output, or run on straight.
   */
  beyond?: 'hold' | 'extend';
  side?: SideOption;
}
/**
 * A drawn, unselectable line from a control to the thing it steers.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "GuideLine".
 */
export interface GuideLine {
  /**
   * Leaves out what a part made under this id.
   */
  omit?: boolean;
  from?: Id;
  to?: Id;
  /**
   * How it is drawn.
   */
  style?: 'dotted' | 'dashed' | 'solid';
  side?: SideOption;
}
/**
 * A mesh of the model.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Geometry".
 */
export interface Geometry {
  /**
   * Leaves out what a part made under this id.
   */
  omit?: boolean;
  /**
   * Name of the mesh in the model's file; without it, the id.
   */
  mesh?: string;
  role?: Word;
  side?: SideOption;
}
/**
 * Which joints deform a mesh.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Skin".
 */
export interface Skin {
  /**
   * Leaves out what a part made under this id.
   */
  omit?: boolean;
  geometry?: Id;
  /**
   * Joints, or chains for all of their joints.
   */
  joints?: Id[];
  /**
   * Joints that a vertex may follow at most.
   */
  influences?: number;
  side?: SideOption;
}
/**
 * A morph target of a mesh with what weighs it.
 *
 * This interface was referenced by `Recipe`'s JSON-Schema
 * via the `definition` "Shape".
 */
export interface Shape {
  /**
   * Leaves out what a part made under this id.
   */
  omit?: boolean;
  geometry?: Id;
  /**
   * Name of the morph target in the model's file; without it, the id.
   */
  morph?: string;
  weight?: NumberOrAttribute;
  side?: SideOption;
}
