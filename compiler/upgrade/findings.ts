import { declareFindings } from '../findings/catalogue';

/** What can be wrong with an upgrade script, beside what can be wrong with any script. */
export const upgradeFindings = declareFindings({
  'upgrade-other-scene': {
    severity: 'error',
    summary: 'An upgrade was given to a scene that holds another version.',
    message: 'This upgrade begins at another version than the scene holds.',
    help: 'Make the upgrade from the version that the scene holds.',
  },
  'upgrade-name-unknown': {
    severity: 'error',
    summary: 'An upgrade speaks of a thing that the scene does not have.',
    message: 'The scene has nothing of the name "{name}".',
    help: 'Make the upgrade anew from both versions.',
  },
  'upgrade-name-taken': {
    severity: 'error',
    summary: 'An upgrade gives a name that something else bears.',
    message: 'The name "{name}" is taken.',
    help: 'Make the upgrade anew from both versions.',
  },
  'upgrade-key-wrong': {
    severity: 'error',
    summary: 'A line of an upgrade lacks a key, or has one that does not fit.',
    message: '"{verb}" does not take this: {fact}',
    help: 'Make the upgrade anew from both versions.',
  },
  'upgrade-other-result': {
    severity: 'error',
    summary: 'An upgrade does not lead to the version it names.',
    message: 'After the last step the scene is not the version that the upgrade names.',
    help: 'Make the upgrade anew from both versions.',
  },
});
