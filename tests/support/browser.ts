import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';
import { inject } from 'vitest';
import { demoAccounts } from '@/db/demo/accounts';

const FLAGS = [
  '--no-sandbox',
  '--use-angle=swiftshader',
  '--enable-unsafe-swiftshader',
  '--disable-quic',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** A browser of Debian's, with pictures drawn in software. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({ executablePath: '/usr/bin/chromium', args: FLAGS });
}

export interface VisitOptions {
  readonly width?: number;
  readonly height?: number;
  readonly scheme?: 'light' | 'dark';
}

/** A window with what went wrong in it: console errors, uncaught errors, requests to other origins. */
export interface Visit {
  readonly context: BrowserContext;
  readonly page: Page;
  readonly troubles: string[];
}

/** Opens a window of its own and listens for trouble. */
export async function visit(browser: Browser, options: VisitOptions = {}): Promise<Visit> {
  const { width = 1440, height = 900, scheme = 'light' } = options;
  const context = await browser.newContext({
    baseURL: inject('applicationUrl'),
    viewport: { width, height },
    colorScheme: scheme,
    acceptDownloads: true,
  });
  const troubles: string[] = [];
  context.on('page', (page) => {
    page.on('pageerror', (error) => troubles.push(`uncaught: ${error.message}`));
    page.on('console', (message) => {
      if (message.type() === 'error') troubles.push(`console: ${message.text()} ${message.location().url}`);
    });
    page.on('request', (request) => {
      const url = new URL(request.url());
      const isOwn =
        url.origin === inject('applicationUrl') || url.protocol === 'data:' || url.protocol === 'blob:';
      if (!isOwn) troubles.push(`left the origin: ${request.url()}`);
    });
  });
  const page = await context.newPage();
  page.setDefaultTimeout(60_000);
  return { context, page, troubles };
}

/** Signs in through the form, as a demo account of a role. */
export async function signIn(page: Page, role: string): Promise<void> {
  const account = demoAccounts.find((candidate) => candidate.role === role);
  if (!account) throw new Error(`no demo account is a ${role}`);
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(account.email);
  await page.getByLabel('Password').fill(account.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL('**/shows');
}
