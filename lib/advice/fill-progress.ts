// A fill while it runs: water so far, how it stands on the floor, when it is done, when to look next, and what to fear.
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { cornerDepthsM, floorOf, type FloorGrid, type FloorShape } from '@/lib/physics/floor'
import { hoseHours, levelOf, stageAt } from '@/lib/physics/stage'
import { hoseWarning, type HoseHour } from './hose-warning'
import { leakWarning, levelOfReading, type LevelReading } from './leak-warning'
import { FILLING } from './thresholds'
import { toIso } from './zoned-time'
import type { Caution } from './types'

/** One time of running hose, as logged. */
export interface HoseSession {
  startedAt: string
  /** Null while it runs. */
  stoppedAt: string | null
  flowLPerMin: number
}

export interface FillProgressInput {
  now: string
  lengthM: number
  widthM: number
  /** Below any level line; level ground when absent. */
  floor?: FloorShape | null
  /** Water wanted in all. [L] */
  targetL: number
  /** In any order; they may not overlap. */
  sessions: readonly HoseSession[]
  /** Levels read, in any order. Each counts as a look at the hose too. */
  readings?: readonly LevelReading[]
  /** Looks at hose and liner without a reading. */
  checkedAt?: readonly string[]
  /** The forecast at the rink, for the warning about the hose. */
  hours?: readonly HoseHour[]
  /** Of the water in the hose. [°C] Default 6. */
  waterTemperatureC?: number
  /** Allowed for in the level. [mm/day] Default 2. */
  evaporationMmPerDay?: number
}

export interface FillProgress {
  isRunning: boolean
  litres: number
  /** Of the water wanted. 0-1 */
  doneShare: number
  /** Water surface below the line, by the hose. [m] */
  levelM: number
  /** The same as last read; null without a reading. [m] */
  readLevelM: number | null
  cornerDepthsM: [number, number, number, number]
  deepestM: number
  wettedShare: number
  litresLeft: number
  hoursLeft: number
  /** When the water is in if the hose goes on running; null while it is off, or once it is in. */
  doneAt: string | null
  /** When somebody should look at hose and liner; null while it is off. */
  nextCheckAt: string | null
  isCheckDue: boolean
  /** Codes and numbers; words in lib/words/filling.ts. */
  leak: Caution | null
  hose: Caution | null
}

/**
 * How a fill stands now.
 *
 * @param input See the fields.
 * @returns Everything the Filling page shows; units in its names.
 * @throws RangeError for a floor or a flow out of range, an unreadable instant, or sessions that end before they
 *   start.
 *
 * Source: balance of volume; limits in FILLING.
 */
export function fillProgress(input: FillProgressInput): FillProgress {
  const nowMillis = instantOf(input.now)
  const floor = floorOf(input.lengthM, input.widthM, input.floor)
  const running = input.sessions.find(({ stoppedAt }) => stoppedAt === null)
  const litres = litresPouredBy(input.sessions, nowMillis)
  const litresLeft = Math.max(0, input.targetL - litres)
  const flowLPerMin = running?.flowLPerMin ?? latestFlow(input.sessions)
  const hoursLeft = flowLPerMin === null ? 0 : hoseHours(litresLeft, flowLPerMin)
  const nextCheckMillis = running ? lastLook(input, running, nowMillis) + FILLING.checkEveryHours * HOUR_MILLIS : null
  return {
    isRunning: running !== undefined,
    litres,
    doneShare: input.targetL > 0 ? Math.min(1, litres / input.targetL) : 1,
    ...waterOn(floor, litres),
    readLevelM: lastReadLevelM(floor, input.readings ?? [], nowMillis),
    litresLeft,
    hoursLeft,
    doneAt: running && litresLeft > 0 ? toIso(upToMinute(nowMillis + hoursLeft * HOUR_MILLIS)) : null,
    nextCheckAt: nextCheckMillis === null ? null : toIso(nextCheckMillis),
    isCheckDue: nextCheckMillis !== null && nextCheckMillis <= nowMillis,
    leak: leakWarning({
      floor,
      readings: (input.readings ?? []).filter(({ at }) => instantOf(at) <= nowMillis),
      pouredLBy: (millis) => litresPouredBy(input.sessions, millis),
      evaporationMmPerDay: input.evaporationMmPerDay ?? FILLING.evaporationMmPerDay,
    }),
    hose: hoseWarning({
      hours: input.hours ?? [],
      nowMillis,
      isRunning: running !== undefined,
      waterTemperatureC: input.waterTemperatureC ?? 6,
    }),
  }
}

/**
 * Water that all sessions have brought by an instant. A session that has not stopped runs on.
 *
 * @param sessions Hose sessions with their flow. [L/min]
 * @param atMillis Instant. [ms since the epoch]
 * @returns Water. [L]
 * @throws RangeError for a session that ends before it starts.
 *
 * Source: flow times time.
 */
export function litresPouredBy(sessions: readonly HoseSession[], atMillis: number): number {
  return sessions.reduce((sum, { startedAt, stoppedAt, flowLPerMin }) => {
    const from = instantOf(startedAt)
    const to = stoppedAt === null ? Number.POSITIVE_INFINITY : instantOf(stoppedAt)
    if (to < from) throw new RangeError(`a session cannot stop (${stoppedAt}) before it starts (${startedAt})`)
    return sum + (Math.max(0, Math.min(to, atMillis) - from) / MINUTE_MILLIS) * flowLPerMin
  }, 0)
}

function waterOn(floor: FloorGrid, litres: number) {
  const levelM = levelOf(floor, litres / 1000)
  const { deepestM, wetShare } = stageAt(floor, levelM)
  const depths = cornerDepthsM(floor).map((corner) => Math.max(0, corner - levelM))
  return { levelM, deepestM, wettedShare: wetShare, cornerDepthsM: depths as FillProgress['cornerDepthsM'] }
}

function latestFlow(sessions: readonly HoseSession[]): number | null {
  const latest = [...sessions].sort((a, b) => instantOf(b.startedAt) - instantOf(a.startedAt))[0]
  return latest?.flowLPerMin ?? null
}

function lastReadLevelM(floor: FloorGrid, readings: readonly LevelReading[], nowMillis: number): number | null {
  const past = readings.filter(({ at }) => instantOf(at) <= nowMillis)
  const latest = past.sort((a, b) => instantOf(b.at) - instantOf(a.at))[0]
  return latest ? levelOfReading(floor, latest) : null
}

/** Somebody was there when the hose was turned on, at each look and at each reading since. */
function lastLook(input: FillProgressInput, running: HoseSession, nowMillis: number): number {
  const looks = [running.startedAt, ...(input.checkedAt ?? []), ...(input.readings ?? []).map(({ at }) => at)]
  return Math.max(...looks.map(instantOf).filter((at) => at <= nowMillis), instantOf(running.startedAt))
}

function upToMinute(millis: number): number {
  return Math.ceil(millis / MINUTE_MILLIS) * MINUTE_MILLIS
}

function instantOf(at: string): number {
  const millis = Date.parse(at)
  if (Number.isNaN(millis)) throw new RangeError(`expected an instant in ISO 8601, got ${at}`)
  return millis
}
