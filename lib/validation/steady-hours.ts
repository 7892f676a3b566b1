// Weather that stands still, for what compares the model with a table or a closed form.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { dewPointFromHumidityC } from '@/lib/physics/humidity'
import { prepareHours } from '@/lib/physics/prepare'
import type { HourlyRecord, PreparedHour, Site } from '@/lib/physics/types'

export interface SteadyWeather extends Partial<Omit<HourlyRecord, 'time' | 'airTemperatureC'>> {
  airTemperatureC: number
  /** Over water. [0-1] */
  relativeHumidity?: number
  site?: Partial<Site>
}

const FIRST_HOUR_MILLIS = Date.UTC(2027, 0, 12, 22)

/** As many equal night hours as asked for, at an open site under an open sky unless told otherwise. */
export function steadyHours(count: number, weather: SteadyWeather): PreparedHour[] {
  const { relativeHumidity = 0.8, site, ...rest } = weather
  const records = Array.from({ length: count }, (_, index): HourlyRecord => ({
    time: new Date(FIRST_HOUR_MILLIS + index * HOUR_MILLIS).toISOString(),
    dewPointC: dewPointFromHumidityC(weather.airTemperatureC, relativeHumidity),
    windSpeedMps: 2,
    windGustMps: null,
    cloudCover: 0,
    shortwaveWm2: 0,
    precipitationMm: 0,
    rainMm: 0,
    snowfallCm: 0,
    pressureHpa: 1013.25,
    ...rest,
  }))
  return prepareHours(records, { latitudeDeg: 60, longitudeDeg: 25, shelter: 1, skyView: 1, ...site })
}

export function steadyHour(weather: SteadyWeather): PreparedHour {
  return steadyHours(1, weather)[0]!
}
