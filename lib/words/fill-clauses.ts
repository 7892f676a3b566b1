// What each reason of a fill says.
import { nightDateOf } from '@/lib/advice/night'
import { num, text, type ClauseWriter } from './clause'
import {
  durationText,
  iceText,
  signedTemperatureText,
  snowText,
  temperatureText,
  windChillText,
  windText,
} from './quantities'
import { dayPartText } from './times'

export const FILL_CLAUSES: Record<string, ClauseWriter> = {
  fill_hose_runs: (v, w) => `a running hose bears ${temperatureText(num(v, 'airTemperatureC'), w)}${dayText(v, w)}`,
  fill_hose_freezes: (v, w) =>
    `a running cold hose freezes at ${temperatureText(num(v, 'airTemperatureC'), w)}${dayText(v, w)}`,
  hands_bear: (v, w) => `it feels like ${windChillText(num(v, 'windChillC'), w)} at the coldest${dayText(v, w)}`,
  hands_freeze: (v, w) =>
    `it would feel like ${windChillText(num(v, 'windChillC'), w)} with wet hands for hours${dayText(v, w)}`,
  liner_calm: (v, w) => `gusts in your yard stay near ${windText(num(v, 'gustAtRinkMps'), w)}`,
  liner_blown: (v, w) =>
    `gusts of ${windText(num(v, 'gustAtRinkMps'), w)} in your yard would lift the liner${dayText(v, w)}`,
  cold_follows: (v, w) => `${iceText(num(v, 'iceAfterMm'), w)} of ice should grow in the ${daysText(v)} after it`,
  no_cold_after: (v, w) => `only ${iceText(num(v, 'iceAfterMm'), w)} of ice would grow in the ${daysText(v)} after it`,
  cold_after_unseen: () => 'the forecast does not reach far enough past the fill to see the cold',
  fill_past_forecast: (v) => `the forecast ends before ${durationText(num(v, 'hoseHours') * 60)} of hose are done`,
  no_snow_before_skin: () => 'no snow comes before a skin forms',
  snow_before_skin: (v, w) =>
    `${snowText(num(v, 'snowfallCm'), w)} of snow${dayText(v, w, 'from')} would sink into the water before a skin bears it`,
  fill_air_fine: (v, w) =>
    `the air stays below ${signedTemperatureText(Math.ceil(num(v, 'airTemperatureC') + 0.5), w)}`,
  fill_air_warm: (v, w) =>
    `at ${signedTemperatureText(num(v, 'airTemperatureC'), w)} the water only warms${dayText(v, w)}`,
}

function daysText(v: Parameters<ClauseWriter>[0]): string {
  const hours = Math.round(num(v, 'hours'))
  return hours >= 48 ? `${Math.round(hours / 24)} days` : `${hours} hours`
}

/** A reason does not know on which day it is read: it names weekdays, never "tomorrow". */
const NO_DAY = new Date(0)

/** " on Friday night" of a figure from a later night than that of the start, where a long fill runs on; else nothing. */
function dayText(v: Parameters<ClauseWriter>[0], w: Parameters<ClauseWriter>[1], preposition = 'on'): string {
  const [startsAt, at] = [text(v, 'startsAt'), text(v, 'at')]
  if (!startsAt || !at) return ''
  const isSameNight = nightDateOf(new Date(at), w.timeZone) === nightDateOf(new Date(startsAt), w.timeZone)
  return isSameNight ? '' : ` ${preposition} ${dayPartText(at, NO_DAY, w)}`
}
