/**
 * The Content-Security-Policy of one answer: scripts only of this origin and with this answer's nonce, nothing
 * from elsewhere, no frames around us. Inline styles stay allowed because the text editor sets them.
 */
export function contentSecurityPolicy(nonce: string, { allowEval }: { readonly allowEval: boolean }): string {
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${allowEval ? " 'unsafe-eval'" : ''}`,
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self' data:",
    "connect-src 'self'",
    "worker-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ');
}
