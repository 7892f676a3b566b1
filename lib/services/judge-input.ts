// Puts together what the model is asked: the rink, its water, its sheet, what was poured, and the forecast.
import type { Db } from '@/db/knex'
import { findNewestFill, listFillSessions } from '@/db/queries/fills'
import { listFloodsSince, type PouredPass } from '@/db/queries/floods'
import type { StoredForecast } from '@/db/queries/forecasts'
import type { RinkForJudging } from '@/db/queries/rinks'
import { findStartingSheet, type StoredSheet } from '@/db/queries/sheet-states'
import type { RinkAccess } from '@/lib/access/proofs'
import { MODEL_VERSION } from '@/lib/advice/judge'
import type { Yard } from '@/lib/advice/yard/types'
import type { JudgeInput } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { litresBy } from './fill-facts'
import { findYardInUse } from './yard-in-use'

/** What is on the ground before anybody reported a sheet. */
const BARE = { thicknessMm: 0, temperatureC: 0, snowCoverCm: 0 }

function sheetOf(sheet: StoredSheet | undefined, firstHourAt: Date): JudgeInput['sheet'] {
  if (!sheet) return BARE
  const hourAt = Math.floor(sheet.asOf.getTime() / HOUR_MILLIS) * HOUR_MILLIS
  return {
    thicknessMm: sheet.thicknessMm,
    temperatureC: sheet.temperatureC,
    snowCoverCm: sheet.snowCoverCm,
    asOf: new Date(Math.max(hourAt, firstHourAt.getTime())).toISOString(),
    // A state of another model is not read: its plain numbers are a fair start.
    ...(sheet.state && sheet.modelVersion === MODEL_VERSION ? { state: sheet.state } : {}),
  }
}

/** The depth that was wanted of a fill under way, and what of it is in; once it is over, the depth that it came to. */
async function waterOfFill(
  db: Db,
  access: RinkAccess,
  { phase, lengthM, widthM }: RinkForJudging,
  now: Date,
): Promise<Partial<JudgeInput['water']>> {
  if (phase !== 'filling' && phase !== 'freezing') return {}
  const fill = await findNewestFill(db, access)
  if (!fill || (phase === 'filling') !== (fill.finishedAt === null)) return {}
  const litres = litresBy(await listFillSessions(db, fill.id), fill.finishedAt ?? now)
  if (phase === 'filling') return { fillDepthMm: fill.targetDepthMm, filledLitres: litres }
  return { fillDepthMm: Math.min(1000, Math.max(20, litres / (lengthM * widthM))) }
}

function endOf({ hours }: Pick<StoredForecast, 'hours'>): number {
  return Date.parse(hours.at(-1)?.time ?? '') + HOUR_MILLIS
}

/** What the model is asked about a rink now; undefined when the forecast is empty, or so old that it ends before now. */
export async function gatherJudgeInput(
  db: Db,
  access: RinkAccess,
  { rink, forecast, now }: { rink: RinkForJudging; forecast: StoredForecast; now: Date },
): Promise<JudgeInput | undefined> {
  const firstHour = forecast.hours[0]
  if (!firstHour || endOf(forecast) <= now.getTime()) return undefined
  const firstHourAt = new Date(firstHour.time)
  const sheet = await findStartingSheet(db, rink.id, { firstHourAt, now })
  const poured = await listFloodsSince(db, access, sheet && sheet.asOf > firstHourAt ? sheet.asOf : firstHourAt)
  const input = judgeInputOf({ rink, yard: await findYardInUse(db, rink), forecast, sheet, poured, firstHourAt, now })
  return { ...input, water: { ...input.water, ...(await waterOfFill(db, access, rink, now)) } }
}

export function judgeInputOf(facts: {
  rink: RinkForJudging
  yard: Yard
  forecast: Pick<StoredForecast, 'hours' | 'members'>
  sheet: StoredSheet | undefined
  poured: readonly PouredPass[]
  firstHourAt: Date
  now: Date
}): JudgeInput {
  const { rink, yard, forecast, sheet, poured, firstHourAt, now } = facts
  return {
    now: now.toISOString(),
    rink: {
      latitude: rink.latitudeDeg,
      longitude: rink.longitudeDeg,
      timeZone: rink.timeZone,
      lengthM: rink.lengthM,
      widthM: rink.widthM,
      shelter: yard.shelter,
      skyView: yard.skyView,
      base: rink.base,
      phase: rink.phase,
      floor: rink.floor,
    },
    water: {
      temperatureC: rink.water.temperatureC,
      flowLPerMin: rink.water.flowLPerMin,
      layerMm: rink.water.layerMm,
      fillDepthMm: rink.water.fillDepthMm,
    },
    sheet: sheetOf(sheet, firstHourAt),
    available: rink.available,
    limits: {
      ...(rink.windLimitMps === null ? {} : { windMps: rink.windLimitMps }),
      ...(rink.windChillLimitC === null ? {} : { windChillC: rink.windChillLimitC }),
    },
    carriesSkaterMm: rink.carriesSkaterMm,
    maxPasses: rink.maxPasses,
    hours: forecast.hours,
    ...(forecast.members ? { members: forecast.members } : {}),
    poured: poured.map((pass) => ({
      at: pass.pouredAt.toISOString(),
      layerMm: pass.layerMm,
      temperatureC: pass.waterTemperatureC,
    })),
  }
}
