'use client';

import { useEffect, useRef } from 'react';

export interface EditorKeys {
  /** Control or Command with S. */
  onSave(): void;
  /** Control or Command with a full stop. */
  onCommands(): void;
}

/** Listens for the editor's own keys, before the text editor sees them, which has meanings of its own for both. */
export function useEditorKeys(keys: EditorKeys): void {
  const latest = useRef(keys);
  latest.current = keys;
  useEffect(() => {
    const press = (event: KeyboardEvent): void => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey || event.shiftKey) return;
      if (event.key !== 's' && event.key !== '.') return;
      event.preventDefault();
      event.stopPropagation();
      if (event.key === 's') latest.current.onSave();
      else latest.current.onCommands();
    };
    window.addEventListener('keydown', press, { capture: true });
    return () => window.removeEventListener('keydown', press, { capture: true });
  }, []);
}
