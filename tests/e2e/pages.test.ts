import { AxeBuilder } from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { launchBrowser, signIn, visit } from '../support/browser';
import { untilDrawn } from '../support/editorPage';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

/** Addresses of the demo's pages; the hare is the recipe with three versions. */
async function demoPages(page: Page): Promise<readonly string[]> {
  const response = await page.request.get('/api/v1/shows/saltmarsh_post/recipes?search=hare');
  const { items } = (await response.json()) as { items: { id: string; name: string }[] };
  const hare = items.find(({ name }) => name === 'hare')?.id ?? '';
  return [
    '/shows',
    '/shows/saltmarsh_post',
    '/shows/saltmarsh_post?search=nothing+has+this',
    `/recipes/${hare}`,
    `/recipes/${hare}?version=1`,
    `/recipes/${hare}/versions`,
    `/recipes/${hare}/compare?from=1&to=2`,
    '/handbook',
    '/handbook/findings?search=pole',
    '/handbook/findings/pole-undecided',
  ];
}

/** Chapters so long that axe takes a minute over each: made of what the short ones are made of, only measured by width. */
const LONG_CHAPTERS = ['/handbook/language', '/handbook/parts', '/handbook/trials', '/handbook/slipway'];

describe.each([
  ['on paper, wide', { width: 1440, height: 900, scheme: 'light' }],
  ['as blueprint, narrow', { width: 390, height: 844, scheme: 'dark' }],
] as const)('every page %s', (_, options) => {
  it('has nothing that axe objects to, nothing wider than the window, and no trouble in the console', async () => {
    const { context, page, troubles } = await visit(browser, options);
    await page.goto('/sign-in');
    const checkWidth = async (): Promise<void> => {
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(overflow).toBeLessThanOrEqual(0);
    };
    const check = async (): Promise<void> => {
      const { violations } = await new AxeBuilder({ page }).exclude('.monaco-editor').analyze();
      expect(
        violations.map(
          ({ id, nodes }) => `${page.url()} ${id}: ${nodes.map(({ html }) => html).join(' | ')}`,
        ),
      ).toEqual([]);
      await checkWidth();
    };
    await check();
    await signIn(page, 'rigger');
    for (const address of await demoPages(page)) {
      await page.goto(address);
      if (/^\/recipes\/[^/]+$/.test(address.split('?')[0] ?? '')) await untilDrawn(page);
      await check();
      for (const tab of await page.getByRole('tab').all()) {
        await tab.click();
        await check();
      }
    }
    for (const address of LONG_CHAPTERS) {
      await page.goto(address);
      await checkWidth();
    }
    expect(troubles).toEqual([]);
    await context.close();
  });
});

describe('the sides of who may see what', () => {
  it('lets a viewer look but not save, and hides foreign shows', async () => {
    const { context, page } = await visit(browser);
    await signIn(page, 'viewer');
    const [, , , hare] = await demoPages(page);
    await page.goto(hare ?? '');
    await untilDrawn(page);
    await page.getByText(/Read only/).waitFor();
    expect(await page.getByRole('button', { name: 'Save version' }).count()).toBe(0);
    await page.goto('/shows/night_ferry');
    await page.getByRole('heading', { name: 'There is nothing here' }).waitFor();
    await context.close();
  });

  it('keeps what was typed when signing in is refused, and says why', async () => {
    const { context, page } = await visit(browser);
    await page.goto('/shows/saltmarsh_post');
    await page.waitForURL('**/sign-in?callbackUrl=*');
    await page.getByLabel('E-mail').fill('rigger@tidewrack.example');
    await page.getByLabel('Password').fill('wrong');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByRole('alert').filter({ hasText: 'not right' }).waitFor();
    expect(await page.getByLabel('E-mail').inputValue()).toBe('rigger@tidewrack.example');
    await page.getByLabel('Password').fill('samphire-rope-41');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL('**/shows/saltmarsh_post');
    await context.close();
  });

  it('remembers the scheme that was chosen', async () => {
    const { context, page } = await visit(browser);
    await signIn(page, 'rigger');
    await page.getByLabel('Drawn').selectOption('night');
    await page.reload();
    expect(await page.locator('html').getAttribute('data-scheme')).toBe('night');
    await context.close();
  });
});
