// Setting up a rink, and changing what its advice depends on.
import { putAlertPreferences } from '@/db/queries/alert-preferences'
import { findOrCreateGridCell } from '@/db/queries/grid-cells'
import { enqueuePull, enqueueRefresh } from '@/db/queries/jobs'
import { insertMember } from '@/db/queries/members'
import {
  findRinkByCreationKey,
  findRinkForJudging,
  insertRink,
  listRinksOfUser,
  putDefaultWater,
  replaceAvailableHours,
  updateRinkSettings,
  type RinkForJudging,
  type RinkOfUser,
  type RinkSettingsRow,
} from '@/db/queries/rinks'
import { insertReportedSheet } from '@/db/queries/sheet-states'
import { chooseUnits } from '@/db/queries/users'
import type { Db } from '@/db/knex'
import { requireRink } from '@/lib/access/require-rink'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import { findNearestPlace } from '@/lib/places/gazetteer'
import { timeZoneAt } from '@/lib/places/time-zone'
import type { ChangeRinkInput, RinkInput, SetUpRinkInput } from '@/lib/schemas/rinks'
import { cellOf } from '@/lib/weather/cell'
import { spend } from './rate-limits'

/** Nobody measures it, and a sheet forgets it within a day: a little below freezing. [°C] Ours. */
const REPORTED_ICE_TEMPERATURE_C = -2

type PlacedRink = RinkInput & { placeName: string; timeZone: string }

/** Fills in what follows from the position when it was left empty. Reads files, so it happens before any transaction. */
async function placeRink(rink: RinkInput): Promise<PlacedRink> {
  const { latitudeDeg, longitudeDeg } = rink
  const timeZone = rink.timeZone ?? timeZoneAt(latitudeDeg, longitudeDeg)
  if (rink.placeName) return { ...rink, timeZone, placeName: rink.placeName }
  const nearest = await findNearestPlace(latitudeDeg, longitudeDeg)
  const placeName = nearest ? `Near ${nearest.name}` : `${latitudeDeg.toFixed(2)}, ${longitudeDeg.toFixed(2)}`
  return { ...rink, timeZone, placeName }
}

function settingsRow(rink: PlacedRink, gridCellId: string): RinkSettingsRow {
  const { available: _available, water: _water, iceThicknessMm: _iceThicknessMm, ...settings } = rink
  return { ...settings, gridCellId }
}

/** Everything beside the rink's own row that set-up and change have in common. */
async function writeAround(trx: Db, rinkId: string, rink: RinkInput, now: Date): Promise<void> {
  await putDefaultWater(trx, rinkId, rink.water)
  await replaceAvailableHours(trx, rinkId, rink.available)
  if (rink.iceThicknessMm === undefined) return
  const temperatureC = rink.iceThicknessMm > 0 ? REPORTED_ICE_TEMPERATURE_C : 0
  await insertReportedSheet(trx, rinkId, { thicknessMm: rink.iceThicknessMm, temperatureC, snowCoverCm: 0 }, now)
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
  const rink = await placeRink({ ...input.rink, iceThicknessMm: input.rink.iceThicknessMm ?? 0 })
  return db.transaction(async (trx) => {
    const cell = await findOrCreateGridCell(trx, cellOf(rink.latitudeDeg, rink.longitudeDeg))
    const inserted = await insertRink(trx, { ...settingsRow(rink, cell.id), ...made }, now)
    if (!inserted) return { rinkId: await getRinkMadeMeanwhile(trx, made) }
    const rinkId = inserted.id
    await insertMember(trx, { rinkId, userId: viewer.userId, role: 'keeper' }, now)
    await writeAround(trx, rinkId, rink, now)
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

/** Changes a rink's settings, counts the change, and has the night judged again; in a new place with its own weather. */
export async function changeRinkSettings(
  context: ServiceContext,
  { rinkId, rink: input }: ChangeRinkInput,
): Promise<void> {
  const { db, now } = context
  const access = await requireRink(context, rinkId, 'manage')
  const rink = await placeRink(input)
  await db.transaction(async (trx) => {
    const cell = await findOrCreateGridCell(trx, cellOf(rink.latitudeDeg, rink.longitudeDeg))
    const before = await getRink(trx, rinkId)
    // Takes the row's lock first: of two changes at once the second waits here and then replaces all of the first.
    await updateRinkSettings(trx, access, settingsRow(rink, cell.id), now)
    await writeAround(trx, rinkId, rink, now)
    if (before.gridCellId !== cell.id) await enqueuePull(trx, cell.id)
    await enqueueRefresh(trx, rinkId)
  })
}

/** For the settings page. @throws ForbiddenError for crew and skaters, NotFoundError for strangers. */
export async function getRinkSettings(context: ServiceContext, rinkId: string): Promise<RinkForJudging> {
  await requireRink(context, rinkId, 'manage')
  return getRink(context.db, rinkId)
}

async function getRink(db: Db, rinkId: string): Promise<RinkForJudging> {
  const rink = await findRinkForJudging(db, rinkId)
  if (!rink) throw new NotFoundError('Rink')
  return rink
}

export function listMyRinks({ db, viewer }: ServiceContext): Promise<RinkOfUser[]> {
  return listRinksOfUser(db, viewer.userId)
}
