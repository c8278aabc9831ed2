import { Refusal } from '../refusal';

/**
 * Bytes a request body may have: a recipe of a million characters, three bytes each in UTF-8, and a quarter more
 * for the escapes of JSON.
 */
export const MAXIMUM_BODY_BYTES = 4 * 1024 * 1024;

/** Collects the body, giving up as soon as it is too large: what a sender claims of its length proves nothing. */
async function readBytes(request: Request): Promise<Uint8Array> {
  const tooLarge = () => new Refusal({ code: 'body-too-large', maximumBytes: MAXIMUM_BODY_BYTES });
  if (Number(request.headers.get('content-length') ?? 0) > MAXIMUM_BODY_BYTES) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let length = 0;
  for (const reader = request.body?.getReader(); reader; ) {
    const { done, value } = await reader.read();
    if (done) break;
    length += value.byteLength;
    if (length > MAXIMUM_BODY_BYTES) {
      await reader.cancel();
      throw tooLarge();
    }
    chunks.push(value);
  }
  return Buffer.concat(chunks);
}

/** Reads a request's JSON; refuses other media types, too much, broken UTF-8 and broken JSON. */
export async function readJsonBody(request: Request): Promise<unknown> {
  const mediaType = request.headers.get('content-type')?.split(';')[0]?.trim().toLowerCase();
  if (mediaType !== 'application/json') {
    throw new Refusal({ code: 'unsupported-media-type', expected: 'application/json' });
  }
  const bytes = await readBytes(request);
  try {
    return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
  } catch {
    throw new Refusal({ code: 'bad-request', detail: 'The body is not JSON in UTF-8.' });
  }
}
