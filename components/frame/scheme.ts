/** How the pages are drawn: ink on paper, light on blue, or as the person's system asks. */
export type Scheme = 'system' | 'day' | 'night';

/** Keeps the choice; the server reads it, so that the first paint is right. */
export const SCHEME_COOKIE = 'scheme';

/** The scheme a cookie names; anything else is the system's. */
export function readScheme(value: string | undefined): Scheme {
  return value === 'day' || value === 'night' ? value : 'system';
}
