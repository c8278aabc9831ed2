// Made by bin/generate.ts from the JSON Schemas. Change those, not this.
export const houseSchema = {
  "$schema": "https://json-schema.org/draft/2020-12/schema",
  "$id": "https://pintle.invalid/schema/house/1",
  "title": "HouseRules",
  "description": "House rules, format 1: a studio's own standard for containers, roles, names and severities.",
  "type": "object",
  "required": [
    "format",
    "house",
    "naming",
    "roles",
    "containers"
  ],
  "additionalProperties": false,
  "properties": {
    "format": {
      "const": 1,
      "description": "Version of the house-rules language.",
      "examples": [
        1
      ]
    },
    "house": {
      "type": "string",
      "pattern": "^[a-z][a-z0-9_]*$",
      "maxLength": 60,
      "description": "Name of the house rules.",
      "examples": [
        "tidewrack"
      ]
    },
    "version": {
      "type": "integer",
      "minimum": 1,
      "default": 1,
      "description": "Version of the house rules.",
      "examples": [
        1
      ]
    },
    "title": {
      "type": "string",
      "maxLength": 200,
      "description": "What people call them.",
      "examples": [
        "Tidewrack house rules"
      ]
    },
    "naming": {
      "title": "NamingRules",
      "description": "How names in the scene are made from ids.",
      "type": "object",
      "required": [
        "pattern"
      ],
      "additionalProperties": false,
      "properties": {
        "pattern": {
          "type": "array",
          "minItems": 1,
          "items": {
            "enum": [
              "character",
              "role",
              "side",
              "path",
              "leaf",
              "index"
            ]
          },
          "description": "Parts of a name in order; empty ones are left out. path: the id without its side and index. leaf: the last segment of the id. index: the padded number of a counted joint.",
          "examples": [
            [
              "character",
              "side",
              "path",
              "index",
              "role"
            ]
          ]
        },
        "separator": {
          "type": "string",
          "pattern": "^[A-Za-z0-9_]{0,3}$",
          "default": "_",
          "description": "Text between the parts.",
          "examples": [
            "_"
          ]
        },
        "index_digits": {
          "type": "integer",
          "minimum": 2,
          "maximum": 6,
          "default": 2,
          "description": "Least count of digits in an index.",
          "examples": [
            2
          ]
        },
        "sides": {
          "type": "object",
          "additionalProperties": false,
          "description": "Text for each side.",
          "properties": {
            "left": {
              "type": "string",
              "pattern": "^[A-Za-z0-9_]*$",
              "maxLength": 20,
              "default": "l",
              "description": "Text for the left side.",
              "examples": [
                "l"
              ]
            },
            "right": {
              "type": "string",
              "pattern": "^[A-Za-z0-9_]*$",
              "maxLength": 20,
              "default": "r",
              "description": "Text for the right side.",
              "examples": [
                "r"
              ]
            },
            "centre": {
              "type": "string",
              "pattern": "^[A-Za-z0-9_]*$",
              "maxLength": 20,
              "default": "",
              "description": "Text for the centre.",
              "examples": [
                "c"
              ]
            }
          },
          "examples": [
            {
              "left": "l",
              "right": "r",
              "centre": "c"
            }
          ]
        },
        "longest": {
          "type": "integer",
          "minimum": 8,
          "maximum": 255,
          "default": 64,
          "description": "Longest name allowed, in characters.",
          "examples": [
            64
          ]
        }
      }
    },
    "roles": {
      "description": "What things are for. The compiler itself uses carrier, control, skin, guide_line and note.",
      "type": "object",
      "propertyNames": {
        "type": "string",
        "pattern": "^[a-z][a-z0-9_]*$"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Role"
      }
    },
    "containers": {
      "description": "The container tree.",
      "type": "object",
      "propertyNames": {
        "type": "string",
        "pattern": "^[a-z][a-z0-9_]*$"
      },
      "additionalProperties": {
        "$ref": "#/$defs/Container"
      }
    },
    "severities": {
      "description": "Changes the severity of findings, by code. An error of the language itself stays an error.",
      "type": "object",
      "additionalProperties": {
        "enum": [
          "error",
          "warning",
          "info",
          "off"
        ]
      },
      "default": {},
      "examples": [
        {
          "landmark-unused": "off"
        }
      ]
    },
    "profiles": {
      "description": "Delivery profiles: what receiving systems want. A recipe names those it is delivered to.",
      "type": "object",
      "propertyNames": {
        "type": "string",
        "pattern": "^[a-z][a-z0-9_]*$",
        "maxLength": 60
      },
      "additionalProperties": {
        "$ref": "#/$defs/DeliveryProfile"
      },
      "default": {},
      "examples": [
        {
          "realtime": {
            "formats": [
              "gltf"
            ],
            "skin_joints_only": true,
            "joints_at_most": 120
          }
        }
      ]
    }
  },
  "$defs": {
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
    "DeliveryProfile": {
      "title": "DeliveryProfile",
      "description": "What one receiving system wants.",
      "type": "object",
      "required": [
        "formats"
      ],
      "additionalProperties": false,
      "properties": {
        "title": {
          "type": "string",
          "maxLength": 200,
          "description": "What people call it.",
          "examples": [
            "Realtime engine"
          ]
        },
        "formats": {
          "type": "array",
          "items": {
            "enum": [
              "gltf",
              "usd"
            ]
          },
          "minItems": 1,
          "uniqueItems": true,
          "description": "Files that are made: glTF 2.0 (.glb), which is always Y up, Z forward, in metres; OpenUSD (.usda), in the axes and unit below.",
          "examples": [
            [
              "gltf"
            ]
          ]
        },
        "up": {
          "enum": [
            "+y",
            "+z"
          ],
          "default": "+y",
          "description": "usd: axis that points up; +y or +z.",
          "examples": [
            "+z"
          ]
        },
        "forward": {
          "enum": [
            "+x",
            "-x",
            "+y",
            "-y",
            "+z",
            "-z"
          ],
          "default": "+z",
          "description": "usd: axis the character faces along.",
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
          "description": "usd: unit of length.",
          "examples": [
            "m"
          ]
        },
        "skin_joints_only": {
          "type": "boolean",
          "default": true,
          "description": "Leaves out helper joints; what hangs on one then hangs on the joint above it.",
          "examples": [
            true
          ]
        },
        "joints_at_most": {
          "type": "integer",
          "minimum": 1,
          "maximum": 100000,
          "description": "Most joints that are taken.",
          "examples": [
            120
          ]
        },
        "depth_at_most": {
          "type": "integer",
          "minimum": 1,
          "maximum": 100000,
          "description": "Most joints that may hang below one another.",
          "examples": [
            32
          ]
        },
        "influences_at_most": {
          "type": "integer",
          "minimum": 1,
          "maximum": 16,
          "description": "Most joints that one vertex may follow.",
          "examples": [
            4
          ]
        },
        "names": {
          "type": "object",
          "additionalProperties": false,
          "description": "What names of joints may be.",
          "properties": {
            "longest": {
              "type": "integer",
              "minimum": 4,
              "maximum": 255,
              "description": "Most characters of a name.",
              "examples": [
                63
              ]
            },
            "letters": {
              "enum": [
                "any",
                "lower",
                "upper"
              ],
              "default": "any",
              "description": "Letters allowed.",
              "examples": [
                "lower"
              ]
            },
            "digits": {
              "type": "boolean",
              "default": true,
              "description": "Whether digits are allowed.",
              "examples": [
                true
              ]
            }
          },
          "examples": [
            {
              "longest": 63
            }
          ]
        },
        "root_at_origin": {
          "type": "boolean",
          "default": false,
          "description": "The topmost joint must stand at the origin.",
          "examples": [
            true
          ]
        },
        "animation": {
          "enum": [
            "none",
            "range_of_motion"
          ],
          "default": "range_of_motion",
          "description": "Animation that is baked in: every control turned to both ends of its range, one after the other.",
          "examples": [
            "none"
          ]
        },
        "bones": {
          "type": "object",
          "propertyNames": {
            "type": "string",
            "pattern": "^[A-Za-z][A-Za-z0-9_]*$",
            "maxLength": 60
          },
          "additionalProperties": {
            "$ref": "#/$defs/ProfileBone"
          },
          "default": {},
          "description": "Bones the receiver knows by its own names, each with the joint of ours that it is.",
          "examples": [
            {
              "hips": {
                "joint": "spine.hips",
                "required": true
              }
            }
          ]
        }
      }
    },
    "ProfileBone": {
      "title": "ProfileBone",
      "description": "One bone a receiver knows by name.",
      "type": "object",
      "required": [
        "joint"
      ],
      "additionalProperties": false,
      "properties": {
        "joint": {
          "type": "string",
          "pattern": "^[a-z][a-z0-9_]*(\\.[a-z0-9_]+)*$",
          "maxLength": 120,
          "description": "Id of the joint that it is.",
          "examples": [
            "arm.left.elbow"
          ]
        },
        "required": {
          "type": "boolean",
          "default": false,
          "description": "Whether the receiver refuses skeletons without it.",
          "examples": [
            true
          ]
        },
        "parent": {
          "type": "string",
          "pattern": "^[A-Za-z][A-Za-z0-9_]*$",
          "maxLength": 60,
          "description": "Bone that it must hang on, with other joints between if need be; when that is not there, the next above it.",
          "examples": [
            "spine"
          ]
        }
      },
      "examples": [
        {
          "joint": "spine.hips",
          "required": true
        }
      ]
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
    "line": {
      "type": "string",
      "maxLength": 200
    },
    "word": {
      "type": "string",
      "pattern": "^[a-z][a-z0-9_]*$",
      "maxLength": 60
    }
  }
};
