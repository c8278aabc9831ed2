import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import {
  AppRouterContext,
  type AppRouterInstance,
} from 'next/dist/shared/lib/app-router-context.shared-runtime';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { compile, samples } from '@/compiler';
import { NewRecipe } from '@/components/recipes/NewRecipe';
import { json, standInServer } from './server';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const PATH = 'POST /api/v1/shows/post/recipes';
const problem = (code: string, status: number, detail: string): Response =>
  json(
    { type: `https://pintle.invalid/problems/${code}`, title: code, status, detail, code, requestId: 'r' },
    status,
    'application/problem+json',
  );

async function open() {
  const push = vi.fn();
  const router: AppRouterInstance = {
    push,
    back: vi.fn(),
    forward: vi.fn(),
    refresh: vi.fn(),
    replace: vi.fn(),
    prefetch: vi.fn(),
    bfcacheId: '0',
  };
  render(
    <AppRouterContext.Provider value={router}>
      <QueryClientProvider client={new QueryClient()}>
        <NewRecipe slug="post" samples={samples} />
      </QueryClientProvider>
    </AppRouterContext.Provider>,
  );
  const user = userEvent.setup();
  await user.click(screen.getByRole('button', { name: 'New recipe' }));
  return { push, user, dialog: within(await screen.findByRole('dialog', { name: 'New recipe' })) };
}

async function fillIn({ user, dialog }: Awaited<ReturnType<typeof open>>, title: string, name: string) {
  await user.type(dialog.getByRole('textbox', { name: /^Title/ }), title);
  await user.type(dialog.getByRole('textbox', { name: 'Name' }), name);
  await user.click(dialog.getByRole('button', { name: 'Make recipe' }));
}

describe('a new recipe', () => {
  it('offers every sample and nothing, the first one chosen', async () => {
    const { dialog } = await open();
    const choices = within(dialog.getByRole('group', { name: 'Begin from' })).getAllByRole('radio');
    expect(choices.map((choice) => (choice as HTMLInputElement).value)).toEqual([
      ...samples.map(({ id }) => id),
      '',
    ]);
    expect(choices.map((choice) => (choice as HTMLInputElement).checked).indexOf(true)).toBe(0);
  });

  it('is made from the chosen sample under its new name, and opened', async () => {
    const seen = standInServer({ [PATH]: () => json({ id: 'new-id' }, 201) });
    const page = await open();
    await page.user.click(page.dialog.getByRole('radio', { name: /^Ferry eel/ }));
    await fillIn(page, 'Old: eel', 'old_eel');
    await vi.waitFor(() => expect(page.push).toHaveBeenCalledExactlyOnceWith('/recipes/new-id'));
    const [request] = seen;
    const body = JSON.parse(request?.body ?? '');
    expect(body).toMatchObject({
      name: 'old_eel',
      title: 'Old: eel',
      message: 'Begin from the sample Ferry eel',
    });
    expect(compile({ recipe: { name: 'a', text: body.text } }).rig?.scene.character).toBe('old_eel');
    expect(request?.headers.get('idempotency-key')).toMatch(/^[0-9a-f-]{36}$/);
    // Nobody can send it twice while the new page is on its way.
    expect((page.dialog.getByRole('button', { name: 'Making…' }) as HTMLButtonElement).disabled).toBe(true);
    expect(seen).toHaveLength(1);
  });

  it('can begin from nothing', async () => {
    const seen = standInServer({ [PATH]: () => json({ id: 'new-id' }, 201) });
    const page = await open();
    await page.user.click(page.dialog.getByRole('radio', { name: /^Nothing/ }));
    await fillIn(page, 'Crate', 'crate');
    await vi.waitFor(() => expect(page.push).toHaveBeenCalled());
    expect(JSON.parse(seen[0]?.body ?? '')).toMatchObject({
      message: 'Begin',
      text: expect.stringContaining('recipe: crate'),
    });
  });

  it('asks for a title and a right name, without asking the server', async () => {
    const seen = standInServer({});
    const page = await open();
    await page.user.type(page.dialog.getByRole('textbox', { name: 'Name' }), 'Old Hare');
    await page.user.click(page.dialog.getByRole('button', { name: 'Make recipe' }));
    expect(await page.dialog.findByText('Write a name such as old_hare.')).toBeDefined();
    expect(page.dialog.getByText(/^Say what people call it/)).toBeDefined();
    expect(page.dialog.getByRole('textbox', { name: 'Name' }).getAttribute('aria-invalid')).toBe('true');
    expect(seen).toEqual([]);
  });

  it('says at the name that it is taken, and keeps what was typed', async () => {
    standInServer({ [PATH]: () => problem('name-taken', 409, 'Taken.') });
    const page = await open();
    await fillIn(page, 'Hare', 'hare');
    expect(
      await page.dialog.findByText('This show has a recipe of that name. Choose another.'),
    ).toBeDefined();
    const name = page.dialog.getByRole('textbox', { name: 'Name' }) as HTMLInputElement;
    expect([name.value, name.getAttribute('aria-invalid')]).toEqual(['hare', 'true']);
    expect(page.dialog.queryByRole('alert')).toBeNull();
    expect(page.push).not.toHaveBeenCalled();
  });

  it.each([
    [() => problem('forbidden', 403, 'You may only read in this show.'), 'You may only read in this show.'],
    [
      () => {
        throw new TypeError('fetch failed');
      },
      'The server cannot be reached. What you wrote is still here; try again.',
    ],
  ])('says in words why it was not made (%#), and can be tried again', async (answer, words) => {
    const seen = standInServer({ [PATH]: answer });
    const page = await open();
    await fillIn(page, 'Hare', 'hare');
    expect((await page.dialog.findByRole('alert')).textContent).toBe(words);
    await page.user.click(page.dialog.getByRole('button', { name: 'Make recipe' }));
    await vi.waitFor(() => expect(seen).toHaveLength(2));
  });

  it('can be left', async () => {
    const { dialog, user } = await open();
    await user.click(dialog.getByRole('button', { name: 'Not now' }));
    expect(screen.queryByRole('dialog')).toBeNull();
  });
});
