import type { Page } from 'playwright-core';

/** Makes a recipe from a sample through the dialog and waits for its picture. */
export async function makeRecipe(page: Page, sample: string, title: string, name: string): Promise<void> {
  await page.goto('/shows/saltmarsh_post');
  await page.getByRole('button', { name: 'New recipe' }).click();
  await page.getByRole('radio', { name: sample }).check();
  await page.getByLabel('Title').fill(title);
  await page.getByLabel('Name', { exact: true }).fill(name);
  await page.getByRole('button', { name: 'Make recipe' }).click();
  await page.waitForURL('**/recipes/*');
  await untilDrawn(page);
}

/** Waits until text, compiler and picture have all come up. */
export async function untilDrawn(page: Page): Promise<void> {
  await page.locator('.monaco-editor .view-lines').first().waitFor();
  await page.locator('[data-testid="viewport"] canvas').waitFor();
  await page.locator('.editor-sheet:not([data-compiled="0"])').waitFor();
}

/** Finds words in the text with the text editor's own search, and types others over them; by keyboard alone. */
export async function replaceInText(page: Page, words: string, others: string): Promise<void> {
  await page.locator('.monaco-editor textarea, .monaco-editor .native-edit-context').first().focus();
  await page.keyboard.press('Control+Home');
  await page.keyboard.press('Control+f');
  const search = page.locator('.find-widget.visible textarea').first();
  await search.fill(words);
  await search.press('Enter');
  // On a narrow screen the count is there but not shown.
  await page
    .locator('.find-widget.visible .matchesCount', { hasText: /^\d+ of/ })
    .waitFor({ state: 'attached' });
  await page.keyboard.press('Escape');
  await page.locator('.find-widget.visible').waitFor({ state: 'detached' });
  await page.keyboard.type(others);
}

/** World position of a thing, read from the list that stands beside the picture. */
export async function positionOf(page: Page, id: string): Promise<readonly number[]> {
  await page.getByRole('tab', { name: 'Things' }).click();
  const cells = await page.locator(`tr[data-node="${id}"] td`).allTextContents();
  return cells.slice(-3).map((text) => Number(text.replace('−', '-')));
}
