'use client';

import { Message } from '@/components/frame/Message';

/** Shown when a page could not be made. The cause is in the server's log, never here. */
export default function WorkspaceError({ reset }: { readonly error: Error; reset(): void }) {
  return (
    <Message title="This page could not be drawn">
      <p>Something went wrong on our side. Nothing you saved is lost, and drafts are stored as you type.</p>
      <p>
        <button type="button" className="action" onClick={reset}>
          Try again
        </button>
      </p>
    </Message>
  );
}
