'use client';

import { useEffect, useState } from 'react';

/** How long words must stay the same before they are said: nobody wants to hear every key. */
const PAUSE = 1000;

/** Says words to people who listen, once they have settled. */
export function Announcement({ words }: { readonly words: string }) {
  const [settled, setSettled] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setSettled(words), PAUSE);
    return () => clearTimeout(timer);
  }, [words]);
  return (
    <p className="sr-only" role="status" aria-label="Findings of the compiler">
      {settled}
    </p>
  );
}
