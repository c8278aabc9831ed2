import { samples } from '@/compiler/index';

/** A recipe of the demo with the texts of its versions, the oldest first. */
export interface DemoRecipe {
  readonly name: string;
  readonly title: string;
  readonly versions: readonly { readonly message: string; readonly text: string }[];
}

/** The text with one place changed; throws when the place is not there any more, so that the demo stays true. */
function withChange(text: string, from: string, to: string): string {
  if (!text.includes(from)) throw new Error(`the sample has no "${from}" to make an earlier version of`);
  return text.replace(from, () => to);
}

/** The hare as it was before: first smaller, then with shorter ears. What is offered as a sample is the newest. */
function hareVersions(text: string): DemoRecipe['versions'] {
  const shortEars = withChange(text, 'ear: { default: 30,', 'ear: { default: 22,');
  const small = withChange(shortEars, 'stature: { default: 96,', 'stature: { default: 88,');
  return [
    { message: 'First pass from the turnaround drawings', text: small },
    { message: 'Stature as measured on the model', text: shortEars },
    { message: 'Longer ears, as the director asked', text },
  ];
}

/** The recipes of the demo's first show: every sample, the hare with a history. */
export function demoRecipes(): readonly DemoRecipe[] {
  return samples.map(({ id, title, text }) => ({
    name: id,
    title,
    versions: id === 'hare' ? hareVersions(text) : [{ message: 'Start from the sample', text }],
  }));
}
