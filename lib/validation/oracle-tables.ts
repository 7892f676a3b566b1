// Oracle tables: exact growth, and what FLake says of a wet surface and of growing ice under steady weather.
import { advanceSheet, createSheet, reportSheet } from '@/lib/physics/sheet'
import { ashtonThicknessM, neumannThicknessM, stefanThicknessM } from '@/lib/physics/stefan'
import { blackBodyWm2 } from '@/lib/physics/sky'
import { columnThicknessM, NO_RESISTANCE_WM2K } from './exact-solutions'
import { readTable } from './measured'
import { summarise, type ValidationLine } from './scores'
import { steadyHour, steadyHours } from './steady-hours'
import { surfaceBalance } from '@/lib/physics/balance'

/** Sensible and latent flux of a wet surface at 0 °C, 1-6 m/s, each held against FLake. */
export function validateWetFluxes(): ValidationLine {
  const errors: number[] = []
  for (const row of readTable('oracles/flake_wet_surface_fluxes_at_0c.csv')) {
    const windMps = Number(row.wind_10m_ms)
    if (windMps < 1 || windMps > 6) continue
    const hour = steadyHour({
      airTemperatureC: Number(row.t_air_c),
      relativeHumidity: Number(row.rh_pct_water) / 100,
      windSpeedMps: windMps,
    })
    const { sensible, latent } = surfaceBalance(hour, 'wet', 0).parts
    const flakeSensible = Number(row.q_sensible_wm2)
    if (flakeSensible > 1) errors.push((sensible / flakeSensible - 1) * 100)
    errors.push((latent / Number(row.q_latent_wm2) - 1) * 100)
  }
  return {
    set: 'Wet 0 °C surface, FLake fluxes',
    unit: '%',
    model: summarise(errors),
    others: {},
    bar: 'each ±15',
    isMet: errors.every((error) => Math.abs(error) <= 15),
  }
}

/** Closed forms against the table, and the model's own column against each where that form is exact. */
export function validateExactSolutions(): ValidationLine[] {
  const rows = readTable('oracles/closed_form_stefan_ashton.csv').map((row) => ({
    airC: Number(row.air_c),
    startM: Number(row.ice_start_m),
    hours: Number(row.hours),
    published: [Number(row.stefan_m), Number(row.ashton10_m), Number(row.ashton20_m), Number(row.ashton30_m)],
  }))
  const bulks = [NO_RESISTANCE_WM2K, 10, 20, 30]
  const closed = rows.flatMap(({ airC, startM, hours, published }) => {
    const frost = (-airC * hours) / 24
    return published.map((value, i) => {
      const own = i === 0 ? stefanThicknessM(startM, frost) : ashtonThicknessM(startM, frost, bulks[i]!)
      return (own / value - 1) * 100
    })
  })
  // The closed forms leave the heat of cooling ice out, 1 % at 10 K; where it is small the column must agree.
  const mild = rows.filter(({ airC }) => airC >= -5)
  const column = mild.flatMap(({ airC, startM, hours, published }) =>
    published.map((value, i) => (columnThicknessM(startM, airC, bulks[i]!, hours) / value - 1) * 100),
  )
  const neumann = rows
    .filter(({ startM }) => startM === 0)
    .map(
      ({ airC, hours }) =>
        (columnThicknessM(0, airC, NO_RESISTANCE_WM2K, hours) / neumannThicknessM(-airC, hours) - 1) * 100,
    )
  const line = (set: string, errors: number[]): ValidationLine => ({
    set,
    unit: '%',
    model: summarise(errors),
    others: {},
    bar: 'each ±1',
    isMet: errors.every((error) => Math.abs(error) <= 1),
  })
  return [
    line('Stefan and Ashton, closed forms', closed),
    line('  the column, -2 and -5 °C', column),
    line('Neumann, the column, -2 to -30 °C', neumann),
  ]
}

/** Growth over ten days of steady weather against FLake: another model, not the truth. */
export function validateSteadyGrowth(): ValidationLine {
  const errors: number[] = []
  for (const row of readTable('oracles/flake_constant_weather_growth.csv')) {
    const start = Number(row.ice_start_m)
    const airTemperatureC = Number(row.air_c)
    const hours = steadyHours(48, {
      airTemperatureC,
      relativeHumidity: Number(row.rh_pct_water) / 100,
      windSpeedMps: Number(row.wind_10m_ms),
      longwaveDownWm2: Number(row.sky_emissivity) * blackBodyWm2(airTemperatureC),
    })
    const sheet = createSheet({
      thicknessMm: start * 1000,
      temperatureC: Math.min(0, Number(row.surface_c_24h) / 2),
      snowCoverCm: 0,
      unfrozenBelowMm: 10_000,
      base: 'ground',
    })
    errors.push((reportSheet(hours.reduce(advanceSheet, sheet)).thicknessMm / 1000 - Number(row.ice_48h_m)) * 100)
  }
  return {
    set: 'FLake growth, 2 days',
    unit: 'cm',
    model: summarise(errors),
    others: {},
    bar: 'none',
    isMet: true,
  }
}
