import { declareFindings } from '../findings/catalogue';

const BEYOND = '{measured}, where {tolerance} is allowed';

/** What a failed trial says; each has the trial's own numbers and the worst things. */
export const trialFindings = declareFindings({
  'trial-rest': {
    severity: 'error',
    summary: 'Something moves although every control is at rest.',
    message: `At rest {things} would not stand where it was placed: off by ${BEYOND}.`,
    help: 'Keep the offset of constraints on it (keep_offset: true), or put it where what it follows stands.',
  },
  'trial-zero': {
    severity: 'error',
    summary: 'A control does not read zero at rest.',
    message: `With every control at zero {things} would move by ${BEYOND}.`,
    help: 'Let the limits of its channels include rest: 0 for moves and turns, 1 for scale.',
  },
  'trial-carry': {
    severity: 'error',
    summary: 'The motion of the root control does not reach everything exactly once.',
    message: `When the root moves, {things} would not go along exactly once, or not stay: off by ${BEYOND}.`,
    help: 'Look for a driver, constraint or parent that brings it along a second time, or not at all.',
  },
  'trial-mirror': {
    // A lopsided rig can be meant; it is told, not refused.
    severity: 'warning',
    summary: 'Both sides, posed as mirror images, do not come out as mirror images.',
    message: `Posed as in a mirror, {things} would stand beside the mirror image of its twin: by ${BEYOND}.`,
    help: 'Look for what only one side follows, or write both sides apart if they are meant to differ.',
  },
  'trial-pole': {
    severity: 'error',
    summary: 'A bent chain does not point at its pole.',
    message: `{things} would not point at its pole: off the plane by ${BEYOND}.`,
    help: 'Look for constraints on the joints of the chain or on its pole that act against the solver.',
  },
  'trial-reach': {
    severity: 'error',
    summary: 'A solved chain does not end at its goal, or does not keep its lengths.',
    message: `{things} would not be where its solver should bring it: off by ${BEYOND}.`,
    help: 'Look for constraints or drivers on joints of the chain that act against the solver.',
  },
  'trial-blend': {
    severity: 'error',
    summary: 'Something jumps while a blend fades or a space is chosen at rest.',
    message: `{things} would jump in a blend or a choice of space: by ${BEYOND}.`,
    help: 'Look at what the blend fades between: two turns more than half a turn apart have no way between them.',
  },
  'trial-guide': {
    severity: 'error',
    summary: 'A guide line does not join a control and what it steers.',
    message: `The guide line {things} does not join a control with what it steers: off by ${BEYOND}.`,
    help: 'Draw it from the control to a joint or control that it moves.',
  },
  'trial-limits': {
    severity: 'error',
    summary: 'A limit does not hold.',
    message: `At and past the limits of controls {things} would go too far: by ${BEYOND}.`,
    help: 'Narrow the limits of the control to those of the joint it turns.',
  },
  'trial-hidden': {
    // It changes what people see, not what the rig does, and a studio may want its joints to be seen.
    severity: 'warning',
    summary: 'An animator would see or select what is not theirs.',
    message: '{things} would not be shown or hidden as its kind, role and container ask: {measured}.',
    help: 'Let the house rules hide the containers or roles of joints, and leave guide lines not selectable.',
  },
  'trial-containment': {
    severity: 'error',
    summary: 'Something lies outside the rig or outside the container of its role.',
    message: '{things} would not lie in the container of its role: {measured}.',
    help: 'This is a fault of the compiler, not of the recipe: please report it with the recipe.',
  },
  'trial-names': {
    // Names of a standard for single figures leave the character out on purpose; within one rig clashes are errors.
    severity: 'warning',
    summary: 'Characters of one cast would share names in one scene.',
    message: 'In a scene with ten characters {things} would share its name with something else: {measured}.',
    help: 'Let the naming pattern of the house rules include the character, or keep this rig alone in its scene.',
  },
});
