import { connection } from 'next/server'
import { sharedPool } from '@/lib/auth/pool'
import { readClock } from '@/lib/clock'
import { route } from '@/lib/http/route'
import { getHealth } from '@/lib/services/health'

export const GET = route(async () => {
  await connection()
  const health = await getHealth(sharedPool(), readClock())
  return Response.json(health, {
    status: health.status === 'down' ? 503 : 200,
    headers: { 'Cache-Control': 'no-store' },
  })
})
