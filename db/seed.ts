// Fills a database with the demo and prints its sign-ins as one line of JSON.
import { readClock } from '@/lib/clock'
import { createPool } from './knex'
import { seedDemo } from './seeds/dev'
import { DEMO_PASSWORD, DEMO_PEOPLE } from './seeds/people'

if (!process.env.DATABASE_URL) throw new Error('Settings: DATABASE_URL is missing')
const db = createPool(process.env.DATABASE_URL)
try {
  await seedDemo(db, readClock(), {
    weatherFakeUrl: process.env.FAKE_WEATHER_URL,
    pushFakeUrl: process.env.FAKE_PUSH_URL,
  })
} finally {
  await db.destroy()
}
const signIns = DEMO_PEOPLE.map(({ email, who }) => ({ email, password: DEMO_PASSWORD, who }))
process.stdout.write(`${JSON.stringify(signIns)}\n`)
