import type { ChainSpecification, ControlSpecification } from '../../expand/types';
import { areOpposite, referToOtherSide } from '../crossSides';
import type { Rule } from '../Rule';

/** A thing on one side that hangs on the other side is nearly always a copied line in which one word was not changed. */
export const parentCrossesSides: Rule = {
  code: 'parent-crosses-sides',
  severity: 'warning',
  category: 'structure',
  summary: 'A chain or control that hangs on the other side of the body.',
  message: '"{id}" hangs on "{parent}", which is on the other side.',
  help: 'Name the parent on the same side, or one in the centre.',
  create({ resolved, stage, report }) {
    const check = ({ id, side, parent, path }: ChainSpecification | ControlSpecification): void => {
      if (parent === null || !areOpposite(side, resolved.nodeById.get(parent)?.side)) return;
      const place = [...path, 'parent'];
      const fix = referToOtherSide(stage.document, place, 'value', (name) => resolved.nodeById.has(name));
      report(place, { id, parent }, fix);
    };
    return { chain: check, control: check };
  },
};
