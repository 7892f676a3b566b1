// Puts together what the model is asked: the rink, its water, its sheet, what was poured, and the forecast.
import type { Db } from '@/db/knex'
import { findStandingFill, listFillChecks, listFillSessions } from '@/db/queries/fills'
import { listFloodsSince, type PouredPass } from '@/db/queries/floods'
import type { StoredForecast } from '@/db/queries/forecasts'
import type { RinkForJudging } from '@/db/queries/rinks'
import { findStartingSheet, type StoredSheet } from '@/db/queries/sheet-states'
import type { RinkAccess } from '@/lib/access/proofs'
import { MODEL_VERSION } from '@/lib/advice/judge'
import type { Yard } from '@/lib/advice/yard/types'
import type { JudgeInput } from '@/lib/advice/types'
import { HOUR_MILLIS, ICE_DENSITY, WATER_DENSITY } from '@/lib/physics/constants'
import { filledDepthMm, litresBy } from './fill-facts'
import { findYardInUse } from './yard-in-use'

/** What is on the ground before anybody reported a sheet. */
const BARE = { thicknessMm: 0, temperatureC: 0, snowCoverCm: 0 }

const ICE_TO_WATER = ICE_DENSITY / WATER_DENSITY
/** A hole is read to half a centimetre. Common practice. [mm] */
const READ_WITHIN_MM = 5
/** What the model takes as the depth of a fill. [mm] */
const LEAST_FILL_MM = 20
const MOST_FILL_MM = 1000

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
  { rink, sheetMm, now }: { rink: RinkForJudging; sheetMm: number; now: Date },
): Promise<Partial<JudgeInput['water']>> {
  if (rink.phase !== 'filling' && rink.phase !== 'freezing') return {}
  const fill = await findStandingFill(db, access)
  if (!fill || (rink.phase === 'filling') !== (fill.finishedAt === null)) return {}
  const sessions = await listFillSessions(db, fill.id)
  if (rink.phase === 'filling') return { fillDepthMm: fill.targetDepthMm, filledLitres: litresBy(sessions, now) }
  const filledMm = filledDepthMm(rink, fill, { sessions, checks: await listFillChecks(db, fill.id) })
  // Ice thicker than that froze of more water than was counted: nothing says then that it stands on the floor.
  const isMoreThanCounted = (sheetMm - READ_WITHIN_MM) * ICE_TO_WATER > filledMm
  const depthMm = isMoreThanCounted ? Math.max(filledMm, fill.targetDepthMm) : filledMm
  return { fillDepthMm: Math.min(MOST_FILL_MM, Math.max(LEAST_FILL_MM, depthMm)) }
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
  return {
    ...input,
    water: { ...input.water, ...(await waterOfFill(db, access, { rink, sheetMm: sheet?.thicknessMm ?? 0, now })) },
  }
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
