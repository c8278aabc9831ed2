import type { ControlSpecification } from '../expand/types';
import type { MergedDocument } from '../merge/types';
import { isWritten } from './isWritten';

/** Whether a control has an entry of its own, so that its author chose what it says. */
export function isWrittenControl({ path }: ControlSpecification, document: MergedDocument): boolean {
  return path[0] === 'controls' && isWritten(document, path);
}
