import { declareFindings } from '../findings/catalogue';

/** What can be wrong with the geometry of a recipe. */
export const solveFindings = declareFindings({
  'zero-length-bone': {
    severity: 'error',
    summary: 'Two joints in a row stand at one place.',
    message: '"{first}" and "{second}" stand at the same place.',
    help: 'Move one of the landmarks or points apart; a bone without length has no direction.',
  },
  'chain-without-length': {
    severity: 'error',
    summary: 'Joints are to be spread along a line that has no length.',
    message: '"{id}" has {count} joints to spread, but its points leave no length to spread them on.',
    help: 'Give it at least two points that lie apart.',
  },
  'pole-undecided': {
    severity: 'error',
    summary: 'A straight limb does not say which way it bends.',
    message: '"{start}", "{mid}" and "{end}" lie on one line, so the bend has no direction.',
    help: 'Add bend, the direction in which the middle joint should lead, or move the middle point a little that way.',
  },
  'bend-along-limb': {
    severity: 'error',
    summary: 'The bend direction lies along the limb.',
    message: 'The bend direction of "{mid}" lies along the line from "{start}" to "{end}".',
    help: 'Give a direction that points sideways from the limb.',
  },
  'sole-points-together': {
    severity: 'error',
    summary: 'Points of a sole do not lie apart.',
    message: 'The points {first} and {second} of "{id}" do not lie apart along the floor.',
    help: 'Heel and toe must lie apart from back to front, inner and outer from side to side.',
  },
  'place-ring': {
    severity: 'error',
    summary: 'Places depend on one another in a ring.',
    message: 'These stand or turn by one another in a ring: {ring}.',
    help: 'Give one of them a landmark or a point of its own.',
  },
  'size-not-positive': {
    severity: 'error',
    summary: 'A control has a size of zero or less.',
    message: 'The size of "{id}" is {size}.',
    help: 'Give a size above zero; 1 is the size the compiler would choose.',
  },
});
