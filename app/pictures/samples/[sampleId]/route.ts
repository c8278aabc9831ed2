import { samplePicture } from '@/compiler/index';

const drawn = new Map<string, string | undefined>();

/** The picture of a sample, drawn when it is first asked for; the same for everyone. */
export async function GET(
  _: Request,
  { params }: { readonly params: Promise<{ readonly sampleId: string }> },
): Promise<Response> {
  const { sampleId } = await params;
  if (!drawn.has(sampleId)) {
    const picture = samplePicture(sampleId);
    // Only samples there are, so that nobody can fill the memory with names.
    if (picture === undefined) return new Response(null, { status: 404 });
    drawn.set(sampleId, picture);
  }
  return new Response(drawn.get(sampleId), {
    headers: {
      'content-type': 'image/svg+xml',
      'cache-control': 'public, max-age=3600',
      'x-content-type-options': 'nosniff',
    },
  });
}
