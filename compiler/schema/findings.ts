import { declareFindings } from '../findings/catalogue';

/** What can be wrong with the shape of a document. */
export const schemaFindings = declareFindings({
  'not-a-map': {
    severity: 'error',
    summary: 'The document is not a map.',
    message: 'The document is {found}, not a map.',
    help: 'Begin with "format: 1" and the name of the document, each on a line of its own.',
  },
  'unknown-key': {
    severity: 'error',
    summary: 'A key that the language does not have here.',
    message: 'There is no key "{key}" here.',
    help: 'Keys here are {known}.',
  },
  'missing-key': {
    severity: 'error',
    summary: 'A key that must be there is missing.',
    message: '{what} has no key "{key}".',
    help: 'Add "{key}".',
  },
  'wrong-type': {
    severity: 'error',
    summary: 'A value is of the wrong kind.',
    message: '{what} is {found}, not {wanted}.',
    help: 'Write {wanted}.',
  },
  'not-one-of': {
    severity: 'error',
    summary: 'A value is not one of those allowed.',
    message: '"{value}" is not allowed for {what}.',
    help: 'Write one of {allowed}.',
  },
  'text-not-legal': {
    severity: 'error',
    summary: 'A text is not written as it must be.',
    message: '"{value}" is not {wanted}.',
    help: 'Write {wanted}.',
  },
  'text-too-long': {
    severity: 'error',
    summary: 'A text is longer than allowed.',
    message: '{what} has more than {limit} characters.',
    help: 'Shorten it.',
  },
  'list-size': {
    severity: 'error',
    summary: 'A list or map has too few or too many entries.',
    message: '{what} has {found}, where {wanted} are needed.',
    help: 'Write {wanted}.',
  },
  'out-of-range': {
    severity: 'error',
    summary: 'A number is outside its range.',
    message: '{what} is {value}, but must be {wanted}.',
    help: 'Write a number that is {wanted}.',
  },
});
