// A rink whose forecast is stored and judged, for tests of what follows: windows, alerts, deliveries, the Tonight page.
import type { Knex } from 'knex'
import { insertForecast } from '@/db/queries/forecasts'
import { systemRinkAccess } from '@/lib/access/system'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'
import { slotOf } from '@/lib/services/forecasts'
import { refreshOutlook } from '@/lib/services/outlooks'
import type { Cast } from './cast'
import { hoursFrom } from './night-weather'

export const SETTINGS = {
  publicUrl: 'https://rink.example',
  secret: 'a secret that only the tests of this project know',
}

const DAY_HOURS = 24
const FORECAST_HOURS = 5 * DAY_HOURS

/** Stores a forecast as read at `now`, a day back and four ahead. */
export async function storeForecast(
  db: Knex,
  cast: Cast,
  now: Date,
  change?: (at: Date) => Partial<HourlyRecord>,
): Promise<void> {
  const slotAt = slotOf(now)
  const firstAt = new Date(slotAt.getTime() - DAY_HOURS * HOUR_MILLIS)
  await insertForecast(db, {
    cellId: cast.cellId,
    provider: 'invented',
    slotAt,
    issuedAt: null,
    fetchedAt: now,
    expiresAt: new Date(now.getTime() + 6 * HOUR_MILLIS),
    hours: hoursFrom(firstAt, FORECAST_HOURS, change),
    members: null,
    attribution: { text: 'Invented weather', url: 'https://weather.example', licence: 'none' },
  })
}

/** The same, and what the job then judges. */
export async function judgeForecast(...[db, cast, now, change]: Parameters<typeof storeForecast>): Promise<void> {
  await storeForecast(db, cast, now, change)
  await judgeNow(db, cast, now)
}

/** Judges the rink as the job does. */
export function judgeNow(db: Knex, cast: Cast, now: Date): Promise<boolean> {
  return refreshOutlook({ db, now }, systemRinkAccess<'view'>(cast.rinkId))
}
