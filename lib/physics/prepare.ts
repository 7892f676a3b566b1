// From provider-neutral records to hours without gaps, seen from one rink.
import { bridgeLoneGaps, hasNeeded } from './gaps'
import { inRange } from './check'
import { HOUR_MILLIS, STANDARD_PRESSURE_HPA } from './constants'
import { saturationOverWaterHpa } from './humidity'
import { windAtRinkMps } from './site'
import { blackBodyWm2, clearSkyEmissivity, cloudySkyEmissivity, longwaveOnRinkWm2 } from './sky'
import { precipitationPhase } from './snow'
import { sunshineOnRinkWm2 } from './horizon'
import { clearSkyShortwaveAtWm2, cloudShortwaveFactor } from './sun'
import type { HourlyRecord, PreparedHour, Site } from './types'

/** Gust over mean wind where no gust is reported. [-] Usual ratio over land, 1.4-1.6; from memory. */
const GUST_FACTOR = 1.5

/**
 * Prepares a run of hours for one rink: bridges lone gaps, marks longer ones unknown, derives what services leave out.
 *
 * @param records Consecutive hours, oldest first.
 * @param site Place, shelter [0-1] and open sky [0-1].
 * @returns As many hours as records, in the units of PreparedHour; `isKnown` is false where too much is missing.
 * @throws RangeError when hours are not consecutive, a value is out of its physical range or the site is off the
 *   globe.
 *
 * Source: the functions of this folder that it calls; what each hour needs is in gaps.ts.
 */
export function prepareHours(records: readonly HourlyRecord[], site: Site): PreparedHour[] {
  inRange('latitudeDeg [°]', site.latitudeDeg, -90, 90)
  inRange('longitudeDeg [°]', site.longitudeDeg, -180, 180)
  inRange('shelter [0-1]', site.shelter, 0, 1)
  inRange('skyView [0-1]', site.skyView, 0, 1)
  let expectedMillis: number | null = null
  return bridgeLoneGaps(records).map((record) => {
    const startsAtMillis = Date.parse(record.time)
    if (Number.isNaN(startsAtMillis)) throw new RangeError(`time must be an ISO 8601 instant, got ${record.time}`)
    if (expectedMillis !== null && startsAtMillis !== expectedMillis) {
      throw new RangeError(`hours must follow each other: ${record.time} does not follow the hour before it`)
    }
    expectedMillis = startsAtMillis + HOUR_MILLIS
    return preparedHour(record, startsAtMillis, site)
  })
}

/**
 * Prepares other runs of hours that have been prepared before: same times, same site, gaps already bridged.
 *
 * @param records Bridged hours of the other run.
 * @param before The hours as prepared for the first run; their times stand for these.
 * @param from First hour that differs; earlier ones are taken over.
 * @param site As for prepareHours.
 * @returns As many hours as records.
 * @throws RangeError for a value out of its physical range.
 *
 * Source: as prepareHours.
 */
export function prepareLike(
  records: readonly HourlyRecord[],
  before: readonly PreparedHour[],
  from: number,
  site: Site,
): PreparedHour[] {
  return records.map((record, index) => {
    const same = before[index]!
    return index < from ? same : preparedHour(record, same.startsAtMillis, site)
  })
}

function preparedHour(record: HourlyRecord, startsAtMillis: number, site: Site): PreparedHour {
  return hasNeeded(record) ? knownHour(record, startsAtMillis, site) : unknownHour(record, startsAtMillis)
}

function knownHour(record: HourlyRecord, startsAtMillis: number, site: Site): PreparedHour {
  const airTemperatureC = inRange('airTemperatureC [°C]', record.airTemperatureC!, -60, 50)
  const dewPoint = inRange('dewPointC [°C]', Math.min(record.dewPointC!, airTemperatureC), -80, 50)
  const vapourPressureHpa = saturationOverWaterHpa(dewPoint)
  const windSpeedMps = inRange('windSpeedMps [m/s]', record.windSpeedMps!, 0, 75)
  const precipitationMm = inRange('precipitationMm [mm]', record.precipitationMm!, 0, 200)
  const clearEmissivity = clearSkyEmissivity(airTemperatureC, vapourPressureHpa)
  const cloudCover = record.cloudCover ?? cloudFromLongwave(record.longwaveDownWm2!, airTemperatureC, clearEmissivity)
  const skyWm2 =
    record.longwaveDownWm2 ?? cloudySkyEmissivity(clearEmissivity, cloudCover) * blackBodyWm2(airTemperatureC)
  const fallen = precipitationPhase(record, airTemperatureC, precipitationMm)
  const openShortwaveWm2 = inRange(
    'shortwaveWm2 [W/m²]',
    Math.max(0, record.shortwaveWm2 ?? shortwaveFromSun(startsAtMillis, site, cloudCover)),
    0,
    1500,
  )
  return {
    startsAtMillis,
    time: record.time,
    isKnown: true,
    airTemperatureC,
    vapourPressureHpa,
    windSpeedMps,
    windAtRinkMps: windAtRinkMps(windSpeedMps, site.shelter),
    windGustMps: inRange('windGustMps [m/s]', record.windGustMps ?? windSpeedMps * GUST_FACTOR, 0, 120),
    cloudCover,
    shortwaveWm2: sunshineOnRinkWm2(openShortwaveWm2, cloudCover, startsAtMillis, site),
    longwaveDownWm2: longwaveOnRinkWm2(
      inRange('longwaveDownWm2 [W/m²]', skyWm2, 30, 700),
      airTemperatureC,
      site.skyView,
    ),
    precipitationMm,
    rainMm: fallen.rainMm,
    snowfallCm: fallen.snowfallCm,
    pressureHpa: inRange('pressureHpa [hPa]', record.pressureHpa ?? STANDARD_PRESSURE_HPA, 400, 1100),
    snowOnIceCm: record.snowOnIceCm ?? null,
  }
}

function shortwaveFromSun(startsAtMillis: number, site: Site, cloudCover: number): number {
  const middle = startsAtMillis + HOUR_MILLIS / 2
  const clearWm2 = clearSkyShortwaveAtWm2(middle, site.latitudeDeg, site.longitudeDeg)
  return clearWm2 > 0 ? clearWm2 * cloudShortwaveFactor(cloudCover) : 0
}

function cloudFromLongwave(longwaveDownWm2: number, airTemperatureC: number, clearEmissivity: number): number {
  const emissivity = longwaveDownWm2 / blackBodyWm2(airTemperatureC)
  const share = (emissivity - clearEmissivity) / (0.84 * (1 - clearEmissivity))
  return Math.min(1, Math.max(0, share))
}

function unknownHour(record: HourlyRecord, startsAtMillis: number): PreparedHour {
  return {
    startsAtMillis,
    time: record.time,
    isKnown: false,
    airTemperatureC: 0,
    vapourPressureHpa: 0,
    windSpeedMps: 0,
    windAtRinkMps: 0,
    windGustMps: 0,
    cloudCover: 0,
    shortwaveWm2: 0,
    longwaveDownWm2: 0,
    precipitationMm: 0,
    rainMm: 0,
    snowfallCm: 0,
    pressureHpa: STANDARD_PRESSURE_HPA,
    snowOnIceCm: null,
  }
}
