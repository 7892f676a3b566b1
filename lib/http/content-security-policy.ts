// What a page may load and run: our own files, and scripts that carry this answer's nonce.

/** SHA-256 of `display:none`, the one style that React writes: it hides what it streams into a drawing. */
const DISPLAY_NONE = "'sha256-aqNNdDLnnrDOnTNdkJpYlAxKVJtLt9CtFLklmInuUAE='"

export function contentSecurityPolicy({
  nonce,
  isDevelopment,
  isHttps,
}: {
  nonce: string
  isDevelopment: boolean
  isHttps: boolean
}): string {
  // React's development build evaluates code, and the error overlay adds styles without a nonce.
  const evaluate = isDevelopment ? " 'unsafe-eval'" : ''
  const styles = isDevelopment ? "'unsafe-inline'" : `'nonce-${nonce}'`
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${evaluate}`,
    `style-src-elem 'self' ${styles}`,
    `style-src-attr 'unsafe-hashes' ${DISPLAY_NONE}`,
    "img-src 'self' data: blob:",
    "font-src 'self'",
    "connect-src 'self'",
    "worker-src 'self'",
    "manifest-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
    ...(isHttps ? ['upgrade-insecure-requests'] : []),
  ].join('; ')
}
