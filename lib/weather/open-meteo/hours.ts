// Turns the columns of a forecast into hourly records.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { HourlyRecord } from '@/lib/physics/types'
import { malformed, type HourlyBody } from './body'
import type { ForecastVariable } from './request'

const SAME_HOUR = 0
/** Open-Meteo labels sums, means and maxima by the END of their hour: those of hour t stand under the next label. */
const NEXT_LABEL = 1

/** One record for every label but the last, which has no amounts yet. */
export function toHours(body: HourlyBody): HourlyRecord[] {
  return body.times.slice(0, -1).map((time, index) => {
    const read = (name: ForecastVariable, shift: number) => clean(body.columns[name]?.[index + shift])
    const airTemperatureC = read('temperature_2m', SAME_HOUR)
    return {
      time: new Date(time * 1000).toISOString().replace('.000Z', 'Z'),
      airTemperatureC,
      dewPointC: dewPoint(airTemperatureC, read('dew_point_2m', SAME_HOUR), read('relative_humidity_2m', SAME_HOUR)),
      windSpeedMps: notNegative(read('wind_speed_10m', SAME_HOUR)),
      windGustMps: notNegative(read('wind_gusts_10m', NEXT_LABEL)),
      cloudCover: share(read('cloud_cover', SAME_HOUR)),
      shortwaveWm2: notNegative(read('shortwave_radiation', NEXT_LABEL)),
      precipitationMm: notNegative(read('precipitation', NEXT_LABEL)),
      rainMm: liquid(notNegative(read('rain', NEXT_LABEL)), notNegative(read('showers', NEXT_LABEL))),
      snowfallCm: notNegative(read('snowfall', NEXT_LABEL)),
      pressureHpa: read('surface_pressure', SAME_HOUR),
    }
  })
}

/**
 * Refuses a series from which nobody could judge tonight.
 * @throws WeatherError malformed
 */
export function checkHours(hours: HourlyRecord[], now: Date): void {
  const outlier = hours.find(({ airTemperatureC: t }) => t !== null && (t < -70 || t > 60))
  if (outlier) throw malformed(`${outlier.airTemperatureC} °C at ${outlier.time}`)
  const ahead = hours.filter((hour) => Date.parse(hour.time) > now.getTime() - HOUR_MILLIS)
  const first = ahead[0]
  if (!first || Date.parse(first.time) > now.getTime() + 2 * HOUR_MILLIS) {
    throw malformed(`first hour ahead is ${first?.time ?? 'missing'} at ${now.toISOString()}`)
  }
  const usable = ahead.filter((hour) => hour.airTemperatureC !== null && hour.windSpeedMps !== null).length
  if (usable < 24) throw malformed(`only ${usable} hours ahead have temperature and wind`)
}

/** The wire has "-0.0"; adding zero makes it plain. */
function clean(value: number | null | undefined): number | null {
  return value === null || value === undefined ? null : value + 0
}

function notNegative(value: number | null): number | null {
  return value === null ? null : Math.max(0, value)
}

function share(percent: number | null): number | null {
  return percent === null ? null : Math.min(1, Math.max(0, percent / 100))
}

/** Models without a scheme for showers leave that column empty; their rain is then all of it. */
function liquid(rainMm: number | null, showersMm: number | null): number | null {
  return rainMm === null ? null : Math.round((rainMm + (showersMm ?? 0)) * 100) / 100
}

/** From humidity where the column is empty, by the Magnus form the service itself uses (Alduchov & Eskridge 1996). */
function dewPoint(airTemperatureC: number | null, dewPointC: number | null, humidityPercent: number | null) {
  if (airTemperatureC === null) return dewPointC
  if (dewPointC !== null) return Math.min(dewPointC, airTemperatureC)
  if (humidityPercent === null || humidityPercent <= 0) return null
  const gamma = Math.log(Math.min(humidityPercent, 100) / 100) + (17.625 * airTemperatureC) / (243.04 + airTemperatureC)
  return Math.round(((243.04 * gamma) / (17.625 - gamma)) * 10) / 10
}
