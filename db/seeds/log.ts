// The demo's log, written through the services night by night. Fixed keys: repeating it changes nothing.
import type { Db } from '@/db/knex'
import { minuteOf } from '@/lib/advice/time-of-day'
import { instantOfLocal } from '@/lib/advice/zoned-time'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { writeEntrySchema } from '@/lib/schemas/log'
import { answerSet, writeEntry } from '@/lib/services/log'
import { METRIC, unitsCode } from '@/lib/units'
import { DEMO_LOG, type DemoEntry } from './log-nights'
import type { DemoPerson } from './people'

/** Nobody waits longer for a layer. */
const OVERNIGHT_MILLIS = 11 * 60 * MINUTE_MILLIS

interface DemoRink {
  db: Db
  ids: Record<DemoPerson, string>
  rinkId: string
  timeZone: string
}

const keyOf = (index: number) => `6a2f4a0e-3c1b-4a7c-9d55-${String(index).padStart(12, '0')}`

/** Writes what was done in one night; each entry a minute after it happened, as from a phone. */
export async function seedLogNight(rink: DemoRink, night: number, nightDate: string): Promise<void> {
  for (const [index, entry] of DEMO_LOG.entries()) {
    if (entry.night === night) await seedEntry(rink, entry, index, nightDate)
  }
}

async function seedEntry(rink: DemoRink, entry: DemoEntry, index: number, nightDate: string): Promise<void> {
  const { db, ids, rinkId, timeZone } = rink
  const at = new Date(instantOfLocal(nightDate, minuteOf(entry.at), timeZone))
  const by = (now: Date) => ({ db, now, viewer: { userId: ids[entry.by], isAdmin: false } })
  const typed = { ...entry.fields, ...(await drilled(rink, entry, at)) }
  const fields = {
    rinkId,
    entryKey: keyOf(index),
    units: unitsCode(METRIC),
    onDate: nightDate,
    atTime: entry.at,
    ...typed,
  }
  const now = new Date(at.getTime() + MINUTE_MILLIS)
  const { entryId } = await writeEntry(by(now), writeEntrySchema.parse(fields))
  if (!entry.found) return
  const row = await db('log_entries').where({ id: entryId, version: 1 }).first('said_set_by_at')
  if (!row) return
  if (entry.found !== 'as-said') {
    const { outcome, atTime } = entry.found
    const found = new Date(instantOfLocal(nightDate, minuteOf(atTime), timeZone))
    await answerSet(by(found), { rinkId, entryId, version: 1, outcome, atTime })
  } else if (row.said_set_by_at && row.said_set_by_at.getTime() - at.getTime() < OVERNIGHT_MILLIS) {
    // Now a little early, now a little late, as people find it.
    const found = new Date(row.said_set_by_at.getTime() + ((index % 3) - 1) * 5 * MINUTE_MILLIS)
    await answerSet(by(found), { rinkId, entryId, version: 1, outcome: 'set', atTime: undefined })
  }
}

/** Half a centimetre less than the model has, in the half centimetres that a ruler shows. */
async function drilled({ db, rinkId }: DemoRink, { fields }: DemoEntry, at: Date): Promise<Record<string, string>> {
  if (fields.kind !== 'reading') return {}
  const sheet = await db('sheet_states')
    .where({ rink_id: rinkId })
    .where('as_of', '<=', at)
    .orderBy('as_of', 'desc')
    .first('thickness_mm')
  return { thickness: String(Math.round((sheet?.thickness_mm ?? 90) / 5) / 2 - 0.5) }
}
