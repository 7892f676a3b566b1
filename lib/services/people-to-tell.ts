// Who is told about a rink, and from when on in a night.
import { listAlertRecipients, type AlertRecipient } from '@/db/queries/alert-preferences'
import type { Advice } from '@/db/queries/outlooks'
import type { RinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import { isGranted } from '@/lib/access/permissions'
import type { RinkAccess } from '@/lib/access/proofs'
import { minuteOf } from '@/lib/advice/time-of-day'
import { instantOfLocal } from '@/lib/advice/zoned-time'

/** The rink as it was judged, inside the transaction that decides about it and holds the rink's row. */
export interface RinkToTell {
  trx: Db
  access: RinkAccess<'view'>
  now: Date
  rink: RinkForJudging
  /** Of the rink's settings when it was judged. */
  settingsVersion: number
  advice: Advice
  forecastExpiresAt: Date
}

/** Keepers and crew whose address is confirmed. */
export async function listPeopleToTell(trx: Db, access: RinkAccess<'view'>): Promise<AlertRecipient[]> {
  return (await listAlertRecipients(trx, access)).filter(
    (person) => isGranted(person.role, 'receiveAlerts') && person.isEmailVerified,
  )
}

/** A person's time of day, on the date the night begins at. */
export function tellInstant(tellAt: string, nightDate: string, timeZone: string): Date {
  return new Date(instantOfLocal(nightDate, minuteOf(tellAt), timeZone))
}
