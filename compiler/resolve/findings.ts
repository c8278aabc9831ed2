import { declareFindings } from '../findings/catalogue';

/** What can be wrong when ids, containers, roles and names are put together. */
export const resolveFindings = declareFindings({
  'unknown-reference': {
    severity: 'error',
    summary: 'Something is referred to that does not exist.',
    message: 'There is no {what} "{id}".',
    help: 'Write the id of a {what} that exists.',
  },
  'unknown-attribute': {
    severity: 'error',
    summary: 'An attribute is referred to that its control does not have.',
    message: 'The control "{control}" has no attribute "{attribute}".',
    help: 'Add it under attributes of "{control}", or name one that is there.',
  },
  'id-taken': {
    severity: 'error',
    summary: 'Two things have one id.',
    message: '"{id}" is both a {first} and a {second}.',
    help: 'Rename one of them: joints, controls and guide lines share one list of ids.',
  },
  'name-taken': {
    severity: 'error',
    summary: 'Two things would get one name in the scene.',
    message: '"{first}" and "{second}" would both be named "{name}".',
    help: 'Rename one of them, or add a token to the naming pattern of the house rules that tells them apart.',
  },
  'name-too-long': {
    severity: 'error',
    summary: 'A name in the scene would be longer than the house rules allow.',
    message: '"{id}" would be named "{name}", {length} characters where {longest} are allowed.',
    help: 'Shorten the id or the character name.',
  },
  'name-not-legal': {
    severity: 'error',
    summary: 'A name in the scene would not begin with a letter.',
    message: '"{id}" would be named "{name}", which does not begin with a letter or underscore.',
    help: 'Put a token that begins with a letter first in the naming pattern, or rename the thing.',
  },
  'parent-ring': {
    severity: 'error',
    summary: 'Parents form a ring.',
    message: 'These follow one another in a ring: {ring}.',
    help: 'Give one of them another parent, or none.',
  },
  'container-ring': {
    severity: 'error',
    summary: 'Containers lie in one another in a ring.',
    message: 'These containers lie in one another in a ring: {ring}.',
    help: 'Give one of them another parent, or none.',
  },
  'container-moves-conflict': {
    severity: 'error',
    summary: 'A container moves otherwise than the one it lies in.',
    message: 'The container "{id}" is {moves}, but "{parent}", in which it lies, is {parentMoves}.',
    help: 'Move it to a container that is {moves}, or leave moves out.',
  },
  'control-in-parked-container': {
    severity: 'error',
    summary: 'A control lies in a container that stays in the world.',
    message: 'The control "{id}" lies in the container "{container}", which is parked.',
    help: 'Give it a role whose container is carried, so that the root control brings it along.',
  },
  'role-without-container': {
    severity: 'error',
    summary: 'A role has no container.',
    message: 'The role "{role}" has no container.',
    help: 'Give the role a container, in the recipe or in the house rules.',
  },
  'several-carriers': {
    severity: 'error',
    summary: 'More than one control carries the rig.',
    message: '"{first}" and "{second}" both carry the rig, and neither follows the other.',
    help: 'Keep one, or make one the parent of the other.',
  },
  'solver-joints-apart': {
    severity: 'error',
    summary: "A solver's joints are not in a row.",
    message: '"{child}" does not hang directly on "{parent}".',
    help: 'Name three joints of one chain, each the next of the one before.',
  },
  'constraint-blend-sources': {
    severity: 'error',
    summary: 'A blend needs exactly two sources.',
    message: '"{id}" has a blend but {count} sources.',
    help: 'Give it exactly two sources, or use weights in place of blend.',
  },
  'constraint-weights': {
    severity: 'error',
    summary: "A constraint's weights are negative or all zero.",
    message: 'The weights of "{id}" are negative or sum to zero.',
    help: 'Give weights of zero or more, at least one of them above zero.',
  },
  'follows-itself': {
    severity: 'error',
    summary: 'A thing follows itself.',
    message: '"{id}" follows itself.',
    help: 'Name another thing to follow.',
  },
});
