import { Color } from 'three';
import type { Side } from '@/compiler';
import type { Colours } from './colours';

/** How far what animators do not see goes towards the colour of the sheet. */
const FAINT = 0.25;

/** The colour of a thing by its side; faint where animators do not see it. */
export function sideColour(colours: Pick<Colours, Side | 'sheet'>, side: Side, isShown: boolean): Color {
  const colour = new Color(colours[side]);
  return isShown ? colour : colour.lerp(new Color(colours.sheet), FAINT);
}
