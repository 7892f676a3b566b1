// What each reason of a flood says, as a clause that can follow "Hold off:" or stand as a sentence.
import {
  fluxText,
  iceText,
  layerText,
  durationText,
  rainText,
  rateText,
  signedTemperatureText,
  snowText,
  temperatureText,
  windChillText,
  windText,
} from './quantities'
import { clockText, doneByText } from './times'
import { num, text, type ClauseWriter } from './clause'

export const FLOOD_CLAUSES: Record<string, ClauseWriter> = {
  phase_not_flooding: (v) => PHASE_CLAUSES[text(v, 'phase')] ?? 'there is no sheet to flood yet',
  sheet_too_thin: (v, w) =>
    num(v, 'thicknessMm') < 0.5
      ? 'there is no ice yet to walk on with a hose'
      : `the sheet is ${iceText(num(v, 'thicknessMm'), w)} thick, too thin to walk on with a hose`,
  sheet_bears: (v, w) => {
    const ice = iceText(num(v, 'thicknessMm'), w)
    const isOnFloor = v.waterBelowMm === 0 && num(v, 'thicknessMm') < num(v, 'neededMm')
    if (!isOnFloor) return `${ice} of ice should carry you and the hose; drill to be sure`
    return num(v, 'thicknessMm') < 0.5
      ? 'the ground carries you and the hose'
      : `no water should be left under the ${ice} of ice, so the floor carries you and the hose; drill to be sure`
  },
  last_layer_wet: (v, w) => `${layerText(num(v, 'liquidMm'), w)} of water still lies on the sheet`,
  last_layer_set: () => 'the sheet is frozen to the top',
  freezes_well: (v, w) => `${rateText(num(v, 'freezeRateMmPerH'), w)} freezes`,
  freezes_though_mild: (v, w) =>
    `${signedTemperatureText(num(v, 'airTemperatureC'), w)} looks too warm beside the usual ` +
    `${temperatureText(num(v, 'ruleC'), w)}, but ${coolingText(v, w)}: ${rateText(num(v, 'freezeRateMmPerH'), w)} freezes`,
  slow_though_cold: (v, w) =>
    `${temperatureText(num(v, 'airTemperatureC'), w)} looks cold enough, but ${holdingText(v)}: ` +
    (num(v, 'freezeRateMmPerH') > 0
      ? `only ${rateText(num(v, 'freezeRateMmPerH'), w)} freezes`
      : 'water gains more heat than it loses'),
  freezes_slowly: (v, w) => `only ${rateText(num(v, 'freezeRateMmPerH'), w)} freezes`,
  sun_warms: (v, w) => `the sun puts ${fluxText(num(v, 'shortwaveWm2'), w)} into the water`,
  not_freezing: (v, w) => `at ${signedTemperatureText(num(v, 'airTemperatureC'), w)} water does not freeze`,
  dry_until_set: () => 'no snow or rain comes before the layer is set',
  trace_before_set: (v, w) => `a trace of snow or rain is possible around ${clockText(text(v, 'startsAt'), w)}`,
  snow_before_set: (v, w) => `snow from ${clockText(text(v, 'startsAt'), w)} would land on wet water`,
  rain_before_set: (v, w) => `rain from ${clockText(text(v, 'startsAt'), w)} would fall on a layer that is not set`,
  sets_soon: (v, w) => `a layer sets in ${durationText(num(v, 'setMinutes'))}, by ${doneByText(text(v, 'setsAt'), w)}`,
  sets_slowly: (v, w) =>
    `a layer takes ${durationText(num(v, 'setMinutes'))} to set, until ${doneByText(text(v, 'setsAt'), w)}`,
  does_not_set: () => 'a layer would still be wet when the forecast ends',
  forecast_ends_first: (v, w) =>
    `the forecast ends at ${clockText(text(v, 'forecastEndsAt'), w)}, before a layer would be set`,
  set_in_time: (v, w) => `it is set well before ${clockText(text(v, 'neededAt'), w)}`,
  barely_in_time: (v, w) =>
    `it is set only ${durationText(num(v, 'slackMinutes'))} before ${clockText(text(v, 'neededAt'), w)}`,
  not_set_in_time: (v, w) => `a layer would still be wet at ${clockText(text(v, 'neededAt'), w)}`,
  air_fine: (v, w) => `${temperatureText(num(v, 'airTemperatureC'), w)} suits a thin layer`,
  air_mild: (v, w) =>
    `at ${signedTemperatureText(num(v, 'airTemperatureC'), w)} a small error in the forecast would leave it wet`,
  layer_cracks: (v, w) => `at ${temperatureText(num(v, 'airTemperatureC'), w)} a new layer cracks and bonds poorly`,
  wind_light: (v, w) => `the wind in your yard is light, ${windText(num(v, 'windAtRinkMps'), w)}`,
  windy: (v, w) => `wind of ${windText(num(v, 'windAtRinkMps'), w)} in your yard would ripple the water`,
  gusts_light: (v, w) => `gusts in your yard stay near ${windText(num(v, 'gustAtRinkMps'), w)}`,
  gusty: (v, w) => `gusts of ${windText(num(v, 'gustAtRinkMps'), w)} in your yard would push the water about`,
  surface_clear: () => 'the sheet is clear of snow',
  snow_to_clear: (v, w) => `${snowText(num(v, 'snowCoverCm'), w)} of snow lies on the sheet: clear all of it first`,
  hose_runs: () => 'the hose runs freely',
  hose_freezes: (v, w) => `at ${temperatureText(num(v, 'airTemperatureC'), w)} the hose freezes while you work`,
  skin_bears: (v, w) => `it feels like ${windChillText(num(v, 'windChillC'), w)}`,
  skin_freezes: (v, w) => `it feels like ${windChillText(num(v, 'windChillC'), w)}, and bare skin freezes`,
  rain_is_a_flood: (v, w) =>
    `${rainText(num(v, 'rainMm'), w)} of rain on a clear sheet, with cold after it, is a flood that costs nothing`,
  finish_clearing: (v, w) =>
    `it turns wet and then drops to ${temperatureText(num(v, 'lowC'), w)}: clear all the snow before, or leave it lying even`,
}

const PHASE_CLAUSES: Record<string, string> = {
  planning: 'the rink is not built yet',
  waiting: 'there is no sheet to flood yet',
  filling: 'the rink is being filled',
  closed: 'the rink is closed for the season',
}

/** The one or two ways in which a mild night cools the water most. */
export function coolingText(v: Parameters<ClauseWriter>[0], w: Parameters<ClauseWriter>[1]): string {
  const longwave = num(v, 'longwaveWm2')
  const latent = num(v, 'latentWm2')
  const sky = `a clear sky takes ${fluxText(longwave, w)}`
  const dry = `dry air takes ${fluxText(latent, w)}`
  if (longwave > 25 && latent > 25) return `${sky} and ${dry} from the water`
  return longwave >= latent ? `${sky} from the water` : `${dry} from the water by evaporation`
}

/** What keeps the heat in on a night that is cold by the thermometer. */
export function holdingText(v: Parameters<ClauseWriter>[0]): string {
  const isCloudy = num(v, 'cloudCover') >= 0.6
  const isDamp = num(v, 'latentWm2') < 25
  if (isCloudy && isDamp) return 'cloud and damp air hold the heat in'
  if (isCloudy) return 'cloud holds the heat in'
  return isDamp ? 'damp air holds the heat in' : 'little heat leaves the water'
}
