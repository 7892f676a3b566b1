// Passes as the keeper wants them: when each would be set on the sheet that the ones before leave, and what speaks against it.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { wetSurfaceBalance } from '@/lib/physics/balance'
import { advanceSheet, advanceSheetPart, clearSnow, pourLayer, type SheetState } from '@/lib/physics/sheet'
import type { PreparedHour } from '@/lib/physics/types'
import { frostbiteBand } from '@/lib/physics/wind-chill'
import { judgeFloodStart, setsAtOf, type FloodStart } from './flood-factors'
import { floodReasons } from './flood-reasons'
import type { NightRun } from './night-model'
import { isPersonal } from './personal'
import { isGood } from './score-hours'
import { isAvailableAt } from './setting'
import { toIso } from './zoned-time'
import type { Reason } from './types'

/** A factor below this is worth a warning; above it, it is a matter of taste. Ours. [0-1] */
const WARN_BELOW = 0.5
/** Half an inch at once freezes slowly, takes in air and stays soft. Rule D02: U.S. Ice Rink Association. [mm] */
const TOO_THICK_MM = 12.7

export interface WantedPass {
  startsAt: string
  /** [mm], above 0 to 500 */
  layerMm: number
  /** Of the water. [°C], 0 to 100 */
  temperatureC: number
  /** How long the hose is out for it [min]; without it no pass is told to wait for the hose. */
  hoseMinutes?: number
}

export interface JudgedPass extends WantedPass {
  /** Null when it does not set within a day after the night, or the forecast ends before. */
  setBy: string | null
  /** Whether the advice itself would plan it so. */
  isAdvisable: boolean
  windChillC: number
  /** What speaks against the pass and the ice, gravest first. */
  warnings: Reason[]
  /** What speaks against the person going out then. */
  limits: Reason[]
}

/**
 * Judges passes against one another and against the night, with the model that judged the night.
 *
 * @param night From `unpackNight`.
 * @param wanted Passes; each must start in a known hour of the night. Snow is taken as cleared before each.
 * @returns One judgement per pass, in the order given; null where the hour is unknown or outside the forecast.
 *
 * Source: judgeFloodStart on the sheet that the passes before leave.
 */
export function judgePasses(night: NightRun, wanted: readonly WantedPass[]): (JudgedPass | null)[] {
  const judged = new Map<WantedPass, JudgedPass | null>()
  const inOrder = [...wanted].sort((a, b) => Date.parse(a.startsAt) - Date.parse(b.startsAt))
  let before: Poured | null = null
  let hose: HoseOut | null = null
  for (const [place, pass] of inOrder.entries()) {
    const at = placeOf(night, pass)
    const waitsFor: HoseOut | null = hose
    hose = laterOf(hose, pass)
    if (!at) {
      judged.set(pass, null)
      continue
    }
    const under: SheetState = before ? sheetAfter(night, at, before) : sheetAt(night, at)
    // The first of the night meets the sheet of the full hour, as every scored hour does.
    const met = before ? under : (night.run.sheets[at.index] as SheetState)
    const start = judgeFloodStart(withLayer(night, pass), night.run, at.index, at.fraction, met)
    judged.set(pass, judgedPass(night, pass, start, at.index, { waitsFor, next: inOrder[place + 1] }))
    before = { ...at, sheet: pourLayer(clearSnow(under), pass) }
  }
  return wanted.map((pass) => judged.get(pass) ?? null)
}

/** The pass for which the hose is out longest. */
interface HoseOut {
  startsAt: string
  untilMillis: number
}

function laterOf(hose: HoseOut | null, { startsAt, hoseMinutes = 0 }: WantedPass): HoseOut {
  const untilMillis = Date.parse(startsAt) + hoseMinutes * MINUTE_MILLIS
  return hose && hose.untilMillis >= untilMillis ? hose : { startsAt, untilMillis }
}

interface Place {
  index: number
  /** Share of that hour gone by. [0-1) */
  fraction: number
}

/** The sheet with passes on it, at the moment the last of them was poured. */
interface Poured extends Place {
  sheet: SheetState
}

function placeOf({ run }: NightRun, { startsAt }: WantedPass): Place | null {
  const hours = (Date.parse(startsAt) - (run.hours[0] as PreparedHour).startsAtMillis) / HOUR_MILLIS
  const index = Math.floor(hours)
  return run.hours[index]?.isKnown ? { index, fraction: hours - index } : null
}

function withLayer({ setting }: NightRun, { layerMm, temperatureC }: WantedPass) {
  return { ...setting, layer: { layerMm, temperatureC } }
}

/** The run's own sheet at a minute. */
function sheetAt({ run }: NightRun, { index, fraction }: Place): SheetState {
  return advanceSheetPart(run.sheets[index] as SheetState, run.hours[index] as PreparedHour, fraction)
}

/** What the passes before have made of the sheet by a minute. */
function sheetAfter({ run }: NightRun, at: Place, before: Poured): SheetState {
  const hourOf = (index: number) => run.hours[index] as PreparedHour
  if (at.index === before.index) return advanceSheetPart(before.sheet, hourOf(at.index), at.fraction - before.fraction)
  let sheet = advanceSheetPart(before.sheet, hourOf(before.index), 1 - before.fraction)
  for (let index = before.index + 1; index < at.index; index += 1) sheet = advanceSheet(sheet, hourOf(index))
  return advanceSheetPart(sheet, hourOf(at.index), at.fraction)
}

function judgedPass(
  { setting, run }: NightRun,
  pass: WantedPass,
  start: FloodStart,
  index: number,
  { waitsFor, next }: { waitsFor: HoseOut | null; next: WantedPass | undefined },
): JudgedPass {
  const setBy = setsAtOf(start)
  const reasons = floodReasons(start, wetSurfaceBalance(start.hour).parts, setting, run, index)
  const against = reasons.filter(({ factor }) => factor < WARN_BELOW)
  const own: Reason[] = []
  if (waitsFor && waitsFor.untilMillis > start.startMillis) {
    const values = { startsAt: waitsFor.startsAt, until: toIso(waitsFor.untilMillis) }
    own.push({ code: 'hose_still_out', factor: 0, values })
  }
  if (setBy !== null && next && Date.parse(setBy) > Date.parse(next.startsAt)) {
    own.push({ code: 'not_set_before_next', factor: 0, values: { setsAt: setBy, nextAt: next.startsAt } })
  }
  if (pass.layerMm >= TOO_THICK_MM) own.push({ code: 'layer_too_thick', factor: 0, values: { layerMm: pass.layerMm } })
  return {
    startsAt: pass.startsAt,
    layerMm: pass.layerMm,
    temperatureC: pass.temperatureC,
    setBy,
    isAdvisable: isGood(start) && setBy !== null,
    windChillC: start.windChillC,
    warnings: [...own, ...against.filter(({ code }) => !isPersonal(code))],
    limits: [
      ...(isAvailableAt(setting, start.startMillis)
        ? []
        : [{ code: 'outside_hours_you_set', factor: 0, values: { startsAt: pass.startsAt } }]),
      ...frostbiteReason(start, pass),
      ...against.filter(({ code }) => code === 'hose_freezes'),
    ],
  }
}

function frostbiteReason({ windChillC }: FloodStart, { startsAt }: WantedPass): Reason[] {
  const band = frostbiteBand(windChillC)
  if (!band) return []
  return [{ code: 'frostbite', factor: 0, values: { at: startsAt, windChillC, minutes: band.toMinutes } }]
}
