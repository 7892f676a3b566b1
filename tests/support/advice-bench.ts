// The worth of the advice on measured nights: what each strategy would have flooded, against what really happened.
import { judge } from '@/lib/advice/judge'
import { perturbRun } from '@/lib/advice/runs'
import { AGREEMENT, PERSON } from '@/lib/advice/thresholds'
import type { JudgeInput } from '@/lib/advice/types'
import { addDays, instantOfLocal } from '@/lib/advice/zoned-time'
import { DAY_MILLIS, HOUR_MILLIS } from '@/lib/physics/constants'
import { prepareHours } from '@/lib/physics/prepare'
import { shelterFactor } from '@/lib/physics/site'
import type { HourlyRecord, PreparedHour } from '@/lib/physics/types'
import { JOKIOINEN_SITE, readJokioinen } from './measured-winters'
import {
  carryPlainSheet,
  floodOnPlainSheet,
  meanTemperatureC,
  plainSheet,
  type PlainSheet,
  type TrueFlood,
} from './true-nights'

const SPIN_UP_HOURS = 72
const FIRST_HOUR = 17
const LAST_HOUR = 23
const READY_HOUR = 24 + 7
const LAYER = { layerMm: 3, temperatureC: 8 }
const THICKNESS_MM = 100
const SKY_VIEW = 0.85
/** The hours of a night, those most often good first. */
const LIKELY_FIRST = [20, 22, 18, 23, 21, 19, 17]
/** The keeper decides at 15:30. */
const DECIDES_AFTER_NOON_MILLIS = 3.5 * HOUR_MILLIS

export interface BenchNight {
  date: string
  noonMillis: number
  /** Measured, from noon to midnight of the next day. */
  hours: HourlyRecord[]
  sheetC: number
  /** What becomes of a flood at a full hour from 17 to 23; worked out when first asked, because it is slow. */
  floodAt: (clock: number) => TrueFlood
  airAt20C: number
  /** Whether some hour's flood is good. */
  isGood: () => boolean
}

/** Nights from one date to another, each with what became of a flood at every full hour. */
export function trueNights(fromDate: string, toDate: string): BenchNight[] {
  const records = readJokioinen()
  const indexAt = new Map(records.map((record, index) => [Date.parse(record.time), index]))
  const nights: BenchNight[] = []
  for (let date = fromDate; date <= toDate; date = addDays(date, 1)) {
    const noonMillis = instantOfLocal(date, 12 * 60, JOKIOINEN_SITE.timeZone)
    const noon = indexAt.get(noonMillis)
    const first = indexAt.get(noonMillis - SPIN_UP_HOURS * HOUR_MILLIS)
    if (noon === undefined || first === undefined || noon + 36 > records.length) continue
    nights.push(trueNight(date, noonMillis, records.slice(first, noon + 36)))
  }
  return nights
}

/** The sheet at noon has the temperature that three days of bare ice give; any melt water counts as frozen. */
function trueNight(date: string, noonMillis: number, records: HourlyRecord[]): BenchNight {
  const { latitude, longitude } = JOKIOINEN_SITE
  const site = { latitudeDeg: latitude, longitudeDeg: longitude, shelter: shelterFactor('suburban'), skyView: SKY_VIEW }
  const hours = prepareHours(records, site)
  const before = plainSheet(THICKNESS_MM, -1)
  for (let index = 0; index < SPIN_UP_HOURS; index += 1) carryPlainSheet(before, hours[index]!)
  const sheetC = meanTemperatureC(before)
  const floodAt = laterAsked(plainSheet(THICKNESS_MM, sheetC), hours)
  return {
    date,
    noonMillis,
    hours: records.slice(SPIN_UP_HOURS),
    sheetC,
    floodAt,
    airAt20C: hours[SPIN_UP_HOURS + 8]!.airTemperatureC,
    isGood: () => LIKELY_FIRST.some((clock) => floodAt(clock).isGood),
  }
}

/** Floods at each hour on the sheet as it then is, each worked out once and only when asked. */
function laterAsked(sheet: PlainSheet, hours: PreparedHour[]): (clock: number) => TrueFlood {
  const sheets = new Map<number, PlainSheet>()
  for (let clock = 12; clock <= LAST_HOUR; clock += 1) {
    if (clock >= FIRST_HOUR) sheets.set(clock, sheet.slice())
    carryPlainSheet(sheet, hours[SPIN_UP_HOURS + clock - 12]!)
  }
  const known = new Map<number, TrueFlood>()
  return (clock) => {
    const flood =
      known.get(clock) ??
      floodOnPlainSheet(sheets.get(clock)!, LAYER, hours.slice(SPIN_UP_HOURS + clock - 12), (READY_HOUR - clock) * 60)
    known.set(clock, flood)
    return flood
  }
}

export interface BenchChoice {
  night: BenchNight
  /** Clock hour of the flood, or null when the strategy holds off. */
  floodsAt: number | null
  /** Clock hour of the best start, advised or not; null when there is none. */
  bestAt?: number | null
  /** Share of runs that agreed with the night's best window; null for rules and for nights without one. */
  agreement: number | null
}

/** Flood at 20:00 when the air is at or below a limit. */
export function thermometerRule(nights: readonly BenchNight[], limitC: number): BenchChoice[] {
  return nights.map((night) => ({ night, floodsAt: night.airAt20C <= limitC ? 20 : null, agreement: null }))
}

/** Follow the advice given at 15:30, on the measured weather or on a forecast degraded by the error model. */
export function followAdvice(nights: readonly BenchNight[], degradedSeed: number | null): BenchChoice[] {
  return nights.map((night) => adviceAt(night, night.noonMillis + DECIDES_AFTER_NOON_MILLIS, degradedSeed))
}

/**
 * As above, then look again each hour as the forecast is read anew, and flood when the best hour is the next one. The
 * forecast's errors come from the same draw and shrink as the hour comes nearer.
 */
export function followHourly(nights: readonly BenchNight[], degradedSeed: number): BenchChoice[] {
  return nights.map((night) => {
    let choice = adviceAt(night, night.noonMillis + DECIDES_AFTER_NOON_MILLIS, degradedSeed)
    for (let clock = FIRST_HOUR - 1; clock < LAST_HOUR; clock += 1) {
      choice = adviceAt(night, night.noonMillis + (clock - 12 + 0.5) * HOUR_MILLIS, degradedSeed)
      if (choice.floodsAt !== null && choice.floodsAt <= clock + 1) return choice
    }
    return choice
  })
}

function adviceAt(night: BenchNight, nowMillis: number, degradedSeed: number | null): BenchChoice {
  const seed = (degradedSeed ?? 0) * 7919 + Math.floor(night.noonMillis / DAY_MILLIS)
  const hours = degradedSeed === null ? night.hours : perturbRun(night.hours, nowMillis, seed)
  const { windows } = judge(inputOf(night, hours, nowMillis), {
    runs: degradedSeed === null ? 0 : AGREEMENT.defaultRuns,
  })
  const tonight = windows.filter((one) => Date.parse(one.startsAt) < night.noonMillis + 12 * HOUR_MILLIS)
  const [best] = tonight.sort((a, b) => b.agreement - a.agreement || b.score - a.score)
  if (!best) return { night, floodsAt: null, agreement: null }
  const clock = 12 + Math.floor((Date.parse(best.bestStartAt ?? best.startsAt) - night.noonMillis) / HOUR_MILLIS)
  const floodsAt = best.agreement >= AGREEMENT.least ? clock : null
  return { night, floodsAt, bestAt: clock, agreement: best.agreement }
}

function inputOf(night: BenchNight, hours: HourlyRecord[], nowMillis: number): JudgeInput {
  return {
    now: new Date(nowMillis).toISOString(),
    rink: {
      ...JOKIOINEN_SITE,
      lengthM: 10,
      widthM: 10,
      shelter: 'suburban',
      skyView: SKY_VIEW,
      base: 'liner',
      phase: 'skating',
    },
    water: { ...LAYER, flowLPerMin: 25, fillDepthMm: 120 },
    sheet: { thicknessMm: THICKNESS_MM, temperatureC: night.sheetC, snowCoverCm: 0 },
    available: [{ from: '17:00', to: '00:00' }],
    maxPasses: 1,
    hours,
  }
}

export interface BenchScore {
  /** Share of the good nights on which the strategy floods and the flood sets in time, unspoiled. */
  used: number
  /** Share of its floods that do not. */
  spoiled: number
  floods: number
  /** Good nights on which it was too cold for the hose at every hour. */
  tooColdForHose: number
}

export function scoreChoices(choices: readonly BenchChoice[]): BenchScore {
  const good = choices.filter(({ night }) => night.isGood())
  const isSound = ({ night, floodsAt }: BenchChoice) => floodsAt !== null && night.floodAt(floodsAt).isGood
  const floods = choices.filter(({ floodsAt }) => floodsAt !== null)
  return {
    used: good.filter(isSound).length / Math.max(1, good.length),
    spoiled: floods.filter((choice) => !isSound(choice)).length / Math.max(1, floods.length),
    floods: floods.length,
    tooColdForHose: good.filter(({ night }) => isTooCold(night)).length,
  }
}

function isTooCold({ hours }: BenchNight): boolean {
  const evening = hours.slice(FIRST_HOUR - 12, LAST_HOUR - 11)
  return evening.every((hour) => (hour.airTemperatureC ?? 0) <= PERSON.floodHoseC.zero)
}

export interface CalibrationRow {
  from: number
  to: number
  nights: number
  good: number
}

/** Of the nights called with a share in each tenth, how many were good. */
export function calibration(choices: readonly BenchChoice[]): CalibrationRow[] {
  return [0, 0.5, 0.6, 0.7, 0.8, 0.9, 1].map((from, index, edges) => {
    const to = edges[index + 1] ?? 1.01
    const called = choices.filter(
      ({ agreement }) => agreement !== null && agreement >= from - 1e-9 && agreement < to - 1e-9,
    )
    return {
      from,
      to: Math.min(1, to),
      nights: called.length,
      good: called.filter(({ night }) => night.isGood()).length,
    }
  })
}

/** The same choices under another least share of runs. */
export function withLeastShare(choices: readonly BenchChoice[], least: number): BenchChoice[] {
  return choices.map((choice) => {
    const isAdvised = choice.agreement !== null && choice.agreement >= least - 1e-9
    return { ...choice, floodsAt: isAdvised ? (choice.bestAt ?? null) : null }
  })
}

const SHARES = [0.5, 0.55, 0.6, 0.65, 0.7, 0.75, 0.8, 0.85, 0.9]
const MOST_SPOILED = 0.05

/** The least share that uses most good nights while spoiling no more than one flood in twenty. */
export function chooseLeastShare(choices: readonly BenchChoice[]): number {
  const isSparing = (least: number) => scoreChoices(withLeastShare(choices, least)).spoiled <= MOST_SPOILED
  return SHARES.find(isSparing) ?? (SHARES.at(-1) as number)
}
