import { readFileSync } from 'node:fs';
import { strFromU8, unzipSync } from 'fflate';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createPoser, runScript } from '@/compiler';
import { launchBrowser, signIn, visit } from '../support/browser';
import { makeRecipe, positionOf, replaceInText } from '../support/editorPage';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe('journey 1: a new rigger, ten minutes', () => {
  it('signs in, starts from a sample, changes a number, breaks and mends, saves version 2, downloads the build', async () => {
    const { context, page, troubles } = await visit(browser);
    await signIn(page, 'rigger');
    await page.getByRole('link', { name: /The Saltmarsh Post/ }).click();
    await page.getByRole('heading', { name: 'The Saltmarsh Post' }).waitFor();
    await makeRecipe(page, 'Upright hare', 'Postmaster "Quill"', 'quill');

    // A number changes, and the rig moves while typing.
    const before = await positionOf(page, 'head.head.crown');
    const viewport = page.getByTestId('viewport');
    const pictureBefore = await viewport.screenshot();
    await replaceInText(page, 'default: 96', 'default: 120');
    await expect
      .poll(async () => (await positionOf(page, 'head.head.crown'))[1])
      .toBeCloseTo(((before[1] ?? 0) * 120) / 96, 2);
    const pictureAfter = await viewport.screenshot();
    expect(pictureAfter.equals(pictureBefore)).toBe(false);

    // Something breaks; the finding says what, and its fix mends it.
    await replaceInText(page, 'kind: limb', 'kind: lim');
    await page.getByRole('tab', { name: /Findings/ }).click();
    const finding = page.getByRole('listitem').filter({ hasText: 'not-one-of' });
    await finding.waitFor();
    expect(await finding.textContent()).toContain('"lim" is not allowed');
    await page.getByText('From the last text that compiled.').waitFor();
    await finding.getByRole('button', { name: 'Write "limb"' }).click();
    await page.getByText('Nothing is wrong.').waitFor();

    // Version 2 is saved with a message.
    await page.getByRole('button', { name: 'Save version' }).click();
    await page.getByLabel('What changed').fill('Taller, as measured');
    await page.getByRole('dialog').getByRole('button', { name: 'Save version' }).click();
    await page.getByRole('link', { name: 'Download build 2' }).waitFor();

    // The build is the rig that was on the screen.
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('link', { name: 'Download build 2' }).click(),
    ]);
    const files = unzipSync(new Uint8Array(readFileSync(await download.path())));
    expect(Object.keys(files).sort()).toEqual([
      'quill.chart.csv',
      'quill.chart.html',
      'quill.film.usda',
      'quill.findings.sarif',
      'quill.manifest.json',
      'quill.realtime.glb',
      'quill.rig.json',
      'quill.slip',
    ]);
    const { rig, findings } = runScript({
      name: 'quill.slip',
      text: strFromU8(files['quill.slip'] ?? new Uint8Array()),
    });
    expect(findings).toEqual([]);
    expect(rig?.scene).toMatchObject({ character: 'quill', recipe: 'quill@2' });
    if (!rig) throw new Error('the downloaded script did not run');
    const poser = createPoser(rig);
    poser.evaluate();
    const crown = rig.nodes.findIndex(({ id }) => id === 'head.head.crown');
    expect(poser.world[crown * 16 + 13]).toBeCloseTo(((before[1] ?? 0) * 120) / 96, 2);

    // Both versions can be compared.
    await page.getByRole('link', { name: 'Versions' }).click();
    await page.getByRole('link', { name: 'Compare with 1' }).click();
    await page.locator('mark', { hasText: '120' }).waitFor();

    expect(troubles).toEqual([]);
    await context.close();
  });

  it('can be walked by keyboard alone', async () => {
    const { context, page, troubles } = await visit(browser);
    await page.goto('/sign-in');
    await page.keyboard.press('Tab');
    await page.keyboard.type('rigger@tidewrack.example');
    await page.keyboard.press('Tab');
    await page.keyboard.type('samphire-rope-41');
    await page.keyboard.press('Enter');
    await page.waitForURL('**/shows');

    /** Tabs on until what has the focus is called so. */
    const tabTo = async (name: RegExp): Promise<void> => {
      for (let presses = 0; presses < 60; presses += 1) {
        await page.keyboard.press('Tab');
        // Before there is a first stop the body has the focus, and its text holds every name.
        const words = await page.evaluate(
          () => document.activeElement?.closest('a, button')?.textContent ?? '',
        );
        if (name.test(words)) return;
      }
      throw new Error(`no stop on the way is called ${name}`);
    };
    await tabTo(/The Saltmarsh Post/);
    await page.keyboard.press('Enter');
    await page.waitForURL('**/shows/saltmarsh_post');
    await page.getByRole('button', { name: 'New recipe' }).waitFor();
    await tabTo(/^New recipe$/);
    await page.keyboard.press('Enter');
    await page.getByRole('dialog').waitFor();
    await page.getByRole('radio', { name: 'Ferry eel' }).focus();
    await page.keyboard.press('Space');
    await page.keyboard.press('Tab');
    await page.keyboard.type('Night eel');
    await page.keyboard.press('Tab');
    await page.keyboard.type('night_eel');
    await page.keyboard.press('Enter');
    await page.waitForURL('**/recipes/*');
    await page.locator('.editor-sheet:not([data-compiled="0"])').waitFor();
    await page.locator('.monaco-editor .view-lines').first().waitFor();

    await replaceInText(page, 'default: 180', 'default: 150');
    // The text lets go of the keyboard, and the command list leads anywhere.
    await page.keyboard.press('Control+.');
    await page.getByLabel('Search the commands').waitFor();
    await page.keyboard.type('picture');
    await page.keyboard.press('Enter');
    await expect
      .poll(() => page.evaluate(() => document.activeElement?.getAttribute('data-testid')))
      .toBe('viewport');
    const looked = await page.getByTestId('viewport').screenshot();
    await page.keyboard.press('1');
    await page.keyboard.press('ArrowLeft');
    await expect
      .poll(async () => (await page.getByTestId('viewport').screenshot()).equals(looked))
      .toBe(false);

    await page.keyboard.press('Control+s');
    await page.getByLabel('What changed').waitFor();
    await page.keyboard.type('Shorter');
    await page.keyboard.press('Enter');
    await page.getByRole('link', { name: 'Download build 2' }).waitFor();
    expect(troubles).toEqual([]);
    await context.close();
  });
});
