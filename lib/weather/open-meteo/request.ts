// What we ask Open-Meteo for: one cell, our units, UTC seconds, a day back and ten days ahead.
import type { GridCell } from '../port'

/**
 * The columns of an hourly record with the unit each must come back in. Twelve columns weigh 1.2 calls against the
 * quota. Depth of snow on the ground is left out: it says nothing about snow on a cleared sheet.
 */
export const FORECAST_UNITS = {
  temperature_2m: '°C',
  dew_point_2m: '°C',
  relative_humidity_2m: '%',
  wind_speed_10m: 'm/s',
  wind_gusts_10m: 'm/s',
  cloud_cover: '%',
  shortwave_radiation: 'W/m²',
  precipitation: 'mm',
  rain: 'mm',
  showers: 'mm',
  snowfall: 'cm',
  surface_pressure: 'hPa',
} as const

/** The columns in which runs differ most; four of 31 members weigh 12.4 calls for any range up to 14 days. */
export const ENSEMBLE_UNITS = {
  temperature_2m: FORECAST_UNITS.temperature_2m,
  wind_speed_10m: FORECAST_UNITS.wind_speed_10m,
  cloud_cover: FORECAST_UNITS.cloud_cover,
  precipitation: FORECAST_UNITS.precipitation,
} as const

export type ForecastVariable = keyof typeof FORECAST_UNITS
export type EnsembleVariable = keyof typeof ENSEMBLE_UNITS

export function forecastUrl(baseUrl: string, cell: GridCell): URL {
  return hourlyUrl(`${baseUrl}/v1/forecast`, cell, Object.keys(FORECAST_UNITS))
}

export function ensembleUrl(baseUrl: string, cell: GridCell, model: string): URL {
  const url = hourlyUrl(`${baseUrl}/v1/ensemble`, cell, Object.keys(ENSEMBLE_UNITS))
  url.search += `&models=${encodeURIComponent(model)}`
  return url
}

function hourlyUrl(address: string, cell: GridCell, variables: string[]): URL {
  const query = [
    `latitude=${cell.latitudeDeg}`,
    `longitude=${cell.longitudeDeg}`,
    // Commas stay as they are: encoded, the service names the whole list in its error instead of the bad column.
    `hourly=${variables.join(',')}`,
    'wind_speed_unit=ms',
    'timeformat=unixtime',
    'timezone=GMT',
    'past_hours=24',
    'forecast_hours=240',
  ]
  return new URL(`${address}?${query.join('&')}`)
}
