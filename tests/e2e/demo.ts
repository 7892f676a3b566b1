// The demo's people and rinks in the database of the journeys, and a way in for its keeper.
import type { Page } from '@playwright/test'
import { createPool } from '@/db/knex'
import { DEMO_PASSWORD } from '@/db/seeds/people'
import { seedDemo } from '@/db/seeds/dev'
import { expect } from './fixtures'

/** Journeys share the demo: what one wrote into its log is gone before the next looks at tonight's passes. */
export async function forgetEntriesSince(instant: Date): Promise<void> {
  const db = createPool(process.env.DATABASE_URL ?? '')
  try {
    await db('log_entries').where('created_at', '>=', instant).delete()
  } finally {
    await db.destroy()
  }
}

/** Repeating it changes nothing. The worker reads the weather and judges within seconds. */
export async function seedTheDemo(): Promise<void> {
  const db = createPool(process.env.DATABASE_URL ?? '')
  try {
    await seedDemo(db, new Date(), { weatherFakeUrl: process.env.FAKE_WEATHER_URL })
  } finally {
    await db.destroy()
  }
}

export async function signInAsKeeper(page: Page): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill('maren@nightsheet.example')
  await page.getByLabel('Password').fill(DEMO_PASSWORD)
  await page.getByRole('button', { name: 'Sign in', exact: true }).click()
  await expect(page).toHaveURL(/\/rinks/)
}

/** Opens the rink whose log the demo has written, once it has been judged. @returns its path. */
export async function openBirchLane(page: Page): Promise<string> {
  await page.goto('/rinks')
  await page.getByRole('link', { name: /Birch Lane/ }).click()
  await expect(page).toHaveURL(/\/rinks\/[0-9a-f-]{36}$/)
  const path = new URL(page.url()).pathname
  await expect(async () => {
    await page.goto(path)
    await expect(page.getByRole('heading', { level: 1 })).toHaveText(/Flood|Hold|Fill/, { timeout: 2000 })
  }).toPass({ timeout: 60_000 })
  return path
}
