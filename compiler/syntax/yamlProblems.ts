import type { ErrorCode } from 'yaml';

/** What a YAML error means to the person who wrote the text, and what to do. */
export interface YamlProblem {
  readonly problem: string;
  readonly advice: string;
}

const INDENT: YamlProblem = {
  problem: 'This line is not indented like its neighbours.',
  advice: 'Indent it like the other entries of its map or list.',
};
const CHARACTER: YamlProblem = {
  problem: 'Something is missing or too much here.',
  advice: 'Look for a bracket, brace, quote, comma or colon that is not closed or not needed.',
};

const PROBLEMS: Readonly<Partial<Record<ErrorCode, YamlProblem>>> = {
  BAD_INDENT: INDENT,
  BAD_COLLECTION_TYPE: {
    problem: 'A map and a list are mixed here.',
    advice: 'Begin every line of a list with a dash, and no line of a map.',
  },
  BAD_DQ_ESCAPE: {
    problem: 'This escape is not one that double quotes know.',
    advice: 'Write a backslash twice, or use single quotes.',
  },
  BAD_SCALAR_START: {
    problem: 'A value cannot begin with this character.',
    advice: 'Put the value in quotes.',
  },
  BLOCK_AS_IMPLICIT_KEY: {
    problem: 'A key is followed by another key on the same line.',
    advice: 'Put the second key on a line of its own, indented, or its value in quotes.',
  },
  BLOCK_IN_FLOW: {
    problem: 'A map or list by indentation stands inside brackets.',
    advice: 'Write it with braces or brackets too, or close the bracket before it.',
  },
  KEY_OVER_1024_CHARS: { problem: 'A key is longer than 1024 characters.', advice: 'Shorten it.' },
  MISSING_CHAR: CHARACTER,
  UNEXPECTED_TOKEN: CHARACTER,
  MULTILINE_IMPLICIT_KEY: {
    problem: 'A key runs over more than one line.',
    advice: 'Look for a missing colon on this line or an open quote before it.',
  },
  BAD_ALIAS: { problem: 'An alias is not written rightly.', advice: 'Write * and the name of an anchor.' },
  BAD_DIRECTIVE: { problem: 'This directive is not known.', advice: 'Remove the line that begins with %.' },
  MULTIPLE_ANCHORS: { problem: 'A value has two anchors.', advice: 'Keep one.' },
  MULTIPLE_TAGS: { problem: 'A value has two tags.', advice: 'Remove them.' },
};

/** The plain words for a YAML error code; unknown ones speak of a character too many or missing. */
export function yamlProblem(code: ErrorCode): YamlProblem {
  return PROBLEMS[code] ?? CHARACTER;
}
