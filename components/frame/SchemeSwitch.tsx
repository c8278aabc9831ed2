'use client';

import { useState } from 'react';
import { readScheme, SCHEME_COOKIE, type Scheme } from './scheme';

const YEAR = 365 * 24 * 60 * 60;

/** Chooses between ink on paper, light on blue, and what the system asks for. */
export function SchemeSwitch({ scheme: initial }: { readonly scheme: Scheme }) {
  const [scheme, setScheme] = useState(initial);
  const choose = (value: string): void => {
    const chosen = readScheme(value);
    setScheme(chosen);
    // biome-ignore lint/suspicious/noDocumentCookie: the newer interface is not in every browser people use.
    document.cookie = `${SCHEME_COOKIE}=${chosen}; path=/; max-age=${YEAR}; samesite=lax`;
    if (chosen === 'system') delete document.documentElement.dataset.scheme;
    else document.documentElement.dataset.scheme = chosen;
  };
  return (
    <label className="flex items-baseline gap-2 text-sm">
      <span className="text-ink-soft">Drawn</span>
      <select className="plain-select" value={scheme} onChange={(event) => choose(event.target.value)}>
        <option value="system">as the system</option>
        <option value="day">on paper</option>
        <option value="night">as blueprint</option>
      </select>
    </label>
  );
}
