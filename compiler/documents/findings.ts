import { declareFindings } from '../findings/catalogue';

/** What can be wrong when the documents of one compile are brought together. */
export const documentFindings = declareFindings({
  'house-not-found': {
    severity: 'error',
    summary: 'The house rules a recipe names are not there.',
    message: 'There are no house rules "{reference}".',
    help: 'Name house rules that exist, as name@version: {known}.',
  },
  'base-not-found': {
    severity: 'error',
    summary: 'The recipe version that another extends is not there.',
    message: 'There is no recipe version "{reference}" to extend.',
    help: 'Name a saved version, as recipe@number.',
  },
  'extends-ring': {
    severity: 'error',
    summary: 'Recipes extend one another in a ring.',
    message: 'These recipes extend one another in a ring: {ring}.',
    help: 'Remove extends from one of them.',
  },
  'character-name': {
    severity: 'error',
    summary: 'A character name cannot be part of names in the scene.',
    message: '"{name}" cannot be a character name.',
    help: 'Use lower-case letters, digits and underscores, beginning with a letter, at most 60 of them.',
  },
});
