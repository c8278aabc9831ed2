import { SAMPLE_TEXTS } from './generated/sampleTexts';

/** A recipe to start from. */
export interface Sample {
  readonly id: string;
  readonly title: string;
  readonly summary: string;
  readonly text: string;
}

const SUMMARIES: Readonly<Record<string, { readonly title: string; readonly summary: string }>> = {
  hare: {
    title: 'Upright hare',
    summary:
      'Two arms with hands, two legs with rolling feet, a spine, a face; one number drives every segment.',
  },
  heron: {
    title: 'Grey heron',
    summary: 'Wings that fold and fan their feathers, a long neck, legs with three segments.',
  },
  otter: {
    title: 'River otter',
    summary: 'Four legs, front and hind of their own kinds, a long bending back and tail.',
  },
  eel: {
    title: 'Ferry eel',
    summary: 'One long strand of twenty-four joints along a curve, with fins and a jaw.',
  },
  crab: {
    title: 'Shore crab',
    summary: 'Eight legs that fold as one, two claws with pincers, eyes on stalks.',
  },
  mail_cart: {
    title: 'Mail cart',
    summary: 'A prop: four wheels that roll, a drawbar, two flaps, a drawer and a hoist.',
  },
};

/** The sample recipes that come with Pintle, in the order they are offered. */
export const samples: readonly Sample[] = Object.entries(SUMMARIES).map(([id, { title, summary }]) => ({
  id,
  title,
  summary,
  text: SAMPLE_TEXTS[id] ?? '',
}));
