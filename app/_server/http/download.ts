/** A file to keep: never shown by the browser itself, whatever its content. */
export interface Download {
  readonly name: string;
  readonly mediaType: string;
  readonly etag: string;
  readonly body: string | Uint8Array<ArrayBuffer>;
}

/** An answer that the browser stores under the file's name. The name may have any characters (RFC 6266, RFC 8187). */
export function download({ name, mediaType, etag, body }: Download): Response {
  const plain = name.replaceAll(/[^A-Za-z0-9_.@-]/g, '_');
  return new Response(body, {
    headers: {
      'content-type': mediaType,
      'content-disposition': `attachment; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(name)}`,
      'cache-control': 'private, no-cache',
      'x-content-type-options': 'nosniff',
      etag: `"${etag}"`,
    },
  });
}
