// How many forecast runs find a good hour in each night ahead, also in those for which the forecast itself says hold off.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { prepareHours } from '@/lib/physics/prepare'
import { addToTally, otherRuns, startTally } from './agreement'
import { carrySheet } from './forecast-run'
import { nightDateOf } from './night'
import { isHourAvailable } from './score-hours'
import { makeSetting, type Setting } from './setting'
import type { AdviceWindow, JudgeInput, JudgeOptions, Phase } from './types'
import type { HourRange } from './windows'

export interface NightRuns {
  nightDate: string
  /** Runs in which the night's best hour is good. */
  agreeing: number
  runs: number
}

const ASKED_ABOUT: Partial<Record<Phase, HourRange['kind']>> = {
  waiting: 'fill',
  filling: 'fill',
  skating: 'flood',
  thaw: 'flood',
}

/**
 * Asks the other runs about the hours ahead in which the keeper can go out, in nights of which the judgement has not asked
 * them: those without a window.
 *
 * @param input As for `judge`.
 * @param windows The judgement's.
 * @param options Other runs and their seed, as for `judge`.
 * @returns One for each night with such an hour, in order; none in phases in which nothing is poured, or without runs.
 * @throws RangeError as `judge` does.
 *
 * Source: ours; runs as in agreement.ts.
 */
export function askOtherNights(
  input: JudgeInput,
  windows: readonly AdviceWindow[],
  options: JudgeOptions = {},
): NightRuns[] {
  const kind = ASKED_ABOUT[input.rink.phase]
  if (!kind) return []
  const setting = makeSetting(input)
  const main = carrySheet(setting, prepareHours(input.hours, setting.site))
  const asked = nightsOf(windows, input.rink.timeZone)
  const tallies = openRanges(setting, kind)
    .filter(({ from }) => !asked.has(nightOf(setting, from)))
    .map(startTally)
  if (tallies.length === 0) return []
  let runs = 0
  for (const run of otherRuns(setting, options, main, main.hours.length)) {
    runs += 1
    for (const tally of tallies) addToTally(tally, setting, run)
  }
  if (runs === 0) return []
  const nights = new Map<string, number>()
  for (const { range, shares } of tallies) {
    const nightDate = nightOf(setting, range.from)
    nights.set(nightDate, Math.max(...shares, nights.get(nightDate) ?? 0))
  }
  return Array.from(nights, ([nightDate, agreeing]) => ({ nightDate, agreeing, runs }))
}

const nightOf = ({ firstMillis, input }: Setting, index: number) =>
  nightDateOf(new Date(firstMillis + index * HOUR_MILLIS), input.rink.timeZone)

function nightsOf(windows: readonly AdviceWindow[], timeZone: string): Set<string> {
  return new Set(
    windows.flatMap(({ startsAt, endsAt }) => [
      nightDateOf(new Date(startsAt), timeZone),
      nightDateOf(new Date(Date.parse(endsAt) - 1), timeZone),
    ]),
  )
}

/** The hours to come in which the keeper can go out, night by night. */
function openRanges(setting: Setting, kind: HourRange['kind']): HourRange[] {
  const ranges: HourRange[] = []
  for (let index = 0; index < setting.input.hours.length; index += 1) {
    const startMillis = setting.firstMillis + index * HOUR_MILLIS
    if (startMillis + HOUR_MILLIS <= setting.nowMillis || !isHourAvailable(setting, startMillis)) continue
    const last = ranges.at(-1)
    if (last?.to === index && nightOf(setting, last.from) === nightOf(setting, index)) last.to = index + 1
    else ranges.push({ kind, from: index, to: index + 1 })
  }
  return ranges
}
