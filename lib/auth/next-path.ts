// Where to go after sign-in: a path on this site, or nowhere.

/** Request header in which proxy.ts tells pages their own address; it overwrites whatever the visitor sent. */
export const PATH_HEADER = 'x-nightsheet-path'

const HERE = 'http://here.invalid'

/** The path when it stays on this site, otherwise undefined: `//evil.example` and `/\evil.example` leave it. */
export function localPath(value: unknown): string | undefined {
  if (typeof value !== 'string' || !value.startsWith('/') || value.length > 500) return undefined
  if (!URL.canParse(value, HERE)) return undefined
  const url = new URL(value, HERE)
  // `/.//evil.example` climbs to `//evil.example`, which leaves this site when it is read once more.
  if (url.origin !== HERE || url.pathname.startsWith('//')) return undefined
  return `${url.pathname}${url.search}`
}

/** The address of a page at the door that leads on to `next`. */
export function withNext<Door extends string>(door: Door, next: string | undefined): Door | `${Door}?next=${string}` {
  return next ? `${door}?next=${encodeURIComponent(next)}` : door
}
