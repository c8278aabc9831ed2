import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** Words for units of length, with the short form the scene would use. */
const LENGTHS: ReadonlyMap<string, string> = new Map([
  ['mm', 'mm'],
  ['millimetres', 'mm'],
  ['cm', 'cm'],
  ['centimetres', 'cm'],
  ['m', 'm'],
  ['metres', 'm'],
  ['in', 'in'],
  ['inches', 'in'],
  ['ft', 'ft'],
  ['feet', 'ft'],
]);

/** Units of parameters are words for people: a length in another unit than the scene's reaches the rig unconverted. */
export const parameterUnitDiffers: Rule = {
  code: 'parameter-unit-differs',
  severity: 'warning',
  category: 'tidiness',
  summary: 'A length in another unit than the scene.',
  message:
    'The parameter "{name}" is given in {unit}, but the scene is in {scene}, and nothing is converted.',
  help: 'Give it in {scene}, and correct its numbers where they are in {unit}.',
  create({ report, stage, resolved }) {
    const { unit: scene } = resolved.scene;
    return {
      parameter(name, { unit }) {
        const short = unit === undefined ? undefined : LENGTHS.get(unit.trim().toLowerCase());
        if (unit === undefined || short === undefined || short === scene) return;
        const path = ['params', name, 'unit'];
        report(
          path,
          { name, unit, scene },
          rewrite(stage.document, `Write ${scene}`, [{ path, newText: scene }]),
        );
      },
    };
  },
};
