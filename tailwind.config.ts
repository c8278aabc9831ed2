import type { Config } from 'tailwindcss';

/** Names for the drawing office's colours and faces; their values for both schemes are in app/globals.css. */
export default {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: {
        paper: 'var(--paper)',
        sheet: 'var(--sheet)',
        ink: { DEFAULT: 'var(--ink)', soft: 'var(--ink-soft)' },
        rule: 'var(--rule)',
        signal: 'var(--signal)',
        // Not `left` and `right`: classes such as `text-left` would then set a colour in place of an alignment.
        'side-left': 'var(--left)',
        'side-right': 'var(--right)',
        'side-centre': 'var(--centre)',
        error: 'var(--error)',
        warning: 'var(--warning)',
        info: 'var(--info)',
      },
      fontFamily: { text: 'var(--font-text)', figures: 'var(--font-figures)' },
    },
  },
} satisfies Config;
