import { declareFindings } from '../findings/catalogue';

/** What can be wrong with a text before its meaning is looked at. */
export const syntaxFindings = declareFindings({
  'yaml-syntax': {
    severity: 'error',
    summary: 'The text is not YAML.',
    message: '{problem}',
    help: '{advice}',
  },
  'tab-indentation': {
    severity: 'error',
    summary: 'A line is indented with a tab.',
    message: 'This line is indented with a tab.',
    help: 'Indent with spaces; YAML does not allow tabs there.',
  },
  'text-too-large': {
    severity: 'error',
    summary: 'The text is larger than a recipe may be.',
    message: 'The text has {size} characters; at most {limit} are read.',
    help: 'Split it: put what several characters share into a recipe that the others extend.',
  },
  'nested-too-deep': {
    severity: 'error',
    summary: 'Collections lie too deep inside one another.',
    message: 'Here collections lie more than {limit} deep inside one another.',
    help: 'No key of the language needs such depth; look for brackets that are not closed.',
  },
  'too-many-nodes': {
    severity: 'error',
    summary: 'The text holds more values than a recipe may.',
    message: 'The text holds more than {limit} values.',
    help: 'Split it, or let parts write out what is written by hand.',
  },
  'too-many-keys': {
    severity: 'error',
    summary: 'A map has more keys than a recipe may hold in one map.',
    message: 'This map has more than {limit} keys.',
    help: 'Split the recipe.',
  },
  'too-many-anchors': {
    severity: 'error',
    summary: 'The text has more anchors than are allowed.',
    message: 'The text has more than {limit} anchors.',
    help: 'Use parts, or extends, in place of anchors.',
  },
  'scalar-too-long': {
    severity: 'error',
    summary: 'One text value is longer than allowed.',
    message: 'This value has {size} characters; at most {limit} are allowed.',
    help: 'Shorten it.',
  },
  'aliases-too-large': {
    severity: 'error',
    summary: 'Aliases would make the document grow beyond measure.',
    message: 'Written out, the aliases up to here make more than {limit} values.',
    help: 'Remove aliases of values that hold aliases themselves.',
  },
  'alias-unknown': {
    severity: 'error',
    summary: 'An alias names an anchor that is not there before it.',
    message: 'No anchor "{name}" stands before this alias.',
    help: 'Write &{name} before the value that is meant, or write the value here.',
  },
  'alias-ring': {
    severity: 'error',
    summary: 'An alias lies inside the value it stands for.',
    message: 'The alias "{name}" lies inside the value it stands for.',
    help: 'Write the value out without the alias.',
  },
  'tag-refused': {
    severity: 'error',
    summary: 'A value has a tag of its own.',
    message: 'The tag "{tag}" is not allowed.',
    help: 'Remove the tag: recipes hold plain maps, lists, numbers and texts.',
  },
  'merge-key': {
    severity: 'error',
    summary: 'The merge key << is not part of YAML 1.2.',
    message: 'The merge key << is not part of YAML 1.2.',
    help: 'Write the keys out, or use extends to build on another recipe.',
  },
  'several-documents': {
    severity: 'error',
    summary: 'The text holds more than one document.',
    message: 'A second document begins here.',
    help: 'Keep one document in a text; remove the line with three dashes.',
  },
  'document-empty': {
    severity: 'error',
    summary: 'The text holds nothing.',
    message: 'There is nothing in this text.',
    help: 'Begin with "format: 1" and "recipe: name".',
  },
  'duplicate-key': {
    severity: 'error',
    summary: 'A key is written twice in one map.',
    message: 'The key "{key}" is written twice in this map.',
    help: 'Keep one of them; only the first is read.',
  },
  'key-not-text': {
    severity: 'error',
    summary: 'A key is not plain text.',
    message: 'This key is not plain text.',
    help: 'Use a word as the key.',
  },
  'key-reserved': {
    severity: 'error',
    summary: 'A key is a word with a meaning of its own in many programs.',
    message: 'The key "{key}" is not allowed.',
    help: 'Choose another word.',
  },
  'number-not-finite': {
    severity: 'error',
    summary: 'A number is not a number, or infinite.',
    message: '"{text}" is not a finite number.',
    help: 'Write a number, or leave the key out for its default.',
  },
  'number-not-exact': {
    severity: 'error',
    summary: 'A whole number is too large to be kept exactly.',
    message: '"{text}" cannot be kept exactly.',
    help: 'Use a smaller number.',
  },
  'number-too-large': {
    severity: 'error',
    summary: 'A number is larger than any length, angle or factor can be.',
    message: '"{text}" is larger than {limit}.',
    help: 'Use a smaller number, or another unit in scene.',
  },
  'hidden-character': {
    severity: 'error',
    summary: 'A text holds a character that cannot be seen.',
    message: 'This text holds the hidden character {code}.',
    help: 'Delete it; it often comes along when text is copied from a page.',
  },
  'look-alike-name': {
    severity: 'error',
    summary: 'A name holds letters of another alphabet that look like Latin ones.',
    message: '"{name}" looks like "{twin}" but holds {letters}.',
    help: 'Write "{twin}" with Latin letters.',
  },
});
