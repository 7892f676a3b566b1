// One-click unsubscribe (RFC 8058): the POST comes from a mail program, without session or Origin; the token is the proof.
import type { NextRequest } from 'next/server'
import { openContext } from '@/lib/auth/open-context'
import { route } from '@/lib/http/route'
import { unsubscribeByToken } from '@/lib/services/unsubscribe'

function seeOther(path: string): Response {
  return new Response(null, { status: 303, headers: { Location: path, 'Cache-Control': 'no-store' } })
}

function pageOf(request: NextRequest): string {
  return `/unsubscribe?${new URLSearchParams({ token: request.nextUrl.searchParams.get('token') ?? '' })}`
}

export const POST = route(
  async (request: NextRequest) => {
    const context = await openContext()
    await unsubscribeByToken(context, context.secret, request.nextUrl.searchParams.get('token'))
    if (request.nextUrl.searchParams.get('from') === 'page') return seeOther(pageOf(request))
    return new Response('Mails about this rink are off.', { headers: { 'Content-Type': 'text/plain; charset=utf-8' } })
  },
  { acceptsAnyOrigin: true },
)

/** People and scanners open the same address: both get a page, and only a tap on its button unsubscribes. */
export const GET = route((request: NextRequest) => Promise.resolve(seeOther(pageOf(request))))
