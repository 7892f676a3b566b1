// Where to go after sign-in: a path on this site, or nowhere.

const HERE = 'http://here.invalid'

/** The path when it stays on this site, otherwise undefined: `//evil.example` and `/\evil.example` leave it. */
export function localPath(value: unknown): string | undefined {
  if (typeof value !== 'string' || !value.startsWith('/') || value.length > 500) return undefined
  if (!URL.canParse(value, HERE)) return undefined
  const url = new URL(value, HERE)
  return url.origin === HERE ? `${url.pathname}${url.search}` : undefined
}
