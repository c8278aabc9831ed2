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
  'axes-parallel': {
    severity: 'error',
    summary: 'Two axes that must stand at right angles are the same or opposite.',
    message: '"{first}" and "{second}" lie on one line, so they do not fix {what}.',
    help: 'Choose axes with different letters.',
  },
});
