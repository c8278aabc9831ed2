import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, signIn, visit } from '../support/browser';
import { makeRecipe, replaceInText, untilDrawn } from '../support/editorPage';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe('unsaved work', () => {
  it('is stored within two seconds and is there again after the page is gone', async () => {
    const { context, page } = await visit(browser);
    await signIn(page, 'rigger');
    await makeRecipe(page, 'Mail cart', 'Sack cart', 'sack_cart');
    await replaceInText(page, 'forty sacks', 'ninety sacks');
    await page.locator('[data-draft="stored"]').waitFor({ timeout: 4000 });
    const address = page.url();
    await page.close();

    const again = await context.newPage();
    await again.goto(address);
    await untilDrawn(again);
    await again.getByText(/Your draft is stored/).waitFor();
    // The text editor shows only the lines in its window; the script holds all of the text that matters.
    await again.getByRole('tab', { name: 'Build script' }).click();
    const script = again.getByRole('region', { name: 'Build script' });
    await script.getByText('ninety sacks').waitFor();
    await again.getByRole('button', { name: 'Back to version 1' }).click();
    await again.getByText('Same as the saved version.').waitFor();
    await script.getByText('forty sacks').waitFor();
    await context.close();
  });

  it('is never written over by another window', async () => {
    const { context, page } = await visit(browser);
    await signIn(page, 'rigger');
    await makeRecipe(page, 'Mail cart', 'Twin cart', 'twin_cart');
    const other = await context.newPage();
    await other.goto(page.url());
    await untilDrawn(other);
    await replaceInText(page, 'forty sacks', 'ninety sacks');
    await page.locator('[data-draft="stored"]').waitFor();
    await replaceInText(other, 'forty sacks', 'eleven sacks');
    const dialog = other.getByRole('dialog', { name: 'Another window changed this draft' });
    await dialog.waitFor();
    expect(await dialog.textContent()).toContain('ninety sacks');
    expect(await dialog.textContent()).toContain('eleven sacks');
    await dialog.getByRole('button', { name: /Keep this window/ }).click();
    await other.locator('[data-draft="stored"]').waitFor();
    await context.close();
  });

  it('shows both sides when somebody else saved first, and loses neither', async () => {
    const mine = await visit(browser);
    await signIn(mine.page, 'rigger');
    await makeRecipe(mine.page, 'Mail cart', 'Shared cart', 'shared_cart');
    const theirs = await visit(browser);
    await signIn(theirs.page, 'reviewer');
    await theirs.page.goto(mine.page.url());
    await untilDrawn(theirs.page);

    await replaceInText(theirs.page, 'forty sacks', 'ninety sacks');
    await theirs.page.getByRole('button', { name: 'Save version' }).click();
    await theirs.page.getByLabel('What changed').fill('More sacks');
    await theirs.page.getByRole('dialog').getByRole('button', { name: 'Save version' }).click();
    await theirs.page.getByRole('link', { name: 'Download build 2' }).waitFor();

    await replaceInText(mine.page, 'forty sacks', 'eleven sacks');
    await mine.page.getByRole('button', { name: 'Save version' }).click();
    await mine.page.getByLabel('What changed').fill('Fewer sacks');
    await mine.page.getByRole('dialog').getByRole('button', { name: 'Save version' }).click();
    const dialog = mine.page.getByRole('dialog', { name: 'Save version 3' });
    await dialog.waitFor();
    expect(await dialog.textContent()).toContain('ninety sacks');
    expect(await dialog.textContent()).toContain('eleven sacks');
    await dialog.getByRole('button', { name: 'Save mine after version 2' }).click();
    await mine.page.getByRole('link', { name: 'Download build 3' }).waitFor();
    await mine.context.close();
    await theirs.context.close();
  });
});
