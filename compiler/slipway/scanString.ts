const ESCAPE = /\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4})/y;
const FIRST_PRINTABLE = 0x20;

/** A quoted text read to its closing quote, or where and why it could not be. */
export type ScannedString =
  | { readonly closed: true; readonly value: string; readonly end: number }
  | { readonly closed: false; readonly at: number; readonly expected: string };

/**
 * Reads the JSON string whose opening quote stands at `start`, looking no further than `limit`. `end` is the offset
 * after the closing quote. Time grows with the length of the string alone.
 */
export function scanString(text: string, start: number, limit: number): ScannedString {
  let at = start + 1;
  while (at < limit) {
    const code = text.charCodeAt(at);
    if (code === 0x22) {
      // Quotes and escapes have just been checked by the rules of JSON, so this cannot throw.
      return { closed: true, value: JSON.parse(text.slice(start, at + 1)) as string, end: at + 1 };
    }
    if (code < FIRST_PRINTABLE)
      return { closed: false, at, expected: 'control characters written as \\u and four digits' };
    if (code === 0x5c) {
      ESCAPE.lastIndex = at;
      const found = ESCAPE.exec(text)?.[0];
      if (found === undefined) return { closed: false, at, expected: 'an escape that JSON knows' };
      at += found.length;
    } else at += 1;
  }
  return { closed: false, at: limit, expected: 'a closing quote' };
}
