// next-auth's own routes: session, CSRF token, sign-in and sign-out for clients that do not use our forms.
import { NextRequest } from 'next/server'
import NextAuth from 'next-auth'
import { authOptions } from '@/lib/auth/options'
import { readBytes } from '@/lib/http/read-json'
import { route } from '@/lib/http/route'

type Context = RouteContext<'/api/auth/[...nextauth]'>

const handle = (request: NextRequest, context: Context): Promise<Response> => NextAuth(request, context, authOptions())

export const GET = route(handle)

export const POST = route(async (request: NextRequest, context: Context) => {
  const { url, method, headers } = request
  // next-auth reads bodies of any size.
  return handle(new NextRequest(url, { method, headers, body: await readBytes(request) }), context)
})
