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
    summary: 'Two arms, two legs, a spine, ears and a tail; one number, stature, drives every segment.',
  },
  eel: { title: 'Ferry eel', summary: 'One long strand of twenty-four joints, with fins and a jaw.' },
  mail_cart: { title: 'Mail cart', summary: 'A prop: four wheels, a drawbar, two flaps and a hoist.' },
};

/** The sample recipes that come with Pintle, in the order they are offered. */
export const samples: readonly Sample[] = Object.entries(SUMMARIES).map(([id, { title, summary }]) => ({
  id,
  title,
  summary,
  text: SAMPLE_TEXTS[id] ?? '',
}));
