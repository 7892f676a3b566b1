// Tells our own pages' requests from other sites': the cookie alone (SameSite=Lax) is not the only guard.

const READING_METHODS = new Set(['GET', 'HEAD', 'OPTIONS'])

/** True for reads, and for writes whose Origin names the host that they were sent to. */
export function isFromHere(request: Request): boolean {
  if (READING_METHODS.has(request.method)) return true
  const origin = request.headers.get('origin')
  // Browsers send Origin with every write; older ones at least say how the request is related to the page.
  if (origin === null) return request.headers.get('sec-fetch-site') === 'same-origin'
  const host = request.headers.get('x-forwarded-host') ?? request.headers.get('host') ?? new URL(request.url).host
  return URL.canParse(origin) && new URL(origin).host === host
}
