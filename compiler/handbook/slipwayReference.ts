import { REFERENCE_TEXT } from '../slipway/generated/referenceText';

/** The Slipway reference as Markdown. */
export function slipwayReference(): string {
  return Object.values(REFERENCE_TEXT)[0] ?? '';
}
