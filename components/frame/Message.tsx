import type { ReactNode } from 'react';

/** A page that only has something to say. */
export function Message({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <div className="sheet">
      <h1>{title}</h1>
      <div className="mt-4 grid max-w-prose gap-3">{children}</div>
    </div>
  );
}
