import { expandFindings } from './findings';
import type { Sided } from './primitives';
import type { StageContext } from './StageContext';

/** Reports each of `keys` that the entry lacks; true when none is missing. */
export function isComplete<E extends object, K extends keyof E & string>(
  sided: Sided<E>,
  keys: readonly K[],
  context: StageContext,
): sided is Sided<E & { readonly [Key in K]-?: Exclude<E[Key], undefined> }> {
  const missing = keys.filter((key) => sided.entry[key] === undefined);
  for (const key of missing) {
    context.findings.report(expandFindings, 'entry-incomplete', context.document.spanAt(sided.path, 'key'), {
      id: sided.id,
      key,
    });
  }
  return missing.length === 0;
}
