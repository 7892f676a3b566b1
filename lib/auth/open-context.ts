// What use cases for strangers are given.
import 'server-only'
import { headers } from 'next/headers'
import { connection } from 'next/server'
import { readClock } from '@/lib/clock'
import type { OpenContext } from '@/lib/context'
import { readEnvironment } from '@/lib/env'
import { sharedPool } from './pool'
import { visitorAddress } from './visitor-address'

export async function openContext(): Promise<OpenContext> {
  await connection()
  const { NEXTAUTH_SECRET, TRUST_PROXY } = readEnvironment()
  const forwardedFor = (await headers()).get('x-forwarded-for')
  return {
    db: sharedPool(),
    now: readClock(),
    secret: NEXTAUTH_SECRET,
    ipAddress: visitorAddress(forwardedFor, TRUST_PROXY),
  }
}
