// Säkylän Pyhäjärvi: the model driven by measured weather against drilled ice.
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { advanceSheet, createSheet, reportSheet } from '@/lib/physics/sheet'
import { ashtonThicknessM, stefanThicknessM } from '@/lib/physics/stefan'
import { dewPointFromHumidityC } from '@/lib/physics/humidity'
import { numberOrNull, readTable } from './measured'
import { prepareHours } from '@/lib/physics/prepare'
import { summarise, type ValidationLine } from './scores'
import type { HourlyRecord } from '@/lib/physics/types'

const SITE = { latitudeDeg: 61, longitudeDeg: 22.29, shelter: 1, skyView: 1 }
/** Mean depth of the lake. [mm] */
const DEPTH_MM = 5400
/** Station pressure lies about this much under that at sea level. [hPa] */
const STATION_DROP_HPA = 12

type SnowAt = (millis: number) => number

interface Weather {
  at(millis: number): Record<string, string> | undefined
}

function loadWeather(): Weather {
  const rows = readTable('pyhajarvi_hourly/jokioinen_hourly_oct_apr_2013_2016.csv')
  const byTime = new Map(rows.map((row) => [Date.parse(row.time_utc!), row]))
  return { at: (millis) => byTime.get(millis) }
}

function recordAt(weather: Weather, millis: number, snowCm: number): HourlyRecord {
  const row = weather.at(millis) ?? {}
  const airTemperatureC = numberOrNull(row.air_c)
  const humidity = numberOrNull(row.rh_pct)
  const pressure = numberOrNull(row.pressure_msl_hpa)
  return {
    time: new Date(millis).toISOString(),
    airTemperatureC,
    dewPointC: airTemperatureC === null || !humidity ? null : dewPointFromHumidityC(airTemperatureC, humidity / 100),
    windSpeedMps: numberOrNull(row.wind_ms),
    windGustMps: null,
    cloudCover: null,
    shortwaveWm2: Math.max(0, numberOrNull(row.shortwave_in_wm2) ?? 0),
    longwaveDownWm2: numberOrNull(row.longwave_in_wm2),
    precipitationMm: numberOrNull(row.precip_mm) ?? 0,
    rainMm: null,
    snowfallCm: null,
    pressureHpa: pressure === null ? null : pressure - STATION_DROP_HPA,
    snowOnIceCm: snowCm,
  }
}

/** Ice at the end of a stretch of measured weather. [m] */
function runModel(weather: Weather, startM: number, from: number, to: number, snowAt: SnowAt): number {
  const records: HourlyRecord[] = []
  for (let millis = from; millis < to; millis += HOUR_MILLIS) records.push(recordAt(weather, millis, snowAt(millis)))
  const start = createSheet({
    thicknessMm: startM * 1000,
    temperatureC: Math.min(0, (records[0]!.airTemperatureC ?? 0) / 2),
    snowCoverCm: snowAt(from),
    unfrozenBelowMm: DEPTH_MM,
    waterTemperatureC: 0.5,
    base: 'ground',
  })
  return reportSheet(prepareHours(records, SITE).reduce(advanceSheet, start)).thicknessMm / 1000
}

/** The thirteen intervals, those with little snow, and the season run of 2015. */
export function validatePyhajarvi(): ValidationLine[] {
  const weather = loadWeather()
  const cases = readTable('pyhajarvi_hourly/pyhajarvi_intervals.csv').map((row) => {
    const from = Date.parse(row.start_utc!)
    const to = Date.parse(row.end_utc!)
    const [snowFrom, snowTo] = [Number(row.snow_start_m) * 100, Number(row.snow_end_m) * 100]
    const snowAt: SnowAt = (millis) => snowFrom + ((snowTo - snowFrom) * (millis - from)) / (to - from)
    const end = Number(row.ice_end_m)
    const error = (metres: number) => (metres - end) * 100
    return {
      isBare: snowFrom <= 3 && snowTo <= 3,
      model: error(runModel(weather, Number(row.ice_start_m), from, to, snowAt)),
      stefan: error(Number(row.stefan_m)),
      ashton20: error(Number(row.ashton20_m)),
      flake: error(Number(row.flake_m)),
    }
  })
  const line = (set: string, some: typeof cases, bar: string, isMet: (bias: number, rmse: number) => boolean) => {
    const model = summarise(some.map((one) => one.model))
    return {
      set,
      unit: 'cm',
      model,
      others: {
        Stefan: summarise(some.map((one) => one.stefan)),
        'Ashton 20': summarise(some.map((one) => one.ashton20)),
        FLake: summarise(some.map((one) => one.flake)),
      },
      bar,
      isMet: isMet(model.bias, model.rmse),
    }
  }
  const bare = cases.filter((one) => one.isBare)
  return [
    line('Pyhäjärvi intervals', cases, 'bias ±1.2, RMSE 2.4', (bias, rmse) => Math.abs(bias) <= 1.2 && rmse <= 2.4),
    line('  of those snow ≤ 3 cm', bare, 'RMSE 2.6', (_bias, rmse) => rmse <= 2.6),
    seasonOf2015(weather),
  ]
}

function seasonOf2015(weather: Weather): ValidationLine {
  const drilled = readTable('pyhajarvi_hourly/pyhajarvi_ice_obs_2013_2016.csv')
    .filter((row) => row.date! >= '2015-01-10' && row.date! <= '2015-03-01')
    .map((row) => ({
      millis: Date.parse(`${row.date}T10:00Z`),
      iceM: Number(row.ice_total_m),
      snowCm: Number(row.snow_on_ice_m) * 100,
    }))
  const first = drilled[0]!
  const snowAt: SnowAt = (millis) => {
    const next = Math.max(
      1,
      drilled.findIndex((one) => one.millis >= millis),
    )
    const [a, b] = [drilled[next - 1]!, drilled[next]!]
    return a.snowCm + ((b.snowCm - a.snowCm) * (millis - a.millis)) / (b.millis - a.millis)
  }
  const later = drilled.slice(1)
  const model = summarise(
    later.map((one) => (runModel(weather, first.iceM, first.millis, one.millis, snowAt) - one.iceM) * 100),
  )
  const others = {
    Stefan: summarise(
      later.map((one) => (stefanThicknessM(first.iceM, frost(weather, first.millis, one.millis)) - one.iceM) * 100),
    ),
    'Ashton 20': summarise(
      later.map((one) => (ashtonThicknessM(first.iceM, frost(weather, first.millis, one.millis), 20) - one.iceM) * 100),
    ),
  }
  return { set: 'Pyhäjärvi season 2015', unit: 'cm', model, others, bar: 'RMSE 2.5', isMet: model.rmse <= 2.5 }
}

/** Degree-days below 0 °C. [°C d] */
function frost(weather: Weather, from: number, to: number): number {
  let sum = 0
  for (let millis = from; millis < to; millis += HOUR_MILLIS)
    sum += Math.max(0, -Number(weather.at(millis)?.air_c ?? 0)) / 24
  return sum
}
