// Made by bin/generate.ts from the JSON Schemas. Change those, not this.
export const recipeSchema = {
  "$schema": "https://json-schema.org/draft/2020-12/schema",
  "$id": "https://pintle.invalid/schema/recipe/1",
  "title": "Recipe",
  "description": "A rig recipe, format 1: everything Pintle needs to make one character movable.",
  "type": "object",
  "required": [
    "format",
    "recipe"
  ],
  "additionalProperties": false,
  "properties": {
    "format": {
      "const": 1,
      "description": "Version of the recipe language.",
      "examples": [
        1
      ]
    },
    "recipe": {
      "$ref": "#/$defs/word",
      "description": "Name of the recipe: lower-case letters, digits and underscores. Also the character's name unless one is given when compiling.",
      "examples": [
        "hare"
      ]
    },
    "title": {
      "$ref": "#/$defs/line",
      "description": "What people call the rig.",
      "examples": [
        "Upright hare"
      ]
    },
    "house": {
      "type": "string",
      "pattern": "^[a-z][a-z0-9_]*@[1-9][0-9]*$",
      "description": "House rules to follow, as name@version.",
      "default": "standard@1",
      "examples": [
        "tidewrack@1"
      ]
    },
    "extends": {
      "type": "string",
      "pattern": "^[a-z][a-z0-9_]*@[1-9][0-9]*$",
      "description": "Recipe version this one changes, as name@version. This document is merged onto it by RFC 7396: maps merge key by key, null removes, anything else replaces.",
      "examples": [
        "walker@4"
      ]
    },
    "params": {
      "description": "Parameters: the numbers that vary from character to character.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/word"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Parameter"
      },
      "default": {},
      "examples": [
        {
          "stature": {
            "unit": "cm",
            "default": 96,
            "min": 30,
            "max": 260
          }
        }
      ]
    },
    "scene": {
      "$ref": "#/$defs/Scene"
    },
    "landmarks": {
      "description": "Named measured points on the model. Those with side left have a mirrored right twin.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/word"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Landmark"
      },
      "default": {},
      "examples": [
        {
          "hips": {
            "at": [
              0,
              51,
              0
            ]
          }
        }
      ]
    },
    "roles": {
      "description": "Adds to or adjusts the roles of the house rules.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/word"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Role"
      },
      "default": {},
      "examples": [
        {
          "skin": {
            "token": "sk"
          }
        }
      ]
    },
    "containers": {
      "description": "Adds to or adjusts the containers of the house rules.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/word"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Container"
      },
      "default": {},
      "examples": [
        {
          "whiskers": {
            "parent": "carry"
          }
        }
      ]
    },
    "parts": {
      "description": "Building blocks that expand into chains, controls, solvers, constraints and guide lines. Whatever a part makes can be adjusted by id in those maps.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Part"
      },
      "default": {},
      "examples": [
        {
          "root": {
            "kind": "root"
          }
        }
      ]
    },
    "chains": {
      "description": "Joint chains.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Chain"
      },
      "default": {},
      "examples": [
        {
          "spine": {
            "points": [
              "hips",
              "chest"
            ],
            "joints": 4
          }
        }
      ]
    },
    "controls": {
      "description": "Controls: what the animator takes hold of. An entry whose id a part has made adjusts that control.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Control"
      },
      "default": {},
      "examples": [
        {
          "hips": {
            "at": "hips",
            "shape": "square"
          }
        }
      ]
    },
    "solvers": {
      "description": "Solvers: what computes the rotation of several joints at once.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Solver"
      },
      "default": {},
      "examples": [
        {
          "boom": {
            "kind": "two_bone",
            "joints": [
              "boom.base",
              "boom.knee",
              "boom.tip"
            ],
            "goal": "hook",
            "pole": "boom_pole"
          }
        }
      ]
    },
    "constraints": {
      "description": "Constraints: what makes one thing follow others.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Constraint"
      },
      "default": {},
      "examples": [
        {
          "neck_turn": {
            "kind": "orient",
            "target": "spine.04",
            "sources": {
              "head": 1
            }
          }
        }
      ]
    },
    "drivers": {
      "description": "Drivers: what follows an attribute or channel of a control through a curve and is added to a channel of another thing.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Driver"
      },
      "default": {},
      "examples": [
        {
          "claw_open": {
            "input": "claw.open",
            "target": "claw_upper.hinge",
            "channel": "rz",
            "keys": [
              [
                0,
                0
              ],
              [
                1,
                35
              ]
            ]
          }
        }
      ]
    },
    "guide_lines": {
      "description": "Guide lines: drawn, never selectable, from a control to the thing it steers.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/GuideLine"
      },
      "default": {},
      "examples": [
        {
          "knee_line": {
            "from": "knee_pole",
            "to": "leg.left.knee"
          }
        }
      ]
    },
    "geometry": {
      "description": "Meshes of the model that the rig carries.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Geometry"
      },
      "default": {},
      "examples": [
        {
          "body": {
            "mesh": "hare_body"
          }
        }
      ]
    },
    "skins": {
      "description": "Which joints deform which mesh.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Skin"
      },
      "default": {},
      "examples": [
        {
          "body_skin": {
            "geometry": "body",
            "joints": [
              "spine",
              "arm.left",
              "arm.right"
            ],
            "influences": 4
          }
        }
      ]
    },
    "shapes": {
      "description": "Morph targets of meshes, each with what weighs it.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/id"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Shape"
      },
      "default": {},
      "examples": [
        {
          "smile": {
            "geometry": "body",
            "morph": "smile",
            "weight": "head.smile"
          }
        }
      ]
    },
    "notes": {
      "description": "Custom metadata carried on the rig's note node.",
      "type": "object",
      "propertyNames": {
        "$ref": "#/$defs/word"
      },
      "additionalProperties": {
        "type": [
          "string",
          "number",
          "boolean"
        ],
        "maxLength": 2000
      },
      "default": {},
      "examples": [
        {
          "sequence": "Marsh at dawn"
        }
      ]
    },
    "deliver": {
      "type": "array",
      "items": {
        "$ref": "#/$defs/word"
      },
      "uniqueItems": true,
      "maxItems": 20,
      "default": [],
      "description": "Delivery profiles of the house rules for which files are made.",
      "examples": [
        [
          "film",
          "realtime"
        ]
      ]
    }
  },
  "$defs": {
    "word": {
      "type": "string",
      "pattern": "^[a-z][a-z0-9_]*$",
      "maxLength": 60
    },
    "id": {
      "type": "string",
      "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$",
      "maxLength": 120
    },
    "line": {
      "type": "string",
      "maxLength": 200
    },
    "NumberOrExpression": {
      "title": "NumberOrExpression",
      "description": "A number, or an expression: a string that begins with = and holds CEL over params, landmarks, dist, mix and mid.",
      "type": [
        "number",
        "string"
      ],
      "pattern": "^=",
      "maxLength": 2000,
      "examples": [
        12.5,
        "=params.stature * 0.53"
      ]
    },
    "Point": {
      "title": "Point",
      "description": "Three numbers in the scene's unit and axes, or an expression that gives a point.",
      "anyOf": [
        {
          "type": "array",
          "prefixItems": [
            {
              "$ref": "#/$defs/NumberOrExpression"
            },
            {
              "$ref": "#/$defs/NumberOrExpression"
            },
            {
              "$ref": "#/$defs/NumberOrExpression"
            }
          ],
          "minItems": 3,
          "items": false
        },
        {
          "type": "string",
          "pattern": "^=",
          "maxLength": 2000
        }
      ],
      "examples": [
        [
          0,
          51,
          0
        ],
        "=mid(landmarks.hip, landmarks.ankle)"
      ]
    },
    "Place": {
      "title": "Place",
      "description": "A landmark or joint by name, a point, or a point between two of them.",
      "anyOf": [
        {
          "type": "array",
          "prefixItems": [
            {
              "$ref": "#/$defs/NumberOrExpression"
            },
            {
              "$ref": "#/$defs/NumberOrExpression"
            },
            {
              "$ref": "#/$defs/NumberOrExpression"
            }
          ],
          "minItems": 3,
          "items": false
        },
        {
          "type": "string",
          "pattern": "^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$)",
          "maxLength": 2000
        },
        {
          "$ref": "#/$defs/Between"
        }
      ],
      "examples": [
        "wrist",
        [
          0,
          51,
          0
        ],
        {
          "from": "shoulder",
          "to": "elbow",
          "share": 0.5
        }
      ]
    },
    "SideOption": {
      "title": "SideOption",
      "description": "left or right: that side alone. both: the left side as written and its mirror image, in which every .left in an id reads .right. centre: neither. Without it, an id with a segment left or right says the side.",
      "enum": [
        "left",
        "right",
        "both",
        "centre"
      ],
      "default": "centre",
      "examples": [
        "both"
      ]
    },
    "MirrorRule": {
      "title": "MirrorRule",
      "description": "How the right copy's frames follow from the left's. behaviour: the same rotation values give the mirrored pose. orientation: aim and up axes are mirror images. world: the same world orientation.",
      "enum": [
        "behaviour",
        "orientation",
        "world"
      ],
      "default": "behaviour",
      "examples": [
        "behaviour"
      ]
    },
    "RotationOrderOption": {
      "title": "RotationOrderOption",
      "description": "Which axis turns first, second and third, about fixed axes.",
      "enum": [
        "xyz",
        "xzy",
        "yxz",
        "yzx",
        "zxy",
        "zyx"
      ],
      "default": "xyz",
      "examples": [
        "zxy"
      ]
    },
    "AxisName": {
      "title": "AxisName",
      "enum": [
        "+x",
        "-x",
        "+y",
        "-y",
        "+z",
        "-z"
      ],
      "description": "One of the six axis directions.",
      "examples": [
        "+x"
      ]
    },
    "ChannelName": {
      "enum": [
        "move",
        "turn",
        "scale",
        "tx",
        "ty",
        "tz",
        "rx",
        "ry",
        "rz",
        "sx",
        "sy",
        "sz"
      ],
      "description": "A channel, or move, turn or scale for all three of a kind."
    },
    "Parameter": {
      "title": "Parameter",
      "description": "A number that varies from character to character.",
      "type": "object",
      "required": [
        "default"
      ],
      "additionalProperties": false,
      "properties": {
        "default": {
          "type": "number",
          "description": "Value when a character gives none.",
          "examples": [
            96
          ]
        },
        "min": {
          "type": "number",
          "description": "Smallest value allowed.",
          "examples": [
            30
          ]
        },
        "max": {
          "type": "number",
          "description": "Largest value allowed.",
          "examples": [
            260
          ]
        },
        "unit": {
          "$ref": "#/$defs/line",
          "description": "Unit, for people; nothing is converted.",
          "examples": [
            "cm"
          ]
        },
        "whole": {
          "type": "boolean",
          "default": false,
          "description": "Only whole numbers are allowed.",
          "examples": [
            true
          ]
        },
        "note": {
          "$ref": "#/$defs/line",
          "description": "What the number measures.",
          "examples": [
            "floor to crown"
          ]
        }
      }
    },
    "Scene": {
      "title": "Scene",
      "description": "Axes and unit of every number in the recipe and in the emitted script. Right-handed always; angles in degrees.",
      "type": "object",
      "additionalProperties": false,
      "default": {
        "up": "+y",
        "forward": "+z",
        "unit": "cm"
      },
      "properties": {
        "up": {
          "$ref": "#/$defs/AxisName",
          "default": "+y",
          "description": "Axis that points up.",
          "examples": [
            "+z"
          ]
        },
        "forward": {
          "$ref": "#/$defs/AxisName",
          "default": "+z",
          "description": "Axis the character faces along. Left is up × forward.",
          "examples": [
            "-y"
          ]
        },
        "unit": {
          "enum": [
            "mm",
            "cm",
            "m"
          ],
          "default": "cm",
          "description": "Unit of length.",
          "examples": [
            "m"
          ]
        }
      },
      "examples": [
        {
          "up": "+z",
          "forward": "-y",
          "unit": "m"
        }
      ]
    },
    "Landmark": {
      "title": "Landmark",
      "description": "A named measured point on the model.",
      "type": "object",
      "required": [
        "at"
      ],
      "additionalProperties": false,
      "properties": {
        "at": {
          "$ref": "#/$defs/Point",
          "description": "Where it is. For side left: the left point.",
          "x-unit": "scene unit"
        },
        "side": {
          "enum": [
            "left",
            "centre"
          ],
          "default": "centre",
          "description": "left: a mirrored right twin exists.",
          "examples": [
            "left"
          ]
        },
        "right": {
          "$ref": "#/$defs/Point",
          "description": "The right point, where the model is not symmetrical.",
          "x-unit": "scene unit"
        },
        "note": {
          "$ref": "#/$defs/line",
          "description": "How to find it on the model.",
          "examples": [
            "bony tip of the elbow"
          ]
        }
      }
    },
    "Role": {
      "title": "Role",
      "description": "What a thing is for; decides its container, name token and visibility.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "token": {
          "type": "string",
          "pattern": "^[A-Za-z0-9_]*$",
          "maxLength": 20,
          "description": "Text that the naming pattern puts for this role; may be empty.",
          "examples": [
            "sk"
          ]
        },
        "container": {
          "$ref": "#/$defs/word",
          "description": "Container that holds things of this role.",
          "examples": [
            "skin"
          ]
        },
        "shown": {
          "type": "boolean",
          "default": true,
          "description": "Whether an animator sees things of this role.",
          "examples": [
            false
          ]
        },
        "selectable": {
          "type": "boolean",
          "default": true,
          "description": "Whether an animator can select things of this role.",
          "examples": [
            false
          ]
        },
        "title": {
          "$ref": "#/$defs/line",
          "description": "What people call it.",
          "examples": [
            "Skin joint"
          ]
        }
      }
    },
    "Container": {
      "title": "Container",
      "description": "A group that holds one class of things.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "parent": {
          "$ref": "#/$defs/word",
          "description": "Container it lies in; without one it lies directly in the rig.",
          "examples": [
            "carry"
          ]
        },
        "moves": {
          "enum": [
            "carried",
            "parked"
          ],
          "description": "carried: moves with the root control. parked: stays in the world. Inherited from the parent container; parked at the top.",
          "examples": [
            "parked"
          ]
        },
        "shown": {
          "type": "boolean",
          "default": true,
          "description": "Whether an animator sees what is inside.",
          "examples": [
            false
          ]
        },
        "title": {
          "$ref": "#/$defs/line",
          "description": "What people call it.",
          "examples": [
            "Skin joints"
          ]
        }
      }
    },
    "Part": {
      "title": "Part",
      "description": "A building block; kind decides which.",
      "type": "object",
      "required": [
        "kind"
      ],
      "discriminator": {
        "propertyName": "kind"
      },
      "oneOf": [
        {
          "$ref": "#/$defs/AxlePart"
        },
        {
          "$ref": "#/$defs/ClaviclePart"
        },
        {
          "$ref": "#/$defs/EyePart"
        },
        {
          "$ref": "#/$defs/FootPart"
        },
        {
          "$ref": "#/$defs/HandPart"
        },
        {
          "$ref": "#/$defs/JawPart"
        },
        {
          "$ref": "#/$defs/LegThreePart"
        },
        {
          "$ref": "#/$defs/LimbPart"
        },
        {
          "$ref": "#/$defs/NeckHeadPart"
        },
        {
          "$ref": "#/$defs/RootPart"
        },
        {
          "$ref": "#/$defs/SpinePart"
        },
        {
          "$ref": "#/$defs/StrandPart"
        },
        {
          "$ref": "#/$defs/WingPart"
        }
      ]
    },
    "Orient": {
      "title": "Orient",
      "description": "How joint frames are turned.",
      "type": "object",
      "additionalProperties": false,
      "default": {
        "rule": "chain",
        "aim": "+x",
        "up": "+y"
      },
      "properties": {
        "rule": {
          "enum": [
            "chain",
            "world"
          ],
          "default": "chain",
          "description": "chain: the aim axis points at the next joint and the third axis is the hinge. world: frames keep the scene's axes.",
          "examples": [
            "world"
          ]
        },
        "aim": {
          "$ref": "#/$defs/AxisName",
          "default": "+x",
          "description": "Axis of the joint that points at the next joint.",
          "examples": [
            "+y"
          ]
        },
        "up": {
          "$ref": "#/$defs/AxisName",
          "default": "+y",
          "description": "Axis of the joint that lies in the chain's plane, on the side that the chain folds toward. The third axis is the hinge: positive turns about it fold the chain.",
          "examples": [
            "+z"
          ]
        },
        "toward": {
          "$ref": "#/$defs/Point",
          "description": "Direction the up axis should lean to, in place of the chain's own plane.",
          "examples": [
            [
              0,
              1,
              0
            ]
          ]
        },
        "like": {
          "$ref": "#/$defs/id",
          "description": "Joint whose frame every joint of the chain takes, in place of frames of its own.",
          "examples": [
            "arm.left.elbow"
          ]
        }
      },
      "examples": [
        {
          "aim": "+y",
          "up": "+z"
        }
      ]
    },
    "Chain": {
      "title": "Chain",
      "description": "Joints in a row. Joint ids are the chain's id, a dot, and the joint's name.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "omit": {
          "type": "boolean",
          "default": false,
          "description": "Leaves out what a part made under this id.",
          "examples": [
            true
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of every joint of the chain.",
          "examples": [
            "helper"
          ]
        },
        "points": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/Place"
          },
          "minItems": 1,
          "maxItems": 500,
          "description": "Where the chain runs, from first to last.",
          "examples": [
            [
              "shoulder",
              "elbow",
              "wrist"
            ]
          ]
        },
        "joints": {
          "type": "integer",
          "minimum": 2,
          "maximum": 500,
          "description": "Count of joints, spread evenly by arc length over a curve through the points. Without it there is one joint at each point.",
          "examples": [
            5
          ]
        },
        "curve": {
          "enum": [
            "smooth",
            "straight"
          ],
          "default": "smooth",
          "description": "How joints are spread between the points: along a smooth curve or along straight lines.",
          "examples": [
            "straight"
          ]
        },
        "names": {
          "type": "array",
          "items": {
            "type": "string",
            "pattern": "^[a-z0-9_]+$",
            "maxLength": 60
          },
          "description": "Names of the joints in order. Without it a joint takes its landmark's name, else a padded number.",
          "examples": [
            [
              "upper",
              "lower",
              "end"
            ]
          ]
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that the first joint follows.",
          "examples": [
            "spine.chest"
          ]
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        },
        "orient": {
          "$ref": "#/$defs/Orient"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        },
        "limits": {
          "type": "object",
          "propertyNames": {
            "type": "string",
            "pattern": "^[a-z0-9_]+$",
            "maxLength": 60
          },
          "additionalProperties": {
            "$ref": "#/$defs/JointLimits"
          },
          "default": {},
          "description": "How far joints are meant to turn, by the joint's name in the chain.",
          "examples": [
            {
              "elbow": {
                "rz": {
                  "min": 0,
                  "max": 140
                }
              }
            }
          ]
        }
      }
    },
    "PolePlace": {
      "title": "PolePlace",
      "description": "Stands where the pole of three joints belongs, in place of at: in their plane, from the foot of the perpendicular through the middle joint.",
      "type": "object",
      "required": [
        "joints"
      ],
      "additionalProperties": false,
      "properties": {
        "joints": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/id"
          },
          "minItems": 3,
          "maxItems": 3,
          "description": "Start, middle and end joint.",
          "examples": [
            [
              "leg.left.hip",
              "leg.left.knee",
              "leg.left.ankle"
            ]
          ]
        },
        "distance": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 1,
          "description": "Distance from the line start–end, as a factor on the length of both bones.",
          "x-unit": "limb lengths",
          "examples": [
            1
          ]
        },
        "bend": {
          "$ref": "#/$defs/Point",
          "description": "Direction in which the middle joint should lead when the three joints lie on one line.",
          "examples": [
            [
              0,
              0,
              1
            ]
          ]
        }
      },
      "examples": [
        {
          "joints": [
            "leg.left.hip",
            "leg.left.knee",
            "leg.left.ankle"
          ],
          "distance": 0.8
        }
      ]
    },
    "ChannelOption": {
      "title": "ChannelOption",
      "description": "What an animator may do with a channel.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "locked": {
          "type": "boolean",
          "default": false,
          "description": "The channel cannot be changed.",
          "examples": [
            true
          ]
        },
        "min": {
          "$ref": "#/$defs/NumberOrExpression",
          "description": "Smallest value.",
          "x-unit": "degrees, scene unit or factor",
          "examples": [
            -40
          ]
        },
        "max": {
          "$ref": "#/$defs/NumberOrExpression",
          "description": "Largest value.",
          "x-unit": "degrees, scene unit or factor",
          "examples": [
            40
          ]
        }
      }
    },
    "AttributeOption": {
      "title": "AttributeOption",
      "description": "A value of its own on a control, beside the nine channels.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "default": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 0,
          "description": "Value at rest.",
          "examples": [
            1
          ]
        },
        "min": {
          "$ref": "#/$defs/NumberOrExpression",
          "description": "Smallest value.",
          "examples": [
            0
          ]
        },
        "max": {
          "$ref": "#/$defs/NumberOrExpression",
          "description": "Largest value.",
          "examples": [
            1
          ]
        },
        "note": {
          "$ref": "#/$defs/line",
          "description": "What it does, for the animator.",
          "examples": [
            "0 turns joint by joint, 1 follows the hand"
          ]
        },
        "labels": {
          "type": "array",
          "items": {
            "type": "string",
            "minLength": 1,
            "maxLength": 80
          },
          "minItems": 2,
          "maxItems": 100,
          "description": "Words for the values 0, 1, 2 …, for a choice in place of a number.",
          "examples": [
            [
              "arm",
              "world"
            ]
          ]
        }
      }
    },
    "Control": {
      "title": "Control",
      "description": "What the animator takes hold of.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "omit": {
          "type": "boolean",
          "default": false,
          "description": "Leaves out what a part made under this id.",
          "examples": [
            true
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "control",
          "description": "Role; decides the container.",
          "examples": [
            "control"
          ]
        },
        "at": {
          "$ref": "#/$defs/Place",
          "description": "Where it stands at rest: a landmark, a joint or a point.",
          "examples": [
            "wrist"
          ]
        },
        "pole_of": {
          "$ref": "#/$defs/PolePlace"
        },
        "align": {
          "type": "string",
          "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$",
          "default": "world",
          "description": "Joint or control whose rest orientation it takes, or world.",
          "examples": [
            "arm.left.wrist"
          ]
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that it follows.",
          "examples": [
            "hips"
          ]
        },
        "shape": {
          "enum": [
            "ring",
            "square",
            "diamond",
            "cross",
            "arrow",
            "ball",
            "box",
            "pin",
            "compass"
          ],
          "default": "ring",
          "description": "Drawn shape.",
          "examples": [
            "diamond"
          ]
        },
        "size": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 1,
          "description": "Factor on the size that the compiler takes from what the control steers.",
          "examples": [
            1.2
          ]
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        },
        "channels": {
          "type": "object",
          "propertyNames": {
            "$ref": "#/$defs/ChannelName"
          },
          "additionalProperties": {
            "$ref": "#/$defs/ChannelOption"
          },
          "default": {},
          "description": "Locks and limits by channel; move, turn and scale stand for three channels each.",
          "examples": [
            {
              "scale": {
                "locked": true
              },
              "rx": {
                "min": -40,
                "max": 40
              }
            }
          ]
        },
        "attributes": {
          "type": "object",
          "propertyNames": {
            "$ref": "#/$defs/word"
          },
          "additionalProperties": {
            "$ref": "#/$defs/AttributeOption"
          },
          "default": {},
          "description": "Values of its own, by name.",
          "examples": [
            {
              "reach": {
                "default": 1,
                "min": 0,
                "max": 1
              }
            }
          ]
        },
        "spaces": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/id"
          },
          "minItems": 1,
          "maxItems": 40,
          "description": "Joints and controls that may carry it; the attribute space chooses. Its parent comes first unless it is listed, else the first. Switching keeps nothing in place by itself: a tool matches the pose, or reads the values from Pintle.",
          "examples": [
            [
              "root",
              "spine.chest",
              "hips"
            ]
          ]
        },
        "space_follow": {
          "enum": [
            "all",
            "turn"
          ],
          "default": "all",
          "description": "all: the chosen space carries the control. turn: it only turns it; place stays with the parent.",
          "examples": [
            "turn"
          ]
        }
      }
    },
    "NumberOrAttribute": {
      "title": "NumberOrAttribute",
      "description": "A number, an expression, or an attribute of a control as control.attribute.",
      "type": [
        "number",
        "string"
      ],
      "pattern": "^(=|[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$)",
      "maxLength": 2000,
      "examples": [
        1,
        "arm.left.hand.reach"
      ]
    },
    "Solver": {
      "title": "Solver",
      "description": "Computes the transform of several joints at once. Which keys it takes depends on its kind.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "omit": {
          "type": "boolean",
          "default": false,
          "description": "Leaves out what a part made under this id.",
          "examples": [
            true
          ]
        },
        "kind": {
          "enum": [
            "two_bone",
            "reach",
            "spline",
            "twist",
            "aim",
            "foot_roll"
          ],
          "description": "two_bone: three joints in a row bend so that the last meets the goal. reach: four or more joints fold evenly so that the last meets the goal. spline: joints lie along a curve through controls. twist: joints along a bone share the twist of another joint. aim: one joint points at a goal. foot_roll: a foot rolls and banks over points of its sole.",
          "examples": [
            "two_bone"
          ]
        },
        "joints": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/id"
          },
          "minItems": 1,
          "maxItems": 500,
          "description": "two_bone: the three joints from root to tip. reach: four or more. spline: two or more. Each is the parent of the next. twist: joints along the bone, children of its joint. aim: the one joint.",
          "examples": [
            [
              "arm.left.shoulder",
              "arm.left.elbow",
              "arm.left.wrist"
            ]
          ]
        },
        "goal": {
          "$ref": "#/$defs/id",
          "description": "two_bone, reach: joint or control that the last joint follows. aim: what the joint points at.",
          "examples": [
            "arm.left.hand"
          ]
        },
        "pole": {
          "$ref": "#/$defs/id",
          "description": "two_bone, reach: control toward which the chain bends. aim: thing that says which way is up; without it the joint turns along the shortest arc.",
          "examples": [
            "arm.left.pole"
          ]
        },
        "blend": {
          "$ref": "#/$defs/NumberOrAttribute",
          "default": 1,
          "description": "two_bone, reach, aim: 0: joints keep their own rotation. 1: solved.",
          "examples": [
            "arm.left.hand.reach"
          ]
        },
        "stretch": {
          "$ref": "#/$defs/NumberOrAttribute",
          "default": 0,
          "description": "two_bone, reach: 0: bones keep their length, 1: they grow until the end meets the goal. spline: 0: joints keep their distances, 1: they spread over the whole curve.",
          "examples": [
            "arm.left.hand.stretch"
          ]
        },
        "stretch_limit": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 1.5,
          "description": "two_bone, reach: greatest factor on the bones' length.",
          "x-unit": "factor",
          "examples": [
            1.5
          ]
        },
        "soft": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 0,
          "description": "two_bone, reach: share of the chain's length over which the end slows down before full reach. The zone never begins before the reach at rest.",
          "x-unit": "chain lengths",
          "examples": [
            0.05
          ]
        },
        "swing": {
          "$ref": "#/$defs/NumberOrAttribute",
          "default": 0,
          "description": "two_bone, reach: angle by which the bend is swung about the line from start to goal.",
          "examples": [
            "arm.left.hand.swing"
          ],
          "x-unit": "degrees"
        },
        "bias": {
          "$ref": "#/$defs/NumberOrAttribute",
          "default": 0,
          "description": "reach: −1 to 1: moves the fold from the last bends to the first.",
          "examples": [
            "leg.left.foot.lead"
          ]
        },
        "controls": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/id"
          },
          "minItems": 2,
          "maxItems": 100,
          "description": "spline: the controls whose places shape the curve, from root to tip.",
          "examples": [
            [
              "spine.low",
              "spine.middle",
              "spine.high"
            ]
          ]
        },
        "volume": {
          "$ref": "#/$defs/NumberOrAttribute",
          "default": 0,
          "description": "spline: 0 to 1: how far joints thicken and thin to keep the volume.",
          "examples": [
            "spine.high.volume"
          ]
        },
        "shares": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/NumberOrExpression"
          },
          "minItems": 1,
          "maxItems": 100,
          "description": "twist: share of the twist that each joint takes. Without it, joint i of n takes i / (n + 1).",
          "examples": [
            [
              0.25,
              0.5,
              0.75
            ]
          ]
        },
        "bone": {
          "$ref": "#/$defs/id",
          "description": "twist: joint at the root of the bone, the parent of the twist joints.",
          "examples": [
            "arm.left.elbow"
          ]
        },
        "tip": {
          "$ref": "#/$defs/id",
          "description": "twist: joint at the other end of the bone.",
          "examples": [
            "arm.left.wrist"
          ]
        },
        "base": {
          "$ref": "#/$defs/id",
          "description": "twist: joint or control against which the driver's twist is measured.",
          "examples": [
            "arm.left.elbow"
          ]
        },
        "driver": {
          "$ref": "#/$defs/id",
          "description": "twist: joint whose twist is spread.",
          "examples": [
            "arm.left.wrist"
          ]
        },
        "foot": {
          "$ref": "#/$defs/id",
          "description": "foot_roll: control that carries the foot.",
          "examples": [
            "leg.left.foot"
          ]
        },
        "ankle": {
          "$ref": "#/$defs/id",
          "description": "foot_roll: joint that every pivot moves.",
          "examples": [
            "leg.left_roll.ankle"
          ]
        },
        "toes": {
          "$ref": "#/$defs/id",
          "description": "foot_roll: joint that every pivot but the ball moves; without it the ankle alone is moved.",
          "examples": [
            "leg.left_roll.toes"
          ]
        },
        "heel": {
          "$ref": "#/$defs/Place",
          "description": "foot_roll: back of the sole, about which negative roll turns.",
          "examples": [
            "heel"
          ]
        },
        "ball": {
          "$ref": "#/$defs/Place",
          "description": "foot_roll: ball of the foot, about which roll turns up to the break angle.",
          "examples": [
            "ball"
          ]
        },
        "toe": {
          "$ref": "#/$defs/Place",
          "description": "foot_roll: tip of the toes, about which roll turns beyond the break angle.",
          "examples": [
            "toe"
          ]
        },
        "inner": {
          "$ref": "#/$defs/Place",
          "description": "foot_roll: inner edge of the sole, about which negative bank turns.",
          "examples": [
            "inner"
          ]
        },
        "outer": {
          "$ref": "#/$defs/Place",
          "description": "foot_roll: outer edge of the sole, about which positive bank turns.",
          "examples": [
            "outer"
          ]
        },
        "roll": {
          "$ref": "#/$defs/NumberOrAttribute",
          "default": 0,
          "description": "foot_roll: angle, positive forward.",
          "examples": [
            "leg.left.foot.roll"
          ],
          "x-unit": "degrees"
        },
        "bank": {
          "$ref": "#/$defs/NumberOrAttribute",
          "default": 0,
          "description": "foot_roll: angle, positive outward.",
          "examples": [
            "leg.left.foot.bank"
          ],
          "x-unit": "degrees"
        },
        "break": {
          "$ref": "#/$defs/NumberOrAttribute",
          "default": 30,
          "description": "foot_roll: roll at which the toes begin to lift.",
          "examples": [
            30
          ],
          "x-unit": "degrees"
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        }
      }
    },
    "Constraint": {
      "title": "Constraint",
      "description": "Makes one thing follow others.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "omit": {
          "type": "boolean",
          "default": false,
          "description": "Leaves out what a part made under this id.",
          "examples": [
            true
          ]
        },
        "kind": {
          "enum": [
            "parent",
            "point",
            "orient",
            "scale",
            "aim"
          ],
          "description": "What is followed: everything, position, rotation or scale; or, aim, the target turns to point at the sources.",
          "examples": [
            "orient"
          ]
        },
        "target": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that follows.",
          "examples": [
            "arm.left.wrist"
          ]
        },
        "sources": {
          "type": "object",
          "propertyNames": {
            "$ref": "#/$defs/id"
          },
          "additionalProperties": {
            "$ref": "#/$defs/NumberOrExpression"
          },
          "minProperties": 1,
          "description": "What is followed, each with its weight; weights are taken as shares of their sum.",
          "examples": [
            {
              "arm.left.hand": 1
            }
          ]
        },
        "blend": {
          "$ref": "#/$defs/NumberOrAttribute",
          "description": "Two sources only: share of the first; the second takes the rest.",
          "examples": [
            "arm.left.hand.reach"
          ]
        },
        "keep_offset": {
          "type": "boolean",
          "default": true,
          "description": "Keeps the distance and turn that target and sources have at rest, so that nothing moves at rest.",
          "examples": [
            true
          ]
        },
        "axis": {
          "$ref": "#/$defs/AxisName",
          "default": "+x",
          "description": "aim: axis of the target that points at the sources, when no offset is kept.",
          "examples": [
            "+x"
          ]
        },
        "up_axis": {
          "$ref": "#/$defs/AxisName",
          "default": "+y",
          "description": "aim: axis of the target that keeps its direction against up.",
          "examples": [
            "+y"
          ]
        },
        "up": {
          "$ref": "#/$defs/id",
          "description": "aim: joint or control whose rotation carries the up axis; without it the target turns along the shortest arc.",
          "examples": [
            "head.chin"
          ]
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        }
      }
    },
    "GuideLine": {
      "title": "GuideLine",
      "description": "A drawn, unselectable line from a control to the thing it steers.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "omit": {
          "type": "boolean",
          "default": false,
          "description": "Leaves out what a part made under this id.",
          "examples": [
            true
          ]
        },
        "from": {
          "$ref": "#/$defs/id",
          "description": "Control at its start.",
          "examples": [
            "arm.left.pole"
          ]
        },
        "to": {
          "$ref": "#/$defs/id",
          "description": "Joint or control at its end.",
          "examples": [
            "arm.left.elbow"
          ]
        },
        "style": {
          "enum": [
            "dotted",
            "dashed",
            "solid"
          ],
          "default": "dotted",
          "description": "How it is drawn.",
          "examples": [
            "dotted"
          ]
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        }
      }
    },
    "Range": {
      "title": "Range",
      "description": "Smallest and largest value, from rest.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "min": {
          "$ref": "#/$defs/NumberOrExpression",
          "description": "Smallest value.",
          "x-unit": "degrees",
          "examples": [
            -40
          ]
        },
        "max": {
          "$ref": "#/$defs/NumberOrExpression",
          "description": "Largest value.",
          "x-unit": "degrees",
          "examples": [
            40
          ]
        }
      },
      "examples": [
        {
          "min": -10,
          "max": 140
        }
      ]
    },
    "JointLimits": {
      "title": "JointLimits",
      "description": "How far a joint is meant to turn from rest, by axis. Controls enforce it; the joint itself does not.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "rx": {
          "$ref": "#/$defs/Range",
          "description": "About its own x axis.",
          "examples": [
            {
              "min": 0,
              "max": 140
            }
          ]
        },
        "ry": {
          "$ref": "#/$defs/Range",
          "description": "About its own y axis.",
          "examples": [
            {
              "min": 0,
              "max": 140
            }
          ]
        },
        "rz": {
          "$ref": "#/$defs/Range",
          "description": "About its own z axis.",
          "examples": [
            {
              "min": 0,
              "max": 140
            }
          ]
        }
      },
      "examples": [
        {
          "rz": {
            "min": 0,
            "max": 140
          }
        }
      ]
    },
    "Driver": {
      "title": "Driver",
      "description": "Adds a value that follows a control to a channel of a joint or control.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "omit": {
          "type": "boolean",
          "default": false,
          "description": "Leaves out what a part made under this id.",
          "examples": [
            true
          ]
        },
        "input": {
          "type": "string",
          "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$",
          "maxLength": 180,
          "description": "Attribute or channel of a control, as control.attribute.",
          "examples": [
            "jaw.open",
            "leg.left.foot.ty"
          ]
        },
        "target": {
          "$ref": "#/$defs/id",
          "description": "Joint or control whose channel it moves.",
          "examples": [
            "jaw.hinge"
          ]
        },
        "channel": {
          "enum": [
            "tx",
            "ty",
            "tz",
            "rx",
            "ry",
            "rz",
            "sx",
            "sy",
            "sz"
          ],
          "description": "Channel that it is added to.",
          "examples": [
            "rz"
          ]
        },
        "keys": {
          "type": "array",
          "items": {
            "type": "array",
            "items": {
              "$ref": "#/$defs/NumberOrExpression"
            },
            "minItems": 2,
            "maxItems": 2
          },
          "minItems": 2,
          "maxItems": 100,
          "description": "Curve as pairs of input and output, inputs ascending.",
          "examples": [
            [
              [
                0,
                0
              ],
              [
                1,
                30
              ]
            ]
          ]
        },
        "curve": {
          "enum": [
            "linear",
            "smooth"
          ],
          "default": "linear",
          "description": "How outputs run between keys: straight, or level at each key.",
          "examples": [
            "smooth"
          ]
        },
        "beyond": {
          "enum": [
            "hold",
            "extend"
          ],
          "default": "hold",
          "description": "Beyond the end keys: hold the last output, or run on straight.",
          "examples": [
            "extend"
          ]
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        }
      }
    },
    "Geometry": {
      "title": "Geometry",
      "description": "A mesh of the model.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "omit": {
          "type": "boolean",
          "default": false,
          "description": "Leaves out what a part made under this id.",
          "examples": [
            true
          ]
        },
        "mesh": {
          "type": "string",
          "minLength": 1,
          "maxLength": 200,
          "description": "Name of the mesh in the model's file; without it, the id.",
          "examples": [
            "hare_body"
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "geometry",
          "description": "Role; decides the container.",
          "examples": [
            "geometry"
          ]
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        }
      }
    },
    "Skin": {
      "title": "Skin",
      "description": "Which joints deform a mesh.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "omit": {
          "type": "boolean",
          "default": false,
          "description": "Leaves out what a part made under this id.",
          "examples": [
            true
          ]
        },
        "geometry": {
          "$ref": "#/$defs/id",
          "description": "The mesh.",
          "examples": [
            "body"
          ]
        },
        "joints": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/id"
          },
          "minItems": 1,
          "maxItems": 2000,
          "description": "Joints, or chains for all of their joints.",
          "examples": [
            [
              "spine",
              "arm.left"
            ]
          ]
        },
        "influences": {
          "type": "integer",
          "minimum": 1,
          "maximum": 16,
          "default": 4,
          "description": "Joints that a vertex may follow at most.",
          "examples": [
            4
          ]
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        }
      }
    },
    "Shape": {
      "title": "Shape",
      "description": "A morph target of a mesh with what weighs it.",
      "type": "object",
      "additionalProperties": false,
      "properties": {
        "omit": {
          "type": "boolean",
          "default": false,
          "description": "Leaves out what a part made under this id.",
          "examples": [
            true
          ]
        },
        "geometry": {
          "$ref": "#/$defs/id",
          "description": "The mesh.",
          "examples": [
            "body"
          ]
        },
        "morph": {
          "type": "string",
          "minLength": 1,
          "maxLength": 200,
          "description": "Name of the morph target in the model's file; without it, the id.",
          "examples": [
            "smile"
          ]
        },
        "weight": {
          "$ref": "#/$defs/NumberOrAttribute",
          "description": "Its weight, 0 to 1: a number or an attribute of a control.",
          "examples": [
            "head.smile"
          ]
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        }
      }
    },
    "Between": {
      "title": "Between",
      "description": "A point on the line between two others.",
      "type": "object",
      "required": [
        "from",
        "to"
      ],
      "additionalProperties": false,
      "properties": {
        "from": {
          "type": "string",
          "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$",
          "maxLength": 120,
          "description": "Landmark or joint at its start.",
          "examples": [
            "shoulder"
          ]
        },
        "to": {
          "type": "string",
          "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$",
          "maxLength": 120,
          "description": "Landmark or joint at its end.",
          "examples": [
            "elbow"
          ]
        },
        "share": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 0.5,
          "description": "How far along, from 0 to 1.",
          "examples": [
            0.25
          ]
        }
      },
      "examples": [
        {
          "from": "shoulder",
          "to": "elbow",
          "share": 0.5
        }
      ]
    },
    "AxlePart": {
      "title": "AxlePart",
      "description": "One joint that turns about, swings on or slides along a line: a wheel, a hinge or a slider, with a control that has that one freedom.",
      "type": "object",
      "required": [
        "kind",
        "at",
        "along"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "axle",
          "description": "A moving part of a prop."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that it hangs on.",
          "examples": [
            "body"
          ]
        },
        "at": {
          "$ref": "#/$defs/Place",
          "description": "Where it sits.",
          "examples": [
            "wheel"
          ]
        },
        "along": {
          "$ref": "#/$defs/Place",
          "description": "A second place on the line that it turns about or slides along.",
          "examples": [
            "wheel_out"
          ]
        },
        "motion": {
          "enum": [
            "wheel",
            "hinge",
            "slider"
          ],
          "default": "hinge",
          "description": "wheel: turns without end. hinge: turns within limits. slider: moves along the line.",
          "examples": [
            "hinge"
          ]
        },
        "min": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 0,
          "description": "hinge, slider: least turn or shift.",
          "examples": [
            -90
          ],
          "x-unit": "degrees or scene unit"
        },
        "max": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 90,
          "description": "hinge, slider: greatest turn or shift.",
          "examples": [
            90
          ],
          "x-unit": "degrees or scene unit"
        },
        "roll_with": {
          "type": "string",
          "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)+$",
          "maxLength": 180,
          "description": "wheel: channel of a control, as control.tz, with whose way the wheel rolls. Needs radius.",
          "examples": [
            "root.tz"
          ]
        },
        "radius": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 1,
          "description": "wheel: radius, for rolling; below zero rolls the other way.",
          "examples": [
            12
          ],
          "x-unit": "scene unit"
        },
        "shape": {
          "enum": [
            "ring",
            "square",
            "diamond",
            "cross",
            "arrow",
            "ball",
            "box",
            "pin",
            "compass"
          ],
          "default": "ring",
          "description": "Shape of the control.",
          "examples": [
            "ring"
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        }
      }
    },
    "ClaviclePart": {
      "title": "ClaviclePart",
      "description": "One bone between body and limb, with a control that turns it.",
      "type": "object",
      "required": [
        "kind",
        "points"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "clavicle",
          "description": "A collar bone, shoulder blade or hip girdle."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that it hangs on.",
          "examples": [
            "spine.chest"
          ]
        },
        "points": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/Place"
          },
          "minItems": 2,
          "maxItems": 2,
          "description": "Root and end.",
          "examples": [
            [
              "clavicle",
              "shoulder"
            ]
          ]
        },
        "names": {
          "type": "array",
          "items": {
            "type": "string",
            "pattern": "^[a-z][a-z0-9_]*$",
            "maxLength": 60
          },
          "minItems": 2,
          "maxItems": 2,
          "description": "Names of the two joints. Without it they take their landmarks' names, else root and end.",
          "examples": [
            [
              "root",
              "end"
            ]
          ]
        },
        "limits": {
          "type": "object",
          "propertyNames": {
            "type": "string",
            "pattern": "^[a-z0-9_]+$",
            "maxLength": 60
          },
          "additionalProperties": {
            "$ref": "#/$defs/JointLimits"
          },
          "default": {},
          "description": "How far the root turns, by its name; the control is limited alike.",
          "examples": [
            {
              "clavicle": {
                "rz": {
                  "min": -20,
                  "max": 40
                }
              }
            }
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    },
    "EyePart": {
      "title": "EyePart",
      "description": "An eyeball that points at a control of its own in front of it; a pair hangs on one control that both follow.",
      "type": "object",
      "required": [
        "kind",
        "at",
        "look"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "eye",
          "description": "An eye."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that the eye sits in.",
          "examples": [
            "head.head"
          ]
        },
        "at": {
          "$ref": "#/$defs/Place",
          "description": "Centre of the eyeball.",
          "examples": [
            "eye"
          ]
        },
        "look": {
          "$ref": "#/$defs/Place",
          "description": "Where the eye's target control stands at rest.",
          "examples": [
            "gaze"
          ]
        },
        "pair": {
          "$ref": "#/$defs/id",
          "description": "Control that the target follows, so that a pair of eyes looks at one thing.",
          "examples": [
            "gaze"
          ]
        },
        "limits": {
          "type": "object",
          "propertyNames": {
            "type": "string",
            "pattern": "^[a-z0-9_]+$",
            "maxLength": 60
          },
          "additionalProperties": {
            "$ref": "#/$defs/JointLimits"
          },
          "default": {},
          "description": "How far the eyeball is meant to turn, under the name ball.",
          "examples": [
            {
              "ball": {
                "ry": {
                  "min": -35,
                  "max": 35
                },
                "rx": {
                  "min": -25,
                  "max": 25
                }
              }
            }
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        }
      }
    },
    "FootPart": {
      "title": "FootPart",
      "description": "A foot at the end of a leg: ball and toe joints, and attributes on the leg's goal control that roll it over heel, ball and toe and bank it over its edges.",
      "type": "object",
      "required": [
        "kind",
        "leg",
        "ball",
        "toe",
        "heel",
        "inner",
        "outer"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "foot",
          "description": "A foot that rolls."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "leg": {
          "$ref": "#/$defs/id",
          "description": "Part of kind limb or leg_three that the foot is the end of.",
          "examples": [
            "leg"
          ]
        },
        "ball": {
          "$ref": "#/$defs/Place",
          "description": "Ball of the foot.",
          "examples": [
            "ball"
          ]
        },
        "toe": {
          "$ref": "#/$defs/Place",
          "description": "Tip of the toes.",
          "examples": [
            "toe"
          ]
        },
        "heel": {
          "$ref": "#/$defs/Place",
          "description": "Back of the sole.",
          "examples": [
            "heel"
          ]
        },
        "inner": {
          "$ref": "#/$defs/Place",
          "description": "Inner edge of the sole.",
          "examples": [
            "foot_inner"
          ]
        },
        "outer": {
          "$ref": "#/$defs/Place",
          "description": "Outer edge of the sole.",
          "examples": [
            "foot_outer"
          ]
        },
        "break": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 30,
          "description": "Value at rest of the attribute toe_break: roll at which the toes begin to lift.",
          "examples": [
            30
          ],
          "x-unit": "degrees"
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    },
    "HandPart": {
      "title": "HandPart",
      "description": "Digits that are turned joint by joint, and one control that curls, spreads and cups them together.",
      "type": "object",
      "required": [
        "kind",
        "parent",
        "digits"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "hand",
          "description": "A hand or claw with any count of digits."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint that the digits hang on.",
          "examples": [
            "arm.left.wrist"
          ]
        },
        "at": {
          "$ref": "#/$defs/Place",
          "description": "Where the hand's control stands; without it, at the parent.",
          "examples": [
            "palm"
          ]
        },
        "digits": {
          "type": "object",
          "propertyNames": {
            "$ref": "#/$defs/word"
          },
          "additionalProperties": {
            "type": "array",
            "items": {
              "$ref": "#/$defs/Place"
            },
            "minItems": 2,
            "maxItems": 12,
            "description": "Places of the digit's joints, from its root to its tip.",
            "examples": [
              [
                "index_1",
                "index_2",
                "index_3",
                "index_tip"
              ]
            ]
          },
          "minProperties": 1,
          "description": "Digits by name, in their order across the hand.",
          "examples": [
            {
              "index": [
                "index_1",
                "index_2",
                "index_3",
                "index_tip"
              ]
            }
          ]
        },
        "curl": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 70,
          "description": "Turn of each joint at curl 1.",
          "examples": [
            70
          ],
          "x-unit": "degrees"
        },
        "spread": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 20,
          "description": "Turn of the outermost digits away from the middle at spread 1.",
          "examples": [
            20
          ],
          "x-unit": "degrees"
        },
        "cup": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 15,
          "description": "Turn of the outermost digits' roots about their length at cup 1.",
          "examples": [
            15
          ],
          "x-unit": "degrees"
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        },
        "orient": {
          "$ref": "#/$defs/Orient"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    },
    "JawPart": {
      "title": "JawPart",
      "description": "One bone that opens about a hinge: a control that turns and shifts it, with an attribute that opens it.",
      "type": "object",
      "required": [
        "kind",
        "points"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "jaw",
          "description": "A jaw or beak."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that the jaw hangs on.",
          "examples": [
            "head.head"
          ]
        },
        "points": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/Place"
          },
          "minItems": 2,
          "maxItems": 2,
          "description": "Hinge and tip.",
          "examples": [
            [
              "jaw_hinge",
              "chin"
            ]
          ]
        },
        "names": {
          "type": "array",
          "items": {
            "type": "string",
            "pattern": "^[a-z][a-z0-9_]*$",
            "maxLength": 60
          },
          "minItems": 2,
          "maxItems": 2,
          "description": "Names of the two joints. Without it they take their landmarks' names, else hinge and tip.",
          "examples": [
            [
              "hinge",
              "tip"
            ]
          ]
        },
        "open": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 25,
          "description": "Turn about the hinge at open 1; its sign says which way.",
          "examples": [
            -25
          ],
          "x-unit": "degrees"
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        },
        "orient": {
          "$ref": "#/$defs/Orient"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    },
    "LegThreePart": {
      "title": "LegThreePart",
      "description": "Four joints in a row with three bones, as of a hind leg: joint-by-joint controls, a goal control with a reach solver that folds all bends together, a pole vector control, a blend between the two ways, and an attribute that moves the fold between knee and hock.",
      "type": "object",
      "required": [
        "kind",
        "points"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "leg_three",
          "description": "A leg that bends twice."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that the leg hangs on.",
          "examples": [
            "hips"
          ]
        },
        "points": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/Place"
          },
          "minItems": 4,
          "maxItems": 4,
          "description": "Hip, knee, hock and end.",
          "examples": [
            [
              "hip",
              "knee",
              "hock",
              "paw"
            ]
          ]
        },
        "names": {
          "type": "array",
          "items": {
            "type": "string",
            "pattern": "^[a-z][a-z0-9_]*$",
            "maxLength": 60
          },
          "minItems": 4,
          "maxItems": 4,
          "description": "Names of the four joints. Without it they take their landmarks' names, else upper, middle, lower, end.",
          "examples": [
            [
              "hip",
              "knee",
              "hock",
              "paw"
            ]
          ]
        },
        "goal": {
          "$ref": "#/$defs/word",
          "default": "goal",
          "description": "Name of the goal control.",
          "examples": [
            "paw"
          ]
        },
        "goal_parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that goal and pole follow; without it they follow the root only.",
          "examples": [
            "hips"
          ]
        },
        "pole": {
          "type": "object",
          "additionalProperties": false,
          "description": "The pole vector control.",
          "properties": {
            "distance": {
              "$ref": "#/$defs/NumberOrExpression",
              "default": 1,
              "description": "Distance from the line start–end through the bend, as a factor on the limb's length.",
              "examples": [
                1
              ],
              "x-unit": "limb lengths"
            },
            "guide_line": {
              "type": "boolean",
              "default": true,
              "description": "Draws a guide line from the pole control to the joint it leads.",
              "examples": [
                true
              ]
            }
          },
          "default": {
            "distance": 1,
            "guide_line": true
          },
          "examples": [
            {
              "distance": 0.8
            }
          ]
        },
        "bend": {
          "$ref": "#/$defs/Point",
          "description": "Direction in which the middle joint should lead when the limb is straight at rest.",
          "examples": [
            [
              0,
              0,
              -1
            ]
          ]
        },
        "reach": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 1,
          "description": "Value at rest of the goal control's attribute reach: 0 turns joint by joint, 1 follows the goal.",
          "examples": [
            1
          ]
        },
        "stretch": {
          "type": "object",
          "additionalProperties": false,
          "description": "Lets bones grow toward a goal out of reach; the goal control's attribute stretch turns it on.",
          "properties": {
            "limit": {
              "$ref": "#/$defs/NumberOrExpression",
              "default": 1.5,
              "description": "Greatest factor on the bones' length.",
              "examples": [
                1.5
              ],
              "x-unit": "factor"
            },
            "value": {
              "$ref": "#/$defs/NumberOrExpression",
              "default": 0,
              "description": "Value at rest of the attribute stretch: 0 keeps lengths, 1 grows.",
              "examples": [
                0
              ]
            }
          },
          "examples": [
            {
              "limit": 1.5,
              "value": 1
            }
          ]
        },
        "soft": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 0,
          "description": "Share of the limb's length over which its end slows down before full reach. The zone never begins before the reach at rest.",
          "examples": [
            0.05
          ],
          "x-unit": "limb lengths"
        },
        "spaces": {
          "type": "object",
          "propertyNames": {
            "$ref": "#/$defs/word"
          },
          "additionalProperties": {
            "type": "array",
            "items": {
              "$ref": "#/$defs/id"
            },
            "minItems": 1,
            "maxItems": 40,
            "description": "What may carry the control.",
            "examples": [
              [
                "root",
                "spine.chest"
              ]
            ]
          },
          "default": {},
          "description": "What may carry the goal control (by its name) and the pole control (pole); each gets an attribute space.",
          "examples": [
            {
              "hand": [
                "root",
                "spine.chest",
                "spine.hips"
              ]
            }
          ]
        },
        "limits": {
          "type": "object",
          "propertyNames": {
            "type": "string",
            "pattern": "^[a-z0-9_]+$",
            "maxLength": 60
          },
          "additionalProperties": {
            "$ref": "#/$defs/JointLimits"
          },
          "default": {},
          "description": "How far the joints turn, by name; joint-by-joint controls are limited alike.",
          "examples": [
            {
              "elbow": {
                "rz": {
                  "min": 0,
                  "max": 140
                }
              }
            }
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    },
    "LimbPart": {
      "title": "LimbPart",
      "description": "Three joints in a row that bend in the middle: joint-by-joint controls, a goal control with two-bone inverse kinematics, a pole vector control with its guide line, a blend between the two ways, and on request twist joints, stretch, soft reach and spaces.",
      "type": "object",
      "required": [
        "kind",
        "points"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "limb",
          "description": "An arm, a leg, or anything else that bends once."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that the limb hangs on.",
          "examples": [
            "spine.chest"
          ]
        },
        "points": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/Place"
          },
          "minItems": 3,
          "maxItems": 3,
          "description": "Start, bend and end.",
          "examples": [
            [
              "shoulder",
              "elbow",
              "wrist"
            ]
          ]
        },
        "names": {
          "type": "array",
          "items": {
            "type": "string",
            "pattern": "^[a-z][a-z0-9_]*$",
            "maxLength": 60
          },
          "minItems": 3,
          "maxItems": 3,
          "description": "Names of the three joints. Without it they take their landmarks' names, else upper, lower, end.",
          "examples": [
            [
              "upper",
              "lower",
              "end"
            ]
          ]
        },
        "goal": {
          "$ref": "#/$defs/word",
          "default": "goal",
          "description": "Name of the goal control.",
          "examples": [
            "hand"
          ]
        },
        "goal_parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that goal and pole follow; without it they follow the root only.",
          "examples": [
            "hips"
          ]
        },
        "pole": {
          "type": "object",
          "additionalProperties": false,
          "description": "The pole vector control.",
          "properties": {
            "distance": {
              "$ref": "#/$defs/NumberOrExpression",
              "default": 1,
              "description": "Distance from the line start–end through the bend, as a factor on the limb's length.",
              "examples": [
                1
              ],
              "x-unit": "limb lengths"
            },
            "guide_line": {
              "type": "boolean",
              "default": true,
              "description": "Draws a guide line from the pole control to the joint it leads.",
              "examples": [
                true
              ]
            }
          },
          "default": {
            "distance": 1,
            "guide_line": true
          },
          "examples": [
            {
              "distance": 0.8
            }
          ]
        },
        "bend": {
          "$ref": "#/$defs/Point",
          "description": "Direction in which the middle joint should lead when the limb is straight at rest.",
          "examples": [
            [
              0,
              0,
              -1
            ]
          ]
        },
        "reach": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 1,
          "description": "Value at rest of the goal control's attribute reach: 0 turns joint by joint, 1 follows the goal.",
          "examples": [
            1
          ]
        },
        "stretch": {
          "type": "object",
          "additionalProperties": false,
          "description": "Lets bones grow toward a goal out of reach; the goal control's attribute stretch turns it on.",
          "properties": {
            "limit": {
              "$ref": "#/$defs/NumberOrExpression",
              "default": 1.5,
              "description": "Greatest factor on the bones' length.",
              "examples": [
                1.5
              ],
              "x-unit": "factor"
            },
            "value": {
              "$ref": "#/$defs/NumberOrExpression",
              "default": 0,
              "description": "Value at rest of the attribute stretch: 0 keeps lengths, 1 grows.",
              "examples": [
                0
              ]
            }
          },
          "examples": [
            {
              "limit": 1.5,
              "value": 1
            }
          ]
        },
        "soft": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 0,
          "description": "Share of the limb's length over which its end slows down before full reach. The zone never begins before the reach at rest.",
          "examples": [
            0.05
          ],
          "x-unit": "limb lengths"
        },
        "spaces": {
          "type": "object",
          "propertyNames": {
            "$ref": "#/$defs/word"
          },
          "additionalProperties": {
            "type": "array",
            "items": {
              "$ref": "#/$defs/id"
            },
            "minItems": 1,
            "maxItems": 40,
            "description": "What may carry the control.",
            "examples": [
              [
                "root",
                "spine.chest"
              ]
            ]
          },
          "default": {},
          "description": "What may carry the goal control (by its name) and the pole control (pole); each gets an attribute space.",
          "examples": [
            {
              "hand": [
                "root",
                "spine.chest",
                "spine.hips"
              ]
            }
          ]
        },
        "limits": {
          "type": "object",
          "propertyNames": {
            "type": "string",
            "pattern": "^[a-z0-9_]+$",
            "maxLength": 60
          },
          "additionalProperties": {
            "$ref": "#/$defs/JointLimits"
          },
          "default": {},
          "description": "How far the joints turn, by name; joint-by-joint controls are limited alike.",
          "examples": [
            {
              "elbow": {
                "rz": {
                  "min": 0,
                  "max": 140
                }
              }
            }
          ]
        },
        "twist": {
          "type": "object",
          "additionalProperties": false,
          "description": "Counts of joints that share the twist along each bone.",
          "properties": {
            "upper": {
              "type": "integer",
              "minimum": 0,
              "maximum": 20,
              "default": 0,
              "description": "Joints along the upper bone, which let the twist at its root fade in. Needs parent.",
              "examples": [
                2
              ]
            },
            "lower": {
              "type": "integer",
              "minimum": 0,
              "maximum": 20,
              "default": 0,
              "description": "Joints along the lower bone, which let the twist of the end fade out.",
              "examples": [
                3
              ]
            }
          },
          "default": {},
          "examples": [
            {
              "upper": 2,
              "lower": 3
            }
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    },
    "NeckHeadPart": {
      "title": "NeckHeadPart",
      "description": "A neck of joints that are turned one by one, and a head on it that can keep its direction against the body.",
      "type": "object",
      "required": [
        "kind",
        "from",
        "to",
        "crown"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "neck_head",
          "description": "Neck and head."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that the neck hangs on.",
          "examples": [
            "spine.chest"
          ]
        },
        "from": {
          "$ref": "#/$defs/Place",
          "description": "Root of the neck.",
          "examples": [
            "neck"
          ]
        },
        "to": {
          "$ref": "#/$defs/Place",
          "description": "Where the head turns on the neck.",
          "examples": [
            "skull"
          ]
        },
        "crown": {
          "$ref": "#/$defs/Place",
          "description": "Top of the head.",
          "examples": [
            "crown"
          ]
        },
        "joints": {
          "type": "integer",
          "minimum": 1,
          "maximum": 60,
          "default": 2,
          "description": "Count of joints of the neck, the head's own not counted.",
          "examples": [
            2
          ]
        },
        "via": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/Place"
          },
          "minItems": 1,
          "maxItems": 50,
          "description": "Places the neck runs through on the way.",
          "examples": [
            [
              "neck_bend"
            ]
          ]
        },
        "spaces": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/id"
          },
          "minItems": 1,
          "maxItems": 40,
          "description": "What may turn the head beside the neck; the attribute space chooses.",
          "examples": [
            [
              "root",
              "spine.chest"
            ]
          ]
        },
        "limits": {
          "type": "object",
          "propertyNames": {
            "type": "string",
            "pattern": "^[a-z0-9_]+$",
            "maxLength": 60
          },
          "additionalProperties": {
            "$ref": "#/$defs/JointLimits"
          },
          "default": {},
          "description": "How far the head turns, under the name head; its control is limited alike.",
          "examples": [
            {
              "head": {
                "ry": {
                  "min": -70,
                  "max": 70
                }
              }
            }
          ]
        },
        "guide_line": {
          "type": "boolean",
          "default": false,
          "description": "Draws a guide line from the head control to the crown.",
          "examples": [
            true
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "orient": {
          "$ref": "#/$defs/Orient"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    },
    "RootPart": {
      "title": "RootPart",
      "description": "The control that carries the whole rig; on request with a root joint beneath it.",
      "type": "object",
      "required": [
        "kind"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "root",
          "description": "The carrier of the rig."
        },
        "at": {
          "$ref": "#/$defs/Place",
          "description": "Where it stands.",
          "examples": [
            [
              0,
              0,
              0
            ]
          ],
          "default": [
            0,
            0,
            0
          ]
        },
        "shape": {
          "enum": [
            "ring",
            "square",
            "diamond",
            "cross",
            "arrow",
            "ball",
            "box",
            "pin",
            "compass"
          ],
          "default": "compass",
          "description": "Shape of the control.",
          "examples": [
            "compass"
          ]
        },
        "size": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 1,
          "description": "Factor on its size.",
          "examples": [
            1.2
          ]
        },
        "joint": {
          "type": "boolean",
          "default": false,
          "description": "Makes a joint at the root that follows the control, as some receivers of skeletons want.",
          "examples": [
            true
          ]
        }
      }
    },
    "SpinePart": {
      "title": "SpinePart",
      "description": "A row of joints along a curve between two ends: a control at each end that carries both place and direction of the curve, controls between them that follow both, a spline solver, stretch and volume.",
      "type": "object",
      "required": [
        "kind",
        "from",
        "to"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "spine",
          "description": "A spine, or any bendy body between two ends."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that the lower control follows.",
          "examples": [
            "root"
          ]
        },
        "from": {
          "$ref": "#/$defs/Place",
          "description": "Where it begins.",
          "examples": [
            "hips"
          ]
        },
        "to": {
          "$ref": "#/$defs/Place",
          "description": "Where it ends.",
          "examples": [
            "chest"
          ]
        },
        "via": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/Place"
          },
          "minItems": 1,
          "maxItems": 50,
          "description": "Places it runs through on the way.",
          "examples": [
            [
              "waist"
            ]
          ]
        },
        "joints": {
          "type": "integer",
          "minimum": 3,
          "maximum": 100,
          "default": 5,
          "description": "Count of joints, spread evenly by arc length.",
          "examples": [
            5
          ]
        },
        "controls": {
          "type": "integer",
          "minimum": 2,
          "maximum": 12,
          "default": 3,
          "description": "Count of controls: both ends and those between.",
          "examples": [
            3
          ]
        },
        "stretch": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 1,
          "description": "Value at rest of the upper control's attribute stretch: 0 keeps lengths, 1 spreads the joints over the whole curve.",
          "examples": [
            0
          ]
        },
        "volume": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 0,
          "description": "Value at rest of the upper control's attribute volume: how far joints thicken and thin.",
          "examples": [
            0
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "orient": {
          "$ref": "#/$defs/Orient"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    },
    "StrandPart": {
      "title": "StrandPart",
      "description": "A tail, ear, tentacle or rope: joints spread evenly along a curve, each turned by a control that hangs on the one before, or all laid along a curve through a few controls.",
      "type": "object",
      "required": [
        "kind",
        "points",
        "joints"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "strand",
          "description": "A row of joints."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that the strand hangs on.",
          "examples": [
            "hips"
          ]
        },
        "points": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/Place"
          },
          "minItems": 2,
          "maxItems": 500,
          "description": "Where the strand runs, from base to tip.",
          "examples": [
            [
              "tail_base",
              "tail_tip"
            ]
          ]
        },
        "joints": {
          "type": "integer",
          "minimum": 2,
          "maximum": 500,
          "description": "Count of joints, spread evenly by arc length.",
          "examples": [
            8
          ]
        },
        "curve": {
          "enum": [
            "smooth",
            "straight"
          ],
          "default": "smooth",
          "description": "Whether joints follow a smooth curve through the points or straight lines.",
          "examples": [
            "smooth"
          ]
        },
        "steer": {
          "enum": [
            "joints",
            "spline"
          ],
          "default": "joints",
          "description": "joints: one control for each joint. spline: a few controls shape a curve.",
          "examples": [
            "joints"
          ]
        },
        "controls": {
          "type": "integer",
          "minimum": 2,
          "maximum": 40,
          "default": 4,
          "description": "spline: count of controls along the strand.",
          "examples": [
            4
          ]
        },
        "stretch": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 0,
          "description": "spline: value at rest of the last control's attribute stretch: 0 keeps lengths, 1 spreads the joints over the whole curve.",
          "examples": [
            0
          ]
        },
        "shape": {
          "enum": [
            "ring",
            "square",
            "diamond",
            "cross",
            "arrow",
            "ball",
            "box",
            "pin",
            "compass"
          ],
          "default": "ring",
          "description": "Shape of the controls.",
          "examples": [
            "ring"
          ]
        },
        "size": {
          "$ref": "#/$defs/NumberOrExpression",
          "default": 1,
          "description": "Factor on the controls' size.",
          "examples": [
            1.2
          ]
        },
        "limits": {
          "type": "object",
          "propertyNames": {
            "type": "string",
            "pattern": "^[a-z0-9_]+$",
            "maxLength": 60
          },
          "additionalProperties": {
            "$ref": "#/$defs/JointLimits"
          },
          "default": {},
          "description": "joints: how far each joint turns, by its name; controls are limited alike.",
          "examples": [
            {
              "01": {
                "rz": {
                  "min": -30,
                  "max": 30
                }
              }
            }
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        },
        "orient": {
          "$ref": "#/$defs/Orient"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    },
    "WingPart": {
      "title": "WingPart",
      "description": "A limb that folds in two places with rows of feathers on its bones: a control for each joint, one control that folds the wing and fans its feathers.",
      "type": "object",
      "required": [
        "kind",
        "points"
      ],
      "additionalProperties": false,
      "properties": {
        "kind": {
          "const": "wing",
          "description": "A wing."
        },
        "side": {
          "$ref": "#/$defs/SideOption"
        },
        "parent": {
          "$ref": "#/$defs/id",
          "description": "Joint or control that the wing hangs on.",
          "examples": [
            "spine.chest"
          ]
        },
        "points": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/Place"
          },
          "minItems": 4,
          "maxItems": 4,
          "description": "Shoulder, elbow, wrist and tip.",
          "examples": [
            [
              "shoulder",
              "elbow",
              "wrist",
              "wing_tip"
            ]
          ]
        },
        "names": {
          "type": "array",
          "items": {
            "type": "string",
            "pattern": "^[a-z][a-z0-9_]*$",
            "maxLength": 60
          },
          "minItems": 4,
          "maxItems": 4,
          "description": "Names of the four joints. Without it they take their landmarks' names, else upper, lower, hand, tip.",
          "examples": [
            [
              "upper",
              "lower",
              "hand",
              "tip"
            ]
          ]
        },
        "fold": {
          "type": "array",
          "items": {
            "$ref": "#/$defs/NumberOrExpression"
          },
          "minItems": 3,
          "maxItems": 3,
          "default": [
            20,
            110,
            -120
          ],
          "description": "Turn of shoulder, elbow and wrist about their hinges at fold 1.",
          "x-unit": "degrees",
          "examples": [
            [
              20,
              110,
              -120
            ]
          ]
        },
        "feathers": {
          "type": "object",
          "propertyNames": {
            "$ref": "#/$defs/word"
          },
          "additionalProperties": {
            "type": "object",
            "additionalProperties": false,
            "description": "A row of feathers along one bone.",
            "properties": {
              "bone": {
                "enum": [
                  "upper",
                  "lower",
                  "hand"
                ],
                "default": "hand",
                "description": "Bone that the row sits on.",
                "examples": [
                  "hand"
                ]
              },
              "tips": {
                "type": "array",
                "items": {
                  "$ref": "#/$defs/Place"
                },
                "minItems": 2,
                "maxItems": 2,
                "description": "Where the tips of the first and the last feather lie.",
                "examples": [
                  [
                    "primary_first",
                    "primary_last"
                  ]
                ]
              },
              "count": {
                "type": "integer",
                "minimum": 1,
                "maximum": 40,
                "default": 5,
                "description": "Count of feathers.",
                "examples": [
                  5
                ]
              },
              "joints": {
                "type": "integer",
                "minimum": 2,
                "maximum": 12,
                "default": 3,
                "description": "Count of joints of each feather.",
                "examples": [
                  3
                ]
              },
              "fan": {
                "$ref": "#/$defs/NumberOrExpression",
                "default": 30,
                "description": "Turn of the last feather at fan 1; the first stays.",
                "examples": [
                  30
                ],
                "x-unit": "degrees"
              }
            },
            "required": [
              "tips"
            ],
            "examples": [
              {
                "bone": "hand",
                "tips": [
                  "primary_first",
                  "primary_last"
                ],
                "count": 5
              }
            ]
          },
          "default": {},
          "description": "Rows of feathers by name.",
          "examples": [
            {
              "primary": {
                "bone": "hand",
                "tips": [
                  "primary_first",
                  "primary_last"
                ],
                "count": 5
              }
            }
          ]
        },
        "role": {
          "$ref": "#/$defs/word",
          "default": "skin",
          "description": "Role of the joints.",
          "examples": [
            "skin"
          ]
        },
        "mirror": {
          "$ref": "#/$defs/MirrorRule"
        },
        "orient": {
          "$ref": "#/$defs/Orient"
        },
        "rotation_order": {
          "$ref": "#/$defs/RotationOrderOption"
        }
      }
    }
  }
};
