// One night packed small: what a browser needs to reckon passes with the same model that judged it.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { prepareHours } from '@/lib/physics/prepare'
import type { PreparedHour } from '@/lib/physics/types'
import { carrySheet, type ForecastRun } from './forecast-run'
import { nightBounds } from './night'
import { makeSetting, type Setting } from './setting'
import type { JudgeInput } from './types'

/** A layer poured at the end of the night has this long to set. [h] */
const HOURS_TO_SET = 24

/** Plain JSON. */
export interface NightModel {
  nightDate: string
  setting: Setting
  hours: PreparedHour[]
}

/** A night unpacked: its hours with the sheet carried through them. */
export interface NightRun {
  setting: Setting
  run: ForecastRun
}

/**
 * Packs the part of a judgement's input that one night's passes depend on.
 *
 * @param input What the night was judged from.
 * @param nightDate 'yyyy-MM-dd', see night.ts.
 * @returns The night's hours and a day more, and the sheet at their start; null when the forecast has none of them.
 * @throws RangeError as `judge` does.
 *
 * Source: carrySheet.
 */
export function packNight(input: JudgeInput, nightDate: string): NightModel | null {
  const whole = makeSetting(input)
  const main = carrySheet(whole, prepareHours(input.hours, whole.site))
  const { startsAt, endsAt } = nightBounds(nightDate, input.rink.timeZone)
  const from = Math.max(0, Math.floor((startsAt.getTime() - whole.firstMillis) / HOUR_MILLIS))
  const hoursToEnd = Math.ceil((endsAt.getTime() - whole.firstMillis) / HOUR_MILLIS)
  const to = Math.min(input.hours.length, hoursToEnd + HOURS_TO_SET)
  if (from >= Math.min(hoursToEnd, to)) return null
  const hours = main.hours.slice(from, to)
  const firstTime = (hours[0] as PreparedHour).time
  const asOf = input.sheet.asOf !== undefined && input.sheet.asOf > firstTime ? input.sheet.asOf : firstTime
  const { members: _members, ...rest } = input
  const setting = makeSetting({ ...rest, hours: input.hours.slice(from, to) })
  return {
    nightDate,
    setting: {
      ...setting,
      input: { ...rest, hours: [], sheet: { ...BARE, asOf, state: main.carried[from] } },
    },
    hours,
  }
}

/** The state says it all; these stand where the type wants numbers. */
const BARE = { thicknessMm: 0, temperatureC: 0, snowCoverCm: 0 }

/**
 * Unpacks a night: carries the sheet through its hours as the judgement did.
 *
 * @param model From packNight.
 * @returns Rink and run, as the judgement had them.
 *
 * Source: carrySheet.
 */
export function unpackNight({ setting, hours }: NightModel): NightRun {
  return { setting, run: carrySheet(setting, hours) }
}
