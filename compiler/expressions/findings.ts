import { declareFindings } from '../findings/catalogue';

/** What can be wrong with parameters and expressions. */
export const expressionFindings = declareFindings({
  'expression-syntax': {
    severity: 'error',
    summary: 'An expression is not written rightly.',
    message: 'This expression cannot be read: {problem}.',
    help: 'Write numbers, params.name, landmarks.name.x, + - * / and the functions dist, mix, mid, min, max, abs, sqrt, clamp.',
  },
  'expression-unknown-name': {
    severity: 'error',
    summary: 'An expression reads or calls a name that does not exist.',
    message: 'There is no {what} "{name}".',
    help: 'Add it, or read one that exists.',
  },
  'expression-type': {
    severity: 'error',
    summary: 'An expression gives a value of the wrong kind.',
    message: 'This expression gives {found}, not {wanted}.',
    help: 'Write an expression that gives {wanted}.',
  },
  'expression-not-finite': {
    severity: 'error',
    summary: 'An expression gives no finite number.',
    message: 'This expression gives {value}.',
    help: 'Look for a division by zero or a root of a negative number.',
  },
  'expression-too-large': {
    severity: 'error',
    summary: 'An expression gives a number larger than any length, angle or factor can be.',
    message: 'This expression gives {value}, larger than {limit}.',
    help: 'Check the numbers it multiplies.',
  },
  'expression-failed': {
    severity: 'error',
    summary: 'An expression cannot be worked out.',
    message: 'This expression cannot be worked out: {problem}.',
    help: 'Points and numbers do not mix: take .x, .y or .z of a point, or dist of two points.',
  },
  'expression-ring': {
    severity: 'error',
    summary: 'Landmarks are worked out from one another in a ring.',
    message: 'These landmarks are worked out from one another in a ring: {ring}.',
    help: 'Give one of them numbers of its own.',
  },
  'parameter-limits-inverted': {
    severity: 'error',
    summary: 'A parameter has min above max.',
    message: 'The parameter "{name}" has min {min} above max {max}.',
    help: 'Swap the two numbers, or correct one of them.',
  },
  'parameter-out-of-range': {
    severity: 'error',
    summary: 'A value of a parameter is outside its range.',
    message: 'The parameter "{name}" is {value}, but must be {wanted}.',
    help: 'Give a value that is {wanted}, or widen the range.',
  },
  'parameter-not-whole': {
    severity: 'error',
    summary: 'A parameter for whole numbers has another value.',
    message: 'The parameter "{name}" is {value}, but must be a whole number.',
    help: 'Give a whole number.',
  },
  'parameter-unknown': {
    severity: 'error',
    summary: 'A character gives a value for a parameter that the recipe does not have.',
    message: 'The recipe has no parameter "{name}".',
    help: 'Parameters are {known}.',
  },
});
