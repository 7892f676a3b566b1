// Runs before every page: gives it its Content-Security-Policy, refuses forms of megabytes, and sends browsers without
// a session cookie to sign-in.
// Not an authorisation: services check who asks.
import { randomBytes } from 'node:crypto'
import { NextResponse, type NextRequest } from 'next/server'
import { PATH_HEADER } from '@/lib/auth/next-path'
import { SESSION_SECONDS, sessionCookie } from '@/lib/auth/session-cookie'
import { readEnvironment } from '@/lib/env'
import { contentSecurityPolicy } from '@/lib/http/content-security-policy'
import { BODY_LIMIT_BYTES } from '@/lib/http/read-json'

const MEMBER_PATHS = /^\/(rinks|account|admin)(\/|$)/

export function proxy(request: NextRequest): NextResponse {
  if (request.headers.has('transfer-encoding')) {
    // Browsers say how long a form is; a body of unknown length could only be refused after reading it.
    return new NextResponse('Say how long the form is (Content-Length).', { status: 411 })
  }
  if (Number(request.headers.get('content-length') ?? 0) > BODY_LIMIT_BYTES) {
    // Next would answer a form of megabytes with 500, after reading it.
    return new NextResponse('That is more than any of our forms holds (64 kB).', { status: 413 })
  }
  const { PUBLIC_URL } = readEnvironment()
  const { pathname, search } = request.nextUrl
  if (MEMBER_PATHS.test(pathname) && !request.cookies.has(sessionCookie(PUBLIC_URL).name)) {
    const signIn = new URL('/sign-in', request.url)
    signIn.searchParams.set('next', pathname + search)
    return NextResponse.redirect(signIn)
  }
  const policy = contentSecurityPolicy({
    nonce: randomBytes(16).toString('base64'),
    isDevelopment: process.env.NODE_ENV === 'development',
    isHttps: PUBLIC_URL.startsWith('https:'),
  })
  const headers = new Headers(request.headers)
  // Next reads the nonce for its own scripts from this request header.
  headers.set('Content-Security-Policy', policy)
  headers.set(PATH_HEADER, pathname + search)
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('Content-Security-Policy', policy)
  slideCookie(request, response, PUBLIC_URL)
  return response
}

/**
 * A visit starts the cookie's winter anew, as it does the session's. Only when a page is opened: data that is fetched
 * in the background could arrive after a new sign-in, and would put the old cookie back.
 */
function slideCookie(request: NextRequest, response: NextResponse, publicUrl: string): void {
  const { name, options } = sessionCookie(publicUrl)
  const token = request.cookies.get(name)?.value
  if (!token || request.method !== 'GET' || request.headers.get('sec-fetch-mode') !== 'navigate') return
  response.cookies.set(name, token, { ...options, maxAge: SESSION_SECONDS })
}

export const config = {
  matcher: ['/((?!_next/|api/|sw\\.js$|manifest\\.webmanifest$|icon|apple-icon|favicon\\.ico$|robots\\.txt$).*)'],
}
