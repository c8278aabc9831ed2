import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { SignInForm } from '@/components/signin/SignInForm';
import { json, type SeenRequest, standInServer } from './server';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  window.location.hash = '';
});

/** The server's side of signing in, as Auth.js speaks it; `error` is what it would refuse with. */
function signInServer(error: string | null): readonly SeenRequest[] {
  const address = `http://localhost/sign-in${error ? `?error=${error}` : ''}`;
  return standInServer({
    'GET /api/auth/providers': () => json({ credentials: { id: 'credentials', type: 'credentials' } }),
    'GET /api/auth/csrf': () => json({ csrfToken: 'token' }),
    'POST /api/auth/callback/credentials': () => json({ url: address }, error ? 401 : 200),
    'GET /api/auth/session': () => json(null),
  });
}

const email = () => screen.getByRole('textbox', { name: /^E-mail/ }) as HTMLInputElement;
const password = () => screen.getByLabelText(/^Password/) as HTMLInputElement;

async function fillIn(address: string, secret: string): Promise<void> {
  const user = userEvent.setup();
  if (address) await user.type(email(), address);
  if (secret) await user.type(password(), secret);
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
}

/** Going to another page, which jsdom cannot do but reports. */
function watchForLeaving(): readonly string[] {
  const left: string[] = [];
  const { jsdom } = globalThis as unknown as {
    readonly jsdom: {
      readonly virtualConsole: { on(name: 'jsdomError', call: (error: Error) => void): void };
    };
  };
  jsdom.virtualConsole.on('jsdomError', ({ message }) => left.push(message));
  return left;
}

describe('signing in', () => {
  it('asks for what is missing, without asking the server', async () => {
    const seen = signInServer(null);
    render(<SignInForm callbackUrl="#in" />);
    await fillIn('', '');
    expect(await screen.findByText('Write your e-mail address.')).toBeDefined();
    expect(screen.getByText('Write your password.')).toBeDefined();
    expect(email().getAttribute('aria-invalid')).toBe('true');
    expect(seen).toEqual([]);
  });

  it('sends what was typed, and goes on to the page that was asked for', async () => {
    const seen = signInServer(null);
    render(<SignInForm callbackUrl="#in" />);
    await fillIn('marta@tidewrack.example', 'long secret');
    await vi.waitFor(() => expect(window.location.hash).toBe('#in'));
    const posted = new URLSearchParams(seen.find(({ method }) => method === 'POST')?.body);
    expect(posted.get('email')).toBe('marta@tidewrack.example');
    expect(posted.get('password')).toBe('long secret');
    expect(screen.queryByRole('alert')).toBeNull();
  });

  it.each([
    ['CredentialsSignin', 'E-mail or password is not right. Check both, then try again.'],
    ['TooManyAttempts', 'Too many tries. Wait a quarter of an hour, then try again.'],
    ['SomethingElse', 'Signing in did not work. Try again.'],
  ])('says why it was refused (%s), and keeps what was typed', async (error, words) => {
    signInServer(error);
    render(<SignInForm callbackUrl="#in" />);
    await fillIn('marta@tidewrack.example', 'wrong');
    expect((await screen.findByRole('alert')).textContent).toBe(words);
    expect([email().value, password().value]).toEqual(['marta@tidewrack.example', 'wrong']);
    expect(window.location.hash).toBe('');
  });
});

describe('a server that cannot be reached', () => {
  it('is told of in words; the page stays, with what was typed', async () => {
    const logged = vi.spyOn(console, 'error').mockImplementation(() => {});
    // Browsers have it and Auth.js reports its own trouble by it; the document of these tests lacks it.
    Object.assign(navigator, { sendBeacon: () => true });
    const left = watchForLeaving();
    standInServer({});
    render(<SignInForm callbackUrl="#in" />);
    await fillIn('marta@tidewrack.example', 'long secret');
    expect((await screen.findByRole('alert')).textContent).toBe(
      'The server cannot be reached. Try again in a moment.',
    );
    expect([email().value, password().value]).toEqual(['marta@tidewrack.example', 'long secret']);
    expect(left).toEqual([]);
    logged.mockRestore();
  });
});
