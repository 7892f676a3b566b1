// Other runs of the same forecast: the provider's members when there are any, else runs perturbed by the error model.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'
import { ERROR_MEMORY_HOURS, errorAt, FORECAST_ERROR } from './error-model'
import { normalFrom, seededUniform } from './random'
import { randomStart, type RunStart } from './run-starts'

/** Longwave from the sky rises with the air and with cloud: 4 ε σ T³ near 0 °C, and what full cloud adds. [W/m² per K, W/m²] Ours. */
const LONGWAVE_PER_K = 3.8
const LONGWAVE_PER_CLOUD = 70
/** Light precipitation that was not forecast. [mm/h] Ours. */
const UNFORESEEN_MM = 0.3
const BLOCK_HOURS = 12

/**
 * One perturbed run. Hours that began before `nowMillis` stay as they are: they are known.
 *
 * @param hours The forecast.
 * @param nowMillis Lead times count from here. [ms]
 * @param seed Same seed, same run.
 * @param given Where the run begins; drawn from the seed when absent.
 * @returns As many hours, in the units of the forecast.
 *
 * Source: growth of errors in error-model.ts.
 */
export function perturbRun(
  hours: readonly HourlyRecord[],
  nowMillis: number,
  seed: number,
  given?: RunStart,
): HourlyRecord[] {
  const first = hours[0]
  if (!first) return []
  const firstLead = (Date.parse(first.time) - nowMillis) / HOUR_MILLIS
  const uniform = seededUniform(seed)
  const normal = normalFrom(uniform)
  const start = given ?? randomStart(uniform, normal)
  const drift = { air: start.air, dew: start.dew, wind: start.wind, cloud: start.cloud }
  const keep = Math.exp(-1 / ERROR_MEMORY_HOURS)
  const fresh = Math.sqrt(1 - keep * keep)
  const wet = perturbPrecipitation(hours, firstLead, start, uniform)
  return hours.map((hour, index) => {
    const lead = firstLead + index
    if (lead < 0) return hour
    drift.air = keep * drift.air + fresh * normal()
    drift.dew = keep * drift.dew + fresh * normal()
    drift.wind = keep * drift.wind + fresh * normal()
    drift.cloud = keep * drift.cloud + fresh * normal()
    return perturbHour(hour, wet[index] as Wet, {
      airC: drift.air * errorAt(FORECAST_ERROR.airTemperatureC, lead),
      spreadC: drift.dew * errorAt(FORECAST_ERROR.dewPointSpreadC, lead),
      windFactor: Math.exp(drift.wind * errorAt(FORECAST_ERROR.windLog, lead)),
      cloud: drift.cloud * errorAt(FORECAST_ERROR.cloudCover, lead),
    })
  })
}

/**
 * Index of the first hour that perturbation touches; the number of hours when it touches none.
 *
 * @param hours The forecast.
 * @param nowMillis Lead times count from here. [ms since the epoch]
 * @returns Index, from 0.
 *
 * Source: ours: known hours are not perturbed.
 */
export function firstPerturbed(hours: readonly HourlyRecord[], nowMillis: number): number {
  const first = hours[0]
  if (!first) return 0
  return Math.min(hours.length, Math.max(0, Math.ceil((nowMillis - Date.parse(first.time)) / HOUR_MILLIS)))
}

type Wet = Pick<HourlyRecord, 'precipitationMm' | 'rainMm' | 'snowfallCm'>

interface HourError {
  airC: number
  spreadC: number
  windFactor: number
  cloud: number
}

const limit = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value))

function perturbHour(hour: HourlyRecord, wet: Wet, error: HourError): HourlyRecord {
  const { airTemperatureC: air, dewPointC: dew, cloudCover, shortwaveWm2, longwaveDownWm2 } = hour
  const newAir = air === null ? null : limit(air + error.airC, -60, 50)
  const spread = air === null || dew === null ? null : Math.max(0, air - dew + error.spreadC)
  const newCloud = cloudCover === null ? null : limit(cloudCover + error.cloud, 0, 1)
  const cloudChange = newCloud === null || cloudCover === null ? error.cloud : newCloud - cloudCover
  // Written out: copying the record by spreading it costs more than all the rest.
  return {
    time: hour.time,
    airTemperatureC: newAir,
    dewPointC: newAir === null || spread === null ? null : limit(newAir - spread, -80, 50),
    windSpeedMps: scaled(hour.windSpeedMps, error.windFactor, 75),
    windGustMps: scaled(hour.windGustMps, error.windFactor, 120),
    cloudCover: newCloud,
    shortwaveWm2: scaled(shortwaveWm2, Math.max(0.2, 1 - 0.75 * cloudChange), 1500),
    precipitationMm: wet.precipitationMm,
    rainMm: wet.rainMm,
    snowfallCm: wet.snowfallCm,
    pressureHpa: hour.pressureHpa,
    longwaveDownWm2:
      longwaveDownWm2 == null
        ? longwaveDownWm2
        : limit(longwaveDownWm2 + LONGWAVE_PER_K * error.airC + LONGWAVE_PER_CLOUD * cloudChange, 50, 600),
    snowOnIceCm: hour.snowOnIceCm,
  }
}

function scaled(value: number | null, factor: number, most: number): number | null {
  return value === null ? null : limit(value * factor, 0, most)
}

const isDry = (wet: Wet) => (wet.precipitationMm ?? 0) <= 0 && (wet.snowfallCm ?? 0) <= 0

/** Precipitation comes earlier or later, heavier or lighter, not at all, or where none was forecast. */
function perturbPrecipitation(
  hours: readonly HourlyRecord[],
  firstLead: number,
  start: RunStart,
  uniform: () => number,
): Wet[] {
  const { timing, amount } = start
  let miss = start.miss
  let isInSpell = false
  // Twelve hours that have begun dry are left dry: what is under way is known far better than what is to come.
  let unforeseenChance = 1
  let nextChance = start.unforeseen
  return hours.map((hour, index) => {
    const lead = firstLead + index
    if (lead < 0) return hour
    const shift = Math.round(timing * errorAt(FORECAST_ERROR.timingHours, lead))
    const source = hours[limit(index - shift, 0, hours.length - 1)] as HourlyRecord
    if (index % BLOCK_HOURS === 0) {
      unforeseenChance = nextChance
      nextChance = uniform()
    }
    if (hour.precipitationMm === null || source.precipitationMm === null) return hour
    if (isDry(source)) {
      if (isInSpell) miss = uniform()
      isInSpell = false
      const isFalse = unforeseenChance < errorAt(FORECAST_ERROR.falseChance, lead)
      const isCloudy = (hour.cloudCover ?? 1) > 0.7
      return isFalse && isCloudy ? unforeseen() : source
    }
    isInSpell = true
    const factor =
      miss < errorAt(FORECAST_ERROR.missChance, lead) ? 0 : Math.exp(amount * errorAt(FORECAST_ERROR.amountLog, lead))
    return {
      precipitationMm: scaled(source.precipitationMm, factor, 200),
      rainMm: scaled(source.rainMm, factor, 200),
      snowfallCm: scaled(source.snowfallCm, factor, 100),
    }
  })
}

/** Whether it falls as rain or snow follows from the air. */
function unforeseen(): Wet {
  return { precipitationMm: UNFORESEEN_MM, rainMm: null, snowfallCm: null }
}
