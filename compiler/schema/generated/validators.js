// Made by bin/generate.ts from the JSON Schemas. Change those, not this.
var __getOwnPropNames = Object.getOwnPropertyNames;
var __commonJS = (cb, mod) => function __require() {
  try {
    return mod || (0, cb[__getOwnPropNames(cb)[0]])((mod = { exports: {} }).exports, mod), mod.exports;
  } catch (e) {
    throw mod = 0, e;
  }
};

// node_modules/ajv/dist/runtime/ucs2length.js
var require_ucs2length = __commonJS({
  "node_modules/ajv/dist/runtime/ucs2length.js"(exports) {
    "use strict";
    Object.defineProperty(exports, "__esModule", { value: true });
    function ucs2length(str) {
      const len = str.length;
      let length = 0;
      let pos = 0;
      let value;
      while (pos < len) {
        length++;
        value = str.charCodeAt(pos++);
        if (value >= 55296 && value <= 56319 && pos < len) {
          value = str.charCodeAt(pos);
          if ((value & 64512) === 56320)
            pos++;
        }
      }
      return length;
    }
    exports.default = ucs2length;
    ucs2length.code = 'require("ajv/dist/runtime/ucs2length").default';
  }
});

// node_modules/fast-deep-equal/index.js
var require_fast_deep_equal = __commonJS({
  "node_modules/fast-deep-equal/index.js"(exports, module) {
    "use strict";
    module.exports = function equal(a, b) {
      if (a === b) return true;
      if (a && b && typeof a == "object" && typeof b == "object") {
        if (a.constructor !== b.constructor) return false;
        var length, i, keys;
        if (Array.isArray(a)) {
          length = a.length;
          if (length != b.length) return false;
          for (i = length; i-- !== 0; )
            if (!equal(a[i], b[i])) return false;
          return true;
        }
        if (a.constructor === RegExp) return a.source === b.source && a.flags === b.flags;
        if (a.valueOf !== Object.prototype.valueOf) return a.valueOf() === b.valueOf();
        if (a.toString !== Object.prototype.toString) return a.toString() === b.toString();
        keys = Object.keys(a);
        length = keys.length;
        if (length !== Object.keys(b).length) return false;
        for (i = length; i-- !== 0; )
          if (!Object.prototype.hasOwnProperty.call(b, keys[i])) return false;
        for (i = length; i-- !== 0; ) {
          var key = keys[i];
          if (!equal(a[key], b[key])) return false;
        }
        return true;
      }
      return a !== a && b !== b;
    };
  }
});

// node_modules/ajv/dist/runtime/equal.js
var require_equal = __commonJS({
  "node_modules/ajv/dist/runtime/equal.js"(exports) {
    "use strict";
    Object.defineProperty(exports, "__esModule", { value: true });
    var equal = require_fast_deep_equal();
    equal.code = 'require("ajv/dist/runtime/equal").default';
    exports.default = equal;
  }
});

// <stdin>
var validateRecipe = validate52;
var schema19 = { "$schema": "https://json-schema.org/draft/2020-12/schema", "$id": "https://pintle.invalid/schema/recipe/1", "title": "Recipe", "description": "A rig recipe, format 1: everything Pintle needs to make one character movable.", "type": "object", "required": ["format", "recipe"], "additionalProperties": false, "properties": { "format": { "const": 1, "description": "Version of the recipe language.", "examples": [1] }, "recipe": { "$ref": "#/$defs/word", "description": "Name of the recipe: lower-case letters, digits and underscores. Also the character's name unless one is given when compiling.", "examples": ["hare"] }, "title": { "$ref": "#/$defs/line", "description": "What people call the rig.", "examples": ["Upright hare"] }, "house": { "type": "string", "pattern": "^[a-z][a-z0-9_]*@[1-9][0-9]*$", "description": "House rules to follow, as name@version.", "default": "standard@1", "examples": ["tidewrack@1"] }, "extends": { "type": "string", "pattern": "^[a-z][a-z0-9_]*@[1-9][0-9]*$", "description": "Recipe version this one changes, as name@version. This document is merged onto it by RFC 7396: maps merge key by key, null removes, anything else replaces.", "examples": ["walker@4"] }, "params": { "description": "Parameters: the numbers that vary from character to character.", "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "$ref": "#/$defs/Parameter" }, "default": {}, "examples": [{ "stature": { "unit": "cm", "default": 96, "min": 30, "max": 260 } }] }, "scene": { "$ref": "#/$defs/Scene" }, "landmarks": { "description": "Named measured points on the model. Those with side left have a mirrored right twin.", "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "$ref": "#/$defs/Landmark" }, "default": {}, "examples": [{ "hips": { "at": [0, 51, 0] } }] }, "roles": { "description": "Adds to or adjusts the roles of the house rules.", "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "$ref": "#/$defs/Role" }, "default": {}, "examples": [{ "skin": { "token": "sk" } }] }, "containers": { "description": "Adds to or adjusts the containers of the house rules.", "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "$ref": "#/$defs/Container" }, "default": {}, "examples": [{ "whiskers": { "parent": "carry" } }] }, "parts": { "description": "Building blocks that expand into chains, controls, solvers, constraints and guide lines. Whatever a part makes can be adjusted by id in those maps.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/Part" }, "default": {}, "examples": [{ "root": { "kind": "root" } }] }, "chains": { "description": "Joint chains.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/Chain" }, "default": {}, "examples": [{ "spine": { "points": ["hips", "chest"], "joints": 4 } }] }, "controls": { "description": "Controls: what the animator takes hold of. An entry whose id a part has made adjusts that control.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/Control" }, "default": {}, "examples": [{ "hips": { "at": "hips", "shape": "square" } }] }, "solvers": { "description": "Solvers: what computes the rotation of several joints at once.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/Solver" }, "default": {}, "examples": [{ "boom": { "kind": "two_bone", "joints": ["boom.base", "boom.knee", "boom.tip"], "goal": "hook", "pole": "boom_pole" } }] }, "constraints": { "description": "Constraints: what makes one thing follow others.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/Constraint" }, "default": {}, "examples": [{ "neck_turn": { "kind": "orient", "target": "spine.04", "sources": { "head": 1 } } }] }, "drivers": { "description": "Drivers: what follows an attribute or channel of a control through a curve and is added to a channel of another thing.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/Driver" }, "default": {}, "examples": [{ "claw_open": { "input": "claw.open", "target": "claw_upper.hinge", "channel": "rz", "keys": [[0, 0], [1, 35]] } }] }, "guide_lines": { "description": "Guide lines: drawn, never selectable, from a control to the thing it steers.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/GuideLine" }, "default": {}, "examples": [{ "knee_line": { "from": "knee_pole", "to": "leg.left.knee" } }] }, "geometry": { "description": "Meshes of the model that the rig carries.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/Geometry" }, "default": {}, "examples": [{ "body": { "mesh": "hare_body" } }] }, "skins": { "description": "Which joints deform which mesh.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/Skin" }, "default": {}, "examples": [{ "body_skin": { "geometry": "body", "joints": ["spine", "arm.left", "arm.right"], "influences": 4 } }] }, "shapes": { "description": "Morph targets of meshes, each with what weighs it.", "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/Shape" }, "default": {}, "examples": [{ "smile": { "geometry": "body", "morph": "smile", "weight": "head.smile" } }] }, "notes": { "description": "Custom metadata carried on the rig's note node.", "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "type": ["string", "number", "boolean"], "maxLength": 2e3 }, "default": {}, "examples": [{ "sequence": "Marsh at dawn" }] }, "deliver": { "type": "array", "items": { "$ref": "#/$defs/word" }, "uniqueItems": true, "maxItems": 20, "default": [], "description": "Delivery profiles of the house rules for which files are made.", "examples": [["film", "realtime"]] } }, "$defs": { "word": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "id": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$", "maxLength": 120 }, "line": { "type": "string", "maxLength": 200 }, "NumberOrExpression": { "title": "NumberOrExpression", "description": "A number, or an expression: a string that begins with = and holds CEL over params, landmarks, dist, mix and mid.", "type": ["number", "string"], "pattern": "^=", "maxLength": 2e3, "examples": [12.5, "=params.stature * 0.53"] }, "Point": { "title": "Point", "description": "Three numbers in the scene's unit and axes, or an expression that gives a point.", "anyOf": [{ "type": "array", "prefixItems": [{ "$ref": "#/$defs/NumberOrExpression" }, { "$ref": "#/$defs/NumberOrExpression" }, { "$ref": "#/$defs/NumberOrExpression" }], "minItems": 3, "items": false }, { "type": "string", "pattern": "^=", "maxLength": 2e3 }], "examples": [[0, 51, 0], "=mid(landmarks.hip, landmarks.ankle)"] }, "Place": { "title": "Place", "description": "A landmark or joint by name, a point, or a point between two of them.", "anyOf": [{ "type": "array", "prefixItems": [{ "$ref": "#/$defs/NumberOrExpression" }, { "$ref": "#/$defs/NumberOrExpression" }, { "$ref": "#/$defs/NumberOrExpression" }], "minItems": 3, "items": false }, { "type": "string", "pattern": "^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$)", "maxLength": 2e3 }, { "$ref": "#/$defs/Between" }], "examples": ["wrist", [0, 51, 0], { "from": "shoulder", "to": "elbow", "share": 0.5 }] }, "SideOption": { "title": "SideOption", "description": "left or right: that side alone. both: the left side as written and its mirror image, in which every .left in an id reads .right. centre: neither. Without it, an id with a segment left or right says the side.", "enum": ["left", "right", "both", "centre"], "default": "centre", "examples": ["both"] }, "MirrorRule": { "title": "MirrorRule", "description": "How the right copy's frames follow from the left's. behaviour: the same rotation values give the mirrored pose. orientation: aim and up axes are mirror images. world: the same world orientation.", "enum": ["behaviour", "orientation", "world"], "default": "behaviour", "examples": ["behaviour"] }, "RotationOrderOption": { "title": "RotationOrderOption", "description": "Which axis turns first, second and third, about fixed axes.", "enum": ["xyz", "xzy", "yxz", "yzx", "zxy", "zyx"], "default": "xyz", "examples": ["zxy"] }, "AxisName": { "title": "AxisName", "enum": ["+x", "-x", "+y", "-y", "+z", "-z"], "description": "One of the six axis directions.", "examples": ["+x"] }, "ChannelName": { "enum": ["move", "turn", "scale", "tx", "ty", "tz", "rx", "ry", "rz", "sx", "sy", "sz"], "description": "A channel, or move, turn or scale for all three of a kind." }, "Parameter": { "title": "Parameter", "description": "A number that varies from character to character.", "type": "object", "required": ["default"], "additionalProperties": false, "properties": { "default": { "type": "number", "description": "Value when a character gives none.", "examples": [96] }, "min": { "type": "number", "description": "Smallest value allowed.", "examples": [30] }, "max": { "type": "number", "description": "Largest value allowed.", "examples": [260] }, "unit": { "$ref": "#/$defs/line", "description": "Unit, for people; nothing is converted.", "examples": ["cm"] }, "whole": { "type": "boolean", "default": false, "description": "Only whole numbers are allowed.", "examples": [true] }, "note": { "$ref": "#/$defs/line", "description": "What the number measures.", "examples": ["floor to crown"] } } }, "Scene": { "title": "Scene", "description": "Axes and unit of every number in the recipe and in the emitted script. Right-handed always; angles in degrees.", "type": "object", "additionalProperties": false, "default": { "up": "+y", "forward": "+z", "unit": "cm" }, "properties": { "up": { "$ref": "#/$defs/AxisName", "default": "+y", "description": "Axis that points up.", "examples": ["+z"] }, "forward": { "$ref": "#/$defs/AxisName", "default": "+z", "description": "Axis the character faces along. Left is up \xD7 forward.", "examples": ["-y"] }, "unit": { "enum": ["mm", "cm", "m"], "default": "cm", "description": "Unit of length.", "examples": ["m"] } }, "examples": [{ "up": "+z", "forward": "-y", "unit": "m" }] }, "Landmark": { "title": "Landmark", "description": "A named measured point on the model.", "type": "object", "required": ["at"], "additionalProperties": false, "properties": { "at": { "$ref": "#/$defs/Point", "description": "Where it is. For side left: the left point.", "x-unit": "scene unit" }, "side": { "enum": ["left", "centre"], "default": "centre", "description": "left: a mirrored right twin exists.", "examples": ["left"] }, "right": { "$ref": "#/$defs/Point", "description": "The right point, where the model is not symmetrical.", "x-unit": "scene unit" }, "note": { "$ref": "#/$defs/line", "description": "How to find it on the model.", "examples": ["bony tip of the elbow"] } } }, "Role": { "title": "Role", "description": "What a thing is for; decides its container, name token and visibility.", "type": "object", "additionalProperties": false, "properties": { "token": { "type": "string", "pattern": "^[A-Za-z0-9_]*$", "maxLength": 20, "description": "Text that the naming pattern puts for this role; may be empty.", "examples": ["sk"] }, "container": { "$ref": "#/$defs/word", "description": "Container that holds things of this role.", "examples": ["skin"] }, "shown": { "type": "boolean", "default": true, "description": "Whether an animator sees things of this role.", "examples": [false] }, "selectable": { "type": "boolean", "default": true, "description": "Whether an animator can select things of this role.", "examples": [false] }, "title": { "$ref": "#/$defs/line", "description": "What people call it.", "examples": ["Skin joint"] } } }, "Container": { "title": "Container", "description": "A group that holds one class of things.", "type": "object", "additionalProperties": false, "properties": { "parent": { "$ref": "#/$defs/word", "description": "Container it lies in; without one it lies directly in the rig.", "examples": ["carry"] }, "moves": { "enum": ["carried", "parked"], "description": "carried: moves with the root control. parked: stays in the world. Inherited from the parent container; parked at the top.", "examples": ["parked"] }, "shown": { "type": "boolean", "default": true, "description": "Whether an animator sees what is inside.", "examples": [false] }, "title": { "$ref": "#/$defs/line", "description": "What people call it.", "examples": ["Skin joints"] } } }, "Part": { "title": "Part", "description": "A building block; kind decides which.", "type": "object", "required": ["kind"], "discriminator": { "propertyName": "kind" }, "oneOf": [{ "$ref": "#/$defs/AxlePart" }, { "$ref": "#/$defs/ClaviclePart" }, { "$ref": "#/$defs/EyePart" }, { "$ref": "#/$defs/FootPart" }, { "$ref": "#/$defs/HandPart" }, { "$ref": "#/$defs/JawPart" }, { "$ref": "#/$defs/LegThreePart" }, { "$ref": "#/$defs/LimbPart" }, { "$ref": "#/$defs/NeckHeadPart" }, { "$ref": "#/$defs/RootPart" }, { "$ref": "#/$defs/SpinePart" }, { "$ref": "#/$defs/StrandPart" }, { "$ref": "#/$defs/WingPart" }] }, "Orient": { "title": "Orient", "description": "How joint frames are turned.", "type": "object", "additionalProperties": false, "default": { "rule": "chain", "aim": "+x", "up": "+y" }, "properties": { "rule": { "enum": ["chain", "world"], "default": "chain", "description": "chain: the aim axis points at the next joint and the third axis is the hinge. world: frames keep the scene's axes.", "examples": ["world"] }, "aim": { "$ref": "#/$defs/AxisName", "default": "+x", "description": "Axis of the joint that points at the next joint.", "examples": ["+y"] }, "up": { "$ref": "#/$defs/AxisName", "default": "+y", "description": "Axis of the joint that lies in the chain's plane, on the side that the chain folds toward. The third axis is the hinge: positive turns about it fold the chain.", "examples": ["+z"] }, "toward": { "$ref": "#/$defs/Point", "description": "Direction the up axis should lean to, in place of the chain's own plane.", "examples": [[0, 1, 0]] }, "like": { "$ref": "#/$defs/id", "description": "Joint whose frame every joint of the chain takes, in place of frames of its own.", "examples": ["arm.left.elbow"] } }, "examples": [{ "aim": "+y", "up": "+z" }] }, "Chain": { "title": "Chain", "description": "Joints in a row. Joint ids are the chain's id, a dot, and the joint's name.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of every joint of the chain.", "examples": ["helper"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 1, "maxItems": 500, "description": "Where the chain runs, from first to last.", "examples": [["shoulder", "elbow", "wrist"]] }, "joints": { "type": "integer", "minimum": 2, "maximum": 500, "description": "Count of joints, spread evenly by arc length over a curve through the points. Without it there is one joint at each point.", "examples": [5] }, "curve": { "enum": ["smooth", "straight"], "default": "smooth", "description": "How joints are spread between the points: along a smooth curve or along straight lines.", "examples": ["straight"] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "description": "Names of the joints in order. Without it a joint takes its landmark's name, else a padded number.", "examples": [["upper", "lower", "end"]] }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the first joint follows.", "examples": ["spine.chest"] }, "side": { "$ref": "#/$defs/SideOption" }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far joints are meant to turn, by the joint's name in the chain.", "examples": [{ "elbow": { "rz": { "min": 0, "max": 140 } } }] } } }, "PolePlace": { "title": "PolePlace", "description": "Stands where the pole of three joints belongs, in place of at: in their plane, from the foot of the perpendicular through the middle joint.", "type": "object", "required": ["joints"], "additionalProperties": false, "properties": { "joints": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 3, "maxItems": 3, "description": "Start, middle and end joint.", "examples": [["leg.left.hip", "leg.left.knee", "leg.left.ankle"]] }, "distance": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Distance from the line start\u2013end, as a factor on the length of both bones.", "x-unit": "limb lengths", "examples": [1] }, "bend": { "$ref": "#/$defs/Point", "description": "Direction in which the middle joint should lead when the three joints lie on one line.", "examples": [[0, 0, 1]] } }, "examples": [{ "joints": ["leg.left.hip", "leg.left.knee", "leg.left.ankle"], "distance": 0.8 }] }, "ChannelOption": { "title": "ChannelOption", "description": "What an animator may do with a channel.", "type": "object", "additionalProperties": false, "properties": { "locked": { "type": "boolean", "default": false, "description": "The channel cannot be changed.", "examples": [true] }, "min": { "$ref": "#/$defs/NumberOrExpression", "description": "Smallest value.", "x-unit": "degrees, scene unit or factor", "examples": [-40] }, "max": { "$ref": "#/$defs/NumberOrExpression", "description": "Largest value.", "x-unit": "degrees, scene unit or factor", "examples": [40] } } }, "AttributeOption": { "title": "AttributeOption", "description": "A value of its own on a control, beside the nine channels.", "type": "object", "additionalProperties": false, "properties": { "default": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Value at rest.", "examples": [1] }, "min": { "$ref": "#/$defs/NumberOrExpression", "description": "Smallest value.", "examples": [0] }, "max": { "$ref": "#/$defs/NumberOrExpression", "description": "Largest value.", "examples": [1] }, "note": { "$ref": "#/$defs/line", "description": "What it does, for the animator.", "examples": ["0 turns joint by joint, 1 follows the hand"] }, "labels": { "type": "array", "items": { "type": "string", "minLength": 1, "maxLength": 80 }, "minItems": 2, "maxItems": 100, "description": "Words for the values 0, 1, 2 \u2026, for a choice in place of a number.", "examples": [["arm", "world"]] } } }, "Control": { "title": "Control", "description": "What the animator takes hold of.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "role": { "$ref": "#/$defs/word", "default": "control", "description": "Role; decides the container.", "examples": ["control"] }, "at": { "$ref": "#/$defs/Place", "description": "Where it stands at rest: a landmark, a joint or a point.", "examples": ["wrist"] }, "pole_of": { "$ref": "#/$defs/PolePlace" }, "align": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$", "default": "world", "description": "Joint or control whose rest orientation it takes, or world.", "examples": ["arm.left.wrist"] }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that it follows.", "examples": ["hips"] }, "shape": { "enum": ["ring", "square", "diamond", "cross", "arrow", "ball", "box", "pin", "compass"], "default": "ring", "description": "Drawn shape.", "examples": ["diamond"] }, "size": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Factor on the size that the compiler takes from what the control steers.", "examples": [1.2] }, "side": { "$ref": "#/$defs/SideOption" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" }, "channels": { "type": "object", "propertyNames": { "$ref": "#/$defs/ChannelName" }, "additionalProperties": { "$ref": "#/$defs/ChannelOption" }, "default": {}, "description": "Locks and limits by channel; move, turn and scale stand for three channels each.", "examples": [{ "scale": { "locked": true }, "rx": { "min": -40, "max": 40 } }] }, "attributes": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "$ref": "#/$defs/AttributeOption" }, "default": {}, "description": "Values of its own, by name.", "examples": [{ "reach": { "default": 1, "min": 0, "max": 1 } }] }, "spaces": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 40, "description": "Joints and controls that may carry it; the attribute space chooses. Its parent comes first unless it is listed, else the first. Switching keeps nothing in place by itself: a tool matches the pose, or reads the values from Pintle.", "examples": [["root", "spine.chest", "hips"]] }, "space_follow": { "enum": ["all", "turn"], "default": "all", "description": "all: the chosen space carries the control. turn: it only turns it; place stays with the parent.", "examples": ["turn"] } } }, "NumberOrAttribute": { "title": "NumberOrAttribute", "description": "A number, an expression, or an attribute of a control as control.attribute.", "type": ["number", "string"], "pattern": "^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$)", "maxLength": 2e3, "examples": [1, "arm.left.hand.reach"] }, "Solver": { "title": "Solver", "description": "Computes the transform of several joints at once. Which keys it takes depends on its kind.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "kind": { "enum": ["two_bone", "reach", "spline", "twist", "aim", "foot_roll"], "description": "two_bone: three joints in a row bend so that the last meets the goal. reach: four or more joints fold evenly so that the last meets the goal. spline: joints lie along a curve through controls. twist: joints along a bone share the twist of another joint. aim: one joint points at a goal. foot_roll: a foot rolls and banks over points of its sole.", "examples": ["two_bone"] }, "joints": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 500, "description": "two_bone: the three joints from root to tip. reach: four or more. spline: two or more. Each is the parent of the next. twist: joints along the bone, children of its joint. aim: the one joint.", "examples": [["arm.left.shoulder", "arm.left.elbow", "arm.left.wrist"]] }, "goal": { "$ref": "#/$defs/id", "description": "two_bone, reach: joint or control that the last joint follows. aim: what the joint points at.", "examples": ["arm.left.hand"] }, "pole": { "$ref": "#/$defs/id", "description": "two_bone, reach: control toward which the chain bends. aim: thing that says which way is up; without it the joint turns along the shortest arc.", "examples": ["arm.left.pole"] }, "blend": { "$ref": "#/$defs/NumberOrAttribute", "default": 1, "description": "two_bone, reach, aim: 0: joints keep their own rotation. 1: solved.", "examples": ["arm.left.hand.reach"] }, "stretch": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "two_bone, reach: 0: bones keep their length, 1: they grow until the end meets the goal. spline: 0: joints keep their distances, 1: they spread over the whole curve.", "examples": ["arm.left.hand.stretch"] }, "stretch_limit": { "$ref": "#/$defs/NumberOrExpression", "default": 1.5, "description": "two_bone, reach: greatest factor on the bones' length.", "x-unit": "factor", "examples": [1.5] }, "soft": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "two_bone, reach: share of the chain's length over which the end slows down before full reach. The zone never begins before the reach at rest.", "x-unit": "chain lengths", "examples": [0.05] }, "swing": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "two_bone, reach: angle by which the bend is swung about the line from start to goal.", "examples": ["arm.left.hand.swing"], "x-unit": "degrees" }, "bias": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "reach: \u22121 to 1: moves the fold from the last bends to the first.", "examples": ["leg.left.foot.lead"] }, "controls": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 2, "maxItems": 100, "description": "spline: the controls whose places shape the curve, from root to tip.", "examples": [["spine.low", "spine.middle", "spine.high"]] }, "volume": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "spline: 0 to 1: how far joints thicken and thin to keep the volume.", "examples": ["spine.high.volume"] }, "shares": { "type": "array", "items": { "$ref": "#/$defs/NumberOrExpression" }, "minItems": 1, "maxItems": 100, "description": "twist: share of the twist that each joint takes. Without it, joint i of n takes i / (n + 1).", "examples": [[0.25, 0.5, 0.75]] }, "bone": { "$ref": "#/$defs/id", "description": "twist: joint at the root of the bone, the parent of the twist joints.", "examples": ["arm.left.elbow"] }, "tip": { "$ref": "#/$defs/id", "description": "twist: joint at the other end of the bone.", "examples": ["arm.left.wrist"] }, "base": { "$ref": "#/$defs/id", "description": "twist: joint or control against which the driver's twist is measured.", "examples": ["arm.left.elbow"] }, "driver": { "$ref": "#/$defs/id", "description": "twist: joint whose twist is spread.", "examples": ["arm.left.wrist"] }, "foot": { "$ref": "#/$defs/id", "description": "foot_roll: control that carries the foot.", "examples": ["leg.left.foot"] }, "ankle": { "$ref": "#/$defs/id", "description": "foot_roll: joint that every pivot moves.", "examples": ["leg.left_roll.ankle"] }, "toes": { "$ref": "#/$defs/id", "description": "foot_roll: joint that every pivot but the ball moves; without it the ankle alone is moved.", "examples": ["leg.left_roll.toes"] }, "heel": { "$ref": "#/$defs/Place", "description": "foot_roll: back of the sole, about which negative roll turns.", "examples": ["heel"] }, "ball": { "$ref": "#/$defs/Place", "description": "foot_roll: ball of the foot, about which roll turns up to the break angle.", "examples": ["ball"] }, "toe": { "$ref": "#/$defs/Place", "description": "foot_roll: tip of the toes, about which roll turns beyond the break angle.", "examples": ["toe"] }, "inner": { "$ref": "#/$defs/Place", "description": "foot_roll: inner edge of the sole, about which negative bank turns.", "examples": ["inner"] }, "outer": { "$ref": "#/$defs/Place", "description": "foot_roll: outer edge of the sole, about which positive bank turns.", "examples": ["outer"] }, "roll": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "foot_roll: angle, positive forward.", "examples": ["leg.left.foot.roll"], "x-unit": "degrees" }, "bank": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "foot_roll: angle, positive outward.", "examples": ["leg.left.foot.bank"], "x-unit": "degrees" }, "break": { "$ref": "#/$defs/NumberOrAttribute", "default": 30, "description": "foot_roll: roll at which the toes begin to lift.", "examples": [30], "x-unit": "degrees" }, "side": { "$ref": "#/$defs/SideOption" } } }, "Constraint": { "title": "Constraint", "description": "Makes one thing follow others.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "kind": { "enum": ["parent", "point", "orient", "scale", "aim"], "description": "What is followed: everything, position, rotation or scale; or, aim, the target turns to point at the sources.", "examples": ["orient"] }, "target": { "$ref": "#/$defs/id", "description": "Joint or control that follows.", "examples": ["arm.left.wrist"] }, "sources": { "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/NumberOrExpression" }, "minProperties": 1, "description": "What is followed, each with its weight; weights are taken as shares of their sum.", "examples": [{ "arm.left.hand": 1 }] }, "blend": { "$ref": "#/$defs/NumberOrAttribute", "description": "Two sources only: share of the first; the second takes the rest.", "examples": ["arm.left.hand.reach"] }, "keep_offset": { "type": "boolean", "default": true, "description": "Keeps the distance and turn that target and sources have at rest, so that nothing moves at rest.", "examples": [true] }, "axis": { "$ref": "#/$defs/AxisName", "default": "+x", "description": "aim: axis of the target that points at the sources, when no offset is kept.", "examples": ["+x"] }, "up_axis": { "$ref": "#/$defs/AxisName", "default": "+y", "description": "aim: axis of the target that keeps its direction against up.", "examples": ["+y"] }, "up": { "$ref": "#/$defs/id", "description": "aim: joint or control whose rotation carries the up axis; without it the target turns along the shortest arc.", "examples": ["head.chin"] }, "side": { "$ref": "#/$defs/SideOption" } } }, "GuideLine": { "title": "GuideLine", "description": "A drawn, unselectable line from a control to the thing it steers.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "from": { "$ref": "#/$defs/id", "description": "Control at its start.", "examples": ["arm.left.pole"] }, "to": { "$ref": "#/$defs/id", "description": "Joint or control at its end.", "examples": ["arm.left.elbow"] }, "style": { "enum": ["dotted", "dashed", "solid"], "default": "dotted", "description": "How it is drawn.", "examples": ["dotted"] }, "side": { "$ref": "#/$defs/SideOption" } } }, "Range": { "title": "Range", "description": "Smallest and largest value, from rest.", "type": "object", "additionalProperties": false, "properties": { "min": { "$ref": "#/$defs/NumberOrExpression", "description": "Smallest value.", "x-unit": "degrees", "examples": [-40] }, "max": { "$ref": "#/$defs/NumberOrExpression", "description": "Largest value.", "x-unit": "degrees", "examples": [40] } }, "examples": [{ "min": -10, "max": 140 }] }, "JointLimits": { "title": "JointLimits", "description": "How far a joint is meant to turn from rest, by axis. Controls enforce it; the joint itself does not.", "type": "object", "additionalProperties": false, "properties": { "rx": { "$ref": "#/$defs/Range", "description": "About its own x axis.", "examples": [{ "min": 0, "max": 140 }] }, "ry": { "$ref": "#/$defs/Range", "description": "About its own y axis.", "examples": [{ "min": 0, "max": 140 }] }, "rz": { "$ref": "#/$defs/Range", "description": "About its own z axis.", "examples": [{ "min": 0, "max": 140 }] } }, "examples": [{ "rz": { "min": 0, "max": 140 } }] }, "Driver": { "title": "Driver", "description": "Adds a value that follows a control to a channel of a joint or control.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "input": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$", "maxLength": 180, "description": "Attribute or channel of a control, as control.attribute.", "examples": ["jaw.open", "leg.left.foot.ty"] }, "target": { "$ref": "#/$defs/id", "description": "Joint or control whose channel it moves.", "examples": ["jaw.hinge"] }, "channel": { "enum": ["tx", "ty", "tz", "rx", "ry", "rz", "sx", "sy", "sz"], "description": "Channel that it is added to.", "examples": ["rz"] }, "keys": { "type": "array", "items": { "type": "array", "items": { "$ref": "#/$defs/NumberOrExpression" }, "minItems": 2, "maxItems": 2 }, "minItems": 2, "maxItems": 100, "description": "Curve as pairs of input and output, inputs ascending.", "examples": [[[0, 0], [1, 30]]] }, "curve": { "enum": ["linear", "smooth"], "default": "linear", "description": "How outputs run between keys: straight, or level at each key.", "examples": ["smooth"] }, "beyond": { "enum": ["hold", "extend"], "default": "hold", "description": "Beyond the end keys: hold the last output, or run on straight.", "examples": ["extend"] }, "side": { "$ref": "#/$defs/SideOption" } } }, "Geometry": { "title": "Geometry", "description": "A mesh of the model.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "mesh": { "type": "string", "minLength": 1, "maxLength": 200, "description": "Name of the mesh in the model's file; without it, the id.", "examples": ["hare_body"] }, "role": { "$ref": "#/$defs/word", "default": "geometry", "description": "Role; decides the container.", "examples": ["geometry"] }, "side": { "$ref": "#/$defs/SideOption" } } }, "Skin": { "title": "Skin", "description": "Which joints deform a mesh.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "geometry": { "$ref": "#/$defs/id", "description": "The mesh.", "examples": ["body"] }, "joints": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 2e3, "description": "Joints, or chains for all of their joints.", "examples": [["spine", "arm.left"]] }, "influences": { "type": "integer", "minimum": 1, "maximum": 16, "default": 4, "description": "Joints that a vertex may follow at most.", "examples": [4] }, "side": { "$ref": "#/$defs/SideOption" } } }, "Shape": { "title": "Shape", "description": "A morph target of a mesh with what weighs it.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "geometry": { "$ref": "#/$defs/id", "description": "The mesh.", "examples": ["body"] }, "morph": { "type": "string", "minLength": 1, "maxLength": 200, "description": "Name of the morph target in the model's file; without it, the id.", "examples": ["smile"] }, "weight": { "$ref": "#/$defs/NumberOrAttribute", "description": "Its weight, 0 to 1: a number or an attribute of a control.", "examples": ["head.smile"] }, "side": { "$ref": "#/$defs/SideOption" } } }, "Between": { "title": "Between", "description": "A point on the line between two others.", "type": "object", "required": ["from", "to"], "additionalProperties": false, "properties": { "from": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$", "maxLength": 120, "description": "Landmark or joint at its start.", "examples": ["shoulder"] }, "to": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$", "maxLength": 120, "description": "Landmark or joint at its end.", "examples": ["elbow"] }, "share": { "$ref": "#/$defs/NumberOrExpression", "default": 0.5, "description": "How far along, from 0 to 1.", "examples": [0.25] } }, "examples": [{ "from": "shoulder", "to": "elbow", "share": 0.5 }] }, "AxlePart": { "title": "AxlePart", "description": "One joint that turns about, swings on or slides along a line: a wheel, a hinge or a slider, with a control that has that one freedom.", "type": "object", "required": ["kind", "at", "along"], "additionalProperties": false, "properties": { "kind": { "const": "axle", "description": "A moving part of a prop." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that it hangs on.", "examples": ["body"] }, "at": { "$ref": "#/$defs/Place", "description": "Where it sits.", "examples": ["wheel"] }, "along": { "$ref": "#/$defs/Place", "description": "A second place on the line that it turns about or slides along.", "examples": ["wheel_out"] }, "motion": { "enum": ["wheel", "hinge", "slider"], "default": "hinge", "description": "wheel: turns without end. hinge: turns within limits. slider: moves along the line.", "examples": ["hinge"] }, "min": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "hinge, slider: least turn or shift.", "examples": [-90], "x-unit": "degrees or scene unit" }, "max": { "$ref": "#/$defs/NumberOrExpression", "default": 90, "description": "hinge, slider: greatest turn or shift.", "examples": [90], "x-unit": "degrees or scene unit" }, "roll_with": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$", "maxLength": 180, "description": "wheel: channel of a control, as control.tz, with whose way the wheel rolls. Needs radius.", "examples": ["root.tz"] }, "radius": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "wheel: radius, for rolling; below zero rolls the other way.", "examples": [12], "x-unit": "scene unit" }, "shape": { "enum": ["ring", "square", "diamond", "cross", "arrow", "ball", "box", "pin", "compass"], "default": "ring", "description": "Shape of the control.", "examples": ["ring"] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" } } }, "ClaviclePart": { "title": "ClaviclePart", "description": "One bone between body and limb, with a control that turns it.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "clavicle", "description": "A collar bone, shoulder blade or hip girdle." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that it hangs on.", "examples": ["spine.chest"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 2, "description": "Root and end.", "examples": [["clavicle", "shoulder"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 2, "maxItems": 2, "description": "Names of the two joints. Without it they take their landmarks' names, else root and end.", "examples": [["root", "end"]] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the root turns, by its name; the control is limited alike.", "examples": [{ "clavicle": { "rz": { "min": -20, "max": 40 } } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } }, "EyePart": { "title": "EyePart", "description": "An eyeball that points at a control of its own in front of it; a pair hangs on one control that both follow.", "type": "object", "required": ["kind", "at", "look"], "additionalProperties": false, "properties": { "kind": { "const": "eye", "description": "An eye." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the eye sits in.", "examples": ["head.head"] }, "at": { "$ref": "#/$defs/Place", "description": "Centre of the eyeball.", "examples": ["eye"] }, "look": { "$ref": "#/$defs/Place", "description": "Where the eye's target control stands at rest.", "examples": ["gaze"] }, "pair": { "$ref": "#/$defs/id", "description": "Control that the target follows, so that a pair of eyes looks at one thing.", "examples": ["gaze"] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the eyeball is meant to turn, under the name ball.", "examples": [{ "ball": { "ry": { "min": -35, "max": 35 }, "rx": { "min": -25, "max": 25 } } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" } } }, "FootPart": { "title": "FootPart", "description": "A foot at the end of a leg: ball and toe joints, and attributes on the leg's goal control that roll it over heel, ball and toe and bank it over its edges.", "type": "object", "required": ["kind", "leg", "ball", "toe", "heel", "inner", "outer"], "additionalProperties": false, "properties": { "kind": { "const": "foot", "description": "A foot that rolls." }, "side": { "$ref": "#/$defs/SideOption" }, "leg": { "$ref": "#/$defs/id", "description": "Part of kind limb or leg_three that the foot is the end of.", "examples": ["leg"] }, "ball": { "$ref": "#/$defs/Place", "description": "Ball of the foot.", "examples": ["ball"] }, "toe": { "$ref": "#/$defs/Place", "description": "Tip of the toes.", "examples": ["toe"] }, "heel": { "$ref": "#/$defs/Place", "description": "Back of the sole.", "examples": ["heel"] }, "inner": { "$ref": "#/$defs/Place", "description": "Inner edge of the sole.", "examples": ["foot_inner"] }, "outer": { "$ref": "#/$defs/Place", "description": "Outer edge of the sole.", "examples": ["foot_outer"] }, "break": { "$ref": "#/$defs/NumberOrExpression", "default": 30, "description": "Value at rest of the attribute toe_break: roll at which the toes begin to lift.", "examples": [30], "x-unit": "degrees" }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } }, "HandPart": { "title": "HandPart", "description": "Digits that are turned joint by joint, and one control that curls, spreads and cups them together.", "type": "object", "required": ["kind", "parent", "digits"], "additionalProperties": false, "properties": { "kind": { "const": "hand", "description": "A hand or claw with any count of digits." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint that the digits hang on.", "examples": ["arm.left.wrist"] }, "at": { "$ref": "#/$defs/Place", "description": "Where the hand's control stands; without it, at the parent.", "examples": ["palm"] }, "digits": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 12, "description": "Places of the digit's joints, from its root to its tip.", "examples": [["index_1", "index_2", "index_3", "index_tip"]] }, "minProperties": 1, "description": "Digits by name, in their order across the hand.", "examples": [{ "index": ["index_1", "index_2", "index_3", "index_tip"] }] }, "curl": { "$ref": "#/$defs/NumberOrExpression", "default": 70, "description": "Turn of each joint at curl 1.", "examples": [70], "x-unit": "degrees" }, "spread": { "$ref": "#/$defs/NumberOrExpression", "default": 20, "description": "Turn of the outermost digits away from the middle at spread 1.", "examples": [20], "x-unit": "degrees" }, "cup": { "$ref": "#/$defs/NumberOrExpression", "default": 15, "description": "Turn of the outermost digits' roots about their length at cup 1.", "examples": [15], "x-unit": "degrees" }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } }, "JawPart": { "title": "JawPart", "description": "One bone that opens about a hinge: a control that turns and shifts it, with an attribute that opens it.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "jaw", "description": "A jaw or beak." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the jaw hangs on.", "examples": ["head.head"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 2, "description": "Hinge and tip.", "examples": [["jaw_hinge", "chin"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 2, "maxItems": 2, "description": "Names of the two joints. Without it they take their landmarks' names, else hinge and tip.", "examples": [["hinge", "tip"]] }, "open": { "$ref": "#/$defs/NumberOrExpression", "default": 25, "description": "Turn about the hinge at open 1; its sign says which way.", "examples": [-25], "x-unit": "degrees" }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } }, "LegThreePart": { "title": "LegThreePart", "description": "Four joints in a row with three bones, as of a hind leg: joint-by-joint controls, a goal control with a reach solver that folds all bends together, a pole vector control, a blend between the two ways, and an attribute that moves the fold between knee and hock.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "leg_three", "description": "A leg that bends twice." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the leg hangs on.", "examples": ["hips"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 4, "maxItems": 4, "description": "Hip, knee, hock and end.", "examples": [["hip", "knee", "hock", "paw"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 4, "maxItems": 4, "description": "Names of the four joints. Without it they take their landmarks' names, else upper, middle, lower, end.", "examples": [["hip", "knee", "hock", "paw"]] }, "goal": { "$ref": "#/$defs/word", "default": "goal", "description": "Name of the goal control.", "examples": ["paw"] }, "goal_parent": { "$ref": "#/$defs/id", "description": "Joint or control that goal and pole follow; without it they follow the root only.", "examples": ["hips"] }, "pole": { "type": "object", "additionalProperties": false, "description": "The pole vector control.", "properties": { "distance": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Distance from the line start\u2013end through the bend, as a factor on the limb's length.", "examples": [1], "x-unit": "limb lengths" }, "guide_line": { "type": "boolean", "default": true, "description": "Draws a guide line from the pole control to the joint it leads.", "examples": [true] } }, "default": { "distance": 1, "guide_line": true }, "examples": [{ "distance": 0.8 }] }, "bend": { "$ref": "#/$defs/Point", "description": "Direction in which the middle joint should lead when the limb is straight at rest.", "examples": [[0, 0, -1]] }, "reach": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Value at rest of the goal control's attribute reach: 0 turns joint by joint, 1 follows the goal.", "examples": [1] }, "stretch": { "type": "object", "additionalProperties": false, "description": "Lets bones grow toward a goal out of reach; the goal control's attribute stretch turns it on.", "properties": { "limit": { "$ref": "#/$defs/NumberOrExpression", "default": 1.5, "description": "Greatest factor on the bones' length.", "examples": [1.5], "x-unit": "factor" }, "value": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Value at rest of the attribute stretch: 0 keeps lengths, 1 grows.", "examples": [0] } }, "examples": [{ "limit": 1.5, "value": 1 }] }, "soft": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Share of the limb's length over which its end slows down before full reach. The zone never begins before the reach at rest.", "examples": [0.05], "x-unit": "limb lengths" }, "spaces": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 40, "description": "What may carry the control.", "examples": [["root", "spine.chest"]] }, "default": {}, "description": "What may carry the goal control (by its name) and the pole control (pole); each gets an attribute space.", "examples": [{ "hand": ["root", "spine.chest", "spine.hips"] }] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the joints turn, by name; joint-by-joint controls are limited alike.", "examples": [{ "elbow": { "rz": { "min": 0, "max": 140 } } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } }, "LimbPart": { "title": "LimbPart", "description": "Three joints in a row that bend in the middle: joint-by-joint controls, a goal control with two-bone inverse kinematics, a pole vector control with its guide line, a blend between the two ways, and on request twist joints, stretch, soft reach and spaces.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "limb", "description": "An arm, a leg, or anything else that bends once." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the limb hangs on.", "examples": ["spine.chest"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 3, "maxItems": 3, "description": "Start, bend and end.", "examples": [["shoulder", "elbow", "wrist"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 3, "maxItems": 3, "description": "Names of the three joints. Without it they take their landmarks' names, else upper, lower, end.", "examples": [["upper", "lower", "end"]] }, "goal": { "$ref": "#/$defs/word", "default": "goal", "description": "Name of the goal control.", "examples": ["hand"] }, "goal_parent": { "$ref": "#/$defs/id", "description": "Joint or control that goal and pole follow; without it they follow the root only.", "examples": ["hips"] }, "pole": { "type": "object", "additionalProperties": false, "description": "The pole vector control.", "properties": { "distance": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Distance from the line start\u2013end through the bend, as a factor on the limb's length.", "examples": [1], "x-unit": "limb lengths" }, "guide_line": { "type": "boolean", "default": true, "description": "Draws a guide line from the pole control to the joint it leads.", "examples": [true] } }, "default": { "distance": 1, "guide_line": true }, "examples": [{ "distance": 0.8 }] }, "bend": { "$ref": "#/$defs/Point", "description": "Direction in which the middle joint should lead when the limb is straight at rest.", "examples": [[0, 0, -1]] }, "reach": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Value at rest of the goal control's attribute reach: 0 turns joint by joint, 1 follows the goal.", "examples": [1] }, "stretch": { "type": "object", "additionalProperties": false, "description": "Lets bones grow toward a goal out of reach; the goal control's attribute stretch turns it on.", "properties": { "limit": { "$ref": "#/$defs/NumberOrExpression", "default": 1.5, "description": "Greatest factor on the bones' length.", "examples": [1.5], "x-unit": "factor" }, "value": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Value at rest of the attribute stretch: 0 keeps lengths, 1 grows.", "examples": [0] } }, "examples": [{ "limit": 1.5, "value": 1 }] }, "soft": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Share of the limb's length over which its end slows down before full reach. The zone never begins before the reach at rest.", "examples": [0.05], "x-unit": "limb lengths" }, "spaces": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 40, "description": "What may carry the control.", "examples": [["root", "spine.chest"]] }, "default": {}, "description": "What may carry the goal control (by its name) and the pole control (pole); each gets an attribute space.", "examples": [{ "hand": ["root", "spine.chest", "spine.hips"] }] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the joints turn, by name; joint-by-joint controls are limited alike.", "examples": [{ "elbow": { "rz": { "min": 0, "max": 140 } } }] }, "twist": { "type": "object", "additionalProperties": false, "description": "Counts of joints that share the twist along each bone.", "properties": { "upper": { "type": "integer", "minimum": 0, "maximum": 20, "default": 0, "description": "Joints along the upper bone, which let the twist at its root fade in. Needs parent.", "examples": [2] }, "lower": { "type": "integer", "minimum": 0, "maximum": 20, "default": 0, "description": "Joints along the lower bone, which let the twist of the end fade out.", "examples": [3] } }, "default": {}, "examples": [{ "upper": 2, "lower": 3 }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } }, "NeckHeadPart": { "title": "NeckHeadPart", "description": "A neck of joints that are turned one by one, and a head on it that can keep its direction against the body.", "type": "object", "required": ["kind", "from", "to", "crown"], "additionalProperties": false, "properties": { "kind": { "const": "neck_head", "description": "Neck and head." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the neck hangs on.", "examples": ["spine.chest"] }, "from": { "$ref": "#/$defs/Place", "description": "Root of the neck.", "examples": ["neck"] }, "to": { "$ref": "#/$defs/Place", "description": "Where the head turns on the neck.", "examples": ["skull"] }, "crown": { "$ref": "#/$defs/Place", "description": "Top of the head.", "examples": ["crown"] }, "joints": { "type": "integer", "minimum": 1, "maximum": 60, "default": 2, "description": "Count of joints of the neck, the head's own not counted.", "examples": [2] }, "via": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 1, "maxItems": 50, "description": "Places the neck runs through on the way.", "examples": [["neck_bend"]] }, "spaces": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 40, "description": "What may turn the head beside the neck; the attribute space chooses.", "examples": [["root", "spine.chest"]] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the head turns, under the name head; its control is limited alike.", "examples": [{ "head": { "ry": { "min": -70, "max": 70 } } }] }, "guide_line": { "type": "boolean", "default": false, "description": "Draws a guide line from the head control to the crown.", "examples": [true] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } }, "RootPart": { "title": "RootPart", "description": "The control that carries the whole rig; on request with a root joint beneath it.", "type": "object", "required": ["kind"], "additionalProperties": false, "properties": { "kind": { "const": "root", "description": "The carrier of the rig." }, "at": { "$ref": "#/$defs/Place", "description": "Where it stands.", "examples": [[0, 0, 0]], "default": [0, 0, 0] }, "shape": { "enum": ["ring", "square", "diamond", "cross", "arrow", "ball", "box", "pin", "compass"], "default": "compass", "description": "Shape of the control.", "examples": ["compass"] }, "size": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Factor on its size.", "examples": [1.2] }, "joint": { "type": "boolean", "default": false, "description": "Makes a joint at the root that follows the control, as some receivers of skeletons want.", "examples": [true] } } }, "SpinePart": { "title": "SpinePart", "description": "A row of joints along a curve between two ends: a control at each end that carries both place and direction of the curve, controls between them that follow both, a spline solver, stretch and volume.", "type": "object", "required": ["kind", "from", "to"], "additionalProperties": false, "properties": { "kind": { "const": "spine", "description": "A spine, or any bendy body between two ends." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the lower control follows.", "examples": ["root"] }, "from": { "$ref": "#/$defs/Place", "description": "Where it begins.", "examples": ["hips"] }, "to": { "$ref": "#/$defs/Place", "description": "Where it ends.", "examples": ["chest"] }, "via": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 1, "maxItems": 50, "description": "Places it runs through on the way.", "examples": [["waist"]] }, "joints": { "type": "integer", "minimum": 3, "maximum": 100, "default": 5, "description": "Count of joints, spread evenly by arc length.", "examples": [5] }, "controls": { "type": "integer", "minimum": 2, "maximum": 12, "default": 3, "description": "Count of controls: both ends and those between.", "examples": [3] }, "stretch": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Value at rest of the upper control's attribute stretch: 0 keeps lengths, 1 spreads the joints over the whole curve.", "examples": [0] }, "volume": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Value at rest of the upper control's attribute volume: how far joints thicken and thin.", "examples": [0] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } }, "StrandPart": { "title": "StrandPart", "description": "A tail, ear, tentacle or rope: joints spread evenly along a curve, each turned by a control that hangs on the one before, or all laid along a curve through a few controls.", "type": "object", "required": ["kind", "points", "joints"], "additionalProperties": false, "properties": { "kind": { "const": "strand", "description": "A row of joints." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the strand hangs on.", "examples": ["hips"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 500, "description": "Where the strand runs, from base to tip.", "examples": [["tail_base", "tail_tip"]] }, "joints": { "type": "integer", "minimum": 2, "maximum": 500, "description": "Count of joints, spread evenly by arc length.", "examples": [8] }, "curve": { "enum": ["smooth", "straight"], "default": "smooth", "description": "Whether joints follow a smooth curve through the points or straight lines.", "examples": ["smooth"] }, "steer": { "enum": ["joints", "spline"], "default": "joints", "description": "joints: one control for each joint. spline: a few controls shape a curve.", "examples": ["joints"] }, "controls": { "type": "integer", "minimum": 2, "maximum": 40, "default": 4, "description": "spline: count of controls along the strand.", "examples": [4] }, "stretch": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "spline: value at rest of the last control's attribute stretch: 0 keeps lengths, 1 spreads the joints over the whole curve.", "examples": [0] }, "shape": { "enum": ["ring", "square", "diamond", "cross", "arrow", "ball", "box", "pin", "compass"], "default": "ring", "description": "Shape of the controls.", "examples": ["ring"] }, "size": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Factor on the controls' size.", "examples": [1.2] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "joints: how far each joint turns, by its name; controls are limited alike.", "examples": [{ "01": { "rz": { "min": -30, "max": 30 } } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } }, "WingPart": { "title": "WingPart", "description": "A limb that folds in two places with rows of feathers on its bones: a control for each joint, one control that folds the wing and fans its feathers.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "wing", "description": "A wing." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the wing hangs on.", "examples": ["spine.chest"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 4, "maxItems": 4, "description": "Shoulder, elbow, wrist and tip.", "examples": [["shoulder", "elbow", "wrist", "wing_tip"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 4, "maxItems": 4, "description": "Names of the four joints. Without it they take their landmarks' names, else upper, lower, hand, tip.", "examples": [["upper", "lower", "hand", "tip"]] }, "fold": { "type": "array", "items": { "$ref": "#/$defs/NumberOrExpression" }, "minItems": 3, "maxItems": 3, "default": [20, 110, -120], "description": "Turn of shoulder, elbow and wrist about their hinges at fold 1.", "x-unit": "degrees", "examples": [[20, 110, -120]] }, "feathers": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "type": "object", "additionalProperties": false, "description": "A row of feathers along one bone.", "properties": { "bone": { "enum": ["upper", "lower", "hand"], "default": "hand", "description": "Bone that the row sits on.", "examples": ["hand"] }, "tips": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 2, "description": "Where the tips of the first and the last feather lie.", "examples": [["primary_first", "primary_last"]] }, "count": { "type": "integer", "minimum": 1, "maximum": 40, "default": 5, "description": "Count of feathers.", "examples": [5] }, "joints": { "type": "integer", "minimum": 2, "maximum": 12, "default": 3, "description": "Count of joints of each feather.", "examples": [3] }, "fan": { "$ref": "#/$defs/NumberOrExpression", "default": 30, "description": "Turn of the last feather at fan 1; the first stays.", "examples": [30], "x-unit": "degrees" } }, "required": ["tips"], "examples": [{ "bone": "hand", "tips": ["primary_first", "primary_last"], "count": 5 }] }, "default": {}, "description": "Rows of feathers by name.", "examples": [{ "primary": { "bone": "hand", "tips": ["primary_first", "primary_last"], "count": 5 } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } } } };
var func1 = Object.prototype.hasOwnProperty;
var func2 = require_ucs2length().default;
var func0 = require_equal().default;
var pattern3 = new RegExp("^[a-z][a-z0-9_]*$", "u");
function validate53(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate53.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (typeof data === "string") {
    if (func2(data) > 60) {
      const err0 = { instancePath, schemaPath: "#/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (!pattern3.test(data)) {
      const err1 = { instancePath, schemaPath: "#/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"' };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
  } else {
    const err2 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "string" }, message: "must be string" };
    if (vErrors === null) {
      vErrors = [err2];
    } else {
      vErrors.push(err2);
    }
    errors++;
  }
  validate53.errors = vErrors;
  return errors === 0;
}
validate53.evaluated = { "dynamicProps": false, "dynamicItems": false };
function validate55(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate55.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (typeof data === "string") {
    if (func2(data) > 200) {
      const err0 = { instancePath, schemaPath: "#/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
  } else {
    const err1 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "string" }, message: "must be string" };
    if (vErrors === null) {
      vErrors = [err1];
    } else {
      vErrors.push(err1);
    }
    errors++;
  }
  validate55.errors = vErrors;
  return errors === 0;
}
validate55.evaluated = { "dynamicProps": false, "dynamicItems": false };
function validate58(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate58.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.default === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "default" }, message: "must have required property 'default'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!(key0 === "default" || key0 === "min" || key0 === "max" || key0 === "unit" || key0 === "whole" || key0 === "note")) {
        const err1 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.default !== void 0) {
      let data0 = data.default;
      if (!(typeof data0 == "number" && isFinite(data0))) {
        const err2 = { instancePath: instancePath + "/default", schemaPath: "#/properties/default/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.min !== void 0) {
      let data1 = data.min;
      if (!(typeof data1 == "number" && isFinite(data1))) {
        const err3 = { instancePath: instancePath + "/min", schemaPath: "#/properties/min/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.max !== void 0) {
      let data2 = data.max;
      if (!(typeof data2 == "number" && isFinite(data2))) {
        const err4 = { instancePath: instancePath + "/max", schemaPath: "#/properties/max/type", keyword: "type", params: { type: "number" }, message: "must be number" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.unit !== void 0) {
      if (!validate55(data.unit, { instancePath: instancePath + "/unit", parentData: data, parentDataProperty: "unit", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate55.errors : vErrors.concat(validate55.errors);
        errors = vErrors.length;
      }
    }
    if (data.whole !== void 0) {
      if (typeof data.whole !== "boolean") {
        const err5 = { instancePath: instancePath + "/whole", schemaPath: "#/properties/whole/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.note !== void 0) {
      if (!validate55(data.note, { instancePath: instancePath + "/note", parentData: data, parentDataProperty: "note", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate55.errors : vErrors.concat(validate55.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err6 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err6];
    } else {
      vErrors.push(err6);
    }
    errors++;
  }
  validate58.errors = vErrors;
  return errors === 0;
}
validate58.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema23 = { "title": "Scene", "description": "Axes and unit of every number in the recipe and in the emitted script. Right-handed always; angles in degrees.", "type": "object", "additionalProperties": false, "default": { "up": "+y", "forward": "+z", "unit": "cm" }, "properties": { "up": { "$ref": "#/$defs/AxisName", "default": "+y", "description": "Axis that points up.", "examples": ["+z"] }, "forward": { "$ref": "#/$defs/AxisName", "default": "+z", "description": "Axis the character faces along. Left is up \xD7 forward.", "examples": ["-y"] }, "unit": { "enum": ["mm", "cm", "m"], "default": "cm", "description": "Unit of length.", "examples": ["m"] } }, "examples": [{ "up": "+z", "forward": "-y", "unit": "m" }] };
var schema24 = { "title": "AxisName", "enum": ["+x", "-x", "+y", "-y", "+z", "-z"], "description": "One of the six axis directions.", "examples": ["+x"] };
function validate63(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate63.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (!(data === "+x" || data === "-x" || data === "+y" || data === "-y" || data === "+z" || data === "-z")) {
    const err0 = { instancePath, schemaPath: "#/enum", keyword: "enum", params: { allowedValues: schema24.enum }, message: "must be equal to one of the allowed values" };
    if (vErrors === null) {
      vErrors = [err0];
    } else {
      vErrors.push(err0);
    }
    errors++;
  }
  validate63.errors = vErrors;
  return errors === 0;
}
validate63.evaluated = { "dynamicProps": false, "dynamicItems": false };
function validate62(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate62.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "up" || key0 === "forward" || key0 === "unit")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.up !== void 0) {
      if (!validate63(data.up, { instancePath: instancePath + "/up", parentData: data, parentDataProperty: "up", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate63.errors : vErrors.concat(validate63.errors);
        errors = vErrors.length;
      }
    }
    if (data.forward !== void 0) {
      if (!validate63(data.forward, { instancePath: instancePath + "/forward", parentData: data, parentDataProperty: "forward", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate63.errors : vErrors.concat(validate63.errors);
        errors = vErrors.length;
      }
    }
    if (data.unit !== void 0) {
      let data2 = data.unit;
      if (!(data2 === "mm" || data2 === "cm" || data2 === "m")) {
        const err1 = { instancePath: instancePath + "/unit", schemaPath: "#/properties/unit/enum", keyword: "enum", params: { allowedValues: schema23.properties.unit.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
  } else {
    const err2 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err2];
    } else {
      vErrors.push(err2);
    }
    errors++;
  }
  validate62.errors = vErrors;
  return errors === 0;
}
validate62.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema25 = { "title": "Landmark", "description": "A named measured point on the model.", "type": "object", "required": ["at"], "additionalProperties": false, "properties": { "at": { "$ref": "#/$defs/Point", "description": "Where it is. For side left: the left point.", "x-unit": "scene unit" }, "side": { "enum": ["left", "centre"], "default": "centre", "description": "left: a mirrored right twin exists.", "examples": ["left"] }, "right": { "$ref": "#/$defs/Point", "description": "The right point, where the model is not symmetrical.", "x-unit": "scene unit" }, "note": { "$ref": "#/$defs/line", "description": "How to find it on the model.", "examples": ["bony tip of the elbow"] } } };
var schema27 = { "title": "NumberOrExpression", "description": "A number, or an expression: a string that begins with = and holds CEL over params, landmarks, dist, mix and mid.", "type": ["number", "string"], "pattern": "^=", "maxLength": 2e3, "examples": [12.5, "=params.stature * 0.53"] };
var pattern6 = new RegExp("^=", "u");
function validate70(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate70.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (!(typeof data == "number" && isFinite(data)) && typeof data !== "string") {
    const err0 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: schema27.type }, message: "must be number,string" };
    if (vErrors === null) {
      vErrors = [err0];
    } else {
      vErrors.push(err0);
    }
    errors++;
  }
  if (typeof data === "string") {
    if (func2(data) > 2e3) {
      const err1 = { instancePath, schemaPath: "#/maxLength", keyword: "maxLength", params: { limit: 2e3 }, message: "must NOT have more than 2000 characters" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (!pattern6.test(data)) {
      const err2 = { instancePath, schemaPath: "#/pattern", keyword: "pattern", params: { pattern: "^=" }, message: 'must match pattern "^="' };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
  }
  validate70.errors = vErrors;
  return errors === 0;
}
validate70.evaluated = { "dynamicProps": false, "dynamicItems": false };
function validate69(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate69.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  const _errs0 = errors;
  let valid0 = false;
  const _errs1 = errors;
  if (Array.isArray(data)) {
    if (data.length < 3) {
      const err0 = { instancePath, schemaPath: "#/anyOf/0/minItems", keyword: "minItems", params: { limit: 3 }, message: "must NOT have fewer than 3 items" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    const len0 = data.length;
    if (len0 > 0) {
      if (!validate70(data[0], { instancePath: instancePath + "/0", parentData: data, parentDataProperty: 0, rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (len0 > 1) {
      if (!validate70(data[1], { instancePath: instancePath + "/1", parentData: data, parentDataProperty: 1, rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (len0 > 2) {
      if (!validate70(data[2], { instancePath: instancePath + "/2", parentData: data, parentDataProperty: 2, rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    const len1 = data.length;
    if (!(len1 <= 3)) {
      const err1 = { instancePath, schemaPath: "#/anyOf/0/items", keyword: "items", params: { limit: 3 }, message: "must NOT have more than 3 items" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
  } else {
    const err2 = { instancePath, schemaPath: "#/anyOf/0/type", keyword: "type", params: { type: "array" }, message: "must be array" };
    if (vErrors === null) {
      vErrors = [err2];
    } else {
      vErrors.push(err2);
    }
    errors++;
  }
  var _valid0 = _errs1 === errors;
  valid0 = valid0 || _valid0;
  if (_valid0) {
    var items0 = true;
  }
  const _errs6 = errors;
  if (typeof data === "string") {
    if (func2(data) > 2e3) {
      const err3 = { instancePath, schemaPath: "#/anyOf/1/maxLength", keyword: "maxLength", params: { limit: 2e3 }, message: "must NOT have more than 2000 characters" };
      if (vErrors === null) {
        vErrors = [err3];
      } else {
        vErrors.push(err3);
      }
      errors++;
    }
    if (!pattern6.test(data)) {
      const err4 = { instancePath, schemaPath: "#/anyOf/1/pattern", keyword: "pattern", params: { pattern: "^=" }, message: 'must match pattern "^="' };
      if (vErrors === null) {
        vErrors = [err4];
      } else {
        vErrors.push(err4);
      }
      errors++;
    }
  } else {
    const err5 = { instancePath, schemaPath: "#/anyOf/1/type", keyword: "type", params: { type: "string" }, message: "must be string" };
    if (vErrors === null) {
      vErrors = [err5];
    } else {
      vErrors.push(err5);
    }
    errors++;
  }
  var _valid0 = _errs6 === errors;
  valid0 = valid0 || _valid0;
  if (!valid0) {
    const err6 = { instancePath, schemaPath: "#/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
    if (vErrors === null) {
      vErrors = [err6];
    } else {
      vErrors.push(err6);
    }
    errors++;
  } else {
    errors = _errs0;
    if (vErrors !== null) {
      if (_errs0) {
        vErrors.length = _errs0;
      } else {
        vErrors = null;
      }
    }
  }
  validate69.errors = vErrors;
  evaluated0.items = items0;
  return errors === 0;
}
validate69.evaluated = { "dynamicProps": false, "dynamicItems": true };
function validate68(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate68.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.at === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "at" }, message: "must have required property 'at'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!(key0 === "at" || key0 === "side" || key0 === "right" || key0 === "note")) {
        const err1 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.at !== void 0) {
      if (!validate69(data.at, { instancePath: instancePath + "/at", parentData: data, parentDataProperty: "at", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate69.errors : vErrors.concat(validate69.errors);
        errors = vErrors.length;
      }
    }
    if (data.side !== void 0) {
      let data1 = data.side;
      if (!(data1 === "left" || data1 === "centre")) {
        const err2 = { instancePath: instancePath + "/side", schemaPath: "#/properties/side/enum", keyword: "enum", params: { allowedValues: schema25.properties.side.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.right !== void 0) {
      if (!validate69(data.right, { instancePath: instancePath + "/right", parentData: data, parentDataProperty: "right", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate69.errors : vErrors.concat(validate69.errors);
        errors = vErrors.length;
      }
    }
    if (data.note !== void 0) {
      if (!validate55(data.note, { instancePath: instancePath + "/note", parentData: data, parentDataProperty: "note", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate55.errors : vErrors.concat(validate55.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err3 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err3];
    } else {
      vErrors.push(err3);
    }
    errors++;
  }
  validate68.errors = vErrors;
  return errors === 0;
}
validate68.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var pattern8 = new RegExp("^[A-Za-z0-9_]*$", "u");
function validate79(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate79.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "token" || key0 === "container" || key0 === "shown" || key0 === "selectable" || key0 === "title")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.token !== void 0) {
      let data0 = data.token;
      if (typeof data0 === "string") {
        if (func2(data0) > 20) {
          const err1 = { instancePath: instancePath + "/token", schemaPath: "#/properties/token/maxLength", keyword: "maxLength", params: { limit: 20 }, message: "must NOT have more than 20 characters" };
          if (vErrors === null) {
            vErrors = [err1];
          } else {
            vErrors.push(err1);
          }
          errors++;
        }
        if (!pattern8.test(data0)) {
          const err2 = { instancePath: instancePath + "/token", schemaPath: "#/properties/token/pattern", keyword: "pattern", params: { pattern: "^[A-Za-z0-9_]*$" }, message: 'must match pattern "^[A-Za-z0-9_]*$"' };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
      } else {
        const err3 = { instancePath: instancePath + "/token", schemaPath: "#/properties/token/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.container !== void 0) {
      if (!validate53(data.container, { instancePath: instancePath + "/container", parentData: data, parentDataProperty: "container", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.shown !== void 0) {
      if (typeof data.shown !== "boolean") {
        const err4 = { instancePath: instancePath + "/shown", schemaPath: "#/properties/shown/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.selectable !== void 0) {
      if (typeof data.selectable !== "boolean") {
        const err5 = { instancePath: instancePath + "/selectable", schemaPath: "#/properties/selectable/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.title !== void 0) {
      if (!validate55(data.title, { instancePath: instancePath + "/title", parentData: data, parentDataProperty: "title", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate55.errors : vErrors.concat(validate55.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err6 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err6];
    } else {
      vErrors.push(err6);
    }
    errors++;
  }
  validate79.errors = vErrors;
  return errors === 0;
}
validate79.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema29 = { "title": "Container", "description": "A group that holds one class of things.", "type": "object", "additionalProperties": false, "properties": { "parent": { "$ref": "#/$defs/word", "description": "Container it lies in; without one it lies directly in the rig.", "examples": ["carry"] }, "moves": { "enum": ["carried", "parked"], "description": "carried: moves with the root control. parked: stays in the world. Inherited from the parent container; parked at the top.", "examples": ["parked"] }, "shown": { "type": "boolean", "default": true, "description": "Whether an animator sees what is inside.", "examples": [false] }, "title": { "$ref": "#/$defs/line", "description": "What people call it.", "examples": ["Skin joints"] } } };
function validate84(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate84.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "parent" || key0 === "moves" || key0 === "shown" || key0 === "title")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.parent !== void 0) {
      if (!validate53(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.moves !== void 0) {
      let data1 = data.moves;
      if (!(data1 === "carried" || data1 === "parked")) {
        const err1 = { instancePath: instancePath + "/moves", schemaPath: "#/properties/moves/enum", keyword: "enum", params: { allowedValues: schema29.properties.moves.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.shown !== void 0) {
      if (typeof data.shown !== "boolean") {
        const err2 = { instancePath: instancePath + "/shown", schemaPath: "#/properties/shown/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.title !== void 0) {
      if (!validate55(data.title, { instancePath: instancePath + "/title", parentData: data, parentDataProperty: "title", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate55.errors : vErrors.concat(validate55.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err3 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err3];
    } else {
      vErrors.push(err3);
    }
    errors++;
  }
  validate84.errors = vErrors;
  return errors === 0;
}
validate84.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var pattern9 = new RegExp("^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$", "u");
function validate88(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate88.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (typeof data === "string") {
    if (func2(data) > 120) {
      const err0 = { instancePath, schemaPath: "#/maxLength", keyword: "maxLength", params: { limit: 120 }, message: "must NOT have more than 120 characters" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (!pattern9.test(data)) {
      const err1 = { instancePath, schemaPath: "#/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$"' };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
  } else {
    const err2 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "string" }, message: "must be string" };
    if (vErrors === null) {
      vErrors = [err2];
    } else {
      vErrors.push(err2);
    }
    errors++;
  }
  validate88.errors = vErrors;
  return errors === 0;
}
validate88.evaluated = { "dynamicProps": false, "dynamicItems": false };
var schema32 = { "title": "AxlePart", "description": "One joint that turns about, swings on or slides along a line: a wheel, a hinge or a slider, with a control that has that one freedom.", "type": "object", "required": ["kind", "at", "along"], "additionalProperties": false, "properties": { "kind": { "const": "axle", "description": "A moving part of a prop." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that it hangs on.", "examples": ["body"] }, "at": { "$ref": "#/$defs/Place", "description": "Where it sits.", "examples": ["wheel"] }, "along": { "$ref": "#/$defs/Place", "description": "A second place on the line that it turns about or slides along.", "examples": ["wheel_out"] }, "motion": { "enum": ["wheel", "hinge", "slider"], "default": "hinge", "description": "wheel: turns without end. hinge: turns within limits. slider: moves along the line.", "examples": ["hinge"] }, "min": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "hinge, slider: least turn or shift.", "examples": [-90], "x-unit": "degrees or scene unit" }, "max": { "$ref": "#/$defs/NumberOrExpression", "default": 90, "description": "hinge, slider: greatest turn or shift.", "examples": [90], "x-unit": "degrees or scene unit" }, "roll_with": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$", "maxLength": 180, "description": "wheel: channel of a control, as control.tz, with whose way the wheel rolls. Needs radius.", "examples": ["root.tz"] }, "radius": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "wheel: radius, for rolling; below zero rolls the other way.", "examples": [12], "x-unit": "scene unit" }, "shape": { "enum": ["ring", "square", "diamond", "cross", "arrow", "ball", "box", "pin", "compass"], "default": "ring", "description": "Shape of the control.", "examples": ["ring"] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" } } };
var schema33 = { "title": "SideOption", "description": "left or right: that side alone. both: the left side as written and its mirror image, in which every .left in an id reads .right. centre: neither. Without it, an id with a segment left or right says the side.", "enum": ["left", "right", "both", "centre"], "default": "centre", "examples": ["both"] };
function validate92(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate92.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (!(data === "left" || data === "right" || data === "both" || data === "centre")) {
    const err0 = { instancePath, schemaPath: "#/enum", keyword: "enum", params: { allowedValues: schema33.enum }, message: "must be equal to one of the allowed values" };
    if (vErrors === null) {
      vErrors = [err0];
    } else {
      vErrors.push(err0);
    }
    errors++;
  }
  validate92.errors = vErrors;
  return errors === 0;
}
validate92.evaluated = { "dynamicProps": false, "dynamicItems": false };
function validate99(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate99.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.from === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "from" }, message: "must have required property 'from'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.to === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "to" }, message: "must have required property 'to'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!(key0 === "from" || key0 === "to" || key0 === "share")) {
        const err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.from !== void 0) {
      let data0 = data.from;
      if (typeof data0 === "string") {
        if (func2(data0) > 120) {
          const err3 = { instancePath: instancePath + "/from", schemaPath: "#/properties/from/maxLength", keyword: "maxLength", params: { limit: 120 }, message: "must NOT have more than 120 characters" };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
        if (!pattern9.test(data0)) {
          const err4 = { instancePath: instancePath + "/from", schemaPath: "#/properties/from/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$"' };
          if (vErrors === null) {
            vErrors = [err4];
          } else {
            vErrors.push(err4);
          }
          errors++;
        }
      } else {
        const err5 = { instancePath: instancePath + "/from", schemaPath: "#/properties/from/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.to !== void 0) {
      let data1 = data.to;
      if (typeof data1 === "string") {
        if (func2(data1) > 120) {
          const err6 = { instancePath: instancePath + "/to", schemaPath: "#/properties/to/maxLength", keyword: "maxLength", params: { limit: 120 }, message: "must NOT have more than 120 characters" };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
        if (!pattern9.test(data1)) {
          const err7 = { instancePath: instancePath + "/to", schemaPath: "#/properties/to/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$"' };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
      } else {
        const err8 = { instancePath: instancePath + "/to", schemaPath: "#/properties/to/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
    }
    if (data.share !== void 0) {
      if (!validate70(data.share, { instancePath: instancePath + "/share", parentData: data, parentDataProperty: "share", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err9 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err9];
    } else {
      vErrors.push(err9);
    }
    errors++;
  }
  validate99.errors = vErrors;
  return errors === 0;
}
validate99.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var pattern10 = new RegExp("^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$)", "u");
function validate95(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate95.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  const _errs0 = errors;
  let valid0 = false;
  const _errs1 = errors;
  if (Array.isArray(data)) {
    if (data.length < 3) {
      const err0 = { instancePath, schemaPath: "#/anyOf/0/minItems", keyword: "minItems", params: { limit: 3 }, message: "must NOT have fewer than 3 items" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    const len0 = data.length;
    if (len0 > 0) {
      if (!validate70(data[0], { instancePath: instancePath + "/0", parentData: data, parentDataProperty: 0, rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (len0 > 1) {
      if (!validate70(data[1], { instancePath: instancePath + "/1", parentData: data, parentDataProperty: 1, rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (len0 > 2) {
      if (!validate70(data[2], { instancePath: instancePath + "/2", parentData: data, parentDataProperty: 2, rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    const len1 = data.length;
    if (!(len1 <= 3)) {
      const err1 = { instancePath, schemaPath: "#/anyOf/0/items", keyword: "items", params: { limit: 3 }, message: "must NOT have more than 3 items" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
  } else {
    const err2 = { instancePath, schemaPath: "#/anyOf/0/type", keyword: "type", params: { type: "array" }, message: "must be array" };
    if (vErrors === null) {
      vErrors = [err2];
    } else {
      vErrors.push(err2);
    }
    errors++;
  }
  var _valid0 = _errs1 === errors;
  valid0 = valid0 || _valid0;
  if (_valid0) {
    var items0 = true;
  }
  const _errs6 = errors;
  if (typeof data === "string") {
    if (func2(data) > 2e3) {
      const err3 = { instancePath, schemaPath: "#/anyOf/1/maxLength", keyword: "maxLength", params: { limit: 2e3 }, message: "must NOT have more than 2000 characters" };
      if (vErrors === null) {
        vErrors = [err3];
      } else {
        vErrors.push(err3);
      }
      errors++;
    }
    if (!pattern10.test(data)) {
      const err4 = { instancePath, schemaPath: "#/anyOf/1/pattern", keyword: "pattern", params: { pattern: "^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$)" }, message: 'must match pattern "^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$)"' };
      if (vErrors === null) {
        vErrors = [err4];
      } else {
        vErrors.push(err4);
      }
      errors++;
    }
  } else {
    const err5 = { instancePath, schemaPath: "#/anyOf/1/type", keyword: "type", params: { type: "string" }, message: "must be string" };
    if (vErrors === null) {
      vErrors = [err5];
    } else {
      vErrors.push(err5);
    }
    errors++;
  }
  var _valid0 = _errs6 === errors;
  valid0 = valid0 || _valid0;
  const _errs8 = errors;
  if (!validate99(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
    vErrors = vErrors === null ? validate99.errors : vErrors.concat(validate99.errors);
    errors = vErrors.length;
  }
  var _valid0 = _errs8 === errors;
  valid0 = valid0 || _valid0;
  if (_valid0) {
    var props0 = true;
  }
  if (!valid0) {
    const err6 = { instancePath, schemaPath: "#/anyOf", keyword: "anyOf", params: {}, message: "must match a schema in anyOf" };
    if (vErrors === null) {
      vErrors = [err6];
    } else {
      vErrors.push(err6);
    }
    errors++;
  } else {
    errors = _errs0;
    if (vErrors !== null) {
      if (_errs0) {
        vErrors.length = _errs0;
      } else {
        vErrors = null;
      }
    }
  }
  validate95.errors = vErrors;
  evaluated0.props = props0;
  evaluated0.items = items0;
  return errors === 0;
}
validate95.evaluated = { "dynamicProps": true, "dynamicItems": true };
var schema36 = { "title": "MirrorRule", "description": "How the right copy's frames follow from the left's. behaviour: the same rotation values give the mirrored pose. orientation: aim and up axes are mirror images. world: the same world orientation.", "enum": ["behaviour", "orientation", "world"], "default": "behaviour", "examples": ["behaviour"] };
function validate108(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate108.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (!(data === "behaviour" || data === "orientation" || data === "world")) {
    const err0 = { instancePath, schemaPath: "#/enum", keyword: "enum", params: { allowedValues: schema36.enum }, message: "must be equal to one of the allowed values" };
    if (vErrors === null) {
      vErrors = [err0];
    } else {
      vErrors.push(err0);
    }
    errors++;
  }
  validate108.errors = vErrors;
  return errors === 0;
}
validate108.evaluated = { "dynamicProps": false, "dynamicItems": false };
var pattern13 = new RegExp("^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$", "u");
function validate91(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate91.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.at === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "at" }, message: "must have required property 'at'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (data.along === void 0) {
      const err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "along" }, message: "must have required property 'along'" };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema32.properties, key0)) {
        const err3 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("axle" !== data.kind) {
        const err4 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "axle" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.at !== void 0) {
      if (!validate95(data.at, { instancePath: instancePath + "/at", parentData: data, parentDataProperty: "at", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.along !== void 0) {
      if (!validate95(data.along, { instancePath: instancePath + "/along", parentData: data, parentDataProperty: "along", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.motion !== void 0) {
      let data5 = data.motion;
      if (!(data5 === "wheel" || data5 === "hinge" || data5 === "slider")) {
        const err5 = { instancePath: instancePath + "/motion", schemaPath: "#/properties/motion/enum", keyword: "enum", params: { allowedValues: schema32.properties.motion.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.min !== void 0) {
      if (!validate70(data.min, { instancePath: instancePath + "/min", parentData: data, parentDataProperty: "min", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.max !== void 0) {
      if (!validate70(data.max, { instancePath: instancePath + "/max", parentData: data, parentDataProperty: "max", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.roll_with !== void 0) {
      let data8 = data.roll_with;
      if (typeof data8 === "string") {
        if (func2(data8) > 180) {
          const err6 = { instancePath: instancePath + "/roll_with", schemaPath: "#/properties/roll_with/maxLength", keyword: "maxLength", params: { limit: 180 }, message: "must NOT have more than 180 characters" };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
        if (!pattern13.test(data8)) {
          const err7 = { instancePath: instancePath + "/roll_with", schemaPath: "#/properties/roll_with/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$" }, message: 'must match pattern "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$"' };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
      } else {
        const err8 = { instancePath: instancePath + "/roll_with", schemaPath: "#/properties/roll_with/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
    }
    if (data.radius !== void 0) {
      if (!validate70(data.radius, { instancePath: instancePath + "/radius", parentData: data, parentDataProperty: "radius", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.shape !== void 0) {
      let data10 = data.shape;
      if (!(data10 === "ring" || data10 === "square" || data10 === "diamond" || data10 === "cross" || data10 === "arrow" || data10 === "ball" || data10 === "box" || data10 === "pin" || data10 === "compass")) {
        const err9 = { instancePath: instancePath + "/shape", schemaPath: "#/properties/shape/enum", keyword: "enum", params: { allowedValues: schema32.properties.shape.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err9];
        } else {
          vErrors.push(err9);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err10 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err10];
    } else {
      vErrors.push(err10);
    }
    errors++;
  }
  validate91.errors = vErrors;
  return errors === 0;
}
validate91.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema37 = { "title": "ClaviclePart", "description": "One bone between body and limb, with a control that turns it.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "clavicle", "description": "A collar bone, shoulder blade or hip girdle." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that it hangs on.", "examples": ["spine.chest"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 2, "description": "Root and end.", "examples": [["clavicle", "shoulder"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 2, "maxItems": 2, "description": "Names of the two joints. Without it they take their landmarks' names, else root and end.", "examples": [["root", "end"]] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the root turns, by its name; the control is limited alike.", "examples": [{ "clavicle": { "rz": { "min": -20, "max": 40 } } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
function validate115(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate115.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "min" || key0 === "max")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.min !== void 0) {
      if (!validate70(data.min, { instancePath: instancePath + "/min", parentData: data, parentDataProperty: "min", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.max !== void 0) {
      if (!validate70(data.max, { instancePath: instancePath + "/max", parentData: data, parentDataProperty: "max", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err1 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err1];
    } else {
      vErrors.push(err1);
    }
    errors++;
  }
  validate115.errors = vErrors;
  return errors === 0;
}
validate115.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate114(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate114.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "rx" || key0 === "ry" || key0 === "rz")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.rx !== void 0) {
      if (!validate115(data.rx, { instancePath: instancePath + "/rx", parentData: data, parentDataProperty: "rx", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate115.errors : vErrors.concat(validate115.errors);
        errors = vErrors.length;
      }
    }
    if (data.ry !== void 0) {
      if (!validate115(data.ry, { instancePath: instancePath + "/ry", parentData: data, parentDataProperty: "ry", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate115.errors : vErrors.concat(validate115.errors);
        errors = vErrors.length;
      }
    }
    if (data.rz !== void 0) {
      if (!validate115(data.rz, { instancePath: instancePath + "/rz", parentData: data, parentDataProperty: "rz", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate115.errors : vErrors.concat(validate115.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err1 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err1];
    } else {
      vErrors.push(err1);
    }
    errors++;
  }
  validate114.errors = vErrors;
  return errors === 0;
}
validate114.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema40 = { "title": "RotationOrderOption", "description": "Which axis turns first, second and third, about fixed axes.", "enum": ["xyz", "xzy", "yxz", "yzx", "zxy", "zyx"], "default": "xyz", "examples": ["zxy"] };
function validate124(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate124.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (!(data === "xyz" || data === "xzy" || data === "yxz" || data === "yzx" || data === "zxy" || data === "zyx")) {
    const err0 = { instancePath, schemaPath: "#/enum", keyword: "enum", params: { allowedValues: schema40.enum }, message: "must be equal to one of the allowed values" };
    if (vErrors === null) {
      vErrors = [err0];
    } else {
      vErrors.push(err0);
    }
    errors++;
  }
  validate124.errors = vErrors;
  return errors === 0;
}
validate124.evaluated = { "dynamicProps": false, "dynamicItems": false };
var pattern15 = new RegExp("^[a-z0-9_]+$", "u");
function validate110(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate110.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.points === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "points" }, message: "must have required property 'points'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema37.properties, key0)) {
        const err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("clavicle" !== data.kind) {
        const err3 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "clavicle" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.points !== void 0) {
      let data3 = data.points;
      if (Array.isArray(data3)) {
        if (data3.length > 2) {
          const err4 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/maxItems", keyword: "maxItems", params: { limit: 2 }, message: "must NOT have more than 2 items" };
          if (vErrors === null) {
            vErrors = [err4];
          } else {
            vErrors.push(err4);
          }
          errors++;
        }
        if (data3.length < 2) {
          const err5 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
          if (vErrors === null) {
            vErrors = [err5];
          } else {
            vErrors.push(err5);
          }
          errors++;
        }
        const len0 = data3.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate95(data3[i0], { instancePath: instancePath + "/points/" + i0, parentData: data3, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err6 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
    }
    if (data.names !== void 0) {
      let data5 = data.names;
      if (Array.isArray(data5)) {
        if (data5.length > 2) {
          const err7 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/maxItems", keyword: "maxItems", params: { limit: 2 }, message: "must NOT have more than 2 items" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
        if (data5.length < 2) {
          const err8 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
          if (vErrors === null) {
            vErrors = [err8];
          } else {
            vErrors.push(err8);
          }
          errors++;
        }
        const len1 = data5.length;
        for (let i1 = 0; i1 < len1; i1++) {
          let data6 = data5[i1];
          if (typeof data6 === "string") {
            if (func2(data6) > 60) {
              const err9 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
              if (vErrors === null) {
                vErrors = [err9];
              } else {
                vErrors.push(err9);
              }
              errors++;
            }
            if (!pattern3.test(data6)) {
              const err10 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"' };
              if (vErrors === null) {
                vErrors = [err10];
              } else {
                vErrors.push(err10);
              }
              errors++;
            }
          } else {
            const err11 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            if (vErrors === null) {
              vErrors = [err11];
            } else {
              vErrors.push(err11);
            }
            errors++;
          }
        }
      } else {
        const err12 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
    }
    if (data.limits !== void 0) {
      let data7 = data.limits;
      if (data7 && typeof data7 == "object" && !Array.isArray(data7)) {
        for (const key1 in data7) {
          const _errs14 = errors;
          if (typeof key1 === "string") {
            if (func2(key1) > 60) {
              const err13 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters", propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err13];
              } else {
                vErrors.push(err13);
              }
              errors++;
            }
            if (!pattern15.test(key1)) {
              const err14 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z0-9_]+$" }, message: 'must match pattern "^[a-z0-9_]+$"', propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err14];
              } else {
                vErrors.push(err14);
              }
              errors++;
            }
          } else {
            const err15 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key1 };
            if (vErrors === null) {
              vErrors = [err15];
            } else {
              vErrors.push(err15);
            }
            errors++;
          }
          var valid5 = _errs14 === errors;
          if (!valid5) {
            const err16 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err16];
            } else {
              vErrors.push(err16);
            }
            errors++;
          }
        }
        for (const key2 in data7) {
          if (!validate114(data7[key2], { instancePath: instancePath + "/limits/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data7, parentDataProperty: key2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate114.errors : vErrors.concat(validate114.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err17 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err17];
        } else {
          vErrors.push(err17);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err18 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err18];
    } else {
      vErrors.push(err18);
    }
    errors++;
  }
  validate110.errors = vErrors;
  return errors === 0;
}
validate110.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema41 = { "title": "EyePart", "description": "An eyeball that points at a control of its own in front of it; a pair hangs on one control that both follow.", "type": "object", "required": ["kind", "at", "look"], "additionalProperties": false, "properties": { "kind": { "const": "eye", "description": "An eye." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the eye sits in.", "examples": ["head.head"] }, "at": { "$ref": "#/$defs/Place", "description": "Centre of the eyeball.", "examples": ["eye"] }, "look": { "$ref": "#/$defs/Place", "description": "Where the eye's target control stands at rest.", "examples": ["gaze"] }, "pair": { "$ref": "#/$defs/id", "description": "Control that the target follows, so that a pair of eyes looks at one thing.", "examples": ["gaze"] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the eyeball is meant to turn, under the name ball.", "examples": [{ "ball": { "ry": { "min": -35, "max": 35 }, "rx": { "min": -25, "max": 25 } } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" } } };
function validate126(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate126.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.at === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "at" }, message: "must have required property 'at'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (data.look === void 0) {
      const err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "look" }, message: "must have required property 'look'" };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema41.properties, key0)) {
        const err3 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("eye" !== data.kind) {
        const err4 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "eye" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.at !== void 0) {
      if (!validate95(data.at, { instancePath: instancePath + "/at", parentData: data, parentDataProperty: "at", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.look !== void 0) {
      if (!validate95(data.look, { instancePath: instancePath + "/look", parentData: data, parentDataProperty: "look", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.pair !== void 0) {
      if (!validate88(data.pair, { instancePath: instancePath + "/pair", parentData: data, parentDataProperty: "pair", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.limits !== void 0) {
      let data6 = data.limits;
      if (data6 && typeof data6 == "object" && !Array.isArray(data6)) {
        for (const key1 in data6) {
          const _errs10 = errors;
          if (typeof key1 === "string") {
            if (func2(key1) > 60) {
              const err5 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters", propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err5];
              } else {
                vErrors.push(err5);
              }
              errors++;
            }
            if (!pattern15.test(key1)) {
              const err6 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z0-9_]+$" }, message: 'must match pattern "^[a-z0-9_]+$"', propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err6];
              } else {
                vErrors.push(err6);
              }
              errors++;
            }
          } else {
            const err7 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key1 };
            if (vErrors === null) {
              vErrors = [err7];
            } else {
              vErrors.push(err7);
            }
            errors++;
          }
          var valid1 = _errs10 === errors;
          if (!valid1) {
            const err8 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err8];
            } else {
              vErrors.push(err8);
            }
            errors++;
          }
        }
        for (const key2 in data6) {
          if (!validate114(data6[key2], { instancePath: instancePath + "/limits/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data6, parentDataProperty: key2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate114.errors : vErrors.concat(validate114.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err9 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err9];
        } else {
          vErrors.push(err9);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err10 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err10];
    } else {
      vErrors.push(err10);
    }
    errors++;
  }
  validate126.errors = vErrors;
  return errors === 0;
}
validate126.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema42 = { "title": "FootPart", "description": "A foot at the end of a leg: ball and toe joints, and attributes on the leg's goal control that roll it over heel, ball and toe and bank it over its edges.", "type": "object", "required": ["kind", "leg", "ball", "toe", "heel", "inner", "outer"], "additionalProperties": false, "properties": { "kind": { "const": "foot", "description": "A foot that rolls." }, "side": { "$ref": "#/$defs/SideOption" }, "leg": { "$ref": "#/$defs/id", "description": "Part of kind limb or leg_three that the foot is the end of.", "examples": ["leg"] }, "ball": { "$ref": "#/$defs/Place", "description": "Ball of the foot.", "examples": ["ball"] }, "toe": { "$ref": "#/$defs/Place", "description": "Tip of the toes.", "examples": ["toe"] }, "heel": { "$ref": "#/$defs/Place", "description": "Back of the sole.", "examples": ["heel"] }, "inner": { "$ref": "#/$defs/Place", "description": "Inner edge of the sole.", "examples": ["foot_inner"] }, "outer": { "$ref": "#/$defs/Place", "description": "Outer edge of the sole.", "examples": ["foot_outer"] }, "break": { "$ref": "#/$defs/NumberOrExpression", "default": 30, "description": "Value at rest of the attribute toe_break: roll at which the toes begin to lift.", "examples": [30], "x-unit": "degrees" }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
function validate135(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate135.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.leg === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "leg" }, message: "must have required property 'leg'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (data.ball === void 0) {
      const err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "ball" }, message: "must have required property 'ball'" };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
    if (data.toe === void 0) {
      const err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "toe" }, message: "must have required property 'toe'" };
      if (vErrors === null) {
        vErrors = [err3];
      } else {
        vErrors.push(err3);
      }
      errors++;
    }
    if (data.heel === void 0) {
      const err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "heel" }, message: "must have required property 'heel'" };
      if (vErrors === null) {
        vErrors = [err4];
      } else {
        vErrors.push(err4);
      }
      errors++;
    }
    if (data.inner === void 0) {
      const err5 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "inner" }, message: "must have required property 'inner'" };
      if (vErrors === null) {
        vErrors = [err5];
      } else {
        vErrors.push(err5);
      }
      errors++;
    }
    if (data.outer === void 0) {
      const err6 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "outer" }, message: "must have required property 'outer'" };
      if (vErrors === null) {
        vErrors = [err6];
      } else {
        vErrors.push(err6);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema42.properties, key0)) {
        const err7 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err7];
        } else {
          vErrors.push(err7);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("foot" !== data.kind) {
        const err8 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "foot" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.leg !== void 0) {
      if (!validate88(data.leg, { instancePath: instancePath + "/leg", parentData: data, parentDataProperty: "leg", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.ball !== void 0) {
      if (!validate95(data.ball, { instancePath: instancePath + "/ball", parentData: data, parentDataProperty: "ball", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.toe !== void 0) {
      if (!validate95(data.toe, { instancePath: instancePath + "/toe", parentData: data, parentDataProperty: "toe", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.heel !== void 0) {
      if (!validate95(data.heel, { instancePath: instancePath + "/heel", parentData: data, parentDataProperty: "heel", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.inner !== void 0) {
      if (!validate95(data.inner, { instancePath: instancePath + "/inner", parentData: data, parentDataProperty: "inner", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.outer !== void 0) {
      if (!validate95(data.outer, { instancePath: instancePath + "/outer", parentData: data, parentDataProperty: "outer", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.break !== void 0) {
      if (!validate70(data.break, { instancePath: instancePath + "/break", parentData: data, parentDataProperty: "break", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err9 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err9];
    } else {
      vErrors.push(err9);
    }
    errors++;
  }
  validate135.errors = vErrors;
  return errors === 0;
}
validate135.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema43 = { "title": "HandPart", "description": "Digits that are turned joint by joint, and one control that curls, spreads and cups them together.", "type": "object", "required": ["kind", "parent", "digits"], "additionalProperties": false, "properties": { "kind": { "const": "hand", "description": "A hand or claw with any count of digits." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint that the digits hang on.", "examples": ["arm.left.wrist"] }, "at": { "$ref": "#/$defs/Place", "description": "Where the hand's control stands; without it, at the parent.", "examples": ["palm"] }, "digits": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 12, "description": "Places of the digit's joints, from its root to its tip.", "examples": [["index_1", "index_2", "index_3", "index_tip"]] }, "minProperties": 1, "description": "Digits by name, in their order across the hand.", "examples": [{ "index": ["index_1", "index_2", "index_3", "index_tip"] }] }, "curl": { "$ref": "#/$defs/NumberOrExpression", "default": 70, "description": "Turn of each joint at curl 1.", "examples": [70], "x-unit": "degrees" }, "spread": { "$ref": "#/$defs/NumberOrExpression", "default": 20, "description": "Turn of the outermost digits away from the middle at spread 1.", "examples": [20], "x-unit": "degrees" }, "cup": { "$ref": "#/$defs/NumberOrExpression", "default": 15, "description": "Turn of the outermost digits' roots about their length at cup 1.", "examples": [15], "x-unit": "degrees" }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
var schema44 = { "title": "Orient", "description": "How joint frames are turned.", "type": "object", "additionalProperties": false, "default": { "rule": "chain", "aim": "+x", "up": "+y" }, "properties": { "rule": { "enum": ["chain", "world"], "default": "chain", "description": "chain: the aim axis points at the next joint and the third axis is the hinge. world: frames keep the scene's axes.", "examples": ["world"] }, "aim": { "$ref": "#/$defs/AxisName", "default": "+x", "description": "Axis of the joint that points at the next joint.", "examples": ["+y"] }, "up": { "$ref": "#/$defs/AxisName", "default": "+y", "description": "Axis of the joint that lies in the chain's plane, on the side that the chain folds toward. The third axis is the hinge: positive turns about it fold the chain.", "examples": ["+z"] }, "toward": { "$ref": "#/$defs/Point", "description": "Direction the up axis should lean to, in place of the chain's own plane.", "examples": [[0, 1, 0]] }, "like": { "$ref": "#/$defs/id", "description": "Joint whose frame every joint of the chain takes, in place of frames of its own.", "examples": ["arm.left.elbow"] } }, "examples": [{ "aim": "+y", "up": "+z" }] };
function validate158(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate158.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "rule" || key0 === "aim" || key0 === "up" || key0 === "toward" || key0 === "like")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.rule !== void 0) {
      let data0 = data.rule;
      if (!(data0 === "chain" || data0 === "world")) {
        const err1 = { instancePath: instancePath + "/rule", schemaPath: "#/properties/rule/enum", keyword: "enum", params: { allowedValues: schema44.properties.rule.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.aim !== void 0) {
      if (!validate63(data.aim, { instancePath: instancePath + "/aim", parentData: data, parentDataProperty: "aim", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate63.errors : vErrors.concat(validate63.errors);
        errors = vErrors.length;
      }
    }
    if (data.up !== void 0) {
      if (!validate63(data.up, { instancePath: instancePath + "/up", parentData: data, parentDataProperty: "up", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate63.errors : vErrors.concat(validate63.errors);
        errors = vErrors.length;
      }
    }
    if (data.toward !== void 0) {
      if (!validate69(data.toward, { instancePath: instancePath + "/toward", parentData: data, parentDataProperty: "toward", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate69.errors : vErrors.concat(validate69.errors);
        errors = vErrors.length;
      }
    }
    if (data.like !== void 0) {
      if (!validate88(data.like, { instancePath: instancePath + "/like", parentData: data, parentDataProperty: "like", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err2 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err2];
    } else {
      vErrors.push(err2);
    }
    errors++;
  }
  validate158.errors = vErrors;
  return errors === 0;
}
validate158.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate147(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate147.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.parent === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "parent" }, message: "must have required property 'parent'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (data.digits === void 0) {
      const err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "digits" }, message: "must have required property 'digits'" };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema43.properties, key0)) {
        const err3 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("hand" !== data.kind) {
        const err4 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "hand" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.at !== void 0) {
      if (!validate95(data.at, { instancePath: instancePath + "/at", parentData: data, parentDataProperty: "at", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.digits !== void 0) {
      let data4 = data.digits;
      if (data4 && typeof data4 == "object" && !Array.isArray(data4)) {
        if (Object.keys(data4).length < 1) {
          const err5 = { instancePath: instancePath + "/digits", schemaPath: "#/properties/digits/minProperties", keyword: "minProperties", params: { limit: 1 }, message: "must NOT have fewer than 1 properties" };
          if (vErrors === null) {
            vErrors = [err5];
          } else {
            vErrors.push(err5);
          }
          errors++;
        }
        for (const key1 in data4) {
          const _errs8 = errors;
          if (!validate53(key1, { instancePath: instancePath + "/digits", parentData: data4, parentDataProperty: "digits", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid1 = _errs8 === errors;
          if (!valid1) {
            const err6 = { instancePath: instancePath + "/digits", schemaPath: "#/properties/digits/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err6];
            } else {
              vErrors.push(err6);
            }
            errors++;
          }
        }
        for (const key2 in data4) {
          let data5 = data4[key2];
          if (Array.isArray(data5)) {
            if (data5.length > 12) {
              const err7 = { instancePath: instancePath + "/digits/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/digits/additionalProperties/maxItems", keyword: "maxItems", params: { limit: 12 }, message: "must NOT have more than 12 items" };
              if (vErrors === null) {
                vErrors = [err7];
              } else {
                vErrors.push(err7);
              }
              errors++;
            }
            if (data5.length < 2) {
              const err8 = { instancePath: instancePath + "/digits/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/digits/additionalProperties/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
              if (vErrors === null) {
                vErrors = [err8];
              } else {
                vErrors.push(err8);
              }
              errors++;
            }
            const len0 = data5.length;
            for (let i0 = 0; i0 < len0; i0++) {
              if (!validate95(data5[i0], { instancePath: instancePath + "/digits/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/" + i0, parentData: data5, parentDataProperty: i0, rootData, dynamicAnchors })) {
                vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
                errors = vErrors.length;
              }
            }
          } else {
            const err9 = { instancePath: instancePath + "/digits/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/digits/additionalProperties/type", keyword: "type", params: { type: "array" }, message: "must be array" };
            if (vErrors === null) {
              vErrors = [err9];
            } else {
              vErrors.push(err9);
            }
            errors++;
          }
        }
      } else {
        const err10 = { instancePath: instancePath + "/digits", schemaPath: "#/properties/digits/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err10];
        } else {
          vErrors.push(err10);
        }
        errors++;
      }
    }
    if (data.curl !== void 0) {
      if (!validate70(data.curl, { instancePath: instancePath + "/curl", parentData: data, parentDataProperty: "curl", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.spread !== void 0) {
      if (!validate70(data.spread, { instancePath: instancePath + "/spread", parentData: data, parentDataProperty: "spread", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.cup !== void 0) {
      if (!validate70(data.cup, { instancePath: instancePath + "/cup", parentData: data, parentDataProperty: "cup", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
    if (data.orient !== void 0) {
      if (!validate158(data.orient, { instancePath: instancePath + "/orient", parentData: data, parentDataProperty: "orient", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate158.errors : vErrors.concat(validate158.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err11 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err11];
    } else {
      vErrors.push(err11);
    }
    errors++;
  }
  validate147.errors = vErrors;
  return errors === 0;
}
validate147.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema45 = { "title": "JawPart", "description": "One bone that opens about a hinge: a control that turns and shifts it, with an attribute that opens it.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "jaw", "description": "A jaw or beak." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the jaw hangs on.", "examples": ["head.head"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 2, "description": "Hinge and tip.", "examples": [["jaw_hinge", "chin"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 2, "maxItems": 2, "description": "Names of the two joints. Without it they take their landmarks' names, else hinge and tip.", "examples": [["hinge", "tip"]] }, "open": { "$ref": "#/$defs/NumberOrExpression", "default": 25, "description": "Turn about the hinge at open 1; its sign says which way.", "examples": [-25], "x-unit": "degrees" }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
function validate165(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate165.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.points === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "points" }, message: "must have required property 'points'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema45.properties, key0)) {
        const err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("jaw" !== data.kind) {
        const err3 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "jaw" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.points !== void 0) {
      let data3 = data.points;
      if (Array.isArray(data3)) {
        if (data3.length > 2) {
          const err4 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/maxItems", keyword: "maxItems", params: { limit: 2 }, message: "must NOT have more than 2 items" };
          if (vErrors === null) {
            vErrors = [err4];
          } else {
            vErrors.push(err4);
          }
          errors++;
        }
        if (data3.length < 2) {
          const err5 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
          if (vErrors === null) {
            vErrors = [err5];
          } else {
            vErrors.push(err5);
          }
          errors++;
        }
        const len0 = data3.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate95(data3[i0], { instancePath: instancePath + "/points/" + i0, parentData: data3, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err6 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
    }
    if (data.names !== void 0) {
      let data5 = data.names;
      if (Array.isArray(data5)) {
        if (data5.length > 2) {
          const err7 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/maxItems", keyword: "maxItems", params: { limit: 2 }, message: "must NOT have more than 2 items" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
        if (data5.length < 2) {
          const err8 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
          if (vErrors === null) {
            vErrors = [err8];
          } else {
            vErrors.push(err8);
          }
          errors++;
        }
        const len1 = data5.length;
        for (let i1 = 0; i1 < len1; i1++) {
          let data6 = data5[i1];
          if (typeof data6 === "string") {
            if (func2(data6) > 60) {
              const err9 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
              if (vErrors === null) {
                vErrors = [err9];
              } else {
                vErrors.push(err9);
              }
              errors++;
            }
            if (!pattern3.test(data6)) {
              const err10 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"' };
              if (vErrors === null) {
                vErrors = [err10];
              } else {
                vErrors.push(err10);
              }
              errors++;
            }
          } else {
            const err11 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            if (vErrors === null) {
              vErrors = [err11];
            } else {
              vErrors.push(err11);
            }
            errors++;
          }
        }
      } else {
        const err12 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
    }
    if (data.open !== void 0) {
      if (!validate70(data.open, { instancePath: instancePath + "/open", parentData: data, parentDataProperty: "open", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
    if (data.orient !== void 0) {
      if (!validate158(data.orient, { instancePath: instancePath + "/orient", parentData: data, parentDataProperty: "orient", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate158.errors : vErrors.concat(validate158.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err13 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err13];
    } else {
      vErrors.push(err13);
    }
    errors++;
  }
  validate165.errors = vErrors;
  return errors === 0;
}
validate165.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema46 = { "title": "LegThreePart", "description": "Four joints in a row with three bones, as of a hind leg: joint-by-joint controls, a goal control with a reach solver that folds all bends together, a pole vector control, a blend between the two ways, and an attribute that moves the fold between knee and hock.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "leg_three", "description": "A leg that bends twice." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the leg hangs on.", "examples": ["hips"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 4, "maxItems": 4, "description": "Hip, knee, hock and end.", "examples": [["hip", "knee", "hock", "paw"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 4, "maxItems": 4, "description": "Names of the four joints. Without it they take their landmarks' names, else upper, middle, lower, end.", "examples": [["hip", "knee", "hock", "paw"]] }, "goal": { "$ref": "#/$defs/word", "default": "goal", "description": "Name of the goal control.", "examples": ["paw"] }, "goal_parent": { "$ref": "#/$defs/id", "description": "Joint or control that goal and pole follow; without it they follow the root only.", "examples": ["hips"] }, "pole": { "type": "object", "additionalProperties": false, "description": "The pole vector control.", "properties": { "distance": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Distance from the line start\u2013end through the bend, as a factor on the limb's length.", "examples": [1], "x-unit": "limb lengths" }, "guide_line": { "type": "boolean", "default": true, "description": "Draws a guide line from the pole control to the joint it leads.", "examples": [true] } }, "default": { "distance": 1, "guide_line": true }, "examples": [{ "distance": 0.8 }] }, "bend": { "$ref": "#/$defs/Point", "description": "Direction in which the middle joint should lead when the limb is straight at rest.", "examples": [[0, 0, -1]] }, "reach": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Value at rest of the goal control's attribute reach: 0 turns joint by joint, 1 follows the goal.", "examples": [1] }, "stretch": { "type": "object", "additionalProperties": false, "description": "Lets bones grow toward a goal out of reach; the goal control's attribute stretch turns it on.", "properties": { "limit": { "$ref": "#/$defs/NumberOrExpression", "default": 1.5, "description": "Greatest factor on the bones' length.", "examples": [1.5], "x-unit": "factor" }, "value": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Value at rest of the attribute stretch: 0 keeps lengths, 1 grows.", "examples": [0] } }, "examples": [{ "limit": 1.5, "value": 1 }] }, "soft": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Share of the limb's length over which its end slows down before full reach. The zone never begins before the reach at rest.", "examples": [0.05], "x-unit": "limb lengths" }, "spaces": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 40, "description": "What may carry the control.", "examples": [["root", "spine.chest"]] }, "default": {}, "description": "What may carry the goal control (by its name) and the pole control (pole); each gets an attribute space.", "examples": [{ "hand": ["root", "spine.chest", "spine.hips"] }] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the joints turn, by name; joint-by-joint controls are limited alike.", "examples": [{ "elbow": { "rz": { "min": 0, "max": 140 } } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
function validate174(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate174.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.points === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "points" }, message: "must have required property 'points'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema46.properties, key0)) {
        const err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("leg_three" !== data.kind) {
        const err3 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "leg_three" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.points !== void 0) {
      let data3 = data.points;
      if (Array.isArray(data3)) {
        if (data3.length > 4) {
          const err4 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/maxItems", keyword: "maxItems", params: { limit: 4 }, message: "must NOT have more than 4 items" };
          if (vErrors === null) {
            vErrors = [err4];
          } else {
            vErrors.push(err4);
          }
          errors++;
        }
        if (data3.length < 4) {
          const err5 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/minItems", keyword: "minItems", params: { limit: 4 }, message: "must NOT have fewer than 4 items" };
          if (vErrors === null) {
            vErrors = [err5];
          } else {
            vErrors.push(err5);
          }
          errors++;
        }
        const len0 = data3.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate95(data3[i0], { instancePath: instancePath + "/points/" + i0, parentData: data3, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err6 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
    }
    if (data.names !== void 0) {
      let data5 = data.names;
      if (Array.isArray(data5)) {
        if (data5.length > 4) {
          const err7 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/maxItems", keyword: "maxItems", params: { limit: 4 }, message: "must NOT have more than 4 items" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
        if (data5.length < 4) {
          const err8 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/minItems", keyword: "minItems", params: { limit: 4 }, message: "must NOT have fewer than 4 items" };
          if (vErrors === null) {
            vErrors = [err8];
          } else {
            vErrors.push(err8);
          }
          errors++;
        }
        const len1 = data5.length;
        for (let i1 = 0; i1 < len1; i1++) {
          let data6 = data5[i1];
          if (typeof data6 === "string") {
            if (func2(data6) > 60) {
              const err9 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
              if (vErrors === null) {
                vErrors = [err9];
              } else {
                vErrors.push(err9);
              }
              errors++;
            }
            if (!pattern3.test(data6)) {
              const err10 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"' };
              if (vErrors === null) {
                vErrors = [err10];
              } else {
                vErrors.push(err10);
              }
              errors++;
            }
          } else {
            const err11 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            if (vErrors === null) {
              vErrors = [err11];
            } else {
              vErrors.push(err11);
            }
            errors++;
          }
        }
      } else {
        const err12 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
    }
    if (data.goal !== void 0) {
      if (!validate53(data.goal, { instancePath: instancePath + "/goal", parentData: data, parentDataProperty: "goal", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.goal_parent !== void 0) {
      if (!validate88(data.goal_parent, { instancePath: instancePath + "/goal_parent", parentData: data, parentDataProperty: "goal_parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.pole !== void 0) {
      let data9 = data.pole;
      if (data9 && typeof data9 == "object" && !Array.isArray(data9)) {
        for (const key1 in data9) {
          if (!(key1 === "distance" || key1 === "guide_line")) {
            const err13 = { instancePath: instancePath + "/pole", schemaPath: "#/properties/pole/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            if (vErrors === null) {
              vErrors = [err13];
            } else {
              vErrors.push(err13);
            }
            errors++;
          }
        }
        if (data9.distance !== void 0) {
          if (!validate70(data9.distance, { instancePath: instancePath + "/pole/distance", parentData: data9, parentDataProperty: "distance", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
            errors = vErrors.length;
          }
        }
        if (data9.guide_line !== void 0) {
          if (typeof data9.guide_line !== "boolean") {
            const err14 = { instancePath: instancePath + "/pole/guide_line", schemaPath: "#/properties/pole/properties/guide_line/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
            if (vErrors === null) {
              vErrors = [err14];
            } else {
              vErrors.push(err14);
            }
            errors++;
          }
        }
      } else {
        const err15 = { instancePath: instancePath + "/pole", schemaPath: "#/properties/pole/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err15];
        } else {
          vErrors.push(err15);
        }
        errors++;
      }
    }
    if (data.bend !== void 0) {
      if (!validate69(data.bend, { instancePath: instancePath + "/bend", parentData: data, parentDataProperty: "bend", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate69.errors : vErrors.concat(validate69.errors);
        errors = vErrors.length;
      }
    }
    if (data.reach !== void 0) {
      if (!validate70(data.reach, { instancePath: instancePath + "/reach", parentData: data, parentDataProperty: "reach", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.stretch !== void 0) {
      let data14 = data.stretch;
      if (data14 && typeof data14 == "object" && !Array.isArray(data14)) {
        for (const key2 in data14) {
          if (!(key2 === "limit" || key2 === "value")) {
            const err16 = { instancePath: instancePath + "/stretch", schemaPath: "#/properties/stretch/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key2 }, message: "must NOT have additional properties" };
            if (vErrors === null) {
              vErrors = [err16];
            } else {
              vErrors.push(err16);
            }
            errors++;
          }
        }
        if (data14.limit !== void 0) {
          if (!validate70(data14.limit, { instancePath: instancePath + "/stretch/limit", parentData: data14, parentDataProperty: "limit", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
            errors = vErrors.length;
          }
        }
        if (data14.value !== void 0) {
          if (!validate70(data14.value, { instancePath: instancePath + "/stretch/value", parentData: data14, parentDataProperty: "value", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err17 = { instancePath: instancePath + "/stretch", schemaPath: "#/properties/stretch/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err17];
        } else {
          vErrors.push(err17);
        }
        errors++;
      }
    }
    if (data.soft !== void 0) {
      if (!validate70(data.soft, { instancePath: instancePath + "/soft", parentData: data, parentDataProperty: "soft", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.spaces !== void 0) {
      let data18 = data.spaces;
      if (data18 && typeof data18 == "object" && !Array.isArray(data18)) {
        for (const key3 in data18) {
          const _errs30 = errors;
          if (!validate53(key3, { instancePath: instancePath + "/spaces", parentData: data18, parentDataProperty: "spaces", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid7 = _errs30 === errors;
          if (!valid7) {
            const err18 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/propertyNames", keyword: "propertyNames", params: { propertyName: key3 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err18];
            } else {
              vErrors.push(err18);
            }
            errors++;
          }
        }
        for (const key4 in data18) {
          let data19 = data18[key4];
          if (Array.isArray(data19)) {
            if (data19.length > 40) {
              const err19 = { instancePath: instancePath + "/spaces/" + key4.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/spaces/additionalProperties/maxItems", keyword: "maxItems", params: { limit: 40 }, message: "must NOT have more than 40 items" };
              if (vErrors === null) {
                vErrors = [err19];
              } else {
                vErrors.push(err19);
              }
              errors++;
            }
            if (data19.length < 1) {
              const err20 = { instancePath: instancePath + "/spaces/" + key4.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/spaces/additionalProperties/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
              if (vErrors === null) {
                vErrors = [err20];
              } else {
                vErrors.push(err20);
              }
              errors++;
            }
            const len2 = data19.length;
            for (let i2 = 0; i2 < len2; i2++) {
              if (!validate88(data19[i2], { instancePath: instancePath + "/spaces/" + key4.replace(/~/g, "~0").replace(/\//g, "~1") + "/" + i2, parentData: data19, parentDataProperty: i2, rootData, dynamicAnchors })) {
                vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
                errors = vErrors.length;
              }
            }
          } else {
            const err21 = { instancePath: instancePath + "/spaces/" + key4.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/spaces/additionalProperties/type", keyword: "type", params: { type: "array" }, message: "must be array" };
            if (vErrors === null) {
              vErrors = [err21];
            } else {
              vErrors.push(err21);
            }
            errors++;
          }
        }
      } else {
        const err22 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err22];
        } else {
          vErrors.push(err22);
        }
        errors++;
      }
    }
    if (data.limits !== void 0) {
      let data21 = data.limits;
      if (data21 && typeof data21 == "object" && !Array.isArray(data21)) {
        for (const key5 in data21) {
          const _errs37 = errors;
          if (typeof key5 === "string") {
            if (func2(key5) > 60) {
              const err23 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters", propertyName: key5 };
              if (vErrors === null) {
                vErrors = [err23];
              } else {
                vErrors.push(err23);
              }
              errors++;
            }
            if (!pattern15.test(key5)) {
              const err24 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z0-9_]+$" }, message: 'must match pattern "^[a-z0-9_]+$"', propertyName: key5 };
              if (vErrors === null) {
                vErrors = [err24];
              } else {
                vErrors.push(err24);
              }
              errors++;
            }
          } else {
            const err25 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key5 };
            if (vErrors === null) {
              vErrors = [err25];
            } else {
              vErrors.push(err25);
            }
            errors++;
          }
          var valid11 = _errs37 === errors;
          if (!valid11) {
            const err26 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames", keyword: "propertyNames", params: { propertyName: key5 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err26];
            } else {
              vErrors.push(err26);
            }
            errors++;
          }
        }
        for (const key6 in data21) {
          if (!validate114(data21[key6], { instancePath: instancePath + "/limits/" + key6.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data21, parentDataProperty: key6, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate114.errors : vErrors.concat(validate114.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err27 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err27];
        } else {
          vErrors.push(err27);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err28 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err28];
    } else {
      vErrors.push(err28);
    }
    errors++;
  }
  validate174.errors = vErrors;
  return errors === 0;
}
validate174.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema47 = { "title": "LimbPart", "description": "Three joints in a row that bend in the middle: joint-by-joint controls, a goal control with two-bone inverse kinematics, a pole vector control with its guide line, a blend between the two ways, and on request twist joints, stretch, soft reach and spaces.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "limb", "description": "An arm, a leg, or anything else that bends once." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the limb hangs on.", "examples": ["spine.chest"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 3, "maxItems": 3, "description": "Start, bend and end.", "examples": [["shoulder", "elbow", "wrist"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 3, "maxItems": 3, "description": "Names of the three joints. Without it they take their landmarks' names, else upper, lower, end.", "examples": [["upper", "lower", "end"]] }, "goal": { "$ref": "#/$defs/word", "default": "goal", "description": "Name of the goal control.", "examples": ["hand"] }, "goal_parent": { "$ref": "#/$defs/id", "description": "Joint or control that goal and pole follow; without it they follow the root only.", "examples": ["hips"] }, "pole": { "type": "object", "additionalProperties": false, "description": "The pole vector control.", "properties": { "distance": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Distance from the line start\u2013end through the bend, as a factor on the limb's length.", "examples": [1], "x-unit": "limb lengths" }, "guide_line": { "type": "boolean", "default": true, "description": "Draws a guide line from the pole control to the joint it leads.", "examples": [true] } }, "default": { "distance": 1, "guide_line": true }, "examples": [{ "distance": 0.8 }] }, "bend": { "$ref": "#/$defs/Point", "description": "Direction in which the middle joint should lead when the limb is straight at rest.", "examples": [[0, 0, -1]] }, "reach": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Value at rest of the goal control's attribute reach: 0 turns joint by joint, 1 follows the goal.", "examples": [1] }, "stretch": { "type": "object", "additionalProperties": false, "description": "Lets bones grow toward a goal out of reach; the goal control's attribute stretch turns it on.", "properties": { "limit": { "$ref": "#/$defs/NumberOrExpression", "default": 1.5, "description": "Greatest factor on the bones' length.", "examples": [1.5], "x-unit": "factor" }, "value": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Value at rest of the attribute stretch: 0 keeps lengths, 1 grows.", "examples": [0] } }, "examples": [{ "limit": 1.5, "value": 1 }] }, "soft": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Share of the limb's length over which its end slows down before full reach. The zone never begins before the reach at rest.", "examples": [0.05], "x-unit": "limb lengths" }, "spaces": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 40, "description": "What may carry the control.", "examples": [["root", "spine.chest"]] }, "default": {}, "description": "What may carry the goal control (by its name) and the pole control (pole); each gets an attribute space.", "examples": [{ "hand": ["root", "spine.chest", "spine.hips"] }] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the joints turn, by name; joint-by-joint controls are limited alike.", "examples": [{ "elbow": { "rz": { "min": 0, "max": 140 } } }] }, "twist": { "type": "object", "additionalProperties": false, "description": "Counts of joints that share the twist along each bone.", "properties": { "upper": { "type": "integer", "minimum": 0, "maximum": 20, "default": 0, "description": "Joints along the upper bone, which let the twist at its root fade in. Needs parent.", "examples": [2] }, "lower": { "type": "integer", "minimum": 0, "maximum": 20, "default": 0, "description": "Joints along the lower bone, which let the twist of the end fade out.", "examples": [3] } }, "default": {}, "examples": [{ "upper": 2, "lower": 3 }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
function validate192(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate192.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.points === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "points" }, message: "must have required property 'points'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema47.properties, key0)) {
        const err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("limb" !== data.kind) {
        const err3 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "limb" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.points !== void 0) {
      let data3 = data.points;
      if (Array.isArray(data3)) {
        if (data3.length > 3) {
          const err4 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/maxItems", keyword: "maxItems", params: { limit: 3 }, message: "must NOT have more than 3 items" };
          if (vErrors === null) {
            vErrors = [err4];
          } else {
            vErrors.push(err4);
          }
          errors++;
        }
        if (data3.length < 3) {
          const err5 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/minItems", keyword: "minItems", params: { limit: 3 }, message: "must NOT have fewer than 3 items" };
          if (vErrors === null) {
            vErrors = [err5];
          } else {
            vErrors.push(err5);
          }
          errors++;
        }
        const len0 = data3.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate95(data3[i0], { instancePath: instancePath + "/points/" + i0, parentData: data3, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err6 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
    }
    if (data.names !== void 0) {
      let data5 = data.names;
      if (Array.isArray(data5)) {
        if (data5.length > 3) {
          const err7 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/maxItems", keyword: "maxItems", params: { limit: 3 }, message: "must NOT have more than 3 items" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
        if (data5.length < 3) {
          const err8 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/minItems", keyword: "minItems", params: { limit: 3 }, message: "must NOT have fewer than 3 items" };
          if (vErrors === null) {
            vErrors = [err8];
          } else {
            vErrors.push(err8);
          }
          errors++;
        }
        const len1 = data5.length;
        for (let i1 = 0; i1 < len1; i1++) {
          let data6 = data5[i1];
          if (typeof data6 === "string") {
            if (func2(data6) > 60) {
              const err9 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
              if (vErrors === null) {
                vErrors = [err9];
              } else {
                vErrors.push(err9);
              }
              errors++;
            }
            if (!pattern3.test(data6)) {
              const err10 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"' };
              if (vErrors === null) {
                vErrors = [err10];
              } else {
                vErrors.push(err10);
              }
              errors++;
            }
          } else {
            const err11 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            if (vErrors === null) {
              vErrors = [err11];
            } else {
              vErrors.push(err11);
            }
            errors++;
          }
        }
      } else {
        const err12 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
    }
    if (data.goal !== void 0) {
      if (!validate53(data.goal, { instancePath: instancePath + "/goal", parentData: data, parentDataProperty: "goal", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.goal_parent !== void 0) {
      if (!validate88(data.goal_parent, { instancePath: instancePath + "/goal_parent", parentData: data, parentDataProperty: "goal_parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.pole !== void 0) {
      let data9 = data.pole;
      if (data9 && typeof data9 == "object" && !Array.isArray(data9)) {
        for (const key1 in data9) {
          if (!(key1 === "distance" || key1 === "guide_line")) {
            const err13 = { instancePath: instancePath + "/pole", schemaPath: "#/properties/pole/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            if (vErrors === null) {
              vErrors = [err13];
            } else {
              vErrors.push(err13);
            }
            errors++;
          }
        }
        if (data9.distance !== void 0) {
          if (!validate70(data9.distance, { instancePath: instancePath + "/pole/distance", parentData: data9, parentDataProperty: "distance", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
            errors = vErrors.length;
          }
        }
        if (data9.guide_line !== void 0) {
          if (typeof data9.guide_line !== "boolean") {
            const err14 = { instancePath: instancePath + "/pole/guide_line", schemaPath: "#/properties/pole/properties/guide_line/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
            if (vErrors === null) {
              vErrors = [err14];
            } else {
              vErrors.push(err14);
            }
            errors++;
          }
        }
      } else {
        const err15 = { instancePath: instancePath + "/pole", schemaPath: "#/properties/pole/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err15];
        } else {
          vErrors.push(err15);
        }
        errors++;
      }
    }
    if (data.bend !== void 0) {
      if (!validate69(data.bend, { instancePath: instancePath + "/bend", parentData: data, parentDataProperty: "bend", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate69.errors : vErrors.concat(validate69.errors);
        errors = vErrors.length;
      }
    }
    if (data.reach !== void 0) {
      if (!validate70(data.reach, { instancePath: instancePath + "/reach", parentData: data, parentDataProperty: "reach", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.stretch !== void 0) {
      let data14 = data.stretch;
      if (data14 && typeof data14 == "object" && !Array.isArray(data14)) {
        for (const key2 in data14) {
          if (!(key2 === "limit" || key2 === "value")) {
            const err16 = { instancePath: instancePath + "/stretch", schemaPath: "#/properties/stretch/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key2 }, message: "must NOT have additional properties" };
            if (vErrors === null) {
              vErrors = [err16];
            } else {
              vErrors.push(err16);
            }
            errors++;
          }
        }
        if (data14.limit !== void 0) {
          if (!validate70(data14.limit, { instancePath: instancePath + "/stretch/limit", parentData: data14, parentDataProperty: "limit", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
            errors = vErrors.length;
          }
        }
        if (data14.value !== void 0) {
          if (!validate70(data14.value, { instancePath: instancePath + "/stretch/value", parentData: data14, parentDataProperty: "value", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err17 = { instancePath: instancePath + "/stretch", schemaPath: "#/properties/stretch/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err17];
        } else {
          vErrors.push(err17);
        }
        errors++;
      }
    }
    if (data.soft !== void 0) {
      if (!validate70(data.soft, { instancePath: instancePath + "/soft", parentData: data, parentDataProperty: "soft", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.spaces !== void 0) {
      let data18 = data.spaces;
      if (data18 && typeof data18 == "object" && !Array.isArray(data18)) {
        for (const key3 in data18) {
          const _errs30 = errors;
          if (!validate53(key3, { instancePath: instancePath + "/spaces", parentData: data18, parentDataProperty: "spaces", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid7 = _errs30 === errors;
          if (!valid7) {
            const err18 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/propertyNames", keyword: "propertyNames", params: { propertyName: key3 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err18];
            } else {
              vErrors.push(err18);
            }
            errors++;
          }
        }
        for (const key4 in data18) {
          let data19 = data18[key4];
          if (Array.isArray(data19)) {
            if (data19.length > 40) {
              const err19 = { instancePath: instancePath + "/spaces/" + key4.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/spaces/additionalProperties/maxItems", keyword: "maxItems", params: { limit: 40 }, message: "must NOT have more than 40 items" };
              if (vErrors === null) {
                vErrors = [err19];
              } else {
                vErrors.push(err19);
              }
              errors++;
            }
            if (data19.length < 1) {
              const err20 = { instancePath: instancePath + "/spaces/" + key4.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/spaces/additionalProperties/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
              if (vErrors === null) {
                vErrors = [err20];
              } else {
                vErrors.push(err20);
              }
              errors++;
            }
            const len2 = data19.length;
            for (let i2 = 0; i2 < len2; i2++) {
              if (!validate88(data19[i2], { instancePath: instancePath + "/spaces/" + key4.replace(/~/g, "~0").replace(/\//g, "~1") + "/" + i2, parentData: data19, parentDataProperty: i2, rootData, dynamicAnchors })) {
                vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
                errors = vErrors.length;
              }
            }
          } else {
            const err21 = { instancePath: instancePath + "/spaces/" + key4.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/spaces/additionalProperties/type", keyword: "type", params: { type: "array" }, message: "must be array" };
            if (vErrors === null) {
              vErrors = [err21];
            } else {
              vErrors.push(err21);
            }
            errors++;
          }
        }
      } else {
        const err22 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err22];
        } else {
          vErrors.push(err22);
        }
        errors++;
      }
    }
    if (data.limits !== void 0) {
      let data21 = data.limits;
      if (data21 && typeof data21 == "object" && !Array.isArray(data21)) {
        for (const key5 in data21) {
          const _errs37 = errors;
          if (typeof key5 === "string") {
            if (func2(key5) > 60) {
              const err23 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters", propertyName: key5 };
              if (vErrors === null) {
                vErrors = [err23];
              } else {
                vErrors.push(err23);
              }
              errors++;
            }
            if (!pattern15.test(key5)) {
              const err24 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z0-9_]+$" }, message: 'must match pattern "^[a-z0-9_]+$"', propertyName: key5 };
              if (vErrors === null) {
                vErrors = [err24];
              } else {
                vErrors.push(err24);
              }
              errors++;
            }
          } else {
            const err25 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key5 };
            if (vErrors === null) {
              vErrors = [err25];
            } else {
              vErrors.push(err25);
            }
            errors++;
          }
          var valid11 = _errs37 === errors;
          if (!valid11) {
            const err26 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames", keyword: "propertyNames", params: { propertyName: key5 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err26];
            } else {
              vErrors.push(err26);
            }
            errors++;
          }
        }
        for (const key6 in data21) {
          if (!validate114(data21[key6], { instancePath: instancePath + "/limits/" + key6.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data21, parentDataProperty: key6, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate114.errors : vErrors.concat(validate114.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err27 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err27];
        } else {
          vErrors.push(err27);
        }
        errors++;
      }
    }
    if (data.twist !== void 0) {
      let data23 = data.twist;
      if (data23 && typeof data23 == "object" && !Array.isArray(data23)) {
        for (const key7 in data23) {
          if (!(key7 === "upper" || key7 === "lower")) {
            const err28 = { instancePath: instancePath + "/twist", schemaPath: "#/properties/twist/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key7 }, message: "must NOT have additional properties" };
            if (vErrors === null) {
              vErrors = [err28];
            } else {
              vErrors.push(err28);
            }
            errors++;
          }
        }
        if (data23.upper !== void 0) {
          let data24 = data23.upper;
          if (!(typeof data24 == "number" && (!(data24 % 1) && !isNaN(data24)) && isFinite(data24))) {
            const err29 = { instancePath: instancePath + "/twist/upper", schemaPath: "#/properties/twist/properties/upper/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            if (vErrors === null) {
              vErrors = [err29];
            } else {
              vErrors.push(err29);
            }
            errors++;
          }
          if (typeof data24 == "number" && isFinite(data24)) {
            if (data24 > 20 || isNaN(data24)) {
              const err30 = { instancePath: instancePath + "/twist/upper", schemaPath: "#/properties/twist/properties/upper/maximum", keyword: "maximum", params: { comparison: "<=", limit: 20 }, message: "must be <= 20" };
              if (vErrors === null) {
                vErrors = [err30];
              } else {
                vErrors.push(err30);
              }
              errors++;
            }
            if (data24 < 0 || isNaN(data24)) {
              const err31 = { instancePath: instancePath + "/twist/upper", schemaPath: "#/properties/twist/properties/upper/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
              if (vErrors === null) {
                vErrors = [err31];
              } else {
                vErrors.push(err31);
              }
              errors++;
            }
          }
        }
        if (data23.lower !== void 0) {
          let data25 = data23.lower;
          if (!(typeof data25 == "number" && (!(data25 % 1) && !isNaN(data25)) && isFinite(data25))) {
            const err32 = { instancePath: instancePath + "/twist/lower", schemaPath: "#/properties/twist/properties/lower/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            if (vErrors === null) {
              vErrors = [err32];
            } else {
              vErrors.push(err32);
            }
            errors++;
          }
          if (typeof data25 == "number" && isFinite(data25)) {
            if (data25 > 20 || isNaN(data25)) {
              const err33 = { instancePath: instancePath + "/twist/lower", schemaPath: "#/properties/twist/properties/lower/maximum", keyword: "maximum", params: { comparison: "<=", limit: 20 }, message: "must be <= 20" };
              if (vErrors === null) {
                vErrors = [err33];
              } else {
                vErrors.push(err33);
              }
              errors++;
            }
            if (data25 < 0 || isNaN(data25)) {
              const err34 = { instancePath: instancePath + "/twist/lower", schemaPath: "#/properties/twist/properties/lower/minimum", keyword: "minimum", params: { comparison: ">=", limit: 0 }, message: "must be >= 0" };
              if (vErrors === null) {
                vErrors = [err34];
              } else {
                vErrors.push(err34);
              }
              errors++;
            }
          }
        }
      } else {
        const err35 = { instancePath: instancePath + "/twist", schemaPath: "#/properties/twist/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err35];
        } else {
          vErrors.push(err35);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err36 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err36];
    } else {
      vErrors.push(err36);
    }
    errors++;
  }
  validate192.errors = vErrors;
  return errors === 0;
}
validate192.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema48 = { "title": "NeckHeadPart", "description": "A neck of joints that are turned one by one, and a head on it that can keep its direction against the body.", "type": "object", "required": ["kind", "from", "to", "crown"], "additionalProperties": false, "properties": { "kind": { "const": "neck_head", "description": "Neck and head." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the neck hangs on.", "examples": ["spine.chest"] }, "from": { "$ref": "#/$defs/Place", "description": "Root of the neck.", "examples": ["neck"] }, "to": { "$ref": "#/$defs/Place", "description": "Where the head turns on the neck.", "examples": ["skull"] }, "crown": { "$ref": "#/$defs/Place", "description": "Top of the head.", "examples": ["crown"] }, "joints": { "type": "integer", "minimum": 1, "maximum": 60, "default": 2, "description": "Count of joints of the neck, the head's own not counted.", "examples": [2] }, "via": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 1, "maxItems": 50, "description": "Places the neck runs through on the way.", "examples": [["neck_bend"]] }, "spaces": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 40, "description": "What may turn the head beside the neck; the attribute space chooses.", "examples": [["root", "spine.chest"]] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far the head turns, under the name head; its control is limited alike.", "examples": [{ "head": { "ry": { "min": -70, "max": 70 } } }] }, "guide_line": { "type": "boolean", "default": false, "description": "Draws a guide line from the head control to the crown.", "examples": [true] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
function validate210(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate210.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.from === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "from" }, message: "must have required property 'from'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (data.to === void 0) {
      const err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "to" }, message: "must have required property 'to'" };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
    if (data.crown === void 0) {
      const err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "crown" }, message: "must have required property 'crown'" };
      if (vErrors === null) {
        vErrors = [err3];
      } else {
        vErrors.push(err3);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema48.properties, key0)) {
        const err4 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("neck_head" !== data.kind) {
        const err5 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "neck_head" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.from !== void 0) {
      if (!validate95(data.from, { instancePath: instancePath + "/from", parentData: data, parentDataProperty: "from", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.to !== void 0) {
      if (!validate95(data.to, { instancePath: instancePath + "/to", parentData: data, parentDataProperty: "to", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.crown !== void 0) {
      if (!validate95(data.crown, { instancePath: instancePath + "/crown", parentData: data, parentDataProperty: "crown", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.joints !== void 0) {
      let data6 = data.joints;
      if (!(typeof data6 == "number" && (!(data6 % 1) && !isNaN(data6)) && isFinite(data6))) {
        const err6 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
      if (typeof data6 == "number" && isFinite(data6)) {
        if (data6 > 60 || isNaN(data6)) {
          const err7 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/maximum", keyword: "maximum", params: { comparison: "<=", limit: 60 }, message: "must be <= 60" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
        if (data6 < 1 || isNaN(data6)) {
          const err8 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
          if (vErrors === null) {
            vErrors = [err8];
          } else {
            vErrors.push(err8);
          }
          errors++;
        }
      }
    }
    if (data.via !== void 0) {
      let data7 = data.via;
      if (Array.isArray(data7)) {
        if (data7.length > 50) {
          const err9 = { instancePath: instancePath + "/via", schemaPath: "#/properties/via/maxItems", keyword: "maxItems", params: { limit: 50 }, message: "must NOT have more than 50 items" };
          if (vErrors === null) {
            vErrors = [err9];
          } else {
            vErrors.push(err9);
          }
          errors++;
        }
        if (data7.length < 1) {
          const err10 = { instancePath: instancePath + "/via", schemaPath: "#/properties/via/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          if (vErrors === null) {
            vErrors = [err10];
          } else {
            vErrors.push(err10);
          }
          errors++;
        }
        const len0 = data7.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate95(data7[i0], { instancePath: instancePath + "/via/" + i0, parentData: data7, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err11 = { instancePath: instancePath + "/via", schemaPath: "#/properties/via/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err11];
        } else {
          vErrors.push(err11);
        }
        errors++;
      }
    }
    if (data.spaces !== void 0) {
      let data9 = data.spaces;
      if (Array.isArray(data9)) {
        if (data9.length > 40) {
          const err12 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/maxItems", keyword: "maxItems", params: { limit: 40 }, message: "must NOT have more than 40 items" };
          if (vErrors === null) {
            vErrors = [err12];
          } else {
            vErrors.push(err12);
          }
          errors++;
        }
        if (data9.length < 1) {
          const err13 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          if (vErrors === null) {
            vErrors = [err13];
          } else {
            vErrors.push(err13);
          }
          errors++;
        }
        const len1 = data9.length;
        for (let i1 = 0; i1 < len1; i1++) {
          if (!validate88(data9[i1], { instancePath: instancePath + "/spaces/" + i1, parentData: data9, parentDataProperty: i1, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err14 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err14];
        } else {
          vErrors.push(err14);
        }
        errors++;
      }
    }
    if (data.limits !== void 0) {
      let data11 = data.limits;
      if (data11 && typeof data11 == "object" && !Array.isArray(data11)) {
        for (const key1 in data11) {
          const _errs18 = errors;
          if (typeof key1 === "string") {
            if (func2(key1) > 60) {
              const err15 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters", propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err15];
              } else {
                vErrors.push(err15);
              }
              errors++;
            }
            if (!pattern15.test(key1)) {
              const err16 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z0-9_]+$" }, message: 'must match pattern "^[a-z0-9_]+$"', propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err16];
              } else {
                vErrors.push(err16);
              }
              errors++;
            }
          } else {
            const err17 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key1 };
            if (vErrors === null) {
              vErrors = [err17];
            } else {
              vErrors.push(err17);
            }
            errors++;
          }
          var valid5 = _errs18 === errors;
          if (!valid5) {
            const err18 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err18];
            } else {
              vErrors.push(err18);
            }
            errors++;
          }
        }
        for (const key2 in data11) {
          if (!validate114(data11[key2], { instancePath: instancePath + "/limits/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data11, parentDataProperty: key2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate114.errors : vErrors.concat(validate114.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err19 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err19];
        } else {
          vErrors.push(err19);
        }
        errors++;
      }
    }
    if (data.guide_line !== void 0) {
      if (typeof data.guide_line !== "boolean") {
        const err20 = { instancePath: instancePath + "/guide_line", schemaPath: "#/properties/guide_line/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err20];
        } else {
          vErrors.push(err20);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.orient !== void 0) {
      if (!validate158(data.orient, { instancePath: instancePath + "/orient", parentData: data, parentDataProperty: "orient", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate158.errors : vErrors.concat(validate158.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err21 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err21];
    } else {
      vErrors.push(err21);
    }
    errors++;
  }
  validate210.errors = vErrors;
  return errors === 0;
}
validate210.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema49 = { "title": "RootPart", "description": "The control that carries the whole rig; on request with a root joint beneath it.", "type": "object", "required": ["kind"], "additionalProperties": false, "properties": { "kind": { "const": "root", "description": "The carrier of the rig." }, "at": { "$ref": "#/$defs/Place", "description": "Where it stands.", "examples": [[0, 0, 0]], "default": [0, 0, 0] }, "shape": { "enum": ["ring", "square", "diamond", "cross", "arrow", "ball", "box", "pin", "compass"], "default": "compass", "description": "Shape of the control.", "examples": ["compass"] }, "size": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Factor on its size.", "examples": [1.2] }, "joint": { "type": "boolean", "default": false, "description": "Makes a joint at the root that follows the control, as some receivers of skeletons want.", "examples": [true] } } };
function validate222(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate222.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!(key0 === "kind" || key0 === "at" || key0 === "shape" || key0 === "size" || key0 === "joint")) {
        const err1 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("root" !== data.kind) {
        const err2 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "root" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.at !== void 0) {
      if (!validate95(data.at, { instancePath: instancePath + "/at", parentData: data, parentDataProperty: "at", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.shape !== void 0) {
      let data2 = data.shape;
      if (!(data2 === "ring" || data2 === "square" || data2 === "diamond" || data2 === "cross" || data2 === "arrow" || data2 === "ball" || data2 === "box" || data2 === "pin" || data2 === "compass")) {
        const err3 = { instancePath: instancePath + "/shape", schemaPath: "#/properties/shape/enum", keyword: "enum", params: { allowedValues: schema49.properties.shape.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.size !== void 0) {
      if (!validate70(data.size, { instancePath: instancePath + "/size", parentData: data, parentDataProperty: "size", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.joint !== void 0) {
      if (typeof data.joint !== "boolean") {
        const err4 = { instancePath: instancePath + "/joint", schemaPath: "#/properties/joint/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
  } else {
    const err5 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err5];
    } else {
      vErrors.push(err5);
    }
    errors++;
  }
  validate222.errors = vErrors;
  return errors === 0;
}
validate222.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema50 = { "title": "SpinePart", "description": "A row of joints along a curve between two ends: a control at each end that carries both place and direction of the curve, controls between them that follow both, a spline solver, stretch and volume.", "type": "object", "required": ["kind", "from", "to"], "additionalProperties": false, "properties": { "kind": { "const": "spine", "description": "A spine, or any bendy body between two ends." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the lower control follows.", "examples": ["root"] }, "from": { "$ref": "#/$defs/Place", "description": "Where it begins.", "examples": ["hips"] }, "to": { "$ref": "#/$defs/Place", "description": "Where it ends.", "examples": ["chest"] }, "via": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 1, "maxItems": 50, "description": "Places it runs through on the way.", "examples": [["waist"]] }, "joints": { "type": "integer", "minimum": 3, "maximum": 100, "default": 5, "description": "Count of joints, spread evenly by arc length.", "examples": [5] }, "controls": { "type": "integer", "minimum": 2, "maximum": 12, "default": 3, "description": "Count of controls: both ends and those between.", "examples": [3] }, "stretch": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Value at rest of the upper control's attribute stretch: 0 keeps lengths, 1 spreads the joints over the whole curve.", "examples": [0] }, "volume": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "Value at rest of the upper control's attribute volume: how far joints thicken and thin.", "examples": [0] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
function validate225(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate225.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.from === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "from" }, message: "must have required property 'from'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (data.to === void 0) {
      const err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "to" }, message: "must have required property 'to'" };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema50.properties, key0)) {
        const err3 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("spine" !== data.kind) {
        const err4 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "spine" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.from !== void 0) {
      if (!validate95(data.from, { instancePath: instancePath + "/from", parentData: data, parentDataProperty: "from", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.to !== void 0) {
      if (!validate95(data.to, { instancePath: instancePath + "/to", parentData: data, parentDataProperty: "to", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.via !== void 0) {
      let data5 = data.via;
      if (Array.isArray(data5)) {
        if (data5.length > 50) {
          const err5 = { instancePath: instancePath + "/via", schemaPath: "#/properties/via/maxItems", keyword: "maxItems", params: { limit: 50 }, message: "must NOT have more than 50 items" };
          if (vErrors === null) {
            vErrors = [err5];
          } else {
            vErrors.push(err5);
          }
          errors++;
        }
        if (data5.length < 1) {
          const err6 = { instancePath: instancePath + "/via", schemaPath: "#/properties/via/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
        const len0 = data5.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate95(data5[i0], { instancePath: instancePath + "/via/" + i0, parentData: data5, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err7 = { instancePath: instancePath + "/via", schemaPath: "#/properties/via/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err7];
        } else {
          vErrors.push(err7);
        }
        errors++;
      }
    }
    if (data.joints !== void 0) {
      let data7 = data.joints;
      if (!(typeof data7 == "number" && (!(data7 % 1) && !isNaN(data7)) && isFinite(data7))) {
        const err8 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
      if (typeof data7 == "number" && isFinite(data7)) {
        if (data7 > 100 || isNaN(data7)) {
          const err9 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/maximum", keyword: "maximum", params: { comparison: "<=", limit: 100 }, message: "must be <= 100" };
          if (vErrors === null) {
            vErrors = [err9];
          } else {
            vErrors.push(err9);
          }
          errors++;
        }
        if (data7 < 3 || isNaN(data7)) {
          const err10 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/minimum", keyword: "minimum", params: { comparison: ">=", limit: 3 }, message: "must be >= 3" };
          if (vErrors === null) {
            vErrors = [err10];
          } else {
            vErrors.push(err10);
          }
          errors++;
        }
      }
    }
    if (data.controls !== void 0) {
      let data8 = data.controls;
      if (!(typeof data8 == "number" && (!(data8 % 1) && !isNaN(data8)) && isFinite(data8))) {
        const err11 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err11];
        } else {
          vErrors.push(err11);
        }
        errors++;
      }
      if (typeof data8 == "number" && isFinite(data8)) {
        if (data8 > 12 || isNaN(data8)) {
          const err12 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/maximum", keyword: "maximum", params: { comparison: "<=", limit: 12 }, message: "must be <= 12" };
          if (vErrors === null) {
            vErrors = [err12];
          } else {
            vErrors.push(err12);
          }
          errors++;
        }
        if (data8 < 2 || isNaN(data8)) {
          const err13 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/minimum", keyword: "minimum", params: { comparison: ">=", limit: 2 }, message: "must be >= 2" };
          if (vErrors === null) {
            vErrors = [err13];
          } else {
            vErrors.push(err13);
          }
          errors++;
        }
      }
    }
    if (data.stretch !== void 0) {
      if (!validate70(data.stretch, { instancePath: instancePath + "/stretch", parentData: data, parentDataProperty: "stretch", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.volume !== void 0) {
      if (!validate70(data.volume, { instancePath: instancePath + "/volume", parentData: data, parentDataProperty: "volume", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.orient !== void 0) {
      if (!validate158(data.orient, { instancePath: instancePath + "/orient", parentData: data, parentDataProperty: "orient", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate158.errors : vErrors.concat(validate158.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err14 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err14];
    } else {
      vErrors.push(err14);
    }
    errors++;
  }
  validate225.errors = vErrors;
  return errors === 0;
}
validate225.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema51 = { "title": "StrandPart", "description": "A tail, ear, tentacle or rope: joints spread evenly along a curve, each turned by a control that hangs on the one before, or all laid along a curve through a few controls.", "type": "object", "required": ["kind", "points", "joints"], "additionalProperties": false, "properties": { "kind": { "const": "strand", "description": "A row of joints." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the strand hangs on.", "examples": ["hips"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 500, "description": "Where the strand runs, from base to tip.", "examples": [["tail_base", "tail_tip"]] }, "joints": { "type": "integer", "minimum": 2, "maximum": 500, "description": "Count of joints, spread evenly by arc length.", "examples": [8] }, "curve": { "enum": ["smooth", "straight"], "default": "smooth", "description": "Whether joints follow a smooth curve through the points or straight lines.", "examples": ["smooth"] }, "steer": { "enum": ["joints", "spline"], "default": "joints", "description": "joints: one control for each joint. spline: a few controls shape a curve.", "examples": ["joints"] }, "controls": { "type": "integer", "minimum": 2, "maximum": 40, "default": 4, "description": "spline: count of controls along the strand.", "examples": [4] }, "stretch": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "spline: value at rest of the last control's attribute stretch: 0 keeps lengths, 1 spreads the joints over the whole curve.", "examples": [0] }, "shape": { "enum": ["ring", "square", "diamond", "cross", "arrow", "ball", "box", "pin", "compass"], "default": "ring", "description": "Shape of the controls.", "examples": ["ring"] }, "size": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Factor on the controls' size.", "examples": [1.2] }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "joints: how far each joint turns, by its name; controls are limited alike.", "examples": [{ "01": { "rz": { "min": -30, "max": 30 } } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
function validate236(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate236.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.points === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "points" }, message: "must have required property 'points'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (data.joints === void 0) {
      const err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "joints" }, message: "must have required property 'joints'" };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema51.properties, key0)) {
        const err3 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("strand" !== data.kind) {
        const err4 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "strand" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.points !== void 0) {
      let data3 = data.points;
      if (Array.isArray(data3)) {
        if (data3.length > 500) {
          const err5 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/maxItems", keyword: "maxItems", params: { limit: 500 }, message: "must NOT have more than 500 items" };
          if (vErrors === null) {
            vErrors = [err5];
          } else {
            vErrors.push(err5);
          }
          errors++;
        }
        if (data3.length < 2) {
          const err6 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
        const len0 = data3.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate95(data3[i0], { instancePath: instancePath + "/points/" + i0, parentData: data3, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err7 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err7];
        } else {
          vErrors.push(err7);
        }
        errors++;
      }
    }
    if (data.joints !== void 0) {
      let data5 = data.joints;
      if (!(typeof data5 == "number" && (!(data5 % 1) && !isNaN(data5)) && isFinite(data5))) {
        const err8 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
      if (typeof data5 == "number" && isFinite(data5)) {
        if (data5 > 500 || isNaN(data5)) {
          const err9 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/maximum", keyword: "maximum", params: { comparison: "<=", limit: 500 }, message: "must be <= 500" };
          if (vErrors === null) {
            vErrors = [err9];
          } else {
            vErrors.push(err9);
          }
          errors++;
        }
        if (data5 < 2 || isNaN(data5)) {
          const err10 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/minimum", keyword: "minimum", params: { comparison: ">=", limit: 2 }, message: "must be >= 2" };
          if (vErrors === null) {
            vErrors = [err10];
          } else {
            vErrors.push(err10);
          }
          errors++;
        }
      }
    }
    if (data.curve !== void 0) {
      let data6 = data.curve;
      if (!(data6 === "smooth" || data6 === "straight")) {
        const err11 = { instancePath: instancePath + "/curve", schemaPath: "#/properties/curve/enum", keyword: "enum", params: { allowedValues: schema51.properties.curve.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err11];
        } else {
          vErrors.push(err11);
        }
        errors++;
      }
    }
    if (data.steer !== void 0) {
      let data7 = data.steer;
      if (!(data7 === "joints" || data7 === "spline")) {
        const err12 = { instancePath: instancePath + "/steer", schemaPath: "#/properties/steer/enum", keyword: "enum", params: { allowedValues: schema51.properties.steer.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
    }
    if (data.controls !== void 0) {
      let data8 = data.controls;
      if (!(typeof data8 == "number" && (!(data8 % 1) && !isNaN(data8)) && isFinite(data8))) {
        const err13 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err13];
        } else {
          vErrors.push(err13);
        }
        errors++;
      }
      if (typeof data8 == "number" && isFinite(data8)) {
        if (data8 > 40 || isNaN(data8)) {
          const err14 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/maximum", keyword: "maximum", params: { comparison: "<=", limit: 40 }, message: "must be <= 40" };
          if (vErrors === null) {
            vErrors = [err14];
          } else {
            vErrors.push(err14);
          }
          errors++;
        }
        if (data8 < 2 || isNaN(data8)) {
          const err15 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/minimum", keyword: "minimum", params: { comparison: ">=", limit: 2 }, message: "must be >= 2" };
          if (vErrors === null) {
            vErrors = [err15];
          } else {
            vErrors.push(err15);
          }
          errors++;
        }
      }
    }
    if (data.stretch !== void 0) {
      if (!validate70(data.stretch, { instancePath: instancePath + "/stretch", parentData: data, parentDataProperty: "stretch", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.shape !== void 0) {
      let data10 = data.shape;
      if (!(data10 === "ring" || data10 === "square" || data10 === "diamond" || data10 === "cross" || data10 === "arrow" || data10 === "ball" || data10 === "box" || data10 === "pin" || data10 === "compass")) {
        const err16 = { instancePath: instancePath + "/shape", schemaPath: "#/properties/shape/enum", keyword: "enum", params: { allowedValues: schema51.properties.shape.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err16];
        } else {
          vErrors.push(err16);
        }
        errors++;
      }
    }
    if (data.size !== void 0) {
      if (!validate70(data.size, { instancePath: instancePath + "/size", parentData: data, parentDataProperty: "size", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.limits !== void 0) {
      let data12 = data.limits;
      if (data12 && typeof data12 == "object" && !Array.isArray(data12)) {
        for (const key1 in data12) {
          const _errs19 = errors;
          if (typeof key1 === "string") {
            if (func2(key1) > 60) {
              const err17 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters", propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err17];
              } else {
                vErrors.push(err17);
              }
              errors++;
            }
            if (!pattern15.test(key1)) {
              const err18 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z0-9_]+$" }, message: 'must match pattern "^[a-z0-9_]+$"', propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err18];
              } else {
                vErrors.push(err18);
              }
              errors++;
            }
          } else {
            const err19 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key1 };
            if (vErrors === null) {
              vErrors = [err19];
            } else {
              vErrors.push(err19);
            }
            errors++;
          }
          var valid3 = _errs19 === errors;
          if (!valid3) {
            const err20 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err20];
            } else {
              vErrors.push(err20);
            }
            errors++;
          }
        }
        for (const key2 in data12) {
          if (!validate114(data12[key2], { instancePath: instancePath + "/limits/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data12, parentDataProperty: key2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate114.errors : vErrors.concat(validate114.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err21 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err21];
        } else {
          vErrors.push(err21);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
    if (data.orient !== void 0) {
      if (!validate158(data.orient, { instancePath: instancePath + "/orient", parentData: data, parentDataProperty: "orient", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate158.errors : vErrors.concat(validate158.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err22 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err22];
    } else {
      vErrors.push(err22);
    }
    errors++;
  }
  validate236.errors = vErrors;
  return errors === 0;
}
validate236.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema52 = { "title": "WingPart", "description": "A limb that folds in two places with rows of feathers on its bones: a control for each joint, one control that folds the wing and fans its feathers.", "type": "object", "required": ["kind", "points"], "additionalProperties": false, "properties": { "kind": { "const": "wing", "description": "A wing." }, "side": { "$ref": "#/$defs/SideOption" }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the wing hangs on.", "examples": ["spine.chest"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 4, "maxItems": 4, "description": "Shoulder, elbow, wrist and tip.", "examples": [["shoulder", "elbow", "wrist", "wing_tip"]] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "minItems": 4, "maxItems": 4, "description": "Names of the four joints. Without it they take their landmarks' names, else upper, lower, hand, tip.", "examples": [["upper", "lower", "hand", "tip"]] }, "fold": { "type": "array", "items": { "$ref": "#/$defs/NumberOrExpression" }, "minItems": 3, "maxItems": 3, "default": [20, 110, -120], "description": "Turn of shoulder, elbow and wrist about their hinges at fold 1.", "x-unit": "degrees", "examples": [[20, 110, -120]] }, "feathers": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "type": "object", "additionalProperties": false, "description": "A row of feathers along one bone.", "properties": { "bone": { "enum": ["upper", "lower", "hand"], "default": "hand", "description": "Bone that the row sits on.", "examples": ["hand"] }, "tips": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 2, "maxItems": 2, "description": "Where the tips of the first and the last feather lie.", "examples": [["primary_first", "primary_last"]] }, "count": { "type": "integer", "minimum": 1, "maximum": 40, "default": 5, "description": "Count of feathers.", "examples": [5] }, "joints": { "type": "integer", "minimum": 2, "maximum": 12, "default": 3, "description": "Count of joints of each feather.", "examples": [3] }, "fan": { "$ref": "#/$defs/NumberOrExpression", "default": 30, "description": "Turn of the last feather at fan 1; the first stays.", "examples": [30], "x-unit": "degrees" } }, "required": ["tips"], "examples": [{ "bone": "hand", "tips": ["primary_first", "primary_last"], "count": 5 }] }, "default": {}, "description": "Rows of feathers by name.", "examples": [{ "primary": { "bone": "hand", "tips": ["primary_first", "primary_last"], "count": 5 } }] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of the joints.", "examples": ["skin"] }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" } } };
function validate247(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate247.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.points === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "points" }, message: "must have required property 'points'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema52.properties, key0)) {
        const err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      if ("wing" !== data.kind) {
        const err3 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/const", keyword: "const", params: { allowedValue: "wing" }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.points !== void 0) {
      let data3 = data.points;
      if (Array.isArray(data3)) {
        if (data3.length > 4) {
          const err4 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/maxItems", keyword: "maxItems", params: { limit: 4 }, message: "must NOT have more than 4 items" };
          if (vErrors === null) {
            vErrors = [err4];
          } else {
            vErrors.push(err4);
          }
          errors++;
        }
        if (data3.length < 4) {
          const err5 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/minItems", keyword: "minItems", params: { limit: 4 }, message: "must NOT have fewer than 4 items" };
          if (vErrors === null) {
            vErrors = [err5];
          } else {
            vErrors.push(err5);
          }
          errors++;
        }
        const len0 = data3.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate95(data3[i0], { instancePath: instancePath + "/points/" + i0, parentData: data3, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err6 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
    }
    if (data.names !== void 0) {
      let data5 = data.names;
      if (Array.isArray(data5)) {
        if (data5.length > 4) {
          const err7 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/maxItems", keyword: "maxItems", params: { limit: 4 }, message: "must NOT have more than 4 items" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
        if (data5.length < 4) {
          const err8 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/minItems", keyword: "minItems", params: { limit: 4 }, message: "must NOT have fewer than 4 items" };
          if (vErrors === null) {
            vErrors = [err8];
          } else {
            vErrors.push(err8);
          }
          errors++;
        }
        const len1 = data5.length;
        for (let i1 = 0; i1 < len1; i1++) {
          let data6 = data5[i1];
          if (typeof data6 === "string") {
            if (func2(data6) > 60) {
              const err9 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
              if (vErrors === null) {
                vErrors = [err9];
              } else {
                vErrors.push(err9);
              }
              errors++;
            }
            if (!pattern3.test(data6)) {
              const err10 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"' };
              if (vErrors === null) {
                vErrors = [err10];
              } else {
                vErrors.push(err10);
              }
              errors++;
            }
          } else {
            const err11 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            if (vErrors === null) {
              vErrors = [err11];
            } else {
              vErrors.push(err11);
            }
            errors++;
          }
        }
      } else {
        const err12 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
    }
    if (data.fold !== void 0) {
      let data7 = data.fold;
      if (Array.isArray(data7)) {
        if (data7.length > 3) {
          const err13 = { instancePath: instancePath + "/fold", schemaPath: "#/properties/fold/maxItems", keyword: "maxItems", params: { limit: 3 }, message: "must NOT have more than 3 items" };
          if (vErrors === null) {
            vErrors = [err13];
          } else {
            vErrors.push(err13);
          }
          errors++;
        }
        if (data7.length < 3) {
          const err14 = { instancePath: instancePath + "/fold", schemaPath: "#/properties/fold/minItems", keyword: "minItems", params: { limit: 3 }, message: "must NOT have fewer than 3 items" };
          if (vErrors === null) {
            vErrors = [err14];
          } else {
            vErrors.push(err14);
          }
          errors++;
        }
        const len2 = data7.length;
        for (let i2 = 0; i2 < len2; i2++) {
          if (!validate70(data7[i2], { instancePath: instancePath + "/fold/" + i2, parentData: data7, parentDataProperty: i2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err15 = { instancePath: instancePath + "/fold", schemaPath: "#/properties/fold/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err15];
        } else {
          vErrors.push(err15);
        }
        errors++;
      }
    }
    if (data.feathers !== void 0) {
      let data9 = data.feathers;
      if (data9 && typeof data9 == "object" && !Array.isArray(data9)) {
        for (const key1 in data9) {
          const _errs17 = errors;
          if (!validate53(key1, { instancePath: instancePath + "/feathers", parentData: data9, parentDataProperty: "feathers", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid7 = _errs17 === errors;
          if (!valid7) {
            const err16 = { instancePath: instancePath + "/feathers", schemaPath: "#/properties/feathers/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err16];
            } else {
              vErrors.push(err16);
            }
            errors++;
          }
        }
        for (const key2 in data9) {
          let data10 = data9[key2];
          if (data10 && typeof data10 == "object" && !Array.isArray(data10)) {
            if (data10.tips === void 0) {
              const err17 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/feathers/additionalProperties/required", keyword: "required", params: { missingProperty: "tips" }, message: "must have required property 'tips'" };
              if (vErrors === null) {
                vErrors = [err17];
              } else {
                vErrors.push(err17);
              }
              errors++;
            }
            for (const key3 in data10) {
              if (!(key3 === "bone" || key3 === "tips" || key3 === "count" || key3 === "joints" || key3 === "fan")) {
                const err18 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/feathers/additionalProperties/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key3 }, message: "must NOT have additional properties" };
                if (vErrors === null) {
                  vErrors = [err18];
                } else {
                  vErrors.push(err18);
                }
                errors++;
              }
            }
            if (data10.bone !== void 0) {
              let data11 = data10.bone;
              if (!(data11 === "upper" || data11 === "lower" || data11 === "hand")) {
                const err19 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/bone", schemaPath: "#/properties/feathers/additionalProperties/properties/bone/enum", keyword: "enum", params: { allowedValues: schema52.properties.feathers.additionalProperties.properties.bone.enum }, message: "must be equal to one of the allowed values" };
                if (vErrors === null) {
                  vErrors = [err19];
                } else {
                  vErrors.push(err19);
                }
                errors++;
              }
            }
            if (data10.tips !== void 0) {
              let data12 = data10.tips;
              if (Array.isArray(data12)) {
                if (data12.length > 2) {
                  const err20 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/tips", schemaPath: "#/properties/feathers/additionalProperties/properties/tips/maxItems", keyword: "maxItems", params: { limit: 2 }, message: "must NOT have more than 2 items" };
                  if (vErrors === null) {
                    vErrors = [err20];
                  } else {
                    vErrors.push(err20);
                  }
                  errors++;
                }
                if (data12.length < 2) {
                  const err21 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/tips", schemaPath: "#/properties/feathers/additionalProperties/properties/tips/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
                  if (vErrors === null) {
                    vErrors = [err21];
                  } else {
                    vErrors.push(err21);
                  }
                  errors++;
                }
                const len3 = data12.length;
                for (let i3 = 0; i3 < len3; i3++) {
                  if (!validate95(data12[i3], { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/tips/" + i3, parentData: data12, parentDataProperty: i3, rootData, dynamicAnchors })) {
                    vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
                    errors = vErrors.length;
                  }
                }
              } else {
                const err22 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/tips", schemaPath: "#/properties/feathers/additionalProperties/properties/tips/type", keyword: "type", params: { type: "array" }, message: "must be array" };
                if (vErrors === null) {
                  vErrors = [err22];
                } else {
                  vErrors.push(err22);
                }
                errors++;
              }
            }
            if (data10.count !== void 0) {
              let data14 = data10.count;
              if (!(typeof data14 == "number" && (!(data14 % 1) && !isNaN(data14)) && isFinite(data14))) {
                const err23 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/count", schemaPath: "#/properties/feathers/additionalProperties/properties/count/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                if (vErrors === null) {
                  vErrors = [err23];
                } else {
                  vErrors.push(err23);
                }
                errors++;
              }
              if (typeof data14 == "number" && isFinite(data14)) {
                if (data14 > 40 || isNaN(data14)) {
                  const err24 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/count", schemaPath: "#/properties/feathers/additionalProperties/properties/count/maximum", keyword: "maximum", params: { comparison: "<=", limit: 40 }, message: "must be <= 40" };
                  if (vErrors === null) {
                    vErrors = [err24];
                  } else {
                    vErrors.push(err24);
                  }
                  errors++;
                }
                if (data14 < 1 || isNaN(data14)) {
                  const err25 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/count", schemaPath: "#/properties/feathers/additionalProperties/properties/count/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
                  if (vErrors === null) {
                    vErrors = [err25];
                  } else {
                    vErrors.push(err25);
                  }
                  errors++;
                }
              }
            }
            if (data10.joints !== void 0) {
              let data15 = data10.joints;
              if (!(typeof data15 == "number" && (!(data15 % 1) && !isNaN(data15)) && isFinite(data15))) {
                const err26 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/joints", schemaPath: "#/properties/feathers/additionalProperties/properties/joints/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
                if (vErrors === null) {
                  vErrors = [err26];
                } else {
                  vErrors.push(err26);
                }
                errors++;
              }
              if (typeof data15 == "number" && isFinite(data15)) {
                if (data15 > 12 || isNaN(data15)) {
                  const err27 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/joints", schemaPath: "#/properties/feathers/additionalProperties/properties/joints/maximum", keyword: "maximum", params: { comparison: "<=", limit: 12 }, message: "must be <= 12" };
                  if (vErrors === null) {
                    vErrors = [err27];
                  } else {
                    vErrors.push(err27);
                  }
                  errors++;
                }
                if (data15 < 2 || isNaN(data15)) {
                  const err28 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/joints", schemaPath: "#/properties/feathers/additionalProperties/properties/joints/minimum", keyword: "minimum", params: { comparison: ">=", limit: 2 }, message: "must be >= 2" };
                  if (vErrors === null) {
                    vErrors = [err28];
                  } else {
                    vErrors.push(err28);
                  }
                  errors++;
                }
              }
            }
            if (data10.fan !== void 0) {
              if (!validate70(data10.fan, { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1") + "/fan", parentData: data10, parentDataProperty: "fan", rootData, dynamicAnchors })) {
                vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
                errors = vErrors.length;
              }
            }
          } else {
            const err29 = { instancePath: instancePath + "/feathers/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/feathers/additionalProperties/type", keyword: "type", params: { type: "object" }, message: "must be object" };
            if (vErrors === null) {
              vErrors = [err29];
            } else {
              vErrors.push(err29);
            }
            errors++;
          }
        }
      } else {
        const err30 = { instancePath: instancePath + "/feathers", schemaPath: "#/properties/feathers/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err30];
        } else {
          vErrors.push(err30);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
    if (data.orient !== void 0) {
      if (!validate158(data.orient, { instancePath: instancePath + "/orient", parentData: data, parentDataProperty: "orient", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate158.errors : vErrors.concat(validate158.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err31 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err31];
    } else {
      vErrors.push(err31);
    }
    errors++;
  }
  validate247.errors = vErrors;
  return errors === 0;
}
validate247.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate90(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate90.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.kind === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "kind" }, message: "must have required property 'kind'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    const tag0 = data.kind;
    if (typeof tag0 == "string") {
      if (tag0 === "axle") {
        if (!validate91(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate91.errors : vErrors.concat(validate91.errors);
          errors = vErrors.length;
        }
        var props0 = true;
      } else if (tag0 === "clavicle") {
        if (!validate110(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate110.errors : vErrors.concat(validate110.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "eye") {
        if (!validate126(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate126.errors : vErrors.concat(validate126.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "foot") {
        if (!validate135(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate135.errors : vErrors.concat(validate135.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "hand") {
        if (!validate147(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate147.errors : vErrors.concat(validate147.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "jaw") {
        if (!validate165(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate165.errors : vErrors.concat(validate165.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "leg_three") {
        if (!validate174(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate174.errors : vErrors.concat(validate174.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "limb") {
        if (!validate192(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate192.errors : vErrors.concat(validate192.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "neck_head") {
        if (!validate210(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate210.errors : vErrors.concat(validate210.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "root") {
        if (!validate222(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate222.errors : vErrors.concat(validate222.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "spine") {
        if (!validate225(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate225.errors : vErrors.concat(validate225.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "strand") {
        if (!validate236(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate236.errors : vErrors.concat(validate236.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else if (tag0 === "wing") {
        if (!validate247(data, { instancePath, parentData, parentDataProperty, rootData, dynamicAnchors })) {
          vErrors = vErrors === null ? validate247.errors : vErrors.concat(validate247.errors);
          errors = vErrors.length;
        }
        if (props0 !== true) {
          props0 = true;
        }
      } else {
        const err1 = { instancePath, schemaPath: "#/discriminator", keyword: "discriminator", params: { error: "mapping", tag: "kind", tagValue: tag0 }, message: 'value of tag "kind" must be in oneOf' };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    } else {
      const err2 = { instancePath, schemaPath: "#/discriminator", keyword: "discriminator", params: { error: "tag", tag: "kind", tagValue: tag0 }, message: 'tag "kind" must be string' };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
  } else {
    const err3 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err3];
    } else {
      vErrors.push(err3);
    }
    errors++;
  }
  validate90.errors = vErrors;
  evaluated0.props = props0;
  return errors === 0;
}
validate90.evaluated = { "dynamicProps": true, "dynamicItems": false };
var schema53 = { "title": "Chain", "description": "Joints in a row. Joint ids are the chain's id, a dot, and the joint's name.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "role": { "$ref": "#/$defs/word", "default": "skin", "description": "Role of every joint of the chain.", "examples": ["helper"] }, "points": { "type": "array", "items": { "$ref": "#/$defs/Place" }, "minItems": 1, "maxItems": 500, "description": "Where the chain runs, from first to last.", "examples": [["shoulder", "elbow", "wrist"]] }, "joints": { "type": "integer", "minimum": 2, "maximum": 500, "description": "Count of joints, spread evenly by arc length over a curve through the points. Without it there is one joint at each point.", "examples": [5] }, "curve": { "enum": ["smooth", "straight"], "default": "smooth", "description": "How joints are spread between the points: along a smooth curve or along straight lines.", "examples": ["straight"] }, "names": { "type": "array", "items": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "description": "Names of the joints in order. Without it a joint takes its landmark's name, else a padded number.", "examples": [["upper", "lower", "end"]] }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that the first joint follows.", "examples": ["spine.chest"] }, "side": { "$ref": "#/$defs/SideOption" }, "mirror": { "$ref": "#/$defs/MirrorRule" }, "orient": { "$ref": "#/$defs/Orient" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" }, "limits": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z0-9_]+$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/JointLimits" }, "default": {}, "description": "How far joints are meant to turn, by the joint's name in the chain.", "examples": [{ "elbow": { "rz": { "min": 0, "max": 140 } } }] } } };
function validate274(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate274.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!func1.call(schema53.properties, key0)) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.omit !== void 0) {
      if (typeof data.omit !== "boolean") {
        const err1 = { instancePath: instancePath + "/omit", schemaPath: "#/properties/omit/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.points !== void 0) {
      let data2 = data.points;
      if (Array.isArray(data2)) {
        if (data2.length > 500) {
          const err2 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/maxItems", keyword: "maxItems", params: { limit: 500 }, message: "must NOT have more than 500 items" };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
        if (data2.length < 1) {
          const err3 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
        const len0 = data2.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate95(data2[i0], { instancePath: instancePath + "/points/" + i0, parentData: data2, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err4 = { instancePath: instancePath + "/points", schemaPath: "#/properties/points/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.joints !== void 0) {
      let data4 = data.joints;
      if (!(typeof data4 == "number" && (!(data4 % 1) && !isNaN(data4)) && isFinite(data4))) {
        const err5 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
      if (typeof data4 == "number" && isFinite(data4)) {
        if (data4 > 500 || isNaN(data4)) {
          const err6 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/maximum", keyword: "maximum", params: { comparison: "<=", limit: 500 }, message: "must be <= 500" };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
        if (data4 < 2 || isNaN(data4)) {
          const err7 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/minimum", keyword: "minimum", params: { comparison: ">=", limit: 2 }, message: "must be >= 2" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
      }
    }
    if (data.curve !== void 0) {
      let data5 = data.curve;
      if (!(data5 === "smooth" || data5 === "straight")) {
        const err8 = { instancePath: instancePath + "/curve", schemaPath: "#/properties/curve/enum", keyword: "enum", params: { allowedValues: schema53.properties.curve.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
    }
    if (data.names !== void 0) {
      let data6 = data.names;
      if (Array.isArray(data6)) {
        const len1 = data6.length;
        for (let i1 = 0; i1 < len1; i1++) {
          let data7 = data6[i1];
          if (typeof data7 === "string") {
            if (func2(data7) > 60) {
              const err9 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
              if (vErrors === null) {
                vErrors = [err9];
              } else {
                vErrors.push(err9);
              }
              errors++;
            }
            if (!pattern15.test(data7)) {
              const err10 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/pattern", keyword: "pattern", params: { pattern: "^[a-z0-9_]+$" }, message: 'must match pattern "^[a-z0-9_]+$"' };
              if (vErrors === null) {
                vErrors = [err10];
              } else {
                vErrors.push(err10);
              }
              errors++;
            }
          } else {
            const err11 = { instancePath: instancePath + "/names/" + i1, schemaPath: "#/properties/names/items/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            if (vErrors === null) {
              vErrors = [err11];
            } else {
              vErrors.push(err11);
            }
            errors++;
          }
        }
      } else {
        const err12 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.mirror !== void 0) {
      if (!validate108(data.mirror, { instancePath: instancePath + "/mirror", parentData: data, parentDataProperty: "mirror", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate108.errors : vErrors.concat(validate108.errors);
        errors = vErrors.length;
      }
    }
    if (data.orient !== void 0) {
      if (!validate158(data.orient, { instancePath: instancePath + "/orient", parentData: data, parentDataProperty: "orient", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate158.errors : vErrors.concat(validate158.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
    if (data.limits !== void 0) {
      let data13 = data.limits;
      if (data13 && typeof data13 == "object" && !Array.isArray(data13)) {
        for (const key1 in data13) {
          const _errs22 = errors;
          if (typeof key1 === "string") {
            if (func2(key1) > 60) {
              const err13 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters", propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err13];
              } else {
                vErrors.push(err13);
              }
              errors++;
            }
            if (!pattern15.test(key1)) {
              const err14 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z0-9_]+$" }, message: 'must match pattern "^[a-z0-9_]+$"', propertyName: key1 };
              if (vErrors === null) {
                vErrors = [err14];
              } else {
                vErrors.push(err14);
              }
              errors++;
            }
          } else {
            const err15 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key1 };
            if (vErrors === null) {
              vErrors = [err15];
            } else {
              vErrors.push(err15);
            }
            errors++;
          }
          var valid5 = _errs22 === errors;
          if (!valid5) {
            const err16 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err16];
            } else {
              vErrors.push(err16);
            }
            errors++;
          }
        }
        for (const key2 in data13) {
          if (!validate114(data13[key2], { instancePath: instancePath + "/limits/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data13, parentDataProperty: key2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate114.errors : vErrors.concat(validate114.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err17 = { instancePath: instancePath + "/limits", schemaPath: "#/properties/limits/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err17];
        } else {
          vErrors.push(err17);
        }
        errors++;
      }
    }
  } else {
    const err18 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err18];
    } else {
      vErrors.push(err18);
    }
    errors++;
  }
  validate274.errors = vErrors;
  return errors === 0;
}
validate274.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema54 = { "title": "Control", "description": "What the animator takes hold of.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "role": { "$ref": "#/$defs/word", "default": "control", "description": "Role; decides the container.", "examples": ["control"] }, "at": { "$ref": "#/$defs/Place", "description": "Where it stands at rest: a landmark, a joint or a point.", "examples": ["wrist"] }, "pole_of": { "$ref": "#/$defs/PolePlace" }, "align": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$", "default": "world", "description": "Joint or control whose rest orientation it takes, or world.", "examples": ["arm.left.wrist"] }, "parent": { "$ref": "#/$defs/id", "description": "Joint or control that it follows.", "examples": ["hips"] }, "shape": { "enum": ["ring", "square", "diamond", "cross", "arrow", "ball", "box", "pin", "compass"], "default": "ring", "description": "Drawn shape.", "examples": ["diamond"] }, "size": { "$ref": "#/$defs/NumberOrExpression", "default": 1, "description": "Factor on the size that the compiler takes from what the control steers.", "examples": [1.2] }, "side": { "$ref": "#/$defs/SideOption" }, "rotation_order": { "$ref": "#/$defs/RotationOrderOption" }, "channels": { "type": "object", "propertyNames": { "$ref": "#/$defs/ChannelName" }, "additionalProperties": { "$ref": "#/$defs/ChannelOption" }, "default": {}, "description": "Locks and limits by channel; move, turn and scale stand for three channels each.", "examples": [{ "scale": { "locked": true }, "rx": { "min": -40, "max": 40 } }] }, "attributes": { "type": "object", "propertyNames": { "$ref": "#/$defs/word" }, "additionalProperties": { "$ref": "#/$defs/AttributeOption" }, "default": {}, "description": "Values of its own, by name.", "examples": [{ "reach": { "default": 1, "min": 0, "max": 1 } }] }, "spaces": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 40, "description": "Joints and controls that may carry it; the attribute space chooses. Its parent comes first unless it is listed, else the first. Switching keeps nothing in place by itself: a tool matches the pose, or reads the values from Pintle.", "examples": [["root", "spine.chest", "hips"]] }, "space_follow": { "enum": ["all", "turn"], "default": "all", "description": "all: the chosen space carries the control. turn: it only turns it; place stays with the parent.", "examples": ["turn"] } } };
function validate288(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate288.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.joints === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "joints" }, message: "must have required property 'joints'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!(key0 === "joints" || key0 === "distance" || key0 === "bend")) {
        const err1 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.joints !== void 0) {
      let data0 = data.joints;
      if (Array.isArray(data0)) {
        if (data0.length > 3) {
          const err2 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/maxItems", keyword: "maxItems", params: { limit: 3 }, message: "must NOT have more than 3 items" };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
        if (data0.length < 3) {
          const err3 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/minItems", keyword: "minItems", params: { limit: 3 }, message: "must NOT have fewer than 3 items" };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
        const len0 = data0.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate88(data0[i0], { instancePath: instancePath + "/joints/" + i0, parentData: data0, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err4 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.distance !== void 0) {
      if (!validate70(data.distance, { instancePath: instancePath + "/distance", parentData: data, parentDataProperty: "distance", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.bend !== void 0) {
      if (!validate69(data.bend, { instancePath: instancePath + "/bend", parentData: data, parentDataProperty: "bend", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate69.errors : vErrors.concat(validate69.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err5 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err5];
    } else {
      vErrors.push(err5);
    }
    errors++;
  }
  validate288.errors = vErrors;
  return errors === 0;
}
validate288.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema56 = { "enum": ["move", "turn", "scale", "tx", "ty", "tz", "rx", "ry", "rz", "sx", "sy", "sz"], "description": "A channel, or move, turn or scale for all three of a kind." };
function validate297(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate297.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (!(data === "move" || data === "turn" || data === "scale" || data === "tx" || data === "ty" || data === "tz" || data === "rx" || data === "ry" || data === "rz" || data === "sx" || data === "sy" || data === "sz")) {
    const err0 = { instancePath, schemaPath: "#/enum", keyword: "enum", params: { allowedValues: schema56.enum }, message: "must be equal to one of the allowed values" };
    if (vErrors === null) {
      vErrors = [err0];
    } else {
      vErrors.push(err0);
    }
    errors++;
  }
  validate297.errors = vErrors;
  return errors === 0;
}
validate297.evaluated = { "dynamicProps": false, "dynamicItems": false };
function validate299(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate299.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "locked" || key0 === "min" || key0 === "max")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.locked !== void 0) {
      if (typeof data.locked !== "boolean") {
        const err1 = { instancePath: instancePath + "/locked", schemaPath: "#/properties/locked/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.min !== void 0) {
      if (!validate70(data.min, { instancePath: instancePath + "/min", parentData: data, parentDataProperty: "min", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.max !== void 0) {
      if (!validate70(data.max, { instancePath: instancePath + "/max", parentData: data, parentDataProperty: "max", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err2 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err2];
    } else {
      vErrors.push(err2);
    }
    errors++;
  }
  validate299.errors = vErrors;
  return errors === 0;
}
validate299.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate304(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate304.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "default" || key0 === "min" || key0 === "max" || key0 === "note" || key0 === "labels")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.default !== void 0) {
      if (!validate70(data.default, { instancePath: instancePath + "/default", parentData: data, parentDataProperty: "default", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.min !== void 0) {
      if (!validate70(data.min, { instancePath: instancePath + "/min", parentData: data, parentDataProperty: "min", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.max !== void 0) {
      if (!validate70(data.max, { instancePath: instancePath + "/max", parentData: data, parentDataProperty: "max", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.note !== void 0) {
      if (!validate55(data.note, { instancePath: instancePath + "/note", parentData: data, parentDataProperty: "note", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate55.errors : vErrors.concat(validate55.errors);
        errors = vErrors.length;
      }
    }
    if (data.labels !== void 0) {
      let data4 = data.labels;
      if (Array.isArray(data4)) {
        if (data4.length > 100) {
          const err1 = { instancePath: instancePath + "/labels", schemaPath: "#/properties/labels/maxItems", keyword: "maxItems", params: { limit: 100 }, message: "must NOT have more than 100 items" };
          if (vErrors === null) {
            vErrors = [err1];
          } else {
            vErrors.push(err1);
          }
          errors++;
        }
        if (data4.length < 2) {
          const err2 = { instancePath: instancePath + "/labels", schemaPath: "#/properties/labels/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
        const len0 = data4.length;
        for (let i0 = 0; i0 < len0; i0++) {
          let data5 = data4[i0];
          if (typeof data5 === "string") {
            if (func2(data5) > 80) {
              const err3 = { instancePath: instancePath + "/labels/" + i0, schemaPath: "#/properties/labels/items/maxLength", keyword: "maxLength", params: { limit: 80 }, message: "must NOT have more than 80 characters" };
              if (vErrors === null) {
                vErrors = [err3];
              } else {
                vErrors.push(err3);
              }
              errors++;
            }
            if (func2(data5) < 1) {
              const err4 = { instancePath: instancePath + "/labels/" + i0, schemaPath: "#/properties/labels/items/minLength", keyword: "minLength", params: { limit: 1 }, message: "must NOT have fewer than 1 characters" };
              if (vErrors === null) {
                vErrors = [err4];
              } else {
                vErrors.push(err4);
              }
              errors++;
            }
          } else {
            const err5 = { instancePath: instancePath + "/labels/" + i0, schemaPath: "#/properties/labels/items/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            if (vErrors === null) {
              vErrors = [err5];
            } else {
              vErrors.push(err5);
            }
            errors++;
          }
        }
      } else {
        const err6 = { instancePath: instancePath + "/labels", schemaPath: "#/properties/labels/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
    }
  } else {
    const err7 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err7];
    } else {
      vErrors.push(err7);
    }
    errors++;
  }
  validate304.errors = vErrors;
  return errors === 0;
}
validate304.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate285(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate285.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!func1.call(schema54.properties, key0)) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.omit !== void 0) {
      if (typeof data.omit !== "boolean") {
        const err1 = { instancePath: instancePath + "/omit", schemaPath: "#/properties/omit/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.at !== void 0) {
      if (!validate95(data.at, { instancePath: instancePath + "/at", parentData: data, parentDataProperty: "at", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.pole_of !== void 0) {
      if (!validate288(data.pole_of, { instancePath: instancePath + "/pole_of", parentData: data, parentDataProperty: "pole_of", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate288.errors : vErrors.concat(validate288.errors);
        errors = vErrors.length;
      }
    }
    if (data.align !== void 0) {
      let data4 = data.align;
      if (typeof data4 === "string") {
        if (!pattern9.test(data4)) {
          const err2 = { instancePath: instancePath + "/align", schemaPath: "#/properties/align/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$"' };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
      } else {
        const err3 = { instancePath: instancePath + "/align", schemaPath: "#/properties/align/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.parent !== void 0) {
      if (!validate88(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.shape !== void 0) {
      let data6 = data.shape;
      if (!(data6 === "ring" || data6 === "square" || data6 === "diamond" || data6 === "cross" || data6 === "arrow" || data6 === "ball" || data6 === "box" || data6 === "pin" || data6 === "compass")) {
        const err4 = { instancePath: instancePath + "/shape", schemaPath: "#/properties/shape/enum", keyword: "enum", params: { allowedValues: schema54.properties.shape.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.size !== void 0) {
      if (!validate70(data.size, { instancePath: instancePath + "/size", parentData: data, parentDataProperty: "size", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
    if (data.rotation_order !== void 0) {
      if (!validate124(data.rotation_order, { instancePath: instancePath + "/rotation_order", parentData: data, parentDataProperty: "rotation_order", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate124.errors : vErrors.concat(validate124.errors);
        errors = vErrors.length;
      }
    }
    if (data.channels !== void 0) {
      let data10 = data.channels;
      if (data10 && typeof data10 == "object" && !Array.isArray(data10)) {
        for (const key1 in data10) {
          const _errs16 = errors;
          if (!validate297(key1, { instancePath: instancePath + "/channels", parentData: data10, parentDataProperty: "channels", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate297.errors : vErrors.concat(validate297.errors);
            errors = vErrors.length;
          }
          var valid1 = _errs16 === errors;
          if (!valid1) {
            const err5 = { instancePath: instancePath + "/channels", schemaPath: "#/properties/channels/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err5];
            } else {
              vErrors.push(err5);
            }
            errors++;
          }
        }
        for (const key2 in data10) {
          if (!validate299(data10[key2], { instancePath: instancePath + "/channels/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data10, parentDataProperty: key2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate299.errors : vErrors.concat(validate299.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err6 = { instancePath: instancePath + "/channels", schemaPath: "#/properties/channels/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
    }
    if (data.attributes !== void 0) {
      let data12 = data.attributes;
      if (data12 && typeof data12 == "object" && !Array.isArray(data12)) {
        for (const key3 in data12) {
          const _errs21 = errors;
          if (!validate53(key3, { instancePath: instancePath + "/attributes", parentData: data12, parentDataProperty: "attributes", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid3 = _errs21 === errors;
          if (!valid3) {
            const err7 = { instancePath: instancePath + "/attributes", schemaPath: "#/properties/attributes/propertyNames", keyword: "propertyNames", params: { propertyName: key3 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err7];
            } else {
              vErrors.push(err7);
            }
            errors++;
          }
        }
        for (const key4 in data12) {
          if (!validate304(data12[key4], { instancePath: instancePath + "/attributes/" + key4.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data12, parentDataProperty: key4, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate304.errors : vErrors.concat(validate304.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err8 = { instancePath: instancePath + "/attributes", schemaPath: "#/properties/attributes/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
    }
    if (data.spaces !== void 0) {
      let data14 = data.spaces;
      if (Array.isArray(data14)) {
        if (data14.length > 40) {
          const err9 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/maxItems", keyword: "maxItems", params: { limit: 40 }, message: "must NOT have more than 40 items" };
          if (vErrors === null) {
            vErrors = [err9];
          } else {
            vErrors.push(err9);
          }
          errors++;
        }
        if (data14.length < 1) {
          const err10 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          if (vErrors === null) {
            vErrors = [err10];
          } else {
            vErrors.push(err10);
          }
          errors++;
        }
        const len0 = data14.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate88(data14[i0], { instancePath: instancePath + "/spaces/" + i0, parentData: data14, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err11 = { instancePath: instancePath + "/spaces", schemaPath: "#/properties/spaces/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err11];
        } else {
          vErrors.push(err11);
        }
        errors++;
      }
    }
    if (data.space_follow !== void 0) {
      let data16 = data.space_follow;
      if (!(data16 === "all" || data16 === "turn")) {
        const err12 = { instancePath: instancePath + "/space_follow", schemaPath: "#/properties/space_follow/enum", keyword: "enum", params: { allowedValues: schema54.properties.space_follow.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
    }
  } else {
    const err13 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err13];
    } else {
      vErrors.push(err13);
    }
    errors++;
  }
  validate285.errors = vErrors;
  return errors === 0;
}
validate285.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema59 = { "title": "Solver", "description": "Computes the transform of several joints at once. Which keys it takes depends on its kind.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "kind": { "enum": ["two_bone", "reach", "spline", "twist", "aim", "foot_roll"], "description": "two_bone: three joints in a row bend so that the last meets the goal. reach: four or more joints fold evenly so that the last meets the goal. spline: joints lie along a curve through controls. twist: joints along a bone share the twist of another joint. aim: one joint points at a goal. foot_roll: a foot rolls and banks over points of its sole.", "examples": ["two_bone"] }, "joints": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 1, "maxItems": 500, "description": "two_bone: the three joints from root to tip. reach: four or more. spline: two or more. Each is the parent of the next. twist: joints along the bone, children of its joint. aim: the one joint.", "examples": [["arm.left.shoulder", "arm.left.elbow", "arm.left.wrist"]] }, "goal": { "$ref": "#/$defs/id", "description": "two_bone, reach: joint or control that the last joint follows. aim: what the joint points at.", "examples": ["arm.left.hand"] }, "pole": { "$ref": "#/$defs/id", "description": "two_bone, reach: control toward which the chain bends. aim: thing that says which way is up; without it the joint turns along the shortest arc.", "examples": ["arm.left.pole"] }, "blend": { "$ref": "#/$defs/NumberOrAttribute", "default": 1, "description": "two_bone, reach, aim: 0: joints keep their own rotation. 1: solved.", "examples": ["arm.left.hand.reach"] }, "stretch": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "two_bone, reach: 0: bones keep their length, 1: they grow until the end meets the goal. spline: 0: joints keep their distances, 1: they spread over the whole curve.", "examples": ["arm.left.hand.stretch"] }, "stretch_limit": { "$ref": "#/$defs/NumberOrExpression", "default": 1.5, "description": "two_bone, reach: greatest factor on the bones' length.", "x-unit": "factor", "examples": [1.5] }, "soft": { "$ref": "#/$defs/NumberOrExpression", "default": 0, "description": "two_bone, reach: share of the chain's length over which the end slows down before full reach. The zone never begins before the reach at rest.", "x-unit": "chain lengths", "examples": [0.05] }, "swing": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "two_bone, reach: angle by which the bend is swung about the line from start to goal.", "examples": ["arm.left.hand.swing"], "x-unit": "degrees" }, "bias": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "reach: \u22121 to 1: moves the fold from the last bends to the first.", "examples": ["leg.left.foot.lead"] }, "controls": { "type": "array", "items": { "$ref": "#/$defs/id" }, "minItems": 2, "maxItems": 100, "description": "spline: the controls whose places shape the curve, from root to tip.", "examples": [["spine.low", "spine.middle", "spine.high"]] }, "volume": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "spline: 0 to 1: how far joints thicken and thin to keep the volume.", "examples": ["spine.high.volume"] }, "shares": { "type": "array", "items": { "$ref": "#/$defs/NumberOrExpression" }, "minItems": 1, "maxItems": 100, "description": "twist: share of the twist that each joint takes. Without it, joint i of n takes i / (n + 1).", "examples": [[0.25, 0.5, 0.75]] }, "bone": { "$ref": "#/$defs/id", "description": "twist: joint at the root of the bone, the parent of the twist joints.", "examples": ["arm.left.elbow"] }, "tip": { "$ref": "#/$defs/id", "description": "twist: joint at the other end of the bone.", "examples": ["arm.left.wrist"] }, "base": { "$ref": "#/$defs/id", "description": "twist: joint or control against which the driver's twist is measured.", "examples": ["arm.left.elbow"] }, "driver": { "$ref": "#/$defs/id", "description": "twist: joint whose twist is spread.", "examples": ["arm.left.wrist"] }, "foot": { "$ref": "#/$defs/id", "description": "foot_roll: control that carries the foot.", "examples": ["leg.left.foot"] }, "ankle": { "$ref": "#/$defs/id", "description": "foot_roll: joint that every pivot moves.", "examples": ["leg.left_roll.ankle"] }, "toes": { "$ref": "#/$defs/id", "description": "foot_roll: joint that every pivot but the ball moves; without it the ankle alone is moved.", "examples": ["leg.left_roll.toes"] }, "heel": { "$ref": "#/$defs/Place", "description": "foot_roll: back of the sole, about which negative roll turns.", "examples": ["heel"] }, "ball": { "$ref": "#/$defs/Place", "description": "foot_roll: ball of the foot, about which roll turns up to the break angle.", "examples": ["ball"] }, "toe": { "$ref": "#/$defs/Place", "description": "foot_roll: tip of the toes, about which roll turns beyond the break angle.", "examples": ["toe"] }, "inner": { "$ref": "#/$defs/Place", "description": "foot_roll: inner edge of the sole, about which negative bank turns.", "examples": ["inner"] }, "outer": { "$ref": "#/$defs/Place", "description": "foot_roll: outer edge of the sole, about which positive bank turns.", "examples": ["outer"] }, "roll": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "foot_roll: angle, positive forward.", "examples": ["leg.left.foot.roll"], "x-unit": "degrees" }, "bank": { "$ref": "#/$defs/NumberOrAttribute", "default": 0, "description": "foot_roll: angle, positive outward.", "examples": ["leg.left.foot.bank"], "x-unit": "degrees" }, "break": { "$ref": "#/$defs/NumberOrAttribute", "default": 30, "description": "foot_roll: roll at which the toes begin to lift.", "examples": [30], "x-unit": "degrees" }, "side": { "$ref": "#/$defs/SideOption" } } };
var schema60 = { "title": "NumberOrAttribute", "description": "A number, an expression, or an attribute of a control as control.attribute.", "type": ["number", "string"], "pattern": "^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$)", "maxLength": 2e3, "examples": [1, "arm.left.hand.reach"] };
var pattern28 = new RegExp("^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$)", "u");
function validate317(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate317.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (!(typeof data == "number" && isFinite(data)) && typeof data !== "string") {
    const err0 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: schema60.type }, message: "must be number,string" };
    if (vErrors === null) {
      vErrors = [err0];
    } else {
      vErrors.push(err0);
    }
    errors++;
  }
  if (typeof data === "string") {
    if (func2(data) > 2e3) {
      const err1 = { instancePath, schemaPath: "#/maxLength", keyword: "maxLength", params: { limit: 2e3 }, message: "must NOT have more than 2000 characters" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (!pattern28.test(data)) {
      const err2 = { instancePath, schemaPath: "#/pattern", keyword: "pattern", params: { pattern: "^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$)" }, message: 'must match pattern "^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$)"' };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
  }
  validate317.errors = vErrors;
  return errors === 0;
}
validate317.evaluated = { "dynamicProps": false, "dynamicItems": false };
function validate313(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate313.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!func1.call(schema59.properties, key0)) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.omit !== void 0) {
      if (typeof data.omit !== "boolean") {
        const err1 = { instancePath: instancePath + "/omit", schemaPath: "#/properties/omit/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      let data1 = data.kind;
      if (!(data1 === "two_bone" || data1 === "reach" || data1 === "spline" || data1 === "twist" || data1 === "aim" || data1 === "foot_roll")) {
        const err2 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/enum", keyword: "enum", params: { allowedValues: schema59.properties.kind.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.joints !== void 0) {
      let data2 = data.joints;
      if (Array.isArray(data2)) {
        if (data2.length > 500) {
          const err3 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/maxItems", keyword: "maxItems", params: { limit: 500 }, message: "must NOT have more than 500 items" };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
        if (data2.length < 1) {
          const err4 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          if (vErrors === null) {
            vErrors = [err4];
          } else {
            vErrors.push(err4);
          }
          errors++;
        }
        const len0 = data2.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate88(data2[i0], { instancePath: instancePath + "/joints/" + i0, parentData: data2, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err5 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.goal !== void 0) {
      if (!validate88(data.goal, { instancePath: instancePath + "/goal", parentData: data, parentDataProperty: "goal", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.pole !== void 0) {
      if (!validate88(data.pole, { instancePath: instancePath + "/pole", parentData: data, parentDataProperty: "pole", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.blend !== void 0) {
      if (!validate317(data.blend, { instancePath: instancePath + "/blend", parentData: data, parentDataProperty: "blend", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.stretch !== void 0) {
      if (!validate317(data.stretch, { instancePath: instancePath + "/stretch", parentData: data, parentDataProperty: "stretch", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.stretch_limit !== void 0) {
      if (!validate70(data.stretch_limit, { instancePath: instancePath + "/stretch_limit", parentData: data, parentDataProperty: "stretch_limit", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.soft !== void 0) {
      if (!validate70(data.soft, { instancePath: instancePath + "/soft", parentData: data, parentDataProperty: "soft", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
        errors = vErrors.length;
      }
    }
    if (data.swing !== void 0) {
      if (!validate317(data.swing, { instancePath: instancePath + "/swing", parentData: data, parentDataProperty: "swing", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.bias !== void 0) {
      if (!validate317(data.bias, { instancePath: instancePath + "/bias", parentData: data, parentDataProperty: "bias", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.controls !== void 0) {
      let data12 = data.controls;
      if (Array.isArray(data12)) {
        if (data12.length > 100) {
          const err6 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/maxItems", keyword: "maxItems", params: { limit: 100 }, message: "must NOT have more than 100 items" };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
        if (data12.length < 2) {
          const err7 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
        const len1 = data12.length;
        for (let i1 = 0; i1 < len1; i1++) {
          if (!validate88(data12[i1], { instancePath: instancePath + "/controls/" + i1, parentData: data12, parentDataProperty: i1, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err8 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
    }
    if (data.volume !== void 0) {
      if (!validate317(data.volume, { instancePath: instancePath + "/volume", parentData: data, parentDataProperty: "volume", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.shares !== void 0) {
      let data15 = data.shares;
      if (Array.isArray(data15)) {
        if (data15.length > 100) {
          const err9 = { instancePath: instancePath + "/shares", schemaPath: "#/properties/shares/maxItems", keyword: "maxItems", params: { limit: 100 }, message: "must NOT have more than 100 items" };
          if (vErrors === null) {
            vErrors = [err9];
          } else {
            vErrors.push(err9);
          }
          errors++;
        }
        if (data15.length < 1) {
          const err10 = { instancePath: instancePath + "/shares", schemaPath: "#/properties/shares/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          if (vErrors === null) {
            vErrors = [err10];
          } else {
            vErrors.push(err10);
          }
          errors++;
        }
        const len2 = data15.length;
        for (let i2 = 0; i2 < len2; i2++) {
          if (!validate70(data15[i2], { instancePath: instancePath + "/shares/" + i2, parentData: data15, parentDataProperty: i2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err11 = { instancePath: instancePath + "/shares", schemaPath: "#/properties/shares/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err11];
        } else {
          vErrors.push(err11);
        }
        errors++;
      }
    }
    if (data.bone !== void 0) {
      if (!validate88(data.bone, { instancePath: instancePath + "/bone", parentData: data, parentDataProperty: "bone", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.tip !== void 0) {
      if (!validate88(data.tip, { instancePath: instancePath + "/tip", parentData: data, parentDataProperty: "tip", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.base !== void 0) {
      if (!validate88(data.base, { instancePath: instancePath + "/base", parentData: data, parentDataProperty: "base", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.driver !== void 0) {
      if (!validate88(data.driver, { instancePath: instancePath + "/driver", parentData: data, parentDataProperty: "driver", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.foot !== void 0) {
      if (!validate88(data.foot, { instancePath: instancePath + "/foot", parentData: data, parentDataProperty: "foot", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.ankle !== void 0) {
      if (!validate88(data.ankle, { instancePath: instancePath + "/ankle", parentData: data, parentDataProperty: "ankle", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.toes !== void 0) {
      if (!validate88(data.toes, { instancePath: instancePath + "/toes", parentData: data, parentDataProperty: "toes", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.heel !== void 0) {
      if (!validate95(data.heel, { instancePath: instancePath + "/heel", parentData: data, parentDataProperty: "heel", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.ball !== void 0) {
      if (!validate95(data.ball, { instancePath: instancePath + "/ball", parentData: data, parentDataProperty: "ball", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.toe !== void 0) {
      if (!validate95(data.toe, { instancePath: instancePath + "/toe", parentData: data, parentDataProperty: "toe", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.inner !== void 0) {
      if (!validate95(data.inner, { instancePath: instancePath + "/inner", parentData: data, parentDataProperty: "inner", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.outer !== void 0) {
      if (!validate95(data.outer, { instancePath: instancePath + "/outer", parentData: data, parentDataProperty: "outer", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate95.errors : vErrors.concat(validate95.errors);
        errors = vErrors.length;
      }
    }
    if (data.roll !== void 0) {
      if (!validate317(data.roll, { instancePath: instancePath + "/roll", parentData: data, parentDataProperty: "roll", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.bank !== void 0) {
      if (!validate317(data.bank, { instancePath: instancePath + "/bank", parentData: data, parentDataProperty: "bank", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.break !== void 0) {
      if (!validate317(data.break, { instancePath: instancePath + "/break", parentData: data, parentDataProperty: "break", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err12 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err12];
    } else {
      vErrors.push(err12);
    }
    errors++;
  }
  validate313.errors = vErrors;
  return errors === 0;
}
validate313.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema61 = { "title": "Constraint", "description": "Makes one thing follow others.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "kind": { "enum": ["parent", "point", "orient", "scale", "aim"], "description": "What is followed: everything, position, rotation or scale; or, aim, the target turns to point at the sources.", "examples": ["orient"] }, "target": { "$ref": "#/$defs/id", "description": "Joint or control that follows.", "examples": ["arm.left.wrist"] }, "sources": { "type": "object", "propertyNames": { "$ref": "#/$defs/id" }, "additionalProperties": { "$ref": "#/$defs/NumberOrExpression" }, "minProperties": 1, "description": "What is followed, each with its weight; weights are taken as shares of their sum.", "examples": [{ "arm.left.hand": 1 }] }, "blend": { "$ref": "#/$defs/NumberOrAttribute", "description": "Two sources only: share of the first; the second takes the rest.", "examples": ["arm.left.hand.reach"] }, "keep_offset": { "type": "boolean", "default": true, "description": "Keeps the distance and turn that target and sources have at rest, so that nothing moves at rest.", "examples": [true] }, "axis": { "$ref": "#/$defs/AxisName", "default": "+x", "description": "aim: axis of the target that points at the sources, when no offset is kept.", "examples": ["+x"] }, "up_axis": { "$ref": "#/$defs/AxisName", "default": "+y", "description": "aim: axis of the target that keeps its direction against up.", "examples": ["+y"] }, "up": { "$ref": "#/$defs/id", "description": "aim: joint or control whose rotation carries the up axis; without it the target turns along the shortest arc.", "examples": ["head.chin"] }, "side": { "$ref": "#/$defs/SideOption" } } };
function validate345(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate345.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!func1.call(schema61.properties, key0)) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.omit !== void 0) {
      if (typeof data.omit !== "boolean") {
        const err1 = { instancePath: instancePath + "/omit", schemaPath: "#/properties/omit/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.kind !== void 0) {
      let data1 = data.kind;
      if (!(data1 === "parent" || data1 === "point" || data1 === "orient" || data1 === "scale" || data1 === "aim")) {
        const err2 = { instancePath: instancePath + "/kind", schemaPath: "#/properties/kind/enum", keyword: "enum", params: { allowedValues: schema61.properties.kind.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.target !== void 0) {
      if (!validate88(data.target, { instancePath: instancePath + "/target", parentData: data, parentDataProperty: "target", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.sources !== void 0) {
      let data3 = data.sources;
      if (data3 && typeof data3 == "object" && !Array.isArray(data3)) {
        if (Object.keys(data3).length < 1) {
          const err3 = { instancePath: instancePath + "/sources", schemaPath: "#/properties/sources/minProperties", keyword: "minProperties", params: { limit: 1 }, message: "must NOT have fewer than 1 properties" };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
        for (const key1 in data3) {
          const _errs8 = errors;
          if (!validate88(key1, { instancePath: instancePath + "/sources", parentData: data3, parentDataProperty: "sources", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid1 = _errs8 === errors;
          if (!valid1) {
            const err4 = { instancePath: instancePath + "/sources", schemaPath: "#/properties/sources/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err4];
            } else {
              vErrors.push(err4);
            }
            errors++;
          }
        }
        for (const key2 in data3) {
          if (!validate70(data3[key2], { instancePath: instancePath + "/sources/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data3, parentDataProperty: key2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err5 = { instancePath: instancePath + "/sources", schemaPath: "#/properties/sources/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.blend !== void 0) {
      if (!validate317(data.blend, { instancePath: instancePath + "/blend", parentData: data, parentDataProperty: "blend", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.keep_offset !== void 0) {
      if (typeof data.keep_offset !== "boolean") {
        const err6 = { instancePath: instancePath + "/keep_offset", schemaPath: "#/properties/keep_offset/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
    }
    if (data.axis !== void 0) {
      if (!validate63(data.axis, { instancePath: instancePath + "/axis", parentData: data, parentDataProperty: "axis", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate63.errors : vErrors.concat(validate63.errors);
        errors = vErrors.length;
      }
    }
    if (data.up_axis !== void 0) {
      if (!validate63(data.up_axis, { instancePath: instancePath + "/up_axis", parentData: data, parentDataProperty: "up_axis", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate63.errors : vErrors.concat(validate63.errors);
        errors = vErrors.length;
      }
    }
    if (data.up !== void 0) {
      if (!validate88(data.up, { instancePath: instancePath + "/up", parentData: data, parentDataProperty: "up", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err7 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err7];
    } else {
      vErrors.push(err7);
    }
    errors++;
  }
  validate345.errors = vErrors;
  return errors === 0;
}
validate345.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema62 = { "title": "Driver", "description": "Adds a value that follows a control to a channel of a joint or control.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "input": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$", "maxLength": 180, "description": "Attribute or channel of a control, as control.attribute.", "examples": ["jaw.open", "leg.left.foot.ty"] }, "target": { "$ref": "#/$defs/id", "description": "Joint or control whose channel it moves.", "examples": ["jaw.hinge"] }, "channel": { "enum": ["tx", "ty", "tz", "rx", "ry", "rz", "sx", "sy", "sz"], "description": "Channel that it is added to.", "examples": ["rz"] }, "keys": { "type": "array", "items": { "type": "array", "items": { "$ref": "#/$defs/NumberOrExpression" }, "minItems": 2, "maxItems": 2 }, "minItems": 2, "maxItems": 100, "description": "Curve as pairs of input and output, inputs ascending.", "examples": [[[0, 0], [1, 30]]] }, "curve": { "enum": ["linear", "smooth"], "default": "linear", "description": "How outputs run between keys: straight, or level at each key.", "examples": ["smooth"] }, "beyond": { "enum": ["hold", "extend"], "default": "hold", "description": "Beyond the end keys: hold the last output, or run on straight.", "examples": ["extend"] }, "side": { "$ref": "#/$defs/SideOption" } } };
function validate356(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate356.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "omit" || key0 === "input" || key0 === "target" || key0 === "channel" || key0 === "keys" || key0 === "curve" || key0 === "beyond" || key0 === "side")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.omit !== void 0) {
      if (typeof data.omit !== "boolean") {
        const err1 = { instancePath: instancePath + "/omit", schemaPath: "#/properties/omit/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.input !== void 0) {
      let data1 = data.input;
      if (typeof data1 === "string") {
        if (func2(data1) > 180) {
          const err2 = { instancePath: instancePath + "/input", schemaPath: "#/properties/input/maxLength", keyword: "maxLength", params: { limit: 180 }, message: "must NOT have more than 180 characters" };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
        if (!pattern13.test(data1)) {
          const err3 = { instancePath: instancePath + "/input", schemaPath: "#/properties/input/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$" }, message: 'must match pattern "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$"' };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
      } else {
        const err4 = { instancePath: instancePath + "/input", schemaPath: "#/properties/input/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.target !== void 0) {
      if (!validate88(data.target, { instancePath: instancePath + "/target", parentData: data, parentDataProperty: "target", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.channel !== void 0) {
      let data3 = data.channel;
      if (!(data3 === "tx" || data3 === "ty" || data3 === "tz" || data3 === "rx" || data3 === "ry" || data3 === "rz" || data3 === "sx" || data3 === "sy" || data3 === "sz")) {
        const err5 = { instancePath: instancePath + "/channel", schemaPath: "#/properties/channel/enum", keyword: "enum", params: { allowedValues: schema62.properties.channel.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.keys !== void 0) {
      let data4 = data.keys;
      if (Array.isArray(data4)) {
        if (data4.length > 100) {
          const err6 = { instancePath: instancePath + "/keys", schemaPath: "#/properties/keys/maxItems", keyword: "maxItems", params: { limit: 100 }, message: "must NOT have more than 100 items" };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
        if (data4.length < 2) {
          const err7 = { instancePath: instancePath + "/keys", schemaPath: "#/properties/keys/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
        const len0 = data4.length;
        for (let i0 = 0; i0 < len0; i0++) {
          let data5 = data4[i0];
          if (Array.isArray(data5)) {
            if (data5.length > 2) {
              const err8 = { instancePath: instancePath + "/keys/" + i0, schemaPath: "#/properties/keys/items/maxItems", keyword: "maxItems", params: { limit: 2 }, message: "must NOT have more than 2 items" };
              if (vErrors === null) {
                vErrors = [err8];
              } else {
                vErrors.push(err8);
              }
              errors++;
            }
            if (data5.length < 2) {
              const err9 = { instancePath: instancePath + "/keys/" + i0, schemaPath: "#/properties/keys/items/minItems", keyword: "minItems", params: { limit: 2 }, message: "must NOT have fewer than 2 items" };
              if (vErrors === null) {
                vErrors = [err9];
              } else {
                vErrors.push(err9);
              }
              errors++;
            }
            const len1 = data5.length;
            for (let i1 = 0; i1 < len1; i1++) {
              if (!validate70(data5[i1], { instancePath: instancePath + "/keys/" + i0 + "/" + i1, parentData: data5, parentDataProperty: i1, rootData, dynamicAnchors })) {
                vErrors = vErrors === null ? validate70.errors : vErrors.concat(validate70.errors);
                errors = vErrors.length;
              }
            }
          } else {
            const err10 = { instancePath: instancePath + "/keys/" + i0, schemaPath: "#/properties/keys/items/type", keyword: "type", params: { type: "array" }, message: "must be array" };
            if (vErrors === null) {
              vErrors = [err10];
            } else {
              vErrors.push(err10);
            }
            errors++;
          }
        }
      } else {
        const err11 = { instancePath: instancePath + "/keys", schemaPath: "#/properties/keys/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err11];
        } else {
          vErrors.push(err11);
        }
        errors++;
      }
    }
    if (data.curve !== void 0) {
      let data7 = data.curve;
      if (!(data7 === "linear" || data7 === "smooth")) {
        const err12 = { instancePath: instancePath + "/curve", schemaPath: "#/properties/curve/enum", keyword: "enum", params: { allowedValues: schema62.properties.curve.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
    }
    if (data.beyond !== void 0) {
      let data8 = data.beyond;
      if (!(data8 === "hold" || data8 === "extend")) {
        const err13 = { instancePath: instancePath + "/beyond", schemaPath: "#/properties/beyond/enum", keyword: "enum", params: { allowedValues: schema62.properties.beyond.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err13];
        } else {
          vErrors.push(err13);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err14 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err14];
    } else {
      vErrors.push(err14);
    }
    errors++;
  }
  validate356.errors = vErrors;
  return errors === 0;
}
validate356.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema63 = { "title": "GuideLine", "description": "A drawn, unselectable line from a control to the thing it steers.", "type": "object", "additionalProperties": false, "properties": { "omit": { "type": "boolean", "default": false, "description": "Leaves out what a part made under this id.", "examples": [true] }, "from": { "$ref": "#/$defs/id", "description": "Control at its start.", "examples": ["arm.left.pole"] }, "to": { "$ref": "#/$defs/id", "description": "Joint or control at its end.", "examples": ["arm.left.elbow"] }, "style": { "enum": ["dotted", "dashed", "solid"], "default": "dotted", "description": "How it is drawn.", "examples": ["dotted"] }, "side": { "$ref": "#/$defs/SideOption" } } };
function validate362(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate362.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "omit" || key0 === "from" || key0 === "to" || key0 === "style" || key0 === "side")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.omit !== void 0) {
      if (typeof data.omit !== "boolean") {
        const err1 = { instancePath: instancePath + "/omit", schemaPath: "#/properties/omit/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.from !== void 0) {
      if (!validate88(data.from, { instancePath: instancePath + "/from", parentData: data, parentDataProperty: "from", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.to !== void 0) {
      if (!validate88(data.to, { instancePath: instancePath + "/to", parentData: data, parentDataProperty: "to", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.style !== void 0) {
      let data3 = data.style;
      if (!(data3 === "dotted" || data3 === "dashed" || data3 === "solid")) {
        const err2 = { instancePath: instancePath + "/style", schemaPath: "#/properties/style/enum", keyword: "enum", params: { allowedValues: schema63.properties.style.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err3 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err3];
    } else {
      vErrors.push(err3);
    }
    errors++;
  }
  validate362.errors = vErrors;
  return errors === 0;
}
validate362.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate368(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate368.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "omit" || key0 === "mesh" || key0 === "role" || key0 === "side")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.omit !== void 0) {
      if (typeof data.omit !== "boolean") {
        const err1 = { instancePath: instancePath + "/omit", schemaPath: "#/properties/omit/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.mesh !== void 0) {
      let data1 = data.mesh;
      if (typeof data1 === "string") {
        if (func2(data1) > 200) {
          const err2 = { instancePath: instancePath + "/mesh", schemaPath: "#/properties/mesh/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
        if (func2(data1) < 1) {
          const err3 = { instancePath: instancePath + "/mesh", schemaPath: "#/properties/mesh/minLength", keyword: "minLength", params: { limit: 1 }, message: "must NOT have fewer than 1 characters" };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
      } else {
        const err4 = { instancePath: instancePath + "/mesh", schemaPath: "#/properties/mesh/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.role !== void 0) {
      if (!validate53(data.role, { instancePath: instancePath + "/role", parentData: data, parentDataProperty: "role", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err5 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err5];
    } else {
      vErrors.push(err5);
    }
    errors++;
  }
  validate368.errors = vErrors;
  return errors === 0;
}
validate368.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate373(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate373.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "omit" || key0 === "geometry" || key0 === "joints" || key0 === "influences" || key0 === "side")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.omit !== void 0) {
      if (typeof data.omit !== "boolean") {
        const err1 = { instancePath: instancePath + "/omit", schemaPath: "#/properties/omit/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.geometry !== void 0) {
      if (!validate88(data.geometry, { instancePath: instancePath + "/geometry", parentData: data, parentDataProperty: "geometry", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.joints !== void 0) {
      let data2 = data.joints;
      if (Array.isArray(data2)) {
        if (data2.length > 2e3) {
          const err2 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/maxItems", keyword: "maxItems", params: { limit: 2e3 }, message: "must NOT have more than 2000 items" };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
        if (data2.length < 1) {
          const err3 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
        const len0 = data2.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate88(data2[i0], { instancePath: instancePath + "/joints/" + i0, parentData: data2, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err4 = { instancePath: instancePath + "/joints", schemaPath: "#/properties/joints/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.influences !== void 0) {
      let data4 = data.influences;
      if (!(typeof data4 == "number" && (!(data4 % 1) && !isNaN(data4)) && isFinite(data4))) {
        const err5 = { instancePath: instancePath + "/influences", schemaPath: "#/properties/influences/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
      if (typeof data4 == "number" && isFinite(data4)) {
        if (data4 > 16 || isNaN(data4)) {
          const err6 = { instancePath: instancePath + "/influences", schemaPath: "#/properties/influences/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16 }, message: "must be <= 16" };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
        if (data4 < 1 || isNaN(data4)) {
          const err7 = { instancePath: instancePath + "/influences", schemaPath: "#/properties/influences/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err8 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err8];
    } else {
      vErrors.push(err8);
    }
    errors++;
  }
  validate373.errors = vErrors;
  return errors === 0;
}
validate373.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate379(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate379.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "omit" || key0 === "geometry" || key0 === "morph" || key0 === "weight" || key0 === "side")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.omit !== void 0) {
      if (typeof data.omit !== "boolean") {
        const err1 = { instancePath: instancePath + "/omit", schemaPath: "#/properties/omit/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.geometry !== void 0) {
      if (!validate88(data.geometry, { instancePath: instancePath + "/geometry", parentData: data, parentDataProperty: "geometry", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
        errors = vErrors.length;
      }
    }
    if (data.morph !== void 0) {
      let data2 = data.morph;
      if (typeof data2 === "string") {
        if (func2(data2) > 200) {
          const err2 = { instancePath: instancePath + "/morph", schemaPath: "#/properties/morph/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
        if (func2(data2) < 1) {
          const err3 = { instancePath: instancePath + "/morph", schemaPath: "#/properties/morph/minLength", keyword: "minLength", params: { limit: 1 }, message: "must NOT have fewer than 1 characters" };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
      } else {
        const err4 = { instancePath: instancePath + "/morph", schemaPath: "#/properties/morph/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.weight !== void 0) {
      if (!validate317(data.weight, { instancePath: instancePath + "/weight", parentData: data, parentDataProperty: "weight", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate317.errors : vErrors.concat(validate317.errors);
        errors = vErrors.length;
      }
    }
    if (data.side !== void 0) {
      if (!validate92(data.side, { instancePath: instancePath + "/side", parentData: data, parentDataProperty: "side", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate92.errors : vErrors.concat(validate92.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err5 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err5];
    } else {
      vErrors.push(err5);
    }
    errors++;
  }
  validate379.errors = vErrors;
  return errors === 0;
}
validate379.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var pattern4 = new RegExp("^[a-z][a-z0-9_]*@[1-9][0-9]*$", "u");
function validate52(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  ;
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate52.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.format === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "format" }, message: "must have required property 'format'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.recipe === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "recipe" }, message: "must have required property 'recipe'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema19.properties, key0)) {
        const err2 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.format !== void 0) {
      if (1 !== data.format) {
        const err3 = { instancePath: instancePath + "/format", schemaPath: "#/properties/format/const", keyword: "const", params: { allowedValue: 1 }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.recipe !== void 0) {
      if (!validate53(data.recipe, { instancePath: instancePath + "/recipe", parentData: data, parentDataProperty: "recipe", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
        errors = vErrors.length;
      }
    }
    if (data.title !== void 0) {
      if (!validate55(data.title, { instancePath: instancePath + "/title", parentData: data, parentDataProperty: "title", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate55.errors : vErrors.concat(validate55.errors);
        errors = vErrors.length;
      }
    }
    if (data.house !== void 0) {
      let data3 = data.house;
      if (typeof data3 === "string") {
        if (!pattern4.test(data3)) {
          const err4 = { instancePath: instancePath + "/house", schemaPath: "#/properties/house/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*@[1-9][0-9]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*@[1-9][0-9]*$"' };
          if (vErrors === null) {
            vErrors = [err4];
          } else {
            vErrors.push(err4);
          }
          errors++;
        }
      } else {
        const err5 = { instancePath: instancePath + "/house", schemaPath: "#/properties/house/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.extends !== void 0) {
      let data4 = data.extends;
      if (typeof data4 === "string") {
        if (!pattern4.test(data4)) {
          const err6 = { instancePath: instancePath + "/extends", schemaPath: "#/properties/extends/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*@[1-9][0-9]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*@[1-9][0-9]*$"' };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
      } else {
        const err7 = { instancePath: instancePath + "/extends", schemaPath: "#/properties/extends/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err7];
        } else {
          vErrors.push(err7);
        }
        errors++;
      }
    }
    if (data.params !== void 0) {
      let data5 = data.params;
      if (data5 && typeof data5 == "object" && !Array.isArray(data5)) {
        for (const key1 in data5) {
          const _errs11 = errors;
          if (!validate53(key1, { instancePath: instancePath + "/params", parentData: data5, parentDataProperty: "params", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid1 = _errs11 === errors;
          if (!valid1) {
            const err8 = { instancePath: instancePath + "/params", schemaPath: "#/properties/params/propertyNames", keyword: "propertyNames", params: { propertyName: key1 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err8];
            } else {
              vErrors.push(err8);
            }
            errors++;
          }
        }
        for (const key2 in data5) {
          if (!validate58(data5[key2], { instancePath: instancePath + "/params/" + key2.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data5, parentDataProperty: key2, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate58.errors : vErrors.concat(validate58.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err9 = { instancePath: instancePath + "/params", schemaPath: "#/properties/params/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err9];
        } else {
          vErrors.push(err9);
        }
        errors++;
      }
    }
    if (data.scene !== void 0) {
      if (!validate62(data.scene, { instancePath: instancePath + "/scene", parentData: data, parentDataProperty: "scene", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate62.errors : vErrors.concat(validate62.errors);
        errors = vErrors.length;
      }
    }
    if (data.landmarks !== void 0) {
      let data8 = data.landmarks;
      if (data8 && typeof data8 == "object" && !Array.isArray(data8)) {
        for (const key3 in data8) {
          const _errs17 = errors;
          if (!validate53(key3, { instancePath: instancePath + "/landmarks", parentData: data8, parentDataProperty: "landmarks", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid3 = _errs17 === errors;
          if (!valid3) {
            const err10 = { instancePath: instancePath + "/landmarks", schemaPath: "#/properties/landmarks/propertyNames", keyword: "propertyNames", params: { propertyName: key3 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err10];
            } else {
              vErrors.push(err10);
            }
            errors++;
          }
        }
        for (const key4 in data8) {
          if (!validate68(data8[key4], { instancePath: instancePath + "/landmarks/" + key4.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data8, parentDataProperty: key4, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate68.errors : vErrors.concat(validate68.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err11 = { instancePath: instancePath + "/landmarks", schemaPath: "#/properties/landmarks/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err11];
        } else {
          vErrors.push(err11);
        }
        errors++;
      }
    }
    if (data.roles !== void 0) {
      let data10 = data.roles;
      if (data10 && typeof data10 == "object" && !Array.isArray(data10)) {
        for (const key5 in data10) {
          const _errs22 = errors;
          if (!validate53(key5, { instancePath: instancePath + "/roles", parentData: data10, parentDataProperty: "roles", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid5 = _errs22 === errors;
          if (!valid5) {
            const err12 = { instancePath: instancePath + "/roles", schemaPath: "#/properties/roles/propertyNames", keyword: "propertyNames", params: { propertyName: key5 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err12];
            } else {
              vErrors.push(err12);
            }
            errors++;
          }
        }
        for (const key6 in data10) {
          if (!validate79(data10[key6], { instancePath: instancePath + "/roles/" + key6.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data10, parentDataProperty: key6, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate79.errors : vErrors.concat(validate79.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err13 = { instancePath: instancePath + "/roles", schemaPath: "#/properties/roles/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err13];
        } else {
          vErrors.push(err13);
        }
        errors++;
      }
    }
    if (data.containers !== void 0) {
      let data12 = data.containers;
      if (data12 && typeof data12 == "object" && !Array.isArray(data12)) {
        for (const key7 in data12) {
          const _errs27 = errors;
          if (!validate53(key7, { instancePath: instancePath + "/containers", parentData: data12, parentDataProperty: "containers", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid7 = _errs27 === errors;
          if (!valid7) {
            const err14 = { instancePath: instancePath + "/containers", schemaPath: "#/properties/containers/propertyNames", keyword: "propertyNames", params: { propertyName: key7 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err14];
            } else {
              vErrors.push(err14);
            }
            errors++;
          }
        }
        for (const key8 in data12) {
          if (!validate84(data12[key8], { instancePath: instancePath + "/containers/" + key8.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data12, parentDataProperty: key8, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate84.errors : vErrors.concat(validate84.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err15 = { instancePath: instancePath + "/containers", schemaPath: "#/properties/containers/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err15];
        } else {
          vErrors.push(err15);
        }
        errors++;
      }
    }
    if (data.parts !== void 0) {
      let data14 = data.parts;
      if (data14 && typeof data14 == "object" && !Array.isArray(data14)) {
        for (const key9 in data14) {
          const _errs32 = errors;
          if (!validate88(key9, { instancePath: instancePath + "/parts", parentData: data14, parentDataProperty: "parts", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid9 = _errs32 === errors;
          if (!valid9) {
            const err16 = { instancePath: instancePath + "/parts", schemaPath: "#/properties/parts/propertyNames", keyword: "propertyNames", params: { propertyName: key9 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err16];
            } else {
              vErrors.push(err16);
            }
            errors++;
          }
        }
        for (const key10 in data14) {
          if (!validate90(data14[key10], { instancePath: instancePath + "/parts/" + key10.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data14, parentDataProperty: key10, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate90.errors : vErrors.concat(validate90.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err17 = { instancePath: instancePath + "/parts", schemaPath: "#/properties/parts/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err17];
        } else {
          vErrors.push(err17);
        }
        errors++;
      }
    }
    if (data.chains !== void 0) {
      let data16 = data.chains;
      if (data16 && typeof data16 == "object" && !Array.isArray(data16)) {
        for (const key11 in data16) {
          const _errs37 = errors;
          if (!validate88(key11, { instancePath: instancePath + "/chains", parentData: data16, parentDataProperty: "chains", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid11 = _errs37 === errors;
          if (!valid11) {
            const err18 = { instancePath: instancePath + "/chains", schemaPath: "#/properties/chains/propertyNames", keyword: "propertyNames", params: { propertyName: key11 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err18];
            } else {
              vErrors.push(err18);
            }
            errors++;
          }
        }
        for (const key12 in data16) {
          if (!validate274(data16[key12], { instancePath: instancePath + "/chains/" + key12.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data16, parentDataProperty: key12, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate274.errors : vErrors.concat(validate274.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err19 = { instancePath: instancePath + "/chains", schemaPath: "#/properties/chains/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err19];
        } else {
          vErrors.push(err19);
        }
        errors++;
      }
    }
    if (data.controls !== void 0) {
      let data18 = data.controls;
      if (data18 && typeof data18 == "object" && !Array.isArray(data18)) {
        for (const key13 in data18) {
          const _errs42 = errors;
          if (!validate88(key13, { instancePath: instancePath + "/controls", parentData: data18, parentDataProperty: "controls", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid13 = _errs42 === errors;
          if (!valid13) {
            const err20 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/propertyNames", keyword: "propertyNames", params: { propertyName: key13 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err20];
            } else {
              vErrors.push(err20);
            }
            errors++;
          }
        }
        for (const key14 in data18) {
          if (!validate285(data18[key14], { instancePath: instancePath + "/controls/" + key14.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data18, parentDataProperty: key14, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate285.errors : vErrors.concat(validate285.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err21 = { instancePath: instancePath + "/controls", schemaPath: "#/properties/controls/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err21];
        } else {
          vErrors.push(err21);
        }
        errors++;
      }
    }
    if (data.solvers !== void 0) {
      let data20 = data.solvers;
      if (data20 && typeof data20 == "object" && !Array.isArray(data20)) {
        for (const key15 in data20) {
          const _errs47 = errors;
          if (!validate88(key15, { instancePath: instancePath + "/solvers", parentData: data20, parentDataProperty: "solvers", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid15 = _errs47 === errors;
          if (!valid15) {
            const err22 = { instancePath: instancePath + "/solvers", schemaPath: "#/properties/solvers/propertyNames", keyword: "propertyNames", params: { propertyName: key15 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err22];
            } else {
              vErrors.push(err22);
            }
            errors++;
          }
        }
        for (const key16 in data20) {
          if (!validate313(data20[key16], { instancePath: instancePath + "/solvers/" + key16.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data20, parentDataProperty: key16, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate313.errors : vErrors.concat(validate313.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err23 = { instancePath: instancePath + "/solvers", schemaPath: "#/properties/solvers/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err23];
        } else {
          vErrors.push(err23);
        }
        errors++;
      }
    }
    if (data.constraints !== void 0) {
      let data22 = data.constraints;
      if (data22 && typeof data22 == "object" && !Array.isArray(data22)) {
        for (const key17 in data22) {
          const _errs52 = errors;
          if (!validate88(key17, { instancePath: instancePath + "/constraints", parentData: data22, parentDataProperty: "constraints", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid17 = _errs52 === errors;
          if (!valid17) {
            const err24 = { instancePath: instancePath + "/constraints", schemaPath: "#/properties/constraints/propertyNames", keyword: "propertyNames", params: { propertyName: key17 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err24];
            } else {
              vErrors.push(err24);
            }
            errors++;
          }
        }
        for (const key18 in data22) {
          if (!validate345(data22[key18], { instancePath: instancePath + "/constraints/" + key18.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data22, parentDataProperty: key18, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate345.errors : vErrors.concat(validate345.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err25 = { instancePath: instancePath + "/constraints", schemaPath: "#/properties/constraints/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err25];
        } else {
          vErrors.push(err25);
        }
        errors++;
      }
    }
    if (data.drivers !== void 0) {
      let data24 = data.drivers;
      if (data24 && typeof data24 == "object" && !Array.isArray(data24)) {
        for (const key19 in data24) {
          const _errs57 = errors;
          if (!validate88(key19, { instancePath: instancePath + "/drivers", parentData: data24, parentDataProperty: "drivers", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid19 = _errs57 === errors;
          if (!valid19) {
            const err26 = { instancePath: instancePath + "/drivers", schemaPath: "#/properties/drivers/propertyNames", keyword: "propertyNames", params: { propertyName: key19 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err26];
            } else {
              vErrors.push(err26);
            }
            errors++;
          }
        }
        for (const key20 in data24) {
          if (!validate356(data24[key20], { instancePath: instancePath + "/drivers/" + key20.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data24, parentDataProperty: key20, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate356.errors : vErrors.concat(validate356.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err27 = { instancePath: instancePath + "/drivers", schemaPath: "#/properties/drivers/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err27];
        } else {
          vErrors.push(err27);
        }
        errors++;
      }
    }
    if (data.guide_lines !== void 0) {
      let data26 = data.guide_lines;
      if (data26 && typeof data26 == "object" && !Array.isArray(data26)) {
        for (const key21 in data26) {
          const _errs62 = errors;
          if (!validate88(key21, { instancePath: instancePath + "/guide_lines", parentData: data26, parentDataProperty: "guide_lines", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid21 = _errs62 === errors;
          if (!valid21) {
            const err28 = { instancePath: instancePath + "/guide_lines", schemaPath: "#/properties/guide_lines/propertyNames", keyword: "propertyNames", params: { propertyName: key21 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err28];
            } else {
              vErrors.push(err28);
            }
            errors++;
          }
        }
        for (const key22 in data26) {
          if (!validate362(data26[key22], { instancePath: instancePath + "/guide_lines/" + key22.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data26, parentDataProperty: key22, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate362.errors : vErrors.concat(validate362.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err29 = { instancePath: instancePath + "/guide_lines", schemaPath: "#/properties/guide_lines/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err29];
        } else {
          vErrors.push(err29);
        }
        errors++;
      }
    }
    if (data.geometry !== void 0) {
      let data28 = data.geometry;
      if (data28 && typeof data28 == "object" && !Array.isArray(data28)) {
        for (const key23 in data28) {
          const _errs67 = errors;
          if (!validate88(key23, { instancePath: instancePath + "/geometry", parentData: data28, parentDataProperty: "geometry", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid23 = _errs67 === errors;
          if (!valid23) {
            const err30 = { instancePath: instancePath + "/geometry", schemaPath: "#/properties/geometry/propertyNames", keyword: "propertyNames", params: { propertyName: key23 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err30];
            } else {
              vErrors.push(err30);
            }
            errors++;
          }
        }
        for (const key24 in data28) {
          if (!validate368(data28[key24], { instancePath: instancePath + "/geometry/" + key24.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data28, parentDataProperty: key24, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate368.errors : vErrors.concat(validate368.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err31 = { instancePath: instancePath + "/geometry", schemaPath: "#/properties/geometry/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err31];
        } else {
          vErrors.push(err31);
        }
        errors++;
      }
    }
    if (data.skins !== void 0) {
      let data30 = data.skins;
      if (data30 && typeof data30 == "object" && !Array.isArray(data30)) {
        for (const key25 in data30) {
          const _errs72 = errors;
          if (!validate88(key25, { instancePath: instancePath + "/skins", parentData: data30, parentDataProperty: "skins", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid25 = _errs72 === errors;
          if (!valid25) {
            const err32 = { instancePath: instancePath + "/skins", schemaPath: "#/properties/skins/propertyNames", keyword: "propertyNames", params: { propertyName: key25 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err32];
            } else {
              vErrors.push(err32);
            }
            errors++;
          }
        }
        for (const key26 in data30) {
          if (!validate373(data30[key26], { instancePath: instancePath + "/skins/" + key26.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data30, parentDataProperty: key26, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate373.errors : vErrors.concat(validate373.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err33 = { instancePath: instancePath + "/skins", schemaPath: "#/properties/skins/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err33];
        } else {
          vErrors.push(err33);
        }
        errors++;
      }
    }
    if (data.shapes !== void 0) {
      let data32 = data.shapes;
      if (data32 && typeof data32 == "object" && !Array.isArray(data32)) {
        for (const key27 in data32) {
          const _errs77 = errors;
          if (!validate88(key27, { instancePath: instancePath + "/shapes", parentData: data32, parentDataProperty: "shapes", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate88.errors : vErrors.concat(validate88.errors);
            errors = vErrors.length;
          }
          var valid27 = _errs77 === errors;
          if (!valid27) {
            const err34 = { instancePath: instancePath + "/shapes", schemaPath: "#/properties/shapes/propertyNames", keyword: "propertyNames", params: { propertyName: key27 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err34];
            } else {
              vErrors.push(err34);
            }
            errors++;
          }
        }
        for (const key28 in data32) {
          if (!validate379(data32[key28], { instancePath: instancePath + "/shapes/" + key28.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data32, parentDataProperty: key28, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate379.errors : vErrors.concat(validate379.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err35 = { instancePath: instancePath + "/shapes", schemaPath: "#/properties/shapes/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err35];
        } else {
          vErrors.push(err35);
        }
        errors++;
      }
    }
    if (data.notes !== void 0) {
      let data34 = data.notes;
      if (data34 && typeof data34 == "object" && !Array.isArray(data34)) {
        for (const key29 in data34) {
          const _errs82 = errors;
          if (!validate53(key29, { instancePath: instancePath + "/notes", parentData: data34, parentDataProperty: "notes", rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
          var valid29 = _errs82 === errors;
          if (!valid29) {
            const err36 = { instancePath: instancePath + "/notes", schemaPath: "#/properties/notes/propertyNames", keyword: "propertyNames", params: { propertyName: key29 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err36];
            } else {
              vErrors.push(err36);
            }
            errors++;
          }
        }
        for (const key30 in data34) {
          let data35 = data34[key30];
          if (typeof data35 !== "string" && !(typeof data35 == "number" && isFinite(data35)) && typeof data35 !== "boolean") {
            const err37 = { instancePath: instancePath + "/notes/" + key30.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/notes/additionalProperties/type", keyword: "type", params: { type: schema19.properties.notes.additionalProperties.type }, message: "must be string,number,boolean" };
            if (vErrors === null) {
              vErrors = [err37];
            } else {
              vErrors.push(err37);
            }
            errors++;
          }
          if (typeof data35 === "string") {
            if (func2(data35) > 2e3) {
              const err38 = { instancePath: instancePath + "/notes/" + key30.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/notes/additionalProperties/maxLength", keyword: "maxLength", params: { limit: 2e3 }, message: "must NOT have more than 2000 characters" };
              if (vErrors === null) {
                vErrors = [err38];
              } else {
                vErrors.push(err38);
              }
              errors++;
            }
          }
        }
      } else {
        const err39 = { instancePath: instancePath + "/notes", schemaPath: "#/properties/notes/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err39];
        } else {
          vErrors.push(err39);
        }
        errors++;
      }
    }
    if (data.deliver !== void 0) {
      let data36 = data.deliver;
      if (Array.isArray(data36)) {
        if (data36.length > 20) {
          const err40 = { instancePath: instancePath + "/deliver", schemaPath: "#/properties/deliver/maxItems", keyword: "maxItems", params: { limit: 20 }, message: "must NOT have more than 20 items" };
          if (vErrors === null) {
            vErrors = [err40];
          } else {
            vErrors.push(err40);
          }
          errors++;
        }
        const len0 = data36.length;
        for (let i0 = 0; i0 < len0; i0++) {
          if (!validate53(data36[i0], { instancePath: instancePath + "/deliver/" + i0, parentData: data36, parentDataProperty: i0, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate53.errors : vErrors.concat(validate53.errors);
            errors = vErrors.length;
          }
        }
        let i1 = data36.length;
        let j0;
        if (i1 > 1) {
          outer0: for (; i1--; ) {
            for (j0 = i1; j0--; ) {
              if (func0(data36[i1], data36[j0])) {
                const err41 = { instancePath: instancePath + "/deliver", schemaPath: "#/properties/deliver/uniqueItems", keyword: "uniqueItems", params: { i: i1, j: j0 }, message: "must NOT have duplicate items (items ## " + j0 + " and " + i1 + " are identical)" };
                if (vErrors === null) {
                  vErrors = [err41];
                } else {
                  vErrors.push(err41);
                }
                errors++;
                break outer0;
              }
            }
          }
        }
      } else {
        const err42 = { instancePath: instancePath + "/deliver", schemaPath: "#/properties/deliver/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err42];
        } else {
          vErrors.push(err42);
        }
        errors++;
      }
    }
  } else {
    const err43 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err43];
    } else {
      vErrors.push(err43);
    }
    errors++;
  }
  validate52.errors = vErrors;
  return errors === 0;
}
validate52.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var validateHouse = validate386;
var schema67 = { "$schema": "https://json-schema.org/draft/2020-12/schema", "$id": "https://pintle.invalid/schema/house/1", "title": "HouseRules", "description": "House rules, format 1: a studio's own standard for containers, roles, names and severities.", "type": "object", "required": ["format", "house", "naming", "roles", "containers"], "additionalProperties": false, "properties": { "format": { "const": 1, "description": "Version of the house-rules language.", "examples": [1] }, "house": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60, "description": "Name of the house rules.", "examples": ["tidewrack"] }, "version": { "type": "integer", "minimum": 1, "default": 1, "description": "Version of the house rules.", "examples": [1] }, "title": { "type": "string", "maxLength": 200, "description": "What people call them.", "examples": ["Tidewrack house rules"] }, "naming": { "title": "NamingRules", "description": "How names in the scene are made from ids.", "type": "object", "required": ["pattern"], "additionalProperties": false, "properties": { "pattern": { "type": "array", "minItems": 1, "items": { "enum": ["character", "role", "side", "path", "leaf", "index"] }, "description": "Parts of a name in order; empty ones are left out. path: the id without its side and index. leaf: the last segment of the id. index: the padded number of a counted joint.", "examples": [["character", "side", "path", "index", "role"]] }, "separator": { "type": "string", "pattern": "^[A-Za-z0-9_]{0,3}$", "default": "_", "description": "Text between the parts.", "examples": ["_"] }, "index_digits": { "type": "integer", "minimum": 2, "maximum": 6, "default": 2, "description": "Least count of digits in an index.", "examples": [2] }, "sides": { "type": "object", "additionalProperties": false, "description": "Text for each side.", "properties": { "left": { "type": "string", "pattern": "^[A-Za-z0-9_]*$", "maxLength": 20, "default": "l", "description": "Text for the left side.", "examples": ["l"] }, "right": { "type": "string", "pattern": "^[A-Za-z0-9_]*$", "maxLength": 20, "default": "r", "description": "Text for the right side.", "examples": ["r"] }, "centre": { "type": "string", "pattern": "^[A-Za-z0-9_]*$", "maxLength": 20, "default": "", "description": "Text for the centre.", "examples": ["c"] } }, "examples": [{ "left": "l", "right": "r", "centre": "c" }] }, "longest": { "type": "integer", "minimum": 8, "maximum": 255, "default": 64, "description": "Longest name allowed, in characters.", "examples": [64] } } }, "roles": { "description": "What things are for. The compiler itself uses carrier, control, skin, guide_line and note.", "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$" }, "additionalProperties": { "$ref": "#/$defs/Role" } }, "containers": { "description": "The container tree.", "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$" }, "additionalProperties": { "$ref": "#/$defs/Container" } }, "severities": { "description": "Changes the severity of findings, by code. An error of the language itself stays an error.", "type": "object", "additionalProperties": { "enum": ["error", "warning", "info", "off"] }, "default": {}, "examples": [{ "landmark-unused": "off" }] }, "profiles": { "description": "Delivery profiles: what receiving systems want. A recipe names those it is delivered to.", "type": "object", "propertyNames": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/DeliveryProfile" }, "default": {}, "examples": [{ "realtime": { "formats": ["gltf"], "skin_joints_only": true, "joints_at_most": 120 } }] } }, "$defs": { "Container": { "title": "Container", "description": "A group that holds one class of things.", "type": "object", "additionalProperties": false, "properties": { "parent": { "$ref": "#/$defs/word", "description": "Container it lies in; without one it lies directly in the rig.", "examples": ["carry"] }, "moves": { "enum": ["carried", "parked"], "description": "carried: moves with the root control. parked: stays in the world. Inherited from the parent container; parked at the top.", "examples": ["parked"] }, "shown": { "type": "boolean", "default": true, "description": "Whether an animator sees what is inside.", "examples": [false] }, "title": { "$ref": "#/$defs/line", "description": "What people call it.", "examples": ["Skin joints"] } } }, "DeliveryProfile": { "title": "DeliveryProfile", "description": "What one receiving system wants.", "type": "object", "required": ["formats"], "additionalProperties": false, "properties": { "title": { "type": "string", "maxLength": 200, "description": "What people call it.", "examples": ["Realtime engine"] }, "formats": { "type": "array", "items": { "enum": ["gltf", "usd"] }, "minItems": 1, "uniqueItems": true, "description": "Files that are made: glTF 2.0 (.glb), which is always Y up, Z forward, in metres; OpenUSD (.usda), in the axes and unit below.", "examples": [["gltf"]] }, "up": { "enum": ["+y", "+z"], "default": "+y", "description": "usd: axis that points up; +y or +z.", "examples": ["+z"] }, "forward": { "enum": ["+x", "-x", "+y", "-y", "+z", "-z"], "default": "+z", "description": "usd: axis the character faces along.", "examples": ["-y"] }, "unit": { "enum": ["mm", "cm", "m"], "default": "cm", "description": "usd: unit of length.", "examples": ["m"] }, "skin_joints_only": { "type": "boolean", "default": true, "description": "Leaves out helper joints; what hangs on one then hangs on the joint above it.", "examples": [true] }, "joints_at_most": { "type": "integer", "minimum": 1, "maximum": 1e5, "description": "Most joints that are taken.", "examples": [120] }, "depth_at_most": { "type": "integer", "minimum": 1, "maximum": 1e5, "description": "Most joints that may hang below one another.", "examples": [32] }, "influences_at_most": { "type": "integer", "minimum": 1, "maximum": 16, "description": "Most joints that one vertex may follow.", "examples": [4] }, "names": { "type": "object", "additionalProperties": false, "description": "What names of joints may be.", "properties": { "longest": { "type": "integer", "minimum": 4, "maximum": 255, "description": "Most characters of a name.", "examples": [63] }, "letters": { "enum": ["any", "lower", "upper"], "default": "any", "description": "Letters allowed.", "examples": ["lower"] }, "digits": { "type": "boolean", "default": true, "description": "Whether digits are allowed.", "examples": [true] } }, "examples": [{ "longest": 63 }] }, "root_at_origin": { "type": "boolean", "default": false, "description": "The topmost joint must stand at the origin.", "examples": [true] }, "animation": { "enum": ["none", "range_of_motion"], "default": "range_of_motion", "description": "Animation that is baked in: every control turned to both ends of its range, one after the other.", "examples": ["none"] }, "bones": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[A-Za-z][A-Za-z0-9_]*$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/ProfileBone" }, "default": {}, "description": "Bones the receiver knows by its own names, each with the joint of ours that it is.", "examples": [{ "hips": { "joint": "spine.hips", "required": true } }] } } }, "ProfileBone": { "title": "ProfileBone", "description": "One bone a receiver knows by name.", "type": "object", "required": ["joint"], "additionalProperties": false, "properties": { "joint": { "type": "string", "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$", "maxLength": 120, "description": "Id of the joint that it is.", "examples": ["arm.left.elbow"] }, "required": { "type": "boolean", "default": false, "description": "Whether the receiver refuses skeletons without it.", "examples": [true] }, "parent": { "type": "string", "pattern": "^[A-Za-z][A-Za-z0-9_]*$", "maxLength": 60, "description": "Bone that it must hang on, with other joints between if need be; when that is not there, the next above it.", "examples": ["spine"] } }, "examples": [{ "joint": "spine.hips", "required": true }] }, "Role": { "title": "Role", "description": "What a thing is for; decides its container, name token and visibility.", "type": "object", "additionalProperties": false, "properties": { "token": { "type": "string", "pattern": "^[A-Za-z0-9_]*$", "maxLength": 20, "description": "Text that the naming pattern puts for this role; may be empty.", "examples": ["sk"] }, "container": { "$ref": "#/$defs/word", "description": "Container that holds things of this role.", "examples": ["skin"] }, "shown": { "type": "boolean", "default": true, "description": "Whether an animator sees things of this role.", "examples": [false] }, "selectable": { "type": "boolean", "default": true, "description": "Whether an animator can select things of this role.", "examples": [false] }, "title": { "$ref": "#/$defs/line", "description": "What people call it.", "examples": ["Skin joint"] } } }, "line": { "type": "string", "maxLength": 200 }, "word": { "type": "string", "pattern": "^[a-z][a-z0-9_]*$", "maxLength": 60 } } };
var pattern31 = new RegExp("^[A-Za-z0-9_]{0,3}$", "u");
function validate388(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate388.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (typeof data === "string") {
    if (func2(data) > 60) {
      const err0 = { instancePath, schemaPath: "#/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (!pattern3.test(data)) {
      const err1 = { instancePath, schemaPath: "#/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"' };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
  } else {
    const err2 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "string" }, message: "must be string" };
    if (vErrors === null) {
      vErrors = [err2];
    } else {
      vErrors.push(err2);
    }
    errors++;
  }
  validate388.errors = vErrors;
  return errors === 0;
}
validate388.evaluated = { "dynamicProps": false, "dynamicItems": false };
function validate390(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate390.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (typeof data === "string") {
    if (func2(data) > 200) {
      const err0 = { instancePath, schemaPath: "#/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
  } else {
    const err1 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "string" }, message: "must be string" };
    if (vErrors === null) {
      vErrors = [err1];
    } else {
      vErrors.push(err1);
    }
    errors++;
  }
  validate390.errors = vErrors;
  return errors === 0;
}
validate390.evaluated = { "dynamicProps": false, "dynamicItems": false };
function validate387(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate387.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "token" || key0 === "container" || key0 === "shown" || key0 === "selectable" || key0 === "title")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.token !== void 0) {
      let data0 = data.token;
      if (typeof data0 === "string") {
        if (func2(data0) > 20) {
          const err1 = { instancePath: instancePath + "/token", schemaPath: "#/properties/token/maxLength", keyword: "maxLength", params: { limit: 20 }, message: "must NOT have more than 20 characters" };
          if (vErrors === null) {
            vErrors = [err1];
          } else {
            vErrors.push(err1);
          }
          errors++;
        }
        if (!pattern8.test(data0)) {
          const err2 = { instancePath: instancePath + "/token", schemaPath: "#/properties/token/pattern", keyword: "pattern", params: { pattern: "^[A-Za-z0-9_]*$" }, message: 'must match pattern "^[A-Za-z0-9_]*$"' };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
      } else {
        const err3 = { instancePath: instancePath + "/token", schemaPath: "#/properties/token/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.container !== void 0) {
      if (!validate388(data.container, { instancePath: instancePath + "/container", parentData: data, parentDataProperty: "container", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate388.errors : vErrors.concat(validate388.errors);
        errors = vErrors.length;
      }
    }
    if (data.shown !== void 0) {
      if (typeof data.shown !== "boolean") {
        const err4 = { instancePath: instancePath + "/shown", schemaPath: "#/properties/shown/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.selectable !== void 0) {
      if (typeof data.selectable !== "boolean") {
        const err5 = { instancePath: instancePath + "/selectable", schemaPath: "#/properties/selectable/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.title !== void 0) {
      if (!validate390(data.title, { instancePath: instancePath + "/title", parentData: data, parentDataProperty: "title", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate390.errors : vErrors.concat(validate390.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err6 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err6];
    } else {
      vErrors.push(err6);
    }
    errors++;
  }
  validate387.errors = vErrors;
  return errors === 0;
}
validate387.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate393(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate393.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    for (const key0 in data) {
      if (!(key0 === "parent" || key0 === "moves" || key0 === "shown" || key0 === "title")) {
        const err0 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err0];
        } else {
          vErrors.push(err0);
        }
        errors++;
      }
    }
    if (data.parent !== void 0) {
      if (!validate388(data.parent, { instancePath: instancePath + "/parent", parentData: data, parentDataProperty: "parent", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate388.errors : vErrors.concat(validate388.errors);
        errors = vErrors.length;
      }
    }
    if (data.moves !== void 0) {
      let data1 = data.moves;
      if (!(data1 === "carried" || data1 === "parked")) {
        const err1 = { instancePath: instancePath + "/moves", schemaPath: "#/properties/moves/enum", keyword: "enum", params: { allowedValues: schema29.properties.moves.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.shown !== void 0) {
      if (typeof data.shown !== "boolean") {
        const err2 = { instancePath: instancePath + "/shown", schemaPath: "#/properties/shown/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err2];
        } else {
          vErrors.push(err2);
        }
        errors++;
      }
    }
    if (data.title !== void 0) {
      if (!validate390(data.title, { instancePath: instancePath + "/title", parentData: data, parentDataProperty: "title", rootData, dynamicAnchors })) {
        vErrors = vErrors === null ? validate390.errors : vErrors.concat(validate390.errors);
        errors = vErrors.length;
      }
    }
  } else {
    const err3 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err3];
    } else {
      vErrors.push(err3);
    }
    errors++;
  }
  validate393.errors = vErrors;
  return errors === 0;
}
validate393.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
var schema72 = { "title": "DeliveryProfile", "description": "What one receiving system wants.", "type": "object", "required": ["formats"], "additionalProperties": false, "properties": { "title": { "type": "string", "maxLength": 200, "description": "What people call it.", "examples": ["Realtime engine"] }, "formats": { "type": "array", "items": { "enum": ["gltf", "usd"] }, "minItems": 1, "uniqueItems": true, "description": "Files that are made: glTF 2.0 (.glb), which is always Y up, Z forward, in metres; OpenUSD (.usda), in the axes and unit below.", "examples": [["gltf"]] }, "up": { "enum": ["+y", "+z"], "default": "+y", "description": "usd: axis that points up; +y or +z.", "examples": ["+z"] }, "forward": { "enum": ["+x", "-x", "+y", "-y", "+z", "-z"], "default": "+z", "description": "usd: axis the character faces along.", "examples": ["-y"] }, "unit": { "enum": ["mm", "cm", "m"], "default": "cm", "description": "usd: unit of length.", "examples": ["m"] }, "skin_joints_only": { "type": "boolean", "default": true, "description": "Leaves out helper joints; what hangs on one then hangs on the joint above it.", "examples": [true] }, "joints_at_most": { "type": "integer", "minimum": 1, "maximum": 1e5, "description": "Most joints that are taken.", "examples": [120] }, "depth_at_most": { "type": "integer", "minimum": 1, "maximum": 1e5, "description": "Most joints that may hang below one another.", "examples": [32] }, "influences_at_most": { "type": "integer", "minimum": 1, "maximum": 16, "description": "Most joints that one vertex may follow.", "examples": [4] }, "names": { "type": "object", "additionalProperties": false, "description": "What names of joints may be.", "properties": { "longest": { "type": "integer", "minimum": 4, "maximum": 255, "description": "Most characters of a name.", "examples": [63] }, "letters": { "enum": ["any", "lower", "upper"], "default": "any", "description": "Letters allowed.", "examples": ["lower"] }, "digits": { "type": "boolean", "default": true, "description": "Whether digits are allowed.", "examples": [true] } }, "examples": [{ "longest": 63 }] }, "root_at_origin": { "type": "boolean", "default": false, "description": "The topmost joint must stand at the origin.", "examples": [true] }, "animation": { "enum": ["none", "range_of_motion"], "default": "range_of_motion", "description": "Animation that is baked in: every control turned to both ends of its range, one after the other.", "examples": ["none"] }, "bones": { "type": "object", "propertyNames": { "type": "string", "pattern": "^[A-Za-z][A-Za-z0-9_]*$", "maxLength": 60 }, "additionalProperties": { "$ref": "#/$defs/ProfileBone" }, "default": {}, "description": "Bones the receiver knows by its own names, each with the joint of ours that it is.", "examples": [{ "hips": { "joint": "spine.hips", "required": true } }] } } };
var pattern40 = new RegExp("^[A-Za-z][A-Za-z0-9_]*$", "u");
function validate398(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate398.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.joint === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "joint" }, message: "must have required property 'joint'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!(key0 === "joint" || key0 === "required" || key0 === "parent")) {
        const err1 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.joint !== void 0) {
      let data0 = data.joint;
      if (typeof data0 === "string") {
        if (func2(data0) > 120) {
          const err2 = { instancePath: instancePath + "/joint", schemaPath: "#/properties/joint/maxLength", keyword: "maxLength", params: { limit: 120 }, message: "must NOT have more than 120 characters" };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
        if (!pattern9.test(data0)) {
          const err3 = { instancePath: instancePath + "/joint", schemaPath: "#/properties/joint/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$"' };
          if (vErrors === null) {
            vErrors = [err3];
          } else {
            vErrors.push(err3);
          }
          errors++;
        }
      } else {
        const err4 = { instancePath: instancePath + "/joint", schemaPath: "#/properties/joint/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err4];
        } else {
          vErrors.push(err4);
        }
        errors++;
      }
    }
    if (data.required !== void 0) {
      if (typeof data.required !== "boolean") {
        const err5 = { instancePath: instancePath + "/required", schemaPath: "#/properties/required/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.parent !== void 0) {
      let data2 = data.parent;
      if (typeof data2 === "string") {
        if (func2(data2) > 60) {
          const err6 = { instancePath: instancePath + "/parent", schemaPath: "#/properties/parent/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
          if (vErrors === null) {
            vErrors = [err6];
          } else {
            vErrors.push(err6);
          }
          errors++;
        }
        if (!pattern40.test(data2)) {
          const err7 = { instancePath: instancePath + "/parent", schemaPath: "#/properties/parent/pattern", keyword: "pattern", params: { pattern: "^[A-Za-z][A-Za-z0-9_]*$" }, message: 'must match pattern "^[A-Za-z][A-Za-z0-9_]*$"' };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
      } else {
        const err8 = { instancePath: instancePath + "/parent", schemaPath: "#/properties/parent/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
    }
  } else {
    const err9 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err9];
    } else {
      vErrors.push(err9);
    }
    errors++;
  }
  validate398.errors = vErrors;
  return errors === 0;
}
validate398.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate397(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate397.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.formats === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "formats" }, message: "must have required property 'formats'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema72.properties, key0)) {
        const err1 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err1];
        } else {
          vErrors.push(err1);
        }
        errors++;
      }
    }
    if (data.title !== void 0) {
      let data0 = data.title;
      if (typeof data0 === "string") {
        if (func2(data0) > 200) {
          const err2 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          if (vErrors === null) {
            vErrors = [err2];
          } else {
            vErrors.push(err2);
          }
          errors++;
        }
      } else {
        const err3 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err3];
        } else {
          vErrors.push(err3);
        }
        errors++;
      }
    }
    if (data.formats !== void 0) {
      let data1 = data.formats;
      if (Array.isArray(data1)) {
        if (data1.length < 1) {
          const err4 = { instancePath: instancePath + "/formats", schemaPath: "#/properties/formats/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
          if (vErrors === null) {
            vErrors = [err4];
          } else {
            vErrors.push(err4);
          }
          errors++;
        }
        const len0 = data1.length;
        for (let i0 = 0; i0 < len0; i0++) {
          let data2 = data1[i0];
          if (!(data2 === "gltf" || data2 === "usd")) {
            const err5 = { instancePath: instancePath + "/formats/" + i0, schemaPath: "#/properties/formats/items/enum", keyword: "enum", params: { allowedValues: schema72.properties.formats.items.enum }, message: "must be equal to one of the allowed values" };
            if (vErrors === null) {
              vErrors = [err5];
            } else {
              vErrors.push(err5);
            }
            errors++;
          }
        }
        let i1 = data1.length;
        let j0;
        if (i1 > 1) {
          outer0: for (; i1--; ) {
            for (j0 = i1; j0--; ) {
              if (func0(data1[i1], data1[j0])) {
                const err6 = { instancePath: instancePath + "/formats", schemaPath: "#/properties/formats/uniqueItems", keyword: "uniqueItems", params: { i: i1, j: j0 }, message: "must NOT have duplicate items (items ## " + j0 + " and " + i1 + " are identical)" };
                if (vErrors === null) {
                  vErrors = [err6];
                } else {
                  vErrors.push(err6);
                }
                errors++;
                break outer0;
              }
            }
          }
        }
      } else {
        const err7 = { instancePath: instancePath + "/formats", schemaPath: "#/properties/formats/type", keyword: "type", params: { type: "array" }, message: "must be array" };
        if (vErrors === null) {
          vErrors = [err7];
        } else {
          vErrors.push(err7);
        }
        errors++;
      }
    }
    if (data.up !== void 0) {
      let data3 = data.up;
      if (!(data3 === "+y" || data3 === "+z")) {
        const err8 = { instancePath: instancePath + "/up", schemaPath: "#/properties/up/enum", keyword: "enum", params: { allowedValues: schema72.properties.up.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err8];
        } else {
          vErrors.push(err8);
        }
        errors++;
      }
    }
    if (data.forward !== void 0) {
      let data4 = data.forward;
      if (!(data4 === "+x" || data4 === "-x" || data4 === "+y" || data4 === "-y" || data4 === "+z" || data4 === "-z")) {
        const err9 = { instancePath: instancePath + "/forward", schemaPath: "#/properties/forward/enum", keyword: "enum", params: { allowedValues: schema72.properties.forward.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err9];
        } else {
          vErrors.push(err9);
        }
        errors++;
      }
    }
    if (data.unit !== void 0) {
      let data5 = data.unit;
      if (!(data5 === "mm" || data5 === "cm" || data5 === "m")) {
        const err10 = { instancePath: instancePath + "/unit", schemaPath: "#/properties/unit/enum", keyword: "enum", params: { allowedValues: schema72.properties.unit.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err10];
        } else {
          vErrors.push(err10);
        }
        errors++;
      }
    }
    if (data.skin_joints_only !== void 0) {
      if (typeof data.skin_joints_only !== "boolean") {
        const err11 = { instancePath: instancePath + "/skin_joints_only", schemaPath: "#/properties/skin_joints_only/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err11];
        } else {
          vErrors.push(err11);
        }
        errors++;
      }
    }
    if (data.joints_at_most !== void 0) {
      let data7 = data.joints_at_most;
      if (!(typeof data7 == "number" && (!(data7 % 1) && !isNaN(data7)) && isFinite(data7))) {
        const err12 = { instancePath: instancePath + "/joints_at_most", schemaPath: "#/properties/joints_at_most/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err12];
        } else {
          vErrors.push(err12);
        }
        errors++;
      }
      if (typeof data7 == "number" && isFinite(data7)) {
        if (data7 > 1e5 || isNaN(data7)) {
          const err13 = { instancePath: instancePath + "/joints_at_most", schemaPath: "#/properties/joints_at_most/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e5 }, message: "must be <= 100000" };
          if (vErrors === null) {
            vErrors = [err13];
          } else {
            vErrors.push(err13);
          }
          errors++;
        }
        if (data7 < 1 || isNaN(data7)) {
          const err14 = { instancePath: instancePath + "/joints_at_most", schemaPath: "#/properties/joints_at_most/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
          if (vErrors === null) {
            vErrors = [err14];
          } else {
            vErrors.push(err14);
          }
          errors++;
        }
      }
    }
    if (data.depth_at_most !== void 0) {
      let data8 = data.depth_at_most;
      if (!(typeof data8 == "number" && (!(data8 % 1) && !isNaN(data8)) && isFinite(data8))) {
        const err15 = { instancePath: instancePath + "/depth_at_most", schemaPath: "#/properties/depth_at_most/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err15];
        } else {
          vErrors.push(err15);
        }
        errors++;
      }
      if (typeof data8 == "number" && isFinite(data8)) {
        if (data8 > 1e5 || isNaN(data8)) {
          const err16 = { instancePath: instancePath + "/depth_at_most", schemaPath: "#/properties/depth_at_most/maximum", keyword: "maximum", params: { comparison: "<=", limit: 1e5 }, message: "must be <= 100000" };
          if (vErrors === null) {
            vErrors = [err16];
          } else {
            vErrors.push(err16);
          }
          errors++;
        }
        if (data8 < 1 || isNaN(data8)) {
          const err17 = { instancePath: instancePath + "/depth_at_most", schemaPath: "#/properties/depth_at_most/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
          if (vErrors === null) {
            vErrors = [err17];
          } else {
            vErrors.push(err17);
          }
          errors++;
        }
      }
    }
    if (data.influences_at_most !== void 0) {
      let data9 = data.influences_at_most;
      if (!(typeof data9 == "number" && (!(data9 % 1) && !isNaN(data9)) && isFinite(data9))) {
        const err18 = { instancePath: instancePath + "/influences_at_most", schemaPath: "#/properties/influences_at_most/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err18];
        } else {
          vErrors.push(err18);
        }
        errors++;
      }
      if (typeof data9 == "number" && isFinite(data9)) {
        if (data9 > 16 || isNaN(data9)) {
          const err19 = { instancePath: instancePath + "/influences_at_most", schemaPath: "#/properties/influences_at_most/maximum", keyword: "maximum", params: { comparison: "<=", limit: 16 }, message: "must be <= 16" };
          if (vErrors === null) {
            vErrors = [err19];
          } else {
            vErrors.push(err19);
          }
          errors++;
        }
        if (data9 < 1 || isNaN(data9)) {
          const err20 = { instancePath: instancePath + "/influences_at_most", schemaPath: "#/properties/influences_at_most/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
          if (vErrors === null) {
            vErrors = [err20];
          } else {
            vErrors.push(err20);
          }
          errors++;
        }
      }
    }
    if (data.names !== void 0) {
      let data10 = data.names;
      if (data10 && typeof data10 == "object" && !Array.isArray(data10)) {
        for (const key1 in data10) {
          if (!(key1 === "longest" || key1 === "letters" || key1 === "digits")) {
            const err21 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            if (vErrors === null) {
              vErrors = [err21];
            } else {
              vErrors.push(err21);
            }
            errors++;
          }
        }
        if (data10.longest !== void 0) {
          let data11 = data10.longest;
          if (!(typeof data11 == "number" && (!(data11 % 1) && !isNaN(data11)) && isFinite(data11))) {
            const err22 = { instancePath: instancePath + "/names/longest", schemaPath: "#/properties/names/properties/longest/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            if (vErrors === null) {
              vErrors = [err22];
            } else {
              vErrors.push(err22);
            }
            errors++;
          }
          if (typeof data11 == "number" && isFinite(data11)) {
            if (data11 > 255 || isNaN(data11)) {
              const err23 = { instancePath: instancePath + "/names/longest", schemaPath: "#/properties/names/properties/longest/maximum", keyword: "maximum", params: { comparison: "<=", limit: 255 }, message: "must be <= 255" };
              if (vErrors === null) {
                vErrors = [err23];
              } else {
                vErrors.push(err23);
              }
              errors++;
            }
            if (data11 < 4 || isNaN(data11)) {
              const err24 = { instancePath: instancePath + "/names/longest", schemaPath: "#/properties/names/properties/longest/minimum", keyword: "minimum", params: { comparison: ">=", limit: 4 }, message: "must be >= 4" };
              if (vErrors === null) {
                vErrors = [err24];
              } else {
                vErrors.push(err24);
              }
              errors++;
            }
          }
        }
        if (data10.letters !== void 0) {
          let data12 = data10.letters;
          if (!(data12 === "any" || data12 === "lower" || data12 === "upper")) {
            const err25 = { instancePath: instancePath + "/names/letters", schemaPath: "#/properties/names/properties/letters/enum", keyword: "enum", params: { allowedValues: schema72.properties.names.properties.letters.enum }, message: "must be equal to one of the allowed values" };
            if (vErrors === null) {
              vErrors = [err25];
            } else {
              vErrors.push(err25);
            }
            errors++;
          }
        }
        if (data10.digits !== void 0) {
          if (typeof data10.digits !== "boolean") {
            const err26 = { instancePath: instancePath + "/names/digits", schemaPath: "#/properties/names/properties/digits/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
            if (vErrors === null) {
              vErrors = [err26];
            } else {
              vErrors.push(err26);
            }
            errors++;
          }
        }
      } else {
        const err27 = { instancePath: instancePath + "/names", schemaPath: "#/properties/names/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err27];
        } else {
          vErrors.push(err27);
        }
        errors++;
      }
    }
    if (data.root_at_origin !== void 0) {
      if (typeof data.root_at_origin !== "boolean") {
        const err28 = { instancePath: instancePath + "/root_at_origin", schemaPath: "#/properties/root_at_origin/type", keyword: "type", params: { type: "boolean" }, message: "must be boolean" };
        if (vErrors === null) {
          vErrors = [err28];
        } else {
          vErrors.push(err28);
        }
        errors++;
      }
    }
    if (data.animation !== void 0) {
      let data15 = data.animation;
      if (!(data15 === "none" || data15 === "range_of_motion")) {
        const err29 = { instancePath: instancePath + "/animation", schemaPath: "#/properties/animation/enum", keyword: "enum", params: { allowedValues: schema72.properties.animation.enum }, message: "must be equal to one of the allowed values" };
        if (vErrors === null) {
          vErrors = [err29];
        } else {
          vErrors.push(err29);
        }
        errors++;
      }
    }
    if (data.bones !== void 0) {
      let data16 = data.bones;
      if (data16 && typeof data16 == "object" && !Array.isArray(data16)) {
        for (const key2 in data16) {
          const _errs31 = errors;
          if (typeof key2 === "string") {
            if (func2(key2) > 60) {
              const err30 = { instancePath: instancePath + "/bones", schemaPath: "#/properties/bones/propertyNames/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters", propertyName: key2 };
              if (vErrors === null) {
                vErrors = [err30];
              } else {
                vErrors.push(err30);
              }
              errors++;
            }
            if (!pattern40.test(key2)) {
              const err31 = { instancePath: instancePath + "/bones", schemaPath: "#/properties/bones/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[A-Za-z][A-Za-z0-9_]*$" }, message: 'must match pattern "^[A-Za-z][A-Za-z0-9_]*$"', propertyName: key2 };
              if (vErrors === null) {
                vErrors = [err31];
              } else {
                vErrors.push(err31);
              }
              errors++;
            }
          } else {
            const err32 = { instancePath: instancePath + "/bones", schemaPath: "#/properties/bones/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key2 };
            if (vErrors === null) {
              vErrors = [err32];
            } else {
              vErrors.push(err32);
            }
            errors++;
          }
          var valid5 = _errs31 === errors;
          if (!valid5) {
            const err33 = { instancePath: instancePath + "/bones", schemaPath: "#/properties/bones/propertyNames", keyword: "propertyNames", params: { propertyName: key2 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err33];
            } else {
              vErrors.push(err33);
            }
            errors++;
          }
        }
        for (const key3 in data16) {
          if (!validate398(data16[key3], { instancePath: instancePath + "/bones/" + key3.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data16, parentDataProperty: key3, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate398.errors : vErrors.concat(validate398.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err34 = { instancePath: instancePath + "/bones", schemaPath: "#/properties/bones/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err34];
        } else {
          vErrors.push(err34);
        }
        errors++;
      }
    }
  } else {
    const err35 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err35];
    } else {
      vErrors.push(err35);
    }
    errors++;
  }
  validate397.errors = vErrors;
  return errors === 0;
}
validate397.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
function validate386(data, { instancePath = "", parentData, parentDataProperty, rootData = data, dynamicAnchors = {} } = {}) {
  ;
  let vErrors = null;
  let errors = 0;
  const evaluated0 = validate386.evaluated;
  if (evaluated0.dynamicProps) {
    evaluated0.props = void 0;
  }
  if (evaluated0.dynamicItems) {
    evaluated0.items = void 0;
  }
  if (data && typeof data == "object" && !Array.isArray(data)) {
    if (data.format === void 0) {
      const err0 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "format" }, message: "must have required property 'format'" };
      if (vErrors === null) {
        vErrors = [err0];
      } else {
        vErrors.push(err0);
      }
      errors++;
    }
    if (data.house === void 0) {
      const err1 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "house" }, message: "must have required property 'house'" };
      if (vErrors === null) {
        vErrors = [err1];
      } else {
        vErrors.push(err1);
      }
      errors++;
    }
    if (data.naming === void 0) {
      const err2 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "naming" }, message: "must have required property 'naming'" };
      if (vErrors === null) {
        vErrors = [err2];
      } else {
        vErrors.push(err2);
      }
      errors++;
    }
    if (data.roles === void 0) {
      const err3 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "roles" }, message: "must have required property 'roles'" };
      if (vErrors === null) {
        vErrors = [err3];
      } else {
        vErrors.push(err3);
      }
      errors++;
    }
    if (data.containers === void 0) {
      const err4 = { instancePath, schemaPath: "#/required", keyword: "required", params: { missingProperty: "containers" }, message: "must have required property 'containers'" };
      if (vErrors === null) {
        vErrors = [err4];
      } else {
        vErrors.push(err4);
      }
      errors++;
    }
    for (const key0 in data) {
      if (!func1.call(schema67.properties, key0)) {
        const err5 = { instancePath, schemaPath: "#/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key0 }, message: "must NOT have additional properties" };
        if (vErrors === null) {
          vErrors = [err5];
        } else {
          vErrors.push(err5);
        }
        errors++;
      }
    }
    if (data.format !== void 0) {
      if (1 !== data.format) {
        const err6 = { instancePath: instancePath + "/format", schemaPath: "#/properties/format/const", keyword: "const", params: { allowedValue: 1 }, message: "must be equal to constant" };
        if (vErrors === null) {
          vErrors = [err6];
        } else {
          vErrors.push(err6);
        }
        errors++;
      }
    }
    if (data.house !== void 0) {
      let data1 = data.house;
      if (typeof data1 === "string") {
        if (func2(data1) > 60) {
          const err7 = { instancePath: instancePath + "/house", schemaPath: "#/properties/house/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters" };
          if (vErrors === null) {
            vErrors = [err7];
          } else {
            vErrors.push(err7);
          }
          errors++;
        }
        if (!pattern3.test(data1)) {
          const err8 = { instancePath: instancePath + "/house", schemaPath: "#/properties/house/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"' };
          if (vErrors === null) {
            vErrors = [err8];
          } else {
            vErrors.push(err8);
          }
          errors++;
        }
      } else {
        const err9 = { instancePath: instancePath + "/house", schemaPath: "#/properties/house/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err9];
        } else {
          vErrors.push(err9);
        }
        errors++;
      }
    }
    if (data.version !== void 0) {
      let data2 = data.version;
      if (!(typeof data2 == "number" && (!(data2 % 1) && !isNaN(data2)) && isFinite(data2))) {
        const err10 = { instancePath: instancePath + "/version", schemaPath: "#/properties/version/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
        if (vErrors === null) {
          vErrors = [err10];
        } else {
          vErrors.push(err10);
        }
        errors++;
      }
      if (typeof data2 == "number" && isFinite(data2)) {
        if (data2 < 1 || isNaN(data2)) {
          const err11 = { instancePath: instancePath + "/version", schemaPath: "#/properties/version/minimum", keyword: "minimum", params: { comparison: ">=", limit: 1 }, message: "must be >= 1" };
          if (vErrors === null) {
            vErrors = [err11];
          } else {
            vErrors.push(err11);
          }
          errors++;
        }
      }
    }
    if (data.title !== void 0) {
      let data3 = data.title;
      if (typeof data3 === "string") {
        if (func2(data3) > 200) {
          const err12 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/maxLength", keyword: "maxLength", params: { limit: 200 }, message: "must NOT have more than 200 characters" };
          if (vErrors === null) {
            vErrors = [err12];
          } else {
            vErrors.push(err12);
          }
          errors++;
        }
      } else {
        const err13 = { instancePath: instancePath + "/title", schemaPath: "#/properties/title/type", keyword: "type", params: { type: "string" }, message: "must be string" };
        if (vErrors === null) {
          vErrors = [err13];
        } else {
          vErrors.push(err13);
        }
        errors++;
      }
    }
    if (data.naming !== void 0) {
      let data4 = data.naming;
      if (data4 && typeof data4 == "object" && !Array.isArray(data4)) {
        if (data4.pattern === void 0) {
          const err14 = { instancePath: instancePath + "/naming", schemaPath: "#/properties/naming/required", keyword: "required", params: { missingProperty: "pattern" }, message: "must have required property 'pattern'" };
          if (vErrors === null) {
            vErrors = [err14];
          } else {
            vErrors.push(err14);
          }
          errors++;
        }
        for (const key1 in data4) {
          if (!(key1 === "pattern" || key1 === "separator" || key1 === "index_digits" || key1 === "sides" || key1 === "longest")) {
            const err15 = { instancePath: instancePath + "/naming", schemaPath: "#/properties/naming/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key1 }, message: "must NOT have additional properties" };
            if (vErrors === null) {
              vErrors = [err15];
            } else {
              vErrors.push(err15);
            }
            errors++;
          }
        }
        if (data4.pattern !== void 0) {
          let data5 = data4.pattern;
          if (Array.isArray(data5)) {
            if (data5.length < 1) {
              const err16 = { instancePath: instancePath + "/naming/pattern", schemaPath: "#/properties/naming/properties/pattern/minItems", keyword: "minItems", params: { limit: 1 }, message: "must NOT have fewer than 1 items" };
              if (vErrors === null) {
                vErrors = [err16];
              } else {
                vErrors.push(err16);
              }
              errors++;
            }
            const len0 = data5.length;
            for (let i0 = 0; i0 < len0; i0++) {
              let data6 = data5[i0];
              if (!(data6 === "character" || data6 === "role" || data6 === "side" || data6 === "path" || data6 === "leaf" || data6 === "index")) {
                const err17 = { instancePath: instancePath + "/naming/pattern/" + i0, schemaPath: "#/properties/naming/properties/pattern/items/enum", keyword: "enum", params: { allowedValues: schema67.properties.naming.properties.pattern.items.enum }, message: "must be equal to one of the allowed values" };
                if (vErrors === null) {
                  vErrors = [err17];
                } else {
                  vErrors.push(err17);
                }
                errors++;
              }
            }
          } else {
            const err18 = { instancePath: instancePath + "/naming/pattern", schemaPath: "#/properties/naming/properties/pattern/type", keyword: "type", params: { type: "array" }, message: "must be array" };
            if (vErrors === null) {
              vErrors = [err18];
            } else {
              vErrors.push(err18);
            }
            errors++;
          }
        }
        if (data4.separator !== void 0) {
          let data7 = data4.separator;
          if (typeof data7 === "string") {
            if (!pattern31.test(data7)) {
              const err19 = { instancePath: instancePath + "/naming/separator", schemaPath: "#/properties/naming/properties/separator/pattern", keyword: "pattern", params: { pattern: "^[A-Za-z0-9_]{0,3}$" }, message: 'must match pattern "^[A-Za-z0-9_]{0,3}$"' };
              if (vErrors === null) {
                vErrors = [err19];
              } else {
                vErrors.push(err19);
              }
              errors++;
            }
          } else {
            const err20 = { instancePath: instancePath + "/naming/separator", schemaPath: "#/properties/naming/properties/separator/type", keyword: "type", params: { type: "string" }, message: "must be string" };
            if (vErrors === null) {
              vErrors = [err20];
            } else {
              vErrors.push(err20);
            }
            errors++;
          }
        }
        if (data4.index_digits !== void 0) {
          let data8 = data4.index_digits;
          if (!(typeof data8 == "number" && (!(data8 % 1) && !isNaN(data8)) && isFinite(data8))) {
            const err21 = { instancePath: instancePath + "/naming/index_digits", schemaPath: "#/properties/naming/properties/index_digits/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            if (vErrors === null) {
              vErrors = [err21];
            } else {
              vErrors.push(err21);
            }
            errors++;
          }
          if (typeof data8 == "number" && isFinite(data8)) {
            if (data8 > 6 || isNaN(data8)) {
              const err22 = { instancePath: instancePath + "/naming/index_digits", schemaPath: "#/properties/naming/properties/index_digits/maximum", keyword: "maximum", params: { comparison: "<=", limit: 6 }, message: "must be <= 6" };
              if (vErrors === null) {
                vErrors = [err22];
              } else {
                vErrors.push(err22);
              }
              errors++;
            }
            if (data8 < 2 || isNaN(data8)) {
              const err23 = { instancePath: instancePath + "/naming/index_digits", schemaPath: "#/properties/naming/properties/index_digits/minimum", keyword: "minimum", params: { comparison: ">=", limit: 2 }, message: "must be >= 2" };
              if (vErrors === null) {
                vErrors = [err23];
              } else {
                vErrors.push(err23);
              }
              errors++;
            }
          }
        }
        if (data4.sides !== void 0) {
          let data9 = data4.sides;
          if (data9 && typeof data9 == "object" && !Array.isArray(data9)) {
            for (const key2 in data9) {
              if (!(key2 === "left" || key2 === "right" || key2 === "centre")) {
                const err24 = { instancePath: instancePath + "/naming/sides", schemaPath: "#/properties/naming/properties/sides/additionalProperties", keyword: "additionalProperties", params: { additionalProperty: key2 }, message: "must NOT have additional properties" };
                if (vErrors === null) {
                  vErrors = [err24];
                } else {
                  vErrors.push(err24);
                }
                errors++;
              }
            }
            if (data9.left !== void 0) {
              let data10 = data9.left;
              if (typeof data10 === "string") {
                if (func2(data10) > 20) {
                  const err25 = { instancePath: instancePath + "/naming/sides/left", schemaPath: "#/properties/naming/properties/sides/properties/left/maxLength", keyword: "maxLength", params: { limit: 20 }, message: "must NOT have more than 20 characters" };
                  if (vErrors === null) {
                    vErrors = [err25];
                  } else {
                    vErrors.push(err25);
                  }
                  errors++;
                }
                if (!pattern8.test(data10)) {
                  const err26 = { instancePath: instancePath + "/naming/sides/left", schemaPath: "#/properties/naming/properties/sides/properties/left/pattern", keyword: "pattern", params: { pattern: "^[A-Za-z0-9_]*$" }, message: 'must match pattern "^[A-Za-z0-9_]*$"' };
                  if (vErrors === null) {
                    vErrors = [err26];
                  } else {
                    vErrors.push(err26);
                  }
                  errors++;
                }
              } else {
                const err27 = { instancePath: instancePath + "/naming/sides/left", schemaPath: "#/properties/naming/properties/sides/properties/left/type", keyword: "type", params: { type: "string" }, message: "must be string" };
                if (vErrors === null) {
                  vErrors = [err27];
                } else {
                  vErrors.push(err27);
                }
                errors++;
              }
            }
            if (data9.right !== void 0) {
              let data11 = data9.right;
              if (typeof data11 === "string") {
                if (func2(data11) > 20) {
                  const err28 = { instancePath: instancePath + "/naming/sides/right", schemaPath: "#/properties/naming/properties/sides/properties/right/maxLength", keyword: "maxLength", params: { limit: 20 }, message: "must NOT have more than 20 characters" };
                  if (vErrors === null) {
                    vErrors = [err28];
                  } else {
                    vErrors.push(err28);
                  }
                  errors++;
                }
                if (!pattern8.test(data11)) {
                  const err29 = { instancePath: instancePath + "/naming/sides/right", schemaPath: "#/properties/naming/properties/sides/properties/right/pattern", keyword: "pattern", params: { pattern: "^[A-Za-z0-9_]*$" }, message: 'must match pattern "^[A-Za-z0-9_]*$"' };
                  if (vErrors === null) {
                    vErrors = [err29];
                  } else {
                    vErrors.push(err29);
                  }
                  errors++;
                }
              } else {
                const err30 = { instancePath: instancePath + "/naming/sides/right", schemaPath: "#/properties/naming/properties/sides/properties/right/type", keyword: "type", params: { type: "string" }, message: "must be string" };
                if (vErrors === null) {
                  vErrors = [err30];
                } else {
                  vErrors.push(err30);
                }
                errors++;
              }
            }
            if (data9.centre !== void 0) {
              let data12 = data9.centre;
              if (typeof data12 === "string") {
                if (func2(data12) > 20) {
                  const err31 = { instancePath: instancePath + "/naming/sides/centre", schemaPath: "#/properties/naming/properties/sides/properties/centre/maxLength", keyword: "maxLength", params: { limit: 20 }, message: "must NOT have more than 20 characters" };
                  if (vErrors === null) {
                    vErrors = [err31];
                  } else {
                    vErrors.push(err31);
                  }
                  errors++;
                }
                if (!pattern8.test(data12)) {
                  const err32 = { instancePath: instancePath + "/naming/sides/centre", schemaPath: "#/properties/naming/properties/sides/properties/centre/pattern", keyword: "pattern", params: { pattern: "^[A-Za-z0-9_]*$" }, message: 'must match pattern "^[A-Za-z0-9_]*$"' };
                  if (vErrors === null) {
                    vErrors = [err32];
                  } else {
                    vErrors.push(err32);
                  }
                  errors++;
                }
              } else {
                const err33 = { instancePath: instancePath + "/naming/sides/centre", schemaPath: "#/properties/naming/properties/sides/properties/centre/type", keyword: "type", params: { type: "string" }, message: "must be string" };
                if (vErrors === null) {
                  vErrors = [err33];
                } else {
                  vErrors.push(err33);
                }
                errors++;
              }
            }
          } else {
            const err34 = { instancePath: instancePath + "/naming/sides", schemaPath: "#/properties/naming/properties/sides/type", keyword: "type", params: { type: "object" }, message: "must be object" };
            if (vErrors === null) {
              vErrors = [err34];
            } else {
              vErrors.push(err34);
            }
            errors++;
          }
        }
        if (data4.longest !== void 0) {
          let data13 = data4.longest;
          if (!(typeof data13 == "number" && (!(data13 % 1) && !isNaN(data13)) && isFinite(data13))) {
            const err35 = { instancePath: instancePath + "/naming/longest", schemaPath: "#/properties/naming/properties/longest/type", keyword: "type", params: { type: "integer" }, message: "must be integer" };
            if (vErrors === null) {
              vErrors = [err35];
            } else {
              vErrors.push(err35);
            }
            errors++;
          }
          if (typeof data13 == "number" && isFinite(data13)) {
            if (data13 > 255 || isNaN(data13)) {
              const err36 = { instancePath: instancePath + "/naming/longest", schemaPath: "#/properties/naming/properties/longest/maximum", keyword: "maximum", params: { comparison: "<=", limit: 255 }, message: "must be <= 255" };
              if (vErrors === null) {
                vErrors = [err36];
              } else {
                vErrors.push(err36);
              }
              errors++;
            }
            if (data13 < 8 || isNaN(data13)) {
              const err37 = { instancePath: instancePath + "/naming/longest", schemaPath: "#/properties/naming/properties/longest/minimum", keyword: "minimum", params: { comparison: ">=", limit: 8 }, message: "must be >= 8" };
              if (vErrors === null) {
                vErrors = [err37];
              } else {
                vErrors.push(err37);
              }
              errors++;
            }
          }
        }
      } else {
        const err38 = { instancePath: instancePath + "/naming", schemaPath: "#/properties/naming/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err38];
        } else {
          vErrors.push(err38);
        }
        errors++;
      }
    }
    if (data.roles !== void 0) {
      let data14 = data.roles;
      if (data14 && typeof data14 == "object" && !Array.isArray(data14)) {
        for (const key3 in data14) {
          const _errs32 = errors;
          if (typeof key3 === "string") {
            if (!pattern3.test(key3)) {
              const err39 = { instancePath: instancePath + "/roles", schemaPath: "#/properties/roles/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"', propertyName: key3 };
              if (vErrors === null) {
                vErrors = [err39];
              } else {
                vErrors.push(err39);
              }
              errors++;
            }
          } else {
            const err40 = { instancePath: instancePath + "/roles", schemaPath: "#/properties/roles/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key3 };
            if (vErrors === null) {
              vErrors = [err40];
            } else {
              vErrors.push(err40);
            }
            errors++;
          }
          var valid5 = _errs32 === errors;
          if (!valid5) {
            const err41 = { instancePath: instancePath + "/roles", schemaPath: "#/properties/roles/propertyNames", keyword: "propertyNames", params: { propertyName: key3 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err41];
            } else {
              vErrors.push(err41);
            }
            errors++;
          }
        }
        for (const key4 in data14) {
          if (!validate387(data14[key4], { instancePath: instancePath + "/roles/" + key4.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data14, parentDataProperty: key4, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate387.errors : vErrors.concat(validate387.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err42 = { instancePath: instancePath + "/roles", schemaPath: "#/properties/roles/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err42];
        } else {
          vErrors.push(err42);
        }
        errors++;
      }
    }
    if (data.containers !== void 0) {
      let data16 = data.containers;
      if (data16 && typeof data16 == "object" && !Array.isArray(data16)) {
        for (const key5 in data16) {
          const _errs38 = errors;
          if (typeof key5 === "string") {
            if (!pattern3.test(key5)) {
              const err43 = { instancePath: instancePath + "/containers", schemaPath: "#/properties/containers/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"', propertyName: key5 };
              if (vErrors === null) {
                vErrors = [err43];
              } else {
                vErrors.push(err43);
              }
              errors++;
            }
          } else {
            const err44 = { instancePath: instancePath + "/containers", schemaPath: "#/properties/containers/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key5 };
            if (vErrors === null) {
              vErrors = [err44];
            } else {
              vErrors.push(err44);
            }
            errors++;
          }
          var valid7 = _errs38 === errors;
          if (!valid7) {
            const err45 = { instancePath: instancePath + "/containers", schemaPath: "#/properties/containers/propertyNames", keyword: "propertyNames", params: { propertyName: key5 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err45];
            } else {
              vErrors.push(err45);
            }
            errors++;
          }
        }
        for (const key6 in data16) {
          if (!validate393(data16[key6], { instancePath: instancePath + "/containers/" + key6.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data16, parentDataProperty: key6, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate393.errors : vErrors.concat(validate393.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err46 = { instancePath: instancePath + "/containers", schemaPath: "#/properties/containers/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err46];
        } else {
          vErrors.push(err46);
        }
        errors++;
      }
    }
    if (data.severities !== void 0) {
      let data18 = data.severities;
      if (data18 && typeof data18 == "object" && !Array.isArray(data18)) {
        for (const key7 in data18) {
          let data19 = data18[key7];
          if (!(data19 === "error" || data19 === "warning" || data19 === "info" || data19 === "off")) {
            const err47 = { instancePath: instancePath + "/severities/" + key7.replace(/~/g, "~0").replace(/\//g, "~1"), schemaPath: "#/properties/severities/additionalProperties/enum", keyword: "enum", params: { allowedValues: schema67.properties.severities.additionalProperties.enum }, message: "must be equal to one of the allowed values" };
            if (vErrors === null) {
              vErrors = [err47];
            } else {
              vErrors.push(err47);
            }
            errors++;
          }
        }
      } else {
        const err48 = { instancePath: instancePath + "/severities", schemaPath: "#/properties/severities/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err48];
        } else {
          vErrors.push(err48);
        }
        errors++;
      }
    }
    if (data.profiles !== void 0) {
      let data20 = data.profiles;
      if (data20 && typeof data20 == "object" && !Array.isArray(data20)) {
        for (const key8 in data20) {
          const _errs48 = errors;
          if (typeof key8 === "string") {
            if (func2(key8) > 60) {
              const err49 = { instancePath: instancePath + "/profiles", schemaPath: "#/properties/profiles/propertyNames/maxLength", keyword: "maxLength", params: { limit: 60 }, message: "must NOT have more than 60 characters", propertyName: key8 };
              if (vErrors === null) {
                vErrors = [err49];
              } else {
                vErrors.push(err49);
              }
              errors++;
            }
            if (!pattern3.test(key8)) {
              const err50 = { instancePath: instancePath + "/profiles", schemaPath: "#/properties/profiles/propertyNames/pattern", keyword: "pattern", params: { pattern: "^[a-z][a-z0-9_]*$" }, message: 'must match pattern "^[a-z][a-z0-9_]*$"', propertyName: key8 };
              if (vErrors === null) {
                vErrors = [err50];
              } else {
                vErrors.push(err50);
              }
              errors++;
            }
          } else {
            const err51 = { instancePath: instancePath + "/profiles", schemaPath: "#/properties/profiles/propertyNames/type", keyword: "type", params: { type: "string" }, message: "must be string", propertyName: key8 };
            if (vErrors === null) {
              vErrors = [err51];
            } else {
              vErrors.push(err51);
            }
            errors++;
          }
          var valid10 = _errs48 === errors;
          if (!valid10) {
            const err52 = { instancePath: instancePath + "/profiles", schemaPath: "#/properties/profiles/propertyNames", keyword: "propertyNames", params: { propertyName: key8 }, message: "property name must be valid" };
            if (vErrors === null) {
              vErrors = [err52];
            } else {
              vErrors.push(err52);
            }
            errors++;
          }
        }
        for (const key9 in data20) {
          if (!validate397(data20[key9], { instancePath: instancePath + "/profiles/" + key9.replace(/~/g, "~0").replace(/\//g, "~1"), parentData: data20, parentDataProperty: key9, rootData, dynamicAnchors })) {
            vErrors = vErrors === null ? validate397.errors : vErrors.concat(validate397.errors);
            errors = vErrors.length;
          }
        }
      } else {
        const err53 = { instancePath: instancePath + "/profiles", schemaPath: "#/properties/profiles/type", keyword: "type", params: { type: "object" }, message: "must be object" };
        if (vErrors === null) {
          vErrors = [err53];
        } else {
          vErrors.push(err53);
        }
        errors++;
      }
    }
  } else {
    const err54 = { instancePath, schemaPath: "#/type", keyword: "type", params: { type: "object" }, message: "must be object" };
    if (vErrors === null) {
      vErrors = [err54];
    } else {
      vErrors.push(err54);
    }
    errors++;
  }
  validate386.errors = vErrors;
  return errors === 0;
}
validate386.evaluated = { "props": true, "dynamicProps": false, "dynamicItems": false };
export {
  validateHouse,
  validateRecipe
};
