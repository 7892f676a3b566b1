// Why a night's hours are good or poor, and what to mind: reasons and cautions drawn from its scored hours.
import { CAUTIONS, FLOOD } from './thresholds'
import type { AdviceWindow, Caution, ComingPrecipitation, HourWeather, PlannedPass, Reason, ScoredHour } from './types'

type KnownHour = ScoredHour & { parts: NonNullable<ScoredHour['parts']>; weather: HourWeather }

function knownHours(hours: ScoredHour[]): KnownHour[] {
  return hours.filter((hour): hour is KnownHour => hour.parts !== null && hour.weather != null)
}

/** Less absorbed sunshine than this is night or dusk. Ours. [W/m²] */
const SUNLESS_WM2 = 5

const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length

/**
 * Reasons for the list under the plan: the window's hours, or without a window the night's, then what comes after.
 *
 * @param hours The night's hours as scored.
 * @param window The night's window, or null.
 * @param precipitation What falls next, or null.
 * @returns Codes and numbers; none when no hour is known.
 *
 * Source: ours.
 */
export function whyOf(
  hours: ScoredHour[],
  window: AdviceWindow | null,
  precipitation: ComingPrecipitation | null,
): Reason[] {
  const night = knownHours(hours)
  const inWindow = window ? night.filter((h) => h.time >= window.startsAt && h.time < window.endsAt) : night
  const told = inWindow.length > 0 ? inWindow : night
  if (told.length === 0) return []
  const reasons = [skyReason(told), airReason(told), vapourReason(told), ...sunReason(told), ...sheetReason(told)]
  reasons.push(...ruleReason(told, window))
  if (window) reasons.push(...slowingReason(night, told, window))
  if (precipitation) reasons.push(precipitationReason(precipitation, night.at(-1)?.time ?? ''))
  return reasons
}

function skyReason(hours: KnownHour[]): Reason {
  const clouds = hours.flatMap((h) => (h.weather.cloudCover === null ? [] : [h.weather.cloudCover]))
  const values: Reason['values'] = { longwaveWm2: mean(hours.map((h) => h.parts.longwave)) }
  if (clouds.length > 0) values.cloudCover = mean(clouds)
  return { code: 'why_sky', factor: 1, values }
}

function airReason(hours: KnownHour[]): Reason {
  const air = hours.map((h) => h.weather.airTemperatureC)
  return {
    code: 'why_air',
    factor: 1,
    values: {
      sensibleWm2: mean(hours.map((h) => h.parts.sensible)),
      highC: Math.max(...air),
      lowC: Math.min(...air),
      windAtRinkMps: mean(hours.map((h) => h.weather.windAtRinkMps)),
    },
  }
}

function vapourReason(hours: KnownHour[]): Reason {
  const latentWm2 = mean(hours.map((h) => h.parts.latent))
  return {
    code: 'why_vapour',
    factor: 1,
    values: { latentWm2, dewPointC: mean(hours.map((h) => h.weather.dewPointC)) },
  }
}

function sunReason(hours: KnownHour[]): Reason[] {
  const shortwaveWm2 = mean(hours.map((h) => h.parts.shortwave))
  return shortwaveWm2 >= 5 ? [{ code: 'why_sun', factor: 1, values: { shortwaveWm2 } }] : []
}

/** Where the heat balance and the thermometer rule part, a doubting keeper is told why. */
function ruleReason(hours: KnownHour[], window: AdviceWindow | null): Reason[] {
  const values = {
    ruleC: FLOOD.thermometerRuleC,
    airTemperatureC: mean(hours.map((h) => h.weather.airTemperatureC)),
    freezeRateMmPerH: mean(hours.map((h) => h.freezeRateMmPerH ?? 0)),
    longwaveWm2: mean(hours.map((h) => h.parts.longwave)),
    latentWm2: mean(hours.map((h) => h.parts.latent)),
    cloudCover: mean(hours.map((h) => h.weather.cloudCover ?? 0)),
  }
  if (window?.kind === 'flood' && values.airTemperatureC > values.ruleC) {
    return [{ code: 'why_warmer_than_rule', factor: 1, values }]
  }
  const isSlow = values.airTemperatureC <= values.ruleC && values.freezeRateMmPerH < FLOOD.slowForColdMmPerH
  return !window && isSlow ? [{ code: 'why_slow_for_cold', factor: 1, values }] : []
}

/** Less than this is no sheet to speak of. Ours. [mm] */
const SHEETLESS_MM = 1

function sheetReason(hours: KnownHour[]): Reason[] {
  const { thicknessMm, temperatureC } = (hours[0] as KnownHour).sheet
  if (thicknessMm < SHEETLESS_MM) return []
  return [{ code: 'why_sheet', factor: 1, values: { thicknessMm, temperatureC } }]
}

/** The first hour after the window, before the sun is up, in which water freezes at half the window's pace or less. */
function slowingReason(night: KnownHour[], told: KnownHour[], window: AdviceWindow): Reason[] {
  const usual = mean(told.map((h) => h.freezeRateMmPerH ?? 0))
  const slow = night.find(
    (h) => h.time >= window.endsAt && h.parts.shortwave < SUNLESS_WM2 && (h.freezeRateMmPerH ?? 0) <= usual / 2,
  )
  if (!slow || usual <= 0) return []
  const values: Reason['values'] = { startsAt: slow.time, freezeRateMmPerH: slow.freezeRateMmPerH ?? 0 }
  if (slow.weather.cloudCover !== null) values.cloudCover = slow.weather.cloudCover
  return [{ code: 'why_slower_later', factor: 1, values }]
}

/** What comes after the night's last hour is told with its day. */
function precipitationReason({ kind, startsAt, rainMm, snowfallCm }: ComingPrecipitation, lastHourAt: string): Reason {
  const when: Reason['values'] = startsAt > lastHourAt ? { startsAt, isAfterNight: 1 } : { startsAt }
  return kind === 'snow'
    ? { code: 'why_snow', factor: 1, values: { ...when, snowfallCm } }
    : { code: 'why_rain', factor: 1, values: { ...when, rainMm } }
}

/** These always apply, so they come last. */
const STANDING: Caution[] = [
  { code: 'thickness_is_estimate', values: {} },
  { code: 'land_only', values: {} },
]

/**
 * What the keeper must mind if they go out in these hours, gravest first; the standing cautions come last.
 *
 * @param hours The night's hours as scored.
 * @param window The night's window, or null.
 * @param passes Passes planned.
 * @returns Codes and numbers.
 *
 * Source: limits in CAUTIONS; order ours.
 */
export function cautionsOf(hours: ScoredHour[], window: AdviceWindow | null, passes: PlannedPass[]): Caution[] {
  if (!window) return [...snowRuleCautions(hours), ...STANDING]
  const lastStart = passes.at(-1)?.startsAt ?? window.endsAt
  const outside = knownHours(hours).filter((h) => h.time <= lastStart && h.time < window.endsAt)
  const cautions = [
    ...coldCaution(outside),
    ...hoseCaution(outside),
    ...snowCaution(hours, window),
    ...snowRuleCautions(hours),
  ]
  cautions.push({ code: 'not_alone', values: {} })
  if (window.kind === 'fill') cautions.push({ code: 'backflow', values: {} }, { code: 'run_off', values: {} })
  else cautions.push({ code: 'wet_pavement', values: {} })
  cautions.push({ code: 'electric_leads', values: {} }, { code: 'hot_water', values: {} })
  return [...cautions, ...STANDING]
}

function coldCaution(hours: KnownHour[]): Caution[] {
  const coldest = [...hours].sort((a, b) => (a.windChillC ?? 0) - (b.windChillC ?? 0))[0]
  const windChillC = coldest?.windChillC
  if (!coldest || windChillC == null || windChillC > CAUTIONS.feelsColdC) return []
  const band = CAUTIONS.frostbite.find((b) => windChillC <= b.windChillC)
  const values: Caution['values'] = { at: coldest.time, windChillC }
  return band ? [{ code: 'frostbite', values: { ...values, minutes: band.minutes } }] : [{ code: 'cold_skin', values }]
}

function hoseCaution(hours: KnownHour[]): Caution[] {
  const lowC = Math.min(...hours.map((h) => h.weather.airTemperatureC))
  return lowC <= CAUTIONS.hoseFreezesC ? [{ code: 'hose_freezes_between', values: { airTemperatureC: lowC } }] : []
}

function snowCaution(hours: ScoredHour[], window: AdviceWindow): Caution[] {
  const first = hours.find((hour) => hour.time >= window.startsAt)
  const snow = first?.reasons.find((reason) => reason.code === 'snow_to_clear')
  return snow ? [{ code: 'clear_snow_first', values: snow.values }] : []
}

/** The first of each remark of snow-rules.ts in these hours. */
function snowRuleCautions(hours: ScoredHour[]): Caution[] {
  const remarks = hours.flatMap((hour) => hour.reasons)
  return ['finish_clearing', 'rain_is_a_flood'].flatMap((code) => {
    const first = remarks.find((remark) => remark.code === code)
    return first ? [{ code, values: first.values }] : []
  })
}
