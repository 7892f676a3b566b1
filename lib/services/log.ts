// Writing into the log and changing it. What was done with water or snow reaches the model in the same transaction.
import {
  findEntryIdByKey,
  insertEntry,
  isPassLogged,
  listRevisions,
  lockEntry,
  updateEntry,
  type EntryValues,
  type LogEntry,
} from '@/db/queries/log-entries'
import { getRinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { requireRink } from '@/lib/access/require-rink'
import type { ServiceContext } from '@/lib/context'
import { ConflictError, InvalidInputError, NotFoundError } from '@/lib/errors'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { AnswerSetInput, ChangeEntryInput, EntryId, WriteEntryInput } from '@/lib/schemas/log'
import { changedSentence } from '@/lib/words/log'
import { followLog, modelSheetAt } from './log-effects'
import { entryValues, saidForFlood, withUnchanged } from './log-values'
import { entryView } from './log-view'
import { firstAfter, happened } from './log-when'
import { readerOf } from './rink-and-reader'

/** Without a time, what somebody found is taken as found now; not of a flood this old. [h] Ours. */
const ANSWER_NOW_HOURS = 12

/**
 * Writes an entry. The same key again, from a second tap or a phone that was offline, changes nothing.
 *
 * @returns the entry; the one written before when this key was sent already.
 * @throws ForbiddenError for skaters; InvalidInputError for a time to come, of another season, or that no clock showed.
 */
export async function writeEntry(context: ServiceContext, input: WriteEntryInput): Promise<{ entryId: string }> {
  const { db, now, viewer } = context
  const access = await requireRink(context, input.rinkId, 'writeLog')
  const before = await findEntryIdByKey(db, access, input.entryKey)
  if (before) return { entryId: before }
  const rink = await getRinkForJudging(db, access.rinkId)
  const when = happened(input.when, { now, timeZone: rink.timeZone })
  const values = await entryValues(db, access, input, rink)
  const { kind, entryKey } = input
  const saidSetByAt = kind === 'flood' ? await saidForFlood(db, access, when.happenedAt, values, rink) : null
  const modelThicknessMm =
    kind === 'reading' ? ((await modelSheetAt(db, access, when.happenedAt))?.thicknessMm ?? null) : null
  const entry = { ...values, ...when, saidSetByAt, modelThicknessMm, kind, entryKey, writtenBy: viewer.userId }
  return db.transaction(async (trx) => {
    const entryId = await insertEntry(trx, access, entry, now)
    if (!entryId) return { entryId: (await findEntryIdByKey(trx, access, entryKey)) ?? '' }
    await followLog(trx, access, { after: entry }, now)
    return { entryId }
  })
}

/**
 * Changes an entry, unless somebody else did since `version` was read.
 *
 * @throws ConflictError that tells what the other person wrote; sent again with the version it carries, the change stands.
 */
export async function changeEntry(context: ServiceContext, input: ChangeEntryInput): Promise<void> {
  const { db, now } = context
  const access = await requireRink(context, input.rinkId, 'writeLog')
  const rink = await getRinkForJudging(db, access.rinkId)
  await db.transaction(async (trx) => {
    const before = await lockUnchanged(context, trx, access, input, rink.timeZone)
    if (before.kind !== input.kind)
      throw new InvalidInputError('An entry stays what it is.', { kind: 'Write a new one instead.' })
    const when = happened(input.when, { now, timeZone: rink.timeZone }, before.happenedAt)
    refuseAfterOutcome(before, when.happenedAt)
    const movedMillis = when.happenedAt.getTime() - before.happenedAt.getTime()
    const said = before.saidSetByAt && new Date(before.saidSetByAt.getTime() + movedMillis)
    const values = await entryValues(trx, access, withUnchanged(input, before, rink), rink)
    // A planned pass belongs to its night.
    const passNumber = when.nightDate === before.nightDate ? before.passNumber : null
    await saveChange(context, trx, access, before, { ...values, ...when, saidSetByAt: said, passNumber })
  })
}

/** Deletes an entry, or brings it back; doing it twice changes nothing. Both are kept in its history. */
export async function deleteEntry(context: ServiceContext, { rinkId, entryId }: EntryId): Promise<void> {
  const access = await requireRink(context, rinkId, 'writeLog')
  await context.db.transaction(async (trx) => {
    const before = await lockEntry(trx, access, entryId)
    if (!before) throw new NotFoundError('Entry')
    if (before.deletedAt === null) await saveChange(context, trx, access, before, { deletedAt: context.now })
  })
}

export async function restoreEntry(context: ServiceContext, { rinkId, entryId }: EntryId): Promise<void> {
  const access = await requireRink(context, rinkId, 'writeLog')
  await context.db.transaction(async (trx) => {
    const before = await lockEntry(trx, access, entryId)
    if (!before) throw new NotFoundError('Entry')
    if (before.deletedAt === null) return
    // The pass may have been checked off again meanwhile: then this one stays a flood like any other.
    const passNumber = (await isPassLogged(trx, access, before)) ? null : before.passNumber
    await saveChange(context, trx, access, before, { deletedAt: null, passNumber })
  })
}

/** Writes down what somebody found of a flood; "none" takes the answer back. The yard's calibration reads it. */
export async function answerSet(context: ServiceContext, input: AnswerSetInput): Promise<void> {
  const { db, now } = context
  const access = await requireRink(context, input.rinkId, 'writeLog')
  const { timeZone } = await getRinkForJudging(db, access.rinkId)
  await db.transaction(async (trx) => {
    const before = await lockUnchanged(context, trx, access, input, timeZone)
    if (before.kind !== 'flood') throw new InvalidInputError('Only a flood sets.')
    const outcome = input.outcome === 'none' ? null : input.outcome
    const outcomeAt = outcome === null ? null : foundAt(before, input.atTime, { now, timeZone })
    await saveChange(context, trx, access, before, { outcome, outcomeAt })
  })
}

function foundAt(flood: LogEntry, time: string | undefined, { now, timeZone }: { now: Date; timeZone: string }): Date {
  const refuse = (message: string) => new InvalidInputError('Something here needs another look.', { atTime: message })
  if (time === undefined) {
    const isLongAgo = now.getTime() - flood.happenedAt.getTime() > ANSWER_NOW_HOURS * HOUR_MILLIS
    if (isLongAgo) throw refuse('At what time did you see it?')
    return now
  }
  const at = firstAfter(flood.happenedAt, time, timeZone)
  if (at > now) throw refuse('After the flood, that time is still to come.')
  return at
}

/** @throws ConflictError when it was changed or deleted since it was read; NotFoundError for another rink's. */
async function lockUnchanged(
  context: ServiceContext,
  trx: Db,
  access: RinkAccess<'writeLog'>,
  { entryId, version }: { entryId: string; version: number },
  timeZone: string,
): Promise<LogEntry> {
  const entry = await lockEntry(trx, access, entryId)
  if (!entry) throw new NotFoundError('Entry')
  if (entry.version === version && entry.deletedAt === null) return entry
  const [last] = await listRevisions(trx, access, entryId)
  const change = { by: last?.changedBy ?? null, at: last?.changedAt ?? entry.updatedAt, entry: entryView(entry) }
  const message = changedSentence(change, context.now, await readerOf({ ...context, db: trx }, timeZone))
  throw new ConflictError(message, entry.deletedAt === null ? { version: String(entry.version) } : {})
}

function refuseAfterOutcome(before: LogEntry, happenedAt: Date): void {
  if (!before.outcomeAt || happenedAt <= before.outcomeAt) return
  throw new InvalidInputError('Something here needs another look.', {
    atTime: 'Somebody saw how it set before that. Take that answer back first.',
  })
}

async function saveChange(
  { viewer, now }: ServiceContext,
  trx: Db,
  access: RinkAccess<'writeLog'>,
  before: LogEntry,
  changes: Partial<EntryValues> & { deletedAt?: Date | null },
): Promise<void> {
  await updateEntry(trx, before, changes, { changedBy: viewer.userId, now })
  const after = { ...before, ...changes }
  if (!reachesModel(before, after)) return
  const stands = ({ deletedAt }: LogEntry) => deletedAt === null
  await followLog(
    trx,
    access,
    { before: stands(before) ? before : undefined, after: stands(after) ? after : undefined },
    now,
  )
}

/** A mended note, or an answer, leaves the sheet as it is. */
function reachesModel(before: LogEntry, after: LogEntry): boolean {
  return (
    before.happenedAt.getTime() !== after.happenedAt.getTime() ||
    before.layerMm !== after.layerMm ||
    before.waterTemperatureC !== after.waterTemperatureC ||
    before.thicknessMm !== after.thicknessMm ||
    before.deletedAt !== after.deletedAt
  )
}
