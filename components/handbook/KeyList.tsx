import type { LanguageEntry } from '@/compiler/index';

/** The keys of one map of the language, each with what it is, its unit, default and an example. */
export function KeyList({ entry }: { readonly entry: LanguageEntry }) {
  return (
    <dl className="key-list">
      {entry.keys.map(({ key, description, unit, default: initial, example, required }) => (
        <div key={key}>
          <dt>
            <code className="figures">{key}</code>
            {required ? <span className="text-ink-soft text-sm"> needed</span> : null}
          </dt>
          <dd>
            <p>{description}</p>
            <p className="text-ink-soft text-sm">
              {unit === null ? null : <>Unit: {unit}. </>}
              {initial === null ? null : (
                <>
                  Without it: <code className="figures">{initial}</code>.{' '}
                </>
              )}
              {example === null ? null : (
                <>
                  Example: <code className="figures">{example}</code>
                </>
              )}
            </p>
          </dd>
        </div>
      ))}
    </dl>
  );
}
