import { declareFindings } from '../findings/catalogue';

/** What can be wrong when parts and sides are written out. */
export const expandFindings = declareFindings({
  'entry-incomplete': {
    severity: 'error',
    summary: 'An entry lacks a key that it needs.',
    message: '"{id}" has no {key}.',
    help: 'Add {key}. If "{id}" was meant to adjust what a part made, check the id: no part makes "{id}".',
  },
  'control-place-twice': {
    severity: 'error',
    summary: 'A control says twice where it stands.',
    message: '"{id}" has both at and pole_of.',
    help: 'Keep one: at for a landmark, joint or point, pole_of for the pole of three joints.',
  },
  'joint-names-count': {
    severity: 'error',
    summary: 'A chain names more or fewer joints than it has.',
    message: '"{id}" has {count} joints but {given} names.',
    help: 'Give one name for each joint, or leave names out.',
  },
  'limit-joint-unknown': {
    severity: 'error',
    summary: 'Limits are given for a joint that the chain does not have.',
    message: '"{id}" has no joint "{name}".',
    help: 'Its joints are: {names}.',
  },
  'joints-count-wrong': {
    severity: 'error',
    summary: 'A solver has too few or too many joints for its kind.',
    message: 'The solver "{id}" is a {kind} and has {count} joints.',
    help: 'Give it {wanted}.',
  },
  'twist-shares-count': {
    severity: 'error',
    summary: 'A twist solver gives more or fewer shares than it has joints.',
    message: '"{id}" has {count} joints but {given} shares.',
    help: 'Give one share for each joint, or leave shares out.',
  },
  'number-outside': {
    severity: 'error',
    summary: 'A number of a solver or driver lies outside what it may be.',
    message: '{name} of "{id}" is {value}.',
    help: 'Give a number {wanted}.',
  },
  'keys-not-rising': {
    severity: 'error',
    summary: 'The inputs of a driver do not rise from key to key.',
    message: 'The inputs of "{id}" do not rise: {before} is followed by {after}.',
    help: 'Order the keys by their inputs; no input may appear twice.',
  },
  'axes-parallel': {
    severity: 'error',
    summary: 'Two axes that must stand at right angles are the same or opposite.',
    message: '"{first}" and "{second}" lie on one line, so they do not fix {what}.',
    help: 'Choose axes with different letters.',
  },
});
