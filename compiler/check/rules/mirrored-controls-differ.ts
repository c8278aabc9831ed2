import { mirrorId } from '../../expand/sides';
import type { ControlSpecification } from '../../expand/types';
import { isWrittenControl } from '../isWrittenControl';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** What both sides should share, as text that can be compared and written. */
const TRAITS: Readonly<Record<string, (control: ControlSpecification) => string>> = {
  shape: ({ shape }) => shape,
  size: ({ size }) => String(size),
  rotation_order: ({ order }) => order,
  channels: ({ channels }) =>
    Object.entries(channels)
      .map(([channel, rule]) => (rule.locked ? `${channel} locked` : `${channel} limited`))
      .join(', '),
  attributes: ({ attributes }) => attributes.map(({ name }) => name).join(', '),
};

/** Traits whose text is also how they are written. */
const WRITABLE: ReadonlySet<string> = new Set(['shape', 'size', 'rotation_order']);

/** Left and right are learnt once and copied across; every difference between them breaks that. */
export const mirroredControlsDiffer: Rule = {
  code: 'mirrored-controls-differ',
  severity: 'warning',
  category: 'animator',
  summary: 'A left and a right control that differ.',
  message: '"{id}" differs from "{other}" in {trait}: {own} against {wanted}.',
  help: 'Write the control once with side: both, or make the two alike.',
  create({ report, stage, resolved }) {
    const { document } = stage;
    return {
      finish() {
        const byId = new Map(resolved.controls.map((control) => [control.id, control]));
        for (const left of resolved.controls) {
          const right = byId.get(mirrorId(left.id));
          // Both copies of one entry are alike by construction.
          if (!right || right === left || right.path.join() === left.path.join()) continue;
          // Where a part made one of them, the other is what somebody changed.
          const [control, other] = isWrittenControl(right, document) ? [right, left] : [left, right];
          if (!isWrittenControl(control, document)) continue;
          for (const [trait, read] of Object.entries(TRAITS)) {
            const [own, wanted] = [read(control), read(other)];
            if (own === wanted) continue;
            const path = [...control.path, trait];
            const fix = WRITABLE.has(trait)
              ? rewrite(document, `Write ${wanted}`, [{ path, newText: wanted }])
              : {};
            const related = [
              { span: document.spanAt([...other.path, trait]), label: 'the one on the other side' },
            ];
            report(
              path,
              { id: control.id, other: other.id, trait, own: own || 'none', wanted: wanted || 'none' },
              { related, ...fix },
            );
          }
        }
      },
    };
  },
};
