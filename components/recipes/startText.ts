/** A text as a YAML scalar in double quotes, which JSON strings are. */
function quoted(text: string): string {
  return JSON.stringify(text);
}

/**
 * The first text of a recipe: a sample under a new name and title, or the least that builds. The title may hold
 * anything, so it is quoted; the name is a word.
 */
export function startText(name: string, title: string, sample: string | undefined): string {
  if (sample === undefined) {
    return `format: 1\nrecipe: ${name}\ntitle: ${quoted(title)}\nparts:\n  root: { kind: root }\n`;
  }
  // Functions as replacements, because a title may hold the signs that patterns give a meaning to.
  return sample
    .replace(/^recipe: .*$/m, () => `recipe: ${name}`)
    .replace(/^title: .*$/m, () => `title: ${quoted(title)}`);
}
