// The demo's record: three weeks of nights judged and settled by the services, as the worker would have done day by day.
import type { Db } from '@/db/knex'
import { insertForecast } from '@/db/queries/forecasts'
import type { RinkAccess } from '@/lib/access/proofs'
import { nightBounds, tonightDate } from '@/lib/advice/night'
import { addDays } from '@/lib/advice/zoned-time'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { refreshOutlook } from '@/lib/services/outlooks'
import { slotOf } from '@/lib/services/forecasts'
import { settleRinkNight } from '@/lib/services/night-outcomes'
import { PAST_NIGHTS, pastForecast } from './past-weather'

const INVENTED = { text: 'Weather invented for the demo', url: '', licence: '' }

/** Once: a rink that has a settled night keeps its record. Nobody is told of nights that are over. */
export async function seedPastNights(
  db: Db,
  access: RinkAccess<'view'>,
  now: Date,
  /** What people did once the night was judged. */
  spendNight: (index: number, nightDate: string) => Promise<void>,
): Promise<void> {
  const rink = await db('rinks').where({ id: access.rinkId }).first('time_zone', 'grid_cell_id')
  if (!rink || (await db('night_outcomes').where({ rink_id: access.rinkId }).first('night_date'))) return
  const tonight = tonightDate(now, rink.time_zone)
  const told = db('alert_preferences').where({ rink_id: access.rinkId })
  await told.clone().update({ muted_through: addDays(tonight, -1) })
  for (let index = 0; index < PAST_NIGHTS; index++) {
    const nightDate = addDays(tonight, index - PAST_NIGHTS)
    const noon = nightBounds(nightDate, rink.time_zone).startsAt
    // Ten past three: a little before people are told.
    const judgedAt = new Date(noon.getTime() + 3 * HOUR_MILLIS + 600_000)
    await insertForecast(db, {
      cellId: rink.grid_cell_id,
      slotAt: slotOf(judgedAt),
      provider: 'made-up',
      issuedAt: null,
      fetchedAt: judgedAt,
      expiresAt: new Date(judgedAt.getTime() + 6 * HOUR_MILLIS),
      hours: pastForecast(index, noon),
      members: null,
      attribution: INVENTED,
    })
    // With the weather of the night that ended, which this forecast has.
    if (index > 0) await settleRinkNight({ db, now: judgedAt }, access, addDays(nightDate, -1))
    await refreshOutlook({ db, now: judgedAt }, access)
    await spendNight(index, nightDate)
  }
  await told.update({ muted_through: null })
}
