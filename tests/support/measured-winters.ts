// Measured winters from the shared data folder beside the project, as hourly records; absent on most machines.
import { existsSync, readFileSync } from 'node:fs'
import { dewPointC, saturationOverWaterHpa } from '@/lib/physics/humidity'
import type { HourlyRecord } from '@/lib/physics/types'

/** Finnish Meteorological Institute open data, CC BY 4.0: Jokioinen, October to April of 2013-16, radiation measured. */
const JOKIOINEN = '../shared/data/pyhajarvi_hourly/jokioinen_hourly_oct_apr_2013_2016.csv'

export const hasMeasuredWinters = existsSync(JOKIOINEN)

export const JOKIOINEN_SITE = { latitude: 60.81, longitude: 23.5, timeZone: 'Europe/Helsinki' }

/** All hours in order; winters are parted by gaps. */
export function readJokioinen(): HourlyRecord[] {
  const [header = '', ...lines] = readFileSync(JOKIOINEN, 'utf8').trim().split('\n')
  const names = header.split(',')
  return lines.map((line) => {
    const cells = line.split(',')
    const value = (name: string) => Number(cells[names.indexOf(name)])
    const air = value('air_c')
    return {
      time: new Date(cells[0] ?? '').toISOString().replace('.000Z', 'Z'),
      airTemperatureC: air,
      // Relative humidity is over water (the data's own note).
      dewPointC: Math.min(air, dewPointC((saturationOverWaterHpa(air) * value('rh_pct')) / 100)),
      windSpeedMps: value('wind_ms'),
      windGustMps: null,
      cloudCover: null,
      shortwaveWm2: Math.max(0, value('shortwave_in_wm2')),
      precipitationMm: Math.max(0, value('precip_mm')),
      rainMm: null,
      snowfallCm: null,
      pressureHpa: value('pressure_msl_hpa'),
      longwaveDownWm2: value('longwave_in_wm2'),
    }
  })
}
