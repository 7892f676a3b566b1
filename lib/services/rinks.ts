// Setting up a rink, and which rinks one has.
import { putAlertPreferences } from '@/db/queries/alert-preferences'
import { findOrCreateGridCell } from '@/db/queries/grid-cells'
import { enqueuePull } from '@/db/queries/jobs'
import { insertMember } from '@/db/queries/members'
import { replaceAvailableHours } from '@/db/queries/rink-settings'
import { findRinkByCreationKey, insertRink, listRinksOfUser, type RinkOfUser } from '@/db/queries/rinks'
import { insertReportedSheet } from '@/db/queries/sheet-states'
import { chooseUnits } from '@/db/queries/users'
import { insertWater } from '@/db/queries/water-sources'
import type { Db } from '@/db/knex'
import { requireRink } from '@/lib/access/require-rink'
import { REPORTED } from '@/lib/advice/thresholds'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import { timeZoneAt } from '@/lib/places/time-zone'
import type { RinkInput, SetUpRinkInput } from '@/lib/schemas/rinks'
import { cellOf } from '@/lib/weather/cell'
import { placeOf } from './place-rink'
import { spend } from './rate-limits'

/** Keeps what the keeper says of the ice at this moment. */
export async function reportIce(trx: Db, rinkId: string, thicknessMm: number, now: Date): Promise<void> {
  const temperatureC = thicknessMm > 0 ? REPORTED.iceTemperatureC : 0
  await insertReportedSheet(trx, rinkId, { thicknessMm, temperatureC, snowCoverCm: 0 }, now)
}

/** The form fills in the zone of the place: only another one was chosen. */
function chosenZone({ timeZone, latitudeDeg, longitudeDeg }: RinkInput): string | undefined {
  return timeZone === timeZoneAt(latitudeDeg, longitudeDeg) ? undefined : timeZone
}

/**
 * Sets up a rink with everything the first advice needs, and asks for its weather, all or nothing.
 *
 * @returns the rink; the one made before when this form was sent already.
 */
export async function setUpRink(context: ServiceContext, input: SetUpRinkInput): Promise<{ rinkId: string }> {
  const { db, now, viewer } = context
  const made = { createdBy: viewer.userId, creationKey: input.creationKey }
  const before = await findRinkByCreationKey(db, made)
  if (before) return { rinkId: before.id }
  await spend(context, 'setUpByUser', viewer.userId)
  const { available, water, iceThicknessMm, ...rink } = input.rink
  const placed = await placeOf({ ...rink, timeZone: chosenZone(input.rink) })
  return db.transaction(async (trx) => {
    const cell = await findOrCreateGridCell(trx, cellOf(rink.latitudeDeg, rink.longitudeDeg))
    const inserted = await insertRink(trx, { ...rink, ...placed, gridCellId: cell.id, ...made }, now)
    if (!inserted) return { rinkId: await getRinkMadeMeanwhile(trx, made) }
    const rinkId = inserted.id
    await insertMember(trx, { rinkId, userId: viewer.userId, role: 'keeper' }, now)
    await insertWater(trx, rinkId, water, true)
    await replaceAvailableHours(trx, rinkId, available)
    await reportIce(trx, rinkId, iceThicknessMm ?? 0, now)
    const access = await requireRink({ db: trx, now, viewer }, rinkId, 'receiveAlerts')
    await putAlertPreferences(trx, access, viewer.userId, input.told, now)
    await chooseUnits(trx, viewer.userId, input.units, now)
    await enqueuePull(trx, cell.id)
    return { rinkId }
  })
}

async function getRinkMadeMeanwhile(trx: Db, made: { createdBy: string; creationKey: string }): Promise<string> {
  const rink = await findRinkByCreationKey(trx, made)
  if (!rink) throw new NotFoundError('Rink')
  return rink.id
}

export function listMyRinks({ db, viewer }: ServiceContext): Promise<RinkOfUser[]> {
  return listRinksOfUser(db, viewer.userId)
}
