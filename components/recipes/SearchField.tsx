'use client';

import { usePathname, useRouter, useSearchParams } from 'next/navigation';
import { useEffect, useRef, useState } from 'react';

const PAUSE = 250;

/** Searches the list as one types; the address follows, so that going back works. */
export function SearchField({ search }: { readonly search: string }) {
  const [words, setWords] = useState(search);
  const router = useRouter();
  const path = usePathname();
  const parameters = useSearchParams();
  const shown = useRef(search);

  useEffect(() => {
    if (words.trim() === shown.current) return;
    const timer = setTimeout(() => {
      shown.current = words.trim();
      const next = new URLSearchParams(parameters);
      next.delete('cursor');
      if (shown.current === '') next.delete('search');
      else next.set('search', shown.current);
      router.replace(`${path}?${next}`, { scroll: false });
    }, PAUSE);
    return () => clearTimeout(timer);
  }, [words, parameters, path, router]);

  return (
    <label className="flex items-baseline gap-2">
      Search
      <input
        className="plain-input w-48"
        type="search"
        value={words}
        maxLength={100}
        onChange={(event) => setWords(event.target.value)}
      />
    </label>
  );
}
