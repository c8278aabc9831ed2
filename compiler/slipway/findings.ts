import { declareFindings } from '../findings/catalogue';

/** What can be wrong with a script in Slipway. */
export const slipwayFindings = declareFindings({
  'script-too-long': {
    severity: 'error',
    summary: 'A script is longer than the runner takes.',
    message: 'The script is {length} characters long; at most {longest} are read.',
    help: 'Check that this is a script for one character. No rig needs this many steps.',
  },
  'script-version-unknown': {
    severity: 'error',
    summary: 'A script does not begin with a version of Slipway known here.',
    message: 'The first line is not "slipway 1".',
    help: 'Check that this is a script, and take it from the build again.',
  },
  'script-truncated': {
    severity: 'error',
    summary: 'A script has lost its end.',
    message: 'The script does not finish with an "end" line.',
    help: 'Part of the file is missing. Take it from the build again; no step was carried out.',
  },
  'script-altered': {
    severity: 'error',
    summary: 'A script is not what was emitted.',
    message: '{fact}',
    help: 'The file was changed after it was emitted. Take it from the build again; no step was carried out.',
  },
  'script-syntax': {
    severity: 'error',
    summary: 'A line of a script is not written as the grammar asks.',
    message: 'Expected {expected}, found {found}.',
    help: 'A line is a verb, a name in quotes, then key=value with one space between.',
  },
  'script-verb-unknown': {
    severity: 'error',
    summary: 'A line begins with a verb that Slipway 1 does not have.',
    message: 'There is no verb "{verb}".',
    help: 'The verbs are: {verbs}.',
  },
  'script-key-unknown': {
    severity: 'error',
    summary: 'A step has a key that its verb does not take.',
    message: '"{verb}" takes no key "{key}".',
    help: 'Its keys are: {keys}.',
  },
  'script-key-missing': {
    severity: 'error',
    summary: 'A step lacks a key that its verb needs.',
    message: '"{verb}" needs the key "{key}".',
    help: 'Write {key}={expected}.',
  },
  'script-key-repeated': {
    severity: 'error',
    summary: 'A step gives one key twice.',
    message: 'The key "{key}" is given twice.',
    help: 'Keep one of them.',
  },
  'script-value-wrong': {
    severity: 'error',
    summary: 'A value is not of the kind its key takes.',
    message: '"{key}" takes {expected}.',
    help: 'Write {key}= and {expected}.',
  },
  'script-scene-misplaced': {
    severity: 'error',
    summary: 'A script does not have exactly one scene, on its second line.',
    message: '{fact}',
    help: 'A script builds one scene: "scene" stands on the second line and nowhere else.',
  },
  'script-name-taken': {
    severity: 'error',
    summary: 'Two steps make things of one name.',
    message: 'The name "{name}" is already taken.',
    help: 'Every node, constraint and solver of a scene has a name of its own.',
  },
  'script-reference-unknown': {
    severity: 'error',
    summary: 'A step refers to a node that no earlier step made.',
    message: 'No step before this one makes a node "{name}".',
    help: 'Name a node that is made earlier in the script.',
  },
  'script-reference-forward': {
    severity: 'error',
    summary: 'A step refers to a node that is made only later.',
    message: 'The node "{name}" is made only on line {line}.',
    help: 'Put the step that makes "{name}" before this one.',
  },
  'script-reference-kind': {
    severity: 'error',
    summary: 'A step refers to a node of the wrong kind.',
    message: '"{name}" is a {kind}; a {expected} is needed here.',
    help: 'Name a {expected}.',
  },
  'script-attribute-unknown': {
    severity: 'error',
    summary: 'A step refers to an attribute that its control does not have.',
    message: 'The control "{control}" has no attribute "{attribute}".',
    help: 'Add it with an "attr" step before this one, or name one that is there.',
  },
  'script-statement-repeated': {
    severity: 'error',
    summary: 'A script says the same thing of one node twice.',
    message: '{what} of "{name}" is already given.',
    help: 'Keep one of the two steps.',
  },
  'script-range-empty': {
    severity: 'error',
    summary: 'A range in a script leaves no value, or its default lies outside.',
    message: '{fact}',
    help: 'Let min be at most max, with the default between them.',
  },
  'script-turn-not-unit': {
    severity: 'error',
    summary: 'A rest rotation is not a quaternion of length one.',
    message: 'The rotation has length {length} instead of 1.',
    help: 'Divide its four numbers by their length.',
  },
  'script-sources-wrong': {
    severity: 'error',
    summary: 'The sources, weights and blend of a constraint do not fit together.',
    message: '{fact}',
    help: 'Give one weight of at least 0 for each source; a blend needs exactly two sources.',
  },
  'script-link-wrong': {
    severity: 'error',
    summary: 'The lists or numbers of a link do not fit together.',
    message: '{fact}',
    help: 'Compare the line with the table of its verb in the Slipway reference.',
  },
  'script-joints-not-in-row': {
    severity: 'error',
    summary: 'The three joints of a solver do not hang below one another.',
    message: '"{child}" does not hang directly below "{parent}".',
    help: 'Start, mid and end are three joints in a row, each the parent of the next.',
  },
  'script-joint-solved-twice': {
    severity: 'error',
    summary: 'Two solvers turn one joint.',
    message: 'The joint "{joint}" is already turned by "{solver}".',
    help: 'Let one solver turn each joint.',
  },
  'script-ring': {
    severity: 'error',
    summary: 'Things in a script follow one another in a ring.',
    message: 'These wait for one another in a ring: {ring}.',
    help: 'Remove one of the constraints or solvers between them.',
  },
});
