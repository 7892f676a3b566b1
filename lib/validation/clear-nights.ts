// Clear-sky emissivity against measured longwave: the lowest tenth of nights, by temperature.
import { blackBodyWm2, clearSkyEmissivity } from '@/lib/physics/sky'
import { CLEAR_SKY_EMISSIVITIES } from './published-forms'
import { numberOrNull, readTable } from './measured'
import { saturationOverWaterHpa } from '@/lib/physics/humidity'
import { summarise, type ValidationLine } from './scores'

const BIN_K = 3
const COLDEST_C = -18
const LEAST_IN_BIN = 200

interface Sky {
  airC: number
  vapourHpa: number
  emissivity: number
}

/** One line a station: the errors are the mean differences of the bins. */
export function validateClearNights(): ValidationLine[] {
  return [
    lineOf('Clear nights, Jokioinen', skies('pyhajarvi_hourly/jokioinen_hourly_oct_apr_2013_2016.csv')),
    lineOf('Clear nights, Svartberget', skies('longwave_night/svartberget_2019_30min_winter_months.csv')),
  ]
}

function skies(path: string): Sky[] {
  const found: Sky[] = []
  for (const row of readTable(path)) {
    const airC = numberOrNull(row.air_c)
    const humidity = numberOrNull(row.rh_pct)
    const longwave = numberOrNull(row.longwave_in_wm2)
    const isNight = (numberOrNull(row.shortwave_in_wm2) ?? Infinity) < 5
    if (airC === null || humidity === null || longwave === null || !isNight) continue
    found.push({
      airC,
      vapourHpa: (humidity / 100) * saturationOverWaterHpa(airC),
      emissivity: longwave / blackBodyWm2(airC),
    })
  }
  return found
}

function lineOf(set: string, found: Sky[]): ValidationLine {
  const bins: Sky[][] = []
  for (let from = COLDEST_C; from < 0; from += BIN_K) {
    const bin = found.filter(({ airC }) => airC >= from && airC < from + BIN_K)
    if (bin.length >= LEAST_IN_BIN) bins.push(lowestTenth(bin))
  }
  const errors = (form: (airC: number, vapourHpa: number) => number) =>
    bins.map((bin) => bin.reduce((sum, one) => sum + form(one.airC, one.vapourHpa) - one.emissivity, 0) / bin.length)
  const own = errors(clearSkyEmissivity)
  return {
    set,
    unit: '-',
    model: summarise(own),
    others: {
      Brutsaert: summarise(errors((airC, hpa) => CLEAR_SKY_EMISSIVITIES.brutsaert!(airC + 273.15, hpa))),
      'Dilley-O’Brien': summarise(errors((airC, hpa) => CLEAR_SKY_EMISSIVITIES.dilleyObrien!(airC + 273.15, hpa))),
    },
    bar: 'every bin ±0.03',
    isMet: own.every((error) => Math.abs(error) <= 0.03),
  }
}

function lowestTenth(bin: Sky[]): Sky[] {
  return bin.sort((a, b) => a.emissivity - b.emissivity).slice(0, Math.floor(bin.length / 10))
}
