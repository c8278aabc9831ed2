/** The id a proxy in front gave the request, if it looks like one, or a new one: it joins answer and log. */
export function requestIdOf(request: Request): string {
  const given = request.headers.get('x-request-id');
  return given && /^[A-Za-z0-9-]{8,64}$/.test(given) ? given : crypto.randomUUID();
}
