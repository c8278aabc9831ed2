import { declareFindings } from '../findings/catalogue';

/** What can be wrong with a rig for the systems it is delivered to. */
export const deliverFindings = declareFindings({
  'profile-unknown': {
    severity: 'error',
    summary: 'A recipe is delivered by a profile that the house rules do not have.',
    message: 'The house rules "{house}" have no delivery profile "{profile}".',
    help: 'Profiles are: {profiles}.',
  },
  'profile-axes-parallel': {
    severity: 'error',
    summary: 'A delivery profile gives the same line for up and forward.',
    message: 'The delivery profile "{profile}" has "{up}" up and "{forward}" forward, which lie on one line.',
    help: 'Give the profile a forward axis of another letter.',
  },
  'delivery-too-many-joints': {
    severity: 'error',
    summary: 'A skeleton has more joints than its receiver takes.',
    message: '"{profile}" takes {most} joints and gets {count}; the most are made by {worst}.',
    help: 'Give the longest of them fewer joints, or give joints that deform nothing another role.',
  },
  'delivery-too-deep': {
    severity: 'error',
    summary: 'Joints hang below one another more deeply than a receiver takes.',
    message: '"{profile}" takes {most} joints below one another and gets {count}, down to {worst}.',
    help: 'Shorten the row of joints, or hang it on a joint nearer to the root.',
  },
  'delivery-too-many-influences': {
    severity: 'error',
    summary: 'A skin lets a vertex follow more joints than a receiver takes.',
    message: '"{profile}" takes {most} joints at a vertex; {worst} asks for more.',
    help: 'Lower influences of these skins to {most}.',
  },
  'delivery-name-not-legal': {
    severity: 'error',
    summary: 'Names of joints are not what a receiver takes.',
    message: '"{profile}" takes names {rule}; {count} are not, first of all {worst}.',
    help: 'Change the ids, or the naming pattern and tokens of the house rules.',
  },
  'delivery-root-off-origin': {
    severity: 'error',
    summary: 'The topmost joint does not stand where a receiver wants it.',
    message: '"{profile}" wants the topmost joint at the origin; {worst} stands {distance} {unit} away.',
    help: 'Give the root part joint: true and hang the skeleton on it, so that one joint stands at the origin.',
  },
  'delivery-bone-missing': {
    severity: 'error',
    summary: 'A bone that a receiver needs is not there.',
    message: '"{profile}" needs the bones {worst}.',
    help: 'Add joints with the ids that the profile gives for them, or change those in the house rules.',
  },
  'delivery-bone-astray': {
    severity: 'error',
    summary: 'A bone does not hang on the bone that a receiver expects.',
    message: '"{profile}" expects the bones {worst}.',
    help: 'Change the parents of their joints, or leave the bones between out of the profile.',
  },
});
