// Judging a rink: newest forecast and sheet in; scored hours, advised window and what there is to tell out.
import { findNewestForecast, type StoredForecast } from '@/db/queries/forecasts'
import { hasOutlook, insertOutlook, insertScoredHours } from '@/db/queries/outlooks'
import { findRinkForJudging, type RinkForJudging } from '@/db/queries/rinks'
import { keepModelledSheet } from '@/db/queries/sheet-states'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { judge } from '@/lib/advice/judge'
import { tonightDate } from '@/lib/advice/night'
import { askOtherNights } from '@/lib/advice/night-runs'
import { summariseNight } from '@/lib/advice/night-summary'
import type { Judgement, JudgeInput } from '@/lib/advice/types'
import { whatWouldTurn } from '@/lib/advice/what-would-change'
import { adviseNight } from './alerts'
import { slotOf } from './forecasts'
import { gatherJudgeInput } from './judge-input'

interface Judged {
  rink: RinkForJudging
  forecast: StoredForecast
  input: JudgeInput
  judgement: Judgement
}

/**
 * Judges a rink with its newest forecast and, in one transaction, stores the outlook, the sheet, the advised window and
 * the messages it calls for. Once per forecast, settings and hour; repeating it, or two workers at once, changes nothing.
 *
 * @returns false when there was nothing to do.
 */
export async function refreshOutlook({ db, now }: { db: Db; now: Date }, access: RinkAccess<'view'>): Promise<boolean> {
  const slotAt = slotOf(now)
  const judged = await judgeRink(db, access, slotAt, now)
  if (!judged) return false
  const { rink, forecast, input, judgement } = judged
  const summary = summariseNight(judgement, {
    nightDate: tonightDate(now, rink.timeZone),
    now,
    timeZone: rink.timeZone,
  })
  const wouldTurn = summary.verdict === 'hold' ? whatWouldTurn(input, summary.nightDate) : []
  const otherNights = askOtherNights(input, judgement.windows)
  const { modelVersion, windows, plan, fill, thaws } = judgement
  const outlook = {
    forecastId: forecast.id,
    settingsVersion: rink.settingsVersion,
    modelVersion,
    summary,
    advice: { windows, plan, fill, thaws, wouldTurn, otherNights },
  }
  return db.transaction(async (trx) => {
    const outlookId = await insertOutlook(trx, {
      ...outlook,
      rinkId: rink.id,
      judgedAt: now,
      slotAt,
      timeZone: rink.timeZone,
      nightDate: summary.nightDate,
    })
    if (!outlookId) return false
    await insertScoredHours(trx, outlookId, judgement.hours)
    await keepSheet(trx, rink.id, judgement)
    await adviseNight({ trx, access, now }, rink, { id: outlookId, ...outlook }, forecast.expiresAt)
    return true
  })
}

/** Runs the model; the slow part, outside any transaction. Undefined where there is nothing new to judge by. */
async function judgeRink(db: Db, access: RinkAccess<'view'>, slotAt: Date, now: Date): Promise<Judged | undefined> {
  const rink = await findRinkForJudging(db, access.rinkId)
  const forecast = rink && (await findNewestForecast(db, rink.gridCellId, now))
  if (!rink || !forecast) return undefined
  const key = { rinkId: rink.id, forecastId: forecast.id, settingsVersion: rink.settingsVersion, slotAt }
  if (await hasOutlook(db, key)) return undefined
  const input = await gatherJudgeInput(db, access, { rink, forecast, now })
  if (!input) return undefined
  return { rink, forecast, input, judgement: judge(input, { stateAt: slotAt.toISOString() }) }
}

/** Tomorrow's run starts where today's carried the sheet. */
async function keepSheet(trx: Db, rinkId: string, { sheetState, modelVersion, hours }: Judgement): Promise<void> {
  if (!sheetState) return
  const before = hours.findLast((hour) => hour.time < sheetState.at)
  if (!before) return
  const { thicknessMm, temperatureC, snowCoverCm } = before.sheet
  await keepModelledSheet(trx, rinkId, {
    asOf: new Date(sheetState.at),
    modelVersion,
    thicknessMm,
    temperatureC,
    snowCoverCm,
    state: sheetState.state,
  })
}
