// The state of the product, for whoever watches it from outside.
import { connection } from 'next/server'
import { sharedPool } from '@/lib/auth/pool'
import { readClock } from '@/lib/clock'
import { route } from '@/lib/http/route'
import { createHealthReader } from '@/lib/services/health'

const readHealth = createHealthReader()

export const GET = route(async () => {
  await connection()
  const health = await readHealth(sharedPool(), readClock())
  // Anybody may ask here, and an error may quote what it failed on: the server page shows it to the admin alone.
  const jobs = health.jobs.map((job) => ({ ...job, lastError: undefined }))
  return Response.json(
    { ...health, jobs },
    {
      status: health.status === 'down' ? 503 : 200,
      headers: { 'Cache-Control': 'no-store' },
    },
  )
})
