import Link from 'next/link';

/** The chapters of the handbook, in the order in which one needs them. */
export const CHAPTERS = [
  [
    '/handbook/language',
    'The recipe language',
    'Every key of a recipe, with its unit, default and an example.',
  ],
  ['/handbook/parts', 'Parts', 'The ready-made building blocks: what each needs, takes and makes.'],
  ['/handbook/findings', 'Findings', 'Everything the compiler can find, why it matters, and how to mend it.'],
  ['/handbook/trials', 'Trials', 'How every rig is proven by moving it, and what each trial measures.'],
  [
    '/handbook/slipway',
    'Slipway',
    'The build language: its form, its steps, and the mathematics behind them.',
  ],
] as const;

/** Leads from one chapter to the others. */
export function HandbookNav({ here }: { readonly here: string }) {
  return (
    <nav aria-label="Handbook" className="flex flex-wrap gap-x-5 gap-y-1 text-sm">
      <Link className="plain-action" href="/handbook">
        Handbook
      </Link>
      {CHAPTERS.map(([address, title]) => (
        <Link
          key={address}
          className="plain-action"
          href={address}
          {...(address === here ? { 'aria-current': 'page' as const } : {})}
        >
          {title}
        </Link>
      ))}
    </nav>
  );
}
