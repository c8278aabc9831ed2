import { declareFindings } from '../findings/catalogue';

/** What can be wrong with control values that somebody gives a rig. */
export const poseFindings = declareFindings({
  'pose-not-a-map': {
    severity: 'error',
    summary: 'A pose is not a map of controls to their values.',
    message: '{what} is not a map of names to {content}.',
    help: 'Write for each control, by its name, a map of channels and attributes to numbers.',
  },
  'pose-control-unknown': {
    severity: 'error',
    summary: 'A pose names a control that the rig does not have.',
    message: 'The rig has no control "{control}".',
    help: 'Use the name of a control as the script gives it.',
  },
  'pose-channel-unknown': {
    severity: 'error',
    summary: 'A pose gives a value that its control does not have.',
    message: '"{control}" has no channel or attribute "{channel}".',
    help: 'It takes: {channels}.',
  },
  'pose-value-wrong': {
    severity: 'error',
    summary: 'A value in a pose is not a number.',
    message: 'The value of "{channel}" is not a finite number.',
    help: 'Write a number: degrees for rx, ry, rz, scene units for tx, ty, tz.',
  },
  'pose-channel-locked': {
    severity: 'warning',
    summary: 'A pose gives a value to a locked channel.',
    message: 'The channel "{channel}" of "{control}" is locked and stays at rest.',
    help: 'Leave it out.',
  },
  'pose-value-clamped': {
    severity: 'warning',
    summary: 'A value in a pose lies outside its limits.',
    message: 'The value {value} of "{channel}" is limited to {limit}.',
    help: 'Give a value within the limits of "{control}".',
  },
});
