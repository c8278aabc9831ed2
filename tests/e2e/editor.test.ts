import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { AxeBuilder } from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, signIn, visit } from '../support/browser';
import { makeRecipe, replaceInText, untilDrawn } from '../support/editorPage';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const chosenRow = (page: Page, id: string) => page.locator(`tr[data-node="${id}"][aria-selected="true"]`);

describe('choosing a thing', () => {
  it('in the list, the text or the picture chooses it everywhere', async () => {
    const { context, page, troubles } = await visit(browser);
    await signIn(page, 'rigger');
    await makeRecipe(page, 'Mail cart', 'Chosen cart', 'chosen_cart');

    // From the list: the text marks its lines, the script its steps.
    await page.getByRole('tab', { name: 'Things' }).click();
    const first = page.locator('tr[data-node]', { hasText: 'control' }).first();
    const id = (await first.getAttribute('data-node')) ?? '';
    await first.getByRole('button').click();
    await page.locator('.chosen-lines').first().waitFor();
    await page.getByRole('tab', { name: 'Build script' }).click();
    expect(await page.locator('li[aria-current="true"]').first().textContent()).toContain(`id="${id}"`);

    // In the picture: Escape lets it go, a click on the drawn thing chooses it.
    await page.getByRole('tab', { name: 'Things' }).click();
    const viewport = page.getByTestId('viewport');
    await viewport.focus();
    await page.keyboard.press('Escape');
    await expect.poll(() => page.locator('tr[aria-selected="true"]').count()).toBe(0);
    const box = await viewport.boundingBox();
    if (!box) throw new Error('no picture');
    const label = page.getByTestId('hovered');
    let hovered = '';
    for (let x = 0.2; x < 0.8 && hovered === ''; x += 0.02) {
      await page.mouse.move(box.x + box.width * x, box.y + box.height * 0.5);
      if (await label.isVisible()) hovered = (await label.locator('.figures').textContent()) ?? '';
    }
    expect(await label.textContent()).toMatch(/ in /);
    await page.mouse.down();
    await page.mouse.up();
    await chosenRow(page, hovered).waitFor();

    // In the text: the cursor within an entry chooses what the entry makes.
    await page.keyboard.press('Escape');
    await page.locator('.monaco-editor .view-line', { hasText: 'parts:' }).click();
    await page.keyboard.press('ArrowDown');
    await expect.poll(() => page.locator('tr[aria-selected="true"]').count()).toBeGreaterThan(0);
    expect(troubles).toEqual([]);
    await context.close();
  });
});

describe('a build', () => {
  it('is handed out file by file, each as its SHA-256 says', async () => {
    const { context, page, troubles } = await visit(browser);
    await signIn(page, 'rigger');
    await makeRecipe(page, 'Mail cart', 'Filed cart', 'filed_cart');
    await page.getByRole('button', { name: 'Its files' }).click();
    const items = page.getByRole('dialog').getByRole('listitem');
    await items.first().waitFor();
    expect(await items.count()).toBe(8);
    for (const item of await items.all()) {
      const [download] = await Promise.all([page.waitForEvent('download'), item.getByRole('link').click()]);
      const sum = createHash('sha256')
        .update(readFileSync(await download.path()))
        .digest('hex');
      expect(await item.textContent()).toContain(sum);
      expect(download.suggestedFilename()).toMatch(/^filed_cart\./);
    }
    expect(troubles).toEqual([]);
    await context.close();
  });
});

describe('dialogs and panes', () => {
  it.each(['light', 'dark'] as const)('have nothing that axe objects to (%s)', async (scheme) => {
    const { context, page } = await visit(browser, { scheme });
    await signIn(page, 'rigger');
    await makeRecipe(page, 'Mail cart', `Dialog cart ${scheme}`, `dialog_cart_${scheme}`);
    await replaceInText(page, 'forty sacks', 'ninety sacks');
    const check = async (): Promise<void> => {
      await page.getByRole('dialog').waitFor();
      const { violations } = await new AxeBuilder({ page }).exclude('.monaco-editor').analyze();
      expect(
        violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`),
      ).toEqual([]);
      await page.keyboard.press('Escape');
      await page.getByRole('dialog').waitFor({ state: 'detached' });
    };
    await page.keyboard.press('Control+.');
    await check();
    await page.keyboard.press('Control+s');
    await check();
    await page.getByRole('button', { name: 'Its files' }).click();
    await page.getByRole('dialog').getByRole('listitem').first().waitFor();
    await check();
    await context.close();
  });

  it('can be given more or less room by keyboard', async () => {
    const { context, page } = await visit(browser);
    await signIn(page, 'rigger');
    await makeRecipe(page, 'Mail cart', 'Roomy cart', 'roomy_cart');
    const widthOf = async () =>
      (await page.getByRole('region', { name: 'Recipe text' }).boundingBox())?.width ?? 0;
    const before = await widthOf();
    await page.getByRole('separator', { name: 'Line between text and picture' }).focus();
    await page.keyboard.press('ArrowRight');
    await expect.poll(widthOf).toBeGreaterThan(before + 20);
    await context.close();
  });

  it('lead to what a command names, and open what it opens', async () => {
    const { context, page } = await visit(browser);
    await signIn(page, 'rigger');
    await makeRecipe(page, 'Mail cart', 'Commanded cart', 'commanded_cart');
    await page.keyboard.press('Control+.');
    await page.getByLabel('Search the commands').fill('files');
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Enter');
    await page.getByRole('dialog', { name: 'Build of version 1' }).waitFor();
    await context.close();
  });
});

describe('going on from somebody else’s version', () => {
  it('takes theirs as an edit, so that undo brings back one’s own', async () => {
    const mine = await visit(browser);
    await signIn(mine.page, 'rigger');
    await makeRecipe(mine.page, 'Mail cart', 'Their cart', 'their_cart');
    const theirs = await visit(browser);
    await signIn(theirs.page, 'reviewer');
    await theirs.page.goto(mine.page.url());
    await untilDrawn(theirs.page);
    const save = async (page: Page, message: string): Promise<void> => {
      await page.getByRole('button', { name: 'Save version' }).click();
      await page.getByLabel('What changed').fill(message);
      await page.getByRole('dialog').getByRole('button', { name: 'Save version' }).click();
    };
    await replaceInText(theirs.page, 'forty sacks', 'ninety sacks');
    await save(theirs.page, 'More sacks');
    await theirs.page.getByRole('link', { name: 'Download build 2' }).waitFor();

    await replaceInText(mine.page, 'forty sacks', 'eleven sacks');
    await save(mine.page, 'Fewer sacks');
    await mine.page.getByRole('button', { name: 'Go on from version 2' }).click();
    await mine.page.getByText('Same as the saved version.').waitFor();
    await mine.page.getByRole('tab', { name: 'Build script' }).click();
    const script = mine.page.getByRole('region', { name: 'Build script' });
    await script.getByText('ninety sacks').waitFor();

    await mine.page.locator('.monaco-editor textarea, .monaco-editor .native-edit-context').first().focus();
    await mine.page.keyboard.press('Control+z');
    await script.getByText('eleven sacks').waitFor();
    await save(mine.page, 'Fewer sacks after all');
    await mine.page.getByRole('link', { name: 'Download build 3' }).waitFor();
    await mine.context.close();
    await theirs.context.close();
  });
});
