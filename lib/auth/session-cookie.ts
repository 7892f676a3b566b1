// The cookie that carries the session, by one definition for next-auth, for our own sign-in and for proxy.ts.

/** A winter: nobody should have to sign in with gloves on. Every visit within it starts it anew. */
export const SESSION_SECONDS = 180 * 24 * 60 * 60

export interface SessionCookie {
  name: string
  options: { httpOnly: true; sameSite: 'lax'; path: '/'; secure: boolean }
}

/** Over https the name's prefix makes browsers insist on Secure, on our host alone and on the whole site. */
export function sessionCookie(publicUrl: string): SessionCookie {
  const secure = publicUrl.startsWith('https:')
  return {
    name: `${secure ? '__Host-' : ''}nightsheet.session`,
    options: { httpOnly: true, sameSite: 'lax', path: '/', secure },
  }
}
