// How a person wants to hear about a rink, and for how long they want silence.
import {
  DEFAULT_PREFERENCES,
  findAlertPreferences,
  putAlertPreferences,
  type AlertPreferences,
} from '@/db/queries/alert-preferences'
import { enqueueDecision } from '@/db/queries/jobs'
import { getRinkHead } from '@/db/queries/rinks'
import { listToldMessages, type ToldMessageRow } from '@/db/queries/told-messages'
import { requireRink } from '@/lib/access/require-rink'
import { tonightDate } from '@/lib/advice/night'
import type { Phase } from '@/lib/advice/types'
import { addDays } from '@/lib/advice/zoned-time'
import type { ServiceContext } from '@/lib/context'
import { InvalidInputError } from '@/lib/errors'
import type { AlertPreferencesInput, MuteInput } from '@/lib/schemas/alerts'
import type { Units } from '@/lib/units'
import { getAccount } from './own-account'
import { listOwnDevices, type Device } from './push-subscriptions'

/** What the person was told, as the page lists it. */
export type ToldMessage = ToldMessageRow

export interface AlertSettings {
  rink: { name: string; timeZone: string; phase: Phase }
  tonightDate: string
  preferences: AlertPreferences
  email: string
  /** Mail to it came back for good: none is sent until a mailed link was opened. */
  isEmailRefused: boolean
  units: Units
  clock: '12' | '24'
  devices: Device[]
  told: ToldMessage[]
}

const TOLD_SHOWN = 30
const LONGEST_MUTE_DAYS = 366

/** @throws ForbiddenError for skaters, who are not told; NotFoundError for strangers. */
export async function getAlertSettings(context: ServiceContext, rinkId: string): Promise<AlertSettings> {
  const { db, now, viewer } = context
  const access = await requireRink(context, rinkId, 'receiveAlerts')
  const account = await getAccount(context)
  const rink = await getRinkHead(db, access)
  return {
    rink,
    tonightDate: tonightDate(now, rink.timeZone),
    preferences: (await findAlertPreferences(db, access, viewer.userId)) ?? DEFAULT_PREFERENCES,
    email: account.email,
    isEmailRefused: account.isEmailRefused,
    units: account.units,
    clock: account.clock,
    devices: await listOwnDevices(context),
    told: await listToldMessages(db, access, viewer.userId, TOLD_SHOWN),
  }
}

export async function chooseAlertPreferences(context: ServiceContext, input: AlertPreferencesInput): Promise<void> {
  const { rinkId, ...choice } = input
  const access = await requireRink(context, rinkId, 'receiveAlerts')
  await context.db.transaction(async (trx) => {
    await putAlertPreferences(trx, access, context.viewer.userId, choice, context.now)
    // An earlier time of day, or the end of silence, may make something due at once.
    await enqueueDecision(trx, rinkId)
  })
}

/** @returns the last silent night, null when alerts are on again. */
export async function muteAlerts(
  context: ServiceContext,
  input: MuteInput,
): Promise<{ mutedThroughDate: string | null }> {
  const access = await requireRink(context, input.rinkId, 'receiveAlerts')
  const { timeZone } = await getRinkHead(context.db, access)
  const mutedThroughDate = lastSilentNight(input, tonightDate(context.now, timeZone))
  await context.db.transaction(async (trx) => {
    await putAlertPreferences(trx, access, context.viewer.userId, { mutedThroughDate }, context.now)
    if (mutedThroughDate === null) await enqueueDecision(trx, input.rinkId)
  })
  return { mutedThroughDate }
}

/** @throws InvalidInputError at the date, for one that is over or so far ahead that it was a slip. */
function lastSilentNight(input: MuteInput, tonight: string): string | null {
  if (input.until === 'never') return null
  if (input.until === 'tonight') return tonight
  const throughDate = input.throughDate ?? tonight
  if (throughDate < tonight)
    throw new InvalidInputError('That night is over.', { throughDate: 'Choose tonight or a later night.' })
  if (throughDate > addDays(tonight, LONGEST_MUTE_DAYS)) {
    throw new InvalidInputError('That is too far ahead.', { throughDate: 'At most a year ahead.' })
  }
  return throughDate
}
