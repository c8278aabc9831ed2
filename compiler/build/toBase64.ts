const ALPHABET = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/';

/** Bytes as base64 with padding (RFC 4648, section 4). */
export function toBase64(bytes: Uint8Array): string {
  const parts: string[] = [];
  for (let i = 0; i < bytes.length; i += 3) {
    const a = bytes[i] as number;
    const b = bytes[i + 1];
    const c = bytes[i + 2];
    const word = (a << 16) | ((b ?? 0) << 8) | (c ?? 0);
    parts.push(
      (ALPHABET[word >> 18] as string) +
        (ALPHABET[(word >> 12) & 63] as string) +
        (b === undefined ? '=' : (ALPHABET[(word >> 6) & 63] as string)) +
        (c === undefined ? '=' : (ALPHABET[word & 63] as string)),
    );
  }
  return parts.join('');
}
