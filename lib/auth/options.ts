// next-auth: reads every session, and signs in and out over its own routes by the same services as our forms.
import { headers } from 'next/headers'
import type { AuthOptions } from 'next-auth'
import CredentialsProvider from 'next-auth/providers/credentials'
import { ZodError } from 'zod'
import { readClock } from '@/lib/clock'
import { readEnvironment } from '@/lib/env'
import { AppError } from '@/lib/errors'
import { linkSchema, passwordSignInSchema } from '@/lib/schemas/accounts'
import { signInWithLink, signInWithPassword, type SignedIn } from '@/lib/services/accounts'
import { sessionAdapter } from './adapter'
import { openContext } from './open-context'
import { sharedPool } from './pool'
import { SESSION_SECONDS, sessionCookie } from './session-cookie'
import { openSession } from './sessions'

declare module 'next-auth' {
  interface Session {
    user: { id: string; name: string; isAdmin: boolean; signedInAt?: Date }
  }
  interface User {
    isAdmin?: boolean
    signedInAt?: Date
  }
}

const DAY_SECONDS = 24 * 60 * 60

/** next-auth knows a refusal as null; the service's words are those of our own page (`pages.error`). */
async function orNull(signIn: Promise<SignedIn>): Promise<{ id: string } | null> {
  try {
    return { id: (await signIn).userId }
  } catch (error) {
    if (error instanceof AppError || error instanceof ZodError) return null
    throw error
  }
}

const providers = [
  CredentialsProvider({
    id: 'password',
    name: 'Password',
    credentials: { email: {}, password: {} },
    authorize: (fields) =>
      orNull((async () => signInWithPassword(await openContext(), passwordSignInSchema.parse(fields)))()),
  }),
  CredentialsProvider({
    id: 'link',
    name: 'E-mail link',
    credentials: { key: {} },
    authorize: (fields) => orNull((async () => signInWithLink(await openContext(), linkSchema.parse(fields).key))()),
  }),
]

/**
 * Made when first needed, because a build has no settings.
 *
 * @param onFault Hears why a session could not be read, which next-auth logs and keeps to itself.
 */
export function authOptions(onFault?: (fault: unknown) => void): AuthOptions {
  const { NEXTAUTH_SECRET, PUBLIC_URL } = readEnvironment()
  // next-auth takes its own address from here and nowhere else.
  process.env.NEXTAUTH_URL = PUBLIC_URL
  const cookie = sessionCookie(PUBLIC_URL)
  return {
    secret: NEXTAUTH_SECRET,
    adapter: sessionAdapter(sharedPool(), onFault),
    // No `strategy`: the adapter makes it "database". Named outright, next-auth refuses providers like ours.
    session: { maxAge: SESSION_SECONDS, updateAge: DAY_SECONDS },
    useSecureCookies: cookie.options.secure,
    cookies: { sessionToken: cookie },
    providers,
    pages: { signIn: '/sign-in', signOut: '/sign-out', error: '/sign-in', verifyRequest: '/check-your-mail' },
    jwt: {
      // With an adapter next-auth encodes a token in one place only: after `authorize`. The cookie gets
      // what this returns, so a session row takes the place of the signed token.
      encode: async ({ token }) => {
        if (!token?.sub) throw new Error('Signed in without a person')
        return (await openSession(sharedPool(), token.sub, readClock(), (await headers()).get('user-agent') ?? ''))
          .token
      },
    },
    callbacks: {
      session: ({ session, user }) => ({
        expires: session.expires,
        user: { id: user.id, name: user.name ?? '', isAdmin: user.isAdmin ?? false, signedInAt: user.signedInAt },
      }),
    },
  }
}
